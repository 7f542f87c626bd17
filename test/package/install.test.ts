import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import manifest from '../../package.json' with { type: 'json' };

/*
 * The package as another project has it: packed, installed without a registry, run and imported.
 */

const home = mkdtempSync(join(tmpdir(), 'regimen-package-'));
const installed = join(home, 'node_modules/regimen');

function run(command: string, args: readonly string[]): string {
  return execFileSync(command, args, { cwd: home, encoding: 'utf8' });
}

beforeAll(() => {
  execFileSync('npm', ['pack', '--ignore-scripts', '--silent', '--pack-destination', home], { encoding: 'utf8' });
  const [tarball = ''] = readdirSync(home);
  writeFileSync(join(home, 'package.json'), JSON.stringify({ name: 'elsewhere', private: true, type: 'module' }));
  run('npm', ['install', '--offline', '--no-audit', '--no-fund', '--silent', `./${tarball}`]);
}, 120_000);

afterAll(() => {
  rmSync(home, { recursive: true, force: true });
});

describe('the installed package', () => {
  test('needs no other package', () => {
    expect(readdirSync(join(home, 'node_modules')).filter((name) => !name.startsWith('.'))).toEqual(['regimen']);
  });

  test('holds the program, its types, the schemas and the licences, and no source', () => {
    expect(readdirSync(installed).sort()).toEqual(
      expect.arrayContaining(['LICENSE', 'dist', 'package.json', 'schemas']),
    );
    expect(readdirSync(installed)).not.toContain('src');
    const licences = readFileSync(join(installed, 'dist/licenses.txt'), 'utf8');
    for (const name of ['commander', 'yaml', 'chalk'])
      expect(licences).toMatch(new RegExp(`^${name} \\d+\\.\\d+\\.\\d+ \\((MIT|ISC)\\)$`, 'm'));
  });

  test('has a command that can be executed', () => {
    expect(statSync(join(installed, 'dist/regimen.js')).mode & 0o111).not.toBe(0);
    expect(run('npx', ['--no-install', 'regimen', '--version'])).toBe(`${manifest.version}\n`);
  });

  test('starts a site and checks it', () => {
    run('npx', ['--no-install', 'regimen', 'start', 'line']);
    expect(run('npx', ['--no-install', 'regimen', 'check', 'line'])).toContain('Nothing blocks.');
  });

  test('asks for nothing by require, which an ES module does not have', () => {
    const scripts = readdirSync(join(installed, 'dist')).filter((name) => name.endsWith('.js'));
    const texts = scripts.map((name) => readFileSync(join(installed, 'dist', name), 'utf8'));
    expect(texts.join('').match(/[^.\w]require\(["'][^"']*["']\)/g)).toBeNull();
  });
});

describe('the library', () => {
  test('reads a run and judges it, by names that index.ts exports', () => {
    writeFileSync(join(home, 'use.js'), USE);
    expect(JSON.parse(run(process.execPath, ['use.js']))).toEqual({ kind: 'known', steps: 4, faults: 0, fails: 0 });
  });

  test('has types that another project compiles against', () => {
    writeFileSync(join(home, 'use.ts'), TYPED);
    const options = [
      '--strict',
      '--noEmit',
      '--target',
      'es2023',
      '--module',
      'nodenext',
      '--moduleResolution',
      'nodenext',
      '--types',
      'node',
    ];
    const roots = ['--typeRoots', resolve('node_modules/@types')];
    expect(run(process.execPath, [resolve('node_modules/typescript/bin/tsc'), ...options, ...roots, 'use.ts'])).toBe(
      '',
    );
  });
});

const USE = `
import { diskShelf, judge, openRun, openSite, parseReference } from 'regimen';
const shelf = diskShelf();
const path = 'line/recipes/titanium-seed.yaml';
const site = openSite(shelf, path);
const run = openRun(site.value, shelf.read(path, 'recipes/titanium-seed.yaml').value);
const judgement = judge(run.value, '2026-01-31');
const reading = run.value.steps[2].read(parseReference('knudsen.throw:target'));
const fails = judgement.steps.flatMap(({ verdicts }) => verdicts).filter(({ kind }) => kind === 'fail').length;
console.log(JSON.stringify({ kind: reading.kind, steps: run.value.steps.length, faults: run.faults.length, fails }));
`;

const TYPED = `
import { judge, mapShelf, openRun, openSite, Source } from 'regimen';
import type { Change, Fault, Given, Outcome, Place, Reading, Reference, Run, Shelf, Step, Verdict } from 'regimen';

const shelf: Shelf = mapShelf(new Map([['recipes/a.yaml', 'regimen: recipe 1']]));
const site = openSite(shelf, 'recipes/a.yaml');
const number: Reference = { id: 'knudsen', length: 'gap' };
const change: Change = { address: 'pressure', value: 1 };

export function read(run: Run): readonly Reading[] {
  return run.steps.map((step: Step) => step.with(change).read(number));
}

export function failing(run: Run): readonly Verdict[] {
  return judge(run).steps.flatMap(({ verdicts }) => verdicts.filter(({ kind }) => kind === 'fail'));
}

export const places: readonly Place[] = site.faults.map(({ place }: Fault) => place);
export const opened: Outcome<Run> | undefined = site.value && openRun(site.value, new Source('recipes/a.yaml', ''));
export const givens = (run: Run): readonly Given[] => run.steps.flatMap(({ givens: all }) => [...all.values()]);
`;
