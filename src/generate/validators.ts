import { build } from 'esbuild';
import { Ajv2020 } from 'ajv/dist/2020.js';
import standalone from 'ajv/dist/standalone/index.js';
import { isMap, SORTS } from './schemas.ts';
import type { Json, JsonMap } from './schemas.ts';

/**
 * One module with a validator for each sort of document, without a `require` left in it. What the measure pass reads and
 * checks by itself, single physical values and their spans, is left to it: the validators are half as large so.
 */
export async function validatorsModule(schemas: ReadonlyMap<string, JsonMap>): Promise<string> {
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
  for (const schema of schemas.values()) ajv.addSchema(structural(schema));
  const ids = Object.fromEntries(SORTS.map((sort) => [sort, String(schemas.get(`${sort}.json`)?.['$id'])]));
  const code = await bundled(standalone.default(ajv, ids));
  if (code.replaceAll(/'[^'\n]*'|"[^"\n]*"/g, '').match(/\brequire\b/) !== null) throw new Error('a require is left');
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
  readonly schemaPath: string;
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
function structural(schema: JsonMap): Record<string, Json> {
  const kept = Object.entries(schema).filter(([key, value]) => !isRemark(key, value));
  return Object.fromEntries(kept.map(([key, value]) => [key, stripped(value)]));
}

function stripped(node: Json): Json {
  if (Array.isArray(node)) return node.map(stripped);
  if (!isMap(node)) return node;
  return isSingleValue(node) ? {} : structural(node);
}

/** Keys of these names that hold a schema, and not a text or a list, are properties. */
function isRemark(key: string, value: Json): boolean {
  return REMARKS.has(key) && !isMap(value);
}

const REMARKS: ReadonlySet<string> = new Set(['title', 'description', 'examples', 'tsType', 'forms', 'dimension']);

/** Whether a schema is one of a physical value that is written as one text, or as a ramp or a range of such. */
export function isSingleValue(node: JsonMap): boolean {
  const { dimension, then } = node;
  if (dimension === undefined || isMap(dimension) || 'else' in node) return false;
  const reference = isMap(then) ? then['$ref'] : undefined;
  return then === undefined || (typeof reference === 'string' && /\/(span|ramp|range)$/.test(reference));
}

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
  return outputFiles.map(({ text }) => text).join('');
}
