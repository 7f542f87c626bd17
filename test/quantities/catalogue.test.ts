import { describe, expect, test } from 'vitest';
import { assumedAddresses, assumedGiven } from '../../src/quantities/assumed.ts';
import { allQuantities, quantityNamed, TOPICS } from '../../src/quantities/catalogue.ts';
import { parseReference } from '../../src/quantities/reference.ts';
import { DIMENSIONS, isDimension } from '../../src/units/dimensions.ts';
import { unitsOf } from '../../src/units/lookup.ts';

describe('every number of the catalogue', () => {
  test('says what it is, by which law, with a symbol', () => {
    for (const { id, statement, source, symbol } of allQuantities()) {
      expect(statement, id).toMatch(/^[A-Z].*\.$/s);
      expect(source, id).not.toBe('');
      expect(symbol, id).not.toBe('');
    }
  });

  test('has a dimension whose SI unit the table of units knows', () => {
    for (const { id, dimension } of allQuantities()) {
      expect(isDimension(dimension), id).toBe(true);
      const { si } = DIMENSIONS[dimension];
      const spelled = unitsOf(dimension).some(({ name }) => name === si);
      expect(si === '1' || spelled, `${id}: ${si}`).toBe(true);
    }
  });

  test('has an id of its own, over all topics', () => {
    const exported = Object.values(TOPICS).flatMap((topic): readonly unknown[] => Object.values(topic));
    const ids = exported.flatMap((one) =>
      typeof one === 'object' && one !== null && 'id' in one && 'from' in one ? [one.id] : [],
    );
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids.length).toBe(allQuantities().length);
  });

  test('is named as a reference names it', () => {
    for (const { id } of allQuantities()) {
      expect(parseReference(id), id).toEqual({ id });
      expect(quantityNamed(id)?.id).toBe(id);
    }
  });
});

test('every value that the program assumes says why, and has a dimension', () => {
  for (const address of assumedAddresses()) {
    const given = assumedGiven(address);
    expect(given?.origin, address).toMatchObject({ default: 'assumed' });
    expect(given !== undefined && 'because' in given.origin && given.origin.because.length > 20, address).toBe(true);
    expect(given?.uncertainty, address).toBeGreaterThanOrEqual(0);
  }
});
