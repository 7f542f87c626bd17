import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { diskShelf } from '../../src/shelf/disk.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { overlay } from '../../src/shelf/overlay.ts';
import { temporaryFolder, write } from './temporary.ts';
import type { Shelf } from '../../src/shelf/shelf.ts';

const name = fc.constantFrom('a', 'b', 'c.yaml', 'd.yml', 'e f', 'ü', '"', 'n\nl');
const path = fc.array(name, { minLength: 1, maxLength: 4 }).map((names) => names.join('/'));
const texts = fc.dictionary(path, fc.string({ unit: fc.constantFrom('a', 'µ', '\n', '🐦') }));

/** Every text that listing leads to, with what reading says. */
function everything(shelf: Shelf, folder: string): Map<string, string | undefined> {
  const found = new Map<string, string | undefined>();
  for (const entry of shelf.list(folder).value ?? []) {
    const at = folder === '.' ? entry.name : `${folder}/${entry.name}`;
    expect(shelf.kind(at)).toBe(entry.kind);
    expect(shelf.real(at)).toBe(at);
    if (entry.kind === 'folder') for (const [below, text] of everything(shelf, at)) found.set(below, text);
    else found.set(at, shelf.read(at).value?.text);
  }
  return found;
}

function withoutConflicts(files: Record<string, string>): Map<string, string> {
  const all = Object.entries(files);
  return new Map(all.filter(([one]) => !all.some(([other]) => one.startsWith(`${other}/`))));
}

describe('a shelf over a Map', () => {
  const shelf = mapShelf(
    new Map([
      ['site/regimen.yaml', 'site'],
      ['site/recipes/a.yaml', '\uFEFFa'],
      ['/top/b', 'b'],
    ]),
  );

  test('folders are those that the paths imply', () => {
    expect(shelf.list('.').value).toEqual([{ name: 'site', kind: 'folder' }]);
    expect(shelf.list('./site//').value).toEqual([
      { name: 'recipes', kind: 'folder' },
      { name: 'regimen.yaml', kind: 'file' },
    ]);
    expect(shelf.list('/').value).toEqual([{ name: 'top', kind: 'folder' }]);
    expect(mapShelf(new Map()).list('.').value).toEqual([]);
  });

  test('texts are read by any spelling of their path, without a byte order mark', () => {
    expect(shelf.read('site/../site/./recipes/a.yaml', 'a').value).toMatchObject({ text: 'a', file: 'a' });
  });

  test('a folder, an absent file and a misspelt one are faults', () => {
    expect(shelf.read('site').faults[0]?.found).toBe('a folder');
    expect(shelf.read('site/recipes/b.yml').faults[0]?.found).toBe("nothing named 'b.yml' there");
    expect(shelf.read('site/regimne.yaml').faults[0]?.right).toBe("'regimen.yaml' is there; check the name");
    expect(shelf.list('site/regimen.yaml').faults[0]?.found).toBe('a file');
    expect(shelf.list('elsewhere').faults[0]?.found).toBe('no such folder');
  });

  test('the rules for texts hold as on disk', () => {
    const odd = mapShelf(
      new Map([
        ['nul', 'a\n\0'],
        ['long', 'µ'.repeat(2 ** 19 + 1)],
        ['full', 'µ'.repeat(2 ** 19)],
      ]),
    );
    expect(odd.read('nul').faults[0]).toMatchObject({ found: 'a NUL character', place: { line: 2, column: 1 } });
    expect(odd.read('long').faults[0]?.right).toBe('at most 1 MiB; split the document');
    expect(odd.read('full').value?.text).toHaveLength(2 ** 19);
  });

  test('listing leads to every text and to nothing else', () => {
    fc.assert(
      fc.property(texts, (files) => {
        const found = everything(mapShelf(new Map(Object.entries(files))), '.');
        expect(new Map([...found].sort())).toEqual(new Map([...withoutConflicts(files)].sort()));
      }),
    );
  });

  test('it agrees with the same files on disk', () => {
    fc.assert(
      fc.property(texts, (files) => {
        const folder = temporaryFolder();
        const plain = withoutConflicts(files);
        write(folder, Object.fromEntries(plain));
        const below = new Map([...plain].map(([at, text]) => [`${folder}/${at}`, text]));
        expect(everything(mapShelf(below), folder)).toEqual(everything(diskShelf(), folder));
      }),
      { numRuns: 30 },
    );
  });
});

describe('texts laid over a shelf', () => {
  test('laid over a Map they make the Map with them put in', () => {
    fc.assert(
      fc.property(texts, texts, (lower, upper) => {
        const plain = withoutConflicts({ ...lower, ...upper });
        const below = new Map(Object.entries(lower).filter(([at]) => plain.has(at)));
        const above = new Map(Object.entries(upper).filter(([at]) => plain.has(at)));
        const both = everything(overlay(mapShelf(below), above), '.');
        expect(both).toEqual(everything(mapShelf(plain), '.'));
      }),
    );
  });

  test('standard input stands among the files under its name, also in a folder that is not there', () => {
    const folder = temporaryFolder();
    write(folder, { 'recipes/a.yaml': 'on disk' });
    const shelf = overlay(
      diskShelf(),
      new Map([
        [`${folder}/recipes/b.yaml`, 'in'],
        [`${folder}/new/c.yaml`, 'new'],
      ]),
    );
    expect(shelf.read(`${folder}/recipes/b.yaml`).value?.text).toBe('in');
    expect(shelf.read(`${folder}/recipes/a.yaml`).value?.text).toBe('on disk');
    expect(shelf.list(`${folder}/recipes`).value?.map((entry) => entry.name)).toEqual(['a.yaml', 'b.yaml']);
    expect(shelf.list(folder).value?.map((entry) => entry.name)).toEqual(['new', 'recipes']);
    expect(shelf.real(`${folder}/new/c.yaml`)).toBe(`${folder}/new/c.yaml`);
    expect(shelf.kind(`${folder}/new`)).toBe('folder');
    expect(shelf.real(`${folder}/absent`)).toBeUndefined();
  });

  test('a buffer hides the file below it', () => {
    const shelf = overlay(mapShelf(new Map([['a', 'old']])), new Map([['a', 'new']]));
    expect(shelf.read('a').value?.text).toBe('new');
  });
});
