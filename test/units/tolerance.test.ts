import { describe, expect, test } from 'vitest';
import { readAccuracy, readMeasure } from '../../src/units/read.ts';
import type { Dimension } from '../../src/units/dimensions.ts';
import type { Tolerance } from '../../src/units/measure.ts';

const SCALE = 'write it in K: a percentage depends on the scale';

const WITH_TOLERANCE: readonly [text: string, dimension: Dimension, tolerance: Tolerance][] = [
  ['4 mTorr +/- 1 %', 'pressure', { value: 0.01, of: 'reading' }],
  ['4 mTorr ± 1%', 'pressure', { value: 0.01, of: 'reading' }],
  ['4mTorr+/-1%', 'pressure', { value: 0.01, of: 'reading' }],
  ['4 mTorr +- 1 percent', 'pressure', { value: 0.01, of: 'reading' }],
  ['4 mTorr +/- 1 % of reading', 'pressure', { value: 0.01, of: 'reading' }],
  ['4 Pa +/- 50 mPa', 'pressure', { value: 0.05, of: 'value' }],
  ['4 Pa +/- 0 Pa', 'pressure', { value: 0, of: 'value' }],
  ['400 degC +/- 5 K', 'temperature', { value: 5, of: 'value' }],
  ['400 °C ± 5 °C', 'temperature', { value: 5, of: 'value' }],
  ['673 K +/- 1 %', 'temperature', { value: 0.01, of: 'reading' }],
  ['0.45 +/- 0.15', 'fraction', { value: 0.15, of: 'value' }],
  ['70 % +/- 0.02', 'fraction', { value: 0.02, of: 'value' }],
  ['70 % +/- 2 % of reading', 'fraction', { value: 0.02, of: 'reading' }],
  ['3 +/- 10 %', 'number', { value: 0.1, of: 'reading' }],
  ['-420 V +/- 5 V', 'voltage', { value: 5, of: 'value' }],
];

const FAULTY: readonly [text: string, dimension: Dimension, found: string, right: string][] = [
  [
    '4 mTorr +/- 0.05',
    'pressure',
    "tolerance '0.05' has no unit",
    'a pressure is needed, in mTorr, Torr, Pa or mbar, such as 0.05 mTorr',
  ],
  ['5 +/- 3 eV', 'energy', "'5' has no unit", 'an energy is needed, in eV, keV or J, such as 5 eV'],
  ['4 mTorr +/-', 'pressure', 'an empty tolerance', 'a percentage of the reading, or a width with its unit'],
  ['4 mTorr +/- 3 s', 'pressure', "tolerance '3 s' is a time", 'a pressure is needed, in mTorr, Torr, Pa or mbar'],
  ['4 mTorr +/- -1 %', 'pressure', "'-1 %' is below zero", 'half the width between the limits, zero or more'],
  ['4 V +/- -1 V', 'voltage', "tolerance '-1 V' is below zero", 'half the width between the limits, zero or more'],
  [
    '4 mTorr +/- 1 % of full scale',
    'pressure',
    "tolerance '1 % of full scale'",
    'a percentage of the reading, or a width with its unit',
  ],
  ['400 degC +/- 1 %', 'temperature', "tolerance '1 %' of a temperature in degC", SCALE],
  [
    '70 % +/- 2 %',
    'fraction',
    "tolerance '2 %' of a fraction",
    'write 2 % of reading, or 0.02 for a share of the whole',
  ],
  ['100 sccm +/- 1 Torr L/s', 'flow', "tolerance '1 Torr L/s' is counted otherwise than its flow", 'write it in sccm'],
];

describe('a tolerance', () => {
  test.each(WITH_TOLERANCE)('of %j is read', (text, dimension, { value, of }) => {
    const close: unknown = expect.closeTo(value, 12);
    const tolerance = { value: close, of };
    expect(readMeasure(text, dimension, { tolerance: true })).toMatchObject({ dimension, tolerance });
  });

  test.each(FAULTY)('of %j is refused with what would be right', (text, dimension, found, right) => {
    expect(readMeasure(text, dimension, { tolerance: true })).toEqual({ found, right });
  });

  test('is absent where none is written', () => {
    expect(readMeasure('4 mTorr', 'pressure', { tolerance: true })).not.toHaveProperty('tolerance');
  });
});

describe('an accuracy', () => {
  test.each<[string | number, Dimension, Tolerance]>([
    ['1 % of full scale', 'flow', { value: 0.01, of: 'full scale' }],
    ['0.25 % of reading', 'pressure', { value: 0.0025, of: 'reading' }],
    ['0.25 percent of  reading', 'pressure', { value: 0.0025, of: 'reading' }],
    ['0.25 %of reading', 'pressure', { value: 0.0025, of: 'reading' }],
    ['0.1 s', 'time', { value: 0.1, of: 'value' }],
    ['+/- 0.1 s', 'time', { value: 0.1, of: 'value' }],
    ['5 K', 'temperature', { value: 5, of: 'value' }],
    ['5 °C', 'temperature', { value: 5, of: 'value' }],
    [0.05, 'fraction', { value: 0.05, of: 'value' }],
  ])('%j of a %s is read', (text, dimension, tolerance) => {
    expect(readAccuracy(text, dimension)).toEqual(tolerance);
  });

  test.each<[string | number, Dimension, string, string]>([
    ['1 %', 'flow', "'1 %' does not say of what", 'write 1 % of reading or 1 % of full scale'],
    ['1 % of rdg', 'flow', "'1 % of rdg' does not say of what", 'write 1 % of reading or 1 % of full scale'],
    ['1 % of reading', 'temperature', "'1 % of reading' of a temperature", SCALE],
    ['-1 % of reading', 'flow', "'-1 % of reading' is below zero", 'half the width between the limits, zero or more'],
    ['-1 K', 'temperature', "'-1 K' is below zero", 'half the width between the limits, zero or more'],
    [-1, 'number', "'-1' is below zero", 'half the width between the limits, zero or more'],
    [0.1, 'time', "'0.1' has no unit", 'a time is needed, in s, min, h or ms, such as 0.1 s'],
    ['4 sccm', 'time', "'4 sccm' is a flow", 'a time is needed, in s, min, h or ms'],
    ['x'.repeat(201), 'time', `'${'x'.repeat(60)}…' has 201 characters`, 'a value of at most 200'],
  ])('%j of a %s is refused with what would be right', (text, dimension, found, right) => {
    expect(readAccuracy(text, dimension)).toEqual({ found, right });
  });
});
