import type { Gas } from '../substances/gas.ts';
import type { Library } from '../substances/library.ts';
import type { Emitter, Setup, Step } from '../steps/step.ts';
import type { Reference } from './reference.ts';

/**
 * What a number's ingredients depend on apart from values: what the step is made of, which setpoints it has, and the substances.
 * Steps of one scope read the same numbers in the same way.
 */
export class Scope {
  readonly setup: Setup;
  readonly library: Library;
  readonly #step: Step;

  constructor(step: Step, library: Library) {
    this.setup = step.setup;
    this.library = library;
    this.#step = step;
  }

  has(address: string): boolean {
    return this.#step.givens.has(address);
  }

  /** Whether the step or its chamber says that this does not apply: `wafer: none`. */
  isNone(address: string): boolean {
    return this.#step.none.has(address);
  }

  isUnknown(address: string): boolean {
    return this.#step.unknown.has(address);
  }

  /** Whether a document speaks of it: with a value, or as unknown. Then no rule and no default stands in for it. */
  states(address: string): boolean {
    return this.has(address) || this.isUnknown(address);
  }

  /** Addresses of the givens that start so. */
  addresses(prefix: string): readonly string[] {
    return [...this.#step.givens.keys()].filter((address) => address.startsWith(prefix));
  }

  gas(name: string): Gas | undefined {
    return this.library.gas(name);
  }

  /** Whether any gas flows by the recipe; without flow a step has its chamber's residual gas. */
  get fed(): boolean {
    return this.setup.lines.length > 0;
  }

  /** Gases that the molecules of the step meet. */
  get gases(): readonly string[] {
    if (this.setup.gases.length > 0) return this.setup.gases;
    return this.setup.residual.length > 0 ? this.setup.residual : ['H2O'];
  }

  /** Gases that the lines bring, whatever the stated composition makes of them. */
  get fedGases(): readonly string[] {
    const { lines, gases, composition } = this.setup;
    return composition ? [...new Set(lines.flatMap(({ brings }) => brings.map(({ gas }) => gas)))] : gases;
  }

  get powered(): boolean {
    return this.setup.powered.length > 0;
  }

  /** The sputter target or melt that a role names: `target`, `melt`, `target/Ti` for one atom of an alloy. */
  emitted(subject: string): Emitted | undefined {
    const [role, atom] = subject.split('/');
    if (role !== 'target' && role !== 'melt') return undefined;
    const emitter = role === 'target' ? this.setup.target : this.setup.melt;
    if (emitter === undefined) return undefined;
    const chosen = atom === undefined ? emitter.atoms[0] : emitter.atoms.find((one) => one.atom === atom);
    return chosen === undefined ? undefined : { role, emitter, atom: chosen.atom };
  }

  /** The subjects that a role stands for: the atoms of an alloy, one by one. */
  emittedSubjects(role: 'target' | 'melt'): readonly string[] {
    const emitter = role === 'target' ? this.setup.target : this.setup.melt;
    if (emitter === undefined) return [];
    return emitter.atoms.length === 1 ? [role] : emitter.atoms.map(({ atom }) => `${role}/${atom}`);
  }

  /** Address of a setpoint of a target or melt: `targets.ti.throw`. */
  emitterAddress({ role, emitter }: Emitted, key: string): string {
    return `${role}s.${emitter.name}.${key}`;
  }
}

export interface Emitted {
  readonly role: 'target' | 'melt';
  readonly emitter: Emitter;
  readonly atom: string;
}

/** The gas that a reference speaks of; undefined where it names the reactant and the step has none. */
export function gasOf({ of }: Reference, scope: Scope): string | undefined {
  return of === 'reactant' ? scope.setup.reactant : of;
}

/** The gases of a step, for entries whose subjects they are. */
export function gasesOf(scope: Scope): readonly string[] {
  return scope.gases;
}
