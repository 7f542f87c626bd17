import { nodePlace } from './nodes.ts';
import { CHOICE, readHeading } from './sort.ts';
import { nearest } from '../units/suggest.ts';
import { quoted } from '../units/unit-fault.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { KeyNode, Node } from './nodes.ts';
import type { Sort } from './sort.ts';

/** The sort that the first key of a document names, or why there is none. */
export function sortOfNodes(source: Source, root: Node): Sort | Fault {
  if (root.kind !== 'map') {
    const found = root.kind === 'list' ? 'a list at the top of the file' : 'a text without any key';
    return { place: source.place(root.start), found, right: CHOICE };
  }
  const [first] = root.pairs;
  const heading = root.pairs.find(({ key }) => key.text === 'regimen');
  if (first === undefined) return { place: nodePlace(source, root), found: 'an empty map', right: CHOICE };
  if (heading === undefined) return noHeading(source, first.key);
  const sort = readHeading(heading.value.kind === 'scalar' ? heading.value.value : undefined);
  if (typeof sort !== 'string') return { place: nodePlace(source, heading.value), ...sort };
  if (heading === first) return sort;
  return {
    place: nodePlace(source, heading.key),
    found: 'regimen is not the first key',
    right: 'make it the first line',
  };
}

function noHeading(source: Source, node: KeyNode): Fault {
  const { text: key } = node;
  const misspelt = nearest(key, ['regimen']) !== undefined;
  const found = misspelt ? `unknown key ${quoted(key)}` : `the first key is ${quoted(key)}, not regimen`;
  return { place: nodePlace(source, node), found, right: misspelt ? 'write regimen' : CHOICE };
}
