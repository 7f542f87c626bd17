import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { meanFreePath, mixtureMeanFreePath } from '../../src/physics/collisions.ts';
import { mixtureMolarMass } from '../../src/physics/state.ts';
import { diffusivityInMixture, mixtureThermalConductivity, mixtureViscosity } from '../../src/physics/transport.ts';
import { between } from './values.ts';

interface Gas {
  readonly share: number;
  readonly molarMass: number;
  readonly diameter: number;
  readonly viscosity: number;
  readonly conductivity: number;
  readonly speed: number;
}

const gas: fc.Arbitrary<Gas> = fc.record({
  share: between(0.01, 1),
  molarMass: between(0.002, 0.4),
  diameter: between(2e-10, 7e-10),
  viscosity: between(5e-6, 6e-5),
  conductivity: between(0.005, 0.3),
  speed: between(100, 2500),
});
const gases = fc.array(gas, { minLength: 1, maxLength: 6 });

/** Every number that the mixture laws give for these gases. */
function numbersOf(mixture: readonly Gas[]) {
  const total = mixture.reduce((sum, { share }) => sum + share, 0);
  const fractions = mixture.map(({ share }) => share / total);
  const molarMasses = mixture.map(({ molarMass }) => molarMass);
  const viscosities = mixture.map(({ viscosity }) => viscosity);
  const densities = fractions.map((fraction) => fraction * 1e20);
  const paths = mixture.map((one) =>
    meanFreePath(
      one.molarMass,
      densities,
      mixture.map((other) => (one.diameter + other.diameter) / 2),
      molarMasses,
    ),
  );
  return {
    molarMass: mixtureMolarMass(fractions, molarMasses),
    viscosity: mixtureViscosity(fractions, viscosities, molarMasses),
    conductivity: mixtureThermalConductivity(
      fractions,
      mixture.map(({ conductivity }) => conductivity),
      viscosities,
      molarMasses,
    ),
    path: mixtureMeanFreePath(
      fractions,
      mixture.map(({ speed }) => speed),
      paths,
    ),
    diffusivity: diffusivityInMixture(
      0,
      fractions,
      mixture.map(({ conductivity }) => conductivity),
    ),
  };
}

function expectSame(actual: ReturnType<typeof numbersOf>, expected: ReturnType<typeof numbersOf>) {
  expect(actual.molarMass / expected.molarMass).toBeCloseTo(1, 10);
  expect(actual.viscosity / expected.viscosity).toBeCloseTo(1, 10);
  expect(actual.conductivity / expected.conductivity).toBeCloseTo(1, 10);
  expect(actual.path / expected.path).toBeCloseTo(1, 10);
  expect(actual.diffusivity / expected.diffusivity).toBeCloseTo(1, 10);
}

describe('mixture laws', () => {
  test('a mixture of one gas is that gas', () => {
    fc.assert(
      fc.property(gas, (one) => {
        const { molarMass, viscosity, conductivity, path, diffusivity } = numbersOf([one]);
        expect(molarMass).toBeCloseTo(one.molarMass, 12);
        expect(viscosity / one.viscosity).toBeCloseTo(1, 12);
        expect(conductivity / one.conductivity).toBeCloseTo(1, 12);
        expect(diffusivity / one.conductivity).toBeCloseTo(1, 12);
        expect(path * Math.SQRT2 * Math.PI * one.diameter ** 2 * 1e20).toBeCloseTo(1, 12);
      }),
    );
  });

  test('a gas named twice with parts of its share is the gas named once', () => {
    fc.assert(
      fc.property(gases, between(0.05, 0.95), ([first, ...rest], part) => {
        if (first === undefined) return;
        const split = [
          { ...first, share: first.share * part },
          { ...first, share: first.share * (1 - part) },
        ];
        expectSame(numbersOf([...split, ...rest]), numbersOf([first, ...rest]));
      }),
    );
  });

  test('the order of the gases does not matter', () => {
    fc.assert(
      fc.property(gases, (mixture) => {
        expectSame(numbersOf([...mixture].reverse()), numbersOf(mixture));
      }),
    );
  });

  test('the molar mass of a mixture lies between those of its gases', () => {
    fc.assert(
      fc.property(gases, (mixture) => {
        const masses = mixture.map((one) => one.molarMass);
        expect(numbersOf(mixture).molarMass).toBeGreaterThanOrEqual(Math.min(...masses) * (1 - 1e-12));
        expect(numbersOf(mixture).molarMass).toBeLessThanOrEqual(Math.max(...masses) * (1 + 1e-12));
      }),
    );
  });

  test('a gas that is not there changes nothing', () => {
    const one = { share: 1, molarMass: 0.04, diameter: 3.6e-10, viscosity: 2e-5, conductivity: 0.02, speed: 400 };
    const absent = { share: 0, molarMass: 0.004, diameter: 2e-10, viscosity: 1e-5, conductivity: 0.2, speed: 1300 };
    expectSame(numbersOf([one, absent]), numbersOf([one]));
  });

  test('lists of different length have no value', () => {
    expect(mixtureViscosity([0.5, 0.5], [1e-5], [0.04, 0.02])).toBeNaN();
    expect(meanFreePath(0.04, [1e20, 1e20], [3e-10], [0.04, 0.02])).toBeNaN();
    expect(diffusivityInMixture(1, [], [])).toBeNaN();
  });
});
