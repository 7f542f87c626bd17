import { describe, expect, test } from 'vitest';
import { countElements } from '../../src/substances/formula.ts';
import { CRC_HEAT_CAPACITIES, DISAGREEMENTS } from './crc-heat-capacities.ts';
import { heatCapacities, substance, substances } from './documents.ts';

const gases = substances('gases');
const GAS_CONSTANT = 8.314462618;
const known = [...gases].flatMap(([name, gas]) =>
  gas.heat_capacity === undefined ? [] : [[name, heatCapacities(gas)] as const],
);
const MONATOMIC = ['He', 'Ne', 'Ar', 'Kr', 'Xe', 'H', 'N'];

describe('heat capacities', () => {
  test('are known for 70 gases', () => {
    expect(known).toHaveLength(70);
  });

  test.each(MONATOMIC)('of monatomic %s are 5/2 R at every temperature', (name) => {
    const values = [...heatCapacities(substance(gases, name)).values()];
    expect(values).toHaveLength(7);
    for (const value of values) expect(Math.abs(value - 2.5 * GAS_CONSTANT)).toBeLessThan(0.005);
  });

  test.each(known)('of %s start at 300 K and go on to 1000 K at least, in order', (_, values) => {
    const temperatures = [...values.keys()];
    expect(temperatures[0]).toBe(300);
    expect(temperatures.at(-1)).toBeGreaterThanOrEqual(1000);
    expect(temperatures).toEqual([...temperatures].sort((a, b) => a - b));
  });

  test.each(known.filter(([name]) => !['O', 'F', 'Cl'].includes(name)))(
    'of %s never fall with temperature',
    (_, values) => {
      const list = [...values.values()];
      expect(list).toEqual([...list].sort((a, b) => a - b));
    },
  );

  // Translation, rotation and 3n - 6 vibrations (3n - 5 of a linear molecule), each with its full share; 2 % for what
  // stretches and for the excited levels of heavy diatomic molecules.
  test.each(known.filter(([name]) => !MONATOMIC.includes(name) && !['O', 'F', 'Cl', 'air'].includes(name)))(
    'of %s stay below full equipartition',
    (name, values) => {
      const formula = String(substance(gases, name).formula);
      const atoms = [...(countElements(formula)?.values() ?? [])].reduce((sum, count) => sum + count, 0);
      for (const value of values.values()) expect(value / GAS_CONSTANT).toBeLessThan((3 * atoms - 1.5) * 1.02);
      for (const value of values.values()) expect(value / GAS_CONSTANT).toBeGreaterThan(3.4);
    },
  );

  // At 298.15 K the second source stands up to 0.7 % lower, since heat capacities grow until 300 K, and is rounded to 0.1.
  test.each(Object.entries(CRC_HEAT_CAPACITIES))('of %s agree at 300 K with the second source', (name, value) => {
    const mine = heatCapacities(substance(gases, name)).get(300);
    const allowed = DISAGREEMENTS[name] ?? 0.0075;
    expect(mine).toBeDefined();
    expect(Math.abs(Number(mine) / value - 1)).toBeLessThan(allowed);
  });

  test('air has those of its parts', () => {
    const part = (name: string) => Number(heatCapacities(substance(gases, name)).get(600));
    const sum = 0.7808 * part('N2') + 0.2095 * part('O2') + 0.0093 * part('Ar') + 0.0004 * part('CO2');
    expect(part('air')).toBeCloseTo(sum, 1);
  });
});
