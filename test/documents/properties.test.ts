import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { parse } from 'yaml';
import { describe, expect, test } from 'vitest';
import { readDocument } from '../../src/documents/read.ts';
import { sortOf } from '../../src/documents/sort.ts';
import { Source } from '../../src/shelf/place.ts';

const KEYS = [
  'regimen',
  'name',
  'chamber',
  'steps',
  'process',
  'time',
  'pressure',
  'flows',
  'Ar',
  'repeat',
  'throughout',
  'wafer',
];
const WORDS = [
  'recipe 1',
  'chamber 1',
  'site 1',
  'settle',
  '4 mTorr',
  '1,5 sccm',
  '12 s',
  'unknown',
  'none',
  '0x10',
  '.inf',
  '1e400',
  'a: b',
];
const MARKS = [
  ': ',
  ':',
  '- ',
  '? ',
  '\n',
  '\n  ',
  '\n    ',
  '\t',
  '{',
  '}',
  '[',
  ']',
  ', ',
  '#',
  ' #',
  '"',
  "'",
  '|',
  '>',
  '&a ',
  '*a',
  '!',
  '%',
];
const ODD = [
  '---\n',
  '...\n',
  '<<',
  '\uFEFF',
  '\u00a0',
  '\0',
  '\r',
  '\u2028',
  '\ud800',
  '__proto__',
  '\\',
  '@',
  '`',
  '~',
  'null',
  'true',
];

const yamlLike = fc
  .array(
    fc.oneof(fc.constantFrom(...KEYS), fc.constantFrom(...WORDS), fc.constantFrom(...MARKS), fc.constantFrom(...ODD)),
    { maxLength: 60 },
  )
  .map((parts) => parts.join(''));

const TIMES = ['12 s', '0.5 min', '10 s +/- 0.1 s', '250 ms'];
const PRESSURES = ['4 mTorr', '1 Pa +/- 1 %', '"4 Torr"', 'unknown'];
const FLOWS = ['5 sccm', '0.1 slm', '7 sccm +/- 2 %', '3 umol'];
const WRONG = ['3', 'none', '-1 s', '[1]', '', 'true', '{}', '4 furlong'];

const recipe = fc
  .record({
    time: value(TIMES),
    pressure: value(PRESSURES),
    flow: value(FLOWS),
    extra: fc.option(fc.constantFrom(...KEYS), { freq: 2 }),
    repeat: fc.integer({ min: -1, max: 300 }),
  })
  .map(({ time, pressure, flow, extra, repeat }) =>
    [
      'regimen: recipe 1',
      'name: trial',
      'chamber: curlew',
      'steps:',
      `  - { name: a, process: settle, time: ${time}, pressure: ${pressure}, flows: { Ar: ${flow} } }`,
      `  - { name: b, repeat: ${repeat}, steps: [{ name: c, process: purge }]${extra === null ? '' : `, ${extra}: 4 mTorr`} }`,
    ].join('\n'),
  );

/** Mostly one of the right values, or a span of two of them. */
function value(right: readonly string[]): fc.Arbitrary<string> {
  const single = fc.constantFrom(...right);
  const pair = fc.tuple(single, single);
  return fc.oneof(
    { weight: 8, arbitrary: single },
    { weight: 2, arbitrary: pair.map(([from, to]) => `{ from: ${from}, to: ${to} }`) },
    { weight: 2, arbitrary: pair.map(([least, most]) => `{ at_least: ${least}, at_most: ${most} }`) },
    { weight: 1, arbitrary: fc.constantFrom(...WRONG) },
  );
}

function schemaOf(name: string): object {
  const schema: unknown = JSON.parse(readFileSync(`schemas/${name}.json`, 'utf8'));
  return typeof schema === 'object' && schema !== null ? schema : {};
}

describe('whatever the text', () => {
  test('reading it ends, does not throw, and gives a document or faults within the text', () => {
    fc.assert(
      fc.property(
        fc.oneof(
          yamlLike,
          yamlLike.map((text) => `regimen: recipe 1\n${text}`),
          fc.string({ unit: 'binary', maxLength: 200 }),
        ),
        (text) => {
          const start = performance.now();
          const { value: document, faults } = readDocument(new Source('any.yaml', text));
          expect(performance.now() - start).toBeLessThan(1000);
          expect(document === undefined).toBe(faults.length > 0);
          const lines = text.split('\n');
          for (const { place, found, right } of faults) {
            expect(place.line).toBeGreaterThanOrEqual(1);
            expect(place.line).toBeLessThanOrEqual(lines.length);
            expect(place.column).toBeGreaterThanOrEqual(1);
            expect(place.column).toBeLessThanOrEqual((lines[place.line - 1] ?? '').length + 1);
            expect(found.length * right.length).toBeGreaterThan(0);
          }
        },
      ),
      { numRuns: 1500 },
    );
  });

  test('a document that reads is one whose first key told so', () => {
    fc.assert(
      fc.property(
        fc.oneof(
          recipe,
          yamlLike.map((text) => `regimen: site 1\nname: a\n${text}`),
        ),
        (text) => {
          const { value: document } = readDocument(new Source('any.yaml', text));
          if (document !== undefined) expect(sortOf(text)).toBe(document.sort);
        },
      ),
      { numRuns: 500 },
    );
  });

  test('a recipe that reads meets the whole published schema', () => {
    const ajv = new Ajv2020({ strict: false });
    for (const name of ['common', 'recipe']) ajv.addSchema(schemaOf(name));
    const meets = ajv.getSchema('recipe.json');
    let read = 0;
    fc.assert(
      fc.property(recipe, (text) => {
        if (readDocument(new Source('any.yaml', text)).value === undefined) return;
        read += 1;
        expect(meets?.(parse(text))).toBe(true);
      }),
      { numRuns: 1000 },
    );
    expect(read).toBeGreaterThan(100);
  });
});
