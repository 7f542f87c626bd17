import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { clearFolders, folderWith, regimen } from './run.ts';

afterAll(clearFolders);

test('start writes a site that checks clean, even with everything blocking', () => {
  const cwd = folderWith({});
  expect(regimen(['start', 'line'], { cwd })).toMatchObject({ code: 0, err: '' });
  expect(readdirSync(join(cwd, 'line'), { recursive: true }).sort()).toEqual([
    'chambers',
    'chambers/ruff.yaml',
    'recipes',
    'recipes/titanium-seed.yaml',
    'regimen.yaml',
  ]);
  const { code, out, err } = regimen(['check', 'line', '--block-at', 'note', '--unproven'], { cwd });
  expect({ code, err }).toEqual({ code: 0, err: '' });
  expect(out).toContain('4 pass');
});

test('start writes into a folder that is there, and into the working folder', () => {
  const cwd = folderWith({ 'README.md': 'mine\n' });
  expect(regimen(['start', '.'], { cwd }).code).toBe(0);
  expect(readFileSync(join(cwd, 'README.md'), 'utf8')).toBe('mine\n');
  expect(regimen(['check'], { cwd }).code).toBe(0);
});

test('start overwrites nothing and then leaves nothing behind', () => {
  const cwd = folderWith({ 'recipes/titanium-seed.yaml': 'mine\n' });
  const { code, out, err } = regimen(['start', '.'], { cwd });
  expect({ code, out }).toEqual({ code: 2, out: '' });
  expect(err).toBe(
    'regimen: recipes/titanium-seed.yaml: not written, a file of that name is there; choose another path\n',
  );
  expect(readdirSync(cwd)).toEqual(['recipes']);
  expect(readFileSync(join(cwd, 'recipes/titanium-seed.yaml'), 'utf8')).toBe('mine\n');
});

test('start ends where folders cannot be made', () => {
  expect(regimen(['start', '/proc/regimen/line'])).toMatchObject({ code: 2, out: '' });
  expect(existsSync('/proc/regimen')).toBe(false);
});
