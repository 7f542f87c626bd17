import { missing, type Recipe } from './quantity.ts';
import type { Missing } from './reading.ts';
import { temperatureAt } from './gas.ts';
import type { Scope } from './scope.ts';

/** Temperature, and the published values of a gas with the temperatures at which they stand. */
export function heatCapacityIngredients(
  gas: string | undefined,
  scope: Scope,
): Recipe<[number, readonly number[], readonly number[]]> | Missing {
  if (gas === undefined) return missing('reactant.gas');
  const rows = scope.gas(gas)?.heatCapacity ?? [];
  if (rows.length === 0) return missing(`gases.${gas}.heat_capacity`);
  return [
    temperatureAt(undefined),
    rows.map((_, index) => `gases.${gas}.heat_capacity.${String(index)}.temperature`),
    rows.map((_, index) => `gases.${gas}.heat_capacity.${String(index)}.is`),
  ];
}

/** Linear between the published values, and up to 30 K before the first, where heat capacities hardly change. */
export function interpolatedHeatCapacity(
  temperature: number,
  temperatures: readonly number[],
  values: readonly number[],
): number | undefined {
  const last = temperatures.length - 1;
  const first = temperatures[0] ?? NaN;
  if (temperature < first - 30 || temperature > (temperatures[last] ?? NaN)) return undefined;
  const above = Math.max(
    1,
    temperatures.findIndex((at) => at >= temperature),
  );
  const [t0 = NaN, t1 = NaN] = [temperatures[above - 1], temperatures[above]];
  const [c0 = NaN, c1 = NaN] = [values[above - 1], values[above]];
  if (last === 0) return values[0];
  return c0 + ((c1 - c0) * (temperature - t0)) / (t1 - t0);
}
