import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { maxwellPath } from '../../src/physics/collisions.ts';
import {
  apertureConductance,
  chokedConductancePerArea,
  criticalPressureRatio,
  knudsenTubeConductance,
  longTubeConductance,
  plenumPressure,
  seriesConductance,
} from '../../src/physics/conductance.ts';
import { BOLTZMANN } from '../../src/physics/constants.ts';
import { meanSpeed } from '../../src/physics/state.ts';
import { between, decades } from './values.ts';

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
