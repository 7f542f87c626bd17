import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { wholeFile } from '../../src/shelf/fault.ts';
import { matches, reachesBelow, readPattern } from '../../src/shelf/patterns.ts';
import { pattern } from './temporary.ts';

describe('patterns', () => {
  test.each([
    ['chambers/*.yaml', 'chambers/stilt.yaml', true],
    ['chambers/*.yaml', 'chambers/old/stilt.yaml', false],
    ['chambers/*.yaml', 'chambers/stilt.yml', false],
    ['./chambers//*.yaml', 'chambers/.yaml', true],
    ['recipes/**', 'recipes/a/b/c.yaml', true],
    ['recipes/**', 'recipes-old/a.yaml', false],
    ['recipes/**/*.yaml', 'recipes/a.yaml', true],
    ['**/drafts/**', 'recipes/drafts/a.yaml', true],
    ['**/drafts/**', 'drafts/a.yaml', true],
    ['**', 'a/b', true],
    ['*', 'a/b', false],
    ['a/**/b/**/c', 'a/x/b/b/y/c', true],
    ['a/**/b/**/c', 'a/x/y/c', false],
    ['stilt-?.yaml', 'stilt-2.yaml', true],
    ['stilt-?.yaml', 'stilt-.yaml', false],
    ['a.yaml', 'axyaml', false],
    ['A.yaml', 'a.yaml', false],
    ['(a|b)+$.yaml', '(a|b)+$.yaml', true],
    ['*-*-?', 'a-b-c-d', true],
  ])('%s and %s: %s', (text, path, answer) => {
    expect(matches(pattern(text), path)).toBe(answer);
  });

  test.each([
    ['../chambers/*.yaml', "'../chambers/*.yaml' leads upwards"],
    ['chambers/../../x', "'chambers/../../x' leads upwards"],
    ['/etc/*', "'/etc/*' starts at the root"],
    ['', "'' is empty"],
    ['./', "'./' is empty"],
    ['a\\b.yaml', "'a\\b.yaml' has a backslash"],
    ['{a,b}.yaml', "'{a,b}.yaml' has '{'"],
    ['[ab].yaml', "'[ab].yaml' has '['"],
    ['!drafts', "'!drafts' has '!'"],
    ['recipes/**.yaml', "'recipes/**.yaml' has ** within '**.yaml'"],
    ['x'.repeat(2000), 'is too long'],
  ])('%s is refused', (text, found) => {
    const { value, faults } = readPattern(text, wholeFile('regimen.yaml'));
    expect(value).toBeUndefined();
    expect(faults[0]?.found).toContain(found);
  });

  test('a pattern made for regular expressions to choke on is answered at once', () => {
    const names = pattern(`${'*a'.repeat(400)}b`);
    const folders = pattern(`${'**/a/'.repeat(150)}b`);
    const start = performance.now();
    expect(matches(names, 'a'.repeat(5000))).toBe(false);
    expect(matches(folders, 'a/'.repeat(2000))).toBe(false);
    expect(performance.now() - start).toBeLessThan(500);
  });

  const parts = fc.array(fc.constantFrom('a', 'b', '*', '**', 'a?', '*b'), { minLength: 1, maxLength: 5 });
  const names = fc.array(fc.constantFrom('a', 'b', 'ab', 'bb'), { minLength: 1, maxLength: 5 });

  test('they mean what the matching expression means', () => {
    fc.assert(
      fc.property(parts, names, (row, path) => {
        const expression = new RegExp(`^${row.map(expressionOf).join('')}$`);
        expect(matches(pattern(row.join('/')), path.join('/'))).toBe(expression.test(`${path.join('/')}/`));
      }),
      { numRuns: 2000 },
    );
  });

  test('a pattern that meets a path reaches below each of its folders', () => {
    fc.assert(
      fc.property(parts, names, (row, path) => {
        const made = pattern(row.join('/'));
        fc.pre(matches(made, path.join('/')));
        const folders = path.slice(0, -1).map((_, last) => path.slice(0, last + 1).join('/'));
        expect(['.', ...folders].every((folder) => reachesBelow(made, folder))).toBe(true);
      }),
    );
  });

  test('a pattern of fixed depth reaches no further', () => {
    const chambers = pattern('chambers/*.yaml');
    expect(
      ['.', 'chambers', 'recipes', 'chambers/a.yaml', 'chambers/old'].map((at) => reachesBelow(chambers, at)),
    ).toEqual([true, true, false, false, false]);
  });
});

/** The part, with its slash, as a regular expression. */
function expressionOf(part: string): string {
  if (part === '**') return '(?:[^/]+/)*';
  return `${part.replace('*', '[^/]*').replace('?', '[^/]')}/`;
}
