import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { GAS_CONSTANT } from '../../src/physics/constants.ts';
import { diffusivity, MONATOMIC_HEAT_CAPACITY, thermalConductivity, viscosity } from '../../src/physics/transport.ts';
import { pressure, temperature, molarMass } from './values.ts';

describe('transport', () => {
  test('viscosity does not depend on pressure, diffusivity is inverse to it', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, molarMass, (p, t, a, b) => {
        expect(diffusivity(a, b, t, p / 2, 4e-19) / diffusivity(a, b, t, p, 4e-19)).toBeCloseTo(2, 10);
        expect(diffusivity(a, b, t, p, 4e-19)).toBe(diffusivity(b, a, t, p, 4e-19));
      }),
    );
  });

  test('self-diffusion of hard spheres is 6/5 of the kinematic viscosity', () => {
    // Chapman & Cowling 1970: D = (6/5) μ/ρ for Ω11* = Ω22* = 1
    const density = (100 * 0.04) / (GAS_CONSTANT * 300);
    const kinematic = viscosity(0.04, 300, 3.6e-10) / density;
    expect(diffusivity(0.04, 0.04, 300, 100, Math.PI * 3.6e-10 ** 2) / kinematic).toBeCloseTo(1.2, 10);
  });

  test('a monatomic gas conducts 15/4 of R/M times its viscosity', () => {
    expect(thermalConductivity(0.04, 2e-5, MONATOMIC_HEAT_CAPACITY)).toBeCloseTo(
      (15 / 4) * (GAS_CONSTANT / 0.04) * 2e-5,
      12,
    );
    expect(thermalConductivity(0.04, 2e-5, 12.47)).toBeCloseTo((15 / 4) * (GAS_CONSTANT / 0.04) * 2e-5, 5);
  });

  test('no gas has less heat capacity than a monatomic one', () => {
    expect(thermalConductivity(0.04, 2e-5, 8)).toBeNaN();
  });
});
