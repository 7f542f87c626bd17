import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { DIMENSION_NAMES } from '../../src/units/dimensions.ts';
import { isUnitFault, readMeasure } from '../../src/units/read.ts';
import { UNITS } from '../../src/units/table.ts';
import type { Dimension, Dimensions } from '../../src/units/dimensions.ts';

const MTORR = 0.1333223684210526;

const ACCEPTED: readonly [text: string | number, dimension: Dimensions, value: number, unit: string][] = [
  ['4 mTorr', 'pressure', 4 * MTORR, 'mTorr'],
  ['4mTorr', 'pressure', 4 * MTORR, 'mTorr'],
  ['  4 \t mTorr ', 'pressure', 4 * MTORR, 'mTorr'],
  ['+4 mT', 'pressure', 4 * MTORR, 'mTorr'],
  ['2 micron', 'pressure', 2 * MTORR, 'mTorr'],
  ['2 micron', 'length', 2e-6, 'um'],
  ['2.5e-6 Torr', 'pressure', 2.5e-3 * MTORR, 'Torr'],
  ['2.5E+2 Pa', 'pressure', 250, 'Pa'],
  ['.5 um', 'length', 5e-7, 'um'],
  ['5. um', 'length', 5e-6, 'um'],
  ['0 Pa', 'pressure', 0, 'Pa'],
  ['-0 Pa', 'pressure', 0, 'Pa'],
  ['65 degC', 'temperature', 338.15, 'degC'],
  ['65 °C', 'temperature', 338.15, 'degC'],
  ['65 ℃', 'temperature', 338.15, 'degC'],
  ['-273.15 degC', 'temperature', 0, 'degC'],
  ['300 \u212a', 'temperature', 300, 'K'],
  ['5 degC', 'temperature-difference', 5, 'degC'],
  ['2 \u00b5m', 'length', 2e-6, 'um'],
  ['2 \u03bcm', 'length', 2e-6, 'um'],
  ['3.33 \u00c5', 'length', 3.33e-10, 'angstrom'],
  ['3.33 \u212b', 'length', 3.33e-10, 'angstrom'],
  ['3.33 A\u030a', 'length', 3.33e-10, 'angstrom'],
  ['60 A/min', 'rate', 1e-10, 'angstrom/min'],
  ['27\u00a0mm', 'length', 0.027, 'mm'],
  ['27\u2009mm', 'length', 0.027, 'mm'],
  ['27\u202fmm', 'length', 0.027, 'mm'],
  ['1 Torr·L/s', 'flow', 3.53523692e19, 'Torr L/s'],
  ['1 Pa m³/s', 'flow', 2.6516458e20, 'Pa m3/s'],
  ['1 Pa*m^3 / s', 'flow', 2.6516458e20, 'Pa m3/s'],
  ['4e10 cm⁻³', 'number-density', 4e16, '1/cm3'],
  ['4e10 cm-3', 'number-density', 4e16, '1/cm3'],
  ['4e10 1/cm3', 'number-density', 4e16, '1/cm3'],
  ['4e10/cm^3', 'number-density', 4e16, '1/cm3'],
  ['1.2 W m⁻² K⁻¹', 'conductance', 1.2, 'W/(m2 K)'],
  ['4eV', 'energy', 6.408706536e-19, 'eV'],
  ['12 %', 'fraction', 0.12, '%'],
  ['12percent', 'fraction', 0.12, '%'],
  ['0.3', 'fraction', 0.3, ''],
  [0.3, 'fraction', 0.3, ''],
  ['3', 'number', 3, ''],
  [-3, 'number', -3, ''],
  ['-420 V', 'voltage', -420, 'V'],
  ['40 sccm', ['flow', 'amount'], 1.79118674e19, 'sccm'],
  ['2.4 umol', ['flow', 'amount'], 2.4e-6, 'umol'],
  ['500 L/min', 'speed', 0.5 / 60, 'L/min'],
];

const PRESSURES = 'a pressure is needed, in mTorr, Torr, Pa or mbar';
const PLAIN_MINUS = 'write the minus sign of the keyboard, -';

const REFUSED: readonly [text: string | number, dimension: Dimensions, found: string, right: string][] = [
  ['', 'pressure', 'an empty value', PRESSURES],
  ['   ', 'pressure', 'an empty value', PRESSURES],
  ['30', 'pressure', "'30' has no unit", `${PRESSURES}, such as 30 mTorr`],
  [30, 'pressure', "'30' has no unit", `${PRESSURES}, such as 30 mTorr`],
  ['mTorr', 'pressure', "'mTorr' does not start with a number", `a number, then its unit; ${PRESSURES}`],
  ['~4 mTorr', 'pressure', "'~4 mTorr' does not start with a number", `a number, then its unit; ${PRESSURES}`],
  ['. mTorr', 'pressure', "'. mTorr' does not start with a number", `a number, then its unit; ${PRESSURES}`],
  ['4 5 mTorr', 'pressure', "'4 5 mTorr' has two numbers", 'write one number; limits as at_least and at_most'],
  ['4-5 mTorr', 'pressure', "'4-5 mTorr' has two numbers", 'write one number; limits as at_least and at_most'],
  ['4 to 5 mTorr', 'pressure', "'4 to 5 mTorr' has two numbers", 'write one number; limits as at_least and at_most'],
  ['1/2 inch', 'length', "'1/2 inch' has two numbers", 'write 0.5'],
  [
    '1 000 sccm',
    'flow',
    "'1 000 sccm' has two numbers",
    'write 1000 without a blank, or one number; limits as at_least and at_most',
  ],
  ['1,5 Torr', 'pressure', "'1,5 Torr' has a comma in its number", 'write 1.5'],
  [
    '1,000 sccm',
    'flow',
    "'1,000 sccm' has a comma in its number",
    'write 1.000 for a decimal comma, 1000 if it groups digits',
  ],
  ['1_000 sccm', 'flow', "'1_000 sccm' has an underscore in its number", 'write 1000'],
  ['0x10 Pa', 'pressure', "'0x10 Pa' is not a decimal number", 'write 16'],
  ['0o17 Pa', 'pressure', "'0o17 Pa' is not a decimal number", 'write 15'],
  ['4 x 10^10 1/cm3', 'number-density', "'4 x 10^10 1/cm3' has a power of ten", 'write 4e10'],
  ['4×10¹⁰ cm⁻³', 'number-density', "'4×10¹⁰ cm⁻³' has a power of ten", 'write 4e10'],
  ['1e400 Pa', 'pressure', "'1e400 Pa' is beyond what can be computed with", 'a number between 1e-290 and 1e290'],
  ['1e305 slm', 'flow', "'1e305 slm' is beyond what can be computed with", 'a number between 1e-290 and 1e290'],
  ['1e-400 Pa', 'pressure', "'1e-400 Pa' is beyond what can be computed with", 'a number between 1e-290 and 1e290'],
  ['.inf', 'pressure', "'.inf' is no measurable number", `a finite number; ${PRESSURES}`],
  [
    '-Infinity',
    'number',
    "'-Infinity' is no measurable number",
    'a finite number; a plain number is needed, without a unit',
  ],
  [Number.NaN, 'pressure', "'NaN' is no measurable number", `a finite number; ${PRESSURES}`],
  ['−5 degC', 'temperature', "'−5 degC' has the dash U+2212", PLAIN_MINUS],
  ['4e10 cm−3', 'number-density', "'4e10 cm−3' has the dash U+2212", PLAIN_MINUS],
  ['4–5 mTorr', 'pressure', "'4–5 mTorr' has the dash U+2013", `${PLAIN_MINUS}, or limits as at_least and at_most`],
  ['３０ mTorr', 'pressure', "'３０ mTorr' has full-width characters", 'write 30 mTorr'],
  ['12 ％', 'fraction', "'12 ％' has full-width characters", 'write 12 %'],
  ['4 mtorr', 'pressure', "'4 mtorr'", 'write mTorr'],
  ['4 MTORR', 'pressure', "'4 MTORR'", 'write mTorr'],
  ['4 pa', 'pressure', "'4 pa'", 'write Pa'],
  ['4 mpa', 'pressure', "'4 mpa'", 'write mPa or MPa'],
  ['5 SCCM', 'flow', "'5 SCCM'", 'write sccm'],
  ['5 kw', 'power', "'5 kw'", 'write kW'],
  ['5 mw', 'power', "'5 mw'", 'write mW or MW'],
  ['13.56 mhz', 'frequency', "'13.56 mhz'", 'write MHz'],
  ['30 s', 'pressure', "'30 s' is a time", PRESSURES],
  ['30 mTorr', 'time', "'30 mTorr' is a pressure", 'a time is needed, in s, min, h or ms'],
  ['3 mm', 'number', "'3 mm' is a length", 'a plain number is needed, without a unit'],
  ['3 %', 'number', "'3 %' is a fraction", 'a plain number is needed, without a unit'],
  ['3 mm', 'fraction', "'3 mm' is a length", 'a fraction is needed, bare or in % or ppm'],
  [
    '3 s',
    ['flow', 'amount'],
    "'3 s' is a time",
    'needed is a flow in sccm, slm, Pa m3/s or umol/s, or an amount in umol, nmol or mol',
  ],
  [
    '14.7 psi',
    'pressure',
    "'14.7 psi'",
    'absolute or gauge? write the absolute pressure in kPa or Torr (1 psi is 6.895 kPa)',
  ],
  [
    '3 cmHg',
    'pressure',
    "'3 cmHg'",
    'absolute, or below atmosphere? write the absolute pressure in Torr (1 cmHg is 10 Torr)',
  ],
  ['2 BARG', 'pressure', "'2 BARG'", 'add the pressure outside; write the absolute pressure in kPa, bar or Torr'],
  [
    '2 L/min',
    'flow',
    "'2 L/min'",
    'at which temperature and pressure is the volume counted? write sccm or slm for a standard volume, ' +
      'Pa m3/s or Torr L/s for pressure times volume',
  ],
  ['65 C', 'temperature', "'65 C'", 'write degC'],
  ['150 °F', 'temperature', "'150 °F'", 'write degC: subtract 32, divide by 1.8'],
  ['3 m', 'time', "'3 m'", 'write min for minutes'],
  ['4 mTor', 'pressure', "'4 mTor' has no known unit", `perhaps mTorr; ${PRESSURES}`],
  ['4 wombats', 'pressure', "'4 wombats' has no known unit", PRESSURES],
  ['4² mTorr', 'pressure', "'4² mTorr' has no known unit", `perhaps mTorr; ${PRESSURES}`],
  ['-4 mTorr', 'pressure', "'-4 mTorr' is below zero", 'a pressure of zero or more'],
  ['-1 s', 'time', "'-1 s' is below zero", 'a time of zero or more'],
  ['-1 sccm', 'flow', "'-1 sccm' is below zero", 'a flow of zero or more'],
  ['-300 degC', 'temperature', "'-300 degC' is below absolute zero", 'a temperature of at least -273.15 degC'],
  ['-1 K', 'temperature', "'-1 K' is below absolute zero", 'a temperature of at least -273.15 degC'],
  ['4 mTorr +/- 1 %', 'pressure', "'4 mTorr +/- 1 %' has a tolerance", 'a value alone: 4 mTorr'],
];

describe('reading a value with its unit', () => {
  test.each(ACCEPTED)('%j as %j is read', (text, dimension, value, unit) => {
    const measure = readMeasure(text, dimension);
    if (isUnitFault(measure)) expect.fail(`${measure.found}: ${measure.right}`);
    expect(Math.abs(measure.value - value)).toBeLessThanOrEqual(1e-7 * Math.abs(value));
    expect(measure.unit).toBe(unit);
    expect(Object.is(measure.value, -0)).toBe(false);
  });

  test.each(REFUSED)('%j as %j is refused with what would be right', (text, dimension, found, right) => {
    expect(readMeasure(text, dimension)).toEqual({ found, right });
  });

  test('of several dimensions that which has the unit is read', () => {
    expect(readMeasure('2.4 umol', ['flow', 'amount'])).toMatchObject({ dimension: 'amount' });
    expect(readMeasure('2.4 sccm', ['flow', 'amount'])).toMatchObject({ dimension: 'flow' });
  });

  test('a difference of flows may be negative and has the units of a flow', () => {
    expect(readMeasure('-0.5 sccm', 'flow-difference')).toMatchObject({ dimension: 'flow-difference', unit: 'sccm' });
  });

  test('more than 200 characters are refused unread', () => {
    const text = `4 ${'m'.repeat(300)}`;
    expect(readMeasure(text, 'pressure')).toEqual({
      found: `'4 ${'m'.repeat(58)}…' has 302 characters`,
      right: 'a value of at most 200',
    });
  });

  test('characters that would disturb a terminal are written as their code', () => {
    expect(readMeasure('4 \u001b[31m\u202emTorr', 'pressure')).toMatchObject({
      found: "'4 U+001B[31mU+202EmTorr' has no known unit",
    });
  });

  test('every spelling of the table is read in its dimension', () => {
    for (const { name, others = [], dimension } of UNITS) {
      for (const spelling of [name, ...others]) {
        expect(readMeasure(`2 ${spelling}`, dimension), spelling).toMatchObject({ dimension, unit: name });
      }
    }
  });

  test('any text gives a finite measure or a fault with two clauses', () => {
    const texts = fc.string({ unit: 'binary', maxLength: 220 });
    const pieces = fc.array(fc.constantFrom(...PIECES), { maxLength: 12 }).map((list) => list.join(''));
    fc.assert(
      fc.property(
        fc.oneof(texts, pieces),
        fc.constantFrom(...DIMENSION_NAMES),
        fc.boolean(),
        (text, dimension, tolerance) => {
          expectMeasureOrFault(text, dimension, tolerance);
        },
      ),
      { numRuns: 2000 },
    );
  });

  test('any number gives a finite measure or a fault', () => {
    fc.assert(
      fc.property(fc.double(), fc.constantFrom(...DIMENSION_NAMES), (number, dimension) => {
        expectMeasureOrFault(number, dimension, false);
      }),
    );
  });
});

/** What hostile values are made of. */
const PIECES = [
  '4',
  '-',
  '+',
  '.',
  'e',
  '1e9',
  ' ',
  ',',
  '_',
  '0x',
  '/',
  '±',
  '+/-',
  '%',
  ' of reading',
  'mTorr',
  'Torr',
].concat(['mm', '°', 'µ', '³', '⁻', '−', '×', '10', '^', '*', 'inf', 'NaN', '1/', 'cm3', '(', ')', '\u0000', '\ud800']);

function expectMeasureOrFault(text: string | number, dimension: Dimension, tolerance: boolean): void {
  const result = readMeasure(text, dimension, { tolerance });
  if (isUnitFault(result)) {
    expect(result.found).not.toBe('');
    expect(result.right).not.toBe('');
    return;
  }
  expect(Number.isFinite(result.value)).toBe(true);
  expect(result.dimension).toBe(dimension);
  if (result.tolerance !== undefined) expect(result.tolerance.value).toBeGreaterThanOrEqual(0);
}
