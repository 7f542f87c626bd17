import { findSite } from '../shelf/find-site.ts';
import { anchored, folderOf } from '../shelf/paths.ts';
import { openSite } from '../steps/site.ts';
import { processFaults } from '../verdicts/judge.ts';
import type { Shelf } from '../shelf/shelf.ts';
import type { Site } from '../steps/site.ts';
import type { Problem } from './problem.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';

/** The sites that one run meets; each is opened once, and its faults are told the first time it is met. */
export interface Sites {
  /** The site of a recipe or folder. */
  of(path: string): Outcome<Site>;
  /** Those met so far. */
  met(): readonly Site[];
}

/** The nearest site of each path, or, where `chosen` names one, that for all. */
export function sitesOn(shelf: Shelf, chosen?: string): Sites {
  const known = new Map<string, string | undefined>();
  const open = new Map<string, Site>();
  return {
    of(path) {
      const near = chosen ?? path;
      const file = findSite(shelf, near, known);
      const key = file ?? bareKey(shelf, near);
      const before = open.get(key);
      if (before !== undefined) return { value: before, faults: [] };
      const { value, faults } = openSite(shelf, file ?? near);
      if (value === undefined) return { faults };
      open.set(key, value);
      return { value, faults: [...faults, ...ownProcessFaults(value)] };
    },
    met: () => [...open.values()],
  };
}

/** The built-in processes are known to be sound, and looking through them takes time that a single recipe would feel. */
function ownProcessFaults(site: Site): readonly Fault[] {
  return site.document?.content.processes === undefined ? [] : processFaults(site);
}

/** Without a site document each folder stands for itself. */
function bareKey(shelf: Shelf, near: string): string {
  return shelf.kind(near) === 'folder' ? near : folderOf(near);
}

/** What is wrong with the site that a command line chooses: it must be a site's document or the folder it stands in. */
export function siteProblem(shelf: Shelf, chosen: string): Problem | undefined {
  const file = findSite(shelf, chosen);
  const path = anchored(shelf, chosen);
  if (file !== undefined && (file === path || folderOf(file) === path)) return undefined;
  return { found: `--site ${chosen} is no site`, right: "the path of a 'regimen.yaml' or of its folder" };
}
