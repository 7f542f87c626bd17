import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { HERON, onlyStep, resolve, written } from './pilot.ts';

const SCCM = 4.47796e17;
const TORR = 101325 / 760;

describe('where a setpoint comes from', () => {
  const NESTED = `
  - name: outer
    repeat: 2
    throughout: { pressure: 20 mTorr, temperatures: { wafer: 200 degC } }
    steps:
      - name: inner
        repeat: 3
        throughout: { pressure: 30 mTorr }
        steps:
          - { name: own, process: soak, time: 1 s, pressure: 40 mTorr }
          - { name: taken, process: soak, time: 2 s }
  - { name: last, process: soak, time: 4 s }`;

  test('from the step, else from its cycles from the inside out, else the recipe, else the chamber', () => {
    const { value, faults } = resolve(NESTED, { head: 'throughout: { pressure: 10 mTorr }\n' });
    expect(faults).toEqual([]);
    const steps = value?.steps ?? [];
    expect(steps.map(({ path }) => path)).toEqual(['outer/inner/own', 'outer/inner/taken', 'last']);
    expect(steps.map(({ number }) => number)).toEqual([1, 2, 3]);
    const millitorr = steps.map(({ givens }) => ((givens.get('pressure')?.value ?? 0) / TORR) * 1000);
    expect(millitorr.map((pressure) => Math.round(pressure))).toEqual([40, 30, 10]);
    expect(steps[0]?.givens.get('temperatures.wafer')?.value).toBe(473.15);
    expect(steps[2]?.givens.has('temperatures.wafer')).toBe(false);
    expect(steps[2]?.givens.get('temperatures.wall')?.origin).toMatchObject({ place: { file: 'chambers/heron.yaml' } });
  });

  test('cycles tell their path and repeats, and multiply the time', () => {
    const { value } = resolve(NESTED);
    expect(value?.cycles.map(({ path, repeat }) => [path, repeat.value])).toEqual([
      ['outer', 2],
      ['outer/inner', 3],
    ]);
    expect(value?.duration).toBe(2 * 3 * 3 + 4);
  });

  test('a time that is unknown leaves the whole time unknown', () => {
    expect(resolve('  - { name: one, process: soak, time: unknown }').value?.duration).toBeUndefined();
  });

  test('unknown stops the search', () => {
    const step = onlyStep('temperatures: { wall: unknown }', {
      head: 'throughout: { temperatures: { wall: 90 degC } }\n',
    });
    expect(step.unknown.has('temperatures.wall')).toBe(true);
    expect(step.givens.has('temperatures.wall')).toBe(false);
  });

  test('a value states anew what was unknown above', () => {
    const step = onlyStep('pressure: 5 mTorr', { head: 'throughout: { pressure: unknown }\n' });
    expect(step.unknown.size).toBe(0);
    expect(step.givens.has('pressure')).toBe(true);
  });

  test('a set throttle takes the place of a pressure from above, and the other way round', () => {
    const open = onlyStep('throttle: open', { head: 'throughout: { pressure: 5 mTorr }\n' });
    expect([open.setup.throttle, open.givens.has('pressure')]).toEqual(['open', false]);
    const held = onlyStep('pressure: 5 mTorr', { head: 'throughout: { throttle: 40 % }\n' });
    expect([held.setup.throttle, held.givens.has('throttle')]).toEqual(['holds', false]);
    const part = onlyStep('throttle: 40 %');
    expect([part.setup.throttle, part.givens.get('throttle')?.value]).toEqual(['position', 0.4]);
  });

  test('empty flows say that nothing flows', () => {
    const step = onlyStep('flows: {}', { head: 'throughout: { flows: { Ar: 20 sccm } }\n' });
    expect([step.setup.lines, step.givens.has('flows.Ar')]).toEqual([[], false]);
  });

  test('ranges and ramps keep what they run through', () => {
    const step = onlyStep(
      'time: { usually: 60 s, at_least: 45 s, at_most: 90 s }, temperatures: { wafer: { from: 20 degC, to: 80 degC } }, pressure: { at_least: 4 mTorr, at_most: 6 mTorr }',
    );
    expect(step.givens.get('time')).toMatchObject({ value: 60, span: { kind: 'range', atLeast: 45, atMost: 90 } });
    expect(step.givens.get('temperatures.wafer')).toMatchObject({
      value: 293.15,
      span: { kind: 'ramp', to: 353.15, over: 'step' },
    });
    expect(step.givens.get('pressure')?.value).toBeCloseTo(5e-3 * TORR, 12);
  });

  test('a voltage counts by its size', () => {
    expect(onlyStep('targets: { ti: { voltage: -420 V } }').givens.get('targets.ti.voltage')?.value).toBe(420);
  });

  test('what nothing judges is read in the dimension of its unit', () => {
    const { givens } = onlyStep('other: { clamp: 650 V, soak: 2 min, index: 3 }');
    expect(givens.get('other.clamp')).toMatchObject({ value: 650, dimension: 'voltage' });
    expect(givens.get('other.soak')).toMatchObject({ value: 120, dimension: 'time' });
    expect(givens.get('other.index')).toMatchObject({ value: 3, dimension: 'number' });
  });
});

describe('how well a value is known', () => {
  const uncertaintyOf = (step: string, address: string) => onlyStep(step).givens.get(address)?.uncertainty;
  const ROOT = Math.sqrt(3);

  test('by its own tolerance first', () => {
    expect(uncertaintyOf('pressure: 50 mTorr +/- 2 %', 'pressure')).toBeCloseTo((0.02 * 50e-3 * TORR) / ROOT, 12);
  });

  test('by the most sensitive gauge that holds the pressure', () => {
    expect(uncertaintyOf('pressure: 50 mTorr', 'pressure')).toBeCloseTo((0.01 * 100e-3 * TORR) / ROOT, 12);
    expect(uncertaintyOf('pressure: 1 Torr', 'pressure')).toBeCloseTo((0.02 * TORR) / ROOT, 12);
    expect(uncertaintyOf('pressure: 50 Torr', 'pressure')).toBeCloseTo((0.02 * 50 * TORR) / ROOT, 12);
  });

  test('by its gas line', () => {
    expect(uncertaintyOf('flows: { Ar: 50 sccm }', 'flows.Ar')).toBeCloseTo(((2 * SCCM) / ROOT) * 1, -13);
    expect(uncertaintyOf('flows: { N2: 50 sccm }', 'flows.N2')).toBeCloseTo((1 * SCCM) / ROOT, -13);
  });

  test('else by what the site says', () => {
    expect(uncertaintyOf('time: 10 s', 'time')).toBeCloseTo(0.2 / ROOT, 12);
    expect(uncertaintyOf('temperatures: { wafer: 100 degC }', 'temperatures.wafer')).toBeCloseTo(5 / ROOT, 12);
    expect(uncertaintyOf('backside: { gas: He, pressure: 10 Torr }', 'backside.pressure')).toBeCloseTo(
      (0.3 * TORR) / ROOT,
      9,
    );
  });

  test('else it counts as exact', () => {
    expect(uncertaintyOf('wafer: { diameter: 200 mm }', 'wafer.diameter')).toBe(0);
  });

  test('of a wall in zones, by how far they differ', () => {
    const wall = onlyStep('temperatures: { wall: { zones: [600 degC +/- 0 K, 620 degC +/- 0 K] } }').givens.get(
      'temperatures.wall',
    );
    expect(wall?.value).toBeCloseTo(883.15, 9);
    expect(wall?.uncertainty).toBeCloseTo(10 / ROOT, 9);
  });
});

describe('what a step is made of', () => {
  test('lines bring their gases, each once, in order of first mention', () => {
    const { setup } = onlyStep('flows: { N2: 100 sccm, dilute: 200 sccm, Ar: 0 sccm }');
    expect(setup.lines.map(({ name }) => name)).toEqual(['N2', 'dilute']);
    expect(setup.gases).toEqual(['N2', 'SiH4']);
    expect(setup.lines[1]?.brings).toEqual([
      { gas: 'SiH4', share: 'chamber.gas_lines.dilute.brings.SiH4' },
      { gas: 'N2', share: 'chamber.gas_lines.dilute.brings.N2' },
    ]);
  });

  test('the rest is what the other shares leave', () => {
    const { givens } = onlyStep('composition: { CF4: 70 %, O2: 20 %, CO2: rest }');
    expect(givens.get('composition.CO2')?.value).toBeCloseTo(0.1, 12);
    expect(givens.get('chamber.pump.residual.N2')?.value).toBeCloseTo(0.2, 12);
    expect(givens.get('chamber.gas_lines.dilute.brings.N2')?.value).toBeCloseTo(0.98, 12);
  });

  test('a stated composition stands for the feed, as a whole', () => {
    const step = onlyStep('composition: { CF4: 60 %, CO2: rest }, flows: { Ar: 5 sccm }', {
      head: 'throughout: { composition: { CF4: 70 %, O2: rest } }\n',
    });
    expect([step.setup.composition, step.setup.gases]).toEqual([true, ['CF4', 'CO2']]);
    expect(step.givens.has('composition.O2')).toBe(false);
  });

  test('a target that the step names runs, else the only one there is', () => {
    const step = onlyStep('targets: { alloy: {} }');
    expect(step.setup.target).toEqual({
      name: 'alloy',
      atoms: [
        { atom: 'Ti', share: 'chamber.targets.alloy.material.Ti' },
        { atom: 'Al', share: 'chamber.targets.alloy.material.Al' },
      ],
    });
    expect(step.setup.melt).toEqual({ name: 'al', atoms: [{ atom: 'Al' }] });
    expect(onlyStep('time: 1 s').setup.target).toBeUndefined();
    expect(step.givens.get('targets.alloy.throw')?.value).toBeCloseTo(0.07, 12);
  });

  test('generators with power deliver it', () => {
    expect(onlyStep('power: { source: 500 W, bias: 0 W }').setup.powered).toEqual(['source']);
  });

  test('a wafer, a panel, none, or nobody knows', () => {
    expect(onlyStep('wafer: { diameter: 200 mm }').setup.wafer).toBe('disc');
    expect(onlyStep('wafer: { width: 300 mm, length: 400 mm }').setup.wafer).toBe('panel');
    const none = onlyStep('wafer: none', {
      head: 'wafer: { diameter: 200 mm, feature: { shape: hole, width: 1 um } }\n',
    });
    expect([none.setup.wafer, none.setup.feature, none.givens.has('wafer.feature.width')]).toEqual([
      'none',
      undefined,
      false,
    ]);
    expect([...none.none]).toEqual(['wafer']);
    expect(onlyStep('time: 1 s').setup.wafer).toBe('unknown');
  });

  test('the order of flows does not matter to what they are', () => {
    const flows = ['Ar: 5 sccm', 'N2: 9 sccm +/- 1 %', 'dilute: 7 sccm', 'tuned: 3 sccm'];
    const given = (order: readonly string[]) =>
      [...onlyStep(`flows: { ${order.join(', ')} }`).givens].filter(([address]) => address.startsWith('flows.'));
    const told = (order: readonly string[]) =>
      given(order)
        .map(([address, { value, uncertainty }]) => [address, value, uncertainty])
        .sort();
    fc.assert(
      fc.property(fc.shuffledSubarray(flows, { minLength: 4 }), (order) => {
        expect(told(order)).toEqual(told(flows));
      }),
      { numRuns: 10 },
    );
  });

  test('another reactant takes nothing over from the one above', () => {
    const head = 'throughout: { reactant: { gas: CF4, sticking: 0.3 } }\n';
    expect(onlyStep('reactant: { gas: SF6 }', { head }).givens.has('reactant.sticking')).toBe(false);
    expect(onlyStep('reactant: { gas: CF4 }', { head }).givens.get('reactant.sticking')?.value).toBe(0.3);
  });

  test('defaults say that they are', () => {
    const { givens } = onlyStep('wafer: { diameter: 200 mm }, surface: { etches: SiO2 }');
    for (const address of ['wafer.count', 'wafer.coated_faces', 'surface.open_area']) {
      expect(givens.get(address)).toMatchObject({ value: 1, origin: { default: 'rule' } });
    }
  });

  test('places lead to the step and its process', () => {
    const step = onlyStep('time: 1 s');
    expect(step.place).toMatchObject({ file: 'trial.yaml', line: 5, column: 13 });
    expect(step.processPlace).toMatchObject({ line: 5, column: 27 });
  });
});

describe('what a line delivers', () => {
  test('sccm count at 0 degC and 101325 Pa', () => {
    expect((onlyStep('flows: { Ar: 10 sccm }').givens.get('flows.Ar')?.value ?? 0) / SCCM).toBeCloseTo(10, 4);
  });

  test('on a chamber with another reference they hold fewer molecules', () => {
    const files = { 'chambers/heron.yaml': `${HERON}flow_reference: { temperature: 20 degC, pressure: 101325 Pa }\n` };
    const { givens } = onlyStep('flows: { Ar: 10 sccm }', { files });
    expect((givens.get('flows.Ar')?.value ?? 0) / SCCM).toBeCloseTo((10 * 273.15) / 293.15, 4);
    expect((givens.get('chamber.gas_lines.Ar.full_scale')?.value ?? 0) / SCCM).toBeCloseTo((200 * 273.15) / 293.15, 3);
  });

  test('a known calibration holds, but not for a shut valve', () => {
    expect((onlyStep('flows: { tuned: 50 sccm }').givens.get('flows.tuned')?.value ?? 0) / SCCM).toBeCloseTo(52.5, 3);
    expect(onlyStep('flows: { tuned: 0 sccm }').givens.get('flows.tuned')?.value).toBe(0);
  });

  test('a bubbler adds the vapour that its carrier takes along', () => {
    const { givens } = onlyStep('flows: { metal: 100 sccm }');
    const share = givens.get('chamber.gas_lines.metal.brings.H2O')?.value ?? NaN;
    // Water at 60 degC: 19.95 kPa (IAPWS), over 80 kPa in the vessel.
    expect(share).toBeCloseTo(19.95 / 80, 2);
    expect(givens.get('chamber.gas_lines.metal.brings.N2')?.value).toBeCloseTo(1 - share, 12);
    expect((givens.get('flows.metal')?.value ?? 0) / SCCM).toBeCloseTo(100 / (1 - share), 3);
    expect((givens.get('chamber.gas_lines.metal.full_scale')?.value ?? 0) / SCCM).toBeCloseTo(200 / (1 - share), 3);
  });

  test('an amount a step is a flow over its time', () => {
    const { givens } = onlyStep('time: 0.5 s, flows: { water: 2.4 umol }');
    expect(givens.get('flows.water')?.value).toBeCloseTo((2.4e-6 * 6.02214076e23) / 0.5, -8);
    expect(givens.get('flows.water')?.unit).toBe('umol/s');
    expect(onlyStep('time: unknown, flows: { water: 2.4 umol }').unknown.has('flows.water')).toBe(true);
  });
});

describe('faults stand at their very value, and the rest is resolved', () => {
  test.each([
    ['flows: { Argon: 5 sccm }', "5:42 gas line 'Argon' is not known: one of Ar, N2, dilute, tuned, water, metal"],
    ['flows: { ar: 5 sccm }', "5:42 gas line 'ar' is not known: 'Ar'?"],
    ['power: { sauce: 5 W }', "5:42 generator 'sauce' is not known: one of source, bias"],
    ['duty: { rf: 50 % }', "5:41 generator 'rf' is not known: one of source, bias"],
    ['targets: { tx: {} }', "5:44 target 'tx' is not known: 'ti'?"],
    ['targets: { ti: {}, alloy: {} }', '5:52 ti and alloy in one step: the one that runs'],
    ['reactant: { gas: CF5 }', "5:50 gas 'CF5' is not known: 'CF4'?"],
    ['surface: { etches: SiO3 }', "5:52 film 'SiO3' is not known: 'SiO2'?"],
    ['backside: { gas: Hee }', "5:50 gas 'Hee' is not known: 'He'?"],
    [
      'composition: { CF4: 70 %, CO2: 20 % }',
      '5:64 the shares add up to 90 %: shares that add up to 100 %, or one share as rest',
    ],
    ['composition: { CF4: rest, CO2: rest }', '5:64 two shares are the rest: one of them in percent'],
    [
      'composition: { CF4: rest, CO2: 110 % }',
      '5:53 the other shares add up to 110 %: less than 100 % where one is the rest',
    ],
    ['flows: { Ar: 2 umol }, time: 1 s', '5:46 an amount through line Ar: a flow, in sccm: the line has a controller'],
    [
      'flows: { water: 2 umol }',
      '5:49 an amount through line water in a step without time: a time, over which it is fed',
    ],
    ['fill_to: 2 Torr', '5:42 fill_to with the throttle not closed: throttle: closed beside it'],
    [
      'other: { clamp: 650 W2 }',
      "5:49 other.clamp: '650 W2': a value in a unit that is known; `list units` tells them",
    ],
  ])('%s', (step, fault) => {
    const { value, faults } = resolve(
      `  - { name: one, process: soak, ${step} }\n  - { name: two, process: soak, pressure: 3 mTorr }`,
    );
    expect(written(faults)).toHaveLength(1);
    expect(written(faults)[0]).toContain(`trial.yaml:${fault}`);
    expect(value?.steps[1]?.givens.has('pressure')).toBe(true);
  });

  test('an unknown process', () => {
    const { value, faults } = resolve('  - { name: one, process: soaks, time: 1 s }');
    expect(written(faults)).toEqual(["trial.yaml:5:27 process 'soaks' is not known: 'soak'?"]);
    expect(value?.steps[0]?.givens.has('time')).toBe(true);
  });

  test('two neighbours of one name', () => {
    const { faults } = resolve('  - { name: one, process: soak }\n  - { name: one, process: soak }');
    expect(written(faults)).toEqual(["trial.yaml:6:13 'one' is also the step in line 5: a name of its own"]);
  });

  test('a pressure and a throttle in one block', () => {
    const { faults } = resolve('  - { name: one, process: soak }', {
      head: 'throughout: { pressure: 1 Pa, throttle: open }\n',
    });
    expect(written(faults)).toEqual([
      'trial.yaml:4:31 a pressure that is held and a throttle that is set: one of both',
    ]);
  });

  test('a chamber that nobody knows leaves nothing to resolve', () => {
    const { value, faults } = resolve('  - { name: one, process: soak }', { files: { 'chambers/heron.yaml': '' } });
    expect(value).toBeUndefined();
    expect(written(faults)).toEqual([
      "trial.yaml:3:10 chamber 'heron' is not known: the name of a chamber of the site, or a relative path with a `/`",
    ]);
  });
});

describe('waivers', () => {
  const waiver = (assumption: string, until = '2027-06-30') =>
    `waivers: [{ assumption: ${assumption}, reason: lot 7731, approved_by: process integration, until: ${until} }]`;
  const PROCESSES = {
    'processes/sputter.yaml': `regimen: process 1
name: sputter
title: Sputter
assumptions:
  impurity: { statement: Clean., quantity: impurity-ratio, at_most: 1, level: error, source: common practice }
`,
  };

  test('hang at the steps below that have their assumption', () => {
    const steps = '  - { name: one, process: sputter }\n  - { name: two, process: soak }';
    const { value, faults } = resolve(steps, { head: `${waiver('sputter/impurity')}\n`, files: PROCESSES });
    expect(faults).toEqual([]);
    expect(value?.steps.map(({ waivers }) => waivers.length)).toEqual([1, 0]);
  });

  test('of the chamber hold for any step', () => {
    const { value, faults } = resolve(`  - { name: one, process: soak, ${waiver('line-range')} }`);
    expect(faults).toEqual([]);
    expect(value?.steps[0]?.waivers.map(({ assumption, approvedBy }) => [assumption, approvedBy])).toEqual([
      ['line-range', 'process integration'],
    ]);
  });

  test('that name no assumption are faults', () => {
    const { faults } = resolve(`  - { name: one, process: soak, ${waiver('line-rnge')} }`);
    expect(written(faults)).toEqual(["trial.yaml:5:57 assumption 'line-rnge' is not known: 'line-range'?"]);
  });

  test('end on a day of the calendar', () => {
    const { faults } = resolve(`  - { name: one, process: soak, ${waiver('line-range', '2027-02-30')} }`);
    expect(faults.map(({ found }) => found)).toEqual(['there is no day 2027-02-30']);
  });
});
