import type { Outcome } from './fault.ts';
import type { Source } from './place.ts';

/** One entry of a folder. Links to files count as files; links to folders are told apart, since walks do not follow them. */
export interface Entry {
  readonly name: string;
  readonly kind: 'file' | 'folder' | 'linked-folder' | 'other';
}

/**
 * Where texts come from: the disk, standard input, a Map; later a git revision or an editor's buffers.
 * Paths use `/` on every system. Nothing on a shelf throws for a bad path: it is a fault.
 */
export interface Shelf {
  /** The text of a regular file of at most 1 MiB, valid UTF-8, without its byte order mark, reported under `name` (the path itself where not given). */
  read(path: string, name?: string): Outcome<Source>;
  /** Entries of a folder, sorted by name in code-unit order; a fault where there is no such folder. */
  list(folder: string): Outcome<readonly Entry[]>;
  /** The path after all links are resolved; undefined where nothing is there (or links form a loop). */
  real(path: string): string | undefined;
}
