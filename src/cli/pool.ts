import type { Worker } from 'node:worker_threads';
import type { Errand } from './errands.ts';
import type { Part, Work } from './part.ts';
import type { Job } from './recipe-files.ts';

/** Jobs sent at a time: enough that sending them does not count, few enough that all workers end together. */
const BATCH = 16;
/** Characters sent at a time, however few jobs they make: what is held must not grow with the size of files. */
const BATCH_LENGTH = 2 ** 18;
/** Batches that each worker has in hand or waiting, so that it never stands idle. */
const AHEAD = 3;

const WORKER = new URL('./worker.js', import.meta.url);
/** A recipe leaves little behind: with less room for what is new, memory stays flatter and nothing takes longer. */
const LIMITS = { resourceLimits: { maxYoungGenerationSizeMb: 16 } };

/** The parts of jobs in their order, made by several workers at once. No more is held than the workers have in hand. */
export async function* onWorkers(
  jobs: Iterable<Job>,
  work: Work,
  count: number,
): AsyncGenerator<Part, void, undefined> {
  // Loaded only here: most runs have no use for it.
  const threads = await import('node:worker_threads');
  const batches = batched(jobs);
  const workers: Hand[] = [];
  const pending: Promise<readonly Part[]>[] = [];
  try {
    for (;;) {
      while (pending.length < count * AHEAD) {
        const { value: batch, done } = batches.next();
        if (done === true) break;
        if (workers.length < count) workers.push(hire(new threads.Worker(WORKER, LIMITS), work));
        const hand = leastBusy(workers);
        pending.push(hand.make(batch));
      }
      const next = pending.shift();
      if (next === undefined) return;
      yield* await next;
    }
  } finally {
    for (const promise of pending) promise.catch(() => undefined);
    await Promise.all(workers.map((hand) => hand.dismiss()));
  }
}

/** A worker and what it has been given. */
interface Hand {
  readonly waiting: readonly unknown[];
  make(batch: readonly Job[]): Promise<readonly Part[]>;
  dismiss(): Promise<unknown>;
}

interface Waiting {
  readonly resolve: (parts: readonly Part[]) => void;
  readonly reject: (error: unknown) => void;
}

/** A worker answers in the order in which it is asked. */
function hire(worker: Worker, work: Work): Hand {
  const waiting: Waiting[] = [];
  const failAll = (error: unknown): void => {
    for (const { reject } of waiting.splice(0)) reject(error);
  };
  worker.on('message', (parts: readonly Part[]) => waiting.shift()?.resolve(parts));
  worker.on('error', failAll);
  worker.on('exit', (code) => {
    failAll(new Error(`a worker ended with ${code}`));
  });
  return {
    waiting,
    make(batch) {
      return new Promise((resolve, reject) => {
        waiting.push({ resolve, reject });
        const errand: Errand = { work, batch };
        worker.postMessage(errand);
      });
    },
    dismiss: () => worker.terminate(),
  };
}

function leastBusy(workers: readonly Hand[]): Hand {
  return workers.reduce((least, hand) => (hand.waiting.length < least.waiting.length ? hand : least));
}

function* batched(jobs: Iterable<Job>): Generator<readonly Job[], void, undefined> {
  let batch: Job[] = [];
  let length = 0;
  for (const job of jobs) {
    batch.push(job);
    length += job.text.length;
    if (batch.length < BATCH && length < BATCH_LENGTH) continue;
    yield batch;
    batch = [];
    length = 0;
  }
  if (batch.length > 0) yield batch;
}
