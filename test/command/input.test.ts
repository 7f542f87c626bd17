import { chmodSync, mkdirSync, readFileSync, symlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { clearFolders, DEMO, folderWith, regimen, siteWith, SOUND, write } from './run.ts';

afterAll(clearFolders);

describe('standard input', () => {
  test("is a recipe of the working folder's site", () => {
    const { code, out } = regimen(['check', '-'], { cwd: siteWith({}), input: SOUND });
    expect(code).toBe(0);
    expect(out).toContain('titanium-seed');
  });

  test('is reported under the name that it would have', () => {
    const cwd = siteWith({});
    const broken = SOUND.replace('time: 10 s', 'time: soon');
    expect(regimen(['check', '-'], { cwd, input: broken }).out).toContain('standard input:22:11');
    expect(regimen(['check', '-', '--at', 'recipes/new.yaml'], { cwd, input: broken }).out).toContain(
      'recipes/new.yaml:22:11',
    );
  });

  test('stands for the file of that name while it is not saved', () => {
    const cwd = siteWith({ 'a.yaml': 'regimen: recipe 1\n' });
    expect(regimen(['check', '-', '--at', 'recipes/a.yaml'], { cwd, input: SOUND }).code).toBe(0);
  });

  test('gives what the file itself would give', () => {
    const path = 'recipes/sputter/ti-liner-wide.yaml';
    const input = readFileSync(join(DEMO, path), 'utf8');
    const args = ['check', '--format', 'json'];
    expect(regimen([...args, '-', '--at', path], { cwd: DEMO, input })).toEqual(
      regimen([...args, path], { cwd: DEMO }),
    );
  });

  test('that is empty is a fault', () => {
    const { code, out } = regimen(['check', '-'], { cwd: siteWith({}), input: '' });
    expect(code).toBe(2);
    expect(out).toContain('an empty file');
  });
});

describe('paths', () => {
  test('a file may be named from below with ../', () => {
    const cwd = join(siteWith({ 'a.yaml': SOUND }), 'chambers');
    expect(regimen(['check', '../recipes/a.yaml'], { cwd }).code).toBe(0);
  });

  test('a chamber may not lie outside the site', () => {
    const cwd = siteWith({ 'a.yaml': SOUND.replace('chamber: ruff', 'chamber: ../../ruff.yaml') });
    const { code, out } = regimen(['check'], { cwd });
    expect(code).toBe(2);
    expect(out).toContain('leads out of the site');
  });

  test('links to folders are not followed, so that a circle of them ends', () => {
    const cwd = siteWith({ 'a.yaml': SOUND });
    symlinkSync('..', join(cwd, 'recipes/round'));
    const { code, out } = regimen(['check', '.'], { cwd });
    expect(code).toBe(0);
    expect(out).toContain('1 recipe, ');
  });

  test('links that lead round in a circle or nowhere are faults where they are named', () => {
    const cwd = siteWith({});
    symlinkSync('b.yaml', join(cwd, 'a.yaml'));
    symlinkSync('a.yaml', join(cwd, 'b.yaml'));
    symlinkSync('gone.yaml', join(cwd, 'c.yaml'));
    for (const name of ['a.yaml', 'c.yaml']) {
      const { code, out, err } = regimen(['check', name], { cwd });
      expect({ code, err }).toEqual({ code: 2, err: '' });
      expect(out).toContain(`${name}:1:1`);
    }
  });

  test('a file that may not be read is a fault, and the others are still judged', () => {
    const cwd = siteWith({ 'a.yaml': SOUND, 'b.yaml': SOUND });
    chmodSync(cwd, 0o755);
    chmodSync(join(cwd, 'recipes/b.yaml'), 0);
    const { code, out } = regimen(['check'], { cwd, ...asNobody() });
    expect(code).toBe(2);
    expect(out).toContain('recipes/b.yaml:1:1\n         no permission to read it');
    expect(out).toContain('1 recipe, 4 steps: 4 pass.');
  });

  test('a folder with the name of a recipe is walked, not read', () => {
    const cwd = siteWith({ 'a.yaml/b.yaml': SOUND });
    expect(regimen(['check', 'recipes/a.yaml'], { cwd }).code).toBe(0);
  });

  test('one run may meet several sites', () => {
    const outer = folderWith({});
    for (const name of ['east', 'west']) {
      expect(regimen(['start', join(outer, name)]).code).toBe(0);
    }
    const { code, out } = regimen(['check', outer]);
    expect(code).toBe(0);
    expect(out).toContain('2 recipes, 8 steps: 8 pass.');
  });

  test('drafts that the site passes over are not judged', () => {
    expect(regimen(['check', DEMO]).out).not.toContain('ti-getter-dense');
  });

  test('--site names the site of recipes that lie elsewhere', () => {
    const site = siteWith({});
    const cwd = folderWith({ 'loose.yaml': SOUND });
    expect(regimen(['check', 'loose.yaml'], { cwd }).code).toBe(2);
    expect(regimen(['check', 'loose.yaml', '--site', site], { cwd }).code).toBe(0);
    expect(regimen(['check', 'loose.yaml', '--site', join(site, 'regimen.yaml')], { cwd }).code).toBe(0);
  });

  test('a site of its own that is not there is a fault', () => {
    const { code, err } = regimen(['check', '--site', 'nowhere'], { cwd: siteWith({ 'a.yaml': SOUND }) });
    expect(code).toBe(2);
    expect(err).toContain('nowhere');
  });
});

/** Whoever may read everything runs the command as somebody who may not. */
function asNobody(): { readonly uid?: number } {
  return process.getuid?.() === 0 ? { uid: 65_534 } : {};
}

describe('hostile documents end with 2, a message and no stack', () => {
  const bomb = `regimen: recipe 1\na: &a [x, x]\nb: &b [*a, *a]\nc: [*b, *b]\n`;
  const deep = `regimen: recipe 1\nsteps: ${'['.repeat(2000)}\n`;
  const unopened = `regimen: recipe 1\nsteps: ${']'.repeat(2000)}\n`;
  const keys = `regimen: recipe 1\n${Array.from({ length: 40_000 }, (_, key) => `k${key}: 1\n`).join('')}`;
  const digits = `regimen: recipe 1\nname: x\nchamber: ruff\nsteps: [{ name: a, process: soak, time: ${'9'.repeat(100_000)} s }]\n`;

  test.each([
    ['an alias bomb', bomb],
    ['deep nesting', deep],
    ['closing brackets without end', unopened],
    ['forty thousand keys', keys],
    ['a number of a hundred thousand digits', digits],
    ['a NUL character', 'regimen: recipe 1\nname: a\0b\n'],
    ['two documents', `${SOUND}---\n${SOUND}`],
    ['an empty file', ''],
    ['a lone heading', 'regimen: recipe 1\n'],
    ['a tag', 'regimen: recipe 1\nname: !!binary aGk=\n'],
    ['a prototype', 'regimen: recipe 1\n__proto__: { polluted: 1 }\nconstructor: 1\n'],
  ])('%s', (_, text) => {
    const cwd = siteWith({ 'hostile.yaml': text });
    const { code, out, err } = regimen(['check', 'recipes/hostile.yaml'], { cwd });
    expect({ code, err }).toEqual({ code: 2, err: '' });
    expect(out).toMatch(/fault +recipes\/hostile\.yaml:\d+:\d+\n/);
    expect(out + err).not.toMatch(/\bat .*\.js:\d+|a fault of the program/);
  });

  test('bytes that are not UTF-8', () => {
    const cwd = siteWith({});
    mkdirSync(join(cwd, 'recipes'));
    writeFileSync(
      join(cwd, 'recipes/latin.yaml'),
      Buffer.from([...Buffer.from('regimen: recipe 1\nname: '), 0xe9, 0x0a]),
    );
    const { code, out, err } = regimen(['check', 'recipes/latin.yaml'], { cwd });
    expect({ code, err }).toEqual({ code: 2, err: '' });
    expect(out).toContain('recipes/latin.yaml:2:7');
  });

  test('fifty megabytes', () => {
    const cwd = siteWith({});
    write(join(cwd, 'recipes/large.yaml'), `regimen: recipe 1\n${'# padding\n'.repeat(5_242_880)}`);
    const { code, out, err } = regimen(['check'], { cwd });
    expect({ code, err }).toEqual({ code: 2, err: '' });
    expect(out).toContain('a size of 50 MiB');
  });
});
