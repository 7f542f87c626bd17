import { omega11 } from './collision-integrals.ts';
import { BOLTZMANN, ELEMENTARY_CHARGE } from './constants.ts';
import { erf } from './special.ts';

/** Logarithms of the reduced energy for which the cross-section of the universal potential was fitted [1]; see `logReducedEnergy`. */
export const UNIVERSAL_CROSS_SECTION_RANGE = { from: -14.5, to: -4.1 } as const;

/**
 * Collisions of a fast atom with one gas over a length of its way, those that take its momentum.
 *
 *     r = n Q(E_rel) g(s),  E_rel = (m_r/2)(v² + 3 k T/M),  s = v/sqrt(2 k T/M)
 *     g(s) = (1 + 1/(2 s²)) erf s + e^(-s²)/(s sqrtπ)
 *
 * with v the atom's speed, M the mass of a gas molecule, and g the mean speed relative to the gas over the atom's own.
 *
 * Range: few atoms in a thermal gas, from thermal speed to some tens of eV. Weakness: standard uncertainty 20 %, that of the cross-section.
 *
 * @param energy E = m v²/2: energy of the atom [J]
 * @param molarMass m: molar mass of the atom [kg/mol]
 * @param atomicNumber Z1: atomic number of the atom [1]
 * @param density n: number density of the gas [1/m3]
 * @param diameter σ: Lennard-Jones diameter of the pair [m]
 * @param wellDepth ε/k: depth of the pair's well [K]
 * @param gasMolarMass M: molar mass of the gas [kg/mol]
 * @param gasAtomicNumber Z2: atomic number of the atoms of the gas [1]
 * @param gasAtoms a_gas: atoms in a molecule of the gas [1]
 * @param temperature T: gas temperature [K]
 * @returns r: collisions per length [1/m]
 * @source Chapman & Cowling 1970, sec. 5.4 (path of a molecule of given speed); cross-section as `fastCrossSection`
 * @example fastCollisionRate(1.5243e-18, 0.063546, 29, 1.2e20, 3.66e-10, 170, 0.03995, 18, 1, 300) -> 21.784
 */
export function fastCollisionRate(
  energy: number,
  molarMass: number,
  atomicNumber: number,
  density: number,
  diameter: number,
  wellDepth: number,
  gasMolarMass: number,
  gasAtomicNumber: number,
  gasAtoms: number,
  temperature: number,
): number {
  const relative = relativeEnergy(energy, molarMass, gasMolarMass, temperature);
  const crossSection = fastCrossSection(relative, diameter, wellDepth, atomicNumber, gasAtomicNumber, gasAtoms);
  return density * crossSection * sweep(speedRatio(energy, molarMass, gasMolarMass, temperature));
}

/** E_rel: mean energy of the relative motion [J]. */
function relativeEnergy(energy: number, molarMass: number, gasMolarMass: number, temperature: number): number {
  const thermal = 1.5 * BOLTZMANN * temperature;
  return (energy * gasMolarMass + thermal * molarMass) / (molarMass + gasMolarMass);
}

/** s: speed of the atom over the most probable speed of the gas. */
function speedRatio(energy: number, molarMass: number, gasMolarMass: number, temperature: number): number {
  return Math.sqrt((energy * gasMolarMass) / (molarMass * BOLTZMANN * temperature));
}

/** g(s): mean speed relative to the gas over the atom's own. */
function sweep(ratio: number): number {
  const square = ratio * ratio;
  if (ratio > 6) return 1 + 1 / (2 * square);
  return (1 + 1 / (2 * square)) * erf(ratio) + Math.exp(-square) / (ratio * Math.sqrt(Math.PI));
}

/** 0.1 eV [J]: above it the 12-6 wall is too hard. */
const SOFT_ABOVE = 0.1 * ELEMENTARY_CHARGE;

/**
 * Momentum-transfer cross-section of a fast atom and a gas molecule.
 *
 *     Q_LJ = π σ² Ω11*(E/(3ε))                                 up to 0.1 eV
 *     Q = Q_LJ^(1-w) Q_U^w,  w = ½ min(1, log10(E/0.1 eV))     above
 *     Q_U = π a² exp(-6.570e-4 x³ - 0.035746 x² - 0.86843 x + 0.19473),  x of `logReducedEnergy`, a = 0.46854 Å/(Z1^0.23 + Z2^0.23)
 *
 * Q_U is a fit, within 3 % for -14.5 <= x <= -4.1, to the cross-section of the universal potential, which is right where atoms come so close
 * that their cores meet. Between, where neither potential is, the cross-section goes over from one to the geometric mean of both.
 * Past T* = 100 the fit of Ω11* is its leading power.
 *
 * Range: 0.01 to 100 eV. Weakness: standard uncertainty 20 %.
 *
 * @param relativeEnergy E: energy of the relative motion [J]
 * @param diameter σ: Lennard-Jones diameter of the pair [m]
 * @param wellDepth ε/k: depth of the pair's well [K]
 * @param atomicNumber Z1: atomic number of the atom [1]
 * @param gasAtomicNumber Z2: atomic number of the atoms of the gas [1]
 * @param gasAtoms a: atoms in a molecule of the gas [1]
 * @returns Q: cross-section [m2]
 * @source Neufeld, Janzen & Aziz 1972; Ziegler, Biersack & Littmark, The Stopping and Range of Ions in Solids, 1985 (universal potential); own fit and bridge
 * @example fastCrossSection(5.9e-19, 3.66e-10, 170, 29, 18, 1) -> 1.81317e-19
 */
export function fastCrossSection(
  relativeEnergy: number,
  diameter: number,
  wellDepth: number,
  atomicNumber: number,
  gasAtomicNumber: number,
  gasAtoms: number,
): number {
  const hard = Math.PI * diameter ** 2 * omega11(relativeEnergy / (3 * BOLTZMANN * wellDepth));
  if (!(relativeEnergy > SOFT_ABOVE)) return hard;
  const weight = Math.min(1, Math.log10(relativeEnergy / SOFT_ABOVE)) / 2;
  const screening = screeningLength(atomicNumber, gasAtomicNumber);
  const x = Math.log((screening * relativeEnergy) / (gasAtoms * atomicNumber * gasAtomicNumber * COULOMB));
  const logShape = ((-6.57e-4 * x - 0.035746) * x - 0.86843) * x + 0.19473;
  // hard^(1-w) (π a² e^shape)^w
  return hard * Math.exp(weight * (logShape + Math.log((Math.PI * screening * screening) / hard)));
}

/**
 * Logarithm of the reduced energy of a collision in the universal potential.
 *
 *     x = ln(a E/(a_gas Z1 Z2 14.400 eV Å)),  a = 0.46854 Å/(Z1^0.23 + Z2^0.23)
 *
 * A molecule counts as its atoms in one place: their potentials add up, which divides the reduced energy by their number a_gas.
 *
 * Range: the fit of the cross-section holds for -14.5 <= x <= -4.1; heavy pairs leave it below 0.3 eV, where it has little weight.
 *
 * @param relativeEnergy E: energy of the relative motion [J]
 * @param atomicNumber Z1: atomic number of the atom [1]
 * @param gasAtomicNumber Z2: atomic number of the atoms of the gas [1]
 * @param gasAtoms a_gas: atoms in a molecule of the gas [1]
 * @returns x: logarithm of the reduced energy [1]
 * @source Ziegler, Biersack & Littmark 1985, ch. 2
 * @example logReducedEnergy(1.602176634e-19, 29, 18, 1) -> -11.0973
 */
export function logReducedEnergy(
  relativeEnergy: number,
  atomicNumber: number,
  gasAtomicNumber: number,
  gasAtoms: number,
): number {
  const screening = screeningLength(atomicNumber, gasAtomicNumber);
  return Math.log((screening * relativeEnergy) / (gasAtoms * atomicNumber * gasAtomicNumber * COULOMB));
}

/** e²/(4π ε0) [J m]: 14.400 eV Å. */
const COULOMB = 14.4e-10 * ELEMENTARY_CHARGE;

/** a: screening length of the universal potential [m]. */
function screeningLength(atomicNumber: number, gasAtomicNumber: number): number {
  return 0.46854e-10 / (screeningPower(atomicNumber) + screeningPower(gasAtomicNumber));
}

/** Z^0.23, looked up for the elements: it is needed again and again on the way of an atom that slows down. */
function screeningPower(atomicNumber: number): number {
  return POWERS[atomicNumber] ?? atomicNumber ** 0.23;
}

const POWERS: readonly number[] = Array.from({ length: 119 }, (_, atomicNumber) => atomicNumber ** 0.23);
