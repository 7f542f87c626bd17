import { describe, expect, test } from 'vitest';
import { byName, findings, judged, PLOVER, step, tried, verdict, verdicts } from './trial.ts';

describe('a process of the site', () => {
  const film = (process: string) =>
    step(
      process,
      'time: 60 s, pressure: 20 mTorr, flows: { Ar: 200 sccm }, targets: { ti: { voltage: 500 V } }, surface: { grows: Ti, rate: 400 nm/min }',
    );

  test('takes the place of the built-in one of its name', () => {
    const own = `regimen: process 1
name: sputter
title: Sputter, our bound
assumptions:
  short-throw:
    statement: The throw is short.
    quantity: pressure-distance.throw
    at_most: { error: 1 Pa cm }
    source: own cross-sections
`;
    const all = verdicts(film('sputter'), { files: { 'processes/sputter.yaml': own } });
    expect(all.has('sputter/energetic-arrival')).toBe(false);
    expect(all.get('sputter/short-throw')).toMatchObject({ kind: 'fail', level: 'error' });
  });

  test('based on another keeps the rest and changes single assumptions', () => {
    const own = `regimen: process 1
name: soft-sputter
title: Sputter for soft films
based_on: sputter
assumptions:
  energetic-arrival:
    statement: Atoms arrive with part of their energy, but not with all.
    quantity: thermalisation-ratio:target
    at_least: { warning: 10 }
    source: own films
`;
    const all = verdicts(film('soft-sputter'), { files: { 'processes/soft.yaml': own } });
    expect(all.get('soft-sputter/energetic-arrival')).toMatchObject({
      kind: 'fail',
      level: 'warning',
      limit: { side: 'at_least' },
    });
    expect(all.get('soft-sputter/clean-film')?.kind).toBe('pass');
    expect(all.has('soft-sputter/usual-pressure')).toBe(true);
  });

  test('may divide a number by a setpoint', () => {
    const own = `regimen: process 1
name: quick
title: Quick change
assumptions:
  stay:
    statement: Gas stays a small part of the step.
    quantity: residence-time
    over: time
    at_most: { warning: 1e-6 }
    source: own practice
`;
    const one = verdict('quick/stay', step('quick', 'time: 10 s, pressure: 1 Torr, flows: { N2: 100 sccm }'), {
      files: { 'processes/quick.yaml': own },
    });
    const run = judged(step('soak', 'time: 10 s, pressure: 1 Torr, flows: { N2: 100 sccm }')).steps[0]?.run;
    const stay = run?.read({ id: 'residence-time' });
    expect(one.kind).toBe('fail');
    expect(one.value).toBeCloseTo((stay?.kind === 'known' ? stay.value : NaN) / 10, 12);
  });

  test.each([
    ['a number that nobody knows', 'knudsen-throw', 'time', '3', "no number is named 'knudsen-throw'"],
    ['a divisor that nobody knows', 'residence-time', 'tme', '3', "no number is named 'tme'"],
    ['a bound in a wrong unit', 'residence-time', 'time', '3 mTorr', '3 mTorr'],
  ])('with %s is a fault of its document', (_, quantity, over, bound, found) => {
    const own = `regimen: process 1
name: odd
title: Odd
assumptions:
  one:
    statement: It is odd.
    quantity: ${quantity}
    over: ${over}
    at_most: { warning: ${bound} }
    source: nobody
`;
    const { faults } = tried(step('odd', 'time: 1 s, pressure: 1 Torr, flows: { N2: 100 sccm }'), {
      files: { 'processes/odd.yaml': own },
    });
    expect(faults).toHaveLength(1);
    expect(faults[0]?.found).toContain(found);
    expect(faults[0]?.place.file).toBe('processes/odd.yaml');
  });

  test('lets the usual range of the target that runs be stated without its name', () => {
    const own = `regimen: process 1
name: near
title: Near
assumptions: {}
usual: { targets.throw: { at_most: 5 mm } }
`;
    const one = verdict('near/usual-targets.throw', film('near'), { files: { 'processes/near.yaml': own } });
    expect(one).toMatchObject({ kind: 'fail', level: 'note', value: 0.06 });
  });
});

describe('a ratio of flows', () => {
  const ratio = (more = 'at_most: 1.8, level: error') => ({ site: `ratios: { torch: { of: H2, to: O2, ${more} } }\n` });
  const burn = (flows: string) => step('soak', `time: 60 s, pressure: 10 mTorr, flows: { ${flows} }`);

  test.each([
    ['H2: 170 sccm, O2: 100 sccm', 'pass'],
    ['H2: 180 sccm, O2: 100 sccm', 'pass'],
    ['H2: 190 sccm, O2: 100 sccm', 'fail'],
    ['H2: 190 sccm', 'fail'],
    ['H2: 190 sccm, O2: 0 sccm', 'fail'],
    ['O2: 100 sccm', 'pass'],
    ['N2: 100 sccm', 'notApplicable'],
    ['N2: 100 sccm, O2: 0 sccm, H2: 0 sccm', 'notApplicable'],
    ['H2: unknown, O2: 100 sccm', 'open'],
    ['H2: 100 sccm, O2: unknown', 'open'],
  ])('at %s: %s', (flows, kind) => {
    expect(verdict('site/torch', burn(flows), ratio())).toMatchObject({
      kind,
      reference: { id: 'flow-ratio', of: 'H2/O2' },
    });
  });

  test('with a lower bound falls below it where the dividend is absent, and not where the divisor is', () => {
    const least = ratio('at_least: 0.5, level: warning');
    expect(verdict('site/torch', burn('O2: 100 sccm'), least)).toMatchObject({
      kind: 'fail',
      level: 'warning',
      value: 0,
    });
    expect(verdict('site/torch', burn('H2: 100 sccm'), least).kind).toBe('pass');
  });

  test('holds at every instant: also while the divisor is still at zero', () => {
    const one = verdict('site/torch', burn('H2: 100 sccm, O2: { from: 0 sccm, to: 200 sccm }'), ratio());
    expect(one).toMatchObject({ kind: 'fail', level: 'error', instance: { kind: 'ramp', fraction: 0 } });
    expect(one.remarks).toEqual(['H2 flows without O2']);
  });

  test('holds at the limits of a range', () => {
    const one = verdict('site/torch', burn('H2: 100 sccm, O2: { usually: 100 sccm, at_least: 40 sccm }'), ratio());
    expect(one).toMatchObject({ kind: 'fail', instance: { address: 'flows.O2', limit: 'at_least' } });
  });

  test('counts what flows, not what a composition says the molecules meet', () => {
    const split = step(
      'soak',
      'time: 60 s, pressure: 10 mTorr, flows: { H2: 190 sccm, O2: 100 sccm }, composition: { H2O: 90 %, O2: rest }',
    );
    expect(verdict('site/torch', split, ratio()).kind).toBe('fail');
  });

  test('holds on its chambers alone', () => {
    expect([
      ...verdicts(burn('H2: 190 sccm, O2: 100 sccm'), ratio('at_most: 1.8, level: error, chambers: [plover]')).keys(),
    ]).toContain('site/torch');
    const { judgement, faults } = tried(
      burn('H2: 190 sccm, O2: 100 sccm'),
      ratio('at_most: 1.8, level: error, chambers: [heron]'),
    );
    expect(byName(judgement).has('site/torch')).toBe(false);
    expect(faults).toHaveLength(1);
  });
});

describe('limits of the chamber', () => {
  const limited = (limits: string) => ({ chamber: `${PLOVER}limits: { ${limits} }\n` });
  const soak = (keys: string) => step('soak', `time: 60 s, flows: { Ar: 100 sccm }, ${keys}`);

  test.each([
    ['5 mTorr', 'pass'],
    ['2 mTorr', 'pass'],
    ['1.9 mTorr', 'fail'],
    ['200 mTorr', 'pass'],
    ['201 mTorr', 'fail'],
  ])('of 2 to 200 mTorr at %s: %s', (pressure, kind) => {
    const one = verdict(
      'chamber-fit/pressure-limits',
      soak(`pressure: ${pressure}`),
      limited('pressure: { at_least: 2 mTorr, at_most: 200 mTorr }'),
    );
    expect(one).toMatchObject({ kind, level: 'error' });
  });

  test('are judged as set, whatever the tolerance', () => {
    const one = verdict(
      'chamber-fit/pressure-limits',
      soak('pressure: 200 mTorr +/- 5 %'),
      limited('pressure: { at_most: 200 mTorr }'),
    );
    expect(one).toMatchObject({ kind: 'pass', uncertainty: 0 });
  });

  test('do not apply to what the step does not set', () => {
    const one = verdict(
      'chamber-fit/pressure-limits',
      soak('throttle: open'),
      limited('pressure: { at_most: 200 mTorr }'),
    );
    expect(one).toMatchObject({ kind: 'notApplicable', because: 'the step sets no pressure' });
  });

  test('hold along a ramp', () => {
    const one = verdict(
      'chamber-fit/pressure-limits',
      soak('pressure: { from: 10 mTorr, to: 300 mTorr }'),
      limited('pressure: { at_most: 200 mTorr }'),
    );
    expect(one).toMatchObject({ kind: 'fail', instance: { fraction: 1 } });
  });
});

describe('the equipment', () => {
  const gauges = {
    chamber: `${PLOVER}gauges: { fine: { full_scale: 100 mTorr, usable_from: 0.5 % }, coarse: { full_scale: 10 Torr } }\n`,
  };
  const at = (pressure: string, flow = '100 sccm') =>
    step('soak', `time: 60 s, pressure: ${pressure}, flows: { Ar: ${flow} }`);

  test.each([
    ['50 mTorr', 'pass', 'pass'],
    ['0.4 mTorr', 'pass', 'fail'],
    ['5 Torr', 'pass', 'notApplicable'],
    ['11 Torr', 'fail', 'notApplicable'],
  ])('at %s: full scale %s, lowest pressure %s', (pressure, range, footing) => {
    const all = verdicts(at(pressure), gauges);
    expect(all.get('chamber-fit/gauge-range')?.kind).toBe(range);
    expect(all.get('chamber-fit/gauge-footing')?.kind).toBe(footing);
  });

  test.each([
    ['501 sccm', 'fail', 'error'],
    ['480 sccm', 'fail', 'note'],
    ['100 sccm', 'pass', 'error'],
    ['40 sccm', 'fail', 'warning'],
    ['5 sccm', 'fail', 'error'],
    ['0 sccm', 'notApplicable', 'error'],
  ])('a line of 500 sccm at %s: %s %s', (flow, kind, level) => {
    expect(verdict('chamber-fit/line-range', at('10 mTorr', flow))).toMatchObject({ kind, level });
  });

  test('reach: a pump of 1500 L/s cannot hold 500 sccm at 3 mTorr, nor a throttle of 2 L/s 5 sccm at 10 Torr', () => {
    // 500 sccm of gas at 25 degC are 6.9 Torr L/s.
    expect(verdict('chamber-fit/reach-low', at('3 mTorr', '500 sccm'))).toMatchObject({ kind: 'fail', level: 'error' });
    expect(verdict('chamber-fit/reach-low', at('6 mTorr', '500 sccm')).kind).toBe('pass');
    expect(verdict('chamber-fit/reach-high', at('10 Torr', '5 sccm'))).toMatchObject({ kind: 'fail', level: 'error' });
  });
});

describe('a unit slip', () => {
  test.each([
    ['5 mTorr', 'pass'],
    ['5 Torr', 'fail'],
    ['0.005 mTorr', 'fail'],
    ['0.3 mTorr', 'pass'],
  ])('of the pressure of a sputter step, %s: %s', (pressure, kind) => {
    const one = verdict(
      'sputter/usual-pressure',
      step('sputter', `time: 60 s, pressure: ${pressure}, flows: { Ar: 200 sccm }`),
    );
    expect(one).toMatchObject({ kind, level: 'note' });
    expect(one.statement).toContain('is the unit right?');
  });

  test('never blocks by itself', () => {
    const found = findings(judged(step('sputter', 'time: 60 s, pressure: 5 Torr, flows: { Ar: 200 sccm }')));
    expect(found).toContain('fail note sputter/usual-pressure');
  });
});
