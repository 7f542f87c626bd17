import { atomicNumber } from '../substances/elements.ts';
import { inapplicable, type Recipe } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Reference } from './reference.ts';
import type { Emitted, Scope } from './scope.ts';

/* What numbers of an emitted atom are read from: of which target or melt, and its encounters with every gas of the mixture. */

/** Ingredients for an emitted atom, or why there are none. */
export function emittedOr<T>(
  reference: Reference,
  scope: Scope,
  then: (emitted: Emitted) => T,
): T | Missing | Inapplicable {
  const role = reference.of ?? (scope.setup.target === undefined && scope.setup.melt !== undefined ? 'melt' : 'target');
  const emitted = scope.emitted(role);
  if (emitted !== undefined) return then(emitted);
  return role.startsWith('melt') ? inapplicable('no melt runs') : inapplicable('no target runs');
}

function emittedSubjects(scope: Scope): readonly string[] {
  return [...scope.emittedSubjects('target'), ...scope.emittedSubjects('melt')];
}

export const about = { subjects: emittedSubjects, whole: true } as const;

/** Energy, atom, for each gas of the mixture its density, pair values, mass, atomic number and atoms; gas temperature. */
export type FastArguments = [
  energy: number,
  mass: number,
  atomicNumber: number,
  densities: readonly number[],
  diameters: readonly number[],
  depths: readonly number[],
  masses: readonly number[],
  charges: readonly number[],
  atoms: readonly number[],
  temperature: number,
];

export function fastIngredients(reference: Reference, scope: Scope, emitted: Emitted): Recipe<FastArguments> {
  const of = reference.of ?? emitted.role;
  const partners = scope.gases.map((gas) => ({ gas, pair: pairFor(emitted.atom, gas, scope) }));
  const pairs = partners.map(({ pair }) => `atoms.${emitted.atom}.pairs.${pair}`);
  return [
    { id: 'emission-energy', of },
    `atoms.${emitted.atom}.molar_mass`,
    `atoms.${emitted.atom}.atomic_number`,
    partners.map(({ gas }) => ({ id: 'gas-density', of: gas })),
    pairs.map((pair) => `${pair}.diameter`),
    pairs.map((pair) => `${pair}.well_depth`),
    partners.map(({ gas }) => `gases.${gas}.molar_mass`),
    partners.map(({ pair }) => meanCharge(pair, scope)),
    partners.map(({ pair }) => atomsIn(pair, scope)),
    { id: 'gas-temperature' },
  ];
}

/** The gas whose pair values count: its own, else the one that stands in. */
export function pairFor(atom: string, gas: string, scope: Scope): string {
  return scope.library.atom(atom)?.pairFor(gas)?.partner ?? gas;
}

/** Atoms in a molecule of a gas. */
function atomsIn(gas: string, scope: Scope): number {
  let atoms = 0;
  for (const count of scope.gas(gas)?.formula.values() ?? []) atoms += count;
  return atoms;
}

/** Mean atomic number of the atoms of a gas. */
function meanCharge(gas: string, scope: Scope): number {
  let charge = 0;
  for (const [element, count] of scope.gas(gas)?.formula ?? []) charge += count * (atomicNumber(element) ?? NaN);
  return charge / atomsIn(gas, scope);
}

export function pairRemarks(reference: Reference, scope: Scope): readonly string[] {
  const atom = scope.emitted(reference.of ?? 'target')?.atom ?? scope.emitted('melt')?.atom;
  if (atom === undefined) return [];
  return scope.gases
    .filter((gas) => pairFor(atom, gas, scope) !== gas)
    .map((gas) => `collision values of ${atom} with ${gas} are those with N2`);
}
