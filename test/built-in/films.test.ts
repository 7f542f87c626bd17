import { describe, expect, test } from 'vitest';
import { formulaMass } from './atomic-weights.ts';
import { block, halfWidth, si, substance, substances } from './documents.ts';
import type { Block } from './documents.ts';

const films = substances('films');
const atoms = substances('atoms');
const entries = [...films];

// Bulk densities [g/cm3]: CRC Handbook of Chemistry and Physics, 95th ed. (2014), physical constants of inorganic compounds.
// prettier-ignore
const BULK: Readonly<Record<string, number>> = {
  Si: 2.3296, Si3N4: 3.17, SiC: 3.16, Al2O3: 3.99, HfO2: 9.68, ZrO2: 5.68, TiO2: 4.17, Ta2O5: 8.24, ZnO: 5.6, TiN: 5.21,
  TaN: 13.7, W2N: 17.8, AlN: 3.255, HfN: 13.8, Al: 2.7, Ti: 4.506, Cr: 7.15, Fe: 7.87, Co: 8.86, Ni: 8.9, Cu: 8.96,
  Mo: 10.2, Ru: 12.1, Pd: 12, Ag: 10.5, Ta: 16.4, W: 19.3, Pt: 21.5, Au: 19.3, Nb: 8.57, V: 6, Zr: 6.52, Hf: 13.3,
  Ge: 5.3234, GaAs: 5.3176, InP: 4.81,
};

describe('the built-in films', () => {
  test('are 83, among them every atom that a target may give, but carbon by its forms', () => {
    expect(films.size).toBe(83);
    expect([...atoms.keys()].filter((name) => name !== 'C' && !films.has(name))).toEqual([]);
    expect(['diamond', 'a-C', 'ta-C'].map((name) => substance(films, name).formula)).toEqual(['C', 'C', 'C']);
  });

  test.each(entries)('%s weighs what its formula weighs', (_, film) => {
    const mass = si(film.molar_mass, 'molar-mass') * 1000;
    expect(Math.abs(mass / formulaMass(String(film.formula)) - 1)).toBeLessThan(2e-4);
  });

  test.each(entries)('%s tells how far its density varies', (_, film) => {
    expect(halfWidth(density(film), 'density')).toBeGreaterThan(0.001);
    expect(halfWidth(density(film), 'density')).toBeLessThan(0.2);
  });

  test.each(Object.entries(BULK))('%s is no denser than the bulk', (name, bulk) => {
    const film = substance(films, name);
    expect(si(density(film), 'density')).toBeLessThan(bulk * 1000 * 1.0001);
    expect(si(density(film), 'density')).toBeGreaterThan(bulk * 1000 * 0.7);
  });

  test('thermal oxide holds 2.2e22 formula units in a cubic centimetre, as every textbook has it', () => {
    const oxide = substance(films, 'SiO2');
    const units = (si(density(oxide), 'density') / si(oxide.molar_mass, 'molar-mass')) * 6.02214076e23;
    expect(units / 1e28).toBeCloseTo(2.2, 1);
  });

  test('silicon holds 5.0e22 atoms in a cubic centimetre', () => {
    const silicon = substance(films, 'Si');
    const atomsHeld = (si(density(silicon), 'density') / si(silicon.molar_mass, 'molar-mass')) * 6.02214076e23;
    expect(atomsHeld / 1e28).toBeCloseTo(5.0, 1);
  });
});

function density(film: Block): unknown {
  return block(film.density, 'density').is;
}
