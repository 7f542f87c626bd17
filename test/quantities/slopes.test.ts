import { describe, expect, test } from 'vitest';
import { allQuantities } from '../../src/quantities/catalogue.ts';
import type { Reference } from '../../src/quantities/reference.ts';
import { referenceName } from '../../src/quantities/reference.ts';
import type { StepRun } from '../../src/quantities/run.ts';
import { PLASMA, SPUTTER, stepOf } from './samples.ts';

/** Every number that can be read of a step, with each of its lengths and subjects. */
function everyNumber(run: StepRun): readonly Reference[] {
  const { scope } = run.plan;
  return allQuantities().flatMap((quantity) => {
    const subjects: readonly (string | undefined)[] = [undefined, ...(quantity.subjects?.(scope) ?? [])];
    const lengths: readonly (string | undefined)[] = [undefined, ...(quantity.lengths?.(scope) ?? [])];
    return subjects.flatMap((of) =>
      lengths.map((length) => ({
        id: quantity.id,
        ...(of === undefined ? {} : { of }),
        ...(length === undefined ? {} : { length }),
      })),
    );
  });
}

describe.each([
  ['a sputter step', SPUTTER],
  ['a plasma step with five gases', PLASMA],
])('%s', (_, text) => {
  const run = stepOf(text);
  const numbers = everyNumber(run);

  test('every number is known, missing with what would supply it, or does not apply with the reason', () => {
    for (const reference of numbers) {
      const reading = run.read(reference);
      const name = referenceName(reference);
      if (reading.kind === 'known') expect(reading.value, name).toSatisfy(Number.isFinite);
      if (reading.kind === 'missing') expect(reading.needs.length, name).toBeGreaterThan(0);
      if (reading.kind === 'inapplicable') expect(reading.because, name).not.toBe('');
    }
    expect(numbers.filter((one) => run.read(one).kind === 'known').length).toBeGreaterThan(60);
  });

  test('chained slopes agree with moving the given and reading again', () => {
    let compared = 0;
    for (const reference of numbers) {
      const reading = run.read(reference);
      if (reading.kind !== 'known' || reading.value === 0) continue;
      for (const { address, slope } of run.slopes(reference)) {
        const given = run.given(address);
        if (given === undefined || given.value === 0) continue;
        const move = Math.abs(given.value) * 1e-4;
        const above = run.with({ address, value: given.value + move }).read(reference);
        const below = run.with({ address, value: given.value - move }).read(reference);
        if (above.kind !== 'known' || below.kind !== 'known') continue;
        const expected = (above.value - below.value) / (2 * move);
        // A slope of no weight beside the number itself is noise of the difference.
        const scale = Math.abs(reading.value / given.value);
        const off = Math.abs(slope - expected) / Math.max(Math.abs(expected), 1e-3 * scale);
        expect(off, `${referenceName(reference)} by ${address}: ${slope} against ${expected}`).toBeLessThan(2e-3);
        compared += 1;
      }
    }
    expect(compared).toBeGreaterThan(200);
  });

  test('a run with a value moved shares every number that it does not reach', () => {
    for (const reference of numbers) run.read(reference);
    const moved = run.with({ address: 'time', value: 1 });
    expect(moved.reaches(run.plan.number({ id: 'mean-free-path' }))).toBe(false);
    expect(moved.reaches(run.plan.number({ id: 'turnovers' }))).toBe(true);
    expect(moved.read({ id: 'mean-free-path' })).toEqual(run.read({ id: 'mean-free-path' }));
    expect(moved.read({ id: 'turnovers' })).not.toEqual(run.read({ id: 'turnovers' }));
    expect(run.with().read({ id: 'turnovers' })).toEqual(run.read({ id: 'turnovers' }));
  });
});

/** A small generator of normal deviates with a fixed seed, so that a run can be repeated. */
function normals(seed: number): () => number {
  let state = seed;
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}

test('the uncertainty agrees with a Monte Carlo run where the law is nearly straight', () => {
  const run = stepOf(SPUTTER);
  const normal = normals(20261);
  for (const name of ['mean-free-path', 'residence-time', 'flow-rate', 'turnovers', 'film-flux', 'pumping-speed']) {
    const reference = { id: name };
    const addresses = run.slopes(reference).filter(({ contribution }) => contribution > 0);
    const values: number[] = [];
    for (let draw = 0; draw < 4000; draw++) {
      const changes = addresses.map(({ address }) => {
        const given = run.given(address);
        return { address, value: (given?.value ?? NaN) + normal() * (given?.uncertainty ?? NaN) };
      });
      const reading = run.with(...changes).read(reference);
      if (reading.kind === 'known') values.push(reading.value);
    }
    const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
    const spread = Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
    expect(values.length).toBe(4000);
    expect(run.uncertainty(reference) / spread, name).toBeGreaterThan(0.95);
    expect(run.uncertainty(reference) / spread, name).toBeLessThan(1.05);
  }
});
