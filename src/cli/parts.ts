import { availableParallelism } from 'node:os';
import { makePart } from './make-part.ts';
import { onWorkers } from './pool.ts';
import type { Part, Work } from './part.ts';
import type { Job } from './recipe-files.ts';
import type { Sites } from './sites.ts';

/** Recipes from which on workers earn back what starting them costs. */
const PAYS_FROM = 1000;

/** The parts of jobs, in their order. The first jobs are at hand already; whether workers pay is told by how many there are. */
export async function* partsOf(
  first: readonly Job[],
  rest: Iterable<Job>,
  work: Work,
  sites: Sites,
  jobs = first.length < PAYS_FROM ? 1 : availableParallelism(),
): AsyncGenerator<Part, void, undefined> {
  if (jobs > 1) return yield* onWorkers(chained(first, rest), work, jobs);
  for (const job of chained(first, rest)) yield makePart(job, work, sites);
}

/** Jobs to have at hand before any is begun. */
export const AT_HAND = PAYS_FROM;

function* chained(first: readonly Job[], rest: Iterable<Job>): Generator<Job> {
  yield* first;
  yield* rest;
}
