import { describe, expect, test } from 'vitest';
import { energyDecrement, uncollidedFractionCosine } from '../../src/physics/sputtered-atoms.ts';
import { flyerOf, type Measured } from './flyers.ts';
import { arrivals, scattered, seeded, type Arrival, type Flyer, type Leaving } from './sputter-flights.ts';

/* What the bounds of the sputter processes say of the atoms that arrive, by following atoms on their way. */

/** Masses of 0.7 to 2.7 times argon's. */
const IN_ARGON = ['Al', 'Ti', 'Cu', 'Ag'].map((atom) => ({ name: `${atom} in Ar`, flyer: flyerOf(atom, 'Ar') }));
/** Masses of 4.6, 9.1 and 15.9 times the gas atom's. */
const HEAVY = [
  ['W', 'Ar'],
  ['W', 'Ne'],
  ['Cu', 'He'],
].map(([atom = '', gas = '']) => ({ name: `${atom} in ${gas}`, flyer: flyerOf(atom, gas) }));

describe('the flights', () => {
  const plain: Flyer = {
    atomMass: 1,
    gasMass: 1,
    startEnergy: 1,
    thermalEnergy: 0,
    pathAt: () => 1,
    thermalStep: 1,
  };

  test('without a collision are as many as the law of a cosine distribution has', () => {
    const straight = share(arrivalsIn(plain, 1, 20000), ({ collisions }) => collisions === 0, 20000);
    expect(Math.abs(straight - uncollidedFractionCosine(1, 1))).toBeLessThan(0.01);
  });

  test.each([0.7, 1, 4.6, 15.9])(
    'lose as much of ln E in a collision as the decrement says, at mass ratio %d',
    (ratio) => {
      const random = seeded(3);
      const masses = { atomMass: ratio, gasMass: 1 };
      let loss = 0;
      for (let i = 0; i < 20000; i++) {
        const [x, y, z] = scattered(masses, [0, 0, 1], random);
        loss -= Math.log(x * x + y * y + z * z) / 20000;
      }
      expect(Math.abs(loss / energyDecrement(ratio, 1) - 1)).toBeLessThan(0.03);
    },
  );

  // Heat between black plates across a grey gas is the same sum over isotropic walks: Heaslet & Warming, Int. J. Heat Mass Transfer 8,
  // 979 (1965) (values from memory), for plates 1 and 3 paths apart. Thermal from the first collision on.
  test.each([
    [1, 0.5532],
    [3, 0.3016],
  ])('of thermal atoms end on the other plate, %d paths away, as often as published: %d', (apart, expected) => {
    const arrived = arrivalsIn({ ...plain, thermalEnergy: 2 }, apart, 20000).length / 20000;
    expect(Math.abs(arrived - expected)).toBeLessThan(0.012);
  });
});

describe('sputter-line-of-sight: atoms that arrive within 20 degrees of the line on which they left', () => {
  const onLine = ({ flyer }: { flyer: Measured }, slowingKnudsen: number, leaving: Leaving) =>
    share(arrivalsIn(flyer, flyer.slowingDistance / slowingKnudsen, 6000, leaving), ({ kept }) => kept >= COS_20);

  test.each(IN_ARGON)(
    '$name are half at slowing-knudsen 1 and a fifth at 0.3, if they leave along the normal',
    (it) => {
      expectNear(onLine(it, 1, 'along the normal'), 1 / 2);
      expectNear(onLine(it, 0.3, 'along the normal'), 1 / 5);
    },
  );

  test.each(IN_ARGON)('$name are three eighths at 1 and an eighth at 0.3, with a cosine distribution', (it) => {
    expectNear(onLine(it, 1, 'with a cosine distribution'), 3 / 8);
    expectNear(onLine(it, 0.3, 'with a cosine distribution'), 1 / 8);
  });

  test.each(HEAVY)('$name, heavier, are more than half at 1 and hardly more than others at 0.3', (it) => {
    expect(onLine(it, 1, 'with a cosine distribution')).toBeGreaterThan(1 / 2);
    expect(onLine(it, 0.3, 'with a cosine distribution')).toBeGreaterThan(0.1);
    expect(onLine(it, 0.3, 'with a cosine distribution')).toBeLessThan(0.2);
  });
});

describe('sputter and sputter-thermalised: atoms that arrive thermal', () => {
  const all = [...IN_ARGON, ...HEAVY];
  const thermal = (ratio: number) =>
    all.map(({ flyer }) => share(arrivalsIn(flyer, ratio * flyer.thermalisationDistance, 4000), (it) => it.thermal));

  test('are a fifth to a third at thermalisation-ratio 0.5', () => {
    expectSpan(thermal(0.5), 1 / 5, 1 / 3);
  });

  test('are two thirds to five sixths at 1', () => {
    expectSpan(thermal(1), 2 / 3, 5 / 6);
  });

  test('are nine tenths to all at 1.5', () => {
    expectSpan(thermal(1.5), 9 / 10, 1);
  });

  test('are nearly all at 3', () => {
    expect(Math.min(...thermal(3))).toBeGreaterThan(0.98);
  });
});

const COS_20 = Math.cos(Math.PI / 9);

function arrivalsIn(
  flyer: Flyer,
  throwDistance: number,
  atoms: number,
  leaving: Leaving = 'with a cosine distribution',
): readonly Arrival[] {
  return arrivals(flyer, throwDistance, atoms, leaving, seeded(20));
}

/** Share of the arriving atoms, or of so many. */
function share(of: readonly Arrival[], counts: (arrival: Arrival) => boolean, among = of.length): number {
  return of.filter(counts).length / among;
}

/** A share told in words is good within 15 % of itself. */
function expectNear(found: number, told: number): void {
  expect(Math.abs(found / told - 1)).toBeLessThan(0.15);
}

/** The shares reach from one end told to the other: 0.03 for the rounding in words and the chance in some thousand atoms. */
function expectSpan(found: readonly number[], least: number, most: number): void {
  expect(Math.abs(Math.min(...found) - least)).toBeLessThan(0.03);
  expect(Math.abs(Math.max(...found) - most)).toBeLessThan(0.03);
}
