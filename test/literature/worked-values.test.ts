import { describe, expect, test } from 'vitest';
import { LAWS } from './laws.ts';
import { Inputs, rowFiles, rowsOf, type Row } from './rows.ts';
import { si } from './units.ts';

/** Rows that the program means to answer differently: what it says instead, and why. */
const EXPLAINED: Readonly<Record<string, { says: string | number; because: string }>> = {};

const rows = rowFiles().flatMap(rowsOf);

describe.each(rowFiles())('%s', (file) => {
  test.each(rowsOf(file))('$id $states', (row) => {
    const law = LAWS[row.id];
    if (law === undefined) throw new Error('no law for this row');
    expectRow(row, law(new Inputs(row)));
  });
});

test('every law named has its row, every row its source, and each id stands once', () => {
  expect(Object.keys(LAWS).sort()).toEqual(rows.map(({ id }) => id).sort());
  expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
  expect(rows.filter(({ source }) => source.trim() === '')).toEqual([]);
  expect(rows.length).toBe(88);
});

function expectRow({ id, expected, within }: Row, actual: number | string | undefined): void {
  const explained = EXPLAINED[id];
  if (within === undefined) {
    expect(actual).toBe(explained?.says ?? expected);
  } else {
    const deviation = Number(actual) / si(expected) - 1;
    expect(Math.abs(deviation), `${actual} against ${expected}`).toBeLessThanOrEqual(within);
  }
}
