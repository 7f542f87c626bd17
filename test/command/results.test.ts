import { cpSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { afterAll, describe, expect, test } from 'vitest';
import { BROKEN, clearFolders, DEMO, FAILING, folderWith, regimen, siteWith, SOUND } from './run.ts';

afterAll(clearFolders);

const schema = (name: string): object => {
  const value: unknown = JSON.parse(readFileSync(`schemas/${name}.json`, 'utf8'));
  if (typeof value !== 'object' || value === null) throw new Error(`${name} is no schema`);
  return value;
};
const ajv = new Ajv2020({ strict: false, allErrors: true });

describe('JSON', () => {
  test.each([
    ['of the demo line', ['check', DEMO]],
    ['with faults', ['check', siteWith({ 'a.yaml': BROKEN, 'b.yaml': FAILING })]],
    ['without a recipe', ['check', folderWith({})]],
  ])('of check %s meets schemas/check.json', (_, args) => {
    const result: unknown = JSON.parse(regimen([...args, '--format', 'json']).out);
    const validate = ajv.compile(schema('check'));
    ajv.removeSchema();
    expect(validate(result), JSON.stringify(validate.errors)).toBe(true);
  });

  test('of gas meets schemas/gas.json', () => {
    const result: unknown = JSON.parse(regimen(['gas', 'Ar=4', 'CF4=1', 'H2O', '--format', 'json']).out);
    const validate = ajv.compile(schema('gas'));
    ajv.removeSchema();
    expect(validate(result), JSON.stringify(validate.errors)).toBe(true);
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
    const { code, out, err } = regimen(['check', '--format', 'csv'], { cwd: siteWith({ 'a.yaml': BROKEN, 'b.yaml': SOUND }) });
    expect(code).toBe(2);
    expect(err).toMatch(/^regimen: recipes\/a\.yaml:22:11: /);
    expect(records(out).slice(1).every(([file]) => file === 'recipes/b.yaml')).toBe(true);
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
  for (let copy = 0; copy < 20; copy += 1) cpSync(join(DEMO, 'recipes'), join(many, `recipes/copy-${copy}`), { recursive: true });

  test.each(['text', 'markdown', 'csv', 'json'])('as %s, however many recipes are worked on at a time', (format) => {
    const [one, two, five] = [1, 2, 5].map((jobs) => regimen(['check', many, '--format', format, '--jobs', String(jobs)]));
    expect(one?.code).toBe(1);
    expect(one?.err).toBe('');
    expect(two).toEqual(one);
    expect(five).toEqual(one);
  });

  test('in whatever order and however often the paths are named', () => {
    const recipes = join(DEMO, 'recipes');
    const once = regimen(['check', join(recipes, 'etch'), join(recipes, 'sputter')]);
    const again = regimen(['check', join(recipes, 'sputter'), join(recipes, 'etch'), join(recipes, 'etch/via-etch.yaml')]);
    expect(again).toEqual(once);
  });
});
