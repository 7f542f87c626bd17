/**
 * Reactive atoms that arrive from the residual gas over the atoms of the film that grows.
 *
 *     R = Σ_i Γ_i a_i/(J a_film)
 *
 * Range: every molecule that strikes stays. Weakness: an upper bound, close for titanium or aluminium, loose for noble metals.
 *
 * @param impingements Γ_i: impingement rates of the reactive residual gases [1/(m2 s)]
 * @param atomsPerMolecule a_i: reactive atoms in a molecule of each [1]
 * @param filmFlux J: film flux [1/(m2 s)]
 * @param atomsPerFormula a_film: atoms in a formula unit of the film [1]
 * @returns R: impurity ratio [1]
 * @source Ohring, Materials Science of Thin Films, 2nd ed. 2002, ch. 3: arrival over growth
 * @example impurityRatio([3.626875e16], [1], 6.026e20, 1) -> 6.01871e-5
 */
export function impurityRatio(
  impingements: readonly number[],
  atomsPerMolecule: readonly number[],
  filmFlux: number,
  atomsPerFormula: number,
): number {
  let arriving = 0;
  for (let i = 0; i < impingements.length; i++) arriving += (impingements[i] ?? NaN) * (atomsPerMolecule[i] ?? NaN);
  return arriving / (filmFlux * atomsPerFormula);
}

/**
 * Time to pump a volume from one pressure to a lower one.
 *
 *     t = (V/S) ln(p_from/p_to)
 *
 * Range: constant speed. Weakness: below about 10 Pa outgassing rules and the time is longer.
 *
 * @param volume V: gas volume [m3]
 * @param speed S: pumping speed [m3/s]
 * @param from p_from: pressure at the start [Pa]
 * @param to p_to: pressure at the end [Pa]
 * @returns t: time [s]
 * @source Roth, Vacuum Technology, 3rd ed. 1990
 * @example pumpDown(0.1, 0.01, 101300, 100) -> 69.2067
 */
export function pumpDown(volume: number, speed: number, from: number, to: number): number {
  return (volume / speed) * Math.log(from / to);
}
