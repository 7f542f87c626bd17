import { describe, expect, test } from 'vitest';
import { ATOMIC_WEIGHTS } from './atomic-weights.ts';
import { correlatedPair, effectiveElectrons, GASES, OUTER_ELECTRONS, PUBLISHED_ELECTRONS } from './cambi.ts';
import { block, halfWidth, si, substance, substances } from './documents.ts';
import type { Block } from './documents.ts';

const atoms = substances('atoms');
const entries = [...atoms];
const GAS_NAMES = Object.keys(GASES);
const ELECTRON_VOLT = 1.602176634e-19;
const BOHR_CUBED = 0.14818471;

describe('the built-in atoms', () => {
  test('are 26, each with pairs in He, Ne, Ar, Kr, Xe, N2, O2 and H2', () => {
    expect(atoms.size).toBe(26);
    for (const [name, atom] of entries) expect(Object.keys(pairs(atom)), name).toEqual(GAS_NAMES);
  });

  test.each(entries)('%s has the molar mass of its element', (name, atom) => {
    expect(atom.formula).toBe(name);
    expect(si(atom.molar_mass, 'molar-mass') * 1000).toBeCloseTo(Number(ATOMIC_WEIGHTS[name]), 3);
  });

  test('stand in the order of the periodic table, as their masses do but for cobalt and nickel', () => {
    const numbers = entries.map(([, atom]) => Number(atom.atomic_number));
    expect(numbers).toEqual([...numbers].sort((a, b) => a - b));
    const masses = entries.filter(([name]) => name !== 'Co').map(([, atom]) => si(atom.molar_mass, 'molar-mass'));
    expect(masses).toEqual([...masses].sort((a, b) => a - b));
  });
});

describe('sublimation enthalpies', () => {
  // Enthalpies of formation of the gas at 298.15 K [kJ/mol]: CRC Handbook of Chemistry and Physics, 95th ed. (2014),
  // standard thermodynamic properties; Sn from Cox, Wagman & Medvedev 1989.
  // prettier-ignore
  const FORMATION: Readonly<Record<string, number>> = {
    C: 716.7, Mg: 147.1, Al: 330, Si: 450, Ti: 473, V: 514.2, Cr: 396.6, Fe: 416.3, Co: 424.7, Ni: 429.7, Cu: 337.4,
    Zn: 130.4, Ge: 372, Zr: 608.8, Nb: 725.9, Mo: 658.1, Ru: 642.7, Pd: 378.2, Ag: 284.9, In: 243.3, Sn: 301.2, Hf: 619.2,
    Ta: 782, W: 849.4, Pt: 565.3, Au: 366.1,
  };

  test.each(entries)('of %s agree with a second compilation within 1.2 %', (name, atom) => {
    const volts = si(block(atom.sublimation_enthalpy, name).is, 'energy') / ELECTRON_VOLT;
    expect(Math.abs((volts * 96.48533) / Number(FORMATION[name]) - 1)).toBeLessThan(0.012);
  });
});

describe('pairs of atoms with gases', () => {
  const cases = entries.flatMap(([name, atom]) => GAS_NAMES.map((gas) => [name, gas, atom] as const));

  test.each(cases)(
    '%s in %s is what the correlation of Cambi et al. gives, to the printed digits',
    (name, gas, atom) => {
      const expected = correlatedPair({ polarisability: polarisability(atom), electrons: electrons(name, atom) }, gas);
      const pair = block(pairs(atom)[gas], gas);
      expect(Math.abs(si(pair.diameter, 'length') * 1e10 - expected.diameter)).toBeLessThan(0.0006);
      expect(Math.abs(si(pair.well_depth, 'temperature') - expected.wellDepth)).toBeLessThan(0.06);
      expect(pair.estimated).toBeTypeOf('string');
    },
  );

  test.each(cases)('%s in %s carries its half-widths', (_name, gas, atom) => {
    const pair = block(pairs(atom)[gas], gas);
    expect(halfWidth(pair.diameter, 'length')).toBe(0.05);
    expect([0.2, 0.5]).toContain(halfWidth(pair.well_depth, 'temperature'));
  });

  test('wells deepen from helium to xenon for every atom', () => {
    for (const [name, atom] of entries) {
      const depths = ['He', 'Ne', 'Ar', 'Kr', 'Xe'].map((gas) => wellDepth(atom, gas));
      expect(depths, name).toEqual([...depths].sort((a, b) => a - b));
    }
  });

  test('the more polarisable of two atoms is the larger in argon', () => {
    const sorted = entries.map(([, atom]) => atom).sort((a, b) => polarisability(a) - polarisability(b));
    const diameters = sorted.map((atom) => si(block(pairs(atom).Ar, 'Ar').diameter, 'length'));
    expect(diameters).toEqual([...diameters].sort((a, b) => a - b));
  });

  test('palladium, with a closed d shell, is smaller than its neighbours ruthenium and silver', () => {
    const diameter = (name: string) => si(block(pairs(substance(atoms, name)).Ar, 'Ar').diameter, 'length');
    expect(diameter('Pd')).toBeLessThan(Math.min(diameter('Ru'), diameter('Ag')));
  });
});

// Static dipole polarisabilities [atomic units]: Schwerdtfeger & Nagle, Mol. Phys. 117, 1200 (2019).
// prettier-ignore
const POLARISABILITIES: Readonly<Record<string, number>> = {
  Mg: 71.2, Ti: 100, V: 87, Cr: 83, Fe: 62, Co: 55, Ni: 49, Zn: 38.67, Ge: 40, Zr: 112, Nb: 98, Mo: 87, Ru: 72,
  Pd: 26.14, Ag: 55, In: 65, Sn: 53, Hf: 103, Ta: 74, W: 68, Pt: 48, Au: 36,
};

test.each(Object.entries(POLARISABILITIES))('the polarisability of %s is the recommended one', (name, atomicUnits) => {
  expect(polarisability(substance(atoms, name))).toBeCloseTo(atomicUnits * BOHR_CUBED, 2);
});

function pairs(atom: Block): Block {
  return block(atom.pairs, 'pairs');
}

function polarisability(atom: Block): number {
  return Number(block(atom.polarisability_angstrom3, 'polarisability_angstrom3').is);
}

function wellDepth(atom: Block, gas: string): number {
  return si(block(pairs(atom)[gas], gas).well_depth, 'temperature');
}

function electrons(name: string, atom: Block): number {
  const outer = OUTER_ELECTRONS[name];
  return outer === undefined
    ? Number(PUBLISHED_ELECTRONS[name])
    : effectiveElectrons(outer, Number(atom.atomic_number));
}
