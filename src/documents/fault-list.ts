import { failure } from '../shelf/fault.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';

/** Faults told of one file; one mistake at its head can make any number of them. */
export const MOST_FAULTS = 20;

/** A file's faults in the order of the text; of many only the first, and how many more there are. */
export function limited(faults: readonly Fault[]): Outcome<never> {
  const inOrder = [...faults].sort((a, b) => a.place.line - b.place.line || a.place.column - b.place.column);
  const next = inOrder[MOST_FAULTS];
  if (next === undefined) return failure(...inOrder);
  const more = inOrder.length - MOST_FAULTS;
  const rest = { place: next.place, found: `${more} more from here on`, right: 'correct those above first' };
  return failure(...inOrder.slice(0, MOST_FAULTS), rest);
}
