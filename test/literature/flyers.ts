import { diffusionCrossSection } from '../../src/physics/collisions.ts';
import { BOLTZMANN } from '../../src/physics/constants.ts';
import {
  emissionEnergy,
  energyDecrement,
  fastFreePath,
  thermalisationDistance,
} from '../../src/physics/sputtered-atoms.ts';
import { meanSpeed, numberDensity } from '../../src/physics/state.ts';
import { diffusivity } from '../../src/physics/transport.ts';
import { BUILT_IN_SUBSTANCES } from '../../src/substances/built-in-substances.ts';
import { libraryOver } from '../../src/substances/library.ts';
import type { Flyer } from './sputter-flights.ts';

/* Atoms of the built-in data in one gas at 1 Pa and 300 K; shares depend on throws over paths only, not on the pressure. */

/** A flyer, and the distances by which the program measures throws for it. */
export interface Measured extends Flyer {
  /** Throw at which the thermalisation ratio is 1. */
  readonly thermalisationDistance: number;
  /** Throw at which the slowing Knudsen number is 1. */
  readonly slowingDistance: number;
}

export function flyerOf(atom: string, gas: string): Measured {
  const atomMass = datum(`atoms.${atom}.molar_mass`);
  const gasMass = datum(`gases.${gas}.molar_mass`);
  const diameter = datum(`atoms.${atom}.pairs.${gas}.diameter`);
  const wellDepth = datum(`atoms.${atom}.pairs.${gas}.well_depth`);
  const startEnergy = emissionEnergy(datum(`atoms.${atom}.sublimation_enthalpy`));
  const decrement = energyDecrement(atomMass, gasMass);
  const encounters = [
    atomMass,
    datum(`atoms.${atom}.atomic_number`),
    [numberDensity(PRESSURE, TEMPERATURE)],
    [diameter],
    [wellDepth],
    [gasMass],
    [CHARGES[gas] ?? NaN],
    [1],
    TEMPERATURE,
  ] as const;
  const crossSection = diffusionCrossSection(diameter, wellDepth, 0, TEMPERATURE);
  const diffusion = diffusivity(atomMass, gasMass, TEMPERATURE, PRESSURE, crossSection);
  return {
    atomMass,
    gasMass,
    startEnergy,
    thermalEnergy: 1.5 * BOLTZMANN * TEMPERATURE,
    pathAt: (energy) => fastFreePath(energy, ...encounters),
    thermalStep: (3 * diffusion) / meanSpeed(atomMass, TEMPERATURE),
    thermalisationDistance: thermalisationDistance(startEnergy, decrement, ...encounters),
    slowingDistance: fastFreePath(startEnergy, ...encounters) / decrement,
  };
}

const PRESSURE = 1;
const TEMPERATURE = 300;

/** Atomic numbers of the gases, all of single atoms. */
const CHARGES: Readonly<Record<string, number>> = { He: 2, Ne: 10, Ar: 18, Kr: 36 };

const library = libraryOver([BUILT_IN_SUBSTANCES]);

function datum(address: string): number {
  const found = library.datum(address);
  if (found === undefined) throw new Error(`the built-in data have no ${address}`);
  return found.value;
}
