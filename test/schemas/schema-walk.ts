import { isMap, referred } from '../../src/generate/schemas.ts';
import { SCHEMAS, isList } from './schema-files.ts';
import type { Json, JsonMap, Located } from '../../src/generate/schemas.ts';

/** A node of a schema, where it stands and what it is there. */
export interface SchemaNode extends Located {
  readonly pointer: string;
  /** `key`: the schema of a key or of what stands under any name; `item`: of an entry of a list; `def`: a shared definition. */
  readonly role: 'root' | 'key' | 'item' | 'def' | 'branch';
}

/** Every node of every schema. Nodes that only forbid a key (`true`, or `not` with the reason) are left out. */
export function schemaNodes(): SchemaNode[] {
  const found: SchemaNode[] = [];
  for (const [file, node] of SCHEMAS) collect({ file, node, pointer: '', role: 'root' }, found);
  return found;
}

/** The node itself, or where it is nothing but a reference, the one that it leads to. */
export function meant({ file, node }: Located): Located {
  const reference = node.$ref;
  return typeof reference === 'string' && Object.keys(node).length === 1
    ? referred(SCHEMAS, file, reference)
    : { file, node };
}

/** Names `file#pointer` of the keys that a document uses, by a schema file; both ways of an `if` are taken. */
export function keysUsed(file: string, document: Json): Set<string> {
  const used = new Set<string>();
  const root = SCHEMAS.get(file);
  if (root !== undefined) follow({ file, node: root, pointer: '' }, document, used);
  return used;
}

function collect(at: SchemaNode, found: SchemaNode[]): void {
  if (at.node.not !== undefined) return;
  found.push(at);
  const under = (step: string, child: Json | undefined, role: SchemaNode['role']): void => {
    if (isMap(child)) collect({ file: at.file, node: child, pointer: `${at.pointer}/${step}`, role }, found);
  };
  for (const [name, child] of entries(at.node.$defs)) under(`$defs/${escaped(name)}`, child, 'def');
  for (const [name, child] of entries(at.node.properties)) under(`properties/${escaped(name)}`, child, 'key');
  under('additionalProperties', at.node.additionalProperties, 'key');
  under('items', at.node.items, 'item');
  for (const branch of ['then', 'else']) under(branch, at.node[branch], 'branch');
}

type At = Located & { readonly pointer: string };

function follow(at: At, value: Json, used: Set<string>): void {
  const { file, node, pointer } = at;
  const reference = node.$ref;
  if (typeof reference === 'string') {
    const target = referred(SCHEMAS, file, reference);
    follow({ ...target, pointer: reference.split('#')[1] ?? '' }, value, used);
  }
  for (const branch of ['then', 'else']) {
    const child = node[branch];
    if (isMap(child)) follow({ file, node: child, pointer: `${pointer}/${branch}` }, value, used);
  }
  if (isMap(value)) followKeys(at, value, used);
  const items = node.items;
  if (isList(value) && isMap(items)) {
    for (const entry of value) follow({ file, node: items, pointer: `${pointer}/items` }, entry, used);
  }
}

function followKeys({ file, node, pointer }: At, value: JsonMap, used: Set<string>): void {
  const properties = new Map(entries(node.properties));
  for (const [key, inner] of Object.entries(value)) {
    const named = properties.get(key);
    const child = named ?? node.additionalProperties;
    const step = named === undefined ? 'additionalProperties' : `properties/${escaped(key)}`;
    if (!isMap(child)) continue;
    used.add(`${file}#${pointer}/${step}`);
    follow({ file, node: child, pointer: `${pointer}/${step}` }, inner, used);
  }
}

function entries(node: Json | undefined): [string, Json][] {
  return isMap(node) ? Object.entries(node) : [];
}

/** A name as a step of a JSON pointer in a reference. */
function escaped(name: string): string {
  return encodeURIComponent(name.replaceAll('~', '~0').replaceAll('/', '~1'));
}
