import { compile } from 'json-schema-to-typescript';
import { isList, isMap, referred, textOf } from './schemas.ts';
import { SORTS } from '../documents/sort.ts';
import type { Json, JsonMap, Located } from './schemas.ts';

type Schemas = ReadonlyMap<string, JsonMap>;

/** What a node's types are made from, with the names given so far. */
interface Naming {
  readonly schemas: Schemas;
  readonly given: Set<string>;
}

/** The module of the documents' types, as the measure pass leaves their contents. */
export async function typesModule(schemas: Schemas): Promise<string> {
  const code = await compile(together(schemas), 'Documents', {
    bannerComment: '',
    unreachableDefinitions: true,
    additionalProperties: false,
    style: { printWidth: 120, singleQuote: true },
  });
  const plainCode = code.replaceAll(/ \*\n \* This interface was referenced by .*\n \* via the `definition` .*\n/g, '');
  return `${HEAD}import type { ${used(plainCode).join(', ')} } from '../setpoint.ts';\n\n${plainCode}`;
}

const HEAD = '// Made by `npm run generate` from schemas/. Do not edit.\n';

/** Types of the measure pass that the code names. */
function used(code: string): readonly string[] {
  const types = ['Accuracy', 'Fixed', 'None', 'Ramp', 'Range', 'Rest', 'Setpoint', 'Unknown'];
  return types.filter((type) => new RegExp(`(?<!'|\\* .*)\\b${type}\\b(?!\\w|'|\\??:)`).test(code));
}

/** One schema that holds all of them: definitions keep their names, and maps as long as no other has taken theirs. */
function together(schemas: Schemas): Record<string, Json> {
  const nodes = definitionsOf(schemas);
  const naming: Naming = { schemas, given: new Set(nodes.map(({ node }) => textOf(node.title))) };
  const definitions = nodes.map(({ file, key, node }): [string, Json] => {
    const plainNode = plain(naming, { file, node }, node);
    return [nameOf(file, key), isMap(plainNode) ? { ...plainNode, title: node.title ?? key } : plainNode];
  });
  const properties = Object.fromEntries(SORTS.map((sort) => [sort, { $ref: `#/$defs/${nameOf(`${sort}.json`, '')}` }]));
  return {
    title: 'Documents',
    type: 'object',
    additionalProperties: false,
    properties,
    required: [...SORTS],
    $defs: Object.fromEntries(definitions),
  };
}

interface Definition extends Located {
  readonly key: string;
}

function definitionsOf(schemas: Schemas): readonly Definition[] {
  return [...schemas].flatMap(([file, schema]) => {
    const shared = Object.entries(isMap(schema.$defs) ? schema.$defs : {});
    const named = shared.flatMap(([key, node]) => (isMap(node) && isNamed(node) ? [{ file, key, node }] : []));
    return file === 'common.json' ? named : [{ file, key: '', node: schema }, ...named];
  });
}

function nameOf(file: string, key: string): string {
  return `${file.replace('.json', '')}${key === '' ? '' : `-${key}`}`;
}

/** Maps and lists; ramps and ranges are types of the measure pass. */
function isNamed({ type, tsType, properties, additionalProperties, items }: JsonMap): boolean {
  if (tsType !== undefined) return false;
  return (
    (type === 'object' && (properties !== undefined || isMap(additionalProperties))) ||
    (type === 'array' && items !== undefined)
  );
}

/** A node as the compiler of types shall see it, with the description of the place that refers to it. */
function plain(naming: Naming, { file, node }: Located, site: JsonMap): Json {
  const reference = node.$ref;
  if (typeof reference === 'string') return throughReference(naming, file, reference, { ...node, ...aboutSite(site) });
  const result: Record<string, Json> = {};
  for (const [key, value] of Object.entries(node)) {
    if (DROPPED.has(key)) continue;
    result[key] = key === 'properties' && isMap(value) ? ofEach(naming, file, value) : below(naming, file, value);
  }
  const title = titleOf(naming, node);
  return { ...result, ...(title === undefined ? {} : { title }), ...aboutSite(site) };
}

/** Branches only narrow what is said without them; the rest means nothing to a type. */
const DROPPED: ReadonlySet<string> = new Set([
  '$id',
  '$schema',
  '$defs',
  'title',
  'examples',
  'if',
  'then',
  'else',
  'propertyNames',
  'not',
]);

/** The first map of a title becomes a type of that name; others are written out where they stand. */
function titleOf({ given }: Naming, node: JsonMap): string | undefined {
  const { title, type } = node;
  if (typeof title !== 'string' || type !== 'object' || !isNamed(node) || given.has(title)) return undefined;
  given.add(title);
  return title;
}

function aboutSite({ description }: JsonMap): { readonly description?: string } {
  return typeof description === 'string' ? { description } : {};
}

function throughReference(naming: Naming, file: string, reference: string, site: JsonMap): Json {
  const target = referred(naming.schemas, file, reference);
  if (!isNamed(target.node)) return plain(naming, target, site);
  return { $ref: `#/$defs/${nameOf(target.file, reference.split('/').at(-1) ?? '')}` };
}

function ofEach(naming: Naming, file: string, map: JsonMap): Json {
  return Object.fromEntries(Object.entries(map).map(([key, value]) => [key, below(naming, file, value)]));
}

function below(naming: Naming, file: string, value: Json): Json {
  if (isList(value)) return value.map((one) => below(naming, file, one));
  return isMap(value) ? plain(naming, { file, node: value }, value) : value;
}
