import { isDefault, type Given } from '../steps/given.ts';
import { Givens, shapeOf } from '../steps/givens.ts';
import type { Site } from '../steps/site.ts';
import type { Recipe, Step } from '../steps/step.ts';
import type { Library } from '../substances/library.ts';
import { argumentsOf, readingOf, settle, type Values } from './evaluate.ts';
import { Plan, type Node } from './plan.ts';
import type { Inapplicable, Missing, Reading, Slope } from './reading.ts';
import type { Reference } from './reference.ts';
import { Scope } from './scope.ts';
import { contributionsTo, slopesOf, standardUncertainty } from './slopes.ts';

/** Another value for a given: what `with` moves. */
export interface Change {
  readonly address: string;
  /** In SI. */
  readonly value: number;
}

/** One line of a derivation: a number or a given, what it is read from, and what a reader must know of it. */
export interface Line {
  readonly node: Node;
  readonly reading: Reading;
  /** Standard. */
  readonly uncertainty: number;
  /** Of a given: the value with its origin. */
  readonly given?: Given;
  readonly remarks: readonly string[];
}

/**
 * A step whose numbers can be read, alone or one `over` another. Reading one works out those it needs, once, and keeps them.
 * A run never changes.
 */
export class StepRun implements Values {
  readonly step: Step;
  readonly plan: Plan;
  readonly givens: ReadonlyMap<string, Given>;
  readonly origin: StepRun | undefined;
  readonly settled: (boolean | undefined)[] = [];
  readonly numbers: number[] = [];
  readonly absent: (Missing | Inapplicable | undefined)[] = [];
  readonly uncertain: boolean[] = [];
  readonly chosen: number[] = [];
  readonly partials: (number[] | undefined)[] = [];
  readonly deviations: (number | undefined)[] = [];
  readonly #reached: (boolean | undefined)[] = [];

  /** `origin` is another run of the plan: numbers that no given tells apart are taken from it. */
  constructor(step: Step, plan: Plan, origin?: StepRun, givens: ReadonlyMap<string, Given> = step.givens) {
    this.step = step;
    this.plan = plan;
    this.givens = givens;
    this.origin = origin;
  }

  read(reference: Reference, over?: Reference): Reading {
    return readingOf(this, this.plan.node(reference, over));
  }

  /** Standard uncertainty of a known number; zero where it is judged at its setpoint. */
  uncertainty(reference: Reference, over?: Reference): number {
    return standardUncertainty(this, this.plan.node(reference, over));
  }

  /** How every given moves the number, strongest contribution first. */
  slopes(reference: Reference, over?: Reference): readonly Slope[] {
    return slopesOf(this, this.plan.node(reference, over));
  }

  /** How every uncertain given moves the number, strongest contribution first. */
  contributions(reference: Reference, over?: Reference): readonly Slope[] {
    return contributionsTo(this, this.plan.node(reference, over));
  }

  /** The defaults that a number is read from, whether they are uncertain or not. */
  defaults(reference: Reference, over?: Reference): readonly Given[] {
    return reachedFrom(this.plan.node(reference, over)).flatMap((node) => {
      const given = node.kind === 'given' ? givenAt(this, node.address, node.fallback) : undefined;
      return given !== undefined && isDefault(given.origin) ? [given] : [];
    });
  }

  /** All that was read on the way to a number, each once: the number itself first, every line before those it is read from. */
  derive(reference: Reference, over?: Reference): readonly Line[] {
    return reachedFrom(this.plan.node(reference, over)).map((node) => lineOf(this, node));
  }

  /** What a reader must know of a number and of all that it is read from. */
  remarks(reference: Reference, over?: Reference): readonly string[] {
    const nodes = reachedFrom(this.plan.node(reference, over));
    return [...new Set(nodes.flatMap((node) => remarksOf(this, node)))];
  }

  /** The given that stands at an address in this run, or the default that stands in for it. */
  given(address: string): Given | undefined {
    const node = this.plan.given(address);
    return node.kind === 'given' ? givenAt(this, node.address, node.fallback) : undefined;
  }

  /** Another run of the step with some values moved; it shares every number that they do not reach. */
  with(...changes: readonly Change[]): StepRun {
    const givens = new Givens(this.givens);
    for (const { address, value } of changes) {
      const given = this.given(address);
      if (given !== undefined) givens.set({ ...given, value });
    }
    return new StepRun(this.step, this.plan, this, givens);
  }

  /** Whether any given that a number is read from differs from that of the run it comes from. */
  reaches(node: Node): boolean {
    const known = this.#reached[node.slot];
    if (known !== undefined) return known;
    const reached =
      node.kind === 'given' ? this.#differs(node.address) : node.inputs.some((input) => this.reaches(input));
    this.#reached[node.slot] = reached;
    return reached;
  }

  #differs(address: string): boolean {
    const own = this.givens.get(address);
    const other = this.origin?.givens.get(address);
    return own !== other && (own?.value !== other?.value || own?.uncertainty !== other?.uncertainty);
  }
}

/** A recipe on its chamber and site, whose steps can be read. */
export interface Run {
  readonly site: Site;
  readonly recipe: Recipe;
  readonly steps: readonly StepRun[];
  /** Another run with some values of some steps moved. */
  with(...changes: readonly StepChange[]): Run;
}

/** Another value for a given of the step at a path. */
export interface StepChange extends Change {
  readonly step: string;
}

/**
 * A resolved recipe as a run. Plans of the setups met so far are kept, so that steps alike work out only once what is read from
 * what; within the recipe they share their numbers too, as far as their givens agree.
 */
export function runOf(site: Site, recipe: Recipe): Run {
  const first = new Map<Plan, StepRun>();
  const steps = recipe.steps.map((step) => {
    const plan = planOf(step, site.library);
    const run = new StepRun(step, plan, first.get(plan));
    if (run.origin === undefined) first.set(plan, run);
    return run;
  });
  return madeOf(site, recipe, steps);
}

function madeOf(site: Site, recipe: Recipe, steps: readonly StepRun[]): Run {
  return {
    site,
    recipe,
    steps,
    with: (...changes) => {
      const moved = steps.map((run) => {
        const own = changes.filter(({ step }) => step === run.step.path);
        return own.length === 0 ? run : run.with(...own);
      });
      return madeOf(site, recipe, moved);
    },
  };
}

const PLANS = new WeakMap<Library, Map<string, Plan>>();
/** A repository of very different recipes must not fill the memory with plans. */
const MOST_PLANS = 500;

function planOf(step: Step, library: Library): Plan {
  let plans = PLANS.get(library);
  if (plans === undefined) PLANS.set(library, (plans = new Map<string, Plan>()));
  const signature = signatureOf(step);
  let plan = plans.get(signature);
  if (plan === undefined) {
    if (plans.size >= MOST_PLANS) plans.clear();
    plan = new Plan(new Scope(step, library));
    plans.set(signature, plan);
  }
  return plan;
}

function signatureOf(step: Step): string {
  let signature = JSON.stringify(step.setup);
  signature += `\n${shapeOf(step.givens)}`;
  for (const address of step.unknown) signature += `\n?${address}`;
  for (const address of step.none) signature += `\n-${address}`;
  return signature;
}

function givenAt(run: StepRun, address: string, fallback: Given | undefined): Given | undefined {
  return run.givens.get(address) ?? fallback;
}

/** The nodes that a number is read from and itself, each once, from the number down. */
function reachedFrom(target: Node): readonly Node[] {
  const reached = new Map<number, Node>();
  const visit = (node: Node): void => {
    if (reached.has(node.slot)) return;
    reached.set(node.slot, node);
    for (const input of node.inputs) visit(input);
  };
  visit(target);
  return [...reached.values()].sort((a, b) => b.slot - a.slot);
}

function lineOf(run: StepRun, node: Node): Line {
  const given = node.kind === 'given' ? givenAt(run, node.address, node.fallback) : undefined;
  return {
    node,
    reading: readingOf(run, node),
    uncertainty: standardUncertainty(run, node),
    ...(given === undefined ? {} : { given }),
    remarks: remarksOf(run, node),
  };
}

function remarksOf(run: StepRun, node: Node): readonly string[] {
  if (node.kind !== 'law' || settle(run, node) !== undefined) return [];
  return node.quantity.remarks(node.reference, run.plan.scope, argumentsOf(run, node));
}
