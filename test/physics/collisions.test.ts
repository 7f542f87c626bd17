import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { combine, reducedTemperature, type Molecule } from '../../src/physics/pair.ts';
import { omega11, omega22 } from '../../src/physics/collision-integrals.ts';
import {
  collisionDiameter,
  diffusionCrossSection,
  maxwellPath,
  meanFreePath,
  pathFromViscosity,
} from '../../src/physics/collisions.ts';
import { DEBYE } from '../../src/physics/constants.ts';
import { knudsen } from '../../src/physics/regime.ts';
import { numberDensity } from '../../src/physics/state.ts';
import { viscosity } from '../../src/physics/transport.ts';
import { between, decades, pressure, temperature, molarMass, diameter } from './values.ts';

describe('collisions', () => {
  test('the Knudsen number doubles when the pressure halves', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, diameter, (p, t, m, d) => {
        const at = (one: number) => knudsen(meanFreePath(m, [numberDensity(one, t)], [d], [m]), 0.1);
        expect(at(p / 2) / at(p)).toBeCloseTo(2, 10);
      }),
    );
  });

  test('the path from the diameter is the path from the viscosity', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, diameter, (p, t, m, d) => {
        const direct = meanFreePath(m, [numberDensity(p, t)], [d], [m]);
        expect(pathFromViscosity(viscosity(m, t, d), p, m, t) / direct).toBeCloseTo(1, 10);
        expect(maxwellPath(viscosity(m, t, d), p, m, t) / direct).toBeCloseTo((5 * Math.PI) / 16, 10);
      }),
    );
  });

  test('at fixed pressure the path grows faster than the temperature', () => {
    fc.assert(
      fc.property(between(200, 700), between(10, 250), (t, wellDepth) => {
        const at = (one: number) => one / collisionDiameter(3.5e-10, wellDepth, 0, one) ** 2;
        expect(at(2 * t) / at(t)).toBeGreaterThan(2);
        expect(at(2 * t) / at(t)).toBeLessThan(4);
      }),
    );
  });

  test('collision integrals fall with temperature and grow with the dipole', () => {
    fc.assert(
      fc.property(decades(-0.5, 2), between(0, 2), (t, polarity) => {
        for (const omega of [omega11, omega22]) {
          expect(omega(t * 1.05)).toBeLessThan(omega(t));
          expect(omega(t, polarity)).toBeGreaterThanOrEqual(omega(t));
        }
      }),
    );
  });

  test('collision integrals agree with the integrals of the 12-6 potential', () => {
    // Hirschfelder, Curtiss & Bird 1954, Table I-M, as far as remembered: T*, Ω11*, Ω22*
    const table: readonly [number, number, number][] = [
      [1, 1.439, 1.587],
      [2, 1.075, 1.175],
      [10, 0.7424, 0.8242],
      [100, 0.517, 0.5882],
    ];
    for (const [t, first, second] of table) {
      expect(Math.abs(omega11(t) / first - 1)).toBeLessThan(0.005);
      expect(Math.abs(omega22(t) / second - 1)).toBeLessThan(0.005);
    }
  });

  test('there is no collision integral at or below zero', () => {
    expect(omega11(0)).toBeNaN();
    expect(omega22(-1)).toBeNaN();
    expect(diffusionCrossSection(3e-10, 100, 0, -5)).toBeNaN();
  });

  test('a pair of one molecule is that molecule, and both orders are one', () => {
    const molecule = fc.record<Molecule>({
      diameter,
      wellDepth: between(5, 900),
      dipole: between(0, 8e-30),
      polar: fc.boolean(),
    });
    fc.assert(
      fc.property(molecule, molecule, (a, b) => {
        expect(combine(a, b)).toEqual(combine(b, a));
        expect(combine(a, a).diameter).toBeCloseTo(a.diameter, 20);
        expect(combine(a, a).wellDepth / a.wellDepth).toBeCloseTo(1, 12);
        if (!(a.polar && b.polar)) expect(combine(a, b).polarity).toBe(0);
      }),
    );
  });

  test('the reduced dipole of water is that of its Stockmayer fit', () => {
    // Monchick & Mason, J. Chem. Phys. 35, 1676 (1961), from memory: 1.0 for 1.85 D, 2.52 Å and 775 K
    const water = { diameter: 2.52e-10, wellDepth: 775, dipole: 1.85 * DEBYE, polar: true };
    expect(Math.sqrt(combine(water, water).polarity)).toBeCloseTo(1, 2);
    expect(reducedTemperature(775, 775)).toBe(1);
  });
});
