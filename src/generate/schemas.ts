import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { SORTS } from '../documents/sort.ts';

/** A JSON value, as a schema or one of its nodes. */
export type Json = string | number | boolean | null | readonly Json[] | JsonMap;
export interface JsonMap {
  readonly [key: string]: Json;
}

/** Schemas of the documents by file name: one of each sort's name, and `common.json` with what they share. */
export function documentSchemas(folder: string): ReadonlyMap<string, JsonMap> {
  const wanted = new Set(['common.json', ...SORTS.map((sort) => `${sort}.json`)]);
  const names = readdirSync(folder).filter((name) => wanted.has(name));
  return new Map(names.sort().map((name) => [name, readSchema(join(folder, name))]));
}

export function isMap(value: Json | undefined): value is JsonMap {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

export function isList(value: Json | undefined): value is readonly Json[] {
  return Array.isArray(value);
}

/** A text; empty for anything else. */
export function textOf(value: Json | undefined): string {
  return typeof value === 'string' ? value : '';
}

/** The schema node that a `$ref` leads to, and the file in which its own references are read. */
export function referred(schemas: ReadonlyMap<string, JsonMap>, file: string, reference: string): Located {
  const [target = '', pointer = ''] = reference.split('#');
  const home = target === '' ? file : target;
  let node: Json | undefined = schemas.get(home);
  for (const step of pointer.split('/').slice(1)) node = isMap(node) ? node[step] : undefined;
  if (!isMap(node)) throw new Error(`${file}: ${reference} leads nowhere`);
  return { file: home, node };
}

/** A schema node with the file it stands in. */
export interface Located {
  readonly file: string;
  readonly node: JsonMap;
}

function readSchema(path: string): JsonMap {
  const schema: unknown = JSON.parse(readFileSync(path, 'utf8'));
  if (!isJson(schema) || !isMap(schema)) throw new Error(`${path} is no schema`);
  return schema;
}

/** Whatever JSON can hold has been parsed from it. */
function isJson(value: unknown): value is Json {
  return typeof value !== 'undefined' && typeof value !== 'function';
}
