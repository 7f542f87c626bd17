import { nodePlace } from './nodes.ts';
import { childOf } from './rules.ts';
import { quoted } from '../units/unit-fault.ts';
import type { Source, TextPlace } from '../shelf/place.ts';
import type { Pointer } from './document.ts';
import type { KeyNode, Node } from './nodes.ts';
import type { Value } from './plain.ts';
import type { Sort } from './sort.ts';

/** Where the value that a pointer leads to stands, or its key; the last place on the way, where it leads past the end. */
export function placeOf(source: Source, root: Node, pointer: Pointer, part: 'key' | 'value' = 'value'): TextPlace {
  let node = root;
  let key: Node | KeyNode = root;
  for (const step of pointer) {
    const next = stepInto(node, step);
    if (next === undefined) break;
    node = next.value;
    key = next.key;
  }
  return nodePlace(source, part === 'key' ? key : node);
}

/** Node and key at one step of a pointer; an entry of a list has no key but itself. */
function stepInto(
  node: Node,
  step: string | number,
): { readonly key: Node | KeyNode; readonly value: Node } | undefined {
  if (node.kind === 'map') return node.pairs.find(({ key }) => key.text === String(step));
  const item = node.kind === 'list' ? node.items[Number(step)] : undefined;
  return item === undefined ? undefined : { key: item, value: item };
}

/** The pointer that a path such as `/steps/0/flows` spells, indices of lists as numbers. */
export function pointerOf(content: Value, path: string): Pointer {
  const pointer: (string | number)[] = [];
  let value: Value | undefined = content;
  for (const part of path.split('/').slice(1)) {
    const key = part.replaceAll('~1', '/').replaceAll('~0', '~');
    const step = Array.isArray(value) ? Number(key) : key;
    pointer.push(step);
    value = childOf(value, step);
  }
  return pointer;
}

/** The key that a value stands at, that of its list for an entry. */
export function nameAt(pointer: Pointer, sort: Sort): string {
  const name = pointer.findLast((step) => typeof step === 'string');
  return typeof name === 'string' ? name : sort;
}

/** ` in flows`, ` in 'settle'`; nothing at the top. */
export function within(owner: Value | undefined, pointer: Pointer, sort: Sort): string {
  return pointer.length === 0 ? '' : ` in ${ownerName(owner, pointer, sort)}`;
}

/** What a map is called in a message: by its own name, else by the key it stands at. */
export function ownerName(owner: Value | undefined, pointer: Pointer, sort: Sort): string {
  const name = pointer.length === 0 ? undefined : childOf(owner, 'name');
  if (typeof name === 'string') return quoted(name);
  const key = nameAt(pointer, sort);
  if (pointer.length === 0) return `the ${key}`;
  return typeof pointer.at(-1) === 'number' ? `this entry of ${key}` : key;
}
