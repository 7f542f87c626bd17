import { pumpingSpeed } from '../physics/flow.ts';
import { mixtureSpeed, steadyPressure } from '../physics/pump.ts';
import { inapplicable, missing, quantity, type Ingredient, type Recipe } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Scope } from './scope.ts';

/* What the pump is asked for, and what it can do. */

export const pumpTemperature = quantity<[wall: number, warmest: number]>({
  id: 'pump-temperature',
  symbol: 'T_pump',
  dimension: 'temperature',
  statement: 'Temperature of the gas at the pump: stated, or that of the wall but at most about 60 degC.',
  source: 'min(T_wall, T_cooled); gas cools on its way to the pump (common practice)',
  from: (_, scope) =>
    scope.states('chamber.pump.temperature')
      ? 'chamber.pump.temperature'
      : ['temperatures.wall', 'assumed.pump-cooling'],
  value: (wall, warmest) => Math.min(wall, warmest),
});

export const pumpingSpeedOf = quantity<[flow: number, temperature: number, pressure: number]>({
  id: 'pumping-speed',
  symbol: 'S',
  dimension: 'speed',
  statement: 'Speed that the setpoint needs at the pump.',
  source: 'S = F k T_pump/p',
  from: (_, scope) => {
    if (!scope.fed) return inapplicable('no gas flows');
    if (scope.setup.pumpSpeed === 'none') return inapplicable('the chamber has no pump');
    if (!scope.states('pressure')) return inapplicable('no pressure is held');
    return [{ id: 'flow-rate' }, { id: 'pump-temperature' }, { id: 'gas-pressure' }];
  },
  value: (flow, temperature, pressure) =>
    flow > 0 ? pumpingSpeed(flow, temperature, pressure) : inapplicable('no gas flows'),
});

type PumpArguments = [
  flows: readonly number[],
  pressure: readonly number[],
  limits: readonly number[],
  speeds: readonly number[],
];

export const pumpSpeed = quantity<PumpArguments>({
  id: 'pump-speed',
  symbol: 'S_full',
  dimension: 'speed',
  statement: 'Full speed of the pump at the chamber’s port, for the gas of the step at its pressure.',
  source: 'stated by the chamber',
  from: (_, scope) => pumpSpeedIngredients(scope),
  value: (flows, [pressure], limits, speeds) => {
    if (pressure === undefined) return mixtureSpeed(flows, speeds);
    const row = limits.findIndex((limit) => pressure < limit);
    return row === -1 ? inapplicable('the pump’s table of speeds ends below this pressure') : (speeds[row] ?? NaN);
  },
});

function pumpSpeedIngredients(scope: Scope): Recipe<PumpArguments> | Ingredient | Missing | Inapplicable {
  const { pumpSpeed: kind, pumpRows } = scope.setup;
  const gases = scope.fedGases;
  if (kind === 'none') return inapplicable('the chamber has no pump');
  if (kind === 'one') return 'chamber.pump.speed';
  if (kind === 'by-gas') {
    return [gases.map((of) => ({ id: 'flow-rate', of })), [], [], gases.map((gas) => `chamber.pump.speed.${gas}`)];
  }
  const rows = Array.from({ length: pumpRows }, (_, row) => `chamber.pump.speed.${String(row)}`);
  return [[], [{ id: 'gas-pressure' }], rows.map((row) => `${row}.below`), rows.map((row) => `${row}.is`)];
}

export const lowestPumpSpeed = quantity<[]>({
  id: 'lowest-pump-speed',
  symbol: 'S_low',
  dimension: 'speed',
  statement: 'Speed of the pump with the throttle as far shut as it controls.',
  source: 'stated by the chamber',
  from: () => 'chamber.pump.lowest_speed',
  value: () => NaN,
});

export const openPressure = quantity<[flow: number, temperature: number, speed: number]>({
  id: 'open-pressure',
  symbol: 'p_min',
  dimension: 'pressure',
  statement: 'Pressure at which the pump, throttle open, carries off what flows in: the lowest that the flow allows.',
  source: 'p = F k T_pump/S',
  from: (_, scope) => {
    if (!scope.fed) return inapplicable('no gas flows');
    const { pumpSpeed: kind } = scope.setup;
    if (kind === 'none') return inapplicable('the chamber has no pump');
    // A table by pressure would need the pressure that is sought; a step with an open throttle states it then.
    if (kind === 'by-pressure' && !scope.has('pressure')) return missing('pressure');
    return [{ id: 'flow-rate' }, { id: 'pump-temperature' }, { id: 'pump-speed' }];
  },
  value: (flow, temperature, speed) =>
    flow > 0 ? steadyPressure(flow, temperature, speed) : inapplicable('no gas flows'),
});
