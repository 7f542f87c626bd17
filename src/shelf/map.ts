import { absentFault } from './absent.ts';
import { failure, success } from './fault.ts';
import { absentFolderFault, noFolderFault, notTextFault } from './path-fault.ts';
import { folderOf, nameOf, normalise } from './paths.ts';
import { checkedText, SIZE_LIMIT } from './text.ts';
import type { Outcome } from './fault.ts';
import type { Source } from './place.ts';
import type { Entry, Shelf } from './shelf.ts';

/**
 * A shelf over texts by path, as they are when it is made. Folders are those that the paths imply; there are no links.
 * Relative and absolute paths are two trees that do not meet. Where a text's path runs through another text, it is left out.
 */
export function mapShelf(files: ReadonlyMap<string, string>, options: { readonly sizeLimit?: number } = {}): Shelf {
  const { sizeLimit = SIZE_LIMIT } = options;
  const texts = reachable(new Map(Array.from(files, ([path, text]) => [normalise(path), text])));
  const folders = impliedFolders(texts.keys());
  const shelf: Shelf = {
    read(path, name = path): Outcome<Source> {
      const text = texts.get(normalise(path));
      if (text !== undefined) return checkedText(name, text, sizeLimit);
      if (folders.has(normalise(path))) return failure(notTextFault(name, 'a folder'));
      return failure(absentFault(shelf, path, name));
    },
    list(folder): Outcome<readonly Entry[]> {
      const entries = folders.get(normalise(folder));
      if (entries !== undefined) return success(inOrder(entries.values()));
      return failure(texts.has(normalise(folder)) ? noFolderFault(folder) : absentFolderFault(folder));
    },
    kind(path) {
      const plain = normalise(path);
      return texts.has(plain) ? 'file' : folders.has(plain) ? 'folder' : undefined;
    },
    real: (path) => (shelf.kind(path) === undefined ? undefined : normalise(path)),
  };
  return shelf;
}

/** Entries in code-unit order of their names. */
export function inOrder(entries: Iterable<Entry>): readonly Entry[] {
  return Array.from(entries).sort((one, other) => (one.name < other.name ? -1 : one.name > other.name ? 1 : 0));
}

function reachable(texts: ReadonlyMap<string, string>): ReadonlyMap<string, string> {
  const found = new Map<string, string>();
  for (const [path, text] of texts) if (!runsThroughText(path, texts)) found.set(path, text);
  return found;
}

function runsThroughText(path: string, texts: ReadonlyMap<string, string>): boolean {
  for (let end = path.indexOf('/', 1); end !== -1; end = path.indexOf('/', end + 1)) {
    if (texts.has(path.slice(0, end))) return true;
  }
  return false;
}

/** Every folder on the way to a path, with what it holds. */
function impliedFolders(paths: Iterable<string>): ReadonlyMap<string, ReadonlyMap<string, Entry>> {
  const folders = new Map<string, Map<string, Entry>>([['.', new Map()]]);
  for (const path of paths) enter(folders, path, 'file');
  return folders;
}

function enter(folders: Map<string, Map<string, Entry>>, path: string, kind: 'file' | 'folder'): void {
  const folder = folderOf(path);
  const name = nameOf(path);
  if (folder === path || name === '..') return;
  const known = folders.get(folder);
  const entries = known ?? new Map<string, Entry>();
  entries.set(name, { name, kind });
  if (known !== undefined) return;
  folders.set(folder, entries);
  if (folder !== '.' && folder !== '/') enter(folders, folder, 'folder');
}
