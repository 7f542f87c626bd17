import { spawnSync } from 'node:child_process';
import { chmodSync, cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { STARTER_CHAMBER } from '../../src/cli/start/chamber.ts';
import { STARTER_RECIPE } from '../../src/cli/start/recipe.ts';
import { STARTER_SITE } from '../../src/cli/start/site.ts';

/** The built command. */
export const COMMAND = resolve('dist/regimen.js');
/** The demo line. */
export const DEMO = resolve('recipes');

export interface Ended {
  readonly code: number | null;
  readonly out: string;
  readonly err: string;
}

export interface Setting {
  readonly cwd?: string;
  readonly input?: string;
  readonly env?: Readonly<Record<string, string>>;
  readonly uid?: number;
}

/** Runs the built command as a user does. Colour variables of whoever runs the tests are taken away. */
export function regimen(args: readonly string[], { cwd, input, env = {}, uid }: Setting = {}): Ended {
  const command = uid === undefined ? COMMAND : commandForAll();
  const { status, stdout, stderr } = spawnSync(process.execPath, [command, ...args], {
    cwd,
    input,
    env: { ...PLAIN, ...env },
    ...(uid === undefined ? {} : { uid }),
    encoding: 'utf8',
    maxBuffer: 2 ** 28,
  });
  return { code: status, out: stdout, err: stderr };
}

const PLAIN = Object.fromEntries(Object.entries(process.env).filter(([name]) => !/^(NO|FORCE)_COLOR$/.test(name)));

/** The command where anybody may read it: the folder of the checkout may be its owner's alone. */
function commandForAll(): string {
  const folder = folderWith({});
  cpSync(dirname(COMMAND), join(folder, 'dist'), { recursive: true });
  // Its package tells that it is made of modules.
  cpSync(resolve('package.json'), join(folder, 'package.json'));
  chmodSync(folder, 0o755);
  return join(folder, 'dist', 'regimen.js');
}

const made: string[] = [];

/** A fresh folder with these files. */
export function folderWith(files: Readonly<Record<string, string>>): string {
  const folder = mkdtempSync(join(tmpdir(), 'regimen-test-'));
  made.push(folder);
  for (const [name, text] of Object.entries(files)) write(join(folder, name), text);
  return folder;
}

export function write(path: string, text: string): void {
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, text);
}

/** For `afterAll`. */
export function clearFolders(): void {
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true, force: true });
}

/** A recipe on the starter's chamber that checks clean. */
export const SOUND = STARTER_RECIPE;
/** One whose settling is far too short, which is graded error. */
export const FAILING = SOUND.replace('name: titanium-seed', 'name: hasty').replace(
  'time: 10 s',
  'time: 0.05 s +/- 1 %',
);
/** One with a misspelt unit in line and column. */
export const BROKEN = SOUND.replace('name: titanium-seed', 'name: misspelt').replace('time: 10 s', 'time: 10 sec.');

/** A site of the starter's chamber with these recipes by name of their file. */
export function siteWith(recipes: Readonly<Record<string, string>>): string {
  return folderWith({
    'regimen.yaml': STARTER_SITE,
    'chambers/ruff.yaml': STARTER_CHAMBER,
    ...Object.fromEntries(Object.entries(recipes).map(([name, text]) => [`recipes/${name}`, text])),
  });
}
