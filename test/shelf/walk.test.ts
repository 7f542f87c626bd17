import { execFileSync } from 'node:child_process';
import { symlinkSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { diskShelf } from '../../src/shelf/disk.ts';
import { findSite } from '../../src/shelf/find-site.ts';
import { mapShelf } from '../../src/shelf/map.ts';
import { matching, walk } from '../../src/shelf/walk.ts';
import { pattern, temporaryFolder, write } from './temporary.ts';
import type { Outcome } from '../../src/shelf/fault.ts';
import type { Shelf } from '../../src/shelf/shelf.ts';
import type { Bounds } from '../../src/shelf/walk.ts';

function shelfOf(...paths: string[]): Shelf {
  return mapShelf(new Map(paths.map((path) => [path, ''])));
}

/** Paths as they are, faults as `path: what was found`. */
function told(results: Iterable<Outcome<string>>): string[] {
  return Array.from(
    results,
    ({ value, faults }) => value ?? faults.map((one) => `${one.place.file}: ${one.found}`).join(),
  );
}

describe('a walk', () => {
  test('takes .yaml and .yml, not dot folders, node_modules or anything else', () => {
    const shelf = shelfOf(
      'a.yaml',
      'b.yml',
      'c.YAML',
      'd.json',
      '.git/e.yaml',
      'n/node_modules/f.yaml',
      'n/.g.yaml',
      'n/h.yaml',
    );
    expect(told(walk(shelf, '.', { site: '.' }))).toEqual(['a.yaml', 'b.yml', 'n/.g.yaml', 'n/h.yaml']);
  });

  test('gives whole paths in code-unit order', () => {
    const name = fc.constantFrom('a', 'a.b', 'a-b', 'B', 'é', '~');
    const path = fc.array(name, { minLength: 1, maxLength: 3 }).map((names) => `${names.join('/')}.yaml`);
    fc.assert(
      fc.property(fc.uniqueArray(path, { minLength: 1 }), (paths) => {
        expect(told(walk(shelfOf(...paths), '.', { site: '.' }))).toEqual([...paths].sort());
      }),
    );
  });

  test('passes over what the site says, relative to the site wherever it starts', () => {
    const shelf = shelfOf(
      's/recipes/a.yaml',
      's/recipes/drafts/b.yaml',
      's/recipes/drafts/old/c.yaml',
      's/recipes/x-old.yaml',
    );
    const bounds: Bounds = { site: 's', passOver: [pattern('recipes/drafts/**'), pattern('**/*-old.yaml')] };
    expect(told(walk(shelf, 's', bounds))).toEqual(['s/recipes/a.yaml']);
    expect(told(walk(shelf, './s/recipes/', bounds))).toEqual(['s/recipes/a.yaml']);
    expect(told(walk(shelf, 's/recipes/drafts/old', bounds))).toEqual([]);
    expect(told(walk(shelf, 's/recipes/drafts', { site: 's', passOver: [pattern('recipes/drafts')] }))).toEqual([]);
  });

  test('does not look into folders that are passed over or that no pattern reaches', () => {
    const shelf = shelfOf('chambers/a.yaml', 'recipes/b.yaml', 'drafts/c.yaml', 'chambers/old/d.yaml');
    const asked: string[] = [];
    const watched: Shelf = { ...shelf, list: (folder) => (asked.push(folder), shelf.list(folder)) };
    expect(matching(watched, '.', [pattern('chambers/*.yaml')])).toEqual({ value: ['chambers/a.yaml'], faults: [] });
    expect(asked).toEqual(['.', 'chambers']);
    Array.from(walk(watched, '.', { site: '.', passOver: [pattern('drafts')] }));
    expect(asked.slice(2)).toEqual(['.', 'chambers', 'chambers/old', 'recipes']);
  });

  test('looks at a folder only when it comes to it', () => {
    const shelf = shelfOf('a/1.yaml', 'b/2.yaml', 'c/3.yaml');
    const asked: string[] = [];
    const walking = walk({ ...shelf, list: (folder) => (asked.push(folder), shelf.list(folder)) }, '.', { site: '.' });
    expect(walking.next().value?.value).toBe('a/1.yaml');
    expect(asked).toEqual(['.', 'a']);
  });

  test('keeps to the bounds of a site nested in the folder', () => {
    const shelf = shelfOf('x/regimen.yaml', 'x/drafts/a.yaml', 'x/b.yaml', 'drafts/c.yaml', 'y/regimen.yaml');
    const nested = (file: string) =>
      file === 'x/regimen.yaml' ? { site: 'x', passOver: [pattern('drafts/**')] } : undefined;
    expect(told(walk(shelf, '.', { site: '.', nested }))).toEqual(['drafts/c.yaml', 'x/b.yaml', 'x/regimen.yaml']);
    expect(matching(shelf, '.', [pattern('**')]).value).toEqual(['drafts/c.yaml']);
  });

  test('a folder that is not there, or is a file, is a fault', () => {
    expect(told(walk(shelfOf('a.yaml'), 'b', { site: 'b' }))).toEqual(['b: no such folder']);
    expect(told(walk(shelfOf('a.yaml'), 'a.yaml', { site: '.' }))).toEqual(['a.yaml: a file']);
  });

  test('folders nested without end are given up', () => {
    const deep = `${'d/'.repeat(200)}x.yaml`;
    const found = told(walk(shelfOf(deep, 'z.yaml'), '.', { site: '.' }));
    expect(found).toHaveLength(2);
    expect(found[0]).toMatch(/d: folders nested more than 64 deep$/);
    expect(found[1]).toBe('z.yaml');
  });
});

describe('a walk on disk', () => {
  const folder = temporaryFolder();
  const site = `${folder}/site`;
  const shelf = diskShelf();
  write(folder, {
    'site/recipes/a.yaml': '',
    'site/common/b.yaml': '',
    'outside/c.yaml': '',
    'site/recipes/"\n.yaml': '',
  });

  test('links to folders are not followed, links to files only inside the site, and nothing is left out in silence', () => {
    symlinkSync('..', `${site}/recipes/up`);
    symlinkSync('../../outside', `${site}/recipes/linked`);
    symlinkSync('../common/b.yaml', `${site}/recipes/inner.yaml`);
    symlinkSync('../../outside/c.yaml', `${site}/recipes/outer.yaml`);
    symlinkSync('gone.yaml', `${site}/recipes/gone.yaml`);
    symlinkSync('loop.yaml', `${site}/recipes/loop.yaml`);
    execFileSync('mkfifo', [`${site}/recipes/pipe.yaml`]);
    const found = told(walk(shelf, `${site}/recipes`, { site }));
    expect(found.map((text) => text.replace(`${site}/recipes/`, ''))).toEqual([
      '"\n.yaml',
      'a.yaml',
      'gone.yaml',
      'inner.yaml',
      'loop.yaml',
      "outer.yaml: a path that leads out of the site's folder",
      'pipe.yaml',
    ]);
  });

  test('a folder outside the site, by name or by link, is refused', () => {
    const refused = /a path that leads out of the site's folder$/;
    expect(told(walk(shelf, `${site}/recipes/linked`, { site }))).toEqual([expect.stringMatching(refused)]);
    expect(told(walk(shelf, `${site}/../outside`, { site }))).toEqual([expect.stringMatching(refused)]);
  });

  test('a site reached through a link is walked as it is named', () => {
    symlinkSync('site', `${folder}/door`);
    expect(matching(shelf, `${folder}/door`, [pattern('common/*.yaml')]).value).toEqual([
      `${folder}/door/common/b.yaml`,
    ]);
  });
});

describe('the site of a path', () => {
  const shelf = shelfOf(
    'top/regimen.yaml',
    'top/recipes/etch/a.yaml',
    'top/inner/regimen.yaml',
    'top/inner/b.yaml',
    'c.yaml',
  );

  test('is the nearest in its own folder or above', () => {
    expect(findSite(shelf, 'top/recipes/etch/a.yaml')).toBe('top/regimen.yaml');
    expect(findSite(shelf, 'top/recipes')).toBe('top/regimen.yaml');
    expect(findSite(shelf, 'top')).toBe('top/regimen.yaml');
    expect(findSite(shelf, 'top/inner/b.yaml')).toBe('top/inner/regimen.yaml');
    expect(findSite(shelf, 'top/inner/regimen.yaml')).toBe('top/inner/regimen.yaml');
    expect(findSite(shelf, 'top/recipes/not-yet.yaml')).toBe('top/regimen.yaml');
    expect(findSite(shelf, 'c.yaml')).toBeUndefined();
    expect(findSite(shelf, '../elsewhere/x.yaml')).toBeUndefined();
    expect(findSite(shelfOf('..odd/regimen.yaml'), '..odd/x/y.yaml')).toBe('..odd/regimen.yaml');
    expect(findSite(shelf, 'd/'.repeat(5000))).toBeUndefined();
  });

  test('is asked of the shelf once a folder where answers are kept', () => {
    let asked = 0;
    const counted: Shelf = {
      ...shelf,
      kind: (path) => ((asked += path.endsWith('regimen.yaml') ? 1 : 0), shelf.kind(path)),
    };
    const known = new Map<string, string | undefined>();
    for (let again = 0; again < 5; again += 1) {
      expect(findSite(counted, 'top/recipes/etch/a.yaml', known)).toBe('top/regimen.yaml');
      expect(findSite(counted, 'c.yaml', known)).toBeUndefined();
    }
    expect(asked).toBe(4);
  });

  test('on disk it is found up to the root, and a broken one is found too', () => {
    const folder = temporaryFolder();
    write(folder, { 'site/recipes/a.yaml': '', 'regimen.yaml': '' });
    expect(findSite(diskShelf(), `${folder}/site/recipes/a.yaml`)).toBe(`${folder}/regimen.yaml`);
    symlinkSync('gone', `${folder}/site/regimen.yaml`);
    expect(findSite(diskShelf(), `${folder}/site/recipes/a.yaml`)).toBe(`${folder}/site/regimen.yaml`);
    expect(findSite(diskShelf(), '/')).toBeUndefined();
  });
});
