import { describe, expect, test } from 'vitest';
import { builtInAtom, builtInGas, builtInNames, builtInProcess } from '../../src/documents/built-in.ts';
import { readChamber, readDocument, readRecipe } from '../../src/documents/read.ts';
import { sortOf } from '../../src/documents/sort.ts';
import { Source } from '../../src/shelf/place.ts';
import { chamberWith, recipeWith } from './trial-documents.ts';
import type { Setpoint } from '../../src/documents/setpoint.ts';
import type { Step } from '../../src/documents/generated/types.ts';

function stepWith(...lines: readonly string[]): Step {
  const { value, faults } = readRecipe(new Source('trial.yaml', recipeWith(...lines)));
  expect(faults).toEqual([]);
  const step = value?.content.steps[0];
  if (step === undefined || 'steps' in step) throw new Error('no step');
  return step;
}

function pressureOf(text: string): Setpoint | undefined {
  return stepWith(`pressure: ${text}`).pressure;
}

describe('a physical value becomes a setpoint', () => {
  test('with value in SI, unit as written and its place', () => {
    const pressure = pressureOf('30 mTorr');
    expect(pressure).toMatchObject({ kind: 'fixed', measure: { dimension: 'pressure', unit: 'mTorr' } });
    expect(pressure?.kind === 'fixed' ? pressure.measure.value : 0).toBeCloseTo(3.99967, 5);
    expect(pressure?.place).toMatchObject({ file: 'trial.yaml', line: 8, column: 15 });
  });

  test('with its tolerance', () => {
    expect(pressureOf('30 mTorr +/- 1 %')).toMatchObject({ measure: { tolerance: { value: 0.01, of: 'reading' } } });
  });

  test.each(['4 \u00b5bar', '4 \u03bcbar', '4\u00a0ubar', '4\u2009ubar', '"4 ubar"', "'4 ubar'"])(
    'in the spelling %s',
    (text) => {
      expect(pressureOf(text)).toMatchObject({ kind: 'fixed', measure: { unit: pressureUnit() } });
    },
  );

  test('as a ramp over the step or over the laps of a cycle', () => {
    expect(pressureOf('{ from: 3 mTorr, to: 4 mTorr }')).toMatchObject({
      kind: 'ramp',
      over: 'step',
      to: { measure: { unit: 'mTorr' } },
    });
    expect(pressureOf('{ from: 3 mTorr, to: 4 mTorr, over: laps }')).toMatchObject({ kind: 'ramp', over: 'laps' });
  });

  test('as a range with or without a usual value', () => {
    expect(pressureOf('{ usually: 3 mTorr }')).toMatchObject({
      kind: 'range',
      usually: { measure: { unit: 'mTorr' } },
    });
    expect(pressureOf('{ at_least: 3 mTorr, at_most: 4 mTorr }')).toMatchObject({
      kind: 'range',
      at_most: { place: { line: 8, column: 45 } },
    });
  });

  test('as the word unknown, and a throttle as the word open', () => {
    expect(pressureOf('unknown')).toMatchObject({ kind: 'unknown', place: { line: 8, column: 15 } });
    expect(stepWith('throttle: open').throttle).toBe('open');
    expect(stepWith('throttle: 40 %').throttle).toMatchObject({ kind: 'fixed', measure: { value: 0.4 } });
  });

  test('also behind keys of any name, in lists and in zones', () => {
    expect(stepWith('flows: { Ar-low: 4 sccm }').flows?.['Ar-low']).toMatchObject({
      kind: 'fixed',
      measure: { dimension: 'flow' },
    });
    expect(stepWith('temperatures: { wall: { zones: [600 degC, 610 degC] } }').temperatures?.wall).toMatchObject({
      zones: [{ measure: { value: 873.15 } }, { measure: { value: 883.15 } }],
    });
    const { value } = readChamber(
      new Source('c.yaml', chamberWith('pump: { speed: [{ below: 1 Torr, is: 110 L/s }, { is: 90 L/s }] }')),
    );
    expect(value?.content.pump?.speed).toMatchObject([
      { below: { kind: 'fixed' }, is: { measure: { unit: 'L/s' } } },
      {},
    ]);
  });

  test('as an accuracy of what it says', () => {
    const { value } = readChamber(new Source('c.yaml', chamberWith()));
    expect(value?.content.gas_lines?.Ar?.accuracy).toMatchObject({
      kind: 'accuracy',
      tolerance: { value: 0.01, of: 'full scale' },
    });
  });
});

describe('a document knows the place of every value and key', () => {
  const { value } = readDocument(
    new Source('trial.yaml', recipeWith('flows: { Ar: 4 sccm }', 'reason: |', '  two', '  lines')),
  );

  test.each([
    [['name'], 'value', 2, 7],
    [['name'], 'key', 2, 1],
    [['steps', 0], 'value', 5, 5],
    [['steps', 0, 'flows', 'Ar'], 'value', 8, 18],
    [['steps', 0, 'flows', 'Ar'], 'key', 8, 14],
    [['steps', 0, 'reason'], 'value', 9, 13],
    [['steps', 7, 'reason'], 'value', 5, 3],
  ] as const)('%j, its %s', (pointer, part, line, column) => {
    expect(value?.place(pointer, part)).toMatchObject({ line, column });
  });

  test('counted from the first character behind a byte order mark, and in UTF-16 units', () => {
    const read = readDocument(
      new Source('trial.yaml', `\uFEFF${recipeWith('flows: { "Ar": 4 sccm } # \u{1F9EA}')}`),
    ).value;
    expect(read?.place(['regimen'])).toMatchObject({ line: 1, column: 10 });
  });

  test('the same with either line end', () => {
    const read = readDocument(new Source('trial.yaml', recipeWith('pressure: 4 mTorr').replaceAll('\n', '\r\n'))).value;
    expect(read?.place(['steps', 0, 'pressure'])).toMatchObject({ line: 8, column: 15 });
  });
});

describe('the sort of a text is told by its first key', () => {
  test.each([
    ['regimen: recipe 1\n', 'recipe'],
    ['# a remark\n\n---\nregimen:   chamber 1\n', 'chamber'],
    ['\uFEFFregimen: site 1', 'site'],
    ['"regimen": process 1\r\n', 'process'],
    ['{ regimen: substances 1 }', 'substances'],
    ['%YAML 1.1\n---\nregimen: recipe 1\n', 'recipe'],
    ['regimen: recipe 9\n', 'recipe'],
    ['regimen: recipes 1\n', 'unclear'],
    ['regimen:\n', 'unclear'],
  ])('%j is %s', (text, sort) => {
    expect(sortOf(text)).toBe(sort);
  });

  test.each([
    '',
    '# regimen: recipe 1\n',
    'name: x\nregimen: recipe 1\n',
    'regimens: 3\n',
    '- regimen: recipe 1\n',
    'regimen:recipe\n',
  ])('%j is not ours', (text) => {
    expect(sortOf(text)).toBeUndefined();
  });

  test('a document of another sort than the one needed is a fault', () => {
    const { faults } = readChamber(new Source('trial.yaml', recipeWith()));
    expect(faults).toMatchObject([{ found: 'regimen: a recipe document', right: 'a chamber document is needed here' }]);
  });
});

describe('built-in data', () => {
  test('is read by name, with the place of each value in its file', () => {
    const argon = builtInGas('Ar');
    expect(argon?.content.collision?.diameter).toMatchObject({
      kind: 'fixed',
      measure: { dimension: 'length', unit: 'angstrom' },
    });
    expect(argon?.place(['collision', 'diameter'])).toEqual(argon?.content.collision?.diameter.place);
    expect(argon?.place(['collision']).file).toBe('built-in/gases.yaml');
  });

  test('has no entry for names that it does not list', () => {
    expect(builtInGas('constructor')).toBeUndefined();
    expect(builtInAtom('__proto__')).toBeUndefined();
    expect(builtInProcess('nothing')).toBeUndefined();
  });

  test('can be read whole', () => {
    const gases = builtInNames('gases').map((name) => builtInGas(name));
    expect(gases.every((gas) => gas?.content.title !== undefined)).toBe(true);
    const processes = builtInNames('processes').map((name) => builtInProcess(name)?.content.name);
    expect(processes).toEqual(builtInNames('processes'));
  });
});

function pressureUnit(): string {
  const pressure = pressureOf('4 ubar');
  return pressure?.kind === 'fixed' ? pressure.measure.unit : '';
}
