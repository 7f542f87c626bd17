import { BOLTZMANN, VACUUM_PERMITTIVITY } from './constants.ts';

/** A molecule as the Lennard-Jones 12-6 or the Stockmayer potential sees it. */
export interface Molecule {
  /** σ [m]: distance at which the potential is zero. It belongs to its ε: take both from one table. */
  readonly diameter: number;
  /** ε/k [K]: depth of the well. */
  readonly wellDepth: number;
  /** μ [C m]: dipole moment. */
  readonly dipole: number;
  /** Whether σ and ε were fitted together with the dipole (Stockmayer). Only then does the dipole enter. */
  readonly polar: boolean;
}

/** Potential between two molecules, alike or not. */
export interface PairPotential {
  /** σ_ij [m] */
  readonly diameter: number;
  /** ε_ij/k [K] */
  readonly wellDepth: number;
  /** δ_i δ_j [1], the square of the pair's reduced dipole; zero unless both are polar. */
  readonly polarity: number;
}

/**
 * Potential between two molecules by the combining rules of Lorentz and Berthelot, with Brokaw's for the dipoles.
 *
 *     σ_ij = (σ_i + σ_j)/2      ε_ij = sqrt(ε_i ε_j)      δ_ij² = δ_i δ_j      δ_i = μ_i²/(8π ε0 ε_i σ_i³)
 *
 * Range: gases. Not for metal atoms, whose pairs with gases have values of their own.
 * Weakness: the geometric mean makes wells of unlike pairs (helium or hydrogen with heavy molecules) too deep;
 * that a polar molecule induces a dipole in a non-polar one is left out.
 *
 * @param a one molecule: σ, ε/k, μ [m, K, C m]
 * @param b the other molecule: σ, ε/k, μ [m, K, C m]
 * @returns the pair: σ_ij, ε_ij/k, δ_i δ_j [m, K, 1]
 * @source Hirschfelder, Curtiss & Bird, Molecular Theory of Gases and Liquids, 1954, sec. 8.4; Brokaw, Ind. Eng. Chem. Process Des. Dev. 8, 240 (1969)
 * @example combine({"diameter": 3.33e-10, "wellDepth": 136.5, "dipole": 0, "polar": false}, {"diameter": 2.551e-10, "wellDepth": 10.2, "dipole": 0, "polar": false}) -> {"diameter": 2.9405e-10, "wellDepth": 37.314, "polarity": 0}
 */
export function combine(a: Molecule, b: Molecule): PairPotential {
  return {
    diameter: (a.diameter + b.diameter) / 2,
    wellDepth: Math.sqrt(a.wellDepth * b.wellDepth),
    polarity: a.polar && b.polar ? reducedDipole(a) * reducedDipole(b) : 0,
  };
}

function reducedDipole({ diameter, wellDepth, dipole }: Molecule): number {
  return dipole ** 2 / (8 * Math.PI * VACUUM_PERMITTIVITY * BOLTZMANN * wellDepth * diameter ** 3);
}

/**
 * Temperature in units of a pair's well depth.
 *
 *     T* = k T/ε
 *
 * Range: all; the collision integrals that it enters hold from 0.3 to 100.
 *
 * @param temperature T: gas temperature [K]
 * @param wellDepth ε/k: depth of the pair's well [K]
 * @returns T*: reduced temperature [1]
 * @source definition; Hirschfelder, Curtiss & Bird 1954, sec. 8.2
 * @example reducedTemperature(300, 136.5) -> 2.198
 */
export function reducedTemperature(temperature: number, wellDepth: number): number {
  return temperature / wellDepth;
}
