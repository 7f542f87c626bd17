import { isList, isMap } from './schemas.ts';
import type { Json, JsonMap } from './schemas.ts';

/** The module from which messages take what a schema says: descriptions, examples, keys and the branches to them. */
export function ruleTextsModule(schemas: ReadonlyMap<string, JsonMap>): string {
  const all = Object.fromEntries([...schemas].map(([file, schema]) => [file, ruleTexts(file, schema)]));
  return `// Made by \`npm run generate\` from schemas/. Do not edit.
/** The schemas by file name, as JSON that is parsed when a message needs it. */
export const SCHEMAS = ${quotedText(JSON.stringify(all))};
`;
}

/** A literal in single quotes, since JSON is full of double ones; in ASCII, which is read fastest. */
export function quotedText(text: string): string {
  const escaped = text.replaceAll('\\', '\\\\').replaceAll("'", "\\'").replaceAll('\n', '\\n');
  return `'${escaped.replaceAll(/[^ -~]/g, (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`)}'`;
}

function ruleTexts(file: string, schema: JsonMap): Json {
  const rule: Record<string, Json> = {};
  for (const [key, value] of Object.entries(schema)) {
    if (key === '$ref' && typeof value === 'string') rule[key] = value.startsWith('#') ? `${file}${value}` : value;
    else if (key === 'examples' && isList(value)) Object.assign(rule, exampleOf(value));
    else if (MAPS.has(key) && isMap(value)) rule[key] = ofEach(file, value);
    else if (SUBSCHEMAS.has(key)) rule[key] = subschema(file, value);
    else if (KEPT.has(key)) rule[key] = value;
  }
  return rule;
}

const MAPS: ReadonlySet<string> = new Set(['properties', '$defs']);
const SUBSCHEMAS: ReadonlySet<string> = new Set([
  'if',
  'then',
  'else',
  'not',
  'items',
  'additionalProperties',
  'propertyNames',
  'allOf',
  'anyOf',
]);
const KEPT: ReadonlySet<string> = new Set(['description', 'type', 'const', 'pattern', 'required']);

/** The first example that fits on a line. */
function exampleOf(examples: readonly Json[]): { readonly example?: Json } {
  const example = examples.find((one) => typeof one !== 'object');
  return example === undefined ? {} : { example };
}

function ofEach(file: string, map: JsonMap): Json {
  return Object.fromEntries(Object.entries(map).map(([key, value]) => [key, subschema(file, value)]));
}

function subschema(file: string, value: Json): Json {
  if (isList(value)) return value.map((one) => subschema(file, one));
  return isMap(value) ? ruleTexts(file, value) : value;
}
