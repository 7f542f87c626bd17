import type { Process } from '../documents/generated/types.ts';
import type { Fixed, Range } from '../documents/setpoint.ts';
import { failure, success, type Fault, type Outcome } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import type { Dimension } from '../units/dimensions.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import { dimensionOf } from './addresses.ts';
import { STATED } from './accuracies.ts';
import type { Given } from './given.ts';
import { unknownAddress } from './names.ts';
import { givenFrom, type Written } from './written.ts';

/** What stands at an address where a recipe says nothing. */
export interface StandIn {
  readonly given: Given;
  readonly place: Place;
}

type Stated = NonNullable<Process['stands_in']>[string];
type PlaceOf = (side: readonly string[], part?: 'key') => Place;

/** Reads what a process lets stand in at an address: a value with its tolerance, or limits that it lies within. */
export function readStandIn(address: string, stated: Stated, process: string, placeOf: PlaceOf): Outcome<StandIn> {
  const dimension = dimensionOf(address);
  const key = placeOf([], 'key');
  if (dimension === undefined) return failure(unknownAddress(address, key));
  const faults: Fault[] = [];
  const written = readStated(stated, dimension, placeOf, faults);
  if (written === undefined) return { faults };
  const origin = { default: `process ${process}`, because: 'the process lets it stand in where nothing else says' };
  return success({ given: { ...givenFrom(address, written, STATED), origin }, place: key }, faults);
}

function readStated(stated: Stated, dimension: Dimension, placeOf: PlaceOf, faults: Fault[]): Written | undefined {
  if (typeof stated !== 'object') return readFixed(stated, dimension, placeOf([]), faults);
  const { at_least, at_most } = stated;
  const low = at_least === undefined ? undefined : readFixed(at_least, dimension, placeOf(['at_least']), faults);
  const high = at_most === undefined ? undefined : readFixed(at_most, dimension, placeOf(['at_most']), faults);
  if (faults.length > 0) return undefined;
  const range: Range = {
    kind: 'range',
    ...(low === undefined ? {} : { at_least: low }),
    ...(high === undefined ? {} : { at_most: high }),
    place: placeOf([]),
  };
  return range;
}

function readFixed(text: string | number, dimension: Dimension, place: Place, faults: Fault[]): Fixed | undefined {
  const measure = readMeasure(text, dimension, { tolerance: true });
  if (!isUnitFault(measure)) return { kind: 'fixed', measure, place };
  faults.push({ place, found: measure.found, right: measure.right });
  return undefined;
}
