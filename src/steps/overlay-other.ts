import type { Pointer } from '../documents/document.ts';
import { DIMENSION_NAMES, type Dimension } from '../units/dimensions.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import { quoted } from '../units/unit-fault.ts';
import { STATED } from './accuracies.ts';
import type { Layer } from './layer.ts';
import { placeIn, type Ground } from './ground.ts';

/** Puts setpoints that nothing judges: any value whose unit is known. */
export function putOther(
  layer: Layer,
  other: Readonly<Record<string, string | number>>,
  pointer: Pointer,
  ground: Ground,
): void {
  for (const [name, text] of Object.entries(other)) {
    const measure = readMeasure(text, ANY, { tolerance: true });
    const place = placeIn(ground, pointer, ['other', name]);
    if (isUnitFault(measure))
      ground.faults.push({ place, found: `other.${name}: ${quoted(String(text))}`, right: A_VALUE });
    else layer.put(`other.${name}`, { kind: 'fixed', measure, place }, STATED);
  }
}

const A_VALUE = 'a value in a unit that is known; `list units` tells them';

/** A bare number is a number and no fraction. */
const ANY: readonly Dimension[] = ['number', ...DIMENSION_NAMES];
