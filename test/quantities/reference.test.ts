import fc from 'fast-check';
import { expect, test } from 'vitest';
import { parseReference, referenceName } from '../../src/quantities/reference.ts';

test('a name of a number is read and spelled the same', () => {
  for (const name of [
    'knudsen.gap',
    'mean-free-path:SiH4',
    'diffusivity:SiH4/N2',
    'carry-over:O2@end',
    'knudsen.throw:target',
  ]) {
    const reference = parseReference(name);
    expect(reference, name).toBeDefined();
    if (reference !== undefined) expect(referenceName(reference)).toBe(name);
  }
});

test('what is no name of a number is not read', () => {
  for (const name of ['', 'Knudsen', 'knudsen..gap', 'knudsen.', 'a b', 'x@now', 'x'.repeat(300)]) {
    expect(parseReference(name), name).toBeUndefined();
  }
});

test('no text makes reading a name throw', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary', maxLength: 300 }), (text) => {
      parseReference(text);
    }),
  );
});
