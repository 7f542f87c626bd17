import { BOLTZMANN } from './constants.ts';

/**
 * Pressure at which a pump carries off a flow.
 *
 *     p = F k T/S
 *
 * Range: steady state; a speed that does not depend on the pressure.
 *
 * @param flow F: molecules that flow in [1/s]
 * @param temperature T: temperature of the gas at the pump [K]
 * @param speed S: pumping speed at the chamber's port [m3/s]
 * @returns p: pressure [Pa]
 * @source definition of the pumping speed; ideal gas law
 * @example steadyPressure(4.47796e19, 293.15, 0.5) -> 0.36248
 */
export function steadyPressure(flow: number, temperature: number, speed: number): number {
  return (flow * BOLTZMANN * temperature) / speed;
}

/**
 * Molecules that a pump carries off.
 *
 *     F = p S/(k T)
 *
 * Range: steady state.
 *
 * @param pressure p: pressure [Pa]
 * @param speed S: pumping speed [m3/s]
 * @param temperature T: temperature of the gas at the pump [K]
 * @returns F: flow [1/s]
 * @source definition of the pumping speed; ideal gas law
 * @example carriedOff(0.36248, 0.5, 293.15) -> 4.4780e19
 */
export function carriedOff(pressure: number, speed: number, temperature: number): number {
  return (pressure * speed) / (BOLTZMANN * temperature);
}

/**
 * Speed of a pump for a mixture, from its speeds for the single gases: their partial pressures add up.
 *
 *     S = Σ F_i/Σ (F_i/S_i)
 *
 * Range: molecular flow into the pump, where gases do not drag each other.
 *
 * @param flows F_i: flow of each gas [1/s]
 * @param speeds S_i: speed for each gas [m3/s]
 * @returns S: speed for the mixture [m3/s]
 * @source Dalton's law with p_i = F_i k T/S_i
 * @example mixtureSpeed([1, 1], [1, 3]) -> 1.500
 */
export function mixtureSpeed(flows: readonly number[], speeds: readonly number[]): number {
  let flow = 0;
  let load = 0;
  for (const [index, one] of flows.entries()) {
    flow += one;
    load += one / (speeds[index] ?? NaN);
  }
  return flow / load;
}
