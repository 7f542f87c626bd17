import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { Script } from 'node:vm';
import { build as bundleWith } from 'esbuild';
import { standardOut } from '../cli/out.ts';
import { COMMON, DIST, requiredBuiltIns } from './bundling.ts';
import type { Plugin } from 'esbuild';
import type * as everyCommand from '../cli/every-command.ts';
import type { Out } from '../cli/out.ts';

/*
 * What the commands do, for the main thread: one script, and beside it what V8 has compiled of it. For a single recipe most of
 * the time would go into compiling, and V8 keeps what it has compiled of scripts, not of modules. Another version of V8 rejects
 * what is kept, and compiles the script as if nothing were there.
 */

export const COMMANDS = 'commands.cjs';
const DIGEST_LENGTH = 32;

/** The script is one function; it is given what a script lacks that is run by itself, and returns the exports of the commands. */
export async function bundleCommands(): Promise<void> {
  await bundleWith({
    ...COMMON,
    entryPoints: ['src/cli/every-command.ts'],
    outfile: join(DIST, COMMANDS),
    plugins: [requiredBuiltIns],
    format: 'cjs',
    supported: { 'dynamic-import': false },
    define: { 'import.meta.url': 'moduleUrl' },
    banner: { js: '(function (require, moduleUrl) { const module = {};' },
    footer: { js: 'return module.exports; })' },
  });
}

/** Where the main thread asks for the commands it loads that script; workers, which live long, import the modules. */
export const loadedCommands: Plugin = {
  name: 'loaded-commands',
  setup(build) {
    build.onResolve({ filter: /\/every-command\.ts$/ }, ({ path, kind }) =>
      kind === 'dynamic-import' ? { path, namespace: 'loaded' } : undefined,
    );
    build.onLoad({ filter: /./, namespace: 'loaded' }, () => ({ contents: LOADER }));
  },
};

/** V8 believes whatever names its version, and a damaged byte would end the process: hence the digest that stands in front. */
const LOADER = `
import { existsSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import { Script } from 'node:vm';

const load = createRequire(import.meta.url);
const path = fileURLToPath(new URL('./${COMMANDS}', import.meta.url));
const code = readFileSync(path);
const script = new Script(code.toString('latin1'), { filename: '${COMMANDS}', cachedData: compiled(path + '.cache') });
export const { readOptions, RUNS } = script.runInThisContext()(load, import.meta.url);

function compiled(file) {
  if (!existsSync(file)) return undefined;
  const kept = readFileSync(file);
  const data = kept.subarray(${DIGEST_LENGTH});
  // Imported, node:crypto would load all that it has.
  const digest = load('node:crypto').createHash('sha256').update(code).update(data).digest();
  return digest.equals(kept.subarray(0, ${DIGEST_LENGTH})) ? data : undefined;
}
`;

/** Checks a recipe first, so that what is kept is what a check runs through, and not the outlines of every function. */
export async function writeCache(file: string): Promise<void> {
  const path = resolve(file);
  const code = readFileSync(path);
  // V8 keeps the name as well: no path of this machine may be in it.
  const script = new Script(code.toString('latin1'), { filename: COMMANDS });
  // It is the bundle of that very module.
  const open = script.runInThisContext() as (require: NodeJS.Require, url: string) => Commands;
  const { readOptions, RUNS } = open(createRequire(path), pathToFileURL(path).href);
  const args = [PRACTICE];
  const { options } = readOptions(new Map(), args);
  const out: Out = { ...standardOut(), write: () => undefined };
  if (options === undefined || (await RUNS.check({ args, options, out })) !== 0) throw new Error(`${PRACTICE} fails`);
  const data = script.createCachedData();
  const digest = createHash('sha256').update(code).update(data).digest();
  writeFileSync(`${path}.cache`, Buffer.concat([digest, data]));
}

type Commands = Pick<typeof everyCommand, 'readOptions' | 'RUNS'>;

const PRACTICE = 'recipes/recipes/etch/contact-open.yaml';
