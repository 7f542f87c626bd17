import { anchored, join, relative } from '../shelf/paths.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Shelf } from '../shelf/shelf.ts';

/** A fault as plain data, with the folder that its file's name is relative to. Workers send them, so nothing else hangs on them. */
export interface ToldFault {
  readonly folder: string;
  readonly file: string;
  readonly line: number;
  readonly column: number;
  readonly found: string;
  readonly right: string;
}

export function toldFault(folder: string, { place, found, right }: Fault): ToldFault {
  return { folder, file: place.file, line: place.line, column: place.column, found, right };
}

/** A fault of a path as it was named: seen from the folder, so that it reads like those of documents. */
export function toldPathFault(shelf: Shelf, folder: string, fault: Fault): ToldFault {
  const told = toldFault(folder, fault);
  return { ...told, file: told.file === '' ? '' : relative(folder, anchored(shelf, told.file)) };
}

/** The fault with its file as seen from the working folder, where an editor or a shell finds it. */
export function fromHere(shelf: Shelf, { folder, file, line, column, found, right }: ToldFault): Fault {
  const here = shelf.real('.') ?? '.';
  return { place: { file: relative(here, join(folder, file)), line, column }, found, right };
}

/** Tells faults apart: the same one may be met from several recipes. */
export function faultKey({ folder, file, line, column, found }: ToldFault): string {
  return `${folder}\n${file}\n${line}:${column}\n${found}`;
}
