import { describe, expect, test } from 'vitest';
import { standardUncertainty } from '../../src/units/standard-uncertainty.ts';

describe('standard uncertainty of a value within limits (GUM 4.3.7: half-width over the root of three)', () => {
  const ROOT = Math.sqrt(3);
  test.each([
    ['a width', 10, { value: 3, of: 'value' }, 0, 3],
    ['a share of the reading', -10, { value: 0.02, of: 'reading' }, 0, 0.2],
    ['a share of full scale', 10, { value: 0.01, of: 'full scale' }, 500, 5],
  ] as const)('%s', (_, value, tolerance, fullScale, halfWidth) => {
    expect(standardUncertainty(value, tolerance, fullScale)).toBeCloseTo(halfWidth / ROOT, 12);
  });

  test('without a tolerance there is none', () => {
    expect(standardUncertainty(10, undefined)).toBe(0);
  });
});
