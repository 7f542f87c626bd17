import { describe, expect, test } from 'vitest';
import { CHAMBER, keys, stepOf } from './samples.ts';

/* How gas is replaced in a tube: values of the stirred tank and of plug flow by hand. */

const TUBE = CHAMBER.replace(
  'body: { diameter: 460 mm, height: 300 mm, flow: mixed }',
  'body: { diameter: 250 mm, length: 1.8 m, flow: axial }',
);

/** Diffusion and flow both go as 1/p: it is the flow that decides. */
const step = (flow: number, time: string, chamber = TUBE) =>
  stepOf(
    keys({
      process: 'soak',
      time,
      pressure: '300 mTorr',
      flows: `{ N2: ${flow} sccm, Ar: ${flow / 10} sccm }`,
      temperatures: '{ wall: 600 degC }',
      wafer: '{ diameter: 200 mm, count: 50 }',
    }),
    chamber,
  );

const read = (run: ReturnType<typeof stepOf>, id: string, of?: string): number => {
  const reading = run.read(of === undefined ? { id } : { id, of });
  if (reading.kind !== 'known') throw new Error(`${id} is ${JSON.stringify(reading)}`);
  return reading.value;
};

describe('a tube that gas passes from end to end', () => {
  test('with little flow is stirred by diffusion: exp(-t/τ) remains', () => {
    const run = step(20, '1 s');
    expect(read(run, 'axial-peclet', 'Ar')).toBeLessThan(2);
    expect(read(run, 'remaining-fraction', 'Ar')).toBeCloseTo(Math.exp(-read(run, 'turnovers')), 10);
  });

  test('with much flow is passed as a plug: half remains after one turnover, less than stirred after three', () => {
    const residence = read(step(400, '1 s'), 'residence-time');
    const after = (turnovers: number) => step(400, `${(turnovers * residence).toFixed(6)} s`);
    expect(read(after(1), 'axial-peclet', 'Ar')).toBeGreaterThan(10);
    expect(read(after(1), 'remaining-fraction', 'Ar')).toBeCloseTo(0.5, 4);
    expect(read(after(3), 'remaining-fraction', 'Ar')).toBeLessThan(Math.exp(-3));
  });

  test('between both pictures says that neither holds', () => {
    const run = step(100, '5 s');
    expect(read(run, 'axial-peclet', 'Ar')).toBeGreaterThan(2);
    expect(read(run, 'axial-peclet', 'Ar')).toBeLessThan(10);
    expect(run.remarks({ id: 'remaining-fraction', of: 'Ar' }).join()).toContain('neither stirred nor passed');
  });
});

test('a mixed chamber is stirred, and has no axial numbers', () => {
  const run = step(100, '1 s', CHAMBER);
  expect(read(run, 'remaining-fraction')).toBeCloseTo(Math.exp(-read(run, 'turnovers')), 10);
  expect(run.read({ id: 'axial-peclet', of: 'Ar' }).kind).toBe('inapplicable');
});
