/*
 * Flights of sputtered atoms through one gas between two wide plates, followed collision by collision.
 *
 * An atom leaves the target with one energy, along the normal or with a cosine distribution. Its free paths are exponential, of the mean length that the
 * program's own law gives at its energy. That law counts momentum-transfer collisions, so each one scatters as hard spheres do:
 * isotropic about the centre of mass of the atom and a gas molecule at rest. Once below 3/2 k T it is thermal and walks on at random, in
 * isotropic steps of the length that makes its diffusivity, and has forgotten its line. What comes back to the target is lost.
 * Weak points: the gas at rest (of heavy atoms in helium its motion turns one in ten more aside), one energy for a whole spectrum, wide plates.
 */

export interface Masses {
  readonly atomMass: number;
  readonly gasMass: number;
}

/** An atom in a gas: what its flight needs. */
export interface Flyer extends Masses {
  readonly startEnergy: number;
  readonly thermalEnergy: number;
  readonly pathAt: (energy: number) => number;
  readonly thermalStep: number;
}

/** How an atom arrives at the wafer. */
export interface Arrival {
  readonly thermal: boolean;
  /** Cosine of the angle between the line on which it left and that on which it arrives. */
  readonly kept: number;
  /** Collisions before it was thermal. */
  readonly collisions: number;
}

/** How atoms leave the target. */
export type Leaving = 'along the normal' | 'with a cosine distribution';

/** The atoms that arrive, of so many that leave the target. */
export function arrivals(
  flyer: Flyer,
  throwDistance: number,
  atoms: number,
  leaving: Leaving,
  random: () => number,
): readonly Arrival[] {
  const arrived: Arrival[] = [];
  for (let i = 0; i < atoms; i++) {
    const first = towards(leaving === 'along the normal' ? 1 : Math.sqrt(random()), random);
    const arrival = fly(flyer, throwDistance, first, random);
    if (arrival !== undefined) arrived.push(arrival);
  }
  return arrived;
}

export type Direction = readonly [x: number, y: number, z: number];

function fly(flyer: Flyer, throwDistance: number, first: Direction, random: () => number): Arrival | undefined {
  let line = first;
  let energy = flyer.startEnergy;
  let depth = 0;
  for (let collisions = 0; ; collisions++) {
    depth += flyer.pathAt(energy) * exponential(random) * line[2];
    if (depth <= 0) return undefined;
    if (depth >= throwDistance) return { thermal: false, kept: dot(first, line), collisions };
    const after = scattered(flyer, line, random);
    const speed = Math.sqrt(dot(after, after));
    energy *= speed * speed;
    line = [after[0] / speed, after[1] / speed, after[2] / speed];
    if (energy > flyer.thermalEnergy) continue;
    const last = walk(flyer, throwDistance, depth, random);
    return last && { thermal: true, kept: dot(first, last), collisions: collisions + 1 };
  }
}

/** Velocity after a collision in units of the speed before: that of the centre of mass, and the atom's own about it. */
export function scattered({ atomMass, gasMass }: Masses, line: Direction, random: () => number): Direction {
  const about = anywhere(random);
  const both = atomMass + gasMass;
  return [
    (atomMass * line[0] + gasMass * about[0]) / both,
    (atomMass * line[1] + gasMass * about[1]) / both,
    (atomMass * line[2] + gasMass * about[2]) / both,
  ];
}

/** The line on which a thermal atom arrives, if it does. */
function walk(
  { thermalStep }: Flyer,
  throwDistance: number,
  from: number,
  random: () => number,
): Direction | undefined {
  let depth = from;
  for (;;) {
    const line = anywhere(random);
    depth += thermalStep * exponential(random) * line[2];
    if (depth <= 0) return undefined;
    if (depth >= throwDistance) return line;
  }
}

function exponential(random: () => number): number {
  return -Math.log(1 - random());
}

function anywhere(random: () => number): Direction {
  return towards(2 * random() - 1, random);
}

/** A direction with this cosine to the normal, turned about it at random. */
function towards(cosine: number, random: () => number): Direction {
  const turn = 2 * Math.PI * random();
  const across = Math.sqrt(1 - cosine * cosine);
  return [across * Math.cos(turn), across * Math.sin(turn), cosine];
}

function dot(a: Direction, b: Direction): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

/** Numbers from 0 to below 1 by a multiplicative congruential generator; modulus and multiplier of Park, Miller & Stockmeyer 1993 (from memory). */
export function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (48271 * state) % 2147483647;
    return (state - 1) / 2147483646;
  };
}
