import { describe, expect, test } from 'vitest';
import { judged, PLOVER, step, verdict, verdicts, type Trial } from './trial.ts';

const FILM = 'surface: { grows: Ti, rate: 120 nm/min }';

describe('an open verdict', () => {
  test('names every setpoint that would supply its number at once, at the gravest grade', () => {
    const all = verdicts(
      step('sputter-line-of-sight', `time: 60 s, pressure: unknown, flows: { Ar: unknown }, ${FILM}`),
      {
        chamber: PLOVER.replace('  wti: { material: { W: 70 %, Ti: rest }, throw: 60 mm, generator: magnetron }\n', ''),
      },
    );
    expect(all.get('sputter-line-of-sight/free-throw')).toMatchObject({
      kind: 'open',
      level: 'error',
      needs: ['flows.Ar', 'pressure'],
    });
    expect(all.get('sputter-line-of-sight/clean-film')).toMatchObject({
      kind: 'open',
      needs: ['flows.Ar', 'pressure'],
    });
  });

  test('has no value and rests on nothing', () => {
    const one = verdict('pecvd/ample-feed', step('pecvd', 'time: 60 s, pressure: 2 Torr, flows: { SiH4: 80 sccm }'));
    expect(one.kind).toBe('open');
    expect(one.value).toBeUndefined();
    expect(one.needs).toEqual(['surface.grows', 'surface.rate']);
  });

  test('is what unknown makes of a number for which a default would stand in', () => {
    const energy = (energyOf: string) =>
      verdict(
        'sputter/energetic-arrival',
        step(
          'sputter',
          `time: 60 s, pressure: 5 mTorr, flows: { Ar: 100 sccm }, targets: { ti: { energy: ${energyOf} } }, ${FILM}`,
        ),
      );
    expect(energy('unknown')).toMatchObject({ kind: 'open', needs: ['targets.ti.energy'] });
    expect(energy('8 eV').kind).toBe('pass');
  });

  test('is left alone by what the chamber can do: that does not apply', () => {
    const all = verdicts(step('soak', 'time: 60 s, pressure: unknown, flows: { Ar: 100 sccm }'));
    expect(all.get('chamber-fit/reach-low')).toMatchObject({ kind: 'notApplicable', because: 'not given: pressure' });
  });
});

describe('what does not apply', () => {
  test('says why', () => {
    const all = verdicts(step('sputter', `time: 60 s, pressure: 5 mTorr, flows: { Ar: 100 sccm }, ${FILM}`));
    // Two targets, none of them named: none runs.
    expect(all.get('sputter/energetic-arrival')).toMatchObject({ kind: 'notApplicable', because: 'no target runs' });
    for (const one of all.values()) if (one.kind === 'notApplicable') expect(one.because, one.name).not.toBe('');
  });

  test('without a wafer nothing takes up the feed', () => {
    const bare = step(
      'pecvd',
      'time: 60 s, pressure: 2 Torr, flows: { SiH4: 80 sccm }, wafer: none, surface: { grows: SiO2, rate: 100 nm/min }',
    );
    expect(verdict('pecvd/ample-feed', bare)).toMatchObject({
      kind: 'notApplicable',
      because: 'no wafer is in the chamber',
    });
  });
});

describe('steps whose process assumes nothing', () => {
  test.each(['unassessed', 'soak', 'ramp', 'load', 'vent', 'season'])(
    '%s is judged by what the chamber can do alone',
    (process) => {
      const why = process === 'unassessed' ? 'reason: "to come", ' : '';
      const judgement = judged(step(process, `${why}time: 60 s, pressure: 5 mTorr, flows: { Ar: 100 sccm }`));
      const judgedBy = new Set(judgement.steps[0]?.verdicts.map((one) => one.process));
      expect([...judgedBy]).toEqual(['chamber-fit']);
    },
  );

  test('without anything that the chamber states, nothing is judged', () => {
    const bare =
      'regimen: chamber 1\nname: plover\nbody: { diameter: 400 mm, height: 250 mm, flow: mixed }\ngas_lines: { Ar: { } }\n';
    const judgement = judged(step('soak', 'time: 60 s, pressure: 5 mTorr, flows: { Ar: 100 sccm }'), { chamber: bare });
    const kinds = new Set(judgement.steps[0]?.verdicts.map(({ kind }) => kind));
    expect([...kinds]).toEqual(['notApplicable']);
  });
});

describe('a verdict near its bound', () => {
  // The gas temperature of a plasma is assumed: the wall plus 0 to 300 K. That makes its Knudsen number uncertain by nearly a half.
  const plasma = (pressure: string, gas = '') =>
    verdict(
      'pecvd/collisional-gap',
      step(
        'pecvd',
        `time: 60 s, pressure: ${pressure}, flows: { Ar: 100 sccm }, lengths: { gap: 20 mm }, power: { magnetron: 300 W }, temperatures: { ${gas} }`,
      ),
      { chamber: PLOVER.replace('melts: { al: { material: Al, throw: 500 mm } }\n', '') },
    );

  test('that rests on an assumed value is a review of grade note, and names it', () => {
    const one = plasma('80 mTorr', 'wall: 25 degC');
    expect(one).toMatchObject({ kind: 'review', level: 'note', limit: { side: 'at_most', value: 0.05 } });
    const heating = one.assumed.find(({ address }) => address === 'assumed.gas-heating');
    expect(heating?.share).toBeGreaterThan(0.9);
    expect(heating?.because).toMatch(/0 to 300 K/);
  });

  test('that rests on stated values keeps its grade', () => {
    const one = plasma('80 mTorr', 'gas: 450 K +/- 150 K');
    expect(one).toMatchObject({ kind: 'review', level: 'warning' });
  });

  test('is certain where the assumed range does not reach the bound', () => {
    expect(plasma('2 Torr', 'wall: 25 degC').kind).toBe('pass');
    expect(plasma('1 mTorr', 'wall: 25 degC')).toMatchObject({ kind: 'fail', level: 'error' });
  });

  test('fails at the grade that is sure and says that a graver one may be', () => {
    const one = verdict(
      'sputter-line-of-sight/free-throw',
      step(
        'sputter-line-of-sight',
        `time: 60 s, pressure: 1 Pa, flows: { Ar: 200 sccm }, targets: { ti: { voltage: 500 V } }, ${FILM}`,
      ),
    );
    expect(one).toMatchObject({ kind: 'fail', level: 'warning', perhaps: 'error' });
    expect(one.uncertainty).toBeGreaterThan((one.value ?? NaN) - 0.3);
  });

  test('has a margin: the factor to the limit that decides', () => {
    const one = verdict(
      'chamber-fit/reach-low',
      step('soak', 'time: 1 s, pressure: 10 mTorr, flows: { Ar: 100 sccm }'),
    );
    expect(one.margin).toBeCloseTo(1 / (one.value ?? NaN), 9);
  });
});

describe('the site’s coverage factor', () => {
  test('widens what is uncertain', () => {
    const text = step(
      'sputter',
      `time: 60 s, pressure: 5 mTorr, flows: { Ar: 200 sccm }, targets: { ti: { voltage: 500 V } }, ${FILM}`,
    );
    const of = (trial: Trial) => verdict('sputter/energetic-arrival', text, trial).uncertainty ?? NaN;
    expect(of({ site: 'show: { coverage_factor: 3 }\n' }) / of({})).toBeCloseTo(1.5, 9);
  });
});
