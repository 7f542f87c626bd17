import type { Temperatures } from '../documents/generated/types.ts';
import type { Given } from './given.ts';
import type { Layer } from './layer.ts';
import { isSetpoint, type Scale } from './written.ts';

/** Puts temperatures at their addresses. A wall of zones has their mean, and lies surely between the outermost. */
export function putTemperatures(layer: Layer, temperatures: Temperatures, scale: Scale): void {
  const { wall } = temperatures;
  layer.putAll('temperatures', temperatures, scale);
  if (wall === undefined || isSetpoint(wall)) return;
  const zones = wall.zones.map((_, index) => layer.givens.get(`temperatures.wall.zones.${String(index)}`));
  const mean = meanOf(zones);
  if (mean === undefined) layer.mark('temperatures.wall', 'unknown');
  else layer.give(mean);
}

function meanOf(zones: readonly (Given | undefined)[]): Given | undefined {
  const [first] = zones;
  let sum = 0;
  let lowest = Infinity;
  let highest = -Infinity;
  for (const zone of zones) {
    if (zone === undefined) return undefined;
    sum += zone.value;
    lowest = Math.min(lowest, zone.value - ROOT_OF_THREE * zone.uncertainty);
    highest = Math.max(highest, zone.value + ROOT_OF_THREE * zone.uncertainty);
  }
  if (first === undefined) return undefined;
  const { dimension, unit, origin } = first;
  const uncertainty = (highest - lowest) / (2 * ROOT_OF_THREE);
  return { address: 'temperatures.wall', value: sum / zones.length, uncertainty, dimension, unit, origin };
}

const ROOT_OF_THREE = Math.sqrt(3);
