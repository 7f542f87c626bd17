import { BOLTZMANN, ELEMENTARY_CHARGE } from './constants.ts';
import { fastCollisionRate } from './fast-collisions.ts';
import { exponentialIntegral } from './special.ts';

/** The largest energy of Thompson's spectrum must lie this many sublimation enthalpies out for its logarithmic mean to hold [1]. */
export const EMISSION_CUT_AT_LEAST = 10;

/**
 * Energy with which an atom leaves a sputter target: the logarithmic mean of Thompson's spectrum E/(E + U)³.
 *
 *     E0 = e U,  e = 2.71828…
 *
 * Range: ions of some hundred eV, so that the spectrum's upper end lies far out (`emissionCut`). Weakness: a spectrum without a mean in
 * one number; the standard uncertainty of ln E0 is 0.4.
 *
 * @param sublimationEnthalpy U: sublimation enthalpy of an atom [J]
 * @returns E0: emission energy [J]
 * @source Thompson, Phil. Mag. 18, 377 (1968); mean of ln E by integration
 * @example emissionEnergy(5.6076e-19) -> 1.52430e-18
 */
export function emissionEnergy(sublimationEnthalpy: number): number {
  return Math.E * sublimationEnthalpy;
}

/**
 * Mean energy of the atoms that leave a melt.
 *
 *     E = 2 k T
 *
 * Range: atoms that evaporate without collisions above the melt; in the flux fast atoms count more than in the gas, which has 3/2 k T.
 *
 * @param meltTemperature T: temperature of the melt [K]
 * @returns E: mean energy of the evaporated atoms [J]
 * @source Maxwell distribution of an effusing gas; Knudsen 1909
 * @example evaporationEnergy(1473.15) -> 4.0678e-20
 */
export function evaporationEnergy(meltTemperature: number): number {
  return 2 * BOLTZMANN * meltTemperature;
}

/**
 * Largest energy of an atom that an ion of the sheath's full voltage knocks out of a target.
 *
 *     E_max = (4 m M/(m + M)²) e V - U
 *
 * Range: head-on collision with one atom. It only checks `emissionEnergy`: good while E_max > 10 U.
 *
 * @param ionMolarMass m: molar mass of the ion [kg/mol]
 * @param atomMolarMass M: molar mass of the target atom [kg/mol]
 * @param voltage V: voltage of the target [V]
 * @param sublimationEnthalpy U: sublimation enthalpy of an atom [J]
 * @returns E_max: largest emission energy [J]
 * @source Thompson, Phil. Mag. 18, 377 (1968); two-body kinematics
 * @example emissionCut(0.03995, 0.063546, 400, 5.6076e-19) -> 6.0195e-17
 */
export function emissionCut(
  ionMolarMass: number,
  atomMolarMass: number,
  voltage: number,
  sublimationEnthalpy: number,
): number {
  return largestEnergyFraction(ionMolarMass, atomMolarMass) * ELEMENTARY_CHARGE * voltage - sublimationEnthalpy;
}

/**
 * Largest fraction of its energy that a body can pass on to one at rest; hard spheres pass on half of it on average.
 *
 *     β = 4 m M/(m + M)²
 *
 * Range: E >> k T, elastic collision.
 *
 * @param molarMass m: molar mass of the moving body [kg/mol]
 * @param partnerMolarMass M: molar mass of the body at rest [kg/mol]
 * @returns β: largest fraction of the energy passed on [1]
 * @source two-body kinematics
 * @example largestEnergyFraction(0.18384, 0.039948) -> 0.586572
 */
export function largestEnergyFraction(molarMass: number, partnerMolarMass: number): number {
  return (4 * molarMass * partnerMolarMass) / (molarMass + partnerMolarMass) ** 2;
}

/**
 * Mean loss of ln E in a collision of hard spheres with a gas at rest.
 *
 *     ξ = 1 + α ln α/(1 - α),  α = ((m - M)/(m + M))²
 *
 * Range: E >> k T. Weakness: mean of the logarithm; the logarithm of the mean ratio gives up to 1.44 times as many collisions (at equal
 * mass). Soft potentials lose less in an encounter.
 *
 * @param molarMass m: molar mass of the atom [kg/mol]
 * @param gasMolarMass M: molar mass of the gas [kg/mol]
 * @returns ξ: logarithmic energy decrement [1]
 * @source Glasstone & Edlund, The Elements of Nuclear Reactor Theory, 1952 (slowing down of neutrons); Westwood, J. Vac. Sci. Technol. 15, 1 (1978)
 * @example energyDecrement(0.063546, 0.039948) -> 0.83785
 */
export function energyDecrement(molarMass: number, gasMolarMass: number): number {
  const beta = largestEnergyFraction(molarMass, gasMolarMass);
  // α = 1 - β; at equal masses α ln α has the limit zero.
  return beta < 1 ? 1 + ((1 - beta) * Math.log1p(-beta)) / beta : 1;
}

/**
 * Mean loss of ln E in a collision with a mixture at rest: the decrements of the gases, weighted with the collisions that the atom has with each.
 *
 *     ξ = Σ_j r_j ξ_j/Σ_j r_j,  r_j = n_j Q_j(E) g(s_j)
 *
 * Range: as `energyDecrement` and `fastFreePath`. The weights hardly change with energy, so one value, at the emission energy, serves the whole way.
 *
 * @param energy E: energy of the atom [J]
 * @param molarMass m: molar mass of the atom [kg/mol]
 * @param atomicNumber Z1: atomic number of the atom [1]
 * @param densities n_j: number densities of the gases [1/m3]
 * @param diameters σ_j: Lennard-Jones diameters of the pairs atom-gas [m]
 * @param wellDepths ε_j/k: depths of the pairs' wells [K]
 * @param molarMasses M_j: molar masses of the gases [kg/mol]
 * @param gasAtomicNumbers Z2_j: atomic numbers of the atoms of the gases [1]
 * @param gasAtoms a_j: atoms in a molecule of each gas [1]
 * @param temperature T: gas temperature [K]
 * @returns ξ: logarithmic energy decrement in the mixture [1]
 * @source Glasstone & Edlund 1952: moderators in a mixture weighted with their macroscopic cross-sections
 * @example mixtureEnergyDecrement(1.5243e-18, 0.063546, 29, [1.2e20], [3.66e-10], [170], [0.03995], [18], [1], 300) -> 0.83787
 */
export function mixtureEnergyDecrement(
  energy: number,
  molarMass: number,
  atomicNumber: number,
  densities: readonly number[],
  diameters: readonly number[],
  wellDepths: readonly number[],
  molarMasses: readonly number[],
  gasAtomicNumbers: readonly number[],
  gasAtoms: readonly number[],
  temperature: number,
): number {
  let collisions = 0;
  let loss = 0;
  for (let j = 0; j < densities.length; j++) {
    const gasMolarMass = molarMasses[j] ?? NaN;
    const rate = fastCollisionRate(
      energy,
      molarMass,
      atomicNumber,
      densities[j] ?? NaN,
      diameters[j] ?? NaN,
      wellDepths[j] ?? NaN,
      gasMolarMass,
      gasAtomicNumbers[j] ?? NaN,
      gasAtoms[j] ?? NaN,
      temperature,
    );
    collisions += rate;
    loss += rate * energyDecrement(molarMass, gasMolarMass);
  }
  return loss / collisions;
}

/**
 * Mean free path of a fast atom in a gas, between losses of its momentum.
 *
 *     λ = 1/Σ_j n_j Q_j(E_j) g(s_j),  E_j = (m_r/2)(v² + 3 k T/M_j),  s_j = v/sqrt(2 k T/M_j)
 *     g(s) = (1 + 1/(2 s²)) erf s + e^(-s²)/(s sqrtπ)
 *
 * with g the mean speed relative to the gas over the atom's own.
 *
 * Range: few atoms in a thermal gas, from thermal speed to some tens of eV. Weakness: standard uncertainty 20 %, that of the cross-section.
 *
 * @param energy E = m v²/2: energy of the atom [J]
 * @param molarMass m: molar mass of the atom [kg/mol]
 * @param atomicNumber Z1: atomic number of the atom [1]
 * @param densities n_j: number densities of the gases [1/m3]
 * @param diameters σ_j: Lennard-Jones diameters of the pairs atom-gas [m]
 * @param wellDepths ε_j/k: depths of the pairs' wells [K]
 * @param molarMasses M_j: molar masses of the gases [kg/mol]
 * @param gasAtomicNumbers Z2_j: atomic numbers of the atoms of the gases [1]
 * @param gasAtoms a_j: atoms in a molecule of each gas [1]
 * @param temperature T: gas temperature [K]
 * @returns λ: mean free path of the fast atom [m]
 * @source Chapman & Cowling 1970, sec. 5.4 (path of a molecule of given speed); cross-section as `fastCrossSection`
 * @example fastFreePath(1.5243e-18, 0.063546, 29, [1.2e20], [3.66e-10], [170], [0.03995], [18], [1], 300) -> 0.045905
 */
export function fastFreePath(
  energy: number,
  molarMass: number,
  atomicNumber: number,
  densities: readonly number[],
  diameters: readonly number[],
  wellDepths: readonly number[],
  molarMasses: readonly number[],
  gasAtomicNumbers: readonly number[],
  gasAtoms: readonly number[],
  temperature: number,
): number {
  let perLength = 0;
  for (let j = 0; j < densities.length; j++) {
    perLength += fastCollisionRate(
      energy,
      molarMass,
      atomicNumber,
      densities[j] ?? NaN,
      diameters[j] ?? NaN,
      wellDepths[j] ?? NaN,
      molarMasses[j] ?? NaN,
      gasAtomicNumbers[j] ?? NaN,
      gasAtoms[j] ?? NaN,
      temperature,
    );
  }
  return 1 / perLength;
}

/**
 * Fraction of atoms that fly a distance along the normal without a collision.
 *
 *     f = e^(-d/λ)
 *
 * Range: all. Weakness: oblique ways are longer; see `uncollidedFractionCosine`.
 *
 * @param distance d: distance [m]
 * @param path λ: mean free path [m]
 * @returns f: uncollided fraction [1]
 * @source definition of the mean free path
 * @example uncollidedFraction(0.03, 0.01) -> 0.0497871
 */
export function uncollidedFraction(distance: number, path: number): number {
  return Math.exp(-distance / path);
}

/**
 * Fraction of atoms that cross a gap between wide plates without a collision, if they leave with a cosine distribution.
 *
 *     f = 2 E_3(d/λ)
 *
 * Range: plates much wider than their distance. Oblique ways are longer, so it lies below `uncollidedFraction`.
 *
 * @param distance d: distance of the plates [m]
 * @param path λ: mean free path [m]
 * @returns f: uncollided fraction [1]
 * @source integral of e^(-d/(λ cosϑ)) over a cosine distribution; E_3 of Abramowitz & Stegun 1964, ch. 5
 * @example uncollidedFractionCosine(0.01, 0.01) -> 0.219384
 */
export function uncollidedFractionCosine(distance: number, path: number): number {
  return 2 * exponentialIntegral(3, distance / path);
}

/**
 * Collisions that slow an atom down to the mean energy of the gas.
 *
 *     N = ln(E0/(3/2 k T))/ξ
 *
 * Range: hard spheres, gas at rest. An atom that leaves with less than 3/2 k T needs none. Weakness: by the mean logarithm, up to 1.44
 * fewer than by the mean ratio of energies.
 *
 * @param energy E0: energy at the start [J]
 * @param temperature T: gas temperature [K]
 * @param decrement ξ: logarithmic energy decrement [1]
 * @returns N: collisions to thermalise [1]
 * @source Westwood, J. Vac. Sci. Technol. 15, 1 (1978); Glasstone & Edlund 1952
 * @example collisionsToThermalise(8.01088e-19, 300, 0.83785) -> 5.7998
 */
export function collisionsToThermalise(energy: number, temperature: number, decrement: number): number {
  return Math.max(0, Math.log(energy / (1.5 * BOLTZMANN * temperature)) / decrement);
}

/**
 * Throws in which an atom loses an e-fold of its energy. Heavy atoms keep their line through several collisions, so this and not the
 * Knudsen number is the same measure for all pairs.
 *
 *     λ/(ξ L)
 *
 * Range: near the emission energy.
 *
 * @param path λ: mean free path of the fast atom [m]
 * @param decrement ξ: logarithmic energy decrement [1]
 * @param throwDistance L: distance from target to wafer [m]
 * @returns throws per e-fold of energy [1]
 * @source own measure, from the path and decrement of Westwood, J. Vac. Sci. Technol. 15, 1 (1978)
 * @example slowingKnudsen(0.055, 0.83785, 0.27) -> 0.2431
 */
export function slowingKnudsen(path: number, decrement: number, throwDistance: number): number {
  return path / (decrement * throwDistance);
}

/**
 * Way that an atom flies until it has the mean energy of the gas.
 *
 *     L = Σ_k λ(E_k),  E_k = E0 e^(-k ξ),  over the N collisions to thermalise, the last as its fraction
 *
 * Range: as `fastFreePath` and `energyDecrement`. Weakness: length of a zig-zag, not the distance covered: near it for heavy atoms, well above
 * it for light ones.
 *
 * @param energy E0: energy at the start [J]
 * @param decrement ξ: logarithmic energy decrement, of a mixture that at E0 [1]
 * @param molarMass m: molar mass of the atom [kg/mol]
 * @param atomicNumber Z1: atomic number of the atom [1]
 * @param densities n_j: number densities of the gases [1/m3]
 * @param diameters σ_j: Lennard-Jones diameters of the pairs atom-gas [m]
 * @param wellDepths ε_j/k: depths of the pairs' wells [K]
 * @param molarMasses M_j: molar masses of the gases [kg/mol]
 * @param gasAtomicNumbers Z2_j: atomic numbers of the atoms of the gases [1]
 * @param gasAtoms a_j: atoms in a molecule of each gas [1]
 * @param temperature T: gas temperature [K]
 * @returns L: thermalisation distance [m]
 * @source Westwood, J. Vac. Sci. Technol. 15, 1 (1978); paths that shrink on the way as `fastFreePath`
 * @example thermalisationDistance(1.5243e-18, 0.83785, 0.063546, 29, [1.2e20], [3.66e-10], [170], [0.03995], [18], [1], 300) -> 0.18002
 */
export function thermalisationDistance(
  energy: number,
  decrement: number,
  molarMass: number,
  atomicNumber: number,
  densities: readonly number[],
  diameters: readonly number[],
  wellDepths: readonly number[],
  molarMasses: readonly number[],
  gasAtomicNumbers: readonly number[],
  gasAtoms: readonly number[],
  temperature: number,
): number {
  const collisions = collisionsToThermalise(energy, temperature, decrement);
  if (!(collisions <= MOST_COLLISIONS)) return NaN;
  let way = 0;
  let remaining = energy;
  for (let left = collisions; left > 0; left--) {
    const path = fastFreePath(
      remaining,
      molarMass,
      atomicNumber,
      densities,
      diameters,
      wellDepths,
      molarMasses,
      gasAtomicNumbers,
      gasAtoms,
      temperature,
    );
    way += Math.min(1, left) * path;
    remaining *= Math.exp(-decrement);
  }
  return way;
}

/** The heaviest atoms need some 250 collisions in hydrogen; far more means that the decrement makes no sense. */
const MOST_COLLISIONS = 10000;

/**
 * Throw over the way on which an atom becomes thermal. By Monte Carlo a fifth to a third of the atoms that arrive are thermal at 0.5, two
 * thirds to five sixths at 1, nine tenths or more at 1.5, nearly all at 3, for masses of 0.7 to 16 times the gas molecule's, which leave
 * with a cosine distribution.
 *
 *     throw/L
 *
 * Range: L > 0; undefined for atoms that leave thermal.
 *
 * @param throwDistance throw: distance from target to wafer [m]
 * @param distance L: thermalisation distance [m]
 * @returns thermalisation ratio [1]
 * @source definition; own Monte Carlo of hard spheres, repeated in the tests
 * @example thermalisationRatio(0.27, 0.25) -> 1.08
 */
export function thermalisationRatio(throwDistance: number, distance: number): number {
  return distance > 0 ? throwDistance / distance : NaN;
}
