import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import * as validators from '../../src/documents/generated/validators.js';
import { PLAN, ROOTS } from '../../src/documents/generated/plan.ts';
import { SORTS } from '../../src/documents/sort.ts';

describe('what is made from the schemas', () => {
  test('has a validator and a plan of measures for every sort of document', () => {
    for (const sort of SORTS) {
      expect(validators[sort]({})).toBe(false);
      expect(PLAN[ROOTS[sort]]).toBeDefined();
    }
  });

  test('loads nothing: neither a require nor an import is left in the validators', () => {
    const code = readFileSync('src/documents/generated/validators.js', 'utf8');
    expect(code).not.toMatch(/\brequire\s*\(/);
    expect(code).not.toMatch(/\bimport\b/);
  });

  test('leads from every node of the plan to nodes that exist', () => {
    for (const { keys = {}, rest = 0, items = 0 } of PLAN) {
      for (const index of [...Object.values(keys), rest, items]) expect(PLAN[index]).toBeDefined();
    }
  });
});
