import { isAlias, isMap, isScalar } from 'yaml';
import { hasControl } from './characters.ts';
import { slipIn } from './flow-slips.ts';
import { emptyAt } from './nodes.ts';
import type { ParsedNode, Scalar, YAMLMap, YAMLSeq } from 'yaml';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { KeyNode, ListNode, MapNode, Node, NodePair, ScalarNode } from './nodes.ts';

/** Our nodes for those of YAML; what YAML allows in them and we do not goes into the faults. */
export function fromYaml(source: Source, root: ParsedNode, faults: Fault[]): Node {
  return toNode({ source, faults }, root);
}

interface Reading {
  readonly source: Source;
  readonly faults: Fault[];
}

function toNode(reading: Reading, node: ParsedNode): Node {
  if (isAlias(node)) {
    refused(reading, node, '*', `the alias *${node.source}`);
    return { kind: 'scalar', ...rangeOf(node), value: null, source: '' };
  }
  refuseProperties(reading, node);
  if (isScalar(node)) return toScalar(reading, node);
  return isMap(node) ? toMap(reading, node) : toList(reading, node);
}

function toScalar({ source, faults }: Reading, node: Scalar.Parsed): ScalarNode {
  const { value } = node;
  const { start, end } = rangeOf(node);
  if (node.type === 'QUOTE_DOUBLE' && hasControl(node.source)) {
    faults.push({
      place: source.place(start, end),
      found: 'a control character written as an escape',
      right: 'remove it',
    });
  }
  const simple = typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean' ? value : null;
  return { kind: 'scalar', start, end, value: simple, source: node.source };
}

function toMap(reading: Reading, map: YAMLMap.Parsed): MapNode {
  const pairs: NodePair[] = [];
  let before: KeyNode | undefined;
  for (const { key: keyNode, value } of map.items) {
    const key = toKey(reading, keyNode);
    const slip = map.flow === true && value === null ? slipIn(reading.source, before, key) : undefined;
    if (slip === undefined) pairs.push({ key, value: toValue(reading, key, value) });
    else reading.faults.push(slip);
    before = slip === undefined && isScalar(value) ? { ...rangeOf(value), text: value.source } : key;
  }
  const { start, end } = rangeOf(map);
  return { kind: 'map', start, end: map.flow === true ? end : (pairs.at(-1)?.value.end ?? end), pairs };
}

function toKey(reading: Reading, node: ParsedNode): KeyNode {
  refuseProperties(reading, node);
  return { ...rangeOf(node), text: isScalar(node) && typeof node.value === 'string' ? node.value : '' };
}

function toValue(reading: Reading, key: KeyNode, node: ParsedNode | null): Node {
  const isEmpty = node === null || (isScalar(node) && node.value === null && node.source === '');
  if (!isEmpty) return toNode(reading, node);
  if (node !== null) refuseProperties(reading, node);
  return emptyAt(key);
}

function toList(reading: Reading, list: YAMLSeq.Parsed): ListNode {
  const items = list.items.map((item) => toNode(reading, item));
  const { start, end } = rangeOf(list);
  return { kind: 'list', start, end: list.flow === true ? end : (items.at(-1)?.end ?? end), items };
}

function rangeOf({ range: [start, end] }: ParsedNode): { readonly start: number; readonly end: number } {
  return { start, end };
}

function refuseProperties(reading: Reading, node: ParsedNode): void {
  if (isAlias(node)) return;
  if (node.anchor !== undefined) refused(reading, node, '&', `the anchor &${node.anchor}`);
  if (node.tag !== undefined) refused(reading, node, '!', 'a tag');
}

/** What stands before a node, from its sign on, is told with the node. */
function refused({ source, faults }: Reading, node: ParsedNode, sign: string, found: string): void {
  const start = source.text.lastIndexOf(sign, node.range[0]);
  const right = 'write the value itself, in quotes where it is text';
  faults.push({ place: source.place(start, node.range[1]), found, right });
}
