import type { Pointer, RecipeDocument } from '../documents/document.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import type { Library } from '../substances/library.ts';
import type { ChamberFacts } from './chamber.ts';

/** What setpoints are read against. */
export interface Ground {
  readonly document: RecipeDocument;
  readonly chamber: ChamberFacts;
  readonly library: Library;
  readonly faults: Fault[];
}

/** Where a value of a block, or its key, stands in the recipe. */
export function placeIn({ document }: Ground, pointer: Pointer, path: Pointer, part?: 'key'): Place {
  return document.place([...pointer, ...path], part);
}
