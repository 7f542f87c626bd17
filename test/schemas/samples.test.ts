import { describe, expect, test } from 'vitest';
import { DOCUMENT_SORTS, SAMPLE_NAMES, faults, sample, sortOf } from './schema-files.ts';
import { keysUsed, schemaNodes } from './schema-walk.ts';

describe('documents as a site writes them', () => {
  test.each(SAMPLE_NAMES)('%s is valid', (name) => {
    expect(faults(sample(name))).toEqual([]);
  });

  test('the samples use every key that a document may have', () => {
    const used = new Set<string>();
    for (const document of SAMPLE_NAMES.map(sample)) {
      for (const key of keysUsed(`${sortOf(document)}.json`, document)) used.add(key);
    }
    const files = new Set(['common.json', ...DOCUMENT_SORTS.map((sort) => `${sort}.json`)]);
    const keys = schemaNodes().filter(({ file, role }) => role === 'key' && files.has(file));
    expect(keys.length).toBeGreaterThan(200);
    expect(keys.map(({ file, pointer }) => `${file}#${pointer}`).filter((key) => !used.has(key))).toEqual([]);
  });
});
