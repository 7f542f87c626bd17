import { countElements } from '../../src/substances/formula.ts';

/**
 * Standard atomic weights [g/mol], abridged to five digits: Prohaska et al., Pure Appl. Chem. 94, 573 (2022), the IUPAC
 * table of 2021. D is deuterium (atomic mass evaluation, Wang et al., Chin. Phys. C 45, 030003 (2021)).
 */
// prettier-ignore
export const ATOMIC_WEIGHTS: Readonly<Record<string, number>> = {
  H: 1.008, D: 2.0141, He: 4.0026, B: 10.81, C: 12.011, N: 14.007, O: 15.999, F: 18.998, Ne: 20.18, Mg: 24.305,
  Al: 26.982, Si: 28.085, P: 30.974, S: 32.06, Cl: 35.45, Ar: 39.95, Ti: 47.867, V: 50.942, Cr: 51.996, Fe: 55.845,
  Co: 58.933, Ni: 58.693, Cu: 63.546, Zn: 65.38, Ga: 69.723, Ge: 72.63, As: 74.922, Se: 78.971, Br: 79.904, Kr: 83.798,
  Y: 88.906, Zr: 91.224, Nb: 92.906, Mo: 95.95, Ru: 101.07, Pd: 106.42, Ag: 107.87, In: 114.82, Sn: 118.71, Sb: 121.76,
  I: 126.9, Xe: 131.29, La: 138.91, Hf: 178.49, Ta: 180.95, W: 183.84, Pt: 195.08, Au: 196.97,
};

/** Molar mass [g/mol] of a formula by the standard atomic weights. */
export function formulaMass(formula: string): number {
  const counts = countElements(formula);
  if (counts === undefined) throw new Error(`${formula} is no formula`);
  return [...counts].reduce((sum, [element, count]) => sum + count * weight(element), 0);
}

function weight(element: string): number {
  const found = ATOMIC_WEIGHTS[element];
  if (found === undefined) throw new Error(`no atomic weight of ${element}`);
  return found;
}
