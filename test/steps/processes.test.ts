import { describe, expect, test } from 'vitest';
import { open, resolve, site, written } from './pilot.ts';

const ASSUMPTION = (bound: string) => `{ statement: Holds., quantity: knudsen.gap, ${bound}, source: common practice }`;
const process = (name: string, more: string) => `regimen: process 1\nname: ${name}\ntitle: ${name}\n${more}\n`;

describe('processes of a site', () => {
  test('a plain bound has one limit at its level, a graded one its own', () => {
    const files = {
      'processes/a.yaml': process(
        'own',
        `assumptions:\n  plain: ${ASSUMPTION('at_most: 3, level: error')}\n  graded: ${ASSUMPTION('at_least: { warning: 1, error: 0.3 }')}`,
      ),
    };
    const [plain, graded] = site(files).process('own')?.assumptions ?? [];
    expect(plain).toMatchObject({
      name: 'plain',
      quantity: 'knudsen.gap',
      atMost: { error: { is: 3, place: { line: 5 } } },
      cure: [],
    });
    expect(graded).toMatchObject({
      atLeast: { error: { is: 0.3 }, warning: { is: 1 } },
      place: { line: 6, column: 3 },
    });
  });

  test('one of the same name takes the place of the built-in one', () => {
    const line = site({ 'processes/soak.yaml': process('soak', 'remark: ours') });
    expect(line.process('soak')?.remark).toBe('ours');
    expect(site().process('soak')?.remark).not.toBe('ours');
  });

  test('what is based on another keeps its rest and changes single assumptions', () => {
    const files = {
      'processes/a.yaml': process(
        'base',
        `assumptions:\n  one: ${ASSUMPTION('at_most: 1, level: error')}\n  two: ${ASSUMPTION('at_most: 2, level: error')}\nusual: { pressure: { at_most: 1 Pa } }\nshows: [knudsen.gap]`,
      ),
      'processes/b.yaml': process(
        'middle',
        `based_on: base\nassumptions:\n  two: ${ASSUMPTION('at_most: 20, level: error')}`,
      ),
      'processes/c.yaml': process(
        'top',
        `based_on: middle\nassumptions:\n  three: ${ASSUMPTION('at_most: 3, level: error')}\nshows: [turnovers]`,
      ),
    };
    const spec = site(files).process('top');
    expect(spec?.assumptions.map(({ name, atMost }) => [name, atMost?.error?.is])).toEqual([
      ['one', 1],
      ['two', 20],
      ['three', 3],
    ]);
    expect(spec?.shows).toEqual(['knudsen.gap', 'turnovers']);
    expect(spec?.usual.map(({ address }) => address)).toEqual(['pressure']);
  });

  test('one based on its own name changes the built-in one', () => {
    const built = site().process('sputter-line-of-sight')?.assumptions.length ?? NaN;
    const files = {
      'processes/a.yaml': process(
        'sputter-line-of-sight',
        `based_on: sputter-line-of-sight\nassumptions:\n  extra: ${ASSUMPTION('at_most: 1, level: error')}`,
      ),
    };
    const { value, faults } = open(files);
    expect(faults).toEqual([]);
    expect(value?.process('sputter-line-of-sight')?.assumptions).toHaveLength(built + 1);
  });

  test.each([
    [{ a: 'based_on: b', b: 'based_on: a' }, ['processes/b.yaml:4:11 processes based on each other: a, b']],
    [
      { a: 'based_on: b', b: 'based_on: c', c: 'based_on: b' },
      ['processes/c.yaml:4:11 processes based on each other: b, c'],
    ],
    [{ a: 'based_on: sputer' }, ["processes/a.yaml:4:11 process 'sputer' is not known: 'sputter'?"]],
    [
      { a: 'usual: { presure: { at_most: 1 Pa } }' },
      ["processes/a.yaml:4:10 no step has a setpoint 'presure': 'pressure'?"],
    ],
    [{ a: 'usual: { pressure: { at_most: 1 s } }' }, ["processes/a.yaml:4:31 '1 s'"]],
    [{ a: 'stands_in: { targets.energy: 5 s }' }, ["processes/a.yaml:4:30 '5 s'"]],
  ])('faults of %j', (documents, expected) => {
    const files = Object.fromEntries(
      Object.entries(documents).map(([name, more]) => [`processes/${name}.yaml`, process(name, more)]),
    );
    const { faults } = open(files);
    expect(faults).toHaveLength(expected.length);
    for (const [index, fault] of expected.entries()) expect(written(faults)[index]).toContain(fault);
  });

  test('two documents of one name are a fault', () => {
    const { faults } = open({ 'processes/a.yaml': process('own', ''), 'processes/b.yaml': process('own', '') });
    expect(written(faults)).toEqual([
      "processes/b.yaml:2:7 a second process 'own', the first is in processes/a.yaml: a name of its own",
    ]);
  });
});

describe('what a process lets stand in', () => {
  const files = {
    'processes/a.yaml': process(
      'own',
      'stands_in: { targets.energy: 5 eV +/- 3 eV, plasma.sheath: { at_least: 0.3 mm, at_most: 10 mm } }',
    ),
  };
  const step = (more: string) => resolve(`  - { name: one, process: own, ${more} }`, { files }).value?.steps[0];

  test('is a default that says so, at the target that runs', () => {
    const energy = step('targets: { ti: {} }')?.givens.get('targets.ti.energy');
    expect(energy?.origin).toMatchObject({ default: 'process own' });
    expect(energy?.value).toBeCloseTo(5 * 1.602176634e-19, 30);
    expect((energy?.uncertainty ?? 0) / (energy?.value ?? 1)).toBeCloseTo(0.6 / Math.sqrt(3), 9);
  });

  test('may be a range', () => {
    expect(step('time: 1 s')?.givens.get('plasma.sheath')?.span).toEqual({
      kind: 'range',
      atLeast: 3e-4,
      atMost: 1e-2,
    });
  });

  test('gives way to what the recipe says, also that nobody knows', () => {
    expect(step('targets: { ti: { energy: 8 eV } }')?.givens.get('targets.ti.energy')?.origin).toHaveProperty('place');
    expect(step('targets: { ti: { energy: unknown } }')?.givens.has('targets.ti.energy')).toBe(false);
    expect(step('plasma: { sheath: unknown }')?.givens.has('plasma.sheath')).toBe(false);
  });

  test('needs a target that runs', () => {
    expect([...(step('time: 1 s')?.givens.keys() ?? [])].some((address) => address.endsWith('.energy'))).toBe(false);
  });
});
