import { anchored, folderOf, join, nameOf } from './paths.ts';
import type { Shelf } from './shelf.ts';

/** The name of the document at the root of a site. */
export const SITE_FILE = 'regimen.yaml';

/**
 * The path of the site's document for a file or folder: the nearest one in the folder itself or above, whatever it is
 * (should it be unreadable, reading it tells). `known` keeps what was found by folder, for runs over many files.
 */
export function findSite(
  shelf: Shelf,
  near: string,
  known = new Map<string, string | undefined>(),
): string | undefined {
  const start = anchored(shelf, near);
  const kind = shelf.kind(start);
  return siteAbove(shelf, kind === 'folder' || kind === 'linked-folder' ? start : folderOf(start), known);
}

/** No path is nested deeper by honest means. */
const MOST_FOLDERS = 256;

function siteAbove(shelf: Shelf, start: string, known: Map<string, string | undefined>): string | undefined {
  const passed: string[] = [];
  let found: string | undefined;
  for (let folder = start; passed.length < MOST_FOLDERS; folder = folderOf(folder)) {
    found = known.get(folder);
    if (known.has(folder)) break;
    passed.push(folder);
    const file = join(folder, SITE_FILE);
    if (shelf.kind(file) !== undefined) found = file;
    if (found !== undefined || isTop(folder)) break;
  }
  for (const folder of passed) known.set(folder, found);
  return found;
}

/** A root, or the working folder of a shelf that has no root. */
function isTop(folder: string): boolean {
  return folderOf(folder) === folder || ['.', '..'].includes(nameOf(folder));
}
