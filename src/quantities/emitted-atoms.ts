import { diffusionCrossSection, thermalAtomPath } from '../physics/collisions.ts';
import {
  EMISSION_CUT_AT_LEAST,
  emissionCut,
  emissionEnergy,
  evaporationEnergy,
  fastFreePath,
  uncollidedFraction,
  uncollidedFractionCosine,
} from '../physics/sputtered-atoms.ts';
import { about, emittedOr, fastIngredients, pairFor, pairRemarks, type FastArguments } from './emitted.ts';
import { quantity, type Recipe } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Reference } from './reference.ts';
import type { Scope } from './scope.ts';

/* Atoms that leave a sputter target or a melt, on their way through the gas. */

type EmissionArguments = [
  enthalpy: number,
  spread: number,
  voltage: readonly number[],
  atomMass: number,
  ionMasses: readonly number[],
];

export const emissionEnergyOf = quantity<EmissionArguments>({
  ...about,
  id: 'emission-energy',
  symbol: 'E_0',
  dimension: 'energy',
  statement: 'Energy at which an atom leaves the target or melt.',
  source: 'given; else e U, log-mean of Thompson’s spectrum (Phil. Mag. 18, 377 (1968)); of a melt 2 k T',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => {
      if (emitted.role === 'melt') return { id: 'melt-energy', of: reference.of ?? 'melt' };
      const stated = scope.emitterAddress(emitted, 'energy');
      if (scope.states(stated)) return stated;
      const voltage = scope.emitterAddress(emitted, 'voltage');
      return [
        `atoms.${emitted.atom}.sublimation_enthalpy`,
        'assumed.emission-spread',
        scope.has(voltage) ? [voltage] : [],
        `atoms.${emitted.atom}.molar_mass`,
        scope.gases.map((gas) => `gases.${gas}.molar_mass`),
      ] as const;
    }),
  value: (enthalpy, spread) => emissionEnergy(enthalpy) * Math.exp(spread),
  remarks: (_, __, [enthalpy, , [voltage], atomMass, ionMasses]) => {
    if (voltage === undefined) return [];
    const cut = Math.max(...ionMasses.map((ionMass) => emissionCut(ionMass, atomMass, voltage, enthalpy)));
    if (cut > EMISSION_CUT_AT_LEAST * enthalpy) return [];
    return ['the target voltage cuts the spectrum of energies short: atoms leave with less than assumed'];
  },
});

export const meltEnergy = quantity<[temperature: number]>({
  id: 'melt-energy',
  symbol: 'E_melt',
  dimension: 'energy',
  statement: 'Mean energy of the atoms that leave a melt.',
  source: '2 k T, effusion (kinetic theory)',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => [scope.emitterAddress(emitted, 'temperature')] as const),
  value: evaporationEnergy,
});

export const gasDensity = quantity<[fraction: number, density: number]>({
  id: 'gas-density',
  symbol: 'n_i',
  dimension: 'number-density',
  statement: 'Molecules of one gas per volume.',
  source: "Dalton's law",
  subjects: ({ gases }) => gases,
  from: ({ of = '' }) => [{ id: 'mole-fraction', of }, { id: 'number-density' }],
  value: (fraction, density) => fraction * density,
});

export const fastPath = quantity<[...FastArguments, accuracy: number]>({
  ...about,
  id: 'fast-free-path',
  worst: 'smallest',
  symbol: 'λ_fast',
  dimension: 'length',
  statement: 'Mean free path of an atom at the energy at which it leaves target or melt.',
  source:
    '1/Σ_j n_j Q_j g(s_j), Chapman & Cowling 1970; cross-sections Neufeld et al. 1972 to 0.1 eV, Ziegler, Biersack & Littmark 1985 beyond',
  from: (reference, scope) =>
    emittedOr(
      reference,
      scope,
      (emitted) => [...fastIngredients(reference, scope, emitted), 'accuracy.fast-path'] as const,
    ),
  value: (...values) => {
    const [energy, mass, number, densities, diameters, depths, masses, charges, atoms, temperature, accuracy] = values;
    return (
      accuracy * fastFreePath(energy, mass, number, densities, diameters, depths, masses, charges, atoms, temperature)
    );
  },
  remarks: pairRemarks,
});

export const thermalPath = quantity<
  [
    mass: number,
    densities: readonly number[],
    diameters: readonly number[],
    depths: readonly number[],
    temperature: number,
    masses: readonly number[],
  ]
>({
  ...about,
  id: 'thermal-atom-path',
  worst: 'smallest',
  symbol: 'λ_th',
  dimension: 'length',
  statement: 'Mean free path of an atom of target or melt once it is as warm as the gas.',
  source: '1/Σ_j n_j Q_j sqrt(1 + m/M_j), Q = π σ² Ω(1,1)* of the pair, Chapman & Cowling 1970',
  from: (reference, scope) =>
    emittedOr(reference, scope, ({ atom }) => {
      const pairs = scope.gases.map((gas) => `atoms.${atom}.pairs.${pairFor(atom, gas, scope)}`);
      return [
        `atoms.${atom}.molar_mass`,
        scope.gases.map((of) => ({ id: 'gas-density', of })),
        pairs.map((pair) => `${pair}.diameter`),
        pairs.map((pair) => `${pair}.well_depth`),
        { id: 'gas-temperature' },
        scope.gases.map((gas) => `gases.${gas}.molar_mass`),
      ] as const;
    }),
  value: (mass, densities, diameters, depths, temperature, masses) => {
    const sections = diameters.map((diameter, index) =>
      diffusionCrossSection(diameter, depths[index] ?? NaN, 0, temperature),
    );
    return thermalAtomPath(mass, densities, sections, masses);
  },
  remarks: pairRemarks,
});

export const emittedPath = quantity<[]>({
  ...about,
  id: 'emitted-free-path',
  worst: 'smallest',
  symbol: 'λ_e',
  dimension: 'length',
  statement:
    'Mean free path that counts over a throw: of a sputtered atom at its emission energy; of an evaporated atom at the melt’s, or thermal where the melt’s temperature is not given.',
  source: 'fast-free-path, thermal-atom-path',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => {
      const of = reference.of ?? emitted.role;
      const cold = emitted.role === 'melt' && !scope.states(scope.emitterAddress(emitted, 'temperature'));
      return { id: cold ? 'thermal-atom-path' : 'fast-free-path', of } as const;
    }),
  value: () => NaN,
});

export const uncollided = quantity<[distance: number, path: number]>({
  ...about,
  id: 'uncollided-fraction',
  worst: 'smallest',
  symbol: 'f_0',
  dimension: 'fraction',
  statement: 'Share of the emitted atoms that cross the throw along the normal without a collision.',
  source: 'exp(-d/λ)',
  from: (reference, scope) => throwAndPath(reference, scope),
  value: uncollidedFraction,
});

export const uncollidedCosine = quantity<[distance: number, path: number]>({
  ...about,
  id: 'uncollided-fraction-cosine',
  worst: 'smallest',
  symbol: 'f_cos',
  dimension: 'fraction',
  statement: 'Share of the emitted atoms that cross the throw without a collision, leaving with a cosine distribution.',
  source: '2 E_3(d/λ)',
  from: (reference, scope) => throwAndPath(reference, scope),
  value: uncollidedFractionCosine,
});

function throwAndPath(reference: Reference, scope: Scope): Recipe<[number, number]> | Missing | Inapplicable {
  return emittedOr(reference, scope, (emitted): Recipe<[number, number]> => [
    scope.emitterAddress(emitted, 'throw'),
    { id: 'emitted-free-path', of: reference.of ?? emitted.role },
  ]);
}
