import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { omega11 } from '../../src/physics/collision-integrals.ts';
import { ATOMIC_MASS, BOLTZMANN, ELEMENTARY_CHARGE } from '../../src/physics/constants.ts';
import {
  fastCrossSection,
  logReducedEnergy,
  UNIVERSAL_CROSS_SECTION_RANGE,
} from '../../src/physics/fast-collisions.ts';
import {
  collisionsToThermalise,
  EMISSION_CUT_AT_LEAST,
  emissionCut,
  emissionEnergy,
  energyDecrement,
  fastFreePath,
  mixtureEnergyDecrement,
  thermalisationDistance,
  thermalisationRatio,
  uncollidedFraction,
  uncollidedFractionCosine,
} from '../../src/physics/sputtered-atoms.ts';
import { between } from './values.ts';

const eV = ELEMENTARY_CHARGE;

/** Copper in argon, pair values of the built-in table rounded. */
const copper = { molarMass: 0.063546, z: 29 };
const argon = { density: 1.2e20, diameter: 3.66e-10, wellDepth: 170, molarMass: 0.03995, z: 18, atoms: 1 };
const helium = { density: 6e19, diameter: 3.9e-10, wellDepth: 20, molarMass: 0.0040026, z: 2, atoms: 1 };
type Gas = typeof argon;

function path(energy: number, gases: readonly Gas[], temperature = 300): number {
  return fastFreePath(energy, copper.molarMass, copper.z, ...lists(gases), temperature);
}

function lists(gases: readonly Gas[]) {
  return [
    gases.map(({ density }) => density),
    gases.map(({ diameter }) => diameter),
    gases.map(({ wellDepth }) => wellDepth),
    gases.map(({ molarMass }) => molarMass),
    gases.map(({ z }) => z),
    gases.map(({ atoms }) => atoms),
  ] as const;
}

describe('emission', () => {
  test('the emission energy is the logarithmic mean of Thompson’s spectrum', () => {
    // with u = E/(E + U) the spectrum 2 U E/(E + U)³ dE is 2 u du, and ln E = ln U + ln(u/(1 - u))
    const parts = 200000;
    let mean = 0;
    for (let i = 0; i < parts; i++) {
      const u = (i + 0.5) / parts;
      mean += (2 * u * Math.log(u / (1 - u))) / parts;
    }
    expect(Math.log(emissionEnergy(3.5 * eV) / (3.5 * eV))).toBeCloseTo(mean, 4);
  });
});

test('argon at 400 V opens copper’s spectrum far enough, at 30 V not', () => {
  const enthalpy = 3.5 * eV;
  const cut = (voltage: number) => emissionCut(argon.molarMass, copper.molarMass, voltage, enthalpy);
  expect(cut(400) / enthalpy).toBeGreaterThan(EMISSION_CUT_AT_LEAST);
  expect(cut(30) / enthalpy).toBeLessThan(EMISSION_CUT_AT_LEAST);
});

describe('fast collisions', () => {
  test('the cross-section above 0.1 eV leans half on that of the universal potential', () => {
    for (const energy of [1, 3, 10, 30]) {
      const soft = universalCrossSection(energy, 29, 18);
      const hard = Math.PI * 3.66e-10 ** 2 * omega11((energy * eV) / (3 * BOLTZMANN * 170));
      const middle = fastCrossSection(energy * eV, 3.66e-10, 170, 29, 18, 1);
      expect(Math.abs(middle / Math.sqrt(soft * hard) - 1)).toBeLessThan(0.015);
    }
  });

  test('the energies of sputtered copper in argon lie within the fit of the universal potential', () => {
    const { from, to } = UNIVERSAL_CROSS_SECTION_RANGE;
    for (const energy of [0.1, 100]) {
      expect(logReducedEnergy(energy * eV, 29, 18, 1)).toBeGreaterThan(from);
      expect(logReducedEnergy(energy * eV, 29, 18, 1)).toBeLessThan(to);
    }
  });

  test('it runs on without a step at 0.1 eV and at 1 eV', () => {
    for (const energy of [0.1, 1]) {
      const below = fastCrossSection(energy * (1 - 1e-9) * eV, 3.66e-10, 170, 29, 18, 1);
      const above = fastCrossSection(energy * (1 + 1e-9) * eV, 3.66e-10, 170, 29, 18, 1);
      expect(above / below).toBeCloseTo(1, 7);
    }
  });

  test('it falls with energy', () => {
    fc.assert(
      fc.property(between(0.02, 50), (energy) => {
        const at = (one: number) => fastCrossSection(one * eV, 3.66e-10, 170, 29, 18, 1);
        expect(at(1.2 * energy)).toBeLessThan(at(energy));
      }),
    );
  });

  test('two atoms in one place are one atom of half the reduced energy', () => {
    expect(logReducedEnergy(2 * eV, 29, 7, 2)).toBeCloseTo(logReducedEnergy(eV, 29, 7, 1), 12);
  });

  test('a much faster atom than the gas sweeps its own way, a slow one is met by the gas', () => {
    const fast = path(20 * eV, [argon]);
    const relative = 20 * eV * (argon.molarMass / (argon.molarMass + copper.molarMass));
    expect(fast * argon.density * fastCrossSection(relative, argon.diameter, argon.wellDepth, 29, 18, 1)).toBeCloseTo(
      1,
      2,
    );
    expect(path(1e-4 * eV, [argon])).toBeLessThan(path(1e-2 * eV, [argon]));
  });

  test('collisions of gases add up, whatever their order', () => {
    const both = 1 / path(4 * eV, [argon]) + 1 / path(4 * eV, [helium]);
    expect(path(4 * eV, [argon, helium]) * both).toBeCloseTo(1, 12);
    expect(path(4 * eV, [helium, argon])).toBeCloseTo(path(4 * eV, [argon, helium]), 12);
  });
});

describe('slowing down', () => {
  test('the decrement is one at equal masses and twice the mass ratio for a heavy atom', () => {
    expect(energyDecrement(0.04, 0.04)).toBe(1);
    expect(energyDecrement(0.04, 0.04 * (1 + 1e-9))).toBeCloseTo(1, 6);
    expect(energyDecrement(0.2, 2e-5) / ((2 * 2e-5) / 0.2)).toBeCloseTo(1, 3);
    fc.assert(
      fc.property(between(0.002, 0.4), between(0.002, 0.4), (m, gas) => {
        expect(energyDecrement(m, gas)).toBeGreaterThan(0);
        expect(energyDecrement(m, gas)).toBeLessThanOrEqual(1);
        expect(energyDecrement(m, gas)).toBeCloseTo(energyDecrement(gas, m), 10);
      }),
    );
  });

  test('a mixture’s decrement lies between those of its gases and is that of one gas alone', () => {
    const of = (gases: readonly Gas[]) =>
      mixtureEnergyDecrement(4 * eV, copper.molarMass, copper.z, ...lists(gases), 300);
    expect(of([argon])).toBeCloseTo(energyDecrement(copper.molarMass, argon.molarMass), 12);
    expect(of([argon, { ...helium, density: 0 }])).toBeCloseTo(of([argon]), 12);
    expect(of([argon, helium])).toBeLessThan(of([argon]));
    expect(of([argon, helium])).toBeGreaterThan(of([helium]));
  });

  test('the distance grows without steps as collisions are added one by one', () => {
    const distance = (energy: number) =>
      thermalisationDistance(energy, 0.83785, copper.molarMass, copper.z, ...lists([argon]), 300);
    const thermal = 1.5 * BOLTZMANN * 300;
    const third = thermal * Math.exp(3 * 0.83785);
    expect(collisionsToThermalise(third, 300, 0.83785)).toBeCloseTo(3, 12);
    expect(distance(third * (1 + 1e-9)) / distance(third * (1 - 1e-9))).toBeCloseTo(1, 6);
    fc.assert(
      fc.property(between(0.05, 20), (energy) => {
        expect(distance(1.01 * energy * eV)).toBeGreaterThan(distance(energy * eV));
      }),
    );
  });

  test('the distance times the pressure does not depend on the pressure', () => {
    const at = (density: number) =>
      density *
      thermalisationDistance(5 * eV, 0.83785, copper.molarMass, copper.z, ...lists([{ ...argon, density }]), 300);
    expect(at(1e21) / at(1e19)).toBeCloseTo(1, 10);
  });

  test('an atom that leaves thermal needs no way, and has no ratio', () => {
    const none = thermalisationDistance(BOLTZMANN * 300, 0.8, copper.molarMass, copper.z, ...lists([argon]), 300);
    expect(none).toBe(0);
    expect(thermalisationRatio(0.1, none)).toBeNaN();
  });

  test('a decrement without sense has no distance', () => {
    for (const decrement of [0, NaN, 1e-9]) {
      expect(thermalisationDistance(5 * eV, decrement, copper.molarMass, copper.z, ...lists([argon]), 300)).toBeNaN();
    }
  });
});

describe('straight flights', () => {
  test('fewer cross a gap with a cosine distribution than along the normal', () => {
    fc.assert(
      fc.property(between(0.001, 20), (ratio) => {
        expect(uncollidedFractionCosine(ratio, 1)).toBeLessThan(uncollidedFraction(ratio, 1));
        expect(uncollidedFractionCosine(ratio, 1)).toBeGreaterThan(0);
      }),
    );
    expect(uncollidedFractionCosine(0, 1)).toBe(1);
  });
});

/**
 * Momentum-transfer cross-section of the universal potential by integrating classical orbits [m2]; energy in eV.
 * Ziegler, Biersack & Littmark 1985: V = Z1 Z2 e²/r Σ c_i e^(-d_i r/a).
 */
function universalCrossSection(energy: number, z1: number, z2: number): number {
  const screening = 0.46854 / (z1 ** 0.23 + z2 ** 0.23);
  const reduced = (screening * energy) / (z1 * z2 * 14.4);
  let largest = 1;
  while (screen(largest) / (largest * reduced) > 1e-4) largest *= 1.1;
  const parts = 600;
  let sum = 0;
  for (let i = 0; i < parts; i++) {
    const impact = ((i + 0.5) / parts) * largest;
    sum += (1 - Math.cos(deflection(impact, reduced))) * impact * (largest / parts);
  }
  return 2 * Math.PI * (screening * 1e-10) ** 2 * sum;
}

const SCREEN: readonly [number, number][] = [
  [0.18175, 3.1998],
  [0.50986, 0.94229],
  [0.28022, 0.4029],
  [0.028171, 0.20162],
];

function screen(x: number): number {
  let sum = 0;
  for (const [share, decay] of SCREEN) sum += share * Math.exp(-decay * x);
  return sum;
}

/** Deflection in the centre-of-mass frame; x = x0/(1 - u²) takes the root out of the integrand at the turning point. */
function deflection(impact: number, reduced: number): number {
  const radial = (x: number) => 1 - screen(x) / (x * reduced) - (impact / x) ** 2;
  let low = 1e-9;
  let high = Math.max(impact, 1e-3);
  while (radial(high) < 0) high *= 1.5;
  for (let i = 0; i < 100; i++) {
    const middle = (low + high) / 2;
    if (radial(middle) < 0) low = middle;
    else high = middle;
  }
  const parts = 400;
  let sum = 0;
  for (let i = 0; i < parts; i++) {
    const u = (i + 0.5) / parts;
    sum += (2 * u) / (high * parts * Math.sqrt(radial(high / (1 - u * u))));
  }
  return Math.PI - 2 * impact * sum;
}

test('atomic masses in kilograms serve as well as molar masses, since only ratios enter the kinematics', () => {
  expect(energyDecrement(63.546 * ATOMIC_MASS, 39.948 * ATOMIC_MASS)).toBeCloseTo(
    energyDecrement(0.063546, 0.039948),
    12,
  );
});
