import { symlinkSync } from 'node:fs';
import { posix } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { diskShelf } from '../../src/shelf/disk.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { anchored, folderOf, inside, isBelow, join, nameOf, normalise, relative } from '../../src/shelf/paths.ts';
import { temporaryFolder, write } from './temporary.ts';

const part = fc.constantFrom('a', 'b', '..', '.', '...', '..c', 'd.yaml');
const path = fc.array(part, { minLength: 1, maxLength: 5 }).map((parts) => parts.join('/'));

describe('paths by their names', () => {
  test('a path has one normal form', () => {
    expect(['', './a//b/', 'a/../b', '../a', '/', '/..', 'a/..'].map(normalise)).toEqual([
      '.',
      'a/b',
      'b',
      '../a',
      '/',
      '/',
      '.',
    ]);
  });

  test('the folder of a path is one step up, also above the working folder', () => {
    expect(['a/b', 'a', '.', '..', '../..', '/a', '/'].map(folderOf)).toEqual([
      'a',
      '.',
      '..',
      '../..',
      '../../..',
      '/',
      '/',
    ]);
    expect(nameOf('a/b.yaml/')).toBe('b.yaml');
  });

  test('an absolute path is not put below the folder', () => {
    expect([join('a', '../b'), join('.', 'b'), join('a', '/b'), join('/', 'b')]).toEqual(['b', 'b', '/b', '/b']);
  });

  test('a path as written from a folder leads back to it', () => {
    fc.assert(
      fc.property(path, path, (from, to) => {
        const folder = `/r/s/t/u/v/${from}`;
        const way = relative(folder, `/r/s/t/u/v/${to}`);
        expect(way).toBe(posix.relative(folder, `/r/s/t/u/v/${to}`) || '.');
        expect(join(folder, way)).toBe(normalise(`/r/s/t/u/v/${to}`));
        expect(isBelow(folder, `/r/s/t/u/v/${to}`)).toBe(way !== '..' && !way.startsWith('../'));
      }),
    );
  });

  test('where names alone cannot tell the way, the path stays whole and counts as elsewhere', () => {
    expect([relative('../a', 'x'), relative('/a', 'x'), relative('a', '/x')]).toEqual(['x', 'x', '/x']);
    expect([isBelow('../a', 'x'), isBelow('/a', 'x'), isBelow('a', '/x'), isBelow('..', 'x')]).not.toContain(true);
    expect([relative('.', 'a/b'), relative('a', 'b'), relative('a/c', 'a'), relative('.', '../x')]).toEqual([
      'a/b',
      '../b',
      '..',
      '../x',
    ]);
  });

  test('a name that starts with dots does not lead upwards', () => {
    expect(isBelow('/site', '/site/..a/b')).toBe(true);
    expect(isBelow('/site', '/site')).toBe(true);
    expect(isBelow('/site', '/site-b/x')).toBe(false);
    expect(isBelow('/site', '/site/../x')).toBe(false);
    expect(isBelow('.', '../x')).toBe(false);
    expect(isBelow('.', '/x')).toBe(false);
  });
});

describe('paths after their links', () => {
  const folder = temporaryFolder();
  write(folder, { 'site/chambers/stilt.yaml': '', 'outside/godwit.yaml': '' });
  symlinkSync('../outside', `${folder}/site/out`);
  symlinkSync('chambers', `${folder}/site/in`);
  symlinkSync(`${folder}/site`, `${folder}/door`);
  const shelf = diskShelf();
  const site = `${folder}/site`;

  test.each([
    ['chambers/stilt.yaml', true],
    ['in/stilt.yaml', true],
    ['in/../in/absent.yaml', true],
    ['.', true],
    ['out/godwit.yaml', false],
    ['../outside/godwit.yaml', false],
    ['../absent.yaml', false],
    ['../door/chambers/stilt.yaml', true],
    ['/etc/passwd', false],
  ])('%s lies in the site: %s', (way, answer) => {
    expect(inside(shelf, site, join(site, way))).toBe(answer);
  });

  test('a site reached through a link holds what the folder behind it holds', () => {
    expect(inside(shelf, `${folder}/door`, `${site}/chambers/stilt.yaml`)).toBe(true);
    expect(inside(shelf, `${folder}/door`, `${folder}/door/out/godwit.yaml`)).toBe(false);
  });

  test('a relative path counts from the working folder on disk and stays itself on a Map', () => {
    expect(anchored(shelf, 'a/../b')).toBe(`${shelf.real('.') ?? ''}/b`);
    expect(anchored(mapShelf(new Map()), './b')).toBe('b');
    expect(inside(mapShelf(new Map([['a/b', '']])), 'a', 'a/b')).toBe(true);
  });
});
