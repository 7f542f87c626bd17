import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { DIMENSION_NAMES } from '../../src/units/dimensions.ts';
import { displayUnit, printMeasure, printNumber, printTime, printUncertain, toUnit } from '../../src/units/display.ts';
import { unitSpelled } from '../../src/units/lookup.ts';
import { isUnitFault, readMeasure } from '../../src/units/read.ts';
import { UNITS } from '../../src/units/table.ts';
import type { Dimension } from '../../src/units/dimensions.ts';

describe('a printed number', () => {
  test.each([
    [0, '0'],
    [-0, '0'],
    [30, '30'],
    [2.6, '2.6'],
    [1 / 3, '0.3333'],
    [-1 / 3, '-0.3333'],
    [12345, '12350'],
    [0.001, '0.001'],
    [0.00123456, '0.001235'],
    [1.2e-6, '1.2e-6'],
    [0.00099994, '9.999e-4'],
    [0.00099996, '0.001'],
    [99994, '99990'],
    [99996, '1e5'],
    [4e16, '4e16'],
    [-4.47796e17, '-4.478e17'],
    [5e-324, '0'],
    [Number.NaN, 'unknown'],
    [Infinity, 'unknown'],
  ])('%d without an uncertainty has at most four significant digits: %s', (value, text) => {
    expect(printNumber(value)).toBe(text);
  });

  test.each([
    [2.634, 0.52, '2.63 ± 0.52'],
    [2.6, 0.5, '2.60 ± 0.50'],
    [2.634, 0.0996, '2.63 ± 0.10'],
    [2.634, 12, '3 ± 12'],
    [0.3, 12, '0 ± 12'],
    [-0.3, 12, '0 ± 12'],
    [12345, 1234, '12300 ± 1200'],
    [1234.5678, 0.012, '1235'],
    [1234.5678, 0.6, '1235 ± 1'],
    [9.9996, 0.0052, '10.00 ± 0.01'],
    [1.234e-6, 1.2e-7, '1.23e-6 ± 0.12e-6'],
    [1.2e-9, 3.4e-4, '0.0e-4 ± 3.4e-4'],
    [4.4779e17, 8e15, '4.478e17 ± 0.080e17'],
    [0, 0.52, '0.00 ± 0.52'],
    [2.634, 0, '2.634'],
    [2.634, Number.NaN, '2.634'],
    [2.634, Infinity, '2.634'],
    [Number.NaN, 1, 'unknown'],
  ])('%d with an expanded uncertainty of %d goes to its second digit: %s', (value, uncertainty, text) => {
    expect(printUncertain(value, uncertainty)).toBe(text);
  });

  test('is never infinite or NaN, and as near as its digits say', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e300, max: 1e300, noNaN: true }), fc.double({ min: 0 }), (value, uncertainty) => {
        const text = printUncertain(value, uncertainty);
        expect(text).not.toMatch(/NaN|Infinity/);
        const slack = 5.1e-4 * Math.abs(value) + (Number.isFinite(uncertainty) ? 0.51 * uncertainty : 0) + 1e-300;
        expect(Math.abs(Number(text.split(' ± ')[0]) - value)).toBeLessThanOrEqual(slack);
      }),
      { numRuns: 1000 },
    );
  });
});

describe('a printed measure', () => {
  test.each<[number, Dimension, string]>([
    [0.0026, 'length', '2.6 mm'],
    [6.76e-8, 'length', '67.6 nm'],
    [0.46, 'length', '460 mm'],
    [3.9996710526, 'pressure', '30 mTorr'],
    [2.6664473684e-4, 'pressure', '2e-6 Torr'],
    [101325, 'pressure', '760 Torr'],
    [0, 'pressure', '0 mTorr'],
    [338.15, 'temperature', '65 degC'],
    [1.7911867e19, 'flow', '40 sccm'],
    [1.1194917e22, 'flow', '25 slm'],
    [85, 'time', '85 s'],
    [0.012, 'time', '12 ms'],
    [4e16, 'number-density', '4e10 1/cm3'],
    [0.3, 'fraction', '0.3'],
    [0.3, 'number', '0.3'],
    [Number.NaN, 'pressure', 'unknown'],
  ])('%d as a %s stands in a unit that fits its size: %s', (value, dimension, text) => {
    expect(printMeasure(value, dimension)).toBe(text);
  });

  test('stands in the unit that is asked for', () => {
    expect(printMeasure(3.9996710526, 'pressure', { unit: 'Pa' })).toBe('4 Pa');
    expect(printMeasure(0.12, 'fraction', { unit: '%' })).toBe('12 %');
    expect(printMeasure(0.12, 'number', { unit: '1' })).toBe('0.12');
    expect(printMeasure(293.15, 'temperature', { unit: 'K' })).toBe('293.1 K');
  });

  test('carries its expanded uncertainty in the same unit', () => {
    expect(printMeasure(0.002634, 'length', { uncertainty: 0.00052 })).toBe('2.63 ± 0.52 mm');
    expect(printMeasure(338.15, 'temperature', { uncertainty: 5 })).toBe('65.0 ± 5.0 degC');
    expect(printMeasure(2.634, 'number', { uncertainty: 0.52 })).toBe('2.63 ± 0.52');
  });

  test('of a flow counts at the reference of its chamber', () => {
    const reference = { temperature: 293.15, pressure: 101325 };
    const flow = 1.7911867e19 * (273.15 / 293.15);
    expect(printMeasure(flow, 'flow', { unit: 'sccm', reference })).toBe('40 sccm');
    expect(printMeasure(flow, 'flow', { unit: 'sccm' })).toBe('37.27 sccm');
  });

  test('reads back as the same value', () => {
    fc.assert(
      fc.property(fc.constantFrom(...UNITS), fc.double({ min: 1e-3, max: 1e6, noNaN: true }), (unit, number) => {
        const value = number * unit.factor + (unit.offset ?? 0);
        expectSame(printMeasure(value, unit.dimension, { unit: unit.name }), unit.dimension, value, unit.offset);
        expectSame(printMeasure(value, unit.dimension), unit.dimension, value, 273.15);
      }),
      { numRuns: 1000 },
    );
  });

  test('stands in a unit of its dimension whatever its size', () => {
    fc.assert(
      fc.property(fc.constantFrom(...DIMENSION_NAMES), fc.double({ noNaN: true }), (dimension, value) => {
        expect(unitSpelled(displayUnit(value, dimension), dimension)).toBeDefined();
      }),
    );
  });
});

describe('a value in units', () => {
  test('is the SI value over the factor, less the offset', () => {
    expect(toUnit(338.15, 'degC', 'temperature')).toBeCloseTo(65, 10);
    expect(toUnit(5, 'degC', 'temperature-difference')).toBe(5);
    expect(toUnit(0.027, 'mm', 'length')).toBe(27);
    expect(toUnit(0.3, '1', 'fraction')).toBe(0.3);
  });
});

describe('a printed time', () => {
  test.each([
    [0, '0 s'],
    [0.25, '0.25 s'],
    [85, '85 s'],
    [119.4, '119.4 s'],
    [119.6, '2 min'],
    [227, '3 min 47 s'],
    [240.2, '4 min'],
    [3599.7, '1 h'],
    [7500, '2 h 5 min'],
    [Infinity, 'unknown'],
  ])('of %d s is %s', (seconds, text) => {
    expect(printTime(seconds)).toBe(text);
  });
});

function expectSame(text: string, dimension: Dimension, value: number, offset = 0): void {
  const read = readMeasure(text, dimension);
  if (isUnitFault(read)) expect.fail(`${text}: ${read.found}`);
  expect(Math.abs(read.value - value)).toBeLessThanOrEqual(
    5.1e-4 * (Math.abs(value) + (dimension === 'temperature' ? offset : 0)),
  );
}
