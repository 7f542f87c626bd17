import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Given } from '../../src/steps/given.ts';
import { Givens } from '../../src/steps/givens.ts';

const origin = { default: 'test', because: 'test' };
const given = (address: string, value: number): Given => ({
  address,
  value,
  uncertainty: 0,
  dimension: 'number',
  unit: '',
  origin,
});

const address = fc.constantFrom('a', 'b', 'c', 'd');
const move = fc.record({ address, value: fc.option(fc.integer()) });
const moves = fc.array(move, { maxLength: 12 });

function apply(to: Givens | Map<string, number>, list: readonly { address: string; value: number | null }[]): void {
  for (const { address: name, value } of list) {
    if (value === null) to.delete(name);
    else if (to instanceof Givens) to.set(given(name, value));
    else to.set(name, value);
  }
}

describe('layered givens', () => {
  test('hold what one map would, whatever is set and dropped at whichever layer', () => {
    fc.assert(
      fc.property(moves, moves, (below, above) => {
        const plain = new Map<string, number>();
        apply(plain, below);
        apply(plain, above);
        const lower = new Givens();
        apply(lower, below);
        const upper = new Givens(lower.flattened());
        apply(upper, above);
        const sorted = (entries: Iterable<[string, number]>) => [...entries].sort(([a], [b]) => (a < b ? -1 : 1));
        const values = [...upper].map(([name, one]): [string, number] => [name, one.value]);
        expect(sorted(values)).toEqual(sorted(plain));
        expect(upper.size).toBe(plain.size);
        expect([...upper.flattened().keys()].sort()).toEqual([...plain.keys()].sort());
        for (const name of ['a', 'b', 'c', 'd']) {
          expect(upper.get(name)?.value).toBe(plain.get(name));
          expect(upper.has(name)).toBe(plain.has(name));
        }
      }),
    );
  });

  test('leave the layer below as it was', () => {
    const lower = new Givens();
    lower.set(given('pressure', 1));
    const upper = new Givens(lower.flattened());
    upper.set(given('pressure', 2));
    upper.delete('pressure');
    expect(lower.get('pressure')?.value).toBe(1);
    expect(upper.get('pressure')).toBeUndefined();
  });
});
