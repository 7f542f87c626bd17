import { diffusionCrossSection, thermalAtomPath } from '../physics/collisions.ts';
import {
  collisionsToThermalise,
  EMISSION_CUT_AT_LEAST,
  emissionCut,
  emissionEnergy,
  evaporationEnergy,
  fastFreePath,
  mixtureEnergyDecrement,
  slowingKnudsen,
  thermalisationDistance,
  thermalisationRatio,
  uncollidedFraction,
  uncollidedFractionCosine,
} from '../physics/sputtered-atoms.ts';
import { atomicNumber } from '../substances/elements.ts';
import { inapplicable, quantity, type Recipe } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Reference } from './reference.ts';
import type { Emitted, Scope } from './scope.ts';

/* Atoms that leave a sputter target or a melt, on their way through the gas. */

/** Ingredients for an emitted atom, or why there are none. */
function emittedOr<T>(reference: Reference, scope: Scope, then: (emitted: Emitted) => T): T | Missing | Inapplicable {
  const role = reference.of ?? (scope.setup.target === undefined && scope.setup.melt !== undefined ? 'melt' : 'target');
  const emitted = scope.emitted(role);
  if (emitted !== undefined) return then(emitted);
  return role.startsWith('melt') ? inapplicable('no melt runs') : inapplicable('no target runs');
}

function emittedSubjects(scope: Scope): readonly string[] {
  return [...scope.emittedSubjects('target'), ...scope.emittedSubjects('melt')];
}

const about = { subjects: emittedSubjects, whole: true } as const;

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
  from: (reference, scope) => emittedOr(reference, scope, (emitted) => [scope.emitterAddress(emitted, 'temperature')] as const),
  value: evaporationEnergy,
});

/** Energy, atom, for each gas of the mixture its density, pair values, mass, atomic number and atoms; gas temperature. */
type FastArguments = [
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

function fastIngredients(reference: Reference, scope: Scope, emitted: Emitted): Recipe<FastArguments> {
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
function pairFor(atom: string, gas: string, scope: Scope): string {
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

function pairRemarks(reference: Reference, scope: Scope): readonly string[] {
  const atom = scope.emitted(reference.of ?? 'target')?.atom ?? scope.emitted('melt')?.atom;
  if (atom === undefined) return [];
  return scope.gases
    .filter((gas) => pairFor(atom, gas, scope) !== gas)
    .map((gas) => `collision values of ${atom} with ${gas} are those with N2`);
}

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
  symbol: 'λ_fast',
  dimension: 'length',
  statement: 'Mean free path of an atom at the energy at which it leaves target or melt.',
  source: '1/Σ_j n_j Q_j g(s_j), Chapman & Cowling 1970; cross-sections Neufeld et al. 1972 to 0.1 eV, Ziegler, Biersack & Littmark 1985 beyond',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => [...fastIngredients(reference, scope, emitted), 'accuracy.fast-path'] as const),
  value: (...values) => {
    const [energy, mass, number, densities, diameters, depths, masses, charges, atoms, temperature, accuracy] = values;
    return accuracy * fastFreePath(energy, mass, number, densities, diameters, depths, masses, charges, atoms, temperature);
  },
  remarks: pairRemarks,
});

export const energyLoss = quantity<FastArguments>({
  ...about,
  id: 'energy-decrement',
  symbol: 'ξ',
  dimension: 'number',
  statement: 'Mean loss of ln E in a collision with the gas.',
  source: '1 + α ln α/(1 - α), α = ((m - M)/(m + M))², hard spheres, gas at rest; Westwood, J. Vac. Sci. Technol. 15, 1 (1978)',
  from: (reference, scope) => emittedOr(reference, scope, (emitted) => fastIngredients(reference, scope, emitted)),
  value: mixtureEnergyDecrement,
});

export const thermalPath = quantity<
  [mass: number, densities: readonly number[], diameters: readonly number[], depths: readonly number[], temperature: number, masses: readonly number[]]
>({
  ...about,
  id: 'thermal-atom-path',
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
    const sections = diameters.map((diameter, index) => diffusionCrossSection(diameter, depths[index] ?? NaN, 0, temperature));
    return thermalAtomPath(mass, densities, sections, masses);
  },
  remarks: pairRemarks,
});

export const emittedPath = quantity<[]>({
  ...about,
  id: 'emitted-free-path',
  symbol: 'λ_e',
  dimension: 'length',
  statement: 'Mean free path that counts over a throw: of a sputtered atom at its emission energy; of an evaporated atom at the melt’s, or thermal where the melt’s temperature is not given.',
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

export const toThermalise = quantity<[energy: number, temperature: number, decrement: number]>({
  ...about,
  id: 'collisions-to-thermalise',
  symbol: 'N_th',
  dimension: 'number',
  statement: 'Collisions after which an emitted atom is as slow as the gas; by the mean logarithm, up to 1.44 fewer than by the mean ratio.',
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
      return [{ id: 'fast-free-path', of }, { id: 'energy-decrement', of }, scope.emitterAddress(emitted, 'throw')] as const;
    }),
  value: slowingKnudsen,
});

export const thermalisation = quantity<[decrement: number, ...FastArguments, accuracy: number]>({
  ...about,
  id: 'thermalisation-distance',
  symbol: 'L_th',
  dimension: 'length',
  statement: 'Path that an emitted atom flies until it is as slow as the gas; a path flown, not a distance from the target.',
  source: 'Σ_k λ(E_0 e^(-k ξ)) over the collisions to thermalise; Westwood, J. Vac. Sci. Technol. 15, 1 (1978)',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => [
      { id: 'energy-decrement', of: reference.of ?? emitted.role },
      ...fastIngredients(reference, scope, emitted),
      'accuracy.fast-path',
    ] as const),
  value: (decrement, ...values) => {
    const [energy, mass, number, densities, diameters, depths, masses, charges, atoms, temperature, accuracy] = values;
    const way = thermalisationDistance(
      energy, decrement, mass, number, densities, diameters, depths, masses, charges, atoms, temperature,
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
    emittedOr(reference, scope, ({ role }) => [
      { id: 'gas-pressure' },
      { id: 'thermalisation-distance', of: reference.of ?? role },
    ] as const),
  value: (pressure, distance) => pressure * distance,
});

export const thermalisationRatioOf = quantity<[distance: number, way: number]>({
  ...about,
  id: 'thermalisation-ratio',
  symbol: 'throw/L_th',
  dimension: 'number',
  statement: 'Throw over thermalisation distance; a third of the arriving atoms are thermal at 0.5, two thirds at 1, nearly all at 3.',
  source: 'throw/L_th; shares by own Monte Carlo for mass ratios of 0.7 to 16',
  from: (reference, scope) =>
    emittedOr(reference, scope, (emitted) => [
      scope.emitterAddress(emitted, 'throw'),
      { id: 'thermalisation-distance', of: reference.of ?? emitted.role },
    ] as const),
  value: thermalisationRatio,
});
