import { hasControl, oddCharacter } from './characters.ts';
import { numberFault } from './numbers.ts';
import { nodePlace } from './nodes.ts';
import { quoted } from '../units/unit-fault.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { KeyNode, MapNode, Node, ScalarNode } from './nodes.ts';
import type { Setpoint, Accuracy, Rest } from './setpoint.ts';

/** A value of a document; the measure pass puts setpoints in the place of texts. */
export type Value = string | number | boolean | null | Value[] | ValueMap | Setpoint | Rest | Accuracy;

/** Made without a prototype, so that no key means anything but itself. */
export interface ValueMap {
  [key: string]: Value;
}

/** The plain value of a node; what YAML allows and we do not goes into the faults. */
export function plainValue(source: Source, root: Node, faults: Fault[]): Value {
  return nodeValue({ source, faults }, root);
}

interface Reading {
  readonly source: Source;
  readonly faults: Fault[];
}

function nodeValue(reading: Reading, node: Node): Value {
  if (node.kind === 'scalar') return scalarValue(reading, node);
  return node.kind === 'map' ? mapValue(reading, node) : node.items.map((item) => nodeValue(reading, item));
}

function mapValue(reading: Reading, map: MapNode): ValueMap {
  const value = emptyMap();
  let firsts: ReadonlyMap<string, KeyNode> | undefined;
  for (const { key, value: node } of map.pairs) {
    const { text } = key;
    if (text in value) firsts ??= firstKeys(map);
    const fault = keyFault(reading, key, text in value ? firsts?.get(text) : undefined);
    if (fault !== undefined) reading.faults.push(fault);
    else value[text] = nodeValue(reading, node);
  }
  return value;
}

function emptyMap(): ValueMap {
  return { __proto__: null };
}

function scalarValue({ source, faults }: Reading, node: ScalarNode): string | number | boolean | null {
  const { value } = node;
  const fault = typeof value === 'number' ? numberFault(node.source, value) : undefined;
  if (fault !== undefined) faults.push({ place: nodePlace(source, node), ...fault });
  return value;
}

/** What is wrong with a key; `first` is the same key further up, if there is one. */
function keyFault({ source }: Reading, node: KeyNode, first: KeyNode | undefined): Fault | undefined {
  const { text: key } = node;
  if (first === undefined && ORDINARY.test(key) && key !== '__proto__') return undefined;
  const place = nodePlace(source, node);
  if (key === '__proto__') return { place, found: 'the key __proto__', right: 'choose another name' };
  if (key === '<<') return { place, found: 'a merge key (<<)', right: 'write the keys out' };
  if (key === '') return { place, found: 'a value without a key', right: 'write a key before the colon' };
  if (first !== undefined) {
    const { line } = nodePlace(source, first);
    return { place, found: `a second ${quoted(key)}, the first is in line ${line}`, right: 'keep one of both' };
  }
  if (hasControl(key)) return { place, found: 'a key with a control character', right: 'write a plain name' };
  const odd = oddCharacter(key);
  return odd === undefined
    ? undefined
    : { place, found: `${odd} in the key ${quoted(key)}`, right: 'write a plain character' };
}

/** Keys that need no closer look. */
const ORDINARY = /^[\w.+-]+$/;

function firstKeys({ pairs }: MapNode): ReadonlyMap<string, KeyNode> {
  const firsts = new Map<string, KeyNode>();
  for (const { key } of pairs) if (!firsts.has(key.text)) firsts.set(key.text, key);
  return firsts;
}
