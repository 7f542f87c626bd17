import { build } from 'esbuild';
import { Ajv2020 } from 'ajv/dist/2020.js';
import standalone from 'ajv/dist/standalone/index.js';
import { isList, isMap, referred, textOf } from './schemas.ts';
import { SORTS } from '../documents/sort.ts';
import type { Json, JsonMap, Located } from './schemas.ts';

type Schemas = ReadonlyMap<string, JsonMap>;

/**
 * One module with a validator for each sort of document, without a `require` left in it. What the measure pass reads and
 * checks by itself, single physical values and their spans, is left to it: the validators are half as large so.
 */
export async function validatorsModule(schemas: Schemas): Promise<string> {
  const ajv = new Ajv2020({
    strict: true,
    allowUnionTypes: true,
    ownProperties: true,
    allErrors: true,
    messages: false,
    code: { source: true, esm: true },
  });
  // No schema uses the keywords for which the code of every function would keep account.
  ajv.opts.unevaluated = false;
  ajv.opts.dynamicRef = false;
  for (const [file, node] of schemas) ajv.addSchema(structural(schemas, { file, node }));
  const ids = Object.fromEntries(SORTS.map((sort) => [sort, textOf(schemas.get(`${sort}.json`)?.$id)]));
  const code = await bundled(standalone.default(ajv, ids));
  if (code.includes('require(')) throw new Error('a require is left in the validators');
  return `${HEAD}${code}`;
}

/** The types of that module. */
export function validatorsTypes(): string {
  return `${HEAD}${DECLARATIONS}${SORTS.map((sort) => `export const ${sort}: Validator;\n`).join('')}`;
}

const HEAD = '// Made by `npm run generate` from schemas/. Do not edit.\n';

const DECLARATIONS = `
export interface SchemaError {
  readonly instancePath: string;
  readonly keyword: string;
  readonly params: Readonly<Record<string, unknown>>;
  /** The key that breaks the rule, where the rule is one for keys. */
  readonly propertyName?: string;
}

export interface Validator {
  (value: unknown): boolean;
  readonly errors?: readonly SchemaError[] | null;
}

`;

/** The schema of the structure alone: without remarks, and with anything in the place of a single physical value. */
function structural(schemas: Schemas, { file, node }: Located): Record<string, Json> {
  const kept = Object.entries(node).filter(([key, value]) => !isRemark(key, value));
  return Object.fromEntries(kept.map(([key, value]) => [key, stripped(schemas, file, value)]));
}

function stripped(schemas: Schemas, file: string, node: Json): Json {
  if (isList(node)) return node.map((one) => stripped(schemas, file, one));
  if (!isMap(node)) return node;
  return isSingleValue(schemas, { file, node }) ? {} : structural(schemas, { file, node });
}

/** Keys of these names that hold a schema, and not a text or a list, are properties. */
function isRemark(key: string, value: Json): boolean {
  return REMARKS.has(key) && !isMap(value);
}

const REMARKS: ReadonlySet<string> = new Set(['title', 'description', 'examples', 'tsType', 'forms', 'dimension']);

/** Whether a schema is one of a physical value that is written as one text, or as a ramp or a range of such. */
function isSingleValue(schemas: Schemas, { file, node }: Located): boolean {
  const { dimension, then } = node;
  if (dimension === undefined || isMap(dimension) || 'else' in node) return false;
  return then === undefined || (isMap(then) && isSpan(schemas, { file, node: then }));
}

/** Whether all that a schema says is said of ramps and ranges, which are the measure pass's own. */
function isSpan(schemas: Schemas, { file, node }: Located): boolean {
  const { $ref: reference, then, properties } = node;
  if (typeof reference === 'string') return isSpan(schemas, referred(schemas, file, reference));
  if (properties !== undefined) return isMap(properties) && Object.keys(properties).every((key) => SPAN_KEYS.has(key));
  const branches = [then, node.else].filter((branch) => branch !== undefined);
  return branches.length > 0 && branches.every((branch) => isMap(branch) && isSpan(schemas, { file, node: branch }));
}

const SPAN_KEYS: ReadonlySet<string> = new Set(['from', 'to', 'over', 'usually', 'at_least', 'at_most']);

async function bundled(code: string): Promise<string> {
  const { outputFiles } = await build({
    stdin: { contents: code, resolveDir: import.meta.dirname },
    bundle: true,
    write: false,
    format: 'esm',
    platform: 'neutral',
    target: 'node20',
    minify: true,
    legalComments: 'none',
  });
  // The library notes as a text how its two helpers would be loaded; they are in the bundle.
  return outputFiles.map(({ text }) => text.replaceAll(/'require\("[^"]*"\)\.default'/g, "''")).join('');
}
