import type { Pointer } from '../documents/document.ts';
import type { Throughout } from '../documents/generated/types.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import { placeIn, type Ground } from './ground.ts';
import type { Layer } from './layer.ts';
import { checkGas } from './names.ts';
import { putFlows, putGenerators } from './overlay-feeds.ts';
import { putOther } from './overlay-other.ts';
import { putBackside, putWafer } from './overlay-wafer.ts';
import { putReactant, putRunning, putSurface } from './overlay-parts.ts';
import { putShares } from './shares.ts';
import { putTemperatures } from './temperatures.ts';

/** Puts one block of setpoints, a step's own or a `throughout`, over what the layer holds so far. */
export function overlay(layer: Layer, block: Throughout, pointer: Pointer, ground: Ground): void {
  const { plain } = ground.chamber;
  if (block.time !== undefined) layer.put('time', block.time, plain);
  putHold(layer, block, pointer, ground);
  if (block.flows !== undefined) putFlows(layer, block.flows, pointer, ground);
  if (block.composition !== undefined) putComposition(layer, block.composition, pointer, ground);
  if (block.temperatures !== undefined) putTemperatures(layer, block.temperatures, plain);
  if (block.lengths !== undefined) layer.putAll('lengths', block.lengths, plain);
  if (block.power !== undefined) putGenerators(layer, 'power', block.power, pointer, ground);
  if (block.duty !== undefined) putGenerators(layer, 'duty', block.duty, pointer, ground);
  if (block.plasma !== undefined) putPlasma(layer, block.plasma, ground);
  if (block.surface !== undefined) putSurface(layer, block.surface, pointer, ground);
  if (block.reactant !== undefined) putReactant(layer, block.reactant, pointer, ground);
  if (block.targets !== undefined) putRunning(layer, 'targets', block.targets, pointer, ground);
  if (block.melts !== undefined) putRunning(layer, 'melts', block.melts, pointer, ground);
  if (block.backside !== undefined) putBackside(layer, block.backside, pointer, ground);
  if (block.wafer !== undefined) putWafer(layer, block.wafer, plain);
  if (block.body !== undefined) putBody(layer, block.body, ground);
  if (block.other !== undefined) putOther(layer, block.other, pointer, ground);
}

/** A pressure that is held, a throttle that is set and a volume that is filled exclude each other: the innermost counts. */
function putHold(layer: Layer, block: Throughout, pointer: Pointer, ground: Ground): void {
  const { pressure, throttle, fill_to } = block;
  if (pressure !== undefined) {
    layer.drop('throttle');
    layer.drop('fill_to');
    layer.parts.throttle = 'holds';
    layer.put('pressure', pressure, ground.chamber.pressure);
  }
  if (throttle !== undefined) {
    if (pressure !== undefined) ground.faults.push(heldAndSet(placeIn(ground, pointer, ['throttle'], 'key')));
    layer.drop('pressure');
    layer.drop('fill_to');
    layer.drop('throttle');
    layer.parts.throttle = typeof throttle === 'string' ? throttle : 'position';
    if (typeof throttle !== 'string') layer.put('throttle', throttle, ground.chamber.plain);
  }
  if (fill_to !== undefined) layer.put('fill_to', fill_to, ground.chamber.pressure);
}

function heldAndSet(place: Place): Fault {
  return { place, found: 'a pressure that is held and a throttle that is set', right: 'one of both' };
}

function putComposition(
  layer: Layer,
  composition: NonNullable<Throughout['composition']>,
  pointer: Pointer,
  ground: Ground,
): void {
  const gases = Object.keys(composition);
  for (const gas of gases) checkGas(gas, () => placeIn(ground, pointer, ['composition', gas], 'key'), ground);
  if (layer.parts.composition.length > 0) layer.forget('composition');
  ground.faults.push(...putShares(layer, 'composition', composition));
  layer.parts.composition = gases;
}

function putPlasma(layer: Layer, plasma: NonNullable<Throughout['plasma']>, { chamber }: Ground): void {
  layer.putAll('plasma', plasma, chamber.plain);
  if (plasma.ion !== undefined) layer.parts.ion = plasma.ion;
}

function putBody(layer: Layer, body: NonNullable<Throughout['body']>, { chamber }: Ground): void {
  layer.putAll('body', body, chamber.plain);
  if (body.flow !== undefined) layer.parts.flow = body.flow;
}
