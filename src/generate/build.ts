import { spawn } from 'node:child_process';
import { chmodSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { build as bundleWith } from 'esbuild';
import type { Metafile, Plugin } from 'esbuild';

/*
 * `npm run build`: everything that the package ships, in dist/. What the program needs of other packages is bundled into it,
 * so that the package has no dependencies of its own; their licences come along.
 */

const DIST = 'dist';

/** Each entry becomes dist/NAME.js; what several share is split off, so that a command loads what it needs and no more. */
const ENTRIES = {
  main: 'src/cli/main.ts',
  worker: 'src/cli/worker.ts',
  index: 'src/index.ts',
};

/** Of these packages the variants for any platform: they are ES modules throughout, and ask the system for nothing when loaded. */
const ALIASES = {
  yaml: './node_modules/yaml/browser/dist/index.js',
  '#supports-color': './node_modules/chalk/source/vendor/supports-color/browser.js',
};

/** The command itself: as little as can be, so that all else can be loaded when it is known what is wanted. */
const COMMAND = `#!/usr/bin/env node
import { main } from './main.js';
await main(process.argv.slice(2));
`;

async function buildAll(): Promise<void> {
  rmSync(DIST, { recursive: true, force: true });
  const types = writeTypes();
  writeLicences(await bundle());
  writeFileSync(join(DIST, 'regimen.js'), COMMAND);
  chmodSync(join(DIST, 'regimen.js'), 0o755);
  await types;
}

async function bundle(): Promise<Metafile> {
  const { metafile } = await bundleWith({
    entryPoints: ENTRIES,
    outdir: DIST,
    chunkNames: 'part-[hash]',
    alias: ALIASES,
    plugins: [requiredBuiltIns],
    bundle: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    minifySyntax: true,
    minifyWhitespace: true,
    legalComments: 'none',
    metafile: true,
    logLevel: 'warning',
  });
  return metafile;
}

/**
 * Modules of Node that a bundled package asks for by `require`, which an ES module does not have, are imported instead. None
 * of the packages starts another program here: what would is left out, since loading it takes longer than reading the command line.
 */
const requiredBuiltIns: Plugin = {
  name: 'required-built-ins',
  setup(build) {
    build.onResolve({ filter: /^node:/ }, ({ path, kind }) =>
      kind === 'require-call' ? { path, namespace: 'required' } : undefined,
    );
    build.onLoad({ filter: /./, namespace: 'required' }, ({ path }) => ({
      contents: STAND_INS.get(path) ?? `export * from '${path}';`,
    }));
  },
};

const STAND_INS: ReadonlyMap<string, string> = new Map([
  ['node:process', 'module.exports = globalThis.process;'],
  ['node:child_process', 'module.exports = {};'],
]);

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
