import {
  collisionDiameter,
  collisionFrequency,
  diffusionCrossSection,
  maxwellPath,
  meanFreePath,
  pathFromViscosity,
  thermalAtomPath,
  variableHardSphereRatio,
} from '../../src/physics/collisions.ts';
import { omega11 } from '../../src/physics/collision-integrals.ts';
import { chokedConductancePerArea, criticalPressureRatio } from '../../src/physics/conductance.ts';
import { BOLTZMANN } from '../../src/physics/constants.ts';
import {
  bulkVelocity,
  flowRate,
  leakRate,
  peclet,
  pumpingSpeed,
  rayleigh,
  residenceTime,
  reynolds,
} from '../../src/physics/flow.ts';
import {
  fullScaleError,
  gasCorrectionFactor,
  transpiration,
  transpirationLimit,
} from '../../src/physics/instruments.ts';
import { combine } from '../../src/physics/pair.ts';
import { band, knudsen } from '../../src/physics/regime.ts';
import { impurityRatio, pumpDown } from '../../src/physics/residual.ts';
import {
  collisionsToThermalise,
  energyDecrement,
  largestEnergyFraction,
  uncollidedFraction,
} from '../../src/physics/sputtered-atoms.ts';
import { massDensity, meanSpeed, numberDensity } from '../../src/physics/state.ts';
import { exposure, impingement, monolayerTime, surfaceRateFromSticking } from '../../src/physics/surfaces.ts';
import { diffusivity, diffusivityInMixture, mixtureViscosity, viscosity } from '../../src/physics/transport.ts';
import { airViscosity, gasNamed, viscosityOf } from './built-in-gases.ts';
import type { Inputs } from './rows.ts';

type Law = (given: Inputs) => number | string | undefined;

/** How the laws of src/physics come to the number of each row. */
export const LAWS: Readonly<Record<string, Law>> = {
  'a-01': density,
  'a-03': density,
  'a-05': speed,
  'a-07': speed,
  'a-09': speed,
  'a-11': pathOfOneGas,
  'a-13': pathOfOneGas,
  'a-15': pathOfOneGas,
  'a-17': (given) => 1 / collisionFrequency(speed(given), pathOfOneGas(given)),
  // temperature and mass cancel in path over speed
  'a-19': (given) => pathFromViscosity(given.number('eta'), given.number('p'), 0.004, 298) / meanSpeed(0.004, 298),
  'a-21': (given) => pathFromViscosity(given.number('eta'), given.number('p'), given.number('M'), given.number('T')),
  'a-23': (given) => diameterOf(given.number('eta'), given.number('M'), given.number('T')),
  'a-25': (given) => pathFromProduct(given.number('product'), given.number('p')),
  'a-27': (given) => given.number('x'),
  'a-29': (given) => pathInOneGas(numberDensity(1, given.number('T')), given.number('d')),
  'a-31': (given) => pathInOneGas(numberDensity(1, given.number('T')), given.number('d')),
  'a-33': (given) => pathInOneGas(given.number('n'), given.number('d')),
  'a-35': (given) => collisionFrequency(given.number('v'), given.number('path')),
  'a-37': (given) => maxwellPath(given.number('eta'), given.number('p'), given.number('M'), given.number('T')),
  'a-39': carriedPath,
  'a-41': (given) => impingement(given.number('p'), given.number('M'), given.number('T')),
  'a-43': (given) =>
    monolayerTime(
      given.number('Ns'),
      given.number('s'),
      impingement(given.number('p'), given.number('M'), given.number('T')),
    ),
  'a-45': (given) => exposure(given.number('p'), given.number('t')),
  'a-47': (given) =>
    meanFreePath(
      given.number('M1'),
      [density(given)],
      [(given.number('d1') + given.number('d2')) / 2],
      [given.number('M2')],
    ),

  'b-01': (given) => band(given.number('Kn'), 'gas-dynamics'),
  'b-03': (given) => band(given.number('Kn'), 'gas-dynamics'),
  'b-05': (given) => band(given.number('Kn'), 'gas-dynamics'),
  'b-07': (given) => band(given.number('Kn'), 'vacuum'),
  'b-09': (given) => band(given.number('Kn'), 'vacuum'),
  'b-11': (given) => knudsen(given.number('product'), 1) / given.number('Kn'),
  'b-13': (given) => reynolds(given.number('rho'), given.number('v'), given.number('d'), given.number('eta')),
  'b-15': turbulentThroughput,
  'b-17': (given) => criticalPressureRatio(given.number('gamma')),
  'b-19': (given) =>
    given.number('p2') / given.number('p1') < criticalPressureRatio(given.number('gamma')) ? 'yes' : 'no',
  'b-21': (given) => chokedConductancePerArea(given.number('T'), given.number('M'), given.number('gamma')),

  'c-01': molecules,
  'c-03': throughput,
  'c-05': throughput,
  'c-07': throughput,
  'c-09': molecules,
  'c-11': molecules,
  'c-13': (given) =>
    gasCorrectionFactor(given.number('cp_ref'), given.number('cp_gas'), given.number('s_ref'), given.number('s_gas')),

  'd-01': residence,
  'd-03': residence,
  'd-05': residence,

  'f-01': (given) => omega11(given.number('Ts')),
  'f-03': (given) => omega11(given.number('Ts')),
  'f-05': viscosityOfPair,
  'f-07': viscosityOfPair,
  'f-09': viscosityOfPair,
  'f-11': diffusivityOfPair,
  'f-13': diffusivityOfPair,
  'f-15': (given) =>
    diffusivity(given.number('M1'), given.number('M2'), given.number('T'), given.number('p'), given.number('sigma')),
  'f-17': (given) => diffusivityInMixture(0, given.list('x'), given.list('D')),
  'f-19': (given) => mixtureViscosity(given.list('x'), given.list('mu'), given.list('M')),
  'f-21': (given) => airViscosity(given.number('T')),
  'f-23': (given) => viscosityOf(gasNamed('Ar'), given.number('T')),
  'f-25': (given) => viscosityOf(gasNamed('H2'), given.number('T')),
  'f-27': variableHardSphereDiameter,
  'f-29': variableHardSphereDiameter,
  'f-31': variableHardSphereDiameter,
  'f-33': variableHardSphereGrowth,

  // by the mean ratio of energies: minus the logarithm of the part kept stands for ξ
  'g-01': (given) =>
    collisionsToThermalise(
      given.number('E0'),
      given.number('Eth') / (1.5 * BOLTZMANN),
      -Math.log(1 - given.number('x')),
    ),
  'g-03': energyKept,
  'g-05': energyKept,
  'g-07': energyKept,
  'g-09': (given) => largestEnergyFraction(given.number('m'), given.number('M')),
  'g-11': collisionsByMeanLogarithm,
  'g-13': collisionsByMeanLogarithm,
  'g-15': (given) =>
    thermalAtomPath(given.number('m'), [density(given)], [Math.PI * given.number('d12') ** 2], [given.number('M')]),
  'g-17': (given) => uncollidedFraction(given.number('x'), given.number('path')),
  'g-19': (given) => uncollidedFraction(given.number('x'), given.number('path')),
  'g-21': meanUncollidedFraction,

  'i-01': (given) => surfaceRateFromSticking(given.number('gamma'), speed(given)),
  'i-03': (given) => surfaceRateFromSticking(given.number('gamma'), speed(given)),
  'i-11': (given) => buoyancy(given, given.number('rho'), 1 / given.number('beta'), 1),
  'i-13': (given) =>
    buoyancy(
      given,
      massDensity(given.number('p'), given.number('M'), given.number('T')),
      given.number('T'),
      given.number('Pr'),
    ),
  'i-15': (given) =>
    rayleigh(100, 0.05, massDensity(given.number('p2'), 0.028, 300), 1000, 300, 2e-5, 0.03) /
    rayleigh(100, 0.05, massDensity(given.number('p1'), 0.028, 300), 1000, 300, 2e-5, 0.03),
  'i-17': (given) => peclet(given.number('v'), given.number('L'), given.number('D')),

  // throughput: molecules a second times kT, whatever the temperature
  'm-01': (given) => leakRate(given.number('V'), given.number('rate'), 300) * BOLTZMANN * 300,
  'm-03': (given) =>
    leakRate(given.number('V'), given.number('rate'), given.number('T')) /
    flowRate(1, given.number('pref'), given.number('Tref')),
  'm-05': (given) =>
    impurityRatio(
      [given.number('s') * impingement(given.number('p'), given.number('M'), given.number('T'))],
      [1],
      given.number('growth') * given.number('site_density'),
      1,
    ),
  'm-07': (given) => pumpDown(given.number('V'), given.number('S'), given.number('p0'), given.number('p1')),

  'o-01': (given) => fullScaleError(given.number('err_fs'), given.number('fs'), given.number('sp')),
  'o-03': (given) => transpirationLimit(given.number('T_gauge'), given.number('T_chamber')),
  'o-05': halfTranspiration,
  'o-07': halfTranspiration,
  'o-09': halfTranspiration,
};

function density(given: Inputs): number {
  return numberDensity(given.number('p'), given.number('T'));
}

function speed(given: Inputs): number {
  return meanSpeed(given.number('M'), given.number('T'));
}

function pathInOneGas(numberOfMolecules: number, diameter: number): number {
  return meanFreePath(1, [numberOfMolecules], [diameter], [1]);
}

function pathOfOneGas(given: Inputs): number {
  return pathInOneGas(density(given), given.number('d'));
}

/** Diameter of the hard spheres that have this viscosity. */
function diameterOf(measured: number, molarMass: number, temperature: number): number {
  return Math.sqrt(viscosity(molarMass, temperature, 1) / measured);
}

/** Path at a pressure in the gas that has this product of path and pressure. */
function pathFromProduct(product: number, pressure: number): number {
  const diameter = Math.sqrt(pathInOneGas(numberDensity(1, 293.15), 1) / product);
  return pathInOneGas(numberDensity(pressure, 293.15), diameter);
}

/** A tabulated path carried to another condition by the viscosity, here after Sutherland. */
function carriedPath(given: Inputs): number {
  const at = (temperature: number, pressure: number) => {
    const sutherland = temperature ** 1.5 / (temperature + given.number('S'));
    return pathFromViscosity(sutherland, pressure, 0.029, temperature);
  };
  const ratio = at(given.number('T'), given.number('p')) / at(given.number('T0'), given.number('p0'));
  return given.number('path0') * ratio;
}

/** Throughput over diameter at the given Reynolds number: the diameter and pressure chosen cancel. */
function turbulentThroughput(given: Inputs): number {
  const [diameter, pressure] = [0.05, 2000];
  const area = (Math.PI * diameter ** 2) / 4;
  const flow = 1 / (BOLTZMANN * given.number('T'));
  const perThroughput = reynolds(
    massDensity(pressure, given.number('M'), given.number('T')),
    bulkVelocity(flow, given.number('T'), pressure, area),
    diameter,
    given.number('eta'),
  );
  return given.number('Re') / perThroughput / diameter;
}

function molecules(given: Inputs): number {
  return flowRate(given.number('F'), given.number('pref'), given.number('Tref'));
}

/** Pressure times volume a second of a flow whose gas is at T: the speed that would hold it at 1 Pa. */
function throughput(given: Inputs): number {
  return pumpingSpeed(molecules(given), given.number('T'), 1);
}

function residence(given: Inputs): number {
  return residenceTime(given.number('p'), given.number('V'), given.number('T'), molecules(given));
}

function viscosityOfPair(given: Inputs): number {
  const diameter = collisionDiameter(given.number('sigma'), given.number('eps_k'), 0, given.number('T'));
  return viscosity(given.number('M'), given.number('T'), diameter);
}

function diffusivityOfPair(given: Inputs): number {
  const molecule = (n: 1 | 2) => ({
    diameter: given.number(`sigma${n}`),
    wellDepth: given.number(`eps${n}`),
    dipole: 0,
    polar: false,
  });
  const pair = combine(molecule(1), molecule(2));
  const crossSection = diffusionCrossSection(pair.diameter, pair.wellDepth, 0, given.number('T'));
  return diffusivity(given.number('M1'), given.number('M2'), given.number('T'), given.number('p'), crossSection);
}

function variableHardSphereDiameter(given: Inputs): number {
  const hardSphere = diameterOf(given.number('mu_ref'), given.number('M'), given.number('T_ref'));
  return hardSphere / Math.sqrt(variableHardSphereRatio(given.number('omega')));
}

/** The path follows the viscosity, which grows as T to the ω. */
function variableHardSphereGrowth(given: Inputs): number {
  const at = (temperature: number) => pathFromViscosity(temperature ** given.number('omega'), 1, 0.04, temperature);
  return at(given.number('T2')) / at(given.number('T1'));
}

function energyKept(given: Inputs): number {
  return 1 - largestEnergyFraction(given.number('m'), given.number('M')) / 2;
}

function collisionsByMeanLogarithm(given: Inputs): number {
  const temperature = given.number('Eth') / (1.5 * BOLTZMANN);
  return collisionsToThermalise(given.number('E0'), temperature, energyDecrement(given.number('m'), given.number('M')));
}

/** (1 - e^-y)/y is the mean of the uncollided fraction on the way to y. */
function meanUncollidedFraction(given: Inputs): number {
  const parts = 20000;
  let sum = 0;
  for (let i = 0; i < parts; i++)
    sum += uncollidedFraction(((i + 0.5) / parts) * given.number('pd'), given.number('p0d0'));
  return sum / parts;
}

/** Rayleigh number with c_p/κ written as Pr/μ. */
function buoyancy(given: Inputs, mass: number, temperature: number, prandtl: number): number {
  const mu = given.number('mu');
  return rayleigh(given.number('dT'), given.number('L'), mass, prandtl / mu, temperature, mu, 1);
}

/** Pressure at which half of the thermal transpiration is left. */
function halfTranspiration(given: Inputs): number {
  const excess = (pressure: number) =>
    transpiration(
      pressure,
      given.number('d'),
      given.number('T_gauge'),
      given.number('T_chamber'),
      given.number('A'),
      given.number('B'),
      given.number('C'),
    ) - 1;
  const half = (transpirationLimit(given.number('T_gauge'), given.number('T_chamber')) - 1) / 2;
  let [low, high] = [0, 1000];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (excess(middle) > half) low = middle;
    else high = middle;
  }
  return low;
}
