import { isAlias, isMap, isScalar, isSeq } from 'yaml';
import { hasControl, isAscii, oddCharacter } from './characters.ts';
import { numberFault } from './numbers.ts';
import { keyText, nodePlace } from './nodes.ts';
import { slipIn } from './flow-slips.ts';
import { quoted } from '../units/unit-fault.ts';
import type { ParsedNode, Scalar, YAMLMap } from 'yaml';
import type { NodePair } from './nodes.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { Setpoint, Accuracy, Rest } from './setpoint.ts';

/** A value of a document; the measure pass puts setpoints in the place of texts. */
export type Value = string | number | boolean | null | Value[] | ValueMap | Setpoint | Rest | Accuracy;

/** Made without a prototype, so that no key means anything but itself. */
export interface ValueMap {
  [key: string]: Value;
}

/** The plain value of a node; what YAML allows and we do not goes into the faults. */
export function plainValue(source: Source, root: ParsedNode, faults: Fault[]): Value {
  return nodeValue({ source, faults, ascii: isAscii(source.text) }, root);
}

interface Reading {
  readonly source: Source;
  readonly faults: Fault[];
  readonly ascii: boolean;
}

function nodeValue(reading: Reading, node: ParsedNode | null): Value {
  if (node === null) return null;
  if (isAlias(node)) return refused(reading, node, '*', `the alias *${node.source}`);
  if (node.anchor !== undefined) refused(reading, node, '&', `the anchor &${node.anchor}`);
  if (node.tag !== undefined) refused(reading, node, '!', 'a tag');
  if (isScalar(node)) return scalarValue(reading, node);
  if (isMap(node)) return mapValue(reading, node);
  return isSeq(node) ? node.items.map((item) => nodeValue(reading, item)) : null;
}

function mapValue(reading: Reading, map: YAMLMap.Parsed): ValueMap {
  const value: ValueMap = emptyMap();
  let previous: NodePair | undefined;
  let firsts: ReadonlyMap<string, ParsedNode> | undefined;
  for (const pair of map.items) {
    const key = keyText(pair);
    const slip = map.flow === true && pair.value === null ? slipIn(reading.source, previous, pair) : undefined;
    if (key in value) firsts ??= firstKeys(map);
    const fault = slip ?? keyFault(reading, pair.key, key, key in value ? firsts?.get(key) : undefined);
    if (fault !== undefined) reading.faults.push(fault);
    else value[key] = nodeValue(reading, pair.value);
    previous = pair;
  }
  return value;
}

function emptyMap(): ValueMap {
  return { __proto__: null };
}

function scalarValue({ source, faults }: Reading, node: Scalar.Parsed): Value {
  const { value } = node;
  const fault = typeof value === 'number' ? numberFault(node.source, value) : undefined;
  if (fault !== undefined) faults.push({ place: nodePlace(source, node), ...fault });
  if (node.type === 'QUOTE_DOUBLE' && hasControl(node.source)) {
    faults.push({
      place: nodePlace(source, node),
      found: 'a control character written as an escape',
      right: 'remove it',
    });
  }
  return typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean' ? value : null;
}

/** What is wrong with a key; `first` is the same key further up, if there is one. */
function keyFault(reading: Reading, node: ParsedNode, key: string, first: ParsedNode | undefined): Fault | undefined {
  const escaped = isScalar(node) && node.type === 'QUOTE_DOUBLE';
  if (first === undefined && reading.ascii && !escaped && !REFUSED.has(key)) return undefined;
  const place = nodePlace(reading.source, node);
  if (key === '__proto__') return { place, found: 'the key __proto__', right: 'choose another name' };
  if (key === '<<') return { place, found: 'a merge key (<<)', right: 'write the keys out' };
  if (key === '') return { place, found: 'a value without a key', right: 'write a key before the colon' };
  if (first !== undefined) {
    const { line } = nodePlace(reading.source, first);
    return { place, found: `a second ${quoted(key)}, the first is in line ${line}`, right: 'keep one of both' };
  }
  if (hasControl(key)) return { place, found: 'a key with a control character', right: 'write a plain name' };
  const odd = oddCharacter(key);
  return odd === undefined
    ? undefined
    : { place, found: `${odd} in the key ${quoted(key)}`, right: 'write a plain character' };
}

const REFUSED: ReadonlySet<string> = new Set(['__proto__', '<<', '']);

function firstKeys(map: YAMLMap.Parsed): ReadonlyMap<string, ParsedNode> {
  const firsts = new Map<string, ParsedNode>();
  for (const pair of map.items) if (!firsts.has(keyText(pair))) firsts.set(keyText(pair), pair.key);
  return firsts;
}

/** What stands before a node, from its sign on, is told with the node. */
function refused({ source, faults }: Reading, node: ParsedNode, sign: string, found: string): null {
  const start = source.text.lastIndexOf(sign, node.range[0]);
  const right = 'write the value itself, in quotes where it is text';
  faults.push({ place: source.place(start, node.range[1]), found, right });
  return null;
}
