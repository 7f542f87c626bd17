import { describe, expect, test } from 'vitest';
import { casesOf } from '../../src/verdicts/cases.ts';
import { judged, step, verdict, verdicts } from './trial.ts';

const MTORR = 0.1333224;
const FILM = 'surface: { grows: Ti, rate: 120 nm/min }';

function sputter(pressure: string, { time = '90 s', target = 'ti: { voltage: 600 V }' } = {}): string {
  return step(
    'sputter',
    `time: ${time}, pressure: ${pressure}, flows: { Ar: 200 sccm }, targets: { ${target} }, ${FILM}`,
  );
}

describe('a ramp', () => {
  test('is judged at both ends and at eight instants between', () => {
    const run = judged(sputter('{ from: 2 mTorr, to: 20 mTorr }')).steps[0]?.run;
    const pressures =
      run === undefined ? [] : casesOf(run).map((one) => (one.run.given('pressure')?.value ?? NaN) / MTORR);
    expect(pressures.map((one) => Math.round(one * 10) / 10)).toEqual([2, 4, 6, 8, 10, 12, 14, 16, 18, 20]);
  });

  test('counts at its worst instant, with its time: at the end, or at the start', () => {
    const up = verdict('sputter/energetic-arrival', sputter('{ from: 5 mTorr, to: 80 mTorr }'));
    expect(up).toMatchObject({
      kind: 'fail',
      level: 'error',
      instance: { kind: 'ramp', fraction: 1, time: 90, over: 'step' },
    });
    const down = verdict('sputter/energetic-arrival', sputter('{ from: 80 mTorr, to: 5 mTorr }'));
    expect(down).toMatchObject({ kind: 'fail', instance: { fraction: 0, time: 0 } });
    expect(down.value).toBeCloseTo(up.value ?? NaN, 9);
  });

  test('may be worst in between, where two setpoints move', () => {
    // Ar rises while the pressure rises: the speed needed goes as F/p, here with its largest value at the start only.
    const both = step(
      'soak',
      'time: 90 s, pressure: { from: 1 mTorr, to: 10 mTorr }, flows: { Ar: { from: 50 sccm, to: 450 sccm } }',
    );
    const run = judged(both).steps[0]?.run;
    expect(
      run === undefined
        ? []
        : casesOf(run).map(({ instance }) => (instance?.kind === 'ramp' ? instance.fraction : NaN)),
    ).toEqual(Array.from({ length: 10 }, (_, index) => index / 9));
    expect(verdict('chamber-fit/reach-low', both).instance).toMatchObject({ fraction: 0 });
  });

  test('has at each instant the uncertainty of a step that stands still there', () => {
    const moving = verdict('sputter/clean-film', sputter('{ from: 5 mTorr, to: 50 mTorr }'));
    const still = verdict('sputter/clean-film', sputter('50 mTorr'));
    expect(moving.value).toBeCloseTo(still.value ?? NaN, 9);
    expect(still.uncertainty).toBeGreaterThan(0);
    expect((moving.uncertainty ?? NaN) / (still.uncertainty ?? NaN)).toBeCloseTo(1, 5);
  });

  test('leaves what it does not reach without an instant', () => {
    const one = verdict('chamber-fit/line-range', sputter('{ from: 5 mTorr, to: 50 mTorr }'));
    expect(one.kind).toBe('pass');
    expect(one.instance).toBeUndefined();
  });

  test('over laps bounds the step at its first and its last lap', () => {
    const laps =
      '  - name: loop\n    repeat: 5\n    steps:\n    ' + sputter('{ from: 5 mTorr, to: 80 mTorr, over: laps }');
    expect(verdict('sputter/energetic-arrival', laps)).toMatchObject({
      kind: 'fail',
      instance: { kind: 'ramp', fraction: 1, over: 'laps' },
    });
  });
});

describe('a range', () => {
  test('is judged at three values: usual and both limits', () => {
    const run = judged(sputter('{ usually: 5 mTorr, at_least: 2 mTorr, at_most: 80 mTorr }')).steps[0]?.run;
    const cases = run === undefined ? [] : casesOf(run);
    expect(cases.map((one) => Math.round((one.run.given('pressure')?.value ?? NaN) / MTORR))).toEqual([5, 2, 80]);
    expect(cases.map(({ instance }) => (instance?.kind === 'range' ? instance.limit : undefined))).toEqual([
      undefined,
      'at_least',
      'at_most',
    ]);
  });

  test('counts at its worst limit', () => {
    expect(
      verdict('sputter/energetic-arrival', sputter('{ usually: 5 mTorr, at_least: 2 mTorr, at_most: 80 mTorr }')),
    ).toMatchObject({
      kind: 'fail',
      instance: { kind: 'range', address: 'pressure', limit: 'at_most' },
    });
  });

  test('of the time shortens a purge', () => {
    const purge = step(
      'purge',
      'time: { usually: 60 s, at_least: 2 s, at_most: 90 s }, pressure: 1 Torr, flows: { N2: 300 sccm }',
    );
    expect(verdict('purge/cleared', purge)).toMatchObject({
      kind: 'fail',
      instance: { address: 'time', limit: 'at_least' },
    });
  });

  test('that stays on the good side passes at its usual value or a limit', () => {
    const one = verdict(
      'sputter/energetic-arrival',
      sputter('{ usually: 5 mTorr, at_least: 4 mTorr, at_most: 6 mTorr }'),
    );
    expect(one.kind).toBe('pass');
    expect(one.instance).toMatchObject({ limit: 'at_most' });
  });
});

describe('an alloy target', () => {
  const alloy = { target: 'wti: { voltage: 600 V }' };

  test('is judged atom by atom, the worst counts by name', () => {
    expect(verdict('sputter/energetic-arrival', sputter('60 mTorr', alloy))).toMatchObject({
      kind: 'fail',
      subject: 'Ti',
    });
    const line = sputter('5 mTorr', alloy).replace('process: sputter', 'process: sputter-line-of-sight');
    expect(verdict('sputter-line-of-sight/free-throw', line)).toMatchObject({ subject: 'Ti' });
    const slow = sputter('60 mTorr', alloy).replace('process: sputter', 'process: sputter-thermalised');
    expect(verdict('sputter-thermalised/slow-arrival', slow)).toMatchObject({ subject: 'W' });
  });

  test('has over its throw the path of the atom that flies shortest', () => {
    const run = judged(sputter('5 mTorr', alloy)).steps[0]?.run;
    const kn = (of?: string) => {
      const reading = run?.read({ id: 'knudsen', length: 'throw', ...(of === undefined ? {} : { of }) });
      return reading?.kind === 'known' ? reading.value : NaN;
    };
    expect(kn()).toBe(Math.min(kn('target/W'), kn('target/Ti')));
    expect(kn('target')).toBe(kn());
    expect(kn('target/W')).not.toBe(kn('target/Ti'));
  });

  test('is no better than a target of its worst atom', () => {
    const one = verdict('sputter/energetic-arrival', sputter('60 mTorr', alloy));
    const titanium = verdict('sputter/energetic-arrival', sputter('60 mTorr'));
    expect(one.value).toBeCloseTo(titanium.value ?? NaN, 9);
  });
});

test('the worst of several lines is named', () => {
  const all = verdicts(
    step('soak', 'time: 1 s, pressure: 10 mTorr, flows: { Ar: 100 sccm, N2: 5 sccm, O2: 300 sccm }'),
  );
  expect(all.get('chamber-fit/line-range')).toMatchObject({ kind: 'fail', level: 'error', subject: 'N2' });
});
