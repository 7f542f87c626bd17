import { describe, expect, test } from 'vitest';
import { countElements } from '../../src/substances/formula.ts';

describe('elements of a formula', () => {
  test.each([
    ['Ar', { Ar: 1 }],
    ['H2O', { H: 2, O: 1 }],
    ['C8H20O4Si', { C: 8, H: 20, O: 4, Si: 1 }],
    ['Hf(N(CH3)2)4', { Hf: 1, N: 4, C: 8, H: 24 }],
    ['CH3CH2OH', { C: 2, H: 6, O: 1 }],
  ])('%s is counted', (formula, elements) => {
    expect(Object.fromEntries(countElements(formula) ?? [])).toEqual(elements);
  });

  test.each(['', 'argon', '2H', 'H2)', '(H2', 'H0', '()2', 'SiO2.', 'Si O2', 'x'.repeat(500)])(
    '%j is no formula',
    (text) => {
      expect(countElements(text)).toBeUndefined();
    },
  );
});
