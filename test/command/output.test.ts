import { spawn, spawnSync } from 'node:child_process';
import { existsSync, readdirSync, readFileSync, symlinkSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { BROKEN, clearFolders, COMMAND, DEMO, FAILING, folderWith, regimen, siteWith, SOUND, write } from './run.ts';

afterAll(clearFolders);

describe('a reader who goes away', () => {
  test('ends the run quietly with the code earned so far', async () => {
    const child = spawn(process.execPath, [COMMAND, 'check', '--format', 'json', DEMO]);
    let err = '';
    child.stderr.on('data', (chunk: Buffer) => (err += chunk.toString()));
    child.stdout.once('data', () => child.stdout.destroy());
    const code = await new Promise((resolve) => child.on('close', resolve));
    expect(err).toBe('');
    expect([0, 1]).toContain(code);
  });

  test('does not keep files from being written', () => {
    const report = join(folderWith({}), 'report.json');
    const call = `"${process.execPath}" "${COMMAND}" check --format json --out "${report}" "${DEMO}" | head -c 1`;
    expect(spawnSync('sh', ['-c', call], { encoding: 'utf8' }).stderr).toBe('');
    expect(readFileSync(report, 'utf8')).toBe(regimen(['check', '--format', 'json', DEMO]).out);
  });
});

describe('--out', () => {
  test('writes every file asked for, each in the format of its ending, the same as standard output would have', () => {
    const cwd = siteWith({ 'sound.yaml': SOUND });
    const { code } = regimen(['check', '--out', 'a.md', '--out', 'a.csv', '--out', 'a.json', '--out', 'a.txt'], {
      cwd,
    });
    expect(code).toBe(0);
    for (const [ending, format] of [
      ['md', 'markdown'],
      ['csv', 'csv'],
      ['json', 'json'],
      ['txt', 'text'],
    ] as const) {
      expect(readFileSync(join(cwd, `a.${ending}`), 'utf8')).toBe(regimen(['check', '--format', format], { cwd }).out);
    }
    expect(readdirSync(cwd).sort()).toEqual([
      'a.csv',
      'a.json',
      'a.md',
      'a.txt',
      'chambers',
      'recipes',
      'regimen.yaml',
    ]);
  });

  test('replaces a file that was there, and what a link leads to', () => {
    const cwd = siteWith({ 'sound.yaml': SOUND });
    write(join(cwd, 'real.md'), 'old');
    symlinkSync('real.md', join(cwd, 'link.md'));
    expect(regimen(['check', '--out', 'link.md'], { cwd }).code).toBe(0);
    expect(readFileSync(join(cwd, 'real.md'), 'utf8')).toContain('titanium-seed');
  });

  test('never replaces a document or a recipe that is read, whatever link leads there', () => {
    const cwd = siteWith({ 'sound.yaml': SOUND });
    write(join(cwd, 'recipes/named.md'), SOUND);
    symlinkSync('recipes/sound.yaml', join(cwd, 'link.md'));
    symlinkSync('recipes', join(cwd, 'folder'));
    const calls: readonly (readonly [readonly string[], string])[] = [
      [
        ['check', '--out', 'good.md', '--out', 'link.md'],
        "--out link.md is a link to 'recipes/sound.yaml', which is no markdown file; choose another path",
      ],
      [
        ['check', 'recipes/named.md', '--out', 'folder/named.md'],
        '--out folder/named.md would replace recipes/named.md, which is read; choose another path',
      ],
      [
        ['table', '--out', 'new.md', '--out', './folder/../new.md'],
        '--out new.md and --out ./folder/../new.md are one file; name each file once',
      ],
    ];
    for (const [args, message] of calls)
      expect(regimen(args, { cwd })).toEqual({ code: 2, out: '', err: `regimen: ${message}\n` });
    expect(readFileSync(join(cwd, 'recipes/sound.yaml'), 'utf8')).toBe(SOUND);
    expect(readFileSync(join(cwd, 'recipes/named.md'), 'utf8')).toBe(SOUND);
    expect(existsSync(join(cwd, 'good.md')) || existsSync(join(cwd, 'new.md'))).toBe(false);
  });

  test('takes two names of one file that is not there yet for one', () => {
    const cwd = siteWith({ 'sound.yaml': SOUND });
    symlinkSync('recipes', join(cwd, 'folder'));
    const { code, err } = regimen(['check', '--out', 'recipes/a.md', '--out', 'folder/a.md'], { cwd });
    expect({ code, err }).toEqual({
      code: 2,
      err: 'regimen: --out recipes/a.md and --out folder/a.md are one file; name each file once\n',
    });
  });

  test.each([
    ['missing/report.md', 'there is no such folder'],
    ['regimen.yaml/report.md', 'its folder is a file'],
    ['folder.md', 'it is a folder'],
  ])('into %s ends with 2 and leaves nothing behind, the rest is still done', (path, reason) => {
    const cwd = siteWith({ 'sound.yaml': SOUND });
    write(join(cwd, 'folder.md/kept'), '');
    const { code, out, err } = regimen(['check', '--out', path, '--out', 'good.md'], { cwd });
    expect({ code, err }).toEqual({ code: 2, err: `regimen: ${path}: not written, ${reason}; choose another path\n` });
    expect(out).toContain('Nothing blocks.');
    expect(existsSync(join(cwd, 'good.md'))).toBe(true);
    expect(readdirSync(cwd).sort()).toEqual(['chambers', 'folder.md', 'good.md', 'recipes', 'regimen.yaml']);
  });

  test('into a folder that may not be written ends with 2', () => {
    const { code, err } = regimen(['check', DEMO, '--out', '/proc/report.md']);
    expect(code).toBe(2);
    expect(err).toMatch(/^regimen: \/proc\/report\.md: not written, .*\n$/);
  });

  test('holds the faults too, whole, though the job was not done in full', () => {
    const cwd = siteWith({ 'broken.yaml': BROKEN });
    expect(regimen(['check', '--out', 'a.md'], { cwd }).code).toBe(2);
    expect(readFileSync(join(cwd, 'a.md'), 'utf8')).toContain('recipes/broken.yaml:22:11');
  });
});

describe('a check of several recipes', () => {
  const named = (name: string): string => SOUND.replace('name: titanium-seed', `name: ${name}`);

  test('lists those that are clean without blank lines between them', () => {
    const { out } = regimen(['check'], {
      cwd: siteWith({ 'a.yaml': named('a'), 'b.yaml': named('b'), 'c.yaml': FAILING, 'd.yaml': named('d') }),
    });
    expect(out).toMatch(/^a {3}.*4 pass\nb {3}.*4 pass\n\nhasty {3}/);
    expect(out).toMatch(/\n\nd {3}.*4 pass\n\n4 recipes, 16 steps/);
  });

  test('tells a fault of their chamber once', () => {
    const cwd = siteWith({ 'a.yaml': named('a'), 'b.yaml': named('b') });
    const chamber = join(cwd, 'chambers/ruff.yaml');
    write(chamber, readFileSync(chamber, 'utf8').replace('diameter: ', 'diametre: '));
    const { code, out } = regimen(['check'], { cwd });
    expect(code).toBe(2);
    expect(out.match(/^fault .*chambers\/ruff\.yaml:/gm)).toHaveLength(1);
    expect(out).toMatch(/1 fault: /);
  });
});

describe('colour', () => {
  const cwd = siteWith({ 'sound.yaml': SOUND });
  const coloured = (args: readonly string[], env: Record<string, string> = {}): boolean =>
    regimen(['check', ...args], { cwd, env }).out.includes('\u001b[');

  test('is left out where standard output is no terminal', () => {
    expect(coloured([])).toBe(false);
  });

  test('is decided by the flag, else NO_COLOR, else FORCE_COLOR', () => {
    expect(coloured([], { FORCE_COLOR: '1' })).toBe(true);
    expect(coloured([], { FORCE_COLOR: '0' })).toBe(false);
    expect(coloured([], { FORCE_COLOR: '1', NO_COLOR: '1' })).toBe(false);
    expect(coloured([], { FORCE_COLOR: '1', NO_COLOR: '' })).toBe(true);
    expect(coloured(['--color', 'always'], { NO_COLOR: '1' })).toBe(true);
    expect(coloured(['--color', 'never'], { FORCE_COLOR: '3' })).toBe(false);
  });

  test('never reaches Markdown, CSV, JSON or a file', () => {
    const formats = ['markdown', 'csv', 'json'].map((format) => coloured(['--color', 'always', '--format', format]));
    expect(formats).toEqual([false, false, false]);
    regimen(['check', '--color', 'always', '--out', 'a.txt'], { cwd });
    expect(readFileSync(join(cwd, 'a.txt'), 'utf8')).not.toContain('\u001b[');
  });
});
