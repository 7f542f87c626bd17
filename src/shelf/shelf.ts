import type { Outcome } from './fault.ts';
import type { Source } from './place.ts';

/**
 * What a name in a folder stands for. Links are told apart from what they lead to: walks do not follow links to folders,
 * and links to files only where they stay inside the site. A link that leads nowhere, a pipe or a device is `other`.
 */
export type Kind = 'file' | 'folder' | 'linked-file' | 'linked-folder' | 'other';

/** One entry of a folder. */
export interface Entry {
  readonly name: string;
  readonly kind: Kind;
}

/**
 * Where texts come from: the disk, standard input, a Map; later a git revision or an editor's buffers.
 * Paths use `/` on every system; a relative one counts from the shelf's working folder, `.`.
 * Nothing on a shelf throws for a bad path: it is a fault.
 */
export interface Shelf {
  /** The text of a regular file of at most 1 MiB, valid UTF-8, without its byte order mark, reported under `name` (the path itself where not given). */
  read(path: string, name?: string): Outcome<Source>;
  /** Entries of a folder, sorted by name in code-unit order; a fault where there is no such folder. */
  list(folder: string): Outcome<readonly Entry[]>;
  /** What the path itself is; undefined where nothing of that name is there or can be seen. */
  kind(path: string): Kind | undefined;
  /** The path after all links are resolved; undefined where nothing is there (or links form a loop). */
  real(path: string): string | undefined;
}
