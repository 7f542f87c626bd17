import { failure, success, wholeFile } from './fault.ts';
import { SITE_FILE } from './find-site.ts';
import { matches, reachesBelow } from './patterns.ts';
import { anchored, inside, join, normalise, relative } from './paths.ts';
import type { Fault, Outcome } from './fault.ts';
import type { Pattern } from './patterns.ts';
import type { Entry, Kind, Shelf } from './shelf.ts';

/** What a walk keeps to. */
export interface Bounds {
  /** The site's folder; without a site, the folder walked. No link may lead out of it, and patterns are relative to it. */
  readonly site: string;
  /** Files and folders to leave out. */
  readonly passOver?: readonly Pattern[];
  /** Only files that meet one of these. */
  readonly only?: readonly Pattern[];
  /**
   * Asked for each folder below that has a site document of its own: the bounds to keep to in there, or undefined not to
   * enter. Without it such folders are walked like any other. Folders further down keep to what the answer says.
   */
  readonly nested?: (siteFile: string) => Bounds | undefined;
}

/**
 * The paths of the `.yaml` and `.yml` files in a folder and below, in code-unit order of the whole path, as they are met;
 * faults for folders that cannot be listed and for links that leave the site. Folders starting with a dot, `node_modules`
 * and links to folders are not entered.
 */
export function* walk(shelf: Shelf, folder: string, bounds: Bounds): Generator<Outcome<string>, void, undefined> {
  if (!inside(shelf, bounds.site, folder)) {
    yield failure(leavesFault(folder));
    return;
  }
  const start = spotOf(shelf, normalise(folder), bounds, 0);
  const waiting = isPassedOver(start) ? [] : [start];
  for (let spot = waiting.pop(); spot !== undefined; spot = waiting.pop()) {
    if (spot.kind === 'folder') {
      const fault = enter(shelf, spot, waiting);
      if (fault !== undefined) yield failure(fault);
    } else if (spot.kind === 'linked-file' && !inside(shelf, spot.bounds.site, spot.path)) {
      yield failure(leavesFault(spot.path));
    } else yield success(spot.path);
  }
}

/** The files below the site's folder that meet one of the patterns, in order. Sites nested in it keep their own. */
export function matching(shelf: Shelf, site: string, patterns: readonly Pattern[]): Outcome<readonly string[]> {
  const paths: string[] = [];
  const faults: Fault[] = [];
  if (patterns.length === 0) return success(paths);
  for (const found of walk(shelf, site, { site, only: patterns, nested: () => undefined })) {
    if (found.value !== undefined) paths.push(found.value);
    faults.push(...found.faults);
  }
  return success(paths, faults);
}

/** A file or folder that the walk still has to come to. */
interface Spot {
  readonly path: string;
  /** The path relative to the site's folder. */
  readonly inSite: string;
  readonly kind: Kind;
  readonly depth: number;
  readonly bounds: Bounds;
}

/** Folders are not nested deeper by honest means. */
const DEEPEST = 64;

function spotOf(shelf: Shelf, path: string, bounds: Bounds, depth: number): Spot {
  const inSite = relative(anchored(shelf, bounds.site), anchored(shelf, path));
  return { path, inSite, kind: 'folder', depth, bounds };
}

/** Puts what is wanted of a folder on the pile, the first on top. */
function enter(shelf: Shelf, folder: Spot, waiting: Spot[]): Fault | undefined {
  if (folder.depth > DEEPEST) return tooDeepFault(folder.path);
  const { value: entries, faults } = shelf.list(folder.path);
  if (entries === undefined) return faults[0];
  const spot = inNestedSite(shelf, folder, entries);
  if (spot === undefined) return undefined;
  for (const entry of inPathOrder(entries).reverse()) {
    const next = spotBelow(spot, entry);
    if (isWanted(next, entry.name)) waiting.push(next);
  }
  return undefined;
}

/** The folder under the bounds of the site it starts, if it starts one; undefined where that site is not to be entered. */
function inNestedSite(shelf: Shelf, folder: Spot, entries: readonly Entry[]): Spot | undefined {
  const { nested } = folder.bounds;
  if (nested === undefined || folder.inSite === '.') return folder;
  if (!entries.some((entry) => entry.name === SITE_FILE)) return folder;
  const bounds = nested(join(folder.path, SITE_FILE));
  return bounds && spotOf(shelf, folder.path, bounds, folder.depth);
}

/** Order of the whole paths: a folder's name counts with its slash. */
function inPathOrder(entries: readonly Entry[]): Entry[] {
  const keys = entries.map((entry) => ({ entry, key: entry.kind === 'folder' ? `${entry.name}/` : entry.name }));
  return keys.sort((one, other) => (one.key < other.key ? -1 : 1)).map(({ entry }) => entry);
}

function spotBelow({ path, inSite, depth, bounds }: Spot, { name, kind }: Entry): Spot {
  return { path: below(path, name), inSite: below(inSite, name), kind, depth: depth + 1, bounds };
}

function below(folder: string, name: string): string {
  if (folder === '.') return name;
  return folder.endsWith('/') ? folder + name : `${folder}/${name}`;
}

function isWanted({ inSite, kind, bounds }: Spot, name: string): boolean {
  const { passOver = [], only } = bounds;
  if (kind === 'linked-folder') return false;
  const isFolder = kind === 'folder';
  if (isFolder ? name.startsWith('.') || name === 'node_modules' : !isDocument(name)) return false;
  if (passOver.some((pattern) => matches(pattern, inSite))) return false;
  return only === undefined || only.some((pattern) => (isFolder ? reachesBelow : matches)(pattern, inSite));
}

function isDocument(name: string): boolean {
  return name.endsWith('.yaml') || name.endsWith('.yml');
}

/** Whether the walk starts in a folder that is left out, itself or with one above it. */
function isPassedOver({ inSite, bounds }: Spot): boolean {
  const { passOver = [] } = bounds;
  const names = inSite.split('/');
  return names.some((_, last) => {
    const folder = names.slice(0, last + 1).join('/');
    return folder !== '.' && passOver.some((pattern) => matches(pattern, folder));
  });
}

function leavesFault(path: string): Fault {
  const right = "a file inside it; keep what belongs to the site below its 'regimen.yaml'";
  return { place: wholeFile(path), found: "a path that leads out of the site's folder", right };
}

function tooDeepFault(path: string): Fault {
  return {
    place: wholeFile(path),
    found: `folders nested more than ${DEEPEST} deep`,
    right: 'fewer, or a site of its own',
  };
}
