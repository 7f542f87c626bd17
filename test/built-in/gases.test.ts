import { describe, expect, test } from 'vitest';
import { formulaMass } from './atomic-weights.ts';
import { block, isBlock, si, substance, substances, texts } from './documents.ts';
import type { Block } from './documents.ts';

const gases = substances('gases');
const entries = [...gases];
const HAZARDS = ['flammable', 'pyrophoric', 'toxic', 'corrosive', 'oxidising', 'asphyxiant'];
const NO_FORMULA = ['air'];
const NO_PAIR = ['TDMAH'];
const NOBLE = ['He', 'Ne', 'Ar', 'Kr', 'Xe'];

describe('the built-in gases', () => {
  test('are 77: 68 gases, 4 vapours of liquid sources and 5 radicals', () => {
    expect(gases.size).toBe(77);
    expect(['TMA', 'TEOS', 'TDMAT', 'TDMAH', 'H', 'N', 'O', 'F', 'Cl'].filter((name) => !gases.has(name))).toEqual([]);
  });

  test.each(entries)('%s has a title, a molar mass and a source', (_, gas) => {
    expect(gas.title).toBeTypeOf('string');
    expect(si(gas.molar_mass, 'molar-mass')).toBeGreaterThan(1e-3);
    expect(gas.source).toBeTypeOf('string');
  });

  test('have a formula, but air', () => {
    expect(entries.filter(([, gas]) => gas.formula === undefined).map(([name]) => name)).toEqual(NO_FORMULA);
  });

  test.each(entries.filter(([name]) => !NO_FORMULA.includes(name)))('%s weighs what its formula weighs', (_, gas) => {
    const mass = si(gas.molar_mass, 'molar-mass') * 1000;
    expect(Math.abs(mass / formulaMass(String(gas.formula)) - 1)).toBeLessThan(2e-4);
  });

  test('have a collision pair and its accuracy, but those for which nothing is published', () => {
    expect(entries.filter(([, gas]) => !isBlock(gas.collision)).map(([name]) => name)).toEqual(NO_PAIR);
    expect(entries.filter(([, gas]) => !isBlock(gas.accuracy)).map(([name]) => name)).toEqual(NO_PAIR);
    for (const name of NO_PAIR) expect(texts(substance(gases, name).remarks).join(' ')).toMatch(/missing/);
  });
});

describe('collision pairs', () => {
  const paired = entries.filter(([, gas]) => isBlock(gas.collision));

  test.each(paired)('of %s lie between those of helium and of the largest molecules', (_, gas) => {
    const pair = block(gas.collision, 'collision');
    expect(si(pair.diameter, 'length')).toBeGreaterThan(2.5e-10);
    expect(si(pair.diameter, 'length')).toBeLessThan(7.5e-10);
    expect(si(pair.well_depth, 'temperature')).toBeGreaterThan(10);
    expect(si(pair.well_depth, 'temperature')).toBeLessThan(600);
  });

  test('are fitted with the dipole for H2O, NH3 and CHF3 alone, and these have one', () => {
    const polar = paired.filter(([, gas]) => block(gas.collision, 'collision').form === 'stockmayer');
    expect(polar.map(([name]) => name).sort()).toEqual(['CHF3', 'H2O', 'NH3']);
    for (const [, gas] of polar) expect(si(block(gas.dipole, 'dipole').is, 'dipole')).toBeGreaterThan(4e-30);
    expect(paired.length - polar.length).toBe(73);
  });

  test('from a rule are marked estimated and carry at least 10 %', () => {
    const estimated = paired.filter(([, gas]) => block(gas.collision, 'collision').estimated !== undefined);
    expect(estimated).toHaveLength(20);
    for (const [name, gas] of estimated) expect(accuracy(gas, 'viscosity'), name).toBeGreaterThanOrEqual(0.1);
  });

  test.each(['TMA', 'TDMAT', 'C5F8', 'ClF3'])('of %s carry 20 %, since what the rule rests on is weak', (name) => {
    expect(accuracy(substance(gases, name), 'viscosity')).toBe(0.2);
    expect(accuracy(substance(gases, name), 'diffusion')).toBe(0.2);
  });

  test.each(paired)('of %s are trusted to 1 % in viscosity and 3 % in diffusion at best', (_, gas) => {
    expect(accuracy(gas, 'viscosity')).toBeGreaterThanOrEqual(0.01);
    expect(accuracy(gas, 'diffusion')).toBeGreaterThanOrEqual(0.03);
    expect(accuracy(gas, 'diffusion')).toBeLessThanOrEqual(0.25);
  });

  // Critical temperature over well depth is 1.3 (Bird, Stewart & Lightfoot, eq. 1.4-11a) within what polar gases spread.
  test.each(paired.filter(([name, gas]) => isBlock(gas.critical) && !['He', 'H2', 'D2'].includes(name)))(
    'of %s agree with its critical temperature as molecules do',
    (_, gas) => {
      const ratio =
        si(block(gas.critical, 'critical').temperature, 'temperature') /
        si(block(gas.collision, 'collision').well_depth, 'temperature');
      expect(ratio).toBeGreaterThan(0.8);
      expect(ratio).toBeLessThan(2.1);
    },
  );
});

describe('what a gas does', () => {
  test('hazards are words of the vocabulary', () => {
    expect(entries.flatMap(([, gas]) => texts(gas.hazards)).filter((word) => !HAZARDS.includes(word))).toEqual([]);
  });

  test.each(entries.filter(([, gas]) => texts(gas.hazards).includes('flammable')))(
    '%s burns: it has an ignition range, or a remark that says why not',
    (_, gas) => {
      if (gas.flammable_range === undefined) expect(texts(gas.remarks).join(' ')).toMatch(/ignition range|limits/);
      else expect(ignitionRange(gas)).toSatisfy(([low, high]: readonly number[]) => within(low, high));
    },
  );

  test('nothing has an ignition range that is not flammable, and what is pyrophoric is flammable', () => {
    const cold = entries.filter(([, gas]) => !texts(gas.hazards).includes('flammable'));
    expect(cold.filter(([, gas]) => gas.flammable_range !== undefined)).toEqual([]);
    expect(cold.filter(([, gas]) => texts(gas.hazards).includes('pyrophoric'))).toEqual([]);
  });

  test('hydrogen, methane and ammonia have the limits of NFPA 497', () => {
    expect(ignitionRange(substance(gases, 'H2'))).toEqual([0.04, 0.75]);
    expect(ignitionRange(substance(gases, 'CH4'))).toEqual([0.05, 0.15]);
    expect(ignitionRange(substance(gases, 'NH3'))).toEqual([0.15, 0.28]);
  });

  test('the noble gases and nitrogen are inert, and no other', () => {
    const inert = entries.filter(([, gas]) => gas.inert === true).map(([name]) => name);
    expect(inert.sort()).toEqual([...NOBLE, 'N2'].sort());
  });

  test('water, ammonia, hydrogen halides, metal halides and organometallics cling; permanent gases do not', () => {
    const clinging = [
      'H2O',
      'NH3',
      'HF',
      'HCl',
      'HBr',
      'TiCl4',
      'WF6',
      'HfCl4',
      'BCl3',
      'TMA',
      'TEOS',
      'TDMAT',
      'TDMAH',
    ];
    const leaving = [...NOBLE, 'N2', 'O2', 'H2', 'CO', 'CH4', 'CF4', 'SF6', 'NF3', 'SiH4', 'N2O'];
    expect(clinging.filter((name) => substance(gases, name).clings !== true)).toEqual([]);
    expect(leaving.filter((name) => substance(gases, name).clings === true)).toEqual([]);
  });

  test('silane, TEOS and TDMAT tell above what temperature they decompose', () => {
    const above = (name: string) => si(block(substance(gases, name).decomposes_above, name).is, 'temperature');
    expect([above('SiH4'), above('TEOS'), above('TDMAT')]).toEqual([700, 900, 450]);
    expect(above('Si2H6')).toBeLessThan(above('SiH4'));
  });

  test.each(['TMA', 'HF', 'NO2'])('%s tells that it associates', (name) => {
    expect(substance(gases, name).associates).toBeTypeOf('string');
  });
});

function accuracy(gas: Block, of: 'viscosity' | 'diffusion'): number {
  return si(block(gas.accuracy, 'accuracy')[of], 'fraction');
}

/** Lower and upper limit; 1 where none is published. */
function ignitionRange(gas: Block): readonly number[] {
  const range = block(gas.flammable_range, 'flammable_range');
  return [si(range.at_least, 'fraction'), range.at_most === undefined ? 1 : si(range.at_most, 'fraction')];
}

function within(low: number | undefined, high: number | undefined): boolean {
  return low !== undefined && high !== undefined && low > 0 && low < high && high <= 1;
}
