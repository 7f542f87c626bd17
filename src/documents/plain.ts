import { isAlias, isMap, isScalar, isSeq } from 'yaml';
import { hasControl, oddCharacter } from './characters.ts';
import { numberFault } from './numbers.ts';
import { keyText, nodePlace } from './nodes.ts';
import { slipIn } from './flow-slips.ts';
import { quoted } from '../units/unit-fault.ts';
import type { ParsedNode, Scalar, YAMLMap } from 'yaml';
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
export function plainValue(source: Source, node: ParsedNode | null, faults: Fault[]): Value {
  if (node === null) return null;
  if (isAlias(node)) return refused(source, node, `the alias *${node.source}`, faults);
  if (node.anchor !== undefined) refused(source, node, `the anchor &${node.anchor}`, faults);
  if (node.tag !== undefined) refused(source, node, 'a tag', faults);
  if (isScalar(node)) return scalarValue(source, node, faults);
  if (isMap(node)) return mapValue(source, node, faults);
  return isSeq(node) ? node.items.map((item) => plainValue(source, item, faults)) : null;
}

function mapValue(source: Source, map: YAMLMap.Parsed, faults: Fault[]): ValueMap {
  const value: ValueMap = emptyMap();
  let previous: YAMLMap.Parsed['items'][number] | undefined;
  for (const pair of map.items) {
    const key = keyText(pair);
    const slip = map.flow === true && pair.value === null ? slipIn(source, previous, pair) : undefined;
    const fault = slip ?? keyFault(source, map, pair.key, key, key in value);
    if (fault !== undefined) faults.push(fault);
    else value[key] = plainValue(source, pair.value, faults);
    previous = pair;
  }
  return value;
}

function emptyMap(): ValueMap {
  const map: ValueMap = Object.create(null);
  return map;
}

function scalarValue(source: Source, node: Scalar.Parsed, faults: Fault[]): Value {
  const { value } = node;
  const fault = typeof value === 'number' ? numberFault(node.source, value) : undefined;
  if (fault !== undefined) faults.push({ place: nodePlace(source, node), ...fault });
  if (node.type === 'QUOTE_DOUBLE' && hasControl(node.source)) {
    faults.push({ place: nodePlace(source, node), found: 'a control character written as an escape', right: 'remove it' });
  }
  return typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean' ? value : null;
}

function keyFault(source: Source, map: YAMLMap.Parsed, node: ParsedNode, key: string, known: boolean): Fault | undefined {
  const place = nodePlace(source, node);
  if (key === '__proto__') return { place, found: 'the key __proto__', right: 'choose another name' };
  if (key === '<<') return { place, found: 'a merge key (<<)', right: 'write the keys out' };
  if (key === '') return { place, found: 'a value without a key', right: 'write a key before the colon' };
  if (known) return { place, found: `a second ${quoted(key)}${firstOf(source, map, key)}`, right: 'keep one of both' };
  if (hasControl(key)) return { place, found: 'a key with a control character', right: 'write a plain name' };
  const odd = oddCharacter(key);
  return odd === undefined ? undefined : { place, found: `${odd} in the key ${quoted(key)}`, right: 'write a plain character' };
}

function firstOf(source: Source, map: YAMLMap.Parsed, key: string): string {
  const first = map.items.find((pair) => keyText(pair) === key);
  return first === undefined ? '' : `, the first is in line ${nodePlace(source, first.key).line}`;
}

function refused(source: Source, node: ParsedNode, found: string, faults: Fault[]): null {
  const right = 'write the value itself, in quotes where it is text';
  faults.push({ place: nodePlace(source, node), found, right });
  return null;
}
