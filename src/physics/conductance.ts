import { maxwellPath } from './collisions.ts';
import { BOLTZMANN, GAS_CONSTANT } from './constants.ts';
import { meanSpeed } from './state.ts';

/**
 * Molecular conductance of a thin aperture between large volumes.
 *
 *     C = A v/4
 *
 * Range: free-molecular, thickness far below the width.
 *
 * @param area A: area of the aperture [m2]
 * @param speed v: mean speed of the gas [m/s]
 * @returns C: conductance [m3/s]
 * @source Roth, Vacuum Technology, 3rd ed. 1990
 * @example apertureConductance(1e-4, 1754.7) -> 0.0438675
 */
export function apertureConductance(area: number, speed: number): number {
  return (area * speed) / 4;
}

/**
 * Molecular conductance of a long round tube.
 *
 *     C = π d³ v/(12 L)
 *
 * Range: free-molecular, L > 30 d; 10 % too much at L = 25 d, 40 % at 5 d.
 *
 * @param diameter d: diameter [m]
 * @param length L: length [m]
 * @param speed v: mean speed of the gas [m/s]
 * @returns C: conductance [m3/s]
 * @source Knudsen, Ann. Phys. 333 (28), 75 (1909)
 * @example longTubeConductance(0.07, 2.47, 471) -> 0.017123
 */
export function longTubeConductance(diameter: number, length: number, speed: number): number {
  return (Math.PI * diameter ** 3 * speed) / (12 * length);
}

/**
 * Conductance of a long round tube at any Knudsen number, by Knudsen's formula.
 *
 *     C = π d⁴ p̄/(128 μ L) + (π d³ v/(12 L)) (1 + 2.507 x)/(1 + 3.095 x),  x = d/(2 λ_M)
 *
 * Range: L > 30 d, laminar, not choked. Weakness: within 5 % of measured minima near x = 0.3.
 *
 * @param diameter d: diameter [m]
 * @param length L: length [m]
 * @param meanPressure p̄: mean of the pressures at both ends [Pa]
 * @param temperature T: gas temperature [K]
 * @param molarMass M: molar mass [kg/mol]
 * @param viscosity μ: viscosity, from which λ_M is Maxwell's path [Pa s]
 * @returns C: conductance [m3/s]
 * @source Knudsen, Ann. Phys. 333 (28), 75 (1909); constants for the radius over Maxwell's path as in Dushman 1962
 * @example knudsenTubeConductance(0.02, 1, 10, 293.15, 0.02896, 18.2e-6) -> 0.0029469
 */
export function knudsenTubeConductance(
  diameter: number,
  length: number,
  meanPressure: number,
  temperature: number,
  molarMass: number,
  viscosity: number,
): number {
  const viscous = (Math.PI * diameter ** 4 * meanPressure) / (128 * viscosity * length);
  const molecular = longTubeConductance(diameter, length, meanSpeed(molarMass, temperature));
  return viscous + molecular * molecularShare(diameter / 2, meanPressure, temperature, molarMass, viscosity);
}

/** (1 + 2.507 x)/(1 + 3.095 x): what collisions leave of the molecular conductance. */
function molecularShare(
  radius: number,
  pressure: number,
  temperature: number,
  molarMass: number,
  viscosity: number,
): number {
  if (pressure === 0) return 1;
  const ratio = radius / maxwellPath(viscosity, pressure, molarMass, temperature);
  return (1 + 2.507 * ratio) / (1 + 3.095 * ratio);
}

/**
 * Conductance of parts in a row.
 *
 *     1/C = Σ 1/C_i
 *
 * Range: each part opens into a volume in which the gas loses its direction. Weakness: short parts in direct contact count their entrance twice.
 *
 * @param conductances C_i: conductances of the parts [m3/s]
 * @returns C: conductance of the row [m3/s]
 * @source Dushman, Scientific Foundations of Vacuum Technique, 2nd ed. 1962
 * @example seriesConductance([0.029722, 0.017123]) -> 0.010864
 */
export function seriesConductance(conductances: readonly number[]): number {
  let resistance = 0;
  for (const conductance of conductances) resistance += 1 / conductance;
  return 1 / resistance;
}

/**
 * Pressure ratio, downstream over upstream, below which a nozzle is choked.
 *
 *     r = (2/(γ + 1))^(γ/(γ - 1))
 *
 * Range: continuum, γ > 1.
 *
 * @param heatCapacityRatio γ: ratio of the heat capacities [1]
 * @returns r: critical pressure ratio [1]
 * @source Cengel & Cimbala, Fluid Mechanics: Fundamentals and Applications, 2006, ch. 12
 * @example criticalPressureRatio(1.4) -> 0.528282
 */
export function criticalPressureRatio(heatCapacityRatio: number): number {
  return (2 / (heatCapacityRatio + 1)) ** (heatCapacityRatio / (heatCapacityRatio - 1));
}

/**
 * Throughput of a choked nozzle over its area and the pressure upstream.
 *
 *     C/A = sqrt(γ R T/M) (2/(γ + 1))^((γ + 1)/(2(γ - 1)))
 *
 * Range: continuum, ideal nozzle, γ > 1. Weakness: a sharp edge passes 0.6 to 0.9 of it.
 *
 * @param temperature T: gas temperature upstream [K]
 * @param molarMass M: molar mass [kg/mol]
 * @param heatCapacityRatio γ: ratio of the heat capacities [1]
 * @returns C/A: conductance per area [m/s]
 * @source Cengel & Cimbala 2006, ch. 12; Umrath et al., Fundamentals of Vacuum Technology, 1998
 * @example chokedConductancePerArea(293.15, 0.02896, 1.4) -> 198.647
 */
export function chokedConductancePerArea(temperature: number, molarMass: number, heatCapacityRatio: number): number {
  const soundSpeed = Math.sqrt((heatCapacityRatio * GAS_CONSTANT * temperature) / molarMass);
  return soundSpeed * (2 / (heatCapacityRatio + 1)) ** ((heatCapacityRatio + 1) / (2 * (heatCapacityRatio - 1)));
}

/**
 * Pressure upstream of the holes of a showerhead: it solves
 *
 *     F k T = C(p̄) (p_up - p),  p̄ = (p_up + p)/2
 *     C = π d⁴ p̄/(128 μ (L + (3π/16) d)) + W (π d²/4)(v/4) (1 + 2.507 x)/(1 + 3.095 x),  x = d/(2 λ_M)
 *     W = 1/(1 + (3/4)(L/d) (1 + 1/(3 (1 + (2/7) L/d))))
 *
 * and is never less than F k T/(A C_choked). A hole is a short tube, so its entrance counts: where collisions rule, Sampson's creeping flow through
 * a thin hole adds its resistance to Poiseuille's (a length of 3π/16 d; Dagan et al. found the sum within 1 % for every L/d); where there are none,
 * W is Santeler's transmission, within 0.7 % of Clausing's. Both limits are right for every L/d; between them Knudsen's bridge of the long tube
 * is used for want of a better one.
 *
 * Range: any Knudsen number, Reynolds number in the hole below about 10. Weakness: 10 to 20 % near Kn = 1 in holes shorter than their width, whose
 * conductance has no minimum; kinetic energy lost at the exit is left out but for the choked bound.
 *
 * @param flowPerHole F: flow of molecules through one hole [1/s]
 * @param downstreamPressure p: pressure in the chamber [Pa]
 * @param temperature T: temperature of the gas in the hole [K]
 * @param holeDiameter d: diameter of the hole [m]
 * @param holeLength L: length of the hole [m]
 * @param molarMass M: molar mass [kg/mol]
 * @param viscosity μ: viscosity [Pa s]
 * @param heatCapacityRatio γ: ratio of the heat capacities [1]
 * @returns p_up: pressure upstream of the holes [Pa]
 * @source Knudsen 1909; Dagan, Weinbaum & Pfeffer, J. Fluid Mech. 115, 505 (1982); Santeler, J. Vac. Sci. Technol. A 4, 338 (1986)
 * @example plenumPressure(1e18, 4, 300, 0.5e-3, 6e-3, 0.03995, 22.7e-6, 1.6667) -> 750.91
 */
export function plenumPressure(
  flowPerHole: number,
  downstreamPressure: number,
  temperature: number,
  holeDiameter: number,
  holeLength: number,
  molarMass: number,
  viscosity: number,
  heatCapacityRatio: number,
): number {
  const throughput = flowPerHole * BOLTZMANN * temperature;
  const area = (Math.PI * holeDiameter ** 2) / 4;
  const slope = (Math.PI * holeDiameter ** 4) / (128 * viscosity * (holeLength + ((3 * Math.PI) / 16) * holeDiameter));
  const molecular =
    shortTubeTransmission(holeLength / holeDiameter) * apertureConductance(area, meanSpeed(molarMass, temperature));
  let drop = 0;
  // The share of the molecular part varies so little with pressure that each turn gains about two digits.
  for (let turn = 0; turn < 12; turn++) {
    const share = molecularShare(holeDiameter / 2, downstreamPressure + drop / 2, temperature, molarMass, viscosity);
    drop = pressureDrop(throughput, slope, slope * downstreamPressure + molecular * share);
  }
  const choked = throughput / (area * chokedConductancePerArea(temperature, molarMass, heatCapacityRatio));
  return Math.max(downstreamPressure + drop, choked);
}

/** Positive root s of (slope/2) s² + conductance s = throughput. */
function pressureDrop(throughput: number, slope: number, conductance: number): number {
  return (2 * throughput) / (conductance + Math.sqrt(conductance ** 2 + 2 * slope * throughput));
}

/** Santeler's fit of the probability that a molecule passes a round tube of this length over diameter. */
function shortTubeTransmission(ratio: number): number {
  return 1 / (1 + (3 / 4) * ratio * (1 + 1 / (3 * (1 + (2 / 7) * ratio))));
}
