import { describe, expect, test } from 'vitest';
import { findings, judged, PLOVER, step, verdict, verdicts, type Trial } from './trial.ts';

/* Steps whose verdict an engineer knows beforehand. */

function target(material: string, throwing = '60 mm', more: Readonly<Record<string, string>> = {}): Trial {
  let chamber = PLOVER.replace('material: Ti, throw: 60 mm', `material: ${material}, throw: ${throwing}`);
  for (const [from, to] of Object.entries(more)) chamber = chamber.replace(from, to);
  return { chamber };
}

function deposit(process: string, pressure: string, film: string, flow = '200 sccm', rate = '120 nm/min'): string {
  return step(
    process,
    `time: 60 s, pressure: ${pressure}, flows: { Ar: ${flow} }, power: { magnetron: 4 kW }, targets: { ti: { voltage: 500 V } }, surface: { grows: ${film}, rate: ${rate} }`,
  );
}

describe('sputter', () => {
  test.each(['Al', 'Ti', 'Cu', 'Ta', 'W'])(
    '%s over 60 mm at 5 to 10 mTorr is an ordinary window and stays silent',
    (metal) => {
      for (const pressure of ['5 mTorr', '7.5 mTorr', '10 mTorr']) {
        expect(findings(judged(deposit('sputter', pressure, metal), target(metal))), pressure).toEqual([]);
      }
    },
  );

  test('atoms that are thermal long before they arrive fail', () => {
    const one = verdict('sputter/energetic-arrival', deposit('sputter', '80 mTorr', 'Ti', '400 sccm'));
    expect(one).toMatchObject({ kind: 'fail', level: 'error' });
    expect(one.value).toBeGreaterThan(4);
  });
});

describe('gas-flow sputter at 0.5 Torr', () => {
  const gasFlow = (process: string) => deposit(process, '0.5 Torr', 'Ti', '450 sccm', '400 nm/min');

  test('is thermalised, and silent', () => {
    expect(findings(judged(gasFlow('sputter-thermalised')))).toEqual([]);
    expect(verdict('sputter-thermalised/slow-arrival', gasFlow('sputter-thermalised')).kind).toBe('pass');
  });

  test('is no line of sight', () => {
    expect(verdict('sputter-line-of-sight/free-throw', gasFlow('sputter-line-of-sight'))).toMatchObject({
      kind: 'fail',
      level: 'error',
      limit: { side: 'at_least', value: 0.3 },
    });
  });
});

describe('line of sight', () => {
  test('a long throw of 300 mm at 0.3 mTorr holds', () => {
    const long = deposit('sputter-line-of-sight', '0.3 mTorr', 'Ti', '20 sccm');
    const one = verdict('sputter-line-of-sight/free-throw', long, target('Ti', '300 mm'));
    expect(one.kind).toBe('pass');
    expect(one.value).toBeGreaterThan(1);
  });

  test('the same throw at 5 mTorr fails', () => {
    const high = deposit('sputter-line-of-sight', '5 mTorr', 'Ti');
    expect(verdict('sputter-line-of-sight/free-throw', high, target('Ti', '300 mm'))).toMatchObject({
      kind: 'fail',
      level: 'error',
    });
  });

  test('heavy atoms keep their line through collisions: tungsten passes at a Knudsen number below one', () => {
    const { judgement, free } = lineOfSight('W', '3 mTorr');
    const kn = judgement.steps[0]?.run.read({ id: 'knudsen', length: 'throw', of: 'target' });
    expect(kn?.kind === 'known' ? kn.value : NaN).toBeLessThan(1);
    expect(free).toBe('pass');
    expect(lineOfSight('Al', '3 mTorr').free).not.toBe('pass');
  });

  test('helium hardly stops a heavy atom', () => {
    const helium = { '  Ar: { full_scale': '  He: { full_scale: 500 sccm }\n  Ar: { full_scale' };
    const text = deposit('sputter-line-of-sight', '10 mTorr', 'W').replace('Ar: 200', 'He: 200');
    expect(verdict('sputter-line-of-sight/free-throw', text, target('W', '60 mm', helium)).kind).toBe('pass');
  });

  function lineOfSight(metal: string, pressure: string) {
    const text = deposit('sputter-line-of-sight', pressure, metal);
    const judgement = judged(text, target(metal));
    return { judgement, free: verdict('sputter-line-of-sight/free-throw', text, target(metal)).kind };
  }
});

describe('residual gas', () => {
  const at = (base: string): Trial => ({ chamber: PLOVER.replace('1e-7 Torr', base) });

  test('a film of ordinary rate on a base of 1e-6 Torr stays silent', () => {
    expect(findings(judged(deposit('sputter', '5 mTorr', 'Ti', '400 sccm', '200 nm/min'), at('1e-6 Torr')))).toEqual(
      [],
    );
  });

  test('a slow film behind a throttle on the same base is called impure, on assumed water', () => {
    const one = verdict(
      'sputter/clean-film',
      deposit('sputter', '10 mTorr', 'Ti', '60 sccm', '20 nm/min'),
      at('1e-6 Torr'),
    );
    expect(one.kind).toBe('fail');
    expect(one.assumed.map(({ address }) => address)).toContain('assumed.residual.H2O');
  });

  test('what rests on assumed sticking is not called an error on ordinary practice', () => {
    const slow = (rate: string) =>
      judged(deposit('sputter', '5 mTorr', 'Ti', '100 sccm', rate), at('1e-6 Torr')).steps[0]?.verdicts ?? [];
    for (const rate of ['60 nm/min', '20 nm/min']) {
      const film = slow(rate).find(({ name }) => name === 'sputter/clean-film');
      expect(film?.kind === 'fail' && film.level === 'error', rate).toBe(false);
    }
    expect(slow('60 nm/min').find(({ name }) => name === 'sputter/clean-film')).toMatchObject({
      kind: 'review',
      level: 'note',
    });
  });

  test('noble residual gas does not soil a film', () => {
    const argon: Trial = { chamber: PLOVER.replace('1e-7 Torr,', '1e-5 Torr, residual: { Ar: 100 % },') };
    const one = verdict('sputter/clean-film', deposit('sputter', '10 mTorr', 'Ti', '200 sccm', '20 nm/min'), argon);
    expect(one).toMatchObject({ kind: 'pass', value: 0 });
  });
});

describe('evaporation', () => {
  const lift = (pressure: string, more = '') =>
    step(
      'evaporation',
      `time: 60 s, ${pressure}, melts: { al: { temperature: 1250 degC } }, surface: { grows: Al, rate: 2 nm/s }${more}`,
    );

  test('over 500 mm at 1e-6 Torr is silent', () => {
    expect(findings(judged(lift('throttle: open, flows: {}'), { chamber: PLOVER.replace('1e-7', '1e-6') }))).toEqual(
      [],
    );
  });

  test('at 1 mTorr atoms collide on their way', () => {
    expect(verdict('evaporation/free-throw', lift('pressure: 1 mTorr, flows: { Ar: 60 sccm }'))).toMatchObject({
      kind: 'fail',
      level: 'error',
    });
  });

  test('in oxygen that is meant counts only what else is in the chamber', () => {
    const reactive = lift('pressure: 0.05 mTorr, flows: { O2: 8 sccm }').replace('evaporation', 'evaporation-reactive');
    const names = [...verdicts(reactive).keys()].filter((name) => name.startsWith('evaporation'));
    expect(names).toEqual(['evaporation-reactive/clean-film', 'evaporation-reactive/usual-pressure']);
    expect(verdict('evaporation-reactive/clean-film', reactive).kind).toBe('pass');
  });
});

describe('plasma CVD', () => {
  const oxide = (process: string, pressure: string, gap: string, flow = '80 sccm', rate = '100 nm/min') =>
    step(
      process,
      `time: 60 s, pressure: ${pressure}, flows: { SiH4: ${flow}, O2: 400 sccm }, lengths: { gap: ${gap} }, power: { magnetron: 300 W }, temperatures: { wafer: 400 degC }, wafer: { diameter: 200 mm }, surface: { grows: SiO2, rate: ${rate} }`,
    );
  const low: Trial = { chamber: PLOVER.replace('2 L/s', '0.5 L/s') };

  test('at 2.5 Torr over 12 mm is silent', () => {
    expect(findings(judged(oxide('pecvd', '2.5 Torr', '12 mm'), low))).toEqual([]);
  });

  test('at 10 mTorr over 12 mm molecules meet the plates first', () => {
    expect(verdict('pecvd/collisional-gap', oxide('pecvd', '10 mTorr', '12 mm'))).toMatchObject({ kind: 'fail' });
  });

  test('a film that takes more silicon than flows is starved, on either kind of source', () => {
    for (const process of ['pecvd', 'pecvd-low-pressure']) {
      const one = verdict(`${process}/ample-feed`, oxide(process, '50 mTorr', '60 mm', '2 sccm', '1000 nm/min'));
      expect(one).toMatchObject({ kind: 'fail', level: 'warning', subject: 'Si' });
      expect(one.value).toBeGreaterThan(1);
    }
  });
});

describe('purge and settle', () => {
  // 20 L at 10 mTorr, 100 sccm and 0 degC turn over in 0.157895 s.
  const stirred: Trial = { chamber: PLOVER.replace('diameter: 400 mm', 'volume: 20 L, diameter: 400 mm') };
  const sweep = (process: string, time: string, flows = '{ N2: 100 sccm }') =>
    step(process, `time: ${time}, pressure: 10 mTorr, temperatures: { gas: 0 degC }, flows: ${flows}`);

  test.each([
    ['purge', '0.7264 s', 'pass', 'error'],
    ['purge', '0.7262 s', 'fail', 'warning'],
    ['purge', '0.4738 s', 'fail', 'warning'],
    ['purge', '0.4736 s', 'fail', 'error'],
    ['settle', '0.4738 s', 'pass', 'error'],
    ['settle', '0.4736 s', 'fail', 'warning'],
    ['settle', '0.2527 s', 'fail', 'warning'],
    ['settle', '0.2526 s', 'fail', 'error'],
  ])('%s of %s: %s %s', (process, time, kind, level) => {
    const name = process === 'purge' ? 'purge/cleared' : 'settle/replaced';
    expect(verdict(name, sweep(process, time), stirred)).toMatchObject({ kind, level });
  });

  test('half a second is enough for a reactor of a few cubic centimetres', () => {
    const small: Trial = {
      chamber: PLOVER.replace('diameter: 400 mm', 'volume: 3 cm3, diameter: 400 mm').replace('2 L/s', '0.1 L/s'),
    };
    expect(findings(judged(step('purge', 'time: 0.5 s, pressure: 1 Torr, flows: { N2: 100 sccm }'), small))).toEqual(
      [],
    );
  });

  test('a purge without gas is none', () => {
    const all = verdicts(step('purge', 'time: 10 s, throttle: open, flows: {}'));
    expect(all.get('purge/fed')).toMatchObject({ kind: 'fail', level: 'error', value: 0 });
    expect(all.get('purge/cleared')).toMatchObject({ kind: 'notApplicable', because: 'no gas flows' });
  });
});

describe('idle', () => {
  const reference = 'reference: { flows: { Ar: 50 sccm }, pressure: 1 mTorr }, temperature: 25 degC';
  const chamber = PLOVER.replace('temperature: 25 degC }\ngas', `${reference} }\ngas`);
  const idle = (pressure: string) => step('idle', `time: 60 s, pressure: ${pressure}, flows: { Ar: 50 sccm }`);

  test.each([
    ['1.1 mTorr', 'pass'],
    ['1.3 mTorr', 'fail'],
    ['0.8 mTorr', 'fail'],
  ])('at %s in place of 1 mTorr: %s', (pressure, kind) => {
    expect(verdict('idle/healthy-pump', idle(pressure), { chamber })).toMatchObject({ kind, level: 'note' });
  });

  test('without a reference nothing is judged', () => {
    expect(verdict('idle/healthy-pump', idle('1 mTorr')).kind).toBe('notApplicable');
  });
});
