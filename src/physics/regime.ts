/** A range of Knudsen numbers and its name. */
export interface Band {
  readonly name: BandName;
  /** Lowest Knudsen number of the band [1]. */
  readonly from: number;
  /** Highest Knudsen number of the band [1]. */
  readonly to: number;
}

export type BandConvention = 'gas-dynamics' | 'vacuum';
export type BandName =
  'continuum' | 'slip' | 'transition' | 'free-molecular' | 'viscous' | 'intermediate' | 'molecular';

/**
 * The names that two trades give to ranges of the Knudsen number. A value on a limit belongs to the middle: 0.01 is slip, 0.1 and 10 are transition;
 * 0.01 and 0.5 are intermediate. Sources: gas dynamics Schaaf & Chambré, Flow of Rarefied Gases, 1961, and Bird 1994; vacuum: common practice,
 * as in Jousten (ed.), Handbook of Vacuum Technology.
 */
export const BANDS: Readonly<Record<BandConvention, readonly Band[]>> = {
  'gas-dynamics': [
    { name: 'continuum', from: 0, to: 0.01 },
    { name: 'slip', from: 0.01, to: 0.1 },
    { name: 'transition', from: 0.1, to: 10 },
    { name: 'free-molecular', from: 10, to: Infinity },
  ],
  vacuum: [
    { name: 'viscous', from: 0, to: 0.01 },
    { name: 'intermediate', from: 0.01, to: 0.5 },
    { name: 'molecular', from: 0.5, to: Infinity },
  ],
};

/**
 * Knudsen number: mean free path over a length.
 *
 *     Kn = λ/L
 *
 * Range: all. Weakness: depends on the definition of λ and on which length is taken; a diameter, not a radius.
 *
 * @param path λ: mean free path [m]
 * @param length L: length [m]
 * @returns Kn: Knudsen number [1]
 * @source Knudsen, Ann. Phys. 333 (28), 75 (1909); Schaaf & Chambré 1961
 * @example knudsen(6.6e-3, 0.027) -> 0.244
 */
export function knudsen(path: number, length: number): number {
  return path / length;
}

/**
 * Name of the band in which a Knudsen number lies; undefined for a negative number and for none.
 *
 * Range: all. Weakness: a convention; between 0.5 and 10 the two trades name the same flow differently. Show the number beside the name.
 *
 * @param knudsen Kn: Knudsen number [1]
 * @param convention whose names: gas-dynamics or vacuum [none]
 * @returns name of the band [none]
 * @source Schaaf & Chambré 1961 and Bird 1994 (gas dynamics); common practice (vacuum)
 * @example band(0.7, "gas-dynamics") -> "transition"
 * @example band(0.7, "vacuum") -> "molecular"
 */
export function band(knudsen: number, convention: BandConvention): BandName | undefined {
  if (!(knudsen >= 0)) return undefined;
  if (convention === 'vacuum') return knudsen < 0.01 ? 'viscous' : knudsen <= 0.5 ? 'intermediate' : 'molecular';
  if (knudsen < 0.01) return 'continuum';
  if (knudsen < 0.1) return 'slip';
  return knudsen <= 10 ? 'transition' : 'free-molecular';
}

/**
 * Collisions on a straight flight over a length.
 *
 *     N = L/λ
 *
 * Range: all; below one the fraction e^(-N) flies through.
 *
 * @param length L: length of the flight [m]
 * @param path λ: mean free path [m]
 * @returns N: collisions [1]
 * @source definition of the mean free path
 * @example collisionsStraight(0.1, 0.0066) -> 15.15
 */
export function collisionsStraight(length: number, path: number): number {
  return length / path;
}

/**
 * Collisions on the random walk that covers a length.
 *
 *     N = z L²/(2 D)
 *
 * Range: L well above the mean free path; on shorter ways molecules fly straight.
 *
 * @param frequency z: collision frequency [1/s]
 * @param length L: length [m]
 * @param diffusivity D: diffusivity [m2/s]
 * @returns N: collisions [1]
 * @source Einstein, Ann. Phys. 322 (8), 549 (1905): mean square way 2 D t
 * @example collisionsWalk(60000, 0.1, 1.5) -> 200
 */
export function collisionsWalk(frequency: number, length: number, diffusivity: number): number {
  return (frequency * length ** 2) / (2 * diffusivity);
}

/**
 * Impacts of a molecule on the walls during its stay.
 *
 *     N = τ v A/(4 V)
 *
 * Range: molecules spread evenly. Weakness: at high pressure most impacts are returns to the same spot.
 *
 * @param residenceTime τ: residence time [s]
 * @param speed v: mean speed [m/s]
 * @param area A: area of the walls [m2]
 * @param volume V: gas volume [m3]
 * @returns N: impacts on the walls [1]
 * @source impingement rate n v/4; Chapman & Cowling 1970
 * @example wallCollisions(0.16, 397, 0.5, 0.02) -> 397
 */
export function wallCollisions(residenceTime: number, speed: number, area: number, volume: number): number {
  return (residenceTime * speed * area) / (4 * volume);
}

/**
 * Time in which diffusion covers a length.
 *
 *     t = L²/(2 D)
 *
 * Range: L well above the mean free path. Weakness: a scale; half the molecules are still nearer.
 *
 * @param length L: length [m]
 * @param diffusivity D: diffusivity [m2/s]
 * @returns t: time [s]
 * @source Einstein, Ann. Phys. 322 (8), 549 (1905)
 * @example diffusionTime(0.1, 1.5) -> 0.00333
 */
export function diffusionTime(length: number, diffusivity: number): number {
  return length ** 2 / (2 * diffusivity);
}
