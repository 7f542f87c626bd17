import {
  diffusivity,
  diffusivityInMixture,
  mixtureThermalConductivity,
  mixtureViscosity,
  thermalConductivity,
  viscosity,
} from '../physics/transport.ts';
import { GAS_CONSTANT } from '../physics/constants.ts';
import { collisionPartners, pairName } from './collisions.ts';
import { heatCapacityIngredients, interpolatedHeatCapacity } from './heat-capacity.ts';
import { inapplicable, missing, quantity } from './quantity.ts';
import { gasOf, gasesOf } from './scope.ts';

/* What a gas carries: momentum, molecules, heat. */

export const viscosityOf = quantity<[mass: number, temperature: number, diameter: number]>({
  id: 'gas-viscosity',
  symbol: 'μ_i',
  dimension: 'viscosity',
  statement: 'Viscosity of one gas.',
  source: 'μ = (5/16) sqrt(π m k T)/(π d²), Chapman & Enskog, first order',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    return [`gases.${gas}.molar_mass`, { id: 'gas-temperature' }, { id: 'collision-diameter', of: pairName(gas, gas) }];
  },
  value: viscosity,
});

export const mixtureViscosityOf = quantity<
  [fractions: readonly number[], viscosities: readonly number[], masses: readonly number[]]
>({
  id: 'viscosity',
  symbol: 'μ',
  dimension: 'viscosity',
  statement: 'Viscosity, of the mixture or of one of its gases.',
  source: 'Σ x_i μ_i/Σ_j x_j φ_ij, Wilke, J. Chem. Phys. 18, 517 (1950); of one gas Chapman & Enskog',
  subjects: gasesOf,
  whole: true,
  from: (reference, scope) => {
    if (reference.of !== undefined) return { id: 'gas-viscosity', of: reference.of };
    const gases = collisionPartners(scope);
    if (gases.length < scope.gases.length) return missing(...withoutCollision(gases, scope.gases));
    return [
      gases.map((of) => ({ id: 'mole-fraction', of })),
      gases.map((of) => ({ id: 'gas-viscosity', of })),
      gases.map((gas) => `gases.${gas}.molar_mass`),
    ];
  },
  value: mixtureViscosity,
});

export const pairDiffusivity = quantity<
  [massA: number, massB: number, temperature: number, pressure: number, crossSection: number]
>({
  id: 'pair-diffusivity',
  symbol: 'D_ij',
  dimension: 'diffusivity',
  statement: 'Diffusivity of a pair of gases.',
  source: 'D = (3/16) sqrt(2π (k T)³/m_r)/(p Q), Chapman & Enskog, first order',
  subjects: (scope) => collisionPartners(scope).flatMap((a, i, all) => all.slice(i).map((b) => pairName(a, b))),
  from: ({ of = '' }) => {
    const [a = '', b = ''] = of.split('/');
    return [
      `gases.${a}.molar_mass`,
      `gases.${b}.molar_mass`,
      { id: 'gas-temperature' },
      { id: 'gas-pressure' },
      { id: 'diffusion-cross-section', of: pairName(a, b) },
    ];
  },
  value: diffusivity,
});

export const diffusivityOf = quantity<
  [own: number, others: readonly number[], diffusivities: readonly number[], self: number]
>({
  id: 'diffusivity',
  symbol: 'D',
  dimension: 'diffusivity',
  statement:
    'Diffusivity of a gas in the mixture, or of a pair, as in diffusivity:SiH4/N2; of a pure gas its self-diffusion.',
  source: '(1 - x_i)/Σ_j x_j/D_ij, Wilke 1950 and Fairbanks & Wilke 1950; for a trace Blanc 1908',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    if (gas.includes('/')) return { id: 'pair-diffusivity', of: gas };
    const partners = collisionPartners(scope);
    if (!partners.includes(gas) || partners.length < scope.gases.length) {
      return missing(...withoutCollision(partners, scope.gases));
    }
    const others = partners.filter((partner) => partner !== gas);
    const self = { id: 'pair-diffusivity', of: pairName(gas, gas) };
    if (others.length === 0) return self;
    return [
      { id: 'mole-fraction', of: gas },
      others.map((of) => ({ id: 'mole-fraction', of })),
      others.map((other) => ({ id: 'pair-diffusivity', of: pairName(gas, other) })),
      self,
    ];
  },
  value: (own, others, diffusivities, self) => (own >= 1 ? self : diffusivityInMixture(own, others, diffusivities)),
});

export const heatCapacity = quantity<[temperature: number, temperatures: readonly number[], values: readonly number[]]>(
  {
    id: 'heat-capacity',
    symbol: 'C_p',
    dimension: 'heat-capacity',
    statement: 'Molar heat capacity of a gas at constant pressure.',
    source: 'interpolated between the published values of the gas',
    subjects: gasesOf,
    from: (reference, scope) => heatCapacityIngredients(gasOf(reference, scope), scope),
    value: (temperature, temperatures, values) =>
      interpolatedHeatCapacity(temperature, temperatures, values) ??
      inapplicable('the temperature lies outside the published heat capacities'),
  },
);

export const gasConductivity = quantity<[mass: number, viscosity: number, heatCapacity: number]>({
  id: 'gas-conductivity',
  symbol: 'κ_i',
  dimension: 'thermal-conductivity',
  statement: 'Thermal conductivity of one gas.',
  source: 'κ M/(μ C_v) = 1.32 + 1.77 R/C_v, modified Eucken, Poling, Prausnitz & O’Connell 2001 ch. 10',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    return [`gases.${gas}.molar_mass`, { id: 'gas-viscosity', of: gas }, { id: 'heat-capacity', of: gas }];
  },
  value: (mass, viscosityOfGas, heatCapacityAtConstantPressure) =>
    thermalConductivity(mass, viscosityOfGas, heatCapacityAtConstantPressure - GAS_CONSTANT),
});

export const thermalConductivityOf = quantity<
  [
    fractions: readonly number[],
    conductivities: readonly number[],
    viscosities: readonly number[],
    masses: readonly number[],
  ]
>({
  id: 'thermal-conductivity',
  symbol: 'κ',
  dimension: 'thermal-conductivity',
  statement: 'Thermal conductivity, of the mixture or of one of its gases.',
  source: 'Σ x_i κ_i/Σ_j x_j φ_ij, Wassiljewa 1904 with the coefficients of Wilke 1950; of one gas modified Eucken',
  subjects: gasesOf,
  whole: true,
  from: (reference, scope) => {
    if (reference.of !== undefined) return { id: 'gas-conductivity', of: reference.of };
    const { gases } = scope;
    return [
      gases.map((of) => ({ id: 'mole-fraction', of })),
      gases.map((of) => ({ id: 'gas-conductivity', of })),
      gases.map((of) => ({ id: 'gas-viscosity', of })),
      gases.map((gas) => `gases.${gas}.molar_mass`),
    ];
  },
  value: mixtureThermalConductivity,
});

function withoutCollision(known: readonly string[], all: readonly string[]): readonly string[] {
  return all.filter((gas) => !known.includes(gas)).map((gas) => `gases.${gas}.collision`);
}
