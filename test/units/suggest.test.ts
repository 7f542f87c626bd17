import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { nearest } from '../../src/units/suggest.ts';

const KEYS = [
  'pressure',
  'power',
  'process',
  'flows',
  'lengths',
  'temperatures',
  'base_pressure',
  'Ar',
  'N2',
  'NH3',
  'SiH4',
];

describe('the nearest name', () => {
  test.each([
    ['presure', 'pressure'],
    ['pressrue', 'pressure'],
    ['Pressure', 'pressure'],
    ['base-pressure', 'base_pressure'],
    ['basepressure', 'base_pressure'],
    ['flow', 'flows'],
    ['temperature', 'temperatures'],
    ['SIH4', 'SiH4'],
    ['sih', 'SiH4'],
    ['NH', 'NH3'],
    ['AR', 'Ar'],
  ])('to %s is %s', (word, meant) => {
    expect(nearest(word, KEYS)).toBe(meant);
  });

  test.each(['', 'x', 'qz', 'gauge', 'voltage', 'x'.repeat(100)])('to %j is none', (word) => {
    expect(nearest(word, KEYS)).toBeUndefined();
  });

  test('is the one that begins alike among equally near ones', () => {
    expect(nearest('ms2', ['as2', 'ms3'])).toBe('ms3');
  });

  test('is the name itself for every name', () => {
    for (const key of KEYS) expect(nearest(key, KEYS)).toBe(key);
  });

  test('is a candidate or none for any words', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.array(fc.string({ unit: 'binary' })), (word, words) => {
        const found = nearest(word, words);
        if (found !== undefined) expect(words).toContain(found);
      }),
    );
  });

  test('costs little for long words and many candidates', () => {
    const candidates = Array.from({ length: 500 }, (_, index) => `${'abcdefg'.repeat(8)}${index}`);
    const start = performance.now();
    nearest('abcdefg'.repeat(8000), candidates);
    nearest('abcdgfe'.repeat(8), candidates);
    expect(performance.now() - start).toBeLessThan(500);
  });
});
