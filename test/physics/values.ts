import fc from 'fast-check';

/* Values over which the laws are tried. */

export const between = (min: number, max: number): fc.Arbitrary<number> => fc.double({ min, max, noNaN: true });
/** Evenly spread over decades. */
export const decades = (from: number, to: number): fc.Arbitrary<number> =>
  between(from, to).map((exponent) => 10 ** exponent);

export const pressure = decades(-4, 5);
export const temperature = between(200, 1500);
export const molarMass = between(0.002, 0.4);
export const diameter = between(2e-10, 7e-10);
