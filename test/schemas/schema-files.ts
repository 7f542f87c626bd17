import { readFileSync, readdirSync } from 'node:fs';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { parse } from 'yaml';
import { isMap } from '../../src/generate/schemas.ts';
import type { ErrorObject, ValidateFunction } from 'ajv/dist/2020.js';
import type { Json, JsonMap } from '../../src/generate/schemas.ts';

/** Every schema of the project by its file name. */
export const SCHEMAS: ReadonlyMap<string, JsonMap> = new Map(
  readdirSync('schemas').map((file) => [file, readMap(`schemas/${file}`)]),
);

/** The sorts of document that a site writes. */
export const DOCUMENT_SORTS = ['recipe', 'chamber', 'substances', 'process', 'site'];

const ajv = withSchemas();

/** The validator at a pointer of a schema file; the whole schema without one. */
export function validator(file: string, pointer = ''): ValidateFunction {
  return ajv.compile({ $ref: `${file}#${pointer}` });
}

/**
 * Faults of a document by the schema of its sort, each as the path where it stands, the rule that it breaks and the key that
 * the rule is about. Rules that only repeat what another says of the same mistake (`if`, `propertyNames`) are left out.
 */
export function faults(document: JsonMap): string[] {
  const validate = validator(`${sortOf(document)}.json`);
  validate(document);
  return (validate.errors ?? []).filter(({ keyword }) => keyword !== 'if' && keyword !== 'propertyNames').map(told);
}

/** The sort that a document says it is of; the empty text where it says none. */
export function sortOf({ regimen }: JsonMap): string {
  return typeof regimen === 'string' ? (regimen.split(' ')[0] ?? '') : '';
}

/** Whether a value is one that JSON can hold. */
export function isJson(value: unknown): value is Json {
  if (value === null || typeof value === 'string' || typeof value === 'boolean') return true;
  if (typeof value === 'number') return Number.isFinite(value);
  return typeof value === 'object' && Object.values(value).every(isJson);
}

export function isList(value: Json | undefined): value is readonly Json[] {
  return Array.isArray(value);
}

/** A sample document of `test/schemas/samples`. */
export function sample(name: string): JsonMap {
  const document: unknown = parse(readFileSync(`test/schemas/samples/${name}`, 'utf8'), { maxAliasCount: 0 });
  if (!isJson(document) || !isMap(document)) throw new Error(`${name} is no document`);
  return document;
}

export const SAMPLE_NAMES: readonly string[] = readdirSync('test/schemas/samples');

function told({ instancePath, keyword, params, propertyName }: ErrorObject): string {
  const about: unknown = params.missingProperty ?? params.additionalProperty ?? propertyName;
  return [instancePath, keyword, ...(typeof about === 'string' ? [about] : [])].join(' ');
}

function withSchemas(): Ajv2020 {
  const compiler = new Ajv2020({ strict: true, allowUnionTypes: true, allErrors: true });
  for (const keyword of ['dimension', 'forms', 'tsType']) compiler.addKeyword({ keyword });
  for (const schema of SCHEMAS.values()) compiler.addSchema(schema);
  return compiler;
}

function readMap(path: string): JsonMap {
  const schema: unknown = JSON.parse(readFileSync(path, 'utf8'));
  if (!isJson(schema) || !isMap(schema)) throw new Error(`${path} is no schema`);
  return schema;
}
