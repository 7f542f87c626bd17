import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { combine, reducedTemperature, type Molecule } from '../../src/physics/pair.ts';
import { omega11, omega22 } from '../../src/physics/collision-integrals.ts';
import {
  collisionDiameter,
  diffusionCrossSection,
  maxwellPath,
  meanFreePath,
  pathFromViscosity,
} from '../../src/physics/collisions.ts';
import {
  apertureConductance,
  chokedConductancePerArea,
  criticalPressureRatio,
  knudsenTubeConductance,
  longTubeConductance,
  plenumPressure,
  seriesConductance,
} from '../../src/physics/conductance.ts';
import {
  ATOMIC_MASS,
  AVOGADRO,
  BOLTZMANN,
  DEBYE,
  ELECTRON_MASS,
  ELEMENTARY_CHARGE,
  GAS_CONSTANT,
} from '../../src/physics/constants.ts';
import { dispersion, flowRate, plugRemainder, pumpingSpeed, residenceTime, turnovers } from '../../src/physics/flow.ts';
import { transpiration, transpirationLimit } from '../../src/physics/instruments.ts';
import {
  band,
  BANDS,
  collisionsStraight,
  collisionsWalk,
  knudsen,
  type BandConvention,
} from '../../src/physics/regime.ts';
import { meanSpeed, numberDensity } from '../../src/physics/state.ts';
import { effectiveSticking, impingement, surfaceRateFromSticking } from '../../src/physics/surfaces.ts';
import { diffusivity, thermalConductivity, viscosity } from '../../src/physics/transport.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Evenly spread over decades. */
const decades = (from: number, to: number) => between(from, to).map((exponent) => 10 ** exponent);
const pressure = decades(-4, 5);
const temperature = between(200, 1500);
const molarMass = between(0.002, 0.4);
const diameter = between(2e-10, 7e-10);

describe('constants', () => {
  test('they agree with each other', () => {
    expect(GAS_CONSTANT).toBeCloseTo(8.31446261815324, 12);
    expect(ATOMIC_MASS * AVOGADRO).toBeCloseTo(1e-3, 11);
    expect(ATOMIC_MASS / ELECTRON_MASS).toBeCloseTo(1822.8885, 3);
    expect(DEBYE / 3.33564095e-30).toBeCloseTo(1, 8);
    expect((BOLTZMANN * 11604.518) / ELEMENTARY_CHARGE).toBeCloseTo(1, 7);
  });
});

describe('collisions', () => {
  test('the Knudsen number doubles when the pressure halves', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, diameter, (p, t, m, d) => {
        const at = (one: number) => knudsen(meanFreePath(m, [numberDensity(one, t)], [d], [m]), 0.1);
        expect(at(p / 2) / at(p)).toBeCloseTo(2, 10);
      }),
    );
  });

  test('the path from the diameter is the path from the viscosity', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, diameter, (p, t, m, d) => {
        const direct = meanFreePath(m, [numberDensity(p, t)], [d], [m]);
        expect(pathFromViscosity(viscosity(m, t, d), p, m, t) / direct).toBeCloseTo(1, 10);
        expect(maxwellPath(viscosity(m, t, d), p, m, t) / direct).toBeCloseTo((5 * Math.PI) / 16, 10);
      }),
    );
  });

  test('at fixed pressure the path grows faster than the temperature', () => {
    fc.assert(
      fc.property(between(200, 700), between(10, 250), (t, wellDepth) => {
        const at = (one: number) => one / collisionDiameter(3.5e-10, wellDepth, 0, one) ** 2;
        expect(at(2 * t) / at(t)).toBeGreaterThan(2);
        expect(at(2 * t) / at(t)).toBeLessThan(4);
      }),
    );
  });

  test('collision integrals fall with temperature and grow with the dipole', () => {
    fc.assert(
      fc.property(decades(-0.5, 2), between(0, 2), (t, polarity) => {
        for (const omega of [omega11, omega22]) {
          expect(omega(t * 1.05)).toBeLessThan(omega(t));
          expect(omega(t, polarity)).toBeGreaterThanOrEqual(omega(t));
        }
      }),
    );
  });

  test('collision integrals agree with the integrals of the 12-6 potential', () => {
    // Hirschfelder, Curtiss & Bird 1954, Table I-M, as far as remembered: T*, Ω11*, Ω22*
    const table: readonly [number, number, number][] = [
      [1, 1.439, 1.587],
      [2, 1.075, 1.175],
      [10, 0.7424, 0.8242],
      [100, 0.517, 0.5882],
    ];
    for (const [t, first, second] of table) {
      expect(Math.abs(omega11(t) / first - 1)).toBeLessThan(0.005);
      expect(Math.abs(omega22(t) / second - 1)).toBeLessThan(0.005);
    }
  });

  test('there is no collision integral at or below zero', () => {
    expect(omega11(0)).toBeNaN();
    expect(omega22(-1)).toBeNaN();
    expect(diffusionCrossSection(3e-10, 100, 0, -5)).toBeNaN();
  });

  test('a pair of one molecule is that molecule, and both orders are one', () => {
    const molecule = fc.record<Molecule>({
      diameter,
      wellDepth: between(5, 900),
      dipole: between(0, 8e-30),
      polar: fc.boolean(),
    });
    fc.assert(
      fc.property(molecule, molecule, (a, b) => {
        expect(combine(a, b)).toEqual(combine(b, a));
        expect(combine(a, a).diameter).toBeCloseTo(a.diameter, 20);
        expect(combine(a, a).wellDepth / a.wellDepth).toBeCloseTo(1, 12);
        if (!(a.polar && b.polar)) expect(combine(a, b).polarity).toBe(0);
      }),
    );
  });

  test('the reduced dipole of water is that of Stockmayer’s fit', () => {
    // δ = μ²/(2 ε σ³) of Monchick & Mason, J. Chem. Phys. 35, 1676 (1961): 1.0 for 1.85 D, 2.71 Å, 506 K (from memory)
    const water = { diameter: 2.71e-10, wellDepth: 506, dipole: 1.85 * DEBYE, polar: true };
    expect(Math.sqrt(combine(water, water).polarity)).toBeCloseTo(1.2, 0);
    expect(reducedTemperature(506, 506)).toBe(1);
  });
});

describe('transport', () => {
  test('viscosity does not depend on pressure, diffusivity is inverse to it', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, molarMass, (p, t, a, b) => {
        expect(diffusivity(a, b, t, p / 2, 4e-19) / diffusivity(a, b, t, p, 4e-19)).toBeCloseTo(2, 10);
        expect(diffusivity(a, b, t, p, 4e-19)).toBe(diffusivity(b, a, t, p, 4e-19));
      }),
    );
  });

  test('self-diffusion of hard spheres is 6/5 of the kinematic viscosity', () => {
    // Chapman & Cowling 1970: D = (6/5) μ/ρ for Ω11* = Ω22* = 1
    const density = (100 * 0.04) / (GAS_CONSTANT * 300);
    const kinematic = viscosity(0.04, 300, 3.6e-10) / density;
    expect(diffusivity(0.04, 0.04, 300, 100, Math.PI * 3.6e-10 ** 2) / kinematic).toBeCloseTo(1.2, 10);
  });

  test('a monatomic gas conducts 15/4 of R/M times its viscosity', () => {
    expect(thermalConductivity(0.04, 2e-5, 1.5 * GAS_CONSTANT)).toBeCloseTo(
      (15 / 4) * (GAS_CONSTANT / 0.04) * 2e-5,
      12,
    );
    expect(thermalConductivity(0.04, 2e-5, 12.47)).toBeCloseTo((15 / 4) * (GAS_CONSTANT / 0.04) * 2e-5, 5);
  });

  test('no gas has less heat capacity than a monatomic one', () => {
    expect(thermalConductivity(0.04, 2e-5, 8)).toBeNaN();
  });
});

describe('flow', () => {
  test('residence time is the volume over the volume flow inside', () => {
    fc.assert(
      fc.property(pressure, temperature, decades(-4, 0), decades(15, 22), (p, t, v, f) => {
        const inside = pumpingSpeed(f, t, p);
        expect(residenceTime(p, v, t, f) / (v / inside)).toBeCloseTo(1, 10);
        expect(turnovers(3 * residenceTime(p, v, t, f), residenceTime(p, v, t, f))).toBeCloseTo(3, 10);
      }),
    );
  });

  test('a sccm at 20 degC is 7 % fewer molecules than at 0 degC', () => {
    expect(flowRate(1e-6 / 60, 101325, 273.15) / flowRate(1e-6 / 60, 101325, 293.15)).toBeCloseTo(1.0732, 4);
  });

  test('plug flow keeps all at the start, half after one turnover, nothing in the end', () => {
    fc.assert(
      fc.property(between(10, 1000), (peclet) => {
        expect(plugRemainder(0, peclet)).toBe(1);
        expect(plugRemainder(1e-6, peclet)).toBeCloseTo(1, 10);
        expect(plugRemainder(1, peclet)).toBe(0.5);
        expect(plugRemainder(50, peclet)).toBeLessThan(1e-9);
      }),
    );
  });

  test('dispersion of resting gas is diffusion', () => {
    expect(dispersion(0.02, 0, 0.3)).toBe(0.02);
    expect(dispersion(0.02, 1, 0.3)).toBeGreaterThan(0.02);
  });
});

describe('conductance', () => {
  const argon = { molarMass: 0.03995, viscosity: 22.7e-6, ratio: 5 / 3 };

  test('Knudsen’s tube has the molecular limit at no pressure and Poiseuille’s at high pressure', () => {
    const speed = meanSpeed(argon.molarMass, 300);
    const none = knudsenTubeConductance(0.02, 1, 0, 300, argon.molarMass, argon.viscosity);
    expect(none).toBe(longTubeConductance(0.02, 1, speed));
    const dense = knudsenTubeConductance(0.02, 1, 1e5, 300, argon.molarMass, argon.viscosity);
    expect(dense / ((Math.PI * 0.02 ** 4 * 1e5) / (128 * argon.viscosity))).toBeCloseTo(1, 3);
  });

  test('Knudsen’s minimum lies 5 % below the molecular conductance, near x = 0.3', () => {
    const speed = meanSpeed(argon.molarMass, 300);
    const relative = (x: number) => {
      const p = maxwellPath(argon.viscosity, 1, argon.molarMass, 300) / (0.01 / x);
      return (
        knudsenTubeConductance(0.02, 1, p, 300, argon.molarMass, argon.viscosity) / longTubeConductance(0.02, 1, speed)
      );
    };
    expect(relative(0.3225)).toBeLessThan(Math.min(relative(0.2), relative(0.5)));
    expect(relative(0.3225)).toBeCloseTo(0.95, 2);
  });

  test('the pressure before a hole solves its own equation, falls to that of the chamber and is never below the choked one', () => {
    const hole = fc.tuple(decades(12, 21), decades(-2, 4), between(250, 700), decades(-3.7, -2.5), decades(-4, -1.7));
    fc.assert(
      fc.property(hole, ([flow, p, t, d, length]) => {
        const upstream = plenumPressure(flow, p, t, d, length, argon.molarMass, argon.viscosity, argon.ratio);
        const choked =
          (flow * BOLTZMANN * t) /
          (((Math.PI * d ** 2) / 4) * chokedConductancePerArea(t, argon.molarMass, argon.ratio));
        expect(upstream).toBeGreaterThan(p);
        expect(upstream).toBeGreaterThanOrEqual(choked);
        expect(
          plenumPressure(1.1 * flow, p, t, d, length, argon.molarMass, argon.viscosity, argon.ratio),
        ).toBeGreaterThan(upstream);
        expect(plenumPressure(0, p, t, d, length, argon.molarMass, argon.viscosity, argon.ratio)).toBe(p);
      }),
    );
  });

  test('a long hole is Knudsen’s tube', () => {
    const flow = 1e17;
    const upstream = plenumPressure(flow, 10, 300, 0.5e-3, 0.1, argon.molarMass, argon.viscosity, argon.ratio);
    const tube = knudsenTubeConductance(0.5e-3, 0.1, (upstream + 10) / 2, 300, argon.molarMass, argon.viscosity);
    expect((tube * (upstream - 10)) / (flow * BOLTZMANN * 300)).toBeCloseTo(1, 1.8);
  });

  test('without collisions a hole passes what Clausing’s transmission says', () => {
    // Clausing's integral equation, solved numerically: length over diameter, transmission
    const exact: readonly [number, number][] = [
      [0.05, 0.9523989],
      [0.25, 0.8012714],
      [1, 0.5142305],
      [2, 0.3565727],
      [5, 0.1909424],
      [10, 0.1093207],
      [25, 0.0484764],
    ];
    const d = 1e-3;
    const open = apertureConductance((Math.PI * d ** 2) / 4, meanSpeed(argon.molarMass, 300));
    for (const [ratio, transmission] of exact) {
      const flow = 1e9;
      const upstream = plenumPressure(flow, 0, 300, d, ratio * d, argon.molarMass, argon.viscosity, argon.ratio);
      expect(Math.abs((flow * BOLTZMANN * 300) / upstream / open / transmission - 1)).toBeLessThan(0.007);
    }
  });

  test('where collisions rule, a thin hole has Sampson’s resistance', () => {
    // creeping flow through a thin hole: volume flow d³ Δp/(24 μ)
    const d = 1e-3;
    const p = 1e5;
    const flow = 1e15;
    const drop = plenumPressure(flow, p, 300, d, 1e-9, argon.molarMass, argon.viscosity, argon.ratio) - p;
    const sampson = (flow * BOLTZMANN * 300 * 24 * argon.viscosity) / (p * d ** 3);
    expect(drop / sampson).toBeCloseTo(1, 1.6);
  });

  test('parts in a row have less conductance than the smallest', () => {
    expect(seriesConductance([2])).toBe(2);
    expect(seriesConductance([2, 2])).toBe(1);
    expect(seriesConductance([1, Infinity])).toBe(1);
  });

  test('a gas of many degrees of freedom chokes at 0.6 of the pressure, a monatomic one below a half', () => {
    expect(criticalPressureRatio(1.0001)).toBeCloseTo(Math.exp(-0.5), 3);
    expect(criticalPressureRatio(5 / 3)).toBeCloseTo(0.487, 3);
  });
});

describe('regime', () => {
  test.each<BandConvention>(['gas-dynamics', 'vacuum'])(
    'the name of a Knudsen number is that of its band in %s',
    (convention) => {
      fc.assert(
        fc.property(decades(-6, 6), (kn) => {
          const of = BANDS[convention].find(({ from, to }) => kn > from && kn < to);
          if (of !== undefined) expect(band(kn, convention)).toBe(of.name);
        }),
      );
    },
  );

  test('limits belong to the middle', () => {
    expect([0.01, 0.1, 10].map((kn) => band(kn, 'gas-dynamics'))).toEqual(['slip', 'transition', 'transition']);
    expect([0.01, 0.5].map((kn) => band(kn, 'vacuum'))).toEqual(['intermediate', 'intermediate']);
    expect(band(NaN, 'vacuum')).toBeUndefined();
    expect(band(-1, 'gas-dynamics')).toBeUndefined();
  });

  test('a walk over many paths takes more collisions than a straight flight', () => {
    // D = v λ/3 for hard spheres, up to the first-order factor
    const path = 1e-3;
    const speed = 400;
    const walk = collisionsWalk(speed / path, 0.1, (speed * path) / 3);
    expect(walk / collisionsStraight(0.1, path) ** 2).toBeCloseTo(1.5, 10);
  });
});

describe('surfaces and instruments', () => {
  test('the impingement rate is a quarter of density times speed', () => {
    fc.assert(
      fc.property(pressure, temperature, molarMass, (p, t, m) => {
        const quarter = (numberDensity(p, t) * meanSpeed(m, t)) / 4;
        expect(impingement(p, m, t) / quarter).toBeCloseTo(1, 6);
      }),
    );
  });

  test('a small sticking coefficient comes back from its surface rate, a large one up to twice', () => {
    expect(effectiveSticking(surfaceRateFromSticking(1e-5, 600), 600) / 1e-5).toBeCloseTo(1, 4);
    expect(effectiveSticking(surfaceRateFromSticking(1, 600), 600)).toBe(2);
    expect(surfaceRateFromSticking(1.01, 600)).toBeNaN();
  });

  test('thermal transpiration goes from the molecular ratio to one', () => {
    const at = (p: number) => transpiration(p, 0.0046, 318.15, 296.15, 6.076e7, 6060.5, 42.724);
    expect(at(0)).toBeCloseTo(transpirationLimit(318.15, 296.15), 12);
    expect(at(1e4)).toBeCloseTo(1, 4);
  });
});
