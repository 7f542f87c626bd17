import { describe, expect, test } from 'vitest';
import { airViscosity, gasNamed, statedAccuracy, viscosityOf } from './built-in-gases.ts';
import { median, percentile, rootMeanSquare } from './deviations.ts';
import { csvOf, table } from './rows.ts';

/** Largest deviation from recommended and measured values, 200 to 1000 K, and where it comes from. */
const ALLOWED: Readonly<Record<string, { within: number; because: string }>> = {
  He: { within: 0.047, because: 'quantum gas, and the 12-6 wall is too hard: 4.5 % low at 1000 K' },
  Ar: {
    within: 0.025,
    because: 'a pair fitted to high temperatures; the single point at 293 K lies 1 % below the correlation',
  },
  H2: { within: 0.051, because: 'quantum gas, and the 12-6 wall is too hard: 5 % low at 1000 K' },
  N2: { within: 0.015, because: 'first-order theory, 1.4 % high at 200 K' },
  O2: { within: 0.025, because: '12-6 wall too hard: 2.4 % low at 1000 K' },
  Cl2: { within: 0.022, because: 'pair from older viscosities, 2 % low near room temperature' },
  HBr: { within: 0.015, because: 'polar, rises by 2 % over the range' },
  H2O: { within: 0.065, because: 'strongly polar; Stockmayer 4 to 6 % high from 300 to 600 K' },
  CO2: { within: 0.01, because: 'first-order theory' },
  N2O: { within: 0.051, because: 'the well is too deep: high at 200 K, 5 % low at 1000 K' },
  NH3: { within: 0.027, because: 'polar; Stockmayer within 3 %' },
  SF6: { within: 0.022, because: 'globular: 2 % low at 250 K, else within 0.5 %' },
  CF4: { within: 0.016, because: 'globular, 1 to 1.5 % low' },
  CHF3: { within: 0.038, because: 'polar; the values at 300 and 400 K and those above come from two sources' },
  SiH4: { within: 0.05, because: 'the recommended polynomial runs straight to 600 K, where it is an extrapolation' },
  air: { within: 0.014, because: 'Wilke’s mixture of nitrogen, oxygen and argon' },
};

interface Point {
  readonly gas: string;
  readonly temperature: number;
  readonly deviation: number;
}

const points: readonly Point[] = csvOf('viscosity').map(([gas = '', temperature = '', published = '']) => ({
  gas,
  temperature: Number(temperature),
  deviation: viscosityAt(gas, Number(temperature)) / (Number(published) * 1e-6) - 1,
}));

describe('viscosity of the built-in gases', () => {
  test('88 published values of 16 gases are held against it', () => {
    expect(points.length).toBe(88);
    expect([...new Set(points.map(({ gas }) => gas))].sort()).toEqual(Object.keys(ALLOWED).sort());
  });

  test.each(Object.entries(ALLOWED))('%s keeps the deviation that the theory has for it', (gas, { within }) => {
    const largest = Math.max(...deviationsOf(gas).map(Math.abs));
    expect(largest).toBeLessThanOrEqual(within);
    // A limit far above what is found would hide that the data got worse.
    expect(largest).toBeGreaterThan(within / 2);
  });

  test.each(Object.keys(ALLOWED).filter((gas) => gas !== 'air'))(
    '%s states an accuracy that covers its deviations',
    (gas) => {
      const above = points.filter((point) => point.gas === gas && point.temperature > 290);
      const found = rootMeanSquare(above.map(({ deviation }) => deviation));
      expect(found).toBeLessThanOrEqual(1.1 * statedAccuracy(gas, 'viscosity'));
    },
  );

  test('from 293 to 600 K half of the values lie within 1 %, nine of ten within 3.5 %', () => {
    const usual = points
      .filter(({ temperature }) => temperature > 290 && temperature < 610)
      .map(({ deviation }) => Math.abs(deviation));
    expect(median(usual)).toBeLessThan(0.011);
    expect(percentile(usual, 0.9)).toBeLessThan(0.035);
  });
});

describe('against further tables', () => {
  const crc = table('viscosity');
  const crcWithin: Readonly<Record<string, number>> = {
    air: 0.015,
    Ar: 0.021,
    BF3: 0.011,
    HCl: 0.007,
    SF6: 0.006,
    H2: 0.025,
  };

  test.each(Object.entries(crc.values))('%s agrees with the CRC Handbook from 200 to 600 K', (gas, row) => {
    for (const [index, published] of row.entries()) {
      const temperature = 100 * (index + 1);
      // Boron trifluoride at 200 K stands at a reduced temperature of 1.07, where its table value is 7 % above the theory.
      if (published === null || temperature < (gas === 'BF3' ? 300 : 200)) continue;
      const deviation = viscosityAt(gas, temperature) / (published * 1e-6) - 1;
      expect(Math.abs(deviation), `${gas} at ${temperature} K`).toBeLessThanOrEqual(crcWithin[gas] ?? 0);
    }
  });

  test.each(Object.entries(table('variable-hard-sphere').values))(
    '%s agrees with Bird at 273 K',
    (gas, [published]) => {
      expect(Math.abs(viscosityAt(gas, 273) / (published ?? NaN) - 1)).toBeLessThan(0.022);
    },
  );

  /** Sutherland's formula is a fit of its own: 2 % for air and argon, 4 % for hydrogen and krypton, 9 % for SF6 and ammonia far from T0. */
  const sutherlandWithin: Readonly<Record<string, number>> = { SF6: 0.09, NH3: 0.08, Kr: 0.045 };

  test.each(Object.entries(table('sutherland').values))('%s agrees with Sutherland’s formula', (gas, row) => {
    const [viscosity = null, reference = null, constant = null] = row;
    if (viscosity === null || reference === null || constant === null) throw new Error('an empty field');
    for (const temperature of [300, 600]) {
      const formula =
        (viscosity * (temperature / reference) ** 1.5 * (reference + constant)) / (temperature + constant);
      const deviation = viscosityAt(gas, temperature) / formula - 1;
      expect(Math.abs(deviation), `${gas} at ${temperature} K`).toBeLessThan(sutherlandWithin[gas] ?? 0.027);
    }
  });
});

function viscosityAt(gas: string, temperature: number): number {
  return gas === 'air' ? airViscosity(temperature) : viscosityOf(gasNamed(gas), temperature);
}

function deviationsOf(gas: string): readonly number[] {
  return points.filter((point) => point.gas === gas).map(({ deviation }) => deviation);
}
