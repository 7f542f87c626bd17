import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { forbiddenCharacters } from '../../src/documents/characters.ts';
import { readOrdinary } from '../../src/documents/ordinary.ts';
import { readYaml } from '../../src/documents/syntax.ts';
import { Source } from '../../src/shelf/place.ts';
import { recipeText } from '../bench/fleet.ts';
import { chamberWith, recipeWith } from './trial-documents.ts';
import { WRONG_FILES } from './wrong-files.ts';
import { WRONG_STRUCTURE } from './wrong-structure.ts';
import { WRONG_SYNTAX } from './wrong-syntax.ts';
import { WRONG_VALUES } from './wrong-values.ts';

/** Whether a text is read as ordinary; if so, YAML's own reader must make the same nodes of it, and find no fault. */
function agrees(text: string): boolean {
  const source = new Source('any.yaml', text);
  // Neither reader is given such a text.
  if (text.startsWith('\uFEFF') || forbiddenCharacters(source).length > 0) return false;
  const ordinary = readOrdinary(text);
  if (ordinary !== undefined) expect(readYaml(source)).toStrictEqual({ value: ordinary, faults: [] });
  return ordinary !== undefined;
}

const DEMO = readdirSync('recipes', { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.yaml'))
  .sort()
  .map((name) => readFileSync(join('recipes', name), 'utf8'));

const WRONG = [...WRONG_FILES, ...WRONG_SYNTAX, ...WRONG_VALUES, ...WRONG_STRUCTURE].map(({ text }) => text);

/** Lines that are ordinary by themselves; whether their order is, is for both readers to say. */
const LINES = [
  ...['a:', 'b: x', 'c: 4 mTorr # c', ' c:', ' d: y', '  g:', '  h: "q"', '   i: 1', '# c', '  # c', '', ' '],
  ...['- e', '- f: 1', ' - h', '  - k: 2', '- l:', '    m: ~', ' {n: o}', '  [p]', ' w', "   'v'", '- {}', 'r: {s: 1,'],
];

const lines = fc
  .tuple(fc.constantFrom('\n', '\n', '\r\n'), fc.array(fc.constantFrom(...LINES), { maxLength: 8 }))
  .map(([end, parts]) => ['a:', ...parts].join(end));

/** Parts of texts, parted by `¦`, with `$` for the end of a line: ordinary ones, nearly so, and anything but. */
const PIECES = [
  'a: ¦b:¦a.b-c: ¦name:$¦7: ¦null: ¦- ¦- a: ¦? ¦$- ¦$  - ¦$    - ¦$¦$  ¦$    ¦$     ¦ ¦  ¦$$¦ $¦\t¦\r$¦$# c$¦$   # c$',
  '{ ¦ }¦{¦}¦[¦]¦, ¦,¦,$¦,$    ¦{}¦[]¦{ a: 1 }¦[x, y]¦$  { a: b,$    c: d,$  }¦{ a: "q", b: [1, x] }¦# c¦ # c',
  '4 mTorr¦text¦-1¦-¦+4¦4¦0x1F¦0o17¦017¦1e400¦.5¦5.¦1e3¦.inf¦-.INF¦.nan¦1_000¦true¦False¦null¦~¦Null¦yes¦2027-06-30',
  '12:30¦a:b¦a b: c¦x#y¦x #y¦z:¦"q"¦\'q\'¦"¦\'¦""¦"a\\n"¦"a: #"¦\'it\'\'s\'¦"k": ¦|$  x¦>¦&a ¦*a¦!t ¦%¦@¦`¦<<: ¦---$¦...$',
  '__proto__: ¦\u00a0¦ü¦µ: ¦\ud800¦\u{1F9EA}¦\u3000¦=¦<¦(¦\\¦.¦_¦+',
].flatMap((row) => row.replaceAll('$', '\n').split('¦'));

const pieces = fc.array(fc.constantFrom(...PIECES), { maxLength: 7 }).map((parts) => ['a: ', ...parts].join(''));

/** A sound or a wrong document with something else at one or two places. */
const changed = fc
  .tuple(
    fc.constantFrom(...DEMO, ...WRONG, recipeText(3), recipeWith('flows: { Ar: 4 sccm }'), chamberWith()),
    fc.array(fc.tuple(fc.nat(), fc.nat({ max: 3 }), fc.constantFrom('', ...PIECES)), { minLength: 1, maxLength: 2 }),
  )
  .map(([text, changes]) =>
    changes.reduce((before, [at, width, piece]) => {
      const start = at % (before.length + 1);
      return before.slice(0, start) + piece + before.slice(start + width);
    }, text),
  );

describe('a text that is read as ordinary has the nodes that YAML gives it, each at its place', () => {
  test.each([
    ['lines in any order', lines, 10_000],
    ['parts in any order', pieces, 5000],
    ['sound and wrong documents with a few changes', changed, 1500],
  ])('%s', (_name, texts, numRuns) => {
    let ordinary = 0;
    const property = fc.property(texts, (text) => {
      if (agrees(text)) ordinary += 1;
    });
    fc.assert(property, { numRuns });
    // Enough of them are ordinary for this to tell something.
    expect(ordinary).toBeGreaterThan(numRuns / 50);
  });

  test('the tables of wrong documents', () => {
    expect(WRONG.filter(agrees).length).toBeGreaterThan(30);
  });
});

describe('ordinary is', () => {
  test('every document of the demo line, and what is measured', () => {
    expect([...DEMO, recipeText(1)].map(agrees)).not.toContain(false);
  });

  test.each([
    ['comments and blank lines anywhere', '# c\n\na: # c\n# c\n  - b # c\n\n    # c\n  - c: d\n# c'],
    ['a list as far left as its key', 'a:\n- b: 1\n  c: 2\n- d\ne: 3\n'],
    ['braces over several lines, with a comma before the last', 'a:\n  {\n    b: 1,\n    c: [d, "e"],\n  }\nf: 2\n'],
    ['keys without a value', 'a:\nb:\n  c:\n  d:\ne: 1'],
    ['numbers, words and texts', "a: 1e3\nb: true\nc: ~\nd: '1'\ne: it's 5 # c\nf: x#y:z\ng: -.5 nm\nh: 2027-06-30\n"],
    ['either line end', 'a:\r\n  - b: c # d\r\n\r\n    e: { f: g,\r\n      h: 1 }\r\n# i\r\n  - "j"\r\n'],
    ['letters of any script', 'title: Übergang µ \u{1F9EA}\n'],
  ])('%s', (_name, text) => {
    expect(agrees(text)).toBe(true);
  });

  test.each([
    ['a text of several lines', 'a: b\n  c\n'],
    ['a text below its key', 'a:\n\n# c\n  b\nc:\n'],
    ['a block of text', 'a: |\n  b\n'],
    ['an escape', 'a: "b\\t"\n'],
    ['a tab', 'a:\tb\n'],
    ['an anchor', 'a: &b c\n'],
    ['a number of another base', 'a: 0x10\n'],
    ['a mark of a document', '---\na: b\n'],
    ['a closing brace as far left as its key', 'a: {\n  b: c\n}\n'],
    ['a list at the top', '- a\n'],
    ['33 lists in lists', `a: ${'['.repeat(33)}${']'.repeat(33)}`],
    ['nothing', ''],
  ])('not %s', (_name, text) => {
    expect(readOrdinary(text)).toBeUndefined();
  });
});
