import { nearest } from '../units/suggest.ts';
import { quoted } from '../units/unit-fault.ts';
import { wholeFile } from './fault.ts';
import { folderOf, nameOf } from './paths.ts';
import type { Fault } from './fault.ts';
import type { Shelf } from './shelf.ts';

/** Why the path, under which nothing was found, may be wrong: its folder is missing, or a like name stands in it. */
export function absentFault(shelf: Pick<Shelf, 'list'>, path: string, name: string): Fault {
  const place = wholeFile(name);
  if (path === '') return { place, found: 'an empty path', right: 'the path of a file' };
  if (path.includes('\uFFFD')) return { place, found: 'a name that is not UTF-8', right: 'rename it in UTF-8' };
  const entries = shelf.list(folderOf(path)).value;
  if (entries === undefined) {
    return { place, found: `no folder ${quoted(nameOf(folderOf(path)))} to find it in`, right: 'check the path' };
  }
  const near = entries.length > MOST_NAMES ? undefined : nearest(nameOf(path), namesOf(entries));
  const right = near === undefined ? 'check the path' : `${quoted(near)} is there; check the name`;
  return { place, found: `nothing named ${quoted(nameOf(path))} there`, right };
}

/** A folder with more names than these is not searched for a like one. */
const MOST_NAMES = 5000;

function namesOf(entries: readonly { readonly name: string }[]): string[] {
  return entries.map((entry) => entry.name);
}
