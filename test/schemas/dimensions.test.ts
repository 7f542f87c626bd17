import { describe, expect, test } from 'vitest';
import { isMap } from '../../src/generate/schemas.ts';
import { readAccuracy } from '../../src/units/accuracy.ts';
import { isDimension } from '../../src/units/dimensions.ts';
import { isUnitFault, readMeasure } from '../../src/units/read.ts';
import { SCHEMAS, isList } from './schema-files.ts';
import { schemaNodes } from './schema-walk.ts';
import type { Dimension } from '../../src/units/dimensions.ts';
import type { Json, JsonMap } from '../../src/generate/schemas.ts';

const NODES = schemaNodes();
const FORMS = ['value', 'tolerance', 'ramp', 'range', 'unknown', 'none', 'rest', 'late', 'open', 'closed'];
const SPAN_KEYS = ['from', 'to', 'usually', 'at_least', 'at_most'];

describe('physical values', () => {
  test('every dimension is one that units know, and every form one that the reader knows', () => {
    for (const { file, pointer, node } of NODES) {
      for (const dimension of list(node.dimension)) {
        expect(dimension === 'accuracy' || isDimension(dimension), `${file}#${pointer}: ${dimension}`).toBe(true);
      }
      for (const form of list(node.forms)) expect(FORMS, `${file}#${pointer}`).toContain(form);
    }
  });

  test('every value with a dimension says its forms', () => {
    expect(NODES.filter(({ node }) => node.dimension !== undefined && list(node.forms).length === 0)).toEqual([]);
  });

  test('every example is read in the dimension of its key', () => {
    const seen: string[] = [];
    for (const { node } of NODES) {
      const physical = physicalOf(node);
      if (physical === undefined || !isList(node.examples)) continue;
      const dimensions = list(physical.dimension);
      for (const value of node.examples.flatMap(written)) {
        if (list(physical.forms).includes(String(value))) continue;
        expect(readable(value, dimensions), `${JSON.stringify(value)} as ${dimensions.join(' or ')}`).toBe(true);
        seen.push(String(value));
      }
    }
    expect(seen.length).toBeGreaterThan(100);
  });
});

/** The node of `common.json` behind a key that says which dimension stands there. */
function physicalOf(node: JsonMap): JsonMap | undefined {
  if (node.dimension !== undefined) return node;
  const name = typeof node.$ref === 'string' ? node.$ref.replace('common.json#/$defs/', '') : undefined;
  const defs = SCHEMAS.get('common.json')?.$defs;
  const target = name !== undefined && isMap(defs) ? defs[name] : undefined;
  return isMap(target) && target.dimension !== undefined ? target : undefined;
}

/** Texts and numbers of an example: itself, or the ends of a ramp or range. */
function written(example: Json): (string | number)[] {
  if (typeof example === 'string' || typeof example === 'number') return [example];
  if (!isMap(example)) return [];
  return SPAN_KEYS.flatMap((key) => written(example[key] ?? null));
}

function readable(value: string | number, dimensions: readonly string[]): boolean {
  const known = dimensions.filter(isDimension);
  if (dimensions.includes('accuracy')) return known.some((dimension) => !isUnitFault(readAccuracy(value, dimension)));
  return known.some((dimension: Dimension) => !isUnitFault(readMeasure(value, dimension, { tolerance: true })));
}

function list(value: Json | undefined): string[] {
  if (typeof value === 'string') return [value];
  return isList(value) ? value.map(String) : [];
}
