import { spawn } from 'node:child_process';
import { chmodSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { build as bundleWith } from 'esbuild';
import { bundleCommands, COMMANDS, loadedCommands, writeCache } from './commands-script.ts';
import { COMMON, DIST, requiredBuiltIns } from './bundling.ts';
import type { Metafile } from 'esbuild';

/*
 * `npm run build`: everything that the package ships, in dist/. What the program needs of other packages is bundled into it,
 * so that the package has no dependencies of its own; their licences come along.
 */

/** Each entry becomes dist/NAME.js; what several share is split off, so that a command loads what it needs and no more. */
const ENTRIES = {
  main: 'src/cli/main.ts',
  worker: 'src/cli/worker.ts',
  index: 'src/index.ts',
};

/** The command itself: as little as can be, so that all else can be loaded when it is known what is wanted. */
const COMMAND = `#!/usr/bin/env node
import { main } from './main.js';
await main(process.argv.slice(2));
`;

async function buildAll(): Promise<void> {
  rmSync(DIST, { recursive: true, force: true });
  const types = writeTypes();
  const [metafile] = await Promise.all([bundle(), bundleCommands()]);
  writeLicences(metafile);
  await writeCache(join(DIST, COMMANDS));
  writeFileSync(join(DIST, 'regimen.js'), COMMAND);
  chmodSync(join(DIST, 'regimen.js'), 0o755);
  await types;
}

async function bundle(): Promise<Metafile> {
  const { metafile } = await bundleWith({
    ...COMMON,
    entryPoints: ENTRIES,
    outdir: DIST,
    chunkNames: 'part-[hash]',
    plugins: [requiredBuiltIns, loadedCommands],
    splitting: true,
    format: 'esm',
    metafile: true,
  });
  return metafile;
}

/** Declarations of the library face and of all that it names. */
function writeTypes(): Promise<void> {
  const compiler = join('node_modules', 'typescript', 'bin', 'tsc');
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [compiler, '--project', 'tsconfig.build.json'], { stdio: 'inherit' });
    child.on('error', reject);
    child.on('close', (code) => {
      if (code === 0) resolve();
      else reject(new Error(`the declarations could not be made: tsc ended with ${code ?? 'a signal'}`));
    });
  });
}

function writeLicences({ inputs }: Metafile): void {
  const packages = new Set(Object.keys(inputs).flatMap((path) => packageOf(path) ?? []));
  const texts = [...packages].sort().map(licenceOf);
  const title = 'Parts of these packages are bundled into this one, under their own licences.\n';
  writeFileSync(join(DIST, 'licenses.txt'), [title, ...texts].join(`\n${'-'.repeat(80)}\n\n`));
}

/** Folder of the package that a bundled file is from; undefined where it is ours. */
function packageOf(path: string): string | undefined {
  return /^(?:.*\/)?node_modules\/(?:@[^/]+\/)?[^/]+/.exec(path)?.[0];
}

function licenceOf(folder: string): string {
  const manifest: unknown = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8'));
  const file = readdirSync(folder).find((name) => /^licen[cs]e/i.test(name));
  if (file === undefined) throw new Error(`${folder} has no licence file`);
  const text = readFileSync(join(folder, file), 'utf8').trim();
  return `${textOf(manifest, 'name')} ${textOf(manifest, 'version')} (${textOf(manifest, 'license')})\n\n${text}\n`;
}

function textOf(manifest: unknown, key: string): string {
  if (typeof manifest !== 'object' || manifest === null) return '';
  const value: unknown = Object.entries(manifest).find(([name]) => name === key)?.[1];
  return typeof value === 'string' ? value : '';
}

await buildAll();
