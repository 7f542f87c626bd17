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

/** What makes a claim one that can be looked up or judged. */
const SOURCED: readonly RegExp[] = [
  // Author, body or title, and further on a year: not 1800 K.
  /\p{Lu}.*\b(18|19|20)\d\d\b(?! K)/u,
  /common practice|from memory|not recorded/,
  // Follows from what the substance is.
  /by symmetry|^monatomic: 5\/2 R$|^sum over .* by mole fraction$/,
  // Of an accuracy: what it was held against, or that there was nothing.
  /\bheld against\b|to hold (it|the monomer) against|: likewise$|^diffusion likewise$|^diffusion: as \w+$/,
];
const COLLECTIONS = /CRC Handbook|SRD \d+|Pocket Guide|Perry's|VDI Heat Atlas/;
const EDITION = /\b(18|19|20)\d\d\b(?! K)|\d+th ed\.|web edition|not recorded/;

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

  test('sources name a publication with its year, a practice, a memory, a reason, or say what was not recorded', () => {
    expect(claims(entries).filter((claim) => !SOURCED.some((told) => told.test(claim)))).toEqual([]);
  });

  test('no handbook is named without its edition, no data collection without its year or release', () => {
    const bare = allSources(entries).filter((source) => COLLECTIONS.test(source) && !EDITION.test(source));
    expect(bare).toEqual([]);
  });

  test('no value is told twice with different sources: keys are unique', () => {
    expect(new Set(entries.map(([name]) => name)).size).toBe(entries.length);
  });
});

function hasSource(value: unknown): boolean {
  return isBlock(value) && typeof value.source === 'string' && value.source.length > 3;
}

/** Sources, that of an accuracy in its two parts: viscosity and diffusion. */
function claims(value: unknown): readonly string[] {
  return allSources(value).flatMap((source) => source.split(/; (?=diffusion)/));
}

function allSources(value: unknown): readonly string[] {
  if (Array.isArray(value)) return value.flatMap(allSources);
  if (!isBlock(value)) return [];
  return Object.entries(value).flatMap(([key, inner]) => (key === 'source' ? [String(inner)] : allSources(inner)));
}
