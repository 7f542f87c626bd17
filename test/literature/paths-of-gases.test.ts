import { describe, expect, test } from 'vitest';
import { collisionFrequency, meanFreePath, pathFromViscosity } from '../../src/physics/collisions.ts';
import { meanSpeed, numberDensity } from '../../src/physics/state.ts';
import { viscosity } from '../../src/physics/transport.ts';
import { gasNamed, pathOf } from './built-in-gases.ts';
import { table, type Table } from './rows.ts';
import { factorOf } from './units.ts';

/** Fields of a row in SI, by the first word of the column's name. */
function fields({ columns }: Table, row: readonly (number | null)[]): (column: string) => number {
  return (column) => {
    const index = columns.findIndex((name) => name.startsWith(column));
    const unit = /\[(.+)\]/.exec(columns[index] ?? '')?.[1] ?? '1';
    return (row[index] ?? NaN) * factorOf(unit);
  };
}

function within(actual: number, expected: number, tolerance: number): void {
  expect(Math.abs(actual / expected - 1), `${actual} against ${expected}`).toBeLessThanOrEqual(tolerance);
}

describe('mean free paths at 25 degC and 100 kPa, CRC Handbook', () => {
  const paths = table('mean-free-path');
  const [pressure, temperature] = [1e5, 298.15];

  test.each(Object.entries(paths.values))(
    '%s: diameter, path, speed, time and viscosity of the table agree by the laws',
    (gas, row) => {
      const field = fields(paths, row);
      const { molarMass } = gasNamed(gas);
      const path = meanFreePath(molarMass, [numberDensity(pressure, temperature)], [field('diameter')], [molarMass]);
      within(path, field('path'), 0.005);
      within(meanSpeed(molarMass, temperature), field('mean speed'), 0.003);
      within(1 / collisionFrequency(field('mean speed'), field('path')), field('time'), 0.006);
      within(viscosity(molarMass, temperature, field('diameter')), field('viscosity'), 0.006);
      within(pathFromViscosity(field('viscosity'), pressure, molarMass, temperature), field('path'), 0.006);
    },
  );

  /** Neon: its pair gives a viscosity 2.7 % low. */
  test.each(Object.keys(paths.values))('%s: the path from the built-in pair agrees', (gas) => {
    const published = fields(paths, paths.values[gas] ?? [])('path');
    within(pathOf(gasNamed(gas), pressure, temperature), published, gas === 'Ne' ? 0.027 : 0.015);
  });
});

describe('mean free paths at 0 degC and 1 atm, Kaye & Laby', () => {
  const paths = table('path-0-degC');

  test.each(Object.entries(paths.values))('%s', (gas, row) => {
    const field = fields(paths, row);
    const { molarMass } = gasNamed(gas);
    within(meanSpeed(molarMass, 273.15), field('mean speed'), 0.003);
    within(1 / collisionFrequency(field('mean speed'), field('path')), field('time'), 0.006);
    within(pathOf(gasNamed(gas), 101325, 273.15), field('path'), 0.027);
  });
});

describe('path times pressure at 0 degC, a vacuum handbook', () => {
  const products = table('path-times-pressure');
  const gases = Object.entries(products.values).filter(([gas]) => gas !== 'air');

  /** Diameters of tables differ by up to 5 %. */
  test.each(gases)('%s', (gas, row) => {
    within(pathOf(gasNamed(gas), 1, 273.15), fields(products, row)('path'), 0.05);
  });
});

describe('Bird’s variable hard sphere', () => {
  const spheres = table('variable-hard-sphere');

  test.each(Object.entries(spheres.values))('%s: the diameter follows from viscosity and exponent', (gas, row) => {
    const field = fields(spheres, row);
    const { molarMass } = gasNamed(gas);
    const hardSphere = Math.sqrt(viscosity(molarMass, 273, 1) / field('viscosity'));
    const exponent = field('exponent');
    within(hardSphere * Math.sqrt(24 / ((5 - 2 * exponent) * (7 - 2 * exponent))), field('diameter'), 0.004);
  });
});
