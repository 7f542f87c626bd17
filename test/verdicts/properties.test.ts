import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { allQuantities } from '../../src/quantities/catalogue.ts';
import { referenceName } from '../../src/quantities/reference.ts';
import type { StepRun } from '../../src/quantities/run.ts';
import { judge } from '../../src/verdicts/judge.ts';
import type { Verdict } from '../../src/verdicts/verdict.ts';
import { judged, PLOVER, step, tried } from './trial.ts';

const CHAMBER = `${PLOVER}gauges: { process: { full_scale: 10 Torr, accuracy: 0.25 % of reading, usable_from: 0.01 % } }
limits: { pressure: { at_least: 1 mTorr, at_most: 5 Torr } }
electrode: { diameter: 260 mm }
inlets: { plate: { holes: 640, diameter: 0.5 mm, thickness: 6 mm } }
`;

const magnitude = (low: number, high: number) =>
  fc
    .double({ min: Math.log10(low), max: Math.log10(high), noNaN: true })
    .map((power) => Number((10 ** power).toPrecision(4)));

/** A value, its ramp, its range, or that nobody knows it. */
const setpoint = (unit: string, low: number, high: number) =>
  fc.oneof(
    { weight: 5, arbitrary: magnitude(low, high).map((value) => `${value} ${unit}`) },
    { weight: 1, arbitrary: magnitude(low, high).map((value) => `${value} ${unit} +/- 5 %`) },
    {
      weight: 1,
      arbitrary: fc
        .tuple(magnitude(low, high), magnitude(low, high))
        .map(([from, to]) => `{ from: ${from} ${unit}, to: ${to} ${unit} }`),
    },
    {
      weight: 1,
      arbitrary: magnitude(low, high).map(
        (value) => `{ usually: ${value} ${unit}, at_least: ${value / 2} ${unit}, at_most: ${value * 2} ${unit} }`,
      ),
    },
    { weight: 1, arbitrary: fc.constant('unknown') },
  );

const FLOWS = fc
  .uniqueArray(fc.constantFrom('Ar', 'N2', 'O2', 'H2', 'SiH4'), { maxLength: 5 })
  .chain((lines) =>
    fc.tuple(
      ...lines.map((line) =>
        fc
          .oneof({ weight: 8, arbitrary: setpoint('sccm', 0.01, 500) }, { weight: 1, arbitrary: fc.constant('0 sccm') })
          .map((flow) => `${line}: ${flow}`),
      ),
    ),
  )
  .map((flows) => `flows: { ${flows.join(', ')} }`);

const KEYS = fc
  .tuple(
    fc.option(
      setpoint('s', 0.01, 1e4).map((time) => `time: ${time}`),
      { nil: '' },
    ),
    fc.oneof(
      { weight: 5, arbitrary: setpoint('Torr', 1e-9, 760).map((pressure) => `pressure: ${pressure}`) },
      { weight: 1, arbitrary: fc.constantFrom('throttle: open', 'throttle: closed', '') },
    ),
    FLOWS,
    fc.option(
      setpoint('K', 200, 1500).map((kelvin) => `temperatures: { wafer: ${kelvin} }`),
      { nil: '' },
    ),
    fc.constantFrom('', 'power: { magnetron: 2 kW }', 'power: { magnetron: 0 W }'),
    fc.constantFrom(
      '',
      'targets: { ti: { voltage: 400 V } }',
      'targets: { wti: { energy: 6 eV +/- 3 eV } }',
      'targets: { ti: { energy: unknown } }',
    ),
    fc.constantFrom(
      '',
      'surface: { grows: Ti, rate: 40 nm/min }',
      'surface: { etches: SiO2, rate: 200 nm/min, product: SiF4 }',
      'surface: { grows: SiO2 }',
    ),
    fc.constantFrom('', 'wafer: none', 'wafer: unknown', 'wafer: { diameter: 200 mm }'),
    fc.constantFrom('', 'reactant: { gas: O2 }', 'reactant: { gas: SiH4, sticking: 0.1 }'),
  )
  .map((keys) => keys.filter((key) => key !== '').join(', '));

const PROCESS = fc.constantFrom(
  ...['sputter', 'sputter-line-of-sight', 'sputter-thermalised', 'evaporation', 'evaporation-reactive', 'pecvd'],
  ...['pecvd-low-pressure', 'purge', 'settle', 'soak', 'idle'],
);

const STEP = fc.tuple(PROCESS, KEYS).map(([process, keys]) => step(process, keys));

function numbersOf(verdict: Verdict): readonly number[] {
  const { value, uncertainty, margin, limit } = verdict;
  return [value, uncertainty, margin, limit?.value].filter((one) => one !== undefined);
}

describe('whatever a step holds', () => {
  test('judging does not throw, and every verdict is one of the kinds, with finite numbers and its reason', () => {
    fc.assert(
      fc.property(STEP, (text) => {
        const { judgement } = tried(text, { chamber: CHAMBER });
        for (const verdict of judgement.steps[0]?.verdicts ?? []) {
          expect(['pass', 'review', 'fail', 'open', 'notApplicable']).toContain(verdict.kind);
          expect(['error', 'warning', 'note']).toContain(verdict.level);
          for (const number of numbersOf(verdict)) expect(number, verdict.name).toSatisfy(Number.isFinite);
          if (verdict.kind === 'open') expect(verdict.needs?.length, verdict.name).toBeGreaterThan(0);
          else if (verdict.kind === 'notApplicable') expect(verdict.because, verdict.name).toMatch(/./);
          else expect(verdict.value, verdict.name).toBeDefined();
        }
      }),
      { numRuns: 150 },
    );
  });

  test('every number is known and finite, missing with what would supply it, or does not apply with a reason', () => {
    fc.assert(
      fc.property(STEP, (text) => {
        const run = first(tried(text, { chamber: CHAMBER }).judgement.steps);
        const { scope } = run.plan;
        for (const { id, subjects, lengths } of allQuantities()) {
          for (const of of [undefined, ...(subjects?.(scope) ?? [])]) {
            for (const length of [undefined, ...(lengths?.(scope) ?? [])]) {
              const reference = {
                id,
                ...(of === undefined ? {} : { of }),
                ...(length === undefined ? {} : { length }),
              };
              const reading = run.read(reference);
              const name = referenceName(reference);
              if (reading.kind === 'known') {
                expect(reading.value, name).toSatisfy(Number.isFinite);
                expect(run.uncertainty(reference), name).toSatisfy(Number.isFinite);
              } else if (reading.kind === 'missing') expect(reading.needs.length, name).toBeGreaterThan(0);
              else expect(reading.because, name).not.toBe('');
            }
          }
        }
      }),
      { numRuns: 40 },
    );
  });

  test('judging twice says the same', () => {
    fc.assert(
      fc.property(STEP, (text) => {
        const { run, steps } = tried(text, { chamber: CHAMBER }).judgement;
        expect(judge(run, '2026-06-01').steps.map(({ verdicts }) => verdicts)).toEqual(
          steps.map(({ verdicts }) => verdicts),
        );
      }),
      { numRuns: 25 },
    );
  });
});

test('a step is judged among others as it is alone', () => {
  const told = (all: readonly Verdict[] = []) =>
    all.map(({ name, kind, level, value, uncertainty, subject, needs, instance }) => {
      return { name, kind, level, value, uncertainty, subject, needs, instance };
    });
  fc.assert(
    fc.property(fc.array(fc.tuple(PROCESS, KEYS), { minLength: 2, maxLength: 4 }), (steps) => {
      const texts = steps.map(([process, keys], index) => step(process, keys, `step-${index}`));
      const together = tried(texts.join('\n'), { chamber: CHAMBER }).judgement.steps;
      for (const [index, text] of texts.entries()) {
        const [alone] = tried(text, { chamber: CHAMBER }).judgement.steps;
        expect(told(together[index]?.verdicts), text).toEqual(told(alone?.verdicts));
      }
    }),
    { numRuns: 60 },
  );
});

test('a step is judged the same whichever step before it differs in one setpoint', () => {
  fc.assert(
    fc.property(KEYS, magnitude(0.1, 5000), magnitude(0.1, 5000), (keys, one, other) => {
      const rest = keys.replace(/(pressure|throttle): (\{[^}]*\}|[^,]*),? ?/, '');
      const soaks = [one, other].map((pressure, index) =>
        step('sputter', `pressure: ${pressure} mTorr, ${rest}`, `step-${index}`),
      );
      const last = tried(soaks.join('\n'), { chamber: CHAMBER }).judgement.steps[1];
      const alone = tried(soaks[1] ?? '', { chamber: CHAMBER }).judgement.steps[0];
      const numbers = (all: readonly Verdict[] = []) =>
        all.map(({ name, value, uncertainty }) => ({ name, value, uncertainty }));
      expect(numbers(last?.verdicts)).toEqual(numbers(alone?.verdicts));
    }),
    { numRuns: 60 },
  );
});

describe('steps of gas', () => {
  const GASES = fc.uniqueArray(fc.constantFrom('Ar', 'N2', 'O2', 'H2', 'SiH4'), { minLength: 1, maxLength: 5 });
  const soak = (pressure: number, flows: readonly string[]) =>
    first(
      judged(step('soak', `time: 60 s, pressure: ${pressure} mTorr, flows: { ${flows.join(', ')} }`), {
        chamber: CHAMBER,
      }).steps,
    );

  test('have twice the Knudsen number at half the pressure', () => {
    fc.assert(
      fc.property(magnitude(0.1, 1e4), GASES, (pressure, gases) => {
        const flows = gases.map((gas) => `${gas}: 100 sccm`);
        for (const length of ['gap', 'chamber', 'hole']) {
          const [full, half] = [pressure, pressure / 2].map((one) =>
            known(soak(one, flows), { id: 'knudsen', length }),
          );
          expect((half ?? NaN) / (full ?? NaN), length).toBeCloseTo(2, 9);
        }
      }),
      { numRuns: 40 },
    );
  });

  test('do not mind the order in which flows are written', () => {
    const NAMES = [
      'mean-free-path',
      'viscosity',
      'residence-time',
      'molar-mass',
      'pumping-speed',
      'thermal-conductivity',
    ];
    fc.assert(
      fc.property(GASES, fc.array(magnitude(1, 500), { minLength: 5, maxLength: 5 }), (gases, sizes) => {
        const flows = gases.map((gas, index) => `${gas}: ${sizes[index] ?? 1} sccm`);
        const [one, other] = [soak(10, flows), soak(10, flows.toReversed())];
        for (const id of NAMES) expect(known(other, { id }) / known(one, { id }), id).toBeCloseTo(1, 12);
      }),
      { numRuns: 40 },
    );
  });

  test('of one gas in two lines are that gas', () => {
    const two = CHAMBER.replace('  N2:', '  Ar-low: { brings: Ar, full_scale: 50 sccm }\n  N2:');
    const both = judged(step('soak', 'time: 60 s, pressure: 10 mTorr, flows: { Ar: 80 sccm, Ar-low: 20 sccm }'), {
      chamber: two,
    });
    for (const id of ['mean-free-path', 'viscosity', 'residence-time', 'flow-rate']) {
      expect(known(first(both.steps), { id }) / known(soak(10, ['Ar: 100 sccm']), { id }), id).toBeCloseTo(1, 12);
    }
  });
});

function first(steps: readonly { readonly run: StepRun }[]): StepRun {
  const [one] = steps;
  if (one === undefined) throw new Error('no step');
  return one.run;
}

function known(run: StepRun, reference: Parameters<StepRun['read']>[0]): number {
  const reading = run.read(reference);
  if (reading.kind !== 'known') throw new Error(`${referenceName(reference)}: ${JSON.stringify(reading)}`);
  return reading.value;
}
