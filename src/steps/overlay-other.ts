import type { Pointer } from '../documents/document.ts';
import { DIMENSION_NAMES, type Dimension } from '../units/dimensions.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import { STATED } from './accuracies.ts';
import type { Layer } from './layer.ts';
import { placeIn, type Ground } from './overlay.ts';

/** Puts setpoints that nothing judges: any value whose unit is known. */
export function putOther(layer: Layer, other: Readonly<Record<string, string | number>>, pointer: Pointer, ground: Ground): void {
  for (const [name, text] of Object.entries(other)) {
    const measure = readMeasure(text, ANY, { tolerance: true });
    const place = placeIn(ground, pointer, ['other', name]);
    if (isUnitFault(measure)) ground.faults.push({ place, found: `other.${name}: ${measure.found}`, right: measure.right });
    else layer.put(`other.${name}`, { kind: 'fixed', measure, place }, STATED);
  }
}

/** A bare number is a number and no fraction. */
const ANY: readonly Dimension[] = ['number', ...DIMENSION_NAMES];
