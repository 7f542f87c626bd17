import { describe, expect, test } from 'vitest';
import { block, si, substance, substances } from './documents.ts';
import type { Block } from './documents.ts';

const gases = substances('gases');
const ATMOSPHERE = 101325;

/**
 * Normal boiling points [K] (HfCl4: sublimation point): CRC Handbook of Chemistry and Physics, 95th ed. (2014), physical
 * constants of inorganic and of organic compounds. Printed boiling points of one substance differ by a kelvin or two.
 */
const BOILING: readonly (readonly [name: string, kelvin: number])[] = [
  ['H2O', 373.124],
  ['TiCl4', 409.6],
  ['SiCl4', 330.8],
  ['SiHCl3', 306.15],
  ['WF6', 290.25],
  ['BCl3', 285.65],
  ['BBr3', 364.45],
  ['HF', 293.15],
  ['Br2', 331.95],
  ['ClF3', 284.9],
  ['CCl4', 349.85],
  ['CH3OH', 337.65],
  ['C2H5OH', 351.39],
  ['TMA', 400.26],
  ['TEOS', 441.15],
  ['HfCl4', 590.15],
];

describe('vapour pressures', () => {
  test.each(BOILING)('%s reaches one atmosphere within 2 K of its boiling point', (name, kelvin) => {
    const { a, b, c } = antoine(substance(gases, name));
    const boiling = Number(b) / (Number(a) - Math.log10(ATMOSPHERE)) - Number(c);
    expect(Math.abs(boiling - kelvin)).toBeLessThan(2);
  });

  test('TDMAT has 13 to 16 Pa at 25 degC', () => {
    expect(pressure('TDMAT', 298.15)).toBeGreaterThan(13);
    expect(pressure('TDMAT', 298.15)).toBeLessThan(16);
  });

  test('TMA has 8.7 Torr at 20 degC', () => {
    expect(pressure('TMA', 293.15) / 133.322).toBeCloseTo(8.74, 1);
  });

  test('water has 2339 Pa at 20 degC (Wagner & Pruß 2002)', () => {
    expect(Math.abs(pressure('H2O', 293.15) / 2339 - 1)).toBeLessThan(0.004);
  });

  test('are given for 17 gases, each over a range that is one', () => {
    const given = [...gases].filter(([, gas]) => gas.vapour_pressure !== undefined);
    expect(given).toHaveLength(17);
    for (const [, gas] of given) {
      const { from, to } = antoine(gas);
      expect(si(from, 'temperature')).toBeLessThan(si(to, 'temperature'));
    }
  });
});

function pressure(name: string, kelvin: number): number {
  const { a, b, c } = antoine(substance(gases, name));
  return 10 ** (Number(a) - Number(b) / (kelvin + Number(c)));
}

function antoine(gas: Block): Block {
  return block(gas.vapour_pressure, 'vapour_pressure');
}
