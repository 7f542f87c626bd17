import type { Found, Job } from './recipe-files.ts';
import type { ToldFault } from './told-fault.ts';

/** Recipes as they are found, and what else was come upon so far. */
export interface JobStream extends Iterable<Job> {
  /** The next jobs, at most so many, and none behind the one with which their texts come to so many characters. */
  take(most: number, length: number): readonly Job[];
  /** Faults since this was last asked. */
  faults(): readonly ToldFault[];
  /** YAML files that are none of ours. */
  readonly passedOver: number;
}

export function jobStream(found: Generator<Found, void, undefined>): JobStream {
  let faults: ToldFault[] = [];
  let passedOver = 0;
  const next = (): Job | undefined => {
    for (;;) {
      const { value, done } = found.next();
      if (done === true) return undefined;
      if (value.kind === 'recipe') return value.job;
      if (value.kind === 'fault') faults.push(value.fault);
      else passedOver += 1;
    }
  };
  return {
    take: (most, length) => [...upTo(most, length, next)],
    faults() {
      const since = faults;
      faults = [];
      return since;
    },
    get passedOver() {
      return passedOver;
    },
    [Symbol.iterator]: () => upTo(Infinity, Infinity, next),
  };
}

function* upTo(most: number, length: number, next: () => Job | undefined): Generator<Job, void, undefined> {
  let taken = 0;
  for (let count = 0; count < most && taken < length; count += 1) {
    const job = next();
    if (job === undefined) return;
    taken += job.text.length;
    yield job;
  }
}
