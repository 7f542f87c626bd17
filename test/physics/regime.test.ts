import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { band, BANDS, collisionsStraight, collisionsWalk, type BandConvention } from '../../src/physics/regime.ts';
import { decades } from './values.ts';

describe('regime', () => {
  test.each<BandConvention>(['gas-dynamics', 'vacuum'])(
    'the name of a Knudsen number is that of its band in %s',
    (convention) => {
      fc.assert(
        fc.property(decades(-6, 6), (kn) => {
          const of = BANDS[convention].find(({ from, to }) => kn > from && kn < to);
          if (of !== undefined) expect(band(kn, convention)).toBe(of.name);
        }),
      );
    },
  );

  test('limits belong to the middle', () => {
    expect([0.01, 0.1, 10].map((kn) => band(kn, 'gas-dynamics'))).toEqual(['slip', 'transition', 'transition']);
    expect([0.01, 0.5].map((kn) => band(kn, 'vacuum'))).toEqual(['intermediate', 'intermediate']);
    expect(band(NaN, 'vacuum')).toBeUndefined();
    expect(band(-1, 'gas-dynamics')).toBeUndefined();
  });

  test('a walk over many paths takes more collisions than a straight flight', () => {
    // D = v λ/3 for hard spheres, up to the first-order factor
    const path = 1e-3;
    const speed = 400;
    const walk = collisionsWalk(speed / path, 0.1, (speed * path) / 3);
    expect(walk / collisionsStraight(0.1, path) ** 2).toBeCloseTo(1.5, 10);
  });
});
