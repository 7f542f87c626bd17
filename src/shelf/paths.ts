import { posix, sep } from 'node:path';
import type { Shelf } from './shelf.ts';

/** The path with `/` between its parts, as every path in here is written. */
export function slashed(path: string): string {
  return sep === '/' ? path : path.replaceAll(sep, '/');
}

/** Without `.`, `..` behind a name, doubled and trailing slashes. The empty path is `.`. */
export function normalise(path: string): string {
  const plain = posix.normalize(slashed(path));
  return plain.length > 1 && plain.endsWith('/') ? plain.slice(0, -1) : plain;
}

/** The path as seen from the folder: itself if absolute, else below the folder. */
export function join(folder: string, path: string): string {
  return isAbsolute(path) ? normalise(path) : normalise(`${slashed(folder)}/${path}`);
}

/** The folder that holds what the path names; a root holds itself, and above `.` is `..`. */
export function folderOf(path: string): string {
  const plain = normalise(path);
  const last = plain.slice(plain.lastIndexOf('/') + 1);
  return last === '.' || last === '..' ? normalise(`${plain}/..`) : posix.dirname(plain);
}

/** The last part of the path. */
export function nameOf(path: string): string {
  return posix.basename(normalise(path));
}

/** The path as written from inside the folder, `..` upwards. Where names alone cannot tell, it stays whole. */
export function relative(folder: string, path: string): string {
  const from = normalise(folder);
  const to = normalise(path);
  if (from === to) return '.';
  if (isAbsolute(from) !== isAbsolute(to)) return to;
  return startsIn(from, to) ? to.slice(startOf(from).length) : acrossFolders(from, to);
}

/** Whether the path starts at a root. */
export function isAbsolute(path: string): boolean {
  return path.startsWith('/') || (sep === '\\' && /^[a-z]:[\\/]|^\\/i.test(path));
}

/** The path from the shelf's root, where the shelf has one; on a Map's shelf, the path itself. */
export function anchored(shelf: Shelf, path: string): string {
  return isAbsolute(path) ? normalise(path) : join(shelf.real('.') ?? '.', path);
}

/** Whether the path lies in the folder or is the folder, as far as names alone can tell. */
export function isBelow(folder: string, path: string): boolean {
  const from = normalise(folder);
  const to = normalise(path);
  return from === to || (startsIn(from, to) && !(from === '.' && isAbsolute(to)));
}

/**
 * Whether the path lies in the folder after all links are resolved. What is not there lies where its name says:
 * reading it is a fault anyway.
 */
export function inside(shelf: Shelf, folder: string, path: string): boolean {
  const place = shelf.real(path);
  if (place === undefined) return isBelow(anchored(shelf, folder), anchored(shelf, path));
  return isBelow(shelf.real(folder) ?? anchored(shelf, folder), place);
}

/** What every normal path below the folder starts with. */
function startOf(folder: string): string {
  return folder === '.' ? '' : folder.endsWith('/') ? folder : `${folder}/`;
}

function startsIn(folder: string, path: string): boolean {
  const start = startOf(folder);
  return path.startsWith(start) && path !== `${start}..` && !path.startsWith('../', start.length);
}

function acrossFolders(from: string, to: string): string {
  const up = from === '.' ? [] : from.split('/');
  const down = to.split('/');
  let shared = 0;
  while (shared < up.length && up[shared] === down[shared]) shared += 1;
  const left = up.slice(shared);
  return left.includes('..') ? to : [...left.map(() => '..'), ...down.slice(shared)].join('/');
}
