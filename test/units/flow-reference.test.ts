import { describe, expect, test } from 'vitest';
import { referenceFactor, STANDARD_REFERENCE } from '../../src/units/flow-reference.ts';

describe('a flow on a chamber with its own reference', () => {
  const WARM = { temperature: 293.15, pressure: 101325 };

  test('stays at 0 degC and 101325 Pa', () => {
    for (const unit of ['sccm', 'slm', 'Torr L/s', '1/s']) expect(referenceFactor(unit, STANDARD_REFERENCE)).toBe(1);
  });

  test('holds fewer molecules where the standard is warm', () => {
    expect(referenceFactor('sccm', WARM)).toBeCloseTo(273.15 / 293.15, 12);
    expect(referenceFactor('Pa m3/s', WARM)).toBeCloseTo(273.15 / 293.15, 12);
  });

  test('follows the reference pressure as a volume, not as pressure times volume', () => {
    const low = { temperature: 273.15, pressure: 1e5 };
    expect(referenceFactor('slm', low)).toBeCloseTo(1e5 / 101325, 12);
    expect(referenceFactor('Torr L/s', low)).toBe(1);
  });

  test('does not change as moles or molecules', () => {
    for (const unit of ['1/s', 'mol/s', 'umol/min']) expect(referenceFactor(unit, WARM)).toBe(1);
  });
});
