import { diskShelf } from '../shelf/disk.ts';
import { readStandardInput } from '../shelf/input.ts';
import { overlay } from '../shelf/overlay.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Shelf } from '../shelf/shelf.ts';

/** The shelf of a run, and the paths to look for on it. */
export interface GivenShelf {
  readonly shelf: Shelf;
  readonly paths: readonly string[];
  readonly faults: readonly Fault[];
}

/** The disk, with standard input laid over it where a path is `-`, under the name that it would have. */
export function givenShelf(paths: readonly string[], name = 'standard input'): GivenShelf {
  const disk = diskShelf();
  if (!paths.includes('-')) return { shelf: disk, paths, faults: [] };
  const { value: text, faults } = readStandardInput(name);
  if (text === undefined) return { shelf: disk, paths: paths.filter((path) => path !== '-'), faults };
  const shelf = overlay(disk, new Map([[name, text]]));
  return { shelf, paths: paths.map((path) => (path === '-' ? name : path)), faults };
}
