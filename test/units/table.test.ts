import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fromSi, toSi } from '../../src/units/convert.ts';
import { DIMENSION_NAMES, DIMENSIONS } from '../../src/units/dimensions.ts';
import { unitSpelled, unitsOf } from '../../src/units/lookup.ts';
import { UNITS } from '../../src/units/table.ts';
import type { Dimension } from '../../src/units/dimensions.ts';

/** NIST SP 811, 2008 ed., appendix B.8, to the digits printed there (from memory). */
const SP811: readonly [name: string, dimension: Dimension, printed: number][] = [
  ['angstrom', 'length', 1.0e-10],
  ['atm', 'pressure', 1.01325e5],
  ['bar', 'pressure', 1.0e5],
  ['mbar', 'pressure', 1.0e2],
  ['Torr', 'pressure', 1.333224e2],
  ['um', 'length', 1.0e-6],
  ['mil', 'length', 2.54e-5],
  ['inch', 'length', 2.54e-2],
  ['inch2', 'area', 6.4516e-4],
  ['cfm', 'speed', 4.719474e-4],
  ['L', 'volume', 1.0e-3],
  ['eV', 'energy', 1.602177e-19],
  ['debye', 'dipole', 3.335641e-30],
  ['d', 'time', 8.64e4],
  ['deg', 'angle', 1.745329e-2],
  ['g/cm3', 'density', 1.0e3],
  ['nm/min', 'rate', 1.666667e-11],
];

/** Own arithmetic from the definitions: 101325 Pa, 273.15 K, k = 1.380649e-23 J/K, N_A = 6.02214076e23 1/mol. */
const DERIVED: readonly [name: string, dimension: Dimension, value: number][] = [
  ['sccm', 'flow', 4.477967e17],
  ['slm', 'flow', 4.477967e20],
  ['Pa m3/s', 'flow', 2.651646e20],
  ['Torr L/s', 'flow', 3.535237e19],
  ['mbar L/s', 'flow', 2.651646e19],
  ['umol/min', 'flow', 1.00369e16],
  ['langmuir', 'exposure', 1.333224e-4],
  ['mTorr/min', 'pressure-rate', 2.22204e-3],
  ['W/cm2', 'power-density', 1e4],
  ['1/cm3', 'number-density', 1e6],
  ['mTorr cm', 'pressure-length', 1.333224e-3],
];

describe('the table of units', () => {
  test.each(SP811)('%s as a %s has the factor printed in NIST SP 811', (name, dimension, printed) => {
    expect(unitSpelled(name, dimension)?.factor).toSatisfy(closeTo(printed));
  });

  test.each(DERIVED)('%s as a %s follows from its definition', (name, dimension, value) => {
    expect(unitSpelled(name, dimension)?.factor).toSatisfy(closeTo(value));
  });

  test('760 torr are exactly one atmosphere', () => {
    expect(toSi(760, unit('Torr', 'pressure'))).toBe(101325);
  });

  test('one sccm is 0.7436 umol/s (SEMI E12)', () => {
    expect(fromSi(toSi(1, unit('sccm', 'flow')), unit('umol/s', 'flow'))).toBeCloseTo(0.7436, 4);
  });

  test('a micron is a millitorr as a pressure and a micrometre as a length', () => {
    expect(unitSpelled('micron', 'pressure')?.name).toBe('mTorr');
    expect(unitSpelled('micron', 'length')?.name).toBe('um');
  });

  test('every dimension has the unit that holds its values, and the units that messages offer', () => {
    for (const dimension of DIMENSION_NAMES) {
      const { si, units } = DIMENSIONS[dimension];
      const held = unitSpelled(si === '1' ? '' : si, dimension);
      expect(held, dimension).toMatchObject({ factor: 1 });
      for (const name of units) expect(unitSpelled(name, dimension)?.name, dimension).toBe(name);
    }
  });

  test('within a dimension no spelling stands for two units', () => {
    for (const dimension of DIMENSION_NAMES) {
      const spellings = unitsOf(dimension).flatMap(({ name, others = [] }) => [name, ...others]);
      expect(new Set(spellings).size, dimension).toBe(spellings.length);
    }
  });

  test('every unit names a source, and only degC as a temperature has an offset', () => {
    for (const { source } of UNITS) expect(source).not.toBe('');
    expect(UNITS.filter(({ offset }) => offset !== undefined)).toMatchObject([
      { name: 'degC', dimension: 'temperature' },
    ]);
  });

  test('flows that count a volume or pressure times volume are marked, moles and molecules are not', () => {
    const marks = unitsOf('flow').map(({ name, standard = 'none' }) => `${name}: ${standard}`);
    expect(marks).toContain('sccm: volume');
    expect(marks).toContain('slm: volume');
    expect(marks).toContain('mbar L/s: pV');
    expect(marks).toContain('1/s: none');
    expect(marks).toContain('umol/min: none');
  });

  test('70 % is 0.7 and 3 mm is 0.003 to the last digit', () => {
    expect(toSi(70, unit('%', 'fraction'))).toBe(0.7);
    expect(toSi(3, unit('mm', 'length'))).toBe(0.003);
  });

  test('a value in any unit comes back from SI', () => {
    const numbers = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom(...UNITS), numbers, (one, number) => {
        const slack = one.offset === undefined ? 1e-15 : 1e-13;
        expect(Math.abs(fromSi(toSi(number, one), one) - number)).toBeLessThanOrEqual(slack * Math.abs(number) + 1e-13);
      }),
    );
  });
});

function unit(name: string, dimension: Dimension) {
  return unitSpelled(name, dimension) ?? expect.fail(`no ${name}`);
}

/** Within a unit of the seventh digit, as far as the tables print. */
function closeTo(printed: number) {
  return (factor: number | undefined) => factor !== undefined && Math.abs(factor / printed - 1) < 5e-7;
}
