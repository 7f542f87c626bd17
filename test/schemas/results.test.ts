import { describe, expect, test } from 'vitest';
import { isMap } from '../../src/generate/schemas.ts';
import { SCHEMAS, isList, validator } from './schema-files.ts';
import type { Json, JsonMap } from '../../src/generate/schemas.ts';

/** The whole example that a result's schema carries. */
function example(file: string): JsonMap {
  const examples = SCHEMAS.get(file)?.examples;
  const first: Json | undefined = isList(examples) ? examples[0] : undefined;
  if (!isMap(first)) throw new Error(`${file} has no example`);
  return first;
}

/** Rules that a value breaks at a place of the schema of `check`. */
function broken(definition: string, value: unknown): string[] {
  const validate = validator('check.json', `/$defs/${definition}`);
  validate(value);
  return (validate.errors ?? [])
    .filter(({ keyword }) => keyword !== 'if')
    .map(({ instancePath, keyword }) => `${instancePath} ${keyword}`);
}

describe('results as JSON', () => {
  test('a result of another format is refused', () => {
    expect(validator('check.json')({ ...example('check.json'), format: 2 })).toBe(false);
    expect(validator('gas.json')({ ...example('gas.json'), format: 2 })).toBe(false);
  });

  test('a number is known, missing or inapplicable, and never two of them', () => {
    expect(broken('quantity', { id: 'knudsen', unit: '1', value: 0.1, uncertainty: 0 })).toEqual([]);
    expect(broken('quantity', { id: 'knudsen', missing: ['pressure'] })).toEqual([]);
    expect(broken('quantity', { id: 'knudsen', inapplicable: 'no gas flows' })).toEqual([]);
    expect(broken('quantity', { id: 'knudsen', missing: [] })).toEqual(['/missing minItems']);
    expect(broken('quantity', { id: 'knudsen', missing: ['pressure'], inapplicable: 'x' })).toEqual([
      ' additionalProperties',
    ]);
    expect(broken('quantity', { id: 'knudsen', unit: '1', value: 0.1 })).toEqual([' required']);
  });

  test('a number that no JSON can hold has become null, and is refused', () => {
    const text = JSON.stringify({ id: 'knudsen', unit: '1', value: Number.POSITIVE_INFINITY, uncertainty: Number.NaN });
    const value: unknown = JSON.parse(text);
    expect(broken('quantity', value)).toEqual(['/value type', '/uncertainty type']);
  });

  test('a given says where it is from: a place, or a default and why', () => {
    const given = { address: 'pressure', value: 1, unit: 'Pa', uncertainty: 0 };
    expect(broken('given', { ...given, origin: { file: 'r.yaml', line: 1, column: 1 } })).toEqual([]);
    expect(broken('given', { ...given, origin: { default: 'chamber', because: 'none stated' } })).toEqual([]);
    expect(broken('given', { ...given, origin: { default: 'chamber' } })).toEqual(['/origin required']);
    expect(broken('given', { ...given, origin: { file: 'r.yaml', line: 0, column: 1 } })).toEqual([
      '/origin/line minimum',
    ]);
  });

  test('a cure has a value and what it breaks, or the reason why there is none', () => {
    expect(broken('cure', { address: 'pressure', value: 1, unit: 'Pa', breaks: [] })).toEqual([]);
    expect(broken('cure', { address: 'pressure', none: 'out of reach' })).toEqual([]);
    expect(broken('cure', { address: 'pressure', none: 'out of reach', value: 1 })).toEqual([' additionalProperties']);
  });
});
