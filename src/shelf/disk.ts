import { closeSync, constants, lstatSync, openSync, readdirSync, realpathSync, statSync } from 'node:fs';
import { absentFault } from './absent.ts';
import { byteReader } from './bytes.ts';
import { failure, success, wholeFile } from './fault.ts';
import { inOrder } from './map.ts';
import { absentFolderFault, codeOf, noFolderFault, notTextFault, systemFault } from './path-fault.ts';
import { slashed } from './paths.ts';
import { decoded, sizeFault, SIZE_LIMIT } from './text.ts';
import type { Dirent, Stats } from 'node:fs';
import type { Fault } from './fault.ts';
import type { Kind, Shelf } from './shelf.ts';

/** The files of this machine. Relative paths count from the working folder of the process. */
export function diskShelf(options: { readonly sizeLimit?: number } = {}): Shelf {
  const { sizeLimit = SIZE_LIMIT } = options;
  const bytesOf = byteReader(sizeLimit);
  const shelf: Shelf = {
    read(path, name = path) {
      try {
        const status = statSync(path, QUIET);
        if (status === undefined) return failure(nothingThereFault(shelf, path, name));
        if (!status.isFile()) return failure(notTextFault(name, whatItIs(status)));
        if (status.size > sizeLimit) return failure(sizeFault(name, status.size, sizeLimit));
        const bytes = withOpenFile(path, (descriptor) => bytesOf(descriptor, status.size));
        return bytes.length > sizeLimit ? failure(sizeFault(name, undefined, sizeLimit)) : decoded(name, bytes);
      } catch (error) {
        return failure(systemFault(name, error));
      }
    },
    list(folder) {
      try {
        const entries = readdirSync(folder, { withFileTypes: true });
        return success(inOrder(entries.map((entry) => ({ name: entry.name, kind: entryKind(folder, entry) }))));
      } catch (error) {
        return failure(listFault(folder, error));
      }
    },
    kind: kindOf,
    real: realPath,
  };
  return shelf;
}

const QUIET = { throwIfNoEntry: false } as const;

function nothingThereFault(shelf: Shelf, path: string, name: string): Fault {
  if (path !== '' && lstatSync(path, QUIET)?.isSymbolicLink() === true) {
    return { place: wholeFile(name), found: 'a link that leads nowhere', right: 'a link that ends at a file' };
  }
  return absentFault(shelf, path, name);
}

function whatItIs(status: Stats): string {
  if (status.isDirectory()) return 'a folder';
  if (status.isFIFO()) return 'a pipe';
  return status.isSocket() ? 'a socket' : 'a device';
}

/**
 * Should the file have become a pipe since it was looked at, opening it does not wait for a writer. Systems that lack the
 * flag have no such pipes.
 */
function withOpenFile<T>(path: string, use: (descriptor: number) => T): T {
  const descriptor = openSync(path, constants.O_RDONLY | constants.O_NONBLOCK);
  try {
    return use(descriptor);
  } finally {
    closeSync(descriptor);
  }
}

function listFault(folder: string, error: unknown): Fault {
  const code = codeOf(error);
  if (code === 'ENOENT') return absentFolderFault(folder);
  return code === 'ENOTDIR' && kindOf(folder) !== undefined ? noFolderFault(folder) : systemFault(folder, error);
}

function entryKind(folder: string, entry: Dirent): Kind {
  if (entry.isFile()) return 'file';
  if (entry.isDirectory()) return 'folder';
  return entry.isSymbolicLink() ? linkKind(`${folder}/${entry.name}`) : 'other';
}

function kindOf(path: string): Kind | undefined {
  try {
    const status = lstatSync(path, QUIET);
    if (status === undefined) return undefined;
    if (status.isSymbolicLink()) return linkKind(path);
    return status.isFile() ? 'file' : status.isDirectory() ? 'folder' : 'other';
  } catch {
    return undefined;
  }
}

function linkKind(path: string): Kind {
  try {
    const status = statSync(path, QUIET);
    return status?.isFile() === true ? 'linked-file' : status?.isDirectory() === true ? 'linked-folder' : 'other';
  } catch {
    return 'other';
  }
}

function realPath(path: string): string | undefined {
  try {
    return slashed(realpathSync.native(path));
  } catch {
    return undefined;
  }
}
