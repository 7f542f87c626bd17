import { AVOGADRO, BOLTZMANN, GAS_CONSTANT } from './constants.ts';

/** Molar heat capacity at constant volume of a gas that only translates [J/(mol K)]: no gas has less. */
export const MONATOMIC_HEAT_CAPACITY = 1.5 * GAS_CONSTANT;

/**
 * Viscosity of a gas, Chapman and Enskog's theory in first order.
 *
 *     μ = (5/16) sqrt(π m k T)/(π d²),  d² = σ² Ω22*
 *
 * Range: dilute gas, below about 1 bar; independent of pressure. Weakness: with Lennard-Jones pairs from tables 1 % in the middle and 3 % in one
 * case of ten from 293 to 600 K, up to 10 % for HF and water, which associate.
 *
 * @param molarMass M = N_A m: molar mass [kg/mol]
 * @param temperature T: gas temperature [K]
 * @param collisionDiameter d: effective hard-sphere diameter at T [m]
 * @returns μ: viscosity [Pa s]
 * @source Poling, Prausnitz & O'Connell, The Properties of Gases and Liquids, 5th ed. 2001, eq. 9-3.9; Chapman & Cowling 1970, ch. 10
 * @example viscosity(0.039948, 298.15, 3.58e-10) -> 2.2732e-5
 */
export function viscosity(molarMass: number, temperature: number, collisionDiameter: number): number {
  const mass = molarMass / AVOGADRO;
  return ((5 / 16) * Math.sqrt(Math.PI * mass * BOLTZMANN * temperature)) / (Math.PI * collisionDiameter ** 2);
}

/**
 * Viscosity of a mixture by Wilke's rule.
 *
 *     μ = Σ_i x_i μ_i / Σ_j x_j Φ_ij,  Φ_ij = (1 + sqrt(μ_i/μ_j) (M_j/M_i)^(1/4))²/sqrt(8 (1 + M_i/M_j))
 *
 * Range: dilute gases. Weakness: usually within 2 %, up to 10 % for hydrogen or helium with heavy gases.
 *
 * @param fractions x_i: mole fractions [1]
 * @param viscosities μ_i: viscosities of the pure gases [Pa s]
 * @param molarMasses M_i: molar masses [kg/mol]
 * @returns μ: viscosity of the mixture [Pa s]
 * @source Wilke, J. Chem. Phys. 18, 517 (1950)
 * @example mixtureViscosity([0.05, 0.95], [1.34e-5, 9.5029e-6], [0.06406, 0.04607]) -> 9.701615e-6
 */
export function mixtureViscosity(
  fractions: readonly number[],
  viscosities: readonly number[],
  molarMasses: readonly number[],
): number {
  return wilkeSum(fractions, viscosities, viscosities, molarMasses);
}

/** Σ_i x_i q_i / Σ_j x_j Φ_ij, shared by viscosity and thermal conductivity. */
function wilkeSum(
  fractions: readonly number[],
  property: readonly number[],
  viscosities: readonly number[],
  molarMasses: readonly number[],
): number {
  let sum = 0;
  for (let i = 0; i < fractions.length; i++) {
    let weight = 0;
    for (let j = 0; j < fractions.length; j++) {
      const massRatio = (molarMasses[i] ?? NaN) / (molarMasses[j] ?? NaN);
      const viscosityRatio = (viscosities[i] ?? NaN) / (viscosities[j] ?? NaN);
      weight += (fractions[j] ?? NaN) * wilkeFactor(massRatio, viscosityRatio);
    }
    sum += ((fractions[i] ?? NaN) * (property[i] ?? NaN)) / weight;
  }
  return sum;
}

/** Φ_ij from M_i/M_j and μ_i/μ_j. */
function wilkeFactor(massRatio: number, viscosityRatio: number): number {
  const root = 1 + Math.sqrt(viscosityRatio / Math.sqrt(massRatio));
  return (root * root) / Math.sqrt(8 * (1 + massRatio));
}

/**
 * Diffusivity of two gases in each other, Chapman and Enskog's theory in first order. With one gas as both: self-diffusion.
 *
 *     D = (3/16) sqrt(2π (k T)³/m_r)/(p Q),  m_r = m_A m_B/(m_A + m_B),  Q = π σ² Ω11*
 *
 * Range: dilute gases. Weakness: 2 % in the middle and 2.5 % low on average; water in CO2 17 % low, hydrogen or SF6 with heavy gases 6 to 10 % low
 * above 600 K. In first order it does not depend on the composition.
 *
 * @param molarMassA M_A: molar mass of one gas [kg/mol]
 * @param molarMassB M_B: molar mass of the other [kg/mol]
 * @param temperature T: gas temperature [K]
 * @param pressure p: total pressure [Pa]
 * @param crossSection Q = π σ² Ω11*: cross-section of the pair at T [m2]
 * @returns D: diffusivity [m2/s]
 * @source Poling, Prausnitz & O'Connell 2001, eq. 11-3.2; Chapman & Cowling 1970, ch. 14
 * @example diffusivity(0.0040026, 0.039948, 298.15, 101325, 2.1e-19) -> 7.5054e-5
 */
export function diffusivity(
  molarMassA: number,
  molarMassB: number,
  temperature: number,
  pressure: number,
  crossSection: number,
): number {
  const reducedMass = (molarMassA * molarMassB) / (molarMassA + molarMassB) / AVOGADRO;
  const energy = BOLTZMANN * temperature;
  return ((3 / 16) * Math.sqrt((2 * Math.PI * energy ** 3) / reducedMass)) / (pressure * crossSection);
}

/**
 * Diffusivity of one gas in a mixture.
 *
 *     D_i = (1 - x_i)/Σ_{j≠i} x_j/D_ij
 *
 * For a trace this is Blanc's law. A pure gas has no other gas to diffuse in: there take its self-diffusivity, which is what this gives
 * for a gas whose molecules are told apart, `diffusivityInMixture(0, [1], [D_ii])`.
 *
 * Range: dilute gases. Weakness: exact only while the other gases stand still against each other, good for a trace.
 *
 * @param ownFraction x_i: mole fraction of the gas [1]
 * @param otherFractions x_j: mole fractions of all others [1]
 * @param otherDiffusivities D_ij: diffusivities of the gas in each of them [m2/s]
 * @returns D_i: diffusivity in the mixture [m2/s]
 * @source Wilke, Chem. Eng. Prog. 46, 95 (1950); Fairbanks & Wilke, Ind. Eng. Chem. 42, 471 (1950); Blanc, J. Phys. (Paris) 7, 825 (1908)
 * @example diffusivityInMixture(0, [0.75, 0.25], [2e-5, 8e-5]) -> 2.46154e-5
 */
export function diffusivityInMixture(
  ownFraction: number,
  otherFractions: readonly number[],
  otherDiffusivities: readonly number[],
): number {
  let resistance = 0;
  for (let j = 0; j < otherFractions.length; j++) {
    resistance += (otherFractions[j] ?? NaN) / (otherDiffusivities[j] ?? NaN);
  }
  return resistance > 0 ? (1 - ownFraction) / resistance : NaN;
}

/**
 * Thermal conductivity of a gas by the modified Eucken formula.
 *
 *     κ = (μ/M) (1.32 C_v + 1.77 R)
 *
 * With C_v = 3/2 R, the heat capacity of a monatomic gas, this is the exact first-order result (15/4)(R/M) μ.
 *
 * Range: dilute gas, C_v >= 3/2 R; undefined below. Weakness: diatomic gases within 3 %, others within 5 to 10 %, polar ones 10 to 20 % high.
 *
 * @param molarMass M: molar mass [kg/mol]
 * @param viscosity μ: viscosity [Pa s]
 * @param heatCapacityAtConstantVolume C_v: molar heat capacity at constant volume [J/(mol K)]
 * @returns κ: thermal conductivity [W/(m K)]
 * @source Poling, Prausnitz & O'Connell 2001, ch. 10, modified Eucken model
 * @example thermalConductivity(0.028014, 17.877e-6, 20.81) -> 0.026921
 * @example thermalConductivity(0.0040026, 19.927e-6, 12.471693927) -> 0.15523
 */
export function thermalConductivity(
  molarMass: number,
  viscosity: number,
  heatCapacityAtConstantVolume: number,
): number {
  // A heat capacity that a document gives to a few digits may fall a hair short of 3/2 R.
  if (!(heatCapacityAtConstantVolume >= 0.999 * MONATOMIC_HEAT_CAPACITY)) return NaN;
  return (viscosity / molarMass) * (1.32 * heatCapacityAtConstantVolume + 1.77 * GAS_CONSTANT);
}

/**
 * Thermal conductivity of a mixture: Wassiljewa's sum with Wilke's factors, as Mason and Saxena proposed.
 *
 *     κ = Σ_i x_i κ_i / Σ_j x_j A_ij,  A_ij = Φ_ij of `mixtureViscosity`
 *
 * Range: dilute gases. Weakness: usually within 4 %, up to 10 % for hydrogen or helium with heavy gases.
 *
 * @param fractions x_i: mole fractions [1]
 * @param conductivities κ_i: thermal conductivities of the pure gases [W/(m K)]
 * @param viscosities μ_i: viscosities of the pure gases [Pa s]
 * @param molarMasses M_i: molar masses [kg/mol]
 * @returns κ: thermal conductivity of the mixture [W/(m K)]
 * @source Wassiljewa, Phys. Z. 5, 737 (1904); Mason & Saxena, Phys. Fluids 1, 361 (1958); Wilke, J. Chem. Phys. 18, 517 (1950)
 * @example mixtureThermalConductivity([0.5, 0.5], [0.1552, 0.01771], [19.93e-6, 22.72e-6], [0.0040026, 0.039948]) -> 0.05964
 */
export function mixtureThermalConductivity(
  fractions: readonly number[],
  conductivities: readonly number[],
  viscosities: readonly number[],
  molarMasses: readonly number[],
): number {
  return wilkeSum(fractions, conductivities, viscosities, molarMasses);
}
