import { Worker } from 'node:worker_threads';
import type { Part, Work } from './part.ts';
import type { Job } from './recipe-files.ts';

/** Jobs sent at a time: enough that sending them does not count, few enough that all workers end together. */
const BATCH = 16;
/** Batches that each worker has in hand or waiting, so that it never stands idle. */
const AHEAD = 3;

/** The parts of jobs in their order, made by several workers at once. No more is held than the workers have in hand. */
export async function* onWorkers(
  jobs: Iterable<Job>,
  work: Work,
  count: number,
): AsyncGenerator<Part, void, undefined> {
  const batches = batched(jobs);
  const workers: Hand[] = [];
  const pending: Promise<readonly Part[]>[] = [];
  try {
    for (;;) {
      while (pending.length < count * AHEAD) {
        const { value: batch, done } = batches.next();
        if (done === true) break;
        if (workers.length < count) workers.push(hire(work));
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

/** What a worker is sent for. */
export interface Errand {
  readonly work: Work;
  readonly batch: readonly Job[];
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
function hire(work: Work): Hand {
  const worker = new Worker(new URL('./worker.js', import.meta.url));
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
  for (const job of jobs) {
    batch.push(job);
    if (batch.length < BATCH) continue;
    yield batch;
    batch = [];
  }
  if (batch.length > 0) yield batch;
}
