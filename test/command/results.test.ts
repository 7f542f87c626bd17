import { cpSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { afterAll, describe, expect, test } from 'vitest';
import { BROKEN, clearFolders, DEMO, FAILING, folderWith, regimen, siteWith, SOUND, write } from './run.ts';

afterAll(clearFolders);

/** The schemas of results, with what they share. */
const ajv = new Ajv2020({ strict: false, allErrors: true });
for (const name of ['common', 'check', 'gas']) {
  const schema: unknown = JSON.parse(readFileSync(`schemas/${name}.json`, 'utf8'));
  if (typeof schema === 'object' && schema !== null) ajv.addSchema(schema);
}

/** What a schema finds wrong with a text. */
function wrongIn(text: string, name: string): unknown {
  const validate = ajv.getSchema(`${name}.json`);
  return validate?.(JSON.parse(text)) === true ? [] : (validate?.errors ?? 'no such schema');
}

describe('JSON', () => {
  test.each([
    ['of the demo line', ['check', DEMO]],
    ['with faults', ['check', siteWith({ 'a.yaml': BROKEN, 'b.yaml': FAILING })]],
    ['without a recipe', ['check', folderWith({})]],
  ])('of check %s meets schemas/check.json', (_, args) => {
    expect(wrongIn(regimen([...args, '--format', 'json']).out, 'check')).toEqual([]);
  });

  test('of several sites says of each recipe by what conventions its numbers are told, and together what they share', () => {
    const folder = folderWith({});
    for (const [name, factor] of [
      ['one', '2'],
      ['two', '3'],
    ] as const) {
      cpSync(siteWith({ 'a.yaml': SOUND }), join(folder, name), { recursive: true });
      const site = join(folder, name, 'regimen.yaml');
      write(site, readFileSync(site, 'utf8').replace('show:', `show:\n  coverage_factor: ${factor}`));
    }
    const { out } = regimen(['check', '--format', 'json', 'one', 'two'], { cwd: folder });
    const result: unknown = JSON.parse(out);
    expect(wrongIn(out, 'check')).toEqual([]);
    expect(result).toMatchObject({ bands: 'gas-dynamics', recipes: [{ coverage_factor: 2 }, { coverage_factor: 3 }] });
    expect(result).not.toHaveProperty('coverage_factor');
  });

  test('of gas meets schemas/gas.json', () => {
    expect(wrongIn(regimen(['gas', 'Ar=4', 'CF4=1', 'H2O', '--format', 'json']).out, 'gas')).toEqual([]);
  });

  test('names files relative to the site, whatever folder the command runs in', () => {
    const cwd = siteWith({ 'a.yaml': BROKEN, 'b.yaml': FAILING });
    const fromSite = regimen(['check', '--format', 'json'], { cwd });
    const fromBelow = regimen(['check', '..', '--format', 'json'], { cwd: join(cwd, 'recipes') });
    const fromElsewhere = regimen(['check', cwd, '--format', 'json']);
    expect(fromSite.out).toContain('"file": "recipes/a.yaml"');
    expect(fromSite.out).not.toContain(cwd);
    expect([fromBelow, fromElsewhere]).toEqual([fromSite, fromSite]);
  });
});

describe('CSV', () => {
  test('has a header and rows of as many cells', () => {
    const rows = records(regimen(['check', DEMO, '--format', 'csv']).out);
    const widths = new Set(rows.map((row) => row.length));
    expect(rows[0]).toContain('assumption');
    expect(rows.length).toBeGreaterThan(500);
    expect([...widths]).toEqual([rows[0]?.length]);
  });

  test('tells faults on standard error, since it has no room for them', () => {
    const { code, out, err } = regimen(['check', '--format', 'csv'], {
      cwd: siteWith({ 'a.yaml': BROKEN, 'b.yaml': SOUND }),
    });
    expect(code).toBe(2);
    expect(err).toMatch(/^regimen: recipes\/a\.yaml:22:11: /);
    expect(
      records(out)
        .slice(1)
        .every(([file]) => file === 'recipes/b.yaml'),
    ).toBe(true);
  });
});

/** RFC 4180, as a reader other than the writer's would take it. */
function records(text: string): string[][] {
  const rows: string[][] = [[]];
  for (const [, quoted, plain = '', end] of text.matchAll(/(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r\n|$)/g)) {
    if (end === '' && quoted === undefined && plain === '') break;
    rows.at(-1)?.push(quoted === undefined ? plain : quoted.replaceAll('""', '"'));
    if (end === '\r\n') rows.push([]);
  }
  return rows.filter((row) => row.length > 0);
}

describe('the same input gives the same bytes', () => {
  const many = folderWith({});
  cpSync(DEMO, many, { recursive: true });
  for (const family of ['sputter', 'etch', 'furnace']) {
    for (let copy = 0; copy < 8; copy += 1) {
      cpSync(join(DEMO, 'recipes', family), join(many, `recipes/${family}-${copy}`), { recursive: true });
    }
  }

  test.each(['text', 'json'])('as %s, however many recipes are worked on at a time', (format) => {
    const [one, two, three] = [1, 2, 3].map((jobs) =>
      regimen(['check', many, '--format', format, '--jobs', String(jobs)]),
    );
    expect(one).toMatchObject({ code: 1, err: '' });
    expect(two).toEqual(one);
    expect(three).toEqual(one);
  });

  test('in whatever order and however often the paths are named', () => {
    const recipes = join(DEMO, 'recipes');
    const once = regimen(['check', join(recipes, 'etch'), join(recipes, 'sputter')]);
    const again = regimen([
      'check',
      join(recipes, 'sputter'),
      join(recipes, 'etch'),
      join(recipes, 'etch/via-etch.yaml'),
    ]);
    expect(again).toEqual(once);
  });
});
