import { describe, expect, test } from 'vitest';
import { MOST_FAULTS } from '../../src/documents/fault-list.ts';
import { readDocument } from '../../src/documents/read.ts';
import { Source } from '../../src/shelf/place.ts';
import { chamberWith, recipeWith } from './trial-documents.ts';
import { WRONG_FILES } from './wrong-files.ts';
import { WRONG_STRUCTURE } from './wrong-structure.ts';
import { WRONG_SYNTAX } from './wrong-syntax.ts';
import { WRONG_VALUES } from './wrong-values.ts';

function faultsOf(text: string): readonly string[] {
  const { faults } = readDocument(new Source('trial.yaml', text));
  return faults.map(({ place, found, right }) => `${place.line}:${place.column} ${found}; ${right}`);
}

describe('one mistake is answered by one message at its place', () => {
  test.each([...WRONG_FILES, ...WRONG_SYNTAX, ...WRONG_VALUES, ...WRONG_STRUCTURE])(
    '$name',
    ({ text, at, found, right }) => {
      expect(faultsOf(text)).toEqual([`${at} ${found}; ${right}`]);
    },
  );

  test('the recipe and the chamber that the rows add to are sound', () => {
    expect(faultsOf(recipeWith())).toEqual([]);
    expect(faultsOf(chamberWith())).toEqual([]);
  });
});

describe('several mistakes are all told, in the order of the text', () => {
  test('an anchor and its alias', () => {
    expect(faultsOf('regimen: site 1\nname: &n marsh\ntitle: *n\n')).toEqual([
      '2:7 the anchor &n; write the value itself, in quotes where it is text',
      '3:8 the alias *n; write the value itself, in quotes where it is text',
    ]);
  });

  test('a wrong unit, a misspelt key and a missing one', () => {
    const text = recipeWith('pressure: 30 s', 'flow: { Ar: 4 sccm }').replace('    process: settle\n', '');
    expect(faultsOf(text)).toEqual([
      "5:5 no process in 'fill'; add it, such as process: pecvd",
      "7:15 pressure: '30 s' is a time; a pressure is needed, in mTorr, Torr, Pa or mbar",
      "8:5 unknown key 'flow' in 'fill'; write flows",
    ]);
  });

  test('texts with an unquoted colon, each', () => {
    expect(faultsOf(recipeWith('remark: a: b', 'reason: c: d'))).toEqual([
      '8:13 a colon and a blank within a text; put the text in quotes',
      '9:13 a colon and a blank within a text; put the text in quotes',
    ]);
  });

  test('of many only the first, and how many more', () => {
    const faults = faultsOf(`regimen: site 1\nname: marsh\n${'name: marsh\n'.repeat(100)}`);
    expect(faults).toHaveLength(MOST_FAULTS + 1);
    expect(faults.at(-1)).toBe('23:1 80 more faults in this file; correct those above first');
  });
});

describe('a text is refused before it can do harm', () => {
  test.each([
    ['40,000 times the same key', `regimen: site 1\n${'a: 1\n'.repeat(40_000)}`],
    [
      '20,000 keys twice',
      `regimen: site 1\n${Array.from({ length: 20_000 }, (_, n) => `k${n}: 1\n`)
        .join('')
        .repeat(2)}`,
    ],
    ['20,000 unknown keys', `regimen: site 1\n${Array.from({ length: 20_000 }, (_, n) => `k${n}: 1\n`).join('')}`],
    ['200,000 brackets', `regimen: site 1\nx: ${'['.repeat(200_000)}`],
    ['200,000 braces', `{regimen: site 1, x: ${'{'.repeat(200_000)}`],
    ['100,000 lists in lists', '- '.repeat(100_000)],
    ['100,000 explicit keys', '? '.repeat(100_000)],
    ['600 maps in maps', Array.from({ length: 600 }, (_, n) => `${' '.repeat(n)}a:`).join('\n')],
    ['aliases that grow tenfold nine times', aliasBomb()],
    ['a value of 200,000 digits', `regimen: site 1\nname: ${'1'.repeat(200_000)}`],
    ['a physical value of 200,000 digits', recipeWith(`pressure: ${'1'.repeat(200_000)} mTorr`)],
    ['a quote that runs to the end', `regimen: site 1\nname: "${"x''\\\"".repeat(50_000)}`],
  ])('%s', (_name, text) => {
    const start = performance.now();
    expect(readDocument(new Source('trial.yaml', text)).value).toBeUndefined();
    expect(performance.now() - start).toBeLessThan(10_000);
  });

  test('no key reaches the prototype of the content or of any other object', () => {
    readDocument(new Source('trial.yaml', recipeWith('__proto__: { polluted: yes }', 'flows: { __proto__: 4 sccm }')));
    expect(Object.hasOwn(Object.prototype, 'polluted')).toBe(false);
    const { value } = readDocument(new Source('trial.yaml', recipeWith('flows: { Ar: 4 sccm }')));
    expect(value !== undefined && 'toString' in value.content).toBe(false);
  });

  test('a line named like a member of every object is a key like any other', () => {
    const { value } = readDocument(new Source('trial.yaml', recipeWith('flows: { constructor: 4 sccm }')));
    const step = value?.sort === 'recipe' ? value.content.steps[0] : undefined;
    expect(step !== undefined && 'flows' in step ? Object.keys(step.flows ?? {}) : []).toEqual(['constructor']);
  });
});

function aliasBomb(): string {
  const rows = ['regimen: site 1', 'a0: &a0 [x, x, x, x, x, x, x, x, x, x]'];
  for (let n = 1; n < 10; n += 1)
    rows.push(
      `a${n}: &a${n} [${Array(10)
        .fill(`*a${n - 1}`)
        .join(', ')}]`,
    );
  return rows.join('\n');
}
