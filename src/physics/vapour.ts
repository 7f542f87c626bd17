/**
 * Vapour pressure of a liquid or solid (Antoine).
 *
 *     log10(p/Pa) = a - b/(T + c)
 *
 * Range: the temperatures for which the constants were fitted; the caller states them.
 *
 * @param temperature T: temperature of the condensed phase [K]
 * @param a a: constant of the substance [1]
 * @param b b: constant of the substance [K]
 * @param c c: constant of the substance [K]
 * @returns p: vapour pressure [Pa]
 * @source Antoine, C. R. Acad. Sci. 107, 681 (1888)
 * @example vapourPressure(373.15, 10.19621, 1730.63, -39.724) -> 1.0134e5
 */
export function vapourPressure(temperature: number, a: number, b: number, c: number): number {
  return 10 ** (a - b / (temperature + c));
}
