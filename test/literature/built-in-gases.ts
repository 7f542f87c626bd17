import { readFileSync } from 'node:fs';
import { parse } from 'yaml';
import { collisionDiameter, diffusionCrossSection, meanFreePath } from '../../src/physics/collisions.ts';
import { combine, type Molecule, type PairPotential } from '../../src/physics/pair.ts';
import { numberDensity } from '../../src/physics/state.ts';
import { diffusivity, diffusivityInMixture, mixtureViscosity, viscosity } from '../../src/physics/transport.ts';
import { si } from './units.ts';

/** A gas of the built-in data, as far as collisions need it. */
export interface Gas {
  readonly name: string;
  readonly molarMass: number;
  readonly molecule: Molecule;
}

/** What src/built-in/gases.yaml says of a gas, as far as it is read here. */
interface Block {
  readonly molar_mass: string;
  readonly collision?: { readonly diameter: string; readonly well_depth: string; readonly form: string };
  readonly dipole?: { readonly is: string };
  readonly accuracy?: { readonly viscosity: string; readonly diffusion: string };
}

const TEXT = readFileSync(new URL('../../src/built-in/gases.yaml', import.meta.url), 'utf8');
const BLOCKS = blocksIn(parse(TEXT));

function blocksIn(document: unknown): ReadonlyMap<string, Block> {
  if (typeof document !== 'object' || document === null || !('gases' in document)) throw new Error('no gases');
  return new Map(Object.entries(document.gases ?? {}));
}

export function gasNamed(name: string): Gas {
  const block = BLOCKS.get(name);
  if (block?.collision === undefined) throw new Error(`the built-in data have no collision values of ${name}`);
  const { diameter, well_depth: wellDepth, form } = block.collision;
  return {
    name,
    molarMass: si(block.molar_mass),
    molecule: {
      diameter: si(diameter),
      wellDepth: si(wellDepth),
      dipole: si(block.dipole?.is ?? 0),
      polar: form === 'stockmayer',
    },
  };
}

/** Relative standard uncertainty that the built-in data state for a property of a gas. */
export function statedAccuracy(name: string, property: 'viscosity' | 'diffusion'): number {
  const stated = BLOCKS.get(name)?.accuracy?.[property];
  if (stated === undefined) throw new Error(`the built-in data state no accuracy of ${name}`);
  return si(stated);
}

function pairOf(a: Gas, b: Gas): PairPotential {
  return combine(a.molecule, b.molecule);
}

export function diameterOf(a: Gas, b: Gas, temperature: number): number {
  const pair = pairOf(a, b);
  return collisionDiameter(pair.diameter, pair.wellDepth, pair.polarity, temperature);
}

export function crossSectionOf(a: Gas, b: Gas, temperature: number): number {
  const pair = pairOf(a, b);
  return diffusionCrossSection(pair.diameter, pair.wellDepth, pair.polarity, temperature);
}

export function viscosityOf(gas: Gas, temperature: number): number {
  return viscosity(gas.molarMass, temperature, diameterOf(gas, gas, temperature));
}

export function diffusivityOf(a: Gas, b: Gas, temperature: number, pressure: number): number {
  return diffusivity(a.molarMass, b.molarMass, temperature, pressure, crossSectionOf(a, b, temperature));
}

export function pathOf(gas: Gas, pressure: number, temperature: number): number {
  const diameter = diameterOf(gas, gas, temperature);
  return meanFreePath(gas.molarMass, [numberDensity(pressure, temperature)], [diameter], [gas.molarMass]);
}

/** Dry air by volume, U.S. Standard Atmosphere, 1976, the traces counted as argon. */
const AIR = [
  { gas: gasNamed('N2'), fraction: 0.78084 },
  { gas: gasNamed('O2'), fraction: 0.209476 },
  { gas: gasNamed('Ar'), fraction: 0.009684 },
];

export function airViscosity(temperature: number): number {
  return mixtureViscosity(
    AIR.map(({ fraction }) => fraction),
    AIR.map(({ gas }) => viscosityOf(gas, temperature)),
    AIR.map(({ gas }) => gas.molarMass),
  );
}

/** Diffusivity of a trace in air. */
export function diffusivityInAir(trace: Gas, temperature: number, pressure: number): number {
  return diffusivityInMixture(
    0,
    AIR.map(({ fraction }) => fraction),
    AIR.map(({ gas }) => diffusivityOf(trace, gas, temperature, pressure)),
  );
}
