import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { transpiration, transpirationLimit } from '../../src/physics/instruments.ts';
import { meanSpeed, numberDensity } from '../../src/physics/state.ts';
import { effectiveSticking, impingement, surfaceRateFromSticking } from '../../src/physics/surfaces.ts';
import { pressure, temperature, molarMass } from './values.ts';

describe('surfaces and instruments', () => {
  test('the impingement rate is a quarter of density times speed', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, (p, t, m) => {
        const quarter = (numberDensity(p, t) * meanSpeed(m, t)) / 4;
        expect(impingement(p, m, t) / quarter).toBeCloseTo(1, 6);
      }),
    );
  });

  test('a small sticking coefficient comes back from its surface rate, a large one up to twice', () => {
    expect(effectiveSticking(surfaceRateFromSticking(1e-5, 600), 600) / 1e-5).toBeCloseTo(1, 4);
    expect(effectiveSticking(surfaceRateFromSticking(1, 600), 600)).toBe(2);
    expect(surfaceRateFromSticking(1.01, 600)).toBeNaN();
  });

  test('thermal transpiration goes from the molecular ratio to one', () => {
    const at = (p: number) => transpiration(p, 0.0046, 318.15, 296.15, 6.076e7, 6060.5, 42.724);
    expect(at(0)).toBeCloseTo(transpirationLimit(318.15, 296.15), 12);
    expect(at(1e4)).toBeCloseTo(1, 4);
  });
});
