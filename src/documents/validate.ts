import * as validators from './generated/validators.js';
import { readMeasures } from './measures.ts';
import { mistakes } from './mistakes.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Contents } from './document.ts';
import type { Rejected } from './mistakes.ts';
import type { Sort } from './sort.ts';

/**
 * Holds a content against the schema of its sort and reads its physical values. It is sound, and of the type that is
 * made from the same schema, where nothing was wrong before and nothing is now.
 */
export function isSound<S extends Sort>(
  candidate: Rejected,
  sort: S,
  content: unknown,
  report: Report,
): content is Contents[S] {
  const { faults } = report;
  const validate = validators[sort];
  if (!validate(content)) {
    const { present, absent, more } = mistakes(candidate, validate.errors ?? []);
    addUntold(faults, present);
    faults.push(...absent);
    report.more += more;
  }
  const units: Fault[] = [];
  readMeasures(candidate.source, candidate.root, candidate.content, sort, units);
  addUntold(faults, units);
  return faults.length === 0;
}

/** What was found wrong so far, and how many faults more. */
export interface Report {
  readonly faults: Fault[];
  more: number;
}

/** A second fault at the same place comes from the same mistake. */
function addUntold(faults: Fault[], more: readonly Fault[]): void {
  if (more.length === 0) return;
  const told = new Set(faults.map(({ place }) => `${place.line}:${place.column}`));
  for (const fault of more) {
    const at = `${fault.place.line}:${fault.place.column}`;
    if (!told.has(at)) faults.push(fault);
    told.add(at);
  }
}
