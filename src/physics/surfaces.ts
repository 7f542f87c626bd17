import { AVOGADRO, BOLTZMANN } from './constants.ts';

/**
 * Molecules of a gas that strike a surface, by Hertz and Knudsen.
 *
 *     Γ = p/sqrt(2π m k T)
 *
 * Range: thermal gas at rest before the surface. Weakness: a surface that takes up much of what strikes it thins the gas before it.
 *
 * @param pressure p: partial pressure [Pa]
 * @param molarMass M = N_A m: molar mass [kg/mol]
 * @param temperature T: gas temperature [K]
 * @returns Γ: impingement rate [1/(m2 s)]
 * @source Hertz, Ann. Phys. 253 (10), 177 (1882); Knudsen, Ann. Phys. 333 (28), 75 (1909)
 * @example impingement(1.33322e-4, 0.028014, 293.15) -> 3.87626e18
 */
export function impingement(pressure: number, molarMass: number, temperature: number): number {
  return pressure / Math.sqrt(2 * Math.PI * (molarMass / AVOGADRO) * BOLTZMANN * temperature);
}

/**
 * Time in which a gas would cover a surface once.
 *
 *     t = N_s/(s Γ)
 *
 * Range: sticking that does not fall with coverage. Weakness: an order of magnitude; sites are 0.5e19 to 1.5e19 1/m2.
 *
 * @param siteDensity N_s: sites of a monolayer [1/m2]
 * @param sticking s: fraction of what strikes that stays [1]
 * @param flux Γ: impingement rate [1/(m2 s)]
 * @returns t: monolayer time [s]
 * @source Roth, Vacuum Technology, 3rd ed. 1990
 * @example monolayerTime(1e19, 1, 3.8762e18) -> 2.5798
 */
export function monolayerTime(siteDensity: number, sticking: number, flux: number): number {
  return siteDensity / (sticking * flux);
}

/**
 * Exposure of a surface to a gas. One langmuir is 1e-6 Torr s, 1.33322e-4 Pa s.
 *
 *     E = p t
 *
 * Range: constant pressure.
 *
 * @param pressure p: partial pressure [Pa]
 * @param time t: duration [s]
 * @returns E: exposure [Pa s]
 * @source Langmuir's unit, common practice
 * @example exposure(3.33306e-4, 40) -> 0.0133322
 */
export function exposure(pressure: number, time: number): number {
  return pressure * time;
}

/**
 * Formula units of film grown or etched on an area in a second.
 *
 *     J = G ρ N_A/M
 *
 * Range: dense film. Weakness: thin films are often 5 to 15 % less dense than their bulk.
 *
 * @param rate G: growth or etch rate [m/s]
 * @param density ρ: mass density of the film [kg/m3]
 * @param molarMass M: molar mass of a formula unit [kg/mol]
 * @returns J: film flux [1/(m2 s)]
 * @source conservation of mass
 * @example filmFlux(1.6666667e-9, 2200, 0.060084) -> 3.6751e19
 */
export function filmFlux(rate: number, density: number, molarMass: number): number {
  return (rate * density * AVOGADRO) / molarMass;
}

/**
 * Rate constant of a first-order surface reaction from a sticking coefficient, with Motz and Wise's correction.
 *
 *     k_s = (s/(1 - s/2)) v/4
 *
 * Range: a gradient in the gas feeds the wall, 0 <= s <= 1; undefined outside. Weakness: where molecules fly free to the wall, s v/4 holds instead.
 *
 * @param sticking s: sticking coefficient [1]
 * @param speed v: mean speed [m/s]
 * @returns k_s: surface rate constant [m/s]
 * @source Motz & Wise, J. Chem. Phys. 32, 1893 (1960)
 * @example surfaceRateFromSticking(0.001, 770.27) -> 0.19266
 */
export function surfaceRateFromSticking(sticking: number, speed: number): number {
  return sticking >= 0 && sticking <= 1 ? ((sticking / (1 - sticking / 2)) * speed) / 4 : NaN;
}

/**
 * Rate constant of a first-order surface reaction from a measured film rate.
 *
 *     k_s = ν J/n
 *
 * Range: one gas supplies the film. Weakness: an average over all that deposits, a lower bound for what really sticks.
 *
 * @param moleculesPerFormula ν: molecules of the gas used up by a formula unit of film [1]
 * @param filmFlux J: film flux [1/(m2 s)]
 * @param concentration n: number density of the gas before the surface [1/m3]
 * @returns k_s: surface rate constant [m/s]
 * @source definition of a first-order surface reaction; Grove, Physics and Technology of Semiconductor Devices, 1967
 * @example surfaceRateFromGrowth(1, 8.3e18, 1.2e21) -> 0.00692
 */
export function surfaceRateFromGrowth(moleculesPerFormula: number, filmFlux: number, concentration: number): number {
  return (moleculesPerFormula * filmFlux) / concentration;
}

/**
 * Fraction of the molecules that strike which would have to react to give a surface rate.
 *
 *     s_eff = 4 k_s/v
 *
 * Range: s_eff well below one, where it is the sticking coefficient itself. Weakness: with Motz and Wise's correction it reaches 2 at s = 1.
 *
 * @param surfaceRate k_s: surface rate constant [m/s]
 * @param speed v: mean speed [m/s]
 * @returns s_eff: effective sticking coefficient [1]
 * @source Motz & Wise, J. Chem. Phys. 32, 1893 (1960), limit of small sticking
 * @example effectiveSticking(0.00692, 770.27) -> 3.594e-5
 */
export function effectiveSticking(surfaceRate: number, speed: number): number {
  return (4 * surfaceRate) / speed;
}

/**
 * What surfaces take up of an element over what the feed brings.
 *
 *     U = J A n_X/F_X
 *
 * Range: same rate on the whole area. Weakness: walls that grow or etch unseen make the true utilisation higher. Above one the rate
 * cannot be fed: rate, area or flow is wrong.
 *
 * @param filmFlux J: film flux [1/(m2 s)]
 * @param area A: area that grows or is etched [m2]
 * @param atomsPerFormula n_X: atoms of the element to a formula unit of film or to the product of one [1]
 * @param feedAtoms F_X: atoms of the element that the feed brings [1/s]
 * @returns U: utilisation [1]
 * @source conservation of atoms
 * @example utilisation(3.6751e19, 0.0314159, 1, 4.47797e19) -> 0.025783
 */
export function utilisation(filmFlux: number, area: number, atomsPerFormula: number, feedAtoms: number): number {
  return (filmFlux * area * atomsPerFormula) / feedAtoms;
}
