import { availableParallelism } from 'node:os';
import { makePart } from './make-part.ts';
import { onWorkers } from './pool.ts';
import type { Part, Work } from './part.ts';
import type { Job } from './recipe-files.ts';
import type { Sites } from './sites.ts';

/** Recipes from which on workers earn back what starting them costs; fewer that fill what is held at hand are long enough. */
const PAYS_FROM = 1000;

/** The parts of jobs, in their order. The first jobs are at hand already; whether workers pay is told by how many there are. */
export async function* partsOf(
  first: readonly Job[],
  rest: Iterable<Job>,
  work: Work,
  sites: Sites,
  jobs = paysOff(first) ? availableParallelism() : 1,
): AsyncGenerator<Part, void, undefined> {
  if (jobs > 1) return yield* onWorkers(chained(first, rest), work, jobs);
  for (const job of chained(first, rest)) yield makePart(job, work, sites);
}

/** Jobs to have at hand before any is begun, as far as their texts are no more than so many characters. */
export const AT_HAND = PAYS_FROM;
export const AT_HAND_LENGTH = 2 ** 22;

function paysOff(first: readonly Job[]): boolean {
  return first.length >= PAYS_FROM || first.reduce((sum, { text }) => sum + text.length, 0) >= AT_HAND_LENGTH;
}

function* chained(first: readonly Job[], rest: Iterable<Job>): Generator<Job> {
  yield* first;
  yield* rest;
}
