import { build } from 'esbuild';
import { Ajv2020 } from 'ajv/dist/2020.js';
import standaloneCode from 'ajv/dist/standalone/index.js';
import { SORTS } from './schemas.ts';
import type { JsonMap } from './schemas.ts';

/** One module with a validator for each sort of document, without a `require` left in it. */
export async function validatorsModule(schemas: ReadonlyMap<string, JsonMap>): Promise<string> {
  const ajv = new Ajv2020({
    strict: true,
    allowUnionTypes: true,
    ownProperties: true,
    allErrors: true,
    messages: false,
    code: { source: true, esm: true, lines: true },
  });
  ajv.addVocabulary(['dimension', 'forms', 'tsType']);
  for (const schema of schemas.values()) ajv.addSchema(schema);
  const ids = Object.fromEntries(SORTS.map((sort) => [sort, `https://regimen.invalid/schemas/${sort}.json`]));
  const code = await bundled(standaloneCode.default(ajv, ids));
  if (process.env.DBG) console.error([...code.matchAll(/.{80}\brequire\s*\(.{80}/gs)].map(String));
  return `${MADE}${code}`;
}

/** The types of that module. */
export function validatorsTypes(): string {
  const names = SORTS.map((sort) => `export const ${sort}: Validator;\n`).join('');
  return `${MADE}${DECLARATIONS}${names}`;
}

const MADE = '// Made by `npm run generate` from schemas/. Do not edit.\n';

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

async function bundled(code: string): Promise<string> {
  const { outputFiles } = await build({
    stdin: { contents: code, resolveDir: process.cwd() },
    bundle: true,
    write: false,
    format: 'esm',
    platform: 'neutral',
    target: 'node20',
    minifySyntax: true,
    minifyWhitespace: true,
    legalComments: 'none',
  });
  return outputFiles[0]?.text ?? '';
}
