import { failure } from '../shelf/fault.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';

/** Faults told of one file; one mistake at its head can make any number of them. */
export const MOST_FAULTS = 20;

/** A file's faults in the order of the text; of many only the first, and how many more there are (`more` were not listed). */
export function limited(faults: readonly Fault[], more = 0): Outcome<never> {
  const inOrder = faults
    .map((fault) => ({ fault, line: fault.place.line, column: fault.place.column }))
    .sort((a, b) => a.line - b.line || a.column - b.column)
    .map(({ fault }) => fault);
  const next = inOrder[MOST_FAULTS];
  if (next === undefined) return failure(...inOrder);
  const untold = inOrder.length - MOST_FAULTS + more;
  const rest = { place: next.place, found: `${untold} more faults in this file`, right: 'correct those above first' };
  return failure(...inOrder.slice(0, MOST_FAULTS), rest);
}
