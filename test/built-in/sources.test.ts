import { describe, expect, test } from 'vitest';
import { isBlock, substances } from './documents.ts';

const FILES = ['gases', 'atoms', 'films'] as const;
/** Keys that are no values, or whose values the substance's own source covers. */
const COVERED = [
  'title',
  'formula',
  'molar_mass',
  'atomic_number',
  'hazards',
  'inert',
  'clings',
  'associates',
  'remarks',
  'source',
];

describe.each(FILES)('%s', (file) => {
  const entries = [...substances(file)];

  test.each(entries)('%s names a source for every value', (_, it) => {
    const unsourced = Object.entries(it)
      .filter(([key]) => !COVERED.includes(key) && key !== 'pairs')
      .filter(([, value]) => !hasSource(value));
    const pairs = isBlock(it.pairs) ? Object.entries(it.pairs).filter(([, pair]) => !hasSource(pair)) : [];
    expect([...unsourced, ...pairs].map(([key]) => key)).toEqual([]);
    expect(hasSource(it)).toBe(true);
  });

  test('sources tell a year, a memory, a rule or a practice', () => {
    const told =
      /\b(18|19|20)\d\d\b|SAND86|SRD \d+|from memory|common practice|by symmetry|5\/2 R|sum over|%|composition|equation of state|transport set|data set|data page|Pocket Guide/;
    expect(allSources(entries).filter((source) => !told.test(source))).toEqual([]);
  });

  test('no value is told twice with different sources: keys are unique', () => {
    expect(new Set(entries.map(([name]) => name)).size).toBe(entries.length);
  });
});

function hasSource(value: unknown): boolean {
  return isBlock(value) && typeof value.source === 'string' && value.source.length > 3;
}

function allSources(value: unknown): readonly string[] {
  if (Array.isArray(value)) return value.flatMap(allSources);
  if (!isBlock(value)) return [];
  return Object.entries(value).flatMap(([key, inner]) => (key === 'source' ? [String(inner)] : allSources(inner)));
}
