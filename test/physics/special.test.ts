import { describe, expect, test } from 'vitest';
import { erf, erfc, exponentialIntegral } from '../../src/physics/special.ts';

describe('error function', () => {
  // Abramowitz & Stegun 1964, Table 7.1, ten digits.
  test.each([
    [0, 0],
    [0.1, 0.112462916],
    [0.5, 0.5204998778],
    [1, 0.8427007929],
    [1.5, 0.9661051465],
    [2, 0.995322265],
    [3, 0.9999779095],
  ])('erf %d has the tabulated value', (x, value) => {
    expect(erf(x)).toBeCloseTo(value, 9.99);
    expect(erf(-x)).toBeCloseTo(-value, 9.99);
    expect(erfc(x)).toBeCloseTo(1 - value, 9.99);
  });

  test('erfc keeps its digits in the tail', () => {
    // e^(x²) erfc x tends to 1/(x sqrtπ) (1 - 1/(2x²) + 3/(4x⁴) - 15/(8x⁶) + 105/(16x⁸))
    for (const x of [8, 12, 20, 26]) {
      const s = 1 / (x * x);
      const asymptote =
        (Math.exp(-x * x) / (x * Math.sqrt(Math.PI))) * (1 - s / 2 + 0.75 * s ** 2 - 1.875 * s ** 3 + 6.5625 * s ** 4);
      expect(erfc(x) / asymptote).toBeCloseTo(1, x > 10 ? 9 : 7);
    }
  });

  test('series and continued fraction meet without a step', () => {
    const slope = (2 / Math.sqrt(Math.PI)) * Math.exp(-4);
    expect(erfc(2 - 1e-9) - erfc(2 + 1e-9)).toBeCloseTo(2e-9 * slope, 13);
    expect(erfc(5 - 1e-12) / erfc(5 + 1e-12)).toBeCloseTo(1, 10);
  });

  test('erfc runs from two to zero', () => {
    expect(erfc(-Infinity)).toBe(2);
    expect(erfc(Infinity)).toBe(0);
    expect(erf(NaN)).toBeNaN();
  });
});

describe('exponential integral', () => {
  // Abramowitz & Stegun 1964, Tables 5.1 and 5.4, and computed to twelve digits with another implementation.
  test.each([
    [1, 0.5, 0.559773594776],
    [1, 1, 0.219383934396],
    [1, 2, 0.048900510708],
    [2, 0.5, 0.326643862324],
    [3, 0, 0.5],
    [3, 0.01, 0.490276564185],
    [3, 0.5, 0.221604364275],
    [3, 1, 0.109691967198],
    [3, 2, 0.030133379798],
    [3, 10, 3.5487625531e-6],
  ])('E_%d(%d) has the tabulated value', (n, x, value) => {
    expect(exponentialIntegral(n, x) / value).toBeCloseTo(1, 9);
  });

  test('both roads meet at one', () => {
    expect(exponentialIntegral(3, 1 + 1e-12) / exponentialIntegral(3, 1)).toBeCloseTo(1, 11);
  });

  test('it agrees with its integral', () => {
    // E_3(x) = ∫0^1 u e^(-x/u) du, by the midpoint rule
    for (const x of [0.2, 1.7, 6]) {
      let sum = 0;
      const parts = 20000;
      for (let i = 0; i < parts; i++) sum += ((i + 0.5) / parts) * Math.exp((-x * parts) / (i + 0.5));
      expect(exponentialIntegral(3, x) / (sum / parts)).toBeCloseTo(1, 7);
    }
  });

  test('it is undefined where it is infinite or has no order', () => {
    expect(exponentialIntegral(1, 0)).toBeNaN();
    expect(exponentialIntegral(2.5, 1)).toBeNaN();
    expect(exponentialIntegral(3, -1)).toBeNaN();
  });
});
