import { BOLTZMANN, STANDARD_GRAVITY } from './constants.ts';
import { erfc } from './special.ts';

/** Below this Péclet number a tube counts as stirred [1]; common practice. */
export const STIRRED_BELOW_PECLET = 2;
/** Above this Péclet number a tube counts as plug flow with dispersion [1]; common practice. Between both pictures are in doubt. */
export const PLUG_ABOVE_PECLET = 10;
/** Rayleigh number at which a layer heated from below, between rigid faces, begins to turn over [1]. Chandrasekhar 1961: 1707.76. */
export const RAYLEIGH_ONSET = 1708;
/** ΔT/T up to which `rayleigh` is good [1]; beyond it, with properties at the film temperature, within 30 %. */
export const RAYLEIGH_CONTRAST = 0.3;

/**
 * Molecules a second in a standard flow.
 *
 *     F = Q p0/(k T0)
 *
 * Range: ideal gas at the reference condition. 1 sccm is 4.478e17 1/s at 0 degC and 101325 Pa, 1.3 % less at 100 kPa, 7 % less at 20 degC.
 *
 * @param standardFlow Q: volume flow at the reference condition [m3/s]
 * @param referencePressure p0: reference pressure [Pa]
 * @param referenceTemperature T0: reference temperature [K]
 * @returns F: flow of molecules [1/s]
 * @source SEMI E12 (reference condition); ideal gas law
 * @example flowRate(1.6666666667e-8, 101325, 273.15) -> 4.47797e17
 */
export function flowRate(standardFlow: number, referencePressure: number, referenceTemperature: number): number {
  return (standardFlow * referencePressure) / (BOLTZMANN * referenceTemperature);
}

/**
 * Time for which the gas fed would fill the volume: mean stay of a molecule in a stirred one.
 *
 *     τ = p V/(k T F)
 *
 * Range: steady state, whole volume swept and at one temperature. Weakness: molecules that split raise the outflow and shorten it.
 *
 * @param pressure p: pressure [Pa]
 * @param volume V: gas volume [m3]
 * @param temperature T: gas temperature [K]
 * @param flow F: flow of molecules [1/s]
 * @returns τ: residence time [s]
 * @source definition; ideal gas law
 * @example residenceTime(1.3332237, 0.02, 273.15, 4.47797e19) -> 0.157895
 */
export function residenceTime(pressure: number, volume: number, temperature: number, flow: number): number {
  return (pressure * volume) / (BOLTZMANN * temperature * flow);
}

/**
 * How often the gas of a volume is fed anew in a time.
 *
 *     θ = t/τ
 *
 * Range: steady pressure and flow over the whole time.
 *
 * @param time t: duration [s]
 * @param residenceTime τ: residence time [s]
 * @returns θ: turnovers [1]
 * @source definition
 * @example turnovers(12, 1.6) -> 7.5
 */
export function turnovers(time: number, residenceTime: number): number {
  return time / residenceTime;
}

/**
 * Pumping speed that holds a pressure against a flow. The pump sees gas at its own temperature, not at the plasma's.
 *
 *     S = F k T_pump/p
 *
 * Range: no drop of pressure between chamber and pump port.
 *
 * @param flow F: flow of molecules [1/s]
 * @param pumpTemperature T_pump: temperature of the gas at the port [K]
 * @param pressure p: pressure [Pa]
 * @returns S: pumping speed [m3/s]
 * @source definition; ideal gas law
 * @example pumpingSpeed(4.47797e19, 293.15, 1) -> 0.18124
 */
export function pumpingSpeed(flow: number, pumpTemperature: number, pressure: number): number {
  return (flow * BOLTZMANN * pumpTemperature) / pressure;
}

/**
 * Mean velocity of a gas stream.
 *
 *     u = F k T/(p A)
 *
 * Range: steady flow; a mean over the area, in a tube half of the largest velocity.
 *
 * @param flow F: flow of molecules [1/s]
 * @param temperature T: gas temperature [K]
 * @param pressure p: pressure [Pa]
 * @param area A: area normal to the flow [m2]
 * @returns u: velocity [m/s]
 * @source conservation of molecules; ideal gas law
 * @example bulkVelocity(4.47797e20, 900, 50, 0.03) -> 3.7095
 */
export function bulkVelocity(flow: number, temperature: number, pressure: number, area: number): number {
  return (flow * BOLTZMANN * temperature) / (pressure * area);
}

/**
 * Reynolds number: inertia over viscous force.
 *
 *     Re = ρ u L/μ
 *
 * Range: continuum and slip. In a round tube with L its diameter laminar below 2300.
 *
 * @param density ρ: mass density [kg/m3]
 * @param velocity u: velocity [m/s]
 * @param length L: length across the flow [m]
 * @param viscosity μ: viscosity [Pa s]
 * @returns Re: Reynolds number [1]
 * @source Reynolds, Phil. Trans. R. Soc. 174, 935 (1883)
 * @example reynolds(0.0547, 8.66, 0.07, 18.2e-6) -> 1822
 */
export function reynolds(density: number, velocity: number, length: number, viscosity: number): number {
  return (density * velocity * length) / viscosity;
}

/**
 * Péclet number of mass: what the stream carries over what diffuses.
 *
 *     Pe = u L/D
 *
 * Range: all. Far below one the gas diffuses against the stream, far above the stream rules.
 *
 * @param velocity u: velocity [m/s]
 * @param length L: length along the flow [m]
 * @param diffusivity D: diffusivity or axial dispersion [m2/s]
 * @returns Pe: Péclet number [1]
 * @source Perry's Chemical Engineers' Handbook, 8th ed. 2008
 * @example peclet(1.5, 2, 1e-9) -> 3.0e9
 */
export function peclet(velocity: number, length: number, diffusivity: number): number {
  return (velocity * length) / diffusivity;
}

/**
 * Axial dispersion in laminar flow through a round tube, after Taylor and Aris.
 *
 *     D_ax = D (1 + (u d/D)²/192)
 *
 * Range: laminar flow, and times above d²/(15 D), in which molecules cross the tube. Weakness: ends and temperature gradients are left out.
 *
 * @param diffusivity D: diffusivity [m2/s]
 * @param velocity u: mean velocity [m/s]
 * @param diameter d: diameter of the tube [m]
 * @returns D_ax: axial dispersion [m2/s]
 * @source Taylor, Proc. R. Soc. A 219, 186 (1953); Aris, Proc. R. Soc. A 235, 67 (1956)
 * @example dispersion(0.01, 1, 0.2) -> 0.030833
 */
export function dispersion(diffusivity: number, velocity: number, diameter: number): number {
  return diffusivity * (1 + ((velocity * diameter) / diffusivity) ** 2 / 192);
}

/**
 * Fraction of the old gas that still leaves a tube, in plug flow with axial dispersion.
 *
 *     f = ½ erfc((θ - 1) sqrt(Pe/(4 θ)))
 *
 * Range: Pe > 10; below 2 the tube is stirred, f = e^(-θ). Weakness: leading term of an open tube, a few percent of the gas off at Pe = 10.
 *
 * @param turnovers θ = t/τ: time over residence time [1]
 * @param peclet Pe: Péclet number of the tube's length with its axial dispersion [1]
 * @returns f: remaining fraction [1]
 * @source Levenspiel, Chemical Reaction Engineering, 3rd ed. 1999, ch. 13; Ogata & Banks, US Geol. Survey Prof. Paper 411-A (1961), leading term
 * @example plugRemainder(1.5, 20) -> 0.0984
 */
export function plugRemainder(turnovers: number, peclet: number): number {
  if (turnovers === 0) return 1;
  return erfc((turnovers - 1) * Math.sqrt(peclet / (4 * turnovers))) / 2;
}

/**
 * Rayleigh number of a gas layer: buoyancy over what viscosity and conduction take away.
 *
 *     Ra = g ΔT L³ ρ² c_p/(T μ κ)
 *
 * Range: ideal gas; the layer turns over from 1708 only where the hot face lies below. Goes with the square of the pressure.
 * Weakness: properties at the film temperature; within 30 % beyond ΔT/T = 0.3.
 *
 * @param temperatureDifference ΔT: between the faces [K]
 * @param gap L: distance of the faces [m]
 * @param density ρ: mass density at the film temperature [kg/m3]
 * @param heatCapacityPerMass c_p: heat capacity at constant pressure [J/(kg K)]
 * @param filmTemperature T: mean of both faces [K]
 * @param viscosity μ: viscosity at the film temperature [Pa s]
 * @param conductivity κ: thermal conductivity at the film temperature [W/(m K)]
 * @returns Ra: Rayleigh number [1]
 * @source Chandrasekhar, Hydrodynamic and Hydromagnetic Stability, 1961, ch. II
 * @example rayleigh(600, 0.05, 0.569, 1075, 600, 2.96e-5, 0.0448) -> 321732
 */
export function rayleigh(
  temperatureDifference: number,
  gap: number,
  density: number,
  heatCapacityPerMass: number,
  filmTemperature: number,
  viscosity: number,
  conductivity: number,
): number {
  const buoyancy = (STANDARD_GRAVITY * temperatureDifference * gap ** 3) / filmTemperature;
  return (buoyancy * density ** 2 * heatCapacityPerMass) / (viscosity * conductivity);
}

/**
 * Molecules that leak or outgas into a closed chamber in a second, from its rate of rise.
 *
 *     F = V (dp/dt)/(k T_wall)
 *
 * Range: volume shut off, gas at the wall's temperature. Weakness: early slopes hold outgassing; that of a true leak stays constant.
 *
 * @param volume V: gas volume [m3]
 * @param pressureRate dp/dt: rate of rise [Pa/s]
 * @param wallTemperature T_wall: temperature of the walls [K]
 * @returns F: flow of molecules [1/s]
 * @source rate-of-rise test, common practice; ideal gas law
 * @example leakRate(0.05, 0.01111, 293.15) -> 1.3725e17
 */
export function leakRate(volume: number, pressureRate: number, wallTemperature: number): number {
  return (volume * pressureRate) / (BOLTZMANN * wallTemperature);
}
