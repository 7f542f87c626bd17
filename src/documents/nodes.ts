import { isScalar } from 'yaml';
import type { ParsedNode, YAMLMap } from 'yaml';
import type { Source, TextPlace } from '../shelf/place.ts';

export type NodePair = YAMLMap.Parsed['items'][number];

/** A key's text. */
export function keyText(pair: NodePair): string {
  return isScalar(pair.key) && typeof pair.key.value === 'string' ? pair.key.value : '';
}

/** The value, or the key where nothing is written behind it: `pressure:` and the end of the line. */
export function writtenNode(key: ParsedNode, value: ParsedNode | null): ParsedNode {
  return value === null || (isScalar(value) && value.value === null && value.source === '') ? key : value;
}

export function nodePlace(source: Source, node: ParsedNode): TextPlace {
  return source.place(node.range[0], node.range[1]);
}
