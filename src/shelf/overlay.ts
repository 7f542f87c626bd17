import { success } from './fault.ts';
import { inOrder, mapShelf } from './map.ts';
import { folderOf, join, nameOf, normalise } from './paths.ts';
import type { Outcome } from './fault.ts';
import type { Entry, Shelf } from './shelf.ts';

/**
 * A shelf with some texts laid over it, by path: standard input under the name it would have, an editor's unsaved buffers.
 * A laid-over text hides the file below it; a path must be written as it will be asked for.
 */
export function overlay(
  below: Shelf,
  texts: ReadonlyMap<string, string>,
  options: { readonly sizeLimit?: number } = {},
): Shelf {
  const above = mapShelf(texts, options);
  const shelf: Shelf = {
    read: (path, name) => (above.kind(path) === 'file' ? above.read(path, name) : below.read(path, name)),
    list: (folder) => merged(above.list(folder), below.list(folder)),
    kind(path) {
      const lying = above.kind(path);
      return lying === 'file' ? lying : (below.kind(path) ?? lying);
    },
    real(path) {
      const found = below.real(path);
      if (found !== undefined || above.kind(path) === undefined) return found;
      const folder = folderOf(path);
      return folder === normalise(path) ? folder : join(shelf.real(folder) ?? folder, nameOf(path));
    },
  };
  return shelf;
}

function merged(above: Outcome<readonly Entry[]>, below: Outcome<readonly Entry[]>): Outcome<readonly Entry[]> {
  if (above.value === undefined || above.value.length === 0) return below;
  if (below.value === undefined) return above;
  const entries = new Map(below.value.map((entry) => [entry.name, entry]));
  for (const entry of above.value) {
    if (entry.kind === 'file' || !entries.has(entry.name)) entries.set(entry.name, entry);
  }
  return success(inOrder(entries.values()));
}
