import { massDensity, meanSpeed, mixtureMolarMass, numberDensity } from '../physics/state.ts';
import { inapplicable, missing, quantity, type Ingredient } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import { gasOf, gasesOf, type Scope } from './scope.ts';

/* State of the gas in a step: pressure, temperature, composition, and what follows from them. */

export const gasPressure = quantity<[]>({
  id: 'gas-pressure',
  symbol: 'p',
  dimension: 'pressure',
  statement:
    'Pressure of the gas: the setpoint, the fill pressure, what the open pump leaves, or the base pressure where nothing flows.',
  source: 'definition',
  from: (_, scope) => pressureOf(scope),
  value: () => NaN,
});

function pressureOf(scope: Scope): Ingredient | Missing | Inapplicable {
  if (scope.isUnknown('pressure')) return missing('pressure');
  if (scope.has('pressure')) return 'pressure';
  if (scope.states('fill_to')) return 'fill_to';
  if (scope.setup.throttle === 'closed') return inapplicable('the pressure rises while the throttle is closed');
  if (scope.fed) return scope.setup.throttle === 'open' ? { id: 'open-pressure' } : missing('pressure');
  return scope.has('chamber.pump.base_pressure') ? 'chamber.pump.base_pressure' : missing('pressure');
}

export const gasTemperature = quantity<[]>({
  id: 'gas-temperature',
  symbol: 'T_gas',
  dimension: 'temperature',
  statement: 'Temperature of the gas: given, or by the rule for a chamber of its kind.',
  source:
    'rule: hot-wall tube, sputter and evaporation the wall; plasma the wall plus 0 to 300 K; heated wafer the middle (common practice)',
  from: (_, scope) => temperatureOf(scope),
  value: () => NaN,
});

function temperatureOf(scope: Scope): Ingredient | Missing {
  const { setup } = scope;
  if (scope.isUnknown('temperatures.gas')) return missing('temperatures.gas');
  if (scope.has('temperatures.gas')) return 'temperatures.gas';
  if (!scope.has('temperatures.wall')) return missing('temperatures.gas', 'temperatures.wall');
  if (setup.flow === 'axial' || setup.target !== undefined || setup.melt !== undefined) return 'temperatures.wall';
  // A wafer that may be hot leaves open what gas it warms.
  if (scope.isUnknown('temperatures.wafer')) return missing('temperatures.gas', 'temperatures.wafer');
  if (scope.has('temperatures.wafer') && !scope.powered) return { id: 'between-temperature' };
  return scope.powered ? { id: 'plasma-gas-temperature' } : 'temperatures.wall';
}

export const betweenTemperature = quantity<[wall: number, wafer: number, share: number]>({
  id: 'between-temperature',
  symbol: 'T_mid',
  dimension: 'temperature',
  statement: 'Temperature between wall and wafer.',
  source: 'the middle of both, either end possible (common practice)',
  from: () => ['temperatures.wall', 'temperatures.wafer', 'assumed.gas-between'],
  value: (wall, wafer, share) => wall + share * (wafer - wall),
});

/** From this difference on the wafer counts as heated, and its heat rules over that of the plasma. */
const HEATED_WAFER = 100;

export const plasmaGasTemperature = quantity<
  [wall: number, wafer: readonly number[], between: number, heating: number]
>({
  id: 'plasma-gas-temperature',
  symbol: 'T_pl',
  dimension: 'temperature',
  statement:
    'Temperature of the gas of a plasma: the wall and what the plasma adds, or the middle to a wafer that is more than 100 K hotter.',
  source: 'wall plus 0 to 300 K; cold wall and heated wafer: the middle of both (common practice)',
  from: (_, scope) => [
    'temperatures.wall',
    scope.has('temperatures.wafer') ? ['temperatures.wafer'] : [],
    'assumed.gas-between',
    'assumed.gas-heating',
  ],
  value: (wall, [wafer = wall], between, heating) =>
    wafer > wall + HEATED_WAFER ? wall + between * (wafer - wall) : wall + heating,
});

export const flowRate = quantity<[pure: readonly number[], mixed: readonly number[], shares: readonly number[]]>({
  id: 'flow-rate',
  symbol: 'F',
  dimension: 'flow',
  statement: 'Molecules that flow in, of all gases or of one.',
  source: 'SEMI E12: standard cubic centimetres count at 0 degC and 101325 Pa',
  subjects: gasesOf,
  whole: true,
  from: ({ of }, { setup }) => {
    if (of === undefined) return [setup.lines.map(({ name }) => `flows.${name}`), [], []];
    const lines = setup.lines.flatMap(({ name, brings }) =>
      brings.filter(({ gas }) => gas === of).map(({ share }) => ({ flow: `flows.${name}`, share })),
    );
    const pure = lines.filter(({ share }) => share === undefined);
    const mixed = lines.flatMap(({ flow, share }) => (share === undefined ? [] : [{ flow, share }]));
    return [pure.map(({ flow }) => flow), mixed.map(({ flow }) => flow), mixed.map(({ share }) => share)];
  },
  value: (pure, mixed, shares) => {
    let sum = 0;
    for (const flow of pure) sum += flow;
    for (const [index, flow] of mixed.entries()) sum += flow * (shares[index] ?? NaN);
    return sum;
  },
});

export const moleFraction = quantity<[flow: number, total: number]>({
  id: 'mole-fraction',
  symbol: 'x',
  dimension: 'fraction',
  statement:
    'Share of a gas among the molecules: of the stated composition, else of the feed, else of the residual gas.',
  source: 'definition; a well-mixed chamber without reactions has the composition of its feed',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    if (!scope.gases.includes(gas)) return inapplicable(`the step has no ${gas}`);
    if (scope.setup.composition) return `composition.${gas}`;
    if (scope.fed) return [{ id: 'flow-rate', of: gas }, { id: 'flow-rate' }];
    return scope.setup.residual.length > 0 ? `chamber.pump.residual.${gas}` : 'assumed.residual.H2O';
  },
  value: (flow, total) => (total > 0 ? flow / total : inapplicable('no gas flows')),
});

export const partialPressure = quantity<[fraction: number, pressure: number]>({
  id: 'partial-pressure',
  symbol: 'p_i',
  dimension: 'pressure',
  statement: 'Share of a gas in the pressure.',
  source: "Dalton's law",
  subjects: gasesOf,
  from: (reference, scope) => [
    { id: 'mole-fraction', of: gasOf(reference, scope) ?? 'reactant' },
    { id: 'gas-pressure' },
  ],
  value: (fraction, pressure) => fraction * pressure,
});

export const flowRatio = quantity<[dividend: number, divisor: number]>({
  id: 'flow-ratio',
  symbol: 'F_a/F_b',
  dimension: 'number',
  statement: 'Flow of one gas over that of another, as in flow-ratio:O2/Ar.',
  source: 'definition',
  subjects: (scope) => scope.fedGases.flatMap((a) => scope.fedGases.filter((b) => a !== b).map((b) => `${a}/${b}`)),
  from: ({ of = '' }, scope) => {
    const [a = '', b = ''] = of.split('/');
    const absent = [a, b].filter((gas) => !scope.fedGases.includes(gas));
    // A gas that does not flow beside one that does has the ratio zero.
    if (absent.includes(b) || scope.gas(a) === undefined)
      return inapplicable(`the step has no flow of ${absent.join(' or ')}`);
    return [
      { id: 'flow-rate', of: a },
      { id: 'flow-rate', of: b },
    ];
  },
  value: (dividend, divisor) =>
    divisor > 0 ? dividend / divisor : inapplicable('the gas it is divided by does not flow'),
});

export const numberDensityOf = quantity<[pressure: number, temperature: number]>({
  id: 'number-density',
  symbol: 'n',
  dimension: 'number-density',
  statement: 'Molecules per volume.',
  source: 'ideal gas, n = p/(k T)',
  from: ({ length }) => [{ id: 'gas-pressure' }, temperatureAt(length)],
  value: numberDensity,
  remarks: (_, __, [pressure]) => (pressure > MOST_IDEAL ? ['above 10 bar a gas is no longer ideal'] : []),
});

/** Pa. */
const MOST_IDEAL = 1e6;

export const molarMass = quantity<[fractions: readonly number[], masses: readonly number[]]>({
  id: 'molar-mass',
  symbol: 'M',
  dimension: 'molar-mass',
  statement: 'Mean molar mass of the mixture.',
  source: 'definition, M = Σ x_i M_i',
  from: (_, scope) => [
    scope.gases.map((of) => ({ id: 'mole-fraction', of })),
    scope.gases.map((gas) => `gases.${gas}.molar_mass`),
  ],
  value: mixtureMolarMass,
});

export const massDensityOf = quantity<[pressure: number, molarMass: number, temperature: number]>({
  id: 'mass-density',
  symbol: 'ρ',
  dimension: 'density',
  statement: 'Mass per volume.',
  source: 'ideal gas, ρ = p M/(R T)',
  from: () => [{ id: 'gas-pressure' }, { id: 'molar-mass' }, { id: 'gas-temperature' }],
  value: massDensity,
});

export const meanSpeedOf = quantity<[molarMass: number, temperature: number]>({
  id: 'mean-speed',
  symbol: 'v',
  dimension: 'velocity',
  statement: 'Mean speed of the molecules of a gas.',
  source: 'Maxwell distribution, v = sqrt(8 k T/(π m))',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    return gas === undefined ? missing('reactant.gas') : [`gases.${gas}.molar_mass`, temperatureAt(reference.length)];
  },
  value: meanSpeed,
});

/** Temperature that counts at a place: inside a feature the wafer's, elsewhere the gas's. */
export function temperatureAt(place: string | undefined): Ingredient {
  return place === 'feature' ? 'temperatures.wafer' : { id: 'gas-temperature' };
}
