import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { hold as holdLimits, limitsOf } from '../../src/verdicts/hold.ts';
import type { Bound } from '../../src/verdicts/verdict.ts';

const hold = (value: number, uncertainty: number, bound: Bound) => holdLimits(value, uncertainty, limitsOf(bound));

describe('a value against a bound', () => {
  const graded = { at_most: { note: 1, warning: 5 } };

  test.each([
    [0.4, 0.1, 'pass', 'warning'],
    [0.95, 0.1, 'review', 'note'],
    [1.05, 0.1, 'review', 'note'],
    [2, 0.1, 'fail', 'note'],
    [4.95, 0.1, 'fail', 'note'],
    [5.05, 0.1, 'fail', 'note'],
    [6, 0.1, 'fail', 'warning'],
  ])('%d ± %d is %s %s', (value, uncertainty, kind, level) => {
    expect(hold(value, uncertainty, graded)).toMatchObject({ kind, level });
  });

  test('a fail whose graver limit is unsure says so', () => {
    expect(hold(5.05, 0.1, graded).perhaps).toBe('warning');
    expect(hold(2, 0.1, graded).perhaps).toBeUndefined();
  });

  test('a value on its limit without uncertainty keeps it, on either side', () => {
    expect(hold(1, 0, { at_most: { error: 1 } }).kind).toBe('pass');
    expect(hold(1, 0, { at_least: { error: 1 } }).kind).toBe('pass');
  });

  test('a bound may have both sides, and the side that is crossed decides', () => {
    const both = { at_least: { warning: 0.1, error: 0.02 }, at_most: { note: 0.95, error: 1 } };
    expect(hold(0.5, 0, both).kind).toBe('pass');
    expect(hold(0.03, 0, both)).toMatchObject({
      kind: 'fail',
      level: 'warning',
      limit: { side: 'at_least', value: 0.1 },
    });
    expect(hold(0.97, 0, both)).toMatchObject({ kind: 'fail', level: 'note', limit: { side: 'at_most', value: 0.95 } });
    expect(hold(1.2, 0, both)).toMatchObject({ kind: 'fail', level: 'error', limit: { side: 'at_most', value: 1 } });
  });

  test('the margin is the factor to the limit, above one on the good side', () => {
    expect(hold(0.5, 0, { at_most: { error: 1 } }).margin).toBe(2);
    expect(hold(0.5, 0, { at_least: { error: 1 } }).margin).toBe(0.5);
  });

  test('more uncertainty never turns a doubt into a certainty', () => {
    const anything = fc.double({ min: 0, max: 10, noNaN: true });
    fc.assert(
      fc.property(anything, anything, anything, (value, small, more) => {
        const [one, other] = [hold(value, small, graded), hold(value, small + more, graded)];
        if (one.kind === 'review') expect(other.kind).not.toBe('pass');
        if (one.kind === 'pass') expect(other.kind).not.toBe('fail');
      }),
    );
  });
});
