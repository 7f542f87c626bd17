import type { Pointer } from '../documents/document.ts';
import type { Throughout } from '../documents/generated/types.ts';
import type { Layer } from './layer.ts';
import { checkGas } from './names.ts';
import { placeIn, type Ground } from './ground.ts';
import type { Scale } from './written.ts';

/** Puts the wafer: what it is, or that there is none, or that it is unknown. */
export function putWafer(layer: Layer, wafer: NonNullable<Throughout['wafer']>, scale: Scale): void {
  if (typeof wafer === 'string') {
    layer.mark('wafer', wafer);
    layer.parts.wafer = wafer;
    layer.parts.feature = undefined;
    return;
  }
  layer.unmark('wafer');
  const { feature, ...plain } = wafer;
  layer.putAll('wafer', plain, scale);
  if (wafer.diameter !== undefined) layer.parts.wafer = 'disc';
  else if (wafer.width !== undefined || wafer.length !== undefined) layer.parts.wafer = 'panel';
  if (typeof feature === 'string') {
    layer.mark('wafer.feature', feature);
    layer.parts.feature = undefined;
  } else if (feature !== undefined) {
    layer.unmark('wafer.feature');
    layer.putAll('wafer.feature', feature, scale);
    layer.parts.feature = feature.shape;
  }
}

/** Puts the gas behind the wafer. Another gas takes nothing over from the one below. */
export function putBackside(
  layer: Layer,
  backside: NonNullable<Throughout['backside']>,
  pointer: Pointer,
  ground: Ground,
): void {
  if (typeof backside === 'string') {
    layer.mark('backside', backside);
    layer.parts.backside = undefined;
    return;
  }
  layer.unmark('backside');
  const below = layer.parts.backside;
  if (below !== undefined && below !== backside.gas) layer.forget('backside');
  checkGas(backside.gas, () => placeIn(ground, pointer, ['backside', 'gas']), ground);
  layer.putAll('backside', backside, ground.chamber.plain);
  layer.parts.backside = backside.gas;
}
