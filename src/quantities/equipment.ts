import { plenumPressure } from '../physics/conductance.ts';
import { GAS_CONSTANT } from '../physics/constants.ts';
import { pumpingSpeed } from '../physics/flow.ts';
import { vapourPressure } from '../physics/vapour.ts';
import { inapplicable, missing, quantity } from './quantity.ts';
import { gasOf, gasesOf, type Scope } from './scope.ts';

/* What the chamber's equipment is asked to do. */

export const setpoint = quantity<[]>({
  id: 'setpoint',
  symbol: '=',
  dimension: 'number',
  statement: 'A setpoint itself, as in setpoint:pressure.',
  source: 'the recipe',
  subjects: (scope) => scope.addresses('').filter((address) => !address.startsWith('chamber.')),
  from: ({ of = '' }, scope) => {
    const address = ownAddress(of, scope);
    return scope.states(address) ? address : inapplicable(`the step sets no ${of}`);
  },
  value: () => NaN,
});

/** `targets.throw` is that of the target that runs. */
function ownAddress(address: string, scope: Scope): string {
  const [family, key = '', more] = address.split('.');
  if (more !== undefined || (family !== 'targets' && family !== 'melts')) return address;
  const emitted = scope.emitted(family === 'targets' ? 'target' : 'melt');
  return emitted === undefined ? address : scope.emitterAddress(emitted, key);
}

export const lineShare = quantity<[flow: number, fullScale: number]>({
  id: 'line-share',
  symbol: 'F/F_full',
  dimension: 'fraction',
  statement: 'Flow of a gas line over its full scale, as in line-share:Ar.',
  source: 'definition',
  nominal: true,
  subjects: ({ setup }) => setup.lines.map(({ name }) => name),
  from: ({ of = '' }, scope) => {
    if (!scope.setup.lines.some(({ name }) => name === of)) return inapplicable(`the step does not use the line ${of}`);
    const fullScale = `chamber.gas_lines.${of}.full_scale`;
    return scope.has(fullScale) ? [`flows.${of}`, fullScale] : inapplicable(`the line ${of} has no controller`);
  },
  value: (flow, fullScale) => (flow > 0 ? flow / fullScale : inapplicable('the line is at zero')),
});

type GaugeArguments = [pressure: number, fullScales: readonly number[]];

export const gaugeShare = quantity<GaugeArguments>({
  id: 'gauge-share',
  symbol: 'p/p_full',
  dimension: 'fraction',
  statement: 'Pressure over the full scale of the gauge that reads it: the finest that still holds it.',
  source: 'definition',
  nominal: true,
  from: (_, scope) => {
    if (scope.setup.gauges.length === 0) return missing('chamber.gauges');
    return ['pressure', fullScales(scope)];
  },
  value: (pressure, scales) => pressure / gaugeFor(pressure, scales).fullScale,
});

export const gaugeFooting = quantity<[...GaugeArguments, floors: readonly number[]]>({
  id: 'gauge-footing',
  symbol: 'p/p_usable',
  dimension: 'number',
  statement: 'Pressure over the lowest that the gauge which reads it can be trusted with.',
  source: 'definition',
  nominal: true,
  from: (_, scope) => {
    const floors = scope.setup.gauges.map((gauge) => `chamber.gauges.${gauge}.usable_from`);
    if (!floors.some((floor) => scope.has(floor))) return missing('chamber.gauges.usable_from');
    return ['pressure', fullScales(scope), floors.map((floor) => (scope.has(floor) ? floor : NO_FLOOR))];
  },
  value: (pressure, scales, floors) => {
    const floor = floors[gaugeFor(pressure, scales).index] ?? NO_FLOOR;
    return floor > NO_FLOOR ? pressure / floor : inapplicable('the gauge that reads the pressure states no lowest');
  },
});

/** Of a gauge that states none. */
const NO_FLOOR = 0;

function fullScales(scope: Scope): readonly string[] {
  return scope.setup.gauges.map((gauge) => `chamber.gauges.${gauge}.full_scale`);
}

/** The finest gauge that still holds the pressure, else the widest. */
function gaugeFor(pressure: number, scales: readonly number[]): { fullScale: number; index: number } {
  let chosen = { fullScale: scales[0] ?? NaN, index: 0 };
  for (const [index, fullScale] of scales.entries()) {
    const holds = fullScale >= pressure;
    const finer = holds && (fullScale < chosen.fullScale || chosen.fullScale < pressure);
    const wider = !holds && chosen.fullScale < pressure && fullScale > chosen.fullScale;
    if (finer || wider) chosen = { fullScale, index };
  }
  return chosen;
}

export const basePressure = quantity<[]>({
  id: 'base-pressure',
  symbol: 'p_base',
  dimension: 'pressure',
  statement: 'Base pressure of the chamber.',
  source: 'stated by the chamber',
  from: () => 'chamber.pump.base_pressure',
  value: () => NaN,
});

export const baseLoad = quantity<[base: number, pressure: number]>({
  id: 'base-load',
  symbol: 'p_base/p',
  dimension: 'fraction',
  statement: 'Base pressure over the pressure of the step.',
  source: 'definition',
  from: (_, { fed }) => (fed ? [{ id: 'base-pressure' }, { id: 'gas-pressure' }] : inapplicable('no gas flows')),
  value: (base, pressure) => base / pressure,
});

export const leakLoad = quantity<[leak: number, flow: number]>({
  id: 'leak-load',
  symbol: 'F_leak/F',
  dimension: 'fraction',
  statement: 'Leak and outgassing over the flow of the step.',
  source: 'definition',
  from: (_, { fed }) => (fed ? [{ id: 'leak-rate' }, { id: 'flow-rate' }] : inapplicable('no gas flows')),
  value: (leak, flow) => (flow > 0 ? leak / flow : inapplicable('no gas flows')),
});

export const speedDrift = quantity<[now: number, flows: readonly number[], pressure: number, temperature: number]>({
  id: 'speed-drift',
  symbol: '|S/S_ref - 1|',
  dimension: 'fraction',
  statement: 'How far the pumping speed that this step shows is from that of the healthy chamber.',
  source: 'definition',
  from: (_, scope) => {
    const flows = scope.addresses('chamber.pump.reference.flows.');
    if (flows.length === 0) return missing('chamber.pump.reference');
    return [{ id: 'pumping-speed' }, flows, 'chamber.pump.reference.pressure', { id: 'pump-temperature' }];
  },
  value: (now, flows, pressure, temperature) => {
    const healthy = pumpingSpeed(
      flows.reduce((sum, flow) => sum + flow, 0),
      temperature,
      pressure,
    );
    return Math.abs(now / healthy - 1);
  },
});

type PlenumArguments = [
  flow: number,
  holes: number,
  pressure: number,
  temperature: number,
  diameter: number,
  thickness: number,
  molarMass: number,
  viscosity: number,
  heatCapacities: readonly number[],
  fractions: readonly number[],
];

export const plenumPressureOf = quantity<PlenumArguments>({
  id: 'plenum-pressure',
  symbol: 'p_up',
  dimension: 'pressure',
  statement: 'Pressure before the holes of an inlet.',
  source: 'F k T/N = C(p̄) (p_up - p), C of a hole by Knudsen 1909 with its entrance, not below the choked value',
  subjects: ({ setup }) => setup.inlets,
  from: ({ of = '' }, scope) => {
    const inlet = `chamber.inlets.${of}`;
    if (!scope.setup.inlets.includes(of)) return inapplicable(`the chamber has no inlet ${of} with holes`);
    if (!scope.fed) return inapplicable('no gas flows');
    if (scope.setup.throttle === 'closed') return inapplicable('the chamber fills behind a closed throttle');
    return [
      { id: 'flow-rate' },
      `${inlet}.holes`,
      { id: 'gas-pressure' },
      { id: 'gas-temperature' },
      `${inlet}.diameter`,
      `${inlet}.thickness`,
      { id: 'molar-mass' },
      { id: 'viscosity' },
      scope.gases.map((gas) => ({ id: 'heat-capacity', of: gas })),
      scope.gases.map((gas) => ({ id: 'mole-fraction', of: gas })),
    ];
  },
  value: (flow, holes, pressure, temperature, diameter, thickness, molarMass, viscosity, heatCapacities, fractions) => {
    const molar = heatCapacities.reduce((sum, one, index) => sum + one * (fractions[index] ?? NaN), 0);
    const ratio = molar / (molar - GAS_CONSTANT);
    return plenumPressure(flow / holes, pressure, temperature, diameter, thickness, molarMass, viscosity, ratio);
  },
});

export const plenumExcess = quantity<[plenum: number, pressure: number]>({
  id: 'plenum-excess',
  symbol: '(p_up - p)/p',
  dimension: 'number',
  statement: 'Excess of the plenum’s pressure over the chamber’s: an inlet feeds evenly where it is well above 0.1.',
  source: '(p_up - p)/p; common practice',
  subjects: ({ setup }) => setup.inlets,
  worst: 'smallest',
  from: ({ of = '' }) => [{ id: 'plenum-pressure', of }, { id: 'gas-pressure' }],
  value: (plenum, pressure) => (plenum - pressure) / pressure,
});

export const saturationPressure = quantity<[temperature: number, a: number, b: number, c: number]>({
  id: 'vapour-pressure',
  symbol: 'p_vap',
  dimension: 'pressure',
  statement: 'Vapour pressure of a condensable gas at the wall.',
  source: 'log10(p/Pa) = a - b/(T + c), Antoine 1888, with the published constants of the gas',
  subjects: condensable,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope) ?? '';
    if (scope.gas(gas)?.vapourPressure === undefined) return missing(`gases.${gas}.vapour_pressure`);
    const data = `gases.${gas}.vapour_pressure`;
    return ['temperatures.wall', `${data}.a`, `${data}.b`, `${data}.c`];
  },
  value: vapourPressure,
  remarks: (reference, scope, [temperature]) => {
    const range = scope.gas(gasOf(reference, scope) ?? '')?.vapourPressure;
    const outside = range !== undefined && (temperature < range.from || temperature > range.to);
    return outside ? ['the wall is outside the temperatures for which the vapour pressure was published'] : [];
  },
});

export const saturation = quantity<[partial: number, vapour: number]>({
  id: 'saturation',
  symbol: 'p_i/p_vap',
  dimension: 'number',
  statement: 'Partial pressure of a condensable gas over its vapour pressure at the wall.',
  source: 'definition',
  subjects: condensable,
  from: (reference, scope) => {
    const of = gasOf(reference, scope) ?? '';
    return [
      { id: 'partial-pressure', of },
      { id: 'vapour-pressure', of },
    ];
  },
  value: (partial, vapour) => partial / vapour,
});

function condensable(scope: Scope): readonly string[] {
  return gasesOf(scope).filter((gas) => scope.gas(gas)?.vapourPressure !== undefined);
}
