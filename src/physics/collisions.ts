import { omega11, omega22 } from './collision-integrals.ts';
import { GAS_CONSTANT } from './constants.ts';
import { meanSpeed } from './state.ts';

/**
 * Effective hard-sphere diameter of a pair: the one that reproduces the viscosity.
 *
 *     d² = σ² Ω22*(T*),  T* = kT/ε
 *
 * Range: that of Ω22*. Weakness: d falls by 5 to 15 % from 300 to 1000 K; a table's diameter at one temperature does not.
 *
 * @param diameter σ: Lennard-Jones diameter of the pair [m]
 * @param wellDepth ε/k: depth of the pair's well [K]
 * @param polarity δ²: square of the pair's reduced dipole [1]
 * @param temperature T: gas temperature [K]
 * @returns d: effective hard-sphere diameter [m]
 * @source Hirschfelder, Curtiss & Bird 1954, sec. 8.2; Ω22* of Neufeld, Janzen & Aziz 1972
 * @example collisionDiameter(3.33e-10, 136.5, 0, 298.15) -> 3.5573e-10
 */
export function collisionDiameter(diameter: number, wellDepth: number, polarity: number, temperature: number): number {
  return diameter * Math.sqrt(omega22(temperature / wellDepth, polarity));
}

/**
 * Momentum-transfer cross-section of a pair in thermal motion, as it governs diffusion.
 *
 *     Q = π σ² Ω11*(T*),  T* = kT/ε
 *
 * Range: that of Ω11*.
 *
 * @param diameter σ: Lennard-Jones diameter of the pair [m]
 * @param wellDepth ε/k: depth of the pair's well [K]
 * @param polarity δ²: square of the pair's reduced dipole [1]
 * @param temperature T: gas temperature [K]
 * @returns Q: cross-section [m2]
 * @source Hirschfelder, Curtiss & Bird 1954, sec. 8.2; Ω11* of Neufeld, Janzen & Aziz 1972
 * @example diffusionCrossSection(3.33e-10, 136.5, 0, 298.15) -> 3.6363e-19
 */
export function diffusionCrossSection(
  diameter: number,
  wellDepth: number,
  polarity: number,
  temperature: number,
): number {
  return Math.PI * diameter ** 2 * omega11(temperature / wellDepth, polarity);
}

/**
 * Mean free path of a molecule in a mixture that holds its own kind too.
 *
 *     λ_i = 1/Σ_j n_j π d_ij² sqrt(1 + M_i/M_j)
 *
 * In one gas this is 1/(sqrt2 n π d²) = (16/5)(μ/p) sqrt(kT/(2π m)).
 *
 * Range: thermal gas at rest. Weakness: a definition among several; Maxwell's is 1.8 % shorter, that of Bird's variable hard sphere
 * 13 to 45 % (`variableHardSphereRatio`). Limits on Knudsen numbers are tied to this one.
 *
 * @param molarMass M_i: molar mass of the molecule [kg/mol]
 * @param partnerDensities n_j: number densities of all gases [1/m3]
 * @param partnerDiameters d_ij: effective hard-sphere diameters of the pairs [m]
 * @param partnerMolarMasses M_j: molar masses of all gases [kg/mol]
 * @returns λ_i: mean free path [m]
 * @source Jeans, The Dynamical Theory of Gases, 4th ed. 1925; Chapman & Cowling 1970, sec. 5.21
 * @example meanFreePath(0.028014, [2.42928e25], [3.7e-10], [0.028014]) -> 6.768e-8
 */
export function meanFreePath(
  molarMass: number,
  partnerDensities: readonly number[],
  partnerDiameters: readonly number[],
  partnerMolarMasses: readonly number[],
): number {
  let perLength = 0;
  for (let j = 0; j < partnerDensities.length; j++) {
    const crossSection = Math.PI * (partnerDiameters[j] ?? NaN) ** 2;
    perLength +=
      (partnerDensities[j] ?? NaN) * crossSection * Math.sqrt(1 + molarMass / (partnerMolarMasses[j] ?? NaN));
  }
  return 1 / perLength;
}

/**
 * Collisions that one molecule suffers in a second.
 *
 *     z = v/λ
 *
 * Range: thermal gas.
 *
 * @param speed v: mean speed [m/s]
 * @param path λ: mean free path [m]
 * @returns z: collision frequency [1/s]
 * @source Chapman & Cowling 1970, sec. 5.21
 * @example collisionFrequency(458.94, 6.6332e-8) -> 6.919e9
 */
export function collisionFrequency(speed: number, path: number): number {
  return speed / path;
}

/**
 * Mean free path of a mixture: path flown by all molecules over collisions suffered.
 *
 *     λ = Σ x_i v_i / Σ x_i v_i/λ_i
 *
 * Range: thermal gas. Weakness: a mean; light molecules may fly ten times as far as heavy ones of the same mixture.
 *
 * @param fractions x_i: mole fractions [1]
 * @param speeds v_i: mean speeds [m/s]
 * @param paths λ_i: mean free paths in the mixture [m]
 * @returns λ: mean free path of the mixture [m]
 * @source definition; paths of Chapman & Cowling 1970, sec. 5.21
 * @example mixtureMeanFreePath([0.5, 0.5], [1256, 397], [0.016, 0.008]) -> 0.01290
 */
export function mixtureMeanFreePath(
  fractions: readonly number[],
  speeds: readonly number[],
  paths: readonly number[],
): number {
  let flown = 0;
  let collisions = 0;
  for (let i = 0; i < fractions.length; i++) {
    const speed = (fractions[i] ?? NaN) * (speeds[i] ?? NaN);
    flown += speed;
    collisions += speed / (paths[i] ?? NaN);
  }
  return flown / collisions;
}

/**
 * Mean free path of a dilute atom that moves at the gas temperature, between losses of its momentum.
 *
 *     λ = 1/Σ_j n_j Q_j sqrt(1 + m/M_j)
 *
 * Range: few atoms, which do not meet each other, in thermal gas. For faster atoms see `fastFreePath`.
 *
 * @param molarMass m: molar mass of the atom [kg/mol]
 * @param densities n_j: number densities of the gases [1/m3]
 * @param crossSections Q_j = π σ² Ω11*: cross-sections of the pairs atom-gas [m2]
 * @param molarMasses M_j: molar masses of the gases [kg/mol]
 * @returns λ: mean free path of the atom [m]
 * @source Chapman & Cowling 1970, sec. 5.21; Westwood, J. Vac. Sci. Technol. 15, 1 (1978)
 * @example thermalAtomPath(0.063546, [1.20715e20], [3.01907e-19], [0.039948]) -> 0.017047
 */
export function thermalAtomPath(
  molarMass: number,
  densities: readonly number[],
  crossSections: readonly number[],
  molarMasses: readonly number[],
): number {
  let perLength = 0;
  for (let j = 0; j < densities.length; j++) {
    const sweep = Math.sqrt(1 + molarMass / (molarMasses[j] ?? NaN));
    perLength += (densities[j] ?? NaN) * (crossSections[j] ?? NaN) * sweep;
  }
  return 1 / perLength;
}

/**
 * Mean free path of one gas from its viscosity: the same number as `meanFreePath` by another road.
 *
 *     λ = (4 μ/(5 p)) v = (16/5)(μ/p) sqrt(R T/(2π M))
 *
 * Range: dilute gas.
 *
 * @param viscosity μ: viscosity [Pa s]
 * @param pressure p: pressure [Pa]
 * @param molarMass M: molar mass [kg/mol]
 * @param temperature T: gas temperature [K]
 * @returns λ: mean free path [m]
 * @source Kaye & Laby, Tables of Physical and Chemical Constants, sec. 2.2.4
 * @example pathFromViscosity(17.8e-6, 100000, 0.028014, 298.15) -> 6.7597e-8
 */
export function pathFromViscosity(viscosity: number, pressure: number, molarMass: number, temperature: number): number {
  return ((4 * viscosity) / (5 * pressure)) * meanSpeed(molarMass, temperature);
}

/**
 * Maxwell's mean free path of one gas, as Knudsen's conductance formula uses it.
 *
 *     λ_M = (μ/p) sqrt(π R T/(2 M))
 *
 * Range: dilute gas. 5π/16 = 0.982 of the path of `pathFromViscosity`.
 *
 * @param viscosity μ: viscosity [Pa s]
 * @param pressure p: pressure [Pa]
 * @param molarMass M: molar mass [kg/mol]
 * @param temperature T: gas temperature [K]
 * @returns λ_M: mean free path in Maxwell's definition [m]
 * @source Maxwell's viscosity form; Dushman, Scientific Foundations of Vacuum Technique, 2nd ed. 1962
 * @example maxwellPath(17.8e-6, 1, 0.028014, 298.15) -> 0.00663631
 */
export function maxwellPath(viscosity: number, pressure: number, molarMass: number, temperature: number): number {
  return (viscosity / pressure) * Math.sqrt((Math.PI * GAS_CONSTANT * temperature) / (2 * molarMass));
}

/**
 * Path of Bird's variable hard sphere over that of `meanFreePath`, for whoever compares with particle simulations.
 *
 *     λ_VHS/λ = (5 - 2ω)(7 - 2ω)/24
 *
 * Range: 0.5 <= ω <= 1.2. At ω = 0.5 both are one.
 *
 * @param viscosityExponent ω: exponent with which the viscosity grows with temperature [1]
 * @returns λ_VHS/λ: ratio of the paths [1]
 * @source Bird, Molecular Gas Dynamics and the Direct Simulation of Gas Flows, 1994, eq. 4.65
 * @example variableHardSphereRatio(0.81) -> 0.7577
 */
export function variableHardSphereRatio(viscosityExponent: number): number {
  return ((5 - 2 * viscosityExponent) * (7 - 2 * viscosityExponent)) / 24;
}
