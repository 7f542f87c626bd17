import { sortOf } from '../documents/sort.ts';
import { anchored, folderOf, relative } from '../shelf/paths.ts';
import { walk } from '../shelf/walk.ts';
import { toldFault, toldPathFault } from './told-fault.ts';
import type { Bounds } from '../shelf/walk.ts';
import type { Shelf } from '../shelf/shelf.ts';
import type { Site } from '../steps/site.ts';
import type { Sites } from './sites.ts';
import type { ToldFault } from './told-fault.ts';

/** A recipe to work on: its text, and where it stands. */
export interface Job {
  /** As seen from the site's folder. */
  readonly file: string;
  /** Where it stands on the shelf; its site is looked for from there. */
  readonly path: string;
  readonly text: string;
}

/** What looking for recipes comes upon, in order. */
export type Found =
  | { readonly kind: 'recipe'; readonly job: Job }
  | { readonly kind: 'fault'; readonly fault: ToldFault }
  /** A YAML file that is none of ours. */
  | { readonly kind: 'passed-over' };

/**
 * The recipes that paths of the command line name: files themselves, folders with all recipes in them, and without a path
 * those of the working folder's site. In order of the files' names, each once.
 */
export function* findRecipes(shelf: Shelf, sites: Sites, paths: readonly string[]): Generator<Found, void, undefined> {
  const faults: ToldFault[] = [];
  const candidates = new Map<string, Candidate>();
  for (const candidate of candidatesOf(shelf, sites, paths, faults)) {
    const key = anchored(shelf, candidate.path);
    if (candidate.named || !candidates.has(key)) candidates.set(key, candidate);
  }
  for (const fault of faults) yield { kind: 'fault', fault };
  const keys = paths.length < 2 ? candidates.keys() : [...candidates.keys()].sort();
  for (const key of keys) {
    const candidate = candidates.get(key);
    if (candidate !== undefined) yield* readCandidate(shelf, sites, candidate);
  }
}

/** A file that may be a recipe. One that was named must be. */
interface Candidate {
  readonly path: string;
  readonly named: boolean;
}

function* candidatesOf(
  shelf: Shelf,
  sites: Sites,
  paths: readonly string[],
  faults: ToldFault[],
): Generator<Candidate> {
  const siteOf = (path: string): Site | undefined => {
    const { value, faults: wrong } = sites.of(path);
    const folder = value?.folder ?? folderOf(path);
    faults.push(...wrong.map((fault) => toldFault(folder, fault)));
    return value;
  };
  if (paths.length === 0) yield* ownRecipes(shelf, siteOf, faults);
  for (const path of paths) {
    const site = siteOf(path);
    const kind = shelf.kind(path);
    if (site === undefined) continue;
    if (kind === 'folder' || kind === 'linked-folder')
      yield* inFolder(shelf, path, boundsOf(shelf, site, siteOf), site, faults);
    else yield { path, named: true };
  }
}

type SiteOf = (path: string) => Site | undefined;

/** The recipes that the working folder's site names; all below it where it names none. */
function* ownRecipes(shelf: Shelf, siteOf: SiteOf, faults: ToldFault[]): Generator<Candidate> {
  const site = siteOf('.');
  if (site === undefined) return;
  const { nested, ...bounds } = boundsOf(shelf, site, siteOf);
  const only = site.recipes.length === 0 ? {} : { only: site.recipes, nested: () => undefined };
  const here = shelf.real('.') ?? '.';
  yield* inFolder(
    shelf,
    relative(here, site.folder),
    { ...bounds, ...(nested === undefined ? {} : { nested }), ...only },
    site,
    faults,
  );
}

function boundsOf(shelf: Shelf, site: Site, siteOf: SiteOf): Bounds {
  return {
    site: site.folder,
    passOver: site.passOver,
    nested: (file) => {
      const inner = siteOf(file);
      return inner === undefined || inner.folder === site.folder ? undefined : boundsOf(shelf, inner, siteOf);
    },
  };
}

function* inFolder(
  shelf: Shelf,
  folder: string,
  bounds: Bounds,
  site: Site,
  faults: ToldFault[],
): Generator<Candidate> {
  for (const { value: path, faults: wrong } of walk(shelf, folder, bounds)) {
    faults.push(...wrong.map((fault) => toldPathFault(shelf, site.folder, fault)));
    if (path !== undefined) yield { path, named: false };
  }
}

function* readCandidate(shelf: Shelf, sites: Sites, { path, named }: Candidate): Generator<Found> {
  const folder = sites.of(path).value?.folder ?? folderOf(path);
  const file = relative(folder, anchored(shelf, path));
  const { value: source, faults } = shelf.read(path, file);
  for (const fault of faults) yield { kind: 'fault', fault: toldFault(folder, fault) };
  if (source === undefined) return;
  const sort = sortOf(source.text);
  if (named || sort === 'recipe' || sort === 'unclear')
    yield { kind: 'recipe', job: { file, path, text: source.text } };
  else if (sort === undefined) yield { kind: 'passed-over' };
}
