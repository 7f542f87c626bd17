/** A partner of a pair: polarisability [angstrom3], effective electrons [1]. */
export interface Partner {
  readonly polarisability: number;
  readonly electrons: number;
}

/**
 * The gases, after Gosma, Swaminathan-Gopalan, Subramaniam & Stephani, open data set of variable-soft-sphere parameters
 * (reference from memory, year not recorded); recovered from its pairs.
 */
export const GASES: Readonly<Record<string, Partner>> = {
  He: { polarisability: 0.2185, electrons: 2 },
  Ne: { polarisability: 0.3955, electrons: 7.05 },
  Ar: { polarisability: 1.6512, electrons: 7.266 },
  Kr: { polarisability: 2.48456, electrons: 11.4547 },
  Xe: { polarisability: 4.0442, electrons: 12.795 },
  N2: { polarisability: 1.7649, electrons: 8.165 },
  O2: { polarisability: 1.5583, electrons: 7.003 },
  H2: { polarisability: 0.8216, electrons: 2.004 },
};

/** Electrons of the valence shell: s and p, for transition metals s and d. */
// prettier-ignore
export const OUTER_ELECTRONS: Readonly<Record<string, number>> = {
  Mg: 2, Ti: 4, V: 5, Cr: 6, Fe: 8, Co: 9, Ni: 10, Zn: 2, Ge: 4, Zr: 4, Nb: 5, Mo: 6, Ru: 8, Pd: 10, Ag: 11, In: 3,
  Sn: 4, Hf: 4, Ta: 5, W: 6, Pt: 10, Au: 11,
};

/** Effective electrons that the data set gives itself. */
export const PUBLISHED_ELECTRONS: Readonly<Record<string, number>> = { C: 3.068, Al: 2.229, Si: 3.318, Cu: 9.228 };

/** Effective electrons by the rule of Cambi, Cappelletti, Liuti & Pirani, J. Chem. Phys. 95, 1852 (1991). */
export function effectiveElectrons(outer: number, all: number): number {
  const inner = all - outer;
  return outer * (1 + (1 - outer / inner) * (inner / all) ** 2);
}

/** Diameter [angstrom] and well depth [K] of an atom with a gas by the correlation of the same authors. */
export function correlatedPair(atom: Partner, name: string): { readonly diameter: number; readonly wellDepth: number } {
  const gas = GASES[name];
  if (gas === undefined) throw new Error(`no polarisability of ${name}`);
  const product = atom.polarisability * gas.polarisability;
  const minimum = (1.767 * (Math.cbrt(atom.polarisability) + Math.cbrt(gas.polarisability))) / product ** 0.095;
  const dispersion = (15.7 * product) / (looseness(atom) + looseness(gas));
  return { diameter: minimum / 2 ** (1 / 6), wellDepth: (0.72 * dispersion) / minimum ** 6 / BOLTZMANN_EV };
}

const BOLTZMANN_EV = 8.617333262e-5;

function looseness({ polarisability, electrons }: Partner): number {
  return Math.sqrt(polarisability / electrons);
}
