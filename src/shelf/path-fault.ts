import { wholeFile } from './fault.ts';
import type { Fault } from './fault.ts';

/** A path that is there but is no text: what it is instead. */
export function notTextFault(name: string, what: string): Fault {
  return { place: wholeFile(name), found: what, right: 'the path of a file' };
}

/** A path that should be a folder and is something else. */
export function noFolderFault(folder: string): Fault {
  return { place: wholeFile(folder), found: 'a file', right: 'the path of a folder' };
}

export function absentFolderFault(folder: string): Fault {
  return { place: wholeFile(folder), found: 'no such folder', right: 'check the path' };
}

/**
 * What the system answered to an attempt to open or list a path, in words. An error that is not the system's is a mistake in
 * here and goes on.
 */
export function systemFault(name: string, error: unknown): Fault {
  const code = codeOf(error);
  if (code === undefined) throw error;
  const [found, right] = ANSWERS.get(code) ?? [`an answer of the system: ${code}`, 'check the disk and try again'];
  return { place: wholeFile(name), found, right };
}

/** The system's own name for what went wrong: `ENOENT`. */
export function codeOf(error: unknown): string | undefined {
  return error instanceof Error && 'code' in error && typeof error.code === 'string' ? error.code : undefined;
}

const NO_PERMISSION = [
  'no permission to read it',
  'the right to read it, for the account that runs the check',
] as const;
const TOO_MANY = ['too many files open at once', 'a higher limit of open files'] as const;

type Answer = readonly [found: string, right: string];

const ANSWERS: ReadonlyMap<string, Answer> = new Map<string, Answer>([
  ['EACCES', NO_PERMISSION],
  ['EPERM', NO_PERMISSION],
  ['ELOOP', ['links that lead round in a circle', 'a link that ends at a file']],
  ['ENAMETOOLONG', ['a name longer than the system allows', 'a shorter name']],
  ['ENOTDIR', ['a path that runs through a file as if it were a folder', 'check the path']],
  ['ERR_INVALID_ARG_VALUE', ['a path with a NUL character', 'a path without it']],
  ['EISDIR', ['a folder', 'the path of a file']],
  ['ENXIO', ['a device or socket', 'the path of a file']],
  ['EMFILE', TOO_MANY],
  ['ENFILE', TOO_MANY],
  ['EIO', ['a disk that fails to read it', 'check the disk']],
]);
