import { isMap, isScalar, isSeq } from 'yaml';
import { keyText, nodePlace, writtenNode } from './nodes.ts';
import { CHOICE, readHeading } from './sort.ts';
import { nearest } from '../units/suggest.ts';
import { quoted } from '../units/unit-fault.ts';
import type { ParsedNode } from 'yaml';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { Sort } from './sort.ts';

/** The sort that the first key of a document names, or why there is none. */
export function sortOfNodes(source: Source, root: ParsedNode): Sort | Fault {
  if (!isMap(root)) {
    const found = isSeq(root) ? 'a list at the top of the file' : 'a text without any key';
    return { place: source.place(root.range[0], root.range[0]), found, right: CHOICE };
  }
  const [first] = root.items;
  const heading = root.items.find((pair) => keyText(pair) === 'regimen');
  if (first === undefined) return { place: nodePlace(source, root), found: 'an empty map', right: CHOICE };
  if (heading === undefined) return noHeading(source, first.key, keyText(first));
  const sort = readHeading(isScalar(heading.value) ? heading.value.value : undefined);
  if (typeof sort !== 'string') return { place: nodePlace(source, writtenNode(heading.key, heading.value)), ...sort };
  if (heading === first) return sort;
  return {
    place: nodePlace(source, heading.key),
    found: 'regimen is not the first key',
    right: 'make it the first line',
  };
}

function noHeading(source: Source, node: ParsedNode, key: string): Fault {
  const misspelt = nearest(key, ['regimen']) !== undefined;
  const found = misspelt ? `unknown key ${quoted(key)}` : `the first key is ${quoted(key)}, not regimen`;
  return { place: nodePlace(source, node), found, right: misspelt ? 'write regimen' : CHOICE };
}
