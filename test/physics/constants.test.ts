import { describe, expect, test } from 'vitest';
import {
  ATOMIC_MASS,
  AVOGADRO,
  BOLTZMANN,
  DEBYE,
  ELECTRON_MASS,
  ELEMENTARY_CHARGE,
  GAS_CONSTANT,
} from '../../src/physics/constants.ts';

describe('constants', () => {
  test('they agree with each other', () => {
    expect(GAS_CONSTANT).toBeCloseTo(8.31446261815324, 12);
    expect(ATOMIC_MASS * AVOGADRO).toBeCloseTo(1e-3, 11);
    expect(ATOMIC_MASS / ELECTRON_MASS).toBeCloseTo(1822.8885, 3);
    expect(DEBYE / 3.33564095e-30).toBeCloseTo(1, 8);
    expect((BOLTZMANN * 11604.518) / ELEMENTARY_CHARGE).toBeCloseTo(1, 7);
  });
});
