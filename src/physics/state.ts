import { BOLTZMANN, GAS_CONSTANT } from './constants.ts';

/**
 * Number of molecules in a volume of gas.
 *
 *     n = p/(k T)
 *
 * Range: ideal gas. At 1 atm and room temperature real gases depart by less than 1 %, near condensation by more.
 *
 * @param pressure p: pressure [Pa]
 * @param temperature T: gas temperature [K]
 * @returns n: number density [1/m3]
 * @source ideal gas law, k of the SI Brochure, 9th ed. 2019
 * @example numberDensity(1, 293.15) -> 2.47074e20
 */
export function numberDensity(pressure: number, temperature: number): number {
  return pressure / (BOLTZMANN * temperature);
}

/**
 * Mean speed of the molecules of a gas, of the Maxwell distribution.
 *
 *     v = sqrt(8 R T/(π M))
 *
 * Range: thermal gas. The root-mean-square speed is 1.085 of it, the most probable one 0.886.
 *
 * @param molarMass M: molar mass [kg/mol]
 * @param temperature T: gas temperature [K]
 * @returns v: mean speed [m/s]
 * @source Chapman & Cowling, The Mathematical Theory of Non-Uniform Gases, 3rd ed. 1970, ch. 4
 * @example meanSpeed(0.039948, 298.15) -> 397.5
 */
export function meanSpeed(molarMass: number, temperature: number): number {
  return Math.sqrt((8 * GAS_CONSTANT * temperature) / (Math.PI * molarMass));
}

/**
 * Mean molar mass of a mixture.
 *
 *     M = Σ x_i M_i
 *
 * Range: fractions that add up to one.
 *
 * @param fractions x_i: mole fractions [1]
 * @param molarMasses M_i: molar masses [kg/mol]
 * @returns M: mean molar mass [kg/mol]
 * @source definition of the mole fraction
 * @example mixtureMolarMass([0.79, 0.21], [0.028014, 0.031998]) -> 0.0288506
 */
export function mixtureMolarMass(fractions: readonly number[], molarMasses: readonly number[]): number {
  let sum = 0;
  for (let i = 0; i < fractions.length; i++) sum += (fractions[i] ?? NaN) * (molarMasses[i] ?? NaN);
  return sum;
}

/**
 * Mass density of a gas.
 *
 *     ρ = p M/(R T)
 *
 * Range: ideal gas.
 *
 * @param pressure p: pressure [Pa]
 * @param molarMass M: molar mass, of a mixture the mean [kg/mol]
 * @param temperature T: gas temperature [K]
 * @returns ρ: mass density [kg/m3]
 * @source ideal gas law, R of the SI Brochure, 9th ed. 2019
 * @example massDensity(101325, 0.028014, 273.15) -> 1.24985
 */
export function massDensity(pressure: number, molarMass: number, temperature: number): number {
  return (pressure * molarMass) / (GAS_CONSTANT * temperature);
}
