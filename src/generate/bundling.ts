import type { Plugin } from 'esbuild';

export const DIST = 'dist';

/** Of these packages the variants for any platform: they are ES modules throughout, and ask the system for nothing when loaded. */
const ALIASES = {
  yaml: './node_modules/yaml/browser/dist/index.js',
  '#supports-color': './node_modules/chalk/source/vendor/supports-color/browser.js',
};

/** How every bundle of the package is made. */
export const COMMON = {
  alias: ALIASES,
  bundle: true,
  platform: 'node',
  target: 'node20',
  minifySyntax: true,
  minifyWhitespace: true,
  legalComments: 'none',
  logLevel: 'warning',
} as const;

/**
 * Modules of Node that a bundled package asks for by `require`, which an ES module does not have, are imported instead. None
 * of the packages starts another program here: what would is left out, since loading it takes longer than reading the command line.
 */
export const requiredBuiltIns: Plugin = {
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
