import { expect, test } from 'vitest';
import { jobStream } from '../../src/cli/job-stream.ts';
import type { Found } from '../../src/cli/recipe-files.ts';

function* found(count: number): Generator<Found, void, undefined> {
  for (let number = 0; number < count; number += 1) {
    const name = `${number}.yaml`;
    yield { kind: 'recipe', job: { file: name, path: name, text: 'x'.repeat(100) } };
    yield { kind: 'passed-over' };
  }
}

test('jobs are taken ahead by number and by the size of their texts, whichever is less', () => {
  const jobs = jobStream(found(50));
  expect(jobs.take(3, Infinity)).toHaveLength(3);
  expect(jobs.take(1000, 950)).toHaveLength(10);
  expect([...jobs]).toHaveLength(37);
  expect(jobs.passedOver).toBe(50);
});
