import { collisionsStraight, collisionsWalk, diffusionTime, knudsen, wallCollisions } from '../physics/regime.ts';
import { lengthsOf } from './lengths.ts';
import { missing, quantity } from './quantity.ts';
import type { Reference } from './reference.ts';
import { gasOf, gasesOf, type Scope } from './scope.ts';

/* Free path against a length: which regime rules. */

export const knudsenOf = quantity<[path: number, length: number]>({
  id: 'knudsen',
  symbol: 'Kn',
  dimension: 'number',
  statement: 'Mean free path over a length of the chamber, step or feature.',
  source: 'λ/L, bands Schaaf & Chambré 1961; path by the hard-sphere diameter that reproduces the viscosity',
  lengths: lengthsOf,
  subjects: (scope) => [...scope.gases, ...scope.emittedSubjects('target'), ...scope.emittedSubjects('melt')],
  whole: true,
  worst: 'smallest',
  from: (reference, scope) => [pathOver(reference, scope), lengthFor(reference)],
  value: knudsen,
});

/** The free path that counts over a length: of the emitted atom over a throw, of the reactant in a feature, else of the mixture. */
function pathOver({ of, length = '' }: Reference, scope: Scope): Reference {
  const emitted = emittedSubject(of, length, scope);
  if (emitted !== undefined) return { id: 'emitted-free-path', of: emitted };
  if (length === 'feature') {
    const gas = of ?? (scope.setup.reactant === undefined ? undefined : 'reactant');
    return gas === undefined ? { id: 'mean-free-path', length } : { id: 'mean-free-path', length, of: gas };
  }
  return of === undefined ? { id: 'mean-free-path' } : { id: 'mean-free-path', of };
}

function emittedSubject(of: string | undefined, length: string, scope: Scope): string | undefined {
  if (of !== undefined) return scope.emitted(of) === undefined ? undefined : of;
  if (length !== 'throw') return undefined;
  // Of an alloy the atom with the shortest path.
  return (['target', 'melt'] as const).find((role) => scope.emitted(role) !== undefined);
}

function lengthFor({ length = 'chamber' }: Reference): Reference {
  return { id: 'length', length };
}

export const pressureDistance = quantity<[pressure: number, length: number]>({
  id: 'pressure-distance',
  symbol: 'p L',
  dimension: 'pressure-length',
  statement: 'Pressure times a length.',
  source: 'definition',
  lengths: lengthsOf,
  from: (reference) => [{ id: 'gas-pressure' }, lengthFor(reference)],
  value: (pressure, length) => pressure * length,
});

export const collisionsStraightOf = quantity<[length: number, path: number]>({
  id: 'collisions-straight',
  symbol: 'L/λ',
  dimension: 'number',
  statement: 'Collisions on a straight flight over a length.',
  source: 'definition',
  lengths: lengthsOf,
  subjects: gasesOf,
  whole: true,
  from: (reference, scope) => [lengthFor(reference), pathOver(reference, scope)],
  value: collisionsStraight,
});

export const collisionsWalkOf = quantity<[frequency: number, length: number, diffusivity: number]>({
  id: 'collisions-walk',
  symbol: 'N_walk',
  dimension: 'number',
  statement: 'Collisions of a molecule on the random walk that covers a length.',
  source: 'z L²/(2 D), Einstein 1905',
  lengths: lengthsOf,
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = gasOf(reference, scope);
    if (of === undefined) return missing('reactant.gas');
    return [{ id: 'collision-frequency', of }, lengthFor(reference), { id: 'diffusivity', of }];
  },
  value: collisionsWalk,
});

export const collisionsResidence = quantity<
  [residence: number, speeds: readonly number[], fractions: readonly number[], path: number]
>({
  id: 'collisions-residence',
  symbol: 'z τ',
  dimension: 'number',
  statement: 'Collisions of a molecule, of the mixture or of one gas, during its stay in the chamber.',
  source: 'τ Σ x_i v_i/λ',
  subjects: gasesOf,
  whole: true,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    const of = gas === undefined ? scope.gases : [gas];
    return [
      { id: 'residence-time' },
      of.map((one) => ({ id: 'mean-speed', of: one })),
      gas === undefined ? of.map((one) => ({ id: 'mole-fraction', of: one })) : [],
      gas === undefined ? { id: 'mean-free-path' } : { id: 'mean-free-path', of: gas },
    ];
  },
  value: (residence, speeds, fractions, path) =>
    (residence * speeds.reduce((sum, speed, index) => sum + speed * (fractions[index] ?? 1), 0)) / path,
});

export const wallCollisionsOf = quantity<[residence: number, speed: number, area: number, volume: number]>({
  id: 'wall-collisions',
  symbol: 'N_wall',
  dimension: 'number',
  statement: 'Hits of a molecule on the walls during its stay in the chamber, were they its only obstacle.',
  source: 'τ v A/(4 V)',
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = gasOf(reference, scope);
    if (of === undefined) return missing('reactant.gas');
    return [{ id: 'residence-time' }, { id: 'mean-speed', of }, { id: 'wall-area' }, { id: 'volume' }];
  },
  value: wallCollisions,
});

export const diffusionTimeOf = quantity<[length: number, diffusivity: number]>({
  id: 'diffusion-time',
  symbol: 't_D',
  dimension: 'time',
  statement: 'Time in which a gas diffuses over a length.',
  source: 'L²/(2 D), Einstein 1905',
  lengths: lengthsOf,
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = gasOf(reference, scope);
    return of === undefined ? missing('reactant.gas') : [lengthFor(reference), { id: 'diffusivity', of }];
  },
  value: diffusionTime,
});
