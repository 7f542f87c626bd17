import {
  collisionsToThermalise,
  mixtureEnergyDecrement,
  slowingKnudsen,
  thermalisationDistance,
  thermalisationRatio,
} from '../physics/sputtered-atoms.ts';
import { about, emittedOr, fastIngredients, pairRemarks, type FastArguments } from './emitted.ts';
import { inapplicable, quantity } from './quantity.ts';

/* How atoms that leave a target or melt lose their energy to the gas. */

export const energyLoss = quantity<FastArguments>({
  ...about,
  id: 'energy-decrement',
  symbol: 'ξ',
  dimension: 'number',
  statement: 'Mean loss of ln E in a collision with the gas.',
  source:
    '1 + α ln α/(1 - α), α = ((m - M)/(m + M))², hard spheres, gas at rest; Westwood, J. Vac. Sci. Technol. 15, 1 (1978)',
  from: (reference, scope) => emittedOr(reference, scope, (emitted) => fastIngredients(reference, scope, emitted)),
  value: mixtureEnergyDecrement,
});

export const toThermalise = quantity<[energy: number, temperature: number, decrement: number]>({
  ...about,
  id: 'collisions-to-thermalise',
  symbol: 'N_th',
  dimension: 'number',
  statement:
    'Collisions after which an emitted atom is as slow as the gas; by the mean logarithm, up to 1.44 fewer than by the mean ratio.',
  source: 'ln(E_0/(3/2 k T))/ξ; Westwood, J. Vac. Sci. Technol. 15, 1 (1978)',
  from: (reference, scope) =>
    emittedOr(reference, scope, ({ role }) => {
      const of = reference.of ?? role;
      return [{ id: 'emission-energy', of }, { id: 'gas-temperature' }, { id: 'energy-decrement', of }] as const;
    }),
  value: collisionsToThermalise,
});

export const slowing = quantity<[path: number, decrement: number, distance: number]>({
  ...about,
  id: 'slowing-knudsen',
  symbol: 'Kn_slow',
  dimension: 'number',
  statement: 'Throws that an emitted atom flies per e-fold of energy lost: the same measure for light and heavy atoms.',
  source: 'λ_fast/(ξ throw), path and decrement of Westwood, J. Vac. Sci. Technol. 15, 1 (1978)',
  worst: 'smallest',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => {
      const of = reference.of ?? emitted.role;
      return [
        { id: 'fast-free-path', of },
        { id: 'energy-decrement', of },
        scope.emitterAddress(emitted, 'throw'),
      ] as const;
    }),
  value: slowingKnudsen,
});

export const thermalisation = quantity<[decrement: number, ...FastArguments, accuracy: number]>({
  ...about,
  id: 'thermalisation-distance',
  symbol: 'L_th',
  dimension: 'length',
  statement:
    'Path that an emitted atom flies until it is as slow as the gas; a path flown, not a distance from the target.',
  source: 'Σ_k λ(E_0 e^(-k ξ)) over the collisions to thermalise; Westwood, J. Vac. Sci. Technol. 15, 1 (1978)',
  from: (reference, scope) =>
    emittedOr(
      reference,
      scope,
      (emitted) =>
        [
          { id: 'energy-decrement', of: reference.of ?? emitted.role },
          ...fastIngredients(reference, scope, emitted),
          'accuracy.fast-path',
        ] as const,
    ),
  value: (decrement, ...values) => {
    const [energy, mass, number, densities, diameters, depths, masses, charges, atoms, temperature, accuracy] = values;
    const way = thermalisationDistance(
      energy,
      decrement,
      mass,
      number,
      densities,
      diameters,
      depths,
      masses,
      charges,
      atoms,
      temperature,
    );
    return way > 0 ? accuracy * way : inapplicable('the atom leaves as slow as the gas');
  },
  remarks: pairRemarks,
});

export const thermalisationProduct = quantity<[pressure: number, distance: number]>({
  ...about,
  id: 'thermalisation-product',
  symbol: 'p L_th',
  dimension: 'pressure-length',
  statement: 'Pressure times thermalisation distance.',
  source: 'definition',
  from: (reference, scope) =>
    emittedOr(
      reference,
      scope,
      ({ role }) => [{ id: 'gas-pressure' }, { id: 'thermalisation-distance', of: reference.of ?? role }] as const,
    ),
  value: (pressure, distance) => pressure * distance,
});

export const thermalisationRatioOf = quantity<[distance: number, way: number]>({
  ...about,
  id: 'thermalisation-ratio',
  symbol: 'throw/L_th',
  dimension: 'number',
  statement:
    'Throw over thermalisation distance; a fifth to a third of the arriving atoms are thermal at 0.5, two thirds or more at 1, nearly all at 3.',
  source: 'throw/L_th; shares by own Monte Carlo, repeated in the tests, for mass ratios of 0.7 to 16',
  from: (reference, scope) =>
    emittedOr(
      reference,
      scope,
      (emitted) =>
        [
          scope.emitterAddress(emitted, 'throw'),
          { id: 'thermalisation-distance', of: reference.of ?? emitted.role },
        ] as const,
    ),
  value: thermalisationRatio,
});
