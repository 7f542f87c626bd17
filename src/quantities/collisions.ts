import {
  collisionDiameter,
  collisionFrequency,
  diffusionCrossSection,
  meanFreePath,
  mixtureMeanFreePath,
} from '../physics/collisions.ts';
import { COLLISION_INTEGRAL_RANGE } from '../physics/collision-integrals.ts';
import { combine, type Molecule } from '../physics/pair.ts';
import { missing, quantity, type Recipe } from './quantity.ts';
import type { Missing } from './reading.ts';
import { gasOf, gasesOf, type Scope } from './scope.ts';
import { temperatureAt } from './gas.ts';

/* Collisions between molecules: cross-sections of pairs, free paths, frequencies. */

type PairArguments = [
  diameterA: number,
  depthA: number,
  dipoleA: readonly number[],
  diameterB: number,
  depthB: number,
  dipoleB: readonly number[],
  temperature: number,
  accuracyA: number,
  accuracyB: number,
];

export const collisionDiameterOf = quantity<PairArguments>({
  id: 'collision-diameter',
  symbol: 'd',
  dimension: 'length',
  statement: 'Effective hard-sphere diameter of a pair of gases: the one that reproduces the viscosity.',
  source: 'd² = σ² Ω(2,2)*, Chapman & Cowling 1970; Ω by Neufeld, Janzen & Aziz 1972, polar gases Brokaw 1969',
  subjects: pairsOf,
  from: ({ of = '', length }, scope) => pairIngredients(of, length, scope, 'viscosity'),
  value: (diameterA, depthA, dipoleA, diameterB, depthB, dipoleB, temperature, accuracyA, accuracyB) => {
    const pair = combine(molecule(diameterA, depthA, dipoleA), molecule(diameterB, depthB, dipoleB));
    const diameter = collisionDiameter(pair.diameter, pair.wellDepth, pair.polarity, temperature);
    // Viscosity goes as 1/d²; of a pair the geometric mean of both accuracies counts.
    return diameter * (accuracyA * accuracyB) ** -0.25;
  },
  remarks: ({ of = '' }, scope, values) => pairRemarks(of, scope, values),
});

export const diffusionCrossSectionOf = quantity<PairArguments>({
  id: 'diffusion-cross-section',
  symbol: 'Q',
  dimension: 'cross-section',
  statement: 'Cross-section of a pair of gases for diffusion.',
  source: 'Q = π σ² Ω(1,1)*, Chapman & Cowling 1970; Ω by Neufeld, Janzen & Aziz 1972, polar gases Brokaw 1969',
  subjects: pairsOf,
  from: ({ of = '', length }, scope) => pairIngredients(of, length, scope, 'diffusion'),
  value: (diameterA, depthA, dipoleA, diameterB, depthB, dipoleB, temperature, accuracyA, accuracyB) => {
    const pair = combine(molecule(diameterA, depthA, dipoleA), molecule(diameterB, depthB, dipoleB));
    return (
      diffusionCrossSection(pair.diameter, pair.wellDepth, pair.polarity, temperature) /
      Math.sqrt(accuracyA * accuracyB)
    );
  },
  remarks: ({ of = '' }, scope, values) => pairRemarks(of, scope, values),
});

type PathArguments = [
  molarMass: number,
  density: number,
  fractions: readonly number[],
  diameters: readonly number[],
  masses: readonly number[],
  leftOut: readonly number[],
  spread: readonly number[],
];

export const meanFreePathOf = quantity<PathArguments>({
  id: 'mean-free-path',
  symbol: 'λ',
  dimension: 'length',
  statement:
    'Path between collisions: of one gas in the mixture; of the mixture the path flown by all molecules over the collisions they suffer.',
  source:
    '1/Σ_j n_j π d_ij² sqrt(1 + m_i/m_j), Jeans; Chapman & Cowling 1970; hard spheres of the diameter that reproduces the viscosity',
  lengths: () => ['feature'],
  subjects: gasesOf,
  whole: true,
  from: (reference, scope) => {
    const { length } = reference;
    if (reference.of === undefined) return { id: 'mixture-free-path', ...(length === undefined ? {} : { length }) };
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    if (scope.gas(gas)?.hasCollision !== true) return missing(`gases.${gas}.collision`);
    const place = length === undefined ? {} : { length };
    const partners = collisionPartners(scope);
    return [
      `gases.${gas}.molar_mass`,
      { id: 'number-density', ...place },
      partners.map((of) => ({ id: 'mole-fraction', of })),
      partners.map((partner) => ({ id: 'collision-diameter', of: pairName(gas, partner), ...place })),
      partners.map((partner) => `gases.${partner}.molar_mass`),
      leftOut(scope).map((of) => ({ id: 'mole-fraction', of })),
      leftOut(scope).length > 0 ? ['accuracy.left-out'] : [],
    ];
  },
  value: (mass, density, fractions, diameters, masses, leftOutFractions, spread) => {
    const absent = sum(leftOutFractions);
    if (absent > MOST_LEFT_OUT) return missing();
    const densities = fractions.map((fraction) => (fraction * density) / (1 - absent));
    return meanFreePath(mass, densities, diameters, masses) * (1 + absent * (spread[0] ?? 0));
  },
  needs: (_, scope) => leftOut(scope).map((gas) => `gases.${gas}.collision`),
  remarks: (_, scope) => leftOutRemarks(scope),
});

export const mixtureFreePath = quantity<
  [fractions: readonly number[], speeds: readonly number[], paths: readonly number[]]
>({
  id: 'mixture-free-path',
  symbol: 'λ_mix',
  dimension: 'length',
  statement: 'Path flown by all molecules of the mixture over the collisions they suffer.',
  source: 'Σ x_i v_i / Σ x_i v_i/λ_i',
  lengths: () => ['feature'],
  from: ({ length }, scope) => {
    const gases = collisionPartners(scope);
    if (gases.length === 0) return missing(...scope.gases.map((gas) => `gases.${gas}.collision`));
    const place = length === undefined ? {} : { length };
    return [
      gases.map((of) => ({ id: 'mole-fraction', of })),
      gases.map((of) => ({ id: 'mean-speed', of, ...place })),
      gases.map((of) => ({ id: 'mean-free-path', of, ...place })),
    ];
  },
  value: mixtureMeanFreePath,
});

export const collisionFrequencyOf = quantity<[speed: number, path: number]>({
  id: 'collision-frequency',
  symbol: 'z',
  dimension: 'frequency',
  statement: 'Collisions that a molecule of a gas suffers in a second.',
  source: 'z = v/λ',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    return gas === undefined
      ? missing('reactant.gas')
      : [
          { id: 'mean-speed', of: gas },
          { id: 'mean-free-path', of: gas },
        ];
  },
  value: collisionFrequency,
});

/** Up to this mole fraction gases without collision values are left out of mixture sums. */
const MOST_LEFT_OUT = 0.05;

/** Gases of the step whose collisions are known. */
export function collisionPartners(scope: Scope): readonly string[] {
  return scope.gases.filter((gas) => scope.gas(gas)?.hasCollision === true);
}

/** Gases of the step without collision values. */
export function leftOut(scope: Scope): readonly string[] {
  return scope.gases.filter((gas) => scope.gas(gas)?.hasCollision !== true);
}

function leftOutRemarks(scope: Scope): readonly string[] {
  return leftOut(scope).map(
    (gas) => `${gas} has no collision values and is left out; its mole fraction counts as uncertainty`,
  );
}

/** The name of a pair, the same whichever gas comes first. */
export function pairName(a: string, b: string): string {
  return a < b ? `${a}/${b}` : `${b}/${a}`;
}

function pairsOf(scope: Scope): readonly string[] {
  return scope.gases.flatMap((a, index) => scope.gases.slice(index).map((b) => pairName(a, b)));
}

function pairIngredients(
  pair: string,
  place: string | undefined,
  scope: Scope,
  property: 'viscosity' | 'diffusion',
): Recipe<PairArguments> | Missing {
  const [a = '', b = ''] = pair.split('/');
  const unknown = [a, b].filter((gas) => scope.gas(gas)?.hasCollision !== true);
  if (unknown.length > 0) return missing(...unknown.map((gas) => `gases.${gas}.collision`));
  return [
    `gases.${a}.collision.diameter`,
    `gases.${a}.collision.well_depth`,
    dipoleOf(a, scope),
    `gases.${b}.collision.diameter`,
    `gases.${b}.collision.well_depth`,
    dipoleOf(b, scope),
    temperatureAt(place),
    `accuracy.${property}.${a}`,
    `accuracy.${property}.${b}`,
  ];
}

/** The dipole counts only where the collision values were fitted together with it. */
function dipoleOf(gas: string, scope: Scope): readonly string[] {
  return scope.gas(gas)?.polar === true ? [`gases.${gas}.dipole`] : [];
}

function molecule(diameter: number, wellDepth: number, dipole: readonly number[]): Molecule {
  const [moment] = dipole;
  return { diameter, wellDepth, dipole: moment ?? 0, polar: moment !== undefined };
}

function pairRemarks(pair: string, scope: Scope, values: PairArguments): readonly string[] {
  const [, depthA, , , depthB, , temperature] = values;
  const remarks: string[] = [];
  const reduced = temperature / Math.sqrt(depthA * depthB);
  const { from, to } = COLLISION_INTEGRAL_RANGE;
  if (reduced < from || reduced > to) {
    remarks.push(
      `collision integrals of ${pair} are used outside their range, at a reduced temperature of ${reduced.toPrecision(3)}`,
    );
  }
  for (const gas of new Set(pair.split('/'))) {
    const estimated = scope.gas(gas)?.estimated;
    if (estimated !== undefined) remarks.push(`collision values of ${gas} are estimated: ${estimated}`);
  }
  return remarks;
}

function sum(values: readonly number[]): number {
  let total = 0;
  for (const value of values) total += value;
  return total;
}
