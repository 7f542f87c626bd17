import {
  bulkVelocity,
  leakRate,
  peclet,
  RAYLEIGH_CONTRAST,
  rayleigh,
  residenceTime,
  reynolds,
  turnovers,
} from '../physics/flow.ts';
import { inapplicable, quantity, type Ingredient } from './quantity.ts';
import { gasOf, gasesOf, type Scope } from './scope.ts';

/* Gas through the chamber: volume, residence, speeds, and the numbers that tell how it moves. */

export const volume = quantity<[diameter: number, height: number]>({
  id: 'volume',
  symbol: 'V',
  dimension: 'volume',
  statement: 'Gas volume of the chamber: stated, or that of a cylinder.',
  source: 'definition',
  from: (_, scope) => (scope.states('body.volume') ? 'body.volume' : cylinder(scope)),
  value: (diameter, height) => (Math.PI * diameter ** 2 * height) / 4,
});

export const wallArea = quantity<[diameter: number, height: number]>({
  id: 'wall-area',
  symbol: 'A_w',
  dimension: 'area',
  statement: 'Inner surface of the chamber: stated, or that of a cylinder.',
  source: 'definition',
  from: (_, scope) => (scope.states('body.wall_area') ? 'body.wall_area' : cylinder(scope)),
  value: (diameter, height) => Math.PI * diameter * (height + diameter / 2),
});

function cylinder(scope: Scope): [Ingredient, Ingredient] {
  return [
    'body.diameter',
    scope.has('body.height') ? 'body.height' : scope.has('body.length') ? 'body.length' : 'body.height',
  ];
}

export const residenceTimeOf = quantity<[pressure: number, volume: number, temperature: number, flow: number]>({
  id: 'residence-time',
  symbol: 'τ',
  dimension: 'time',
  statement: 'Mean stay of a molecule in the chamber; residence-time.plasma in the volume between electrode and wafer.',
  source: 'τ = p V/(k T F), well mixed',
  lengths: () => ['plasma'],
  from: ({ length }, scope) => {
    if (!scope.fed) return inapplicable('no gas flows');
    const swept: Ingredient = { id: length === 'plasma' ? 'plasma-volume' : 'volume' };
    return [{ id: 'gas-pressure' }, swept, { id: 'gas-temperature' }, { id: 'flow-rate' }];
  },
  value: (pressure, swept, temperature, flow) =>
    flow > 0 ? residenceTime(pressure, swept, temperature, flow) : inapplicable('no gas flows'),
});

export const plasmaVolume = quantity<[diameter: number, gap: number]>({
  id: 'plasma-volume',
  symbol: 'V_pl',
  dimension: 'volume',
  statement: 'Volume between the electrode and the wafer.',
  source: 'electrode area times gap',
  from: () => ['chamber.electrode.diameter', { id: 'length', length: 'gap' }],
  value: (diameter, gap) => (Math.PI * diameter ** 2 * gap) / 4,
});

export const turnoversOf = quantity<[time: number, residence: number]>({
  id: 'turnovers',
  symbol: 't/τ',
  dimension: 'number',
  statement: 'How often the gas of the chamber is replaced during the step.',
  source: 't/τ',
  from: () => ['time', { id: 'residence-time' }],
  value: turnovers,
});

export const volumeFlow = quantity<[volume: number, residence: number]>({
  id: 'volume-flow',
  symbol: 'V/τ',
  dimension: 'speed',
  statement: 'Volume of gas that leaves the chamber in a second, at the gas temperature.',
  source: 'definition',
  from: () => [{ id: 'volume' }, { id: 'residence-time' }],
  value: (swept, residence) => swept / residence,
});

export const flowArea = quantity<[diameter: number, wafer: number, gap: readonly number[]]>({
  id: 'flow-area',
  symbol: 'A',
  dimension: 'area',
  statement:
    'Area normal to the flow: of a tube less the wafers’ disc; of radial flow the rim of the wafer times the gap.',
  source: 'π (D² - d²)/4, or π d × gap, by the chamber’s body.flow',
  from: (_, scope) => {
    switch (scope.setup.flow) {
      case 'axial':
        return ['body.diameter', 'wafer.diameter', []];
      case 'radial':
        return ['wafer.diameter', 'wafer.diameter', [{ id: 'length', length: 'gap' }]];
      case 'mixed':
        return inapplicable('the flow of a well-mixed chamber has no direction');
    }
  },
  value: (diameter, wafer, [gap]) =>
    gap === undefined ? (Math.PI * (diameter ** 2 - wafer ** 2)) / 4 : Math.PI * diameter * gap,
});

export const flowLength = quantity<[diameter: number, wafer: number]>({
  id: 'flow-length',
  symbol: 'L_flow',
  dimension: 'length',
  statement: 'Length across the flow: of a tube its diameter less the wafer’s; of radial flow the gap.',
  source: 'geometry of the chamber’s body.flow',
  from: (_, scope) => {
    switch (scope.setup.flow) {
      case 'axial':
        return ['body.diameter', 'wafer.diameter'];
      case 'radial':
        return { id: 'length', length: 'gap' };
      case 'mixed':
        return inapplicable('the flow of a well-mixed chamber has no direction');
    }
  },
  value: (diameter, wafer) => diameter - wafer,
});

export const bulkVelocityOf = quantity<[flow: number, temperature: number, pressure: number, area: number]>({
  id: 'bulk-velocity',
  symbol: 'u',
  dimension: 'velocity',
  statement: 'Velocity of the gas as a whole.',
  source: 'u = F k T/(p A)',
  from: () => [{ id: 'flow-rate' }, { id: 'gas-temperature' }, { id: 'gas-pressure' }, { id: 'flow-area' }],
  value: bulkVelocity,
});

export const reynoldsOf = quantity<[density: number, velocity: number, length: number, viscosity: number]>({
  id: 'reynolds',
  symbol: 'Re',
  dimension: 'number',
  statement: 'Reynolds number: inertia over viscous drag.',
  source: 'Re = ρ u L/μ',
  from: () => [{ id: 'mass-density' }, { id: 'bulk-velocity' }, { id: 'flow-length' }, { id: 'viscosity' }],
  value: reynolds,
});

export const pecletOf = quantity<[velocity: number, length: number, diffusivity: number]>({
  id: 'peclet',
  symbol: 'Pe',
  dimension: 'number',
  statement: 'Péclet number of a gas: flow over diffusion.',
  source: 'Pe = u L/D',
  lengths: (scope) => scope.addresses('lengths.').map((address) => address.slice('lengths.'.length)),
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = gasOf(reference, scope) ?? 'reactant';
    const length: Ingredient =
      reference.length === undefined ? { id: 'flow-length' } : { id: 'length', length: reference.length };
    return [{ id: 'bulk-velocity' }, length, { id: 'diffusivity', of }];
  },
  value: peclet,
});

type RayleighArguments = [
  hot: number,
  cold: number,
  gap: number,
  density: number,
  heatCapacities: readonly number[],
  fractions: readonly number[],
  molarMass: number,
  viscosity: number,
  conductivity: number,
];

export const rayleighOf = quantity<RayleighArguments>({
  id: 'rayleigh',
  symbol: 'Ra',
  dimension: 'number',
  statement:
    'Rayleigh number of the gap between wafer and wall: buoyancy over what damps it. Onset at 1708 where the hot face lies below.',
  source: 'Ra = g ΔT L³ ρ² c_p/(T μ κ); onset Chandrasekhar 1961',
  from: (_, { gases }) => [
    'temperatures.wafer',
    'temperatures.wall',
    { id: 'length', length: 'gap' },
    { id: 'mass-density' },
    gases.map((of) => ({ id: 'heat-capacity', of })),
    gases.map((of) => ({ id: 'mole-fraction', of })),
    { id: 'molar-mass' },
    { id: 'viscosity' },
    { id: 'thermal-conductivity' },
  ],
  value: (hot, cold, gap, density, heatCapacities, fractions, molarMass, viscosity, conductivity) => {
    const molar = heatCapacities.reduce((sum, one, index) => sum + one * (fractions[index] ?? NaN), 0);
    const film = (hot + cold) / 2;
    return rayleigh(Math.abs(hot - cold), gap, density, molar / molarMass, film, viscosity, conductivity);
  },
  remarks: (_, __, [hot, cold]) =>
    Math.abs(hot - cold) > RAYLEIGH_CONTRAST * ((hot + cold) / 2)
      ? ['the temperature difference exceeds 0.3 of the mean: the number is good to 30 %']
      : [],
});

export const leakRateOf = quantity<[volume: number, rate: number, temperature: number]>({
  id: 'leak-rate',
  symbol: 'F_leak',
  dimension: 'flow',
  statement: 'Molecules that leak in or come off the walls, from the leak-up rate.',
  source: 'V (dp/dt)/(k T_wall), rate-of-rise test',
  from: () => [{ id: 'volume' }, 'chamber.pump.leak_up_rate', 'temperatures.wall'],
  value: leakRate,
});

export const powerDensity = quantity<[powers: readonly number[], area: number]>({
  id: 'power-density',
  symbol: 'P/A',
  dimension: 'power-density',
  statement: 'Power of the generators over the electrode’s area, else the wafer’s.',
  source: 'definition',
  from: (_, scope) => {
    const { powered } = scope.setup;
    if (powered.length === 0) return inapplicable('no generator delivers power');
    return [powered.map((generator) => `power.${generator}`), { id: 'electrode-area' }];
  },
  value: (powers, area) => powers.reduce((sum, power) => sum + power, 0) / area,
});

export const flowPerArea = quantity<[flow: number, area: number]>({
  id: 'flow-per-area',
  symbol: 'F/A',
  dimension: 'flux',
  statement: 'Flow over the electrode’s area, else the wafer’s.',
  source: 'definition',
  from: () => [{ id: 'flow-rate' }, { id: 'electrode-area' }],
  value: (flow, area) => flow / area,
});

export const electrodeArea = quantity<[diameter: number]>({
  id: 'electrode-area',
  symbol: 'A_el',
  dimension: 'area',
  statement: 'Area of the electrode, else of the wafer.',
  source: 'definition',
  from: (_, scope) => (scope.has('chamber.electrode.diameter') ? ['chamber.electrode.diameter'] : { id: 'wafer-area' }),
  value: (diameter) => (Math.PI * diameter ** 2) / 4,
});

export const waferArea = quantity<[width: number, height: readonly number[]]>({
  id: 'wafer-area',
  symbol: 'A_wafer',
  dimension: 'area',
  statement: 'Area of one face of a wafer or panel.',
  source: 'definition',
  from: (_, scope) => {
    if (scope.setup.wafer === 'none') return inapplicable('no wafer is in the chamber');
    return scope.setup.wafer === 'panel' ? ['wafer.width', ['wafer.length']] : ['wafer.diameter', []];
  },
  value: (width, [height]) => (height === undefined ? (Math.PI * width ** 2) / 4 : width * height),
});
