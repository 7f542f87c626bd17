import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  dispersion,
  flowRate,
  PLUG_ABOVE_PECLET,
  plugRemainder,
  pumpingSpeed,
  rayleigh,
  RAYLEIGH_CONTRAST,
  RAYLEIGH_ONSET,
  residenceTime,
  STIRRED_BELOW_PECLET,
  turnovers,
} from '../../src/physics/flow.ts';
import { massDensity } from '../../src/physics/state.ts';
import { between, decades, pressure, temperature } from './values.ts';

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

  test('after three turnovers plug flow has cleared a tube better than stirring would, the more so the larger its Péclet number', () => {
    const stirred = Math.exp(-3);
    expect(plugRemainder(3, PLUG_ABOVE_PECLET)).toBeLessThan(stirred / 2);
    expect(plugRemainder(3, STIRRED_BELOW_PECLET)).toBeGreaterThan(stirred);
    expect(plugRemainder(3, 100)).toBeLessThan(plugRemainder(3, PLUG_ABOVE_PECLET));
  });

  test('a layer of nitrogen over a hot plate turns over at 1 atm and rests at 10 Torr', () => {
    const [cold, hot, gap] = [600, 700, 0.05];
    const film = (cold + hot) / 2;
    const at = (p: number) => rayleigh(hot - cold, gap, massDensity(p, 0.028014, film), 1087, film, 3.11e-5, 0.0475);
    expect((hot - cold) / film).toBeLessThan(RAYLEIGH_CONTRAST);
    expect(at(101325)).toBeGreaterThan(RAYLEIGH_ONSET);
    expect(at(1333)).toBeLessThan(RAYLEIGH_ONSET);
  });

  test('dispersion of resting gas is diffusion', () => {
    expect(dispersion(0.02, 0, 0.3)).toBe(0.02);
    expect(dispersion(0.02, 1, 0.3)).toBeGreaterThan(0.02);
  });
});
