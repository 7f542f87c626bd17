import { wholeFile } from '../../shelf/fault.ts';
import { codeOf } from '../../shelf/path-fault.ts';
import type { Fault } from '../../shelf/fault.ts';

export function notWritten(path: string, found: string): Fault {
  return { place: wholeFile(path), found: `not written, ${found}`, right: 'choose another path' };
}

/** Why something could not be written, in words. */
export function reason(error: unknown): string {
  const code = codeOf(error);
  return REASONS.get(code) ?? `the system answers ${code ?? String(error)}`;
}

const REASONS: ReadonlyMap<string | undefined, string> = new Map([
  ['EACCES', 'no permission'],
  ['EPERM', 'no permission'],
  ['EROFS', 'the disk is read-only'],
  ['ENOENT', 'there is no such folder'],
  ['ENOTDIR', 'its folder is a file'],
  ['EEXIST', 'a file of that name is there'],
  ['ENOSPC', 'the disk is full'],
  ['EDQUOT', 'the disk quota is used up'],
  ['EISDIR', 'it is a folder'],
  ['ENAMETOOLONG', 'the name is too long'],
  ['ELOOP', 'links lead round in a circle'],
]);
