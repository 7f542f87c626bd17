import type { ChamberDocument, RecipeDocument, SiteDocument } from '../documents/document.ts';
import { readProcess, readSite, readSubstances } from '../documents/read.ts';
import { success, type Fault, type Outcome } from '../shelf/fault.ts';
import { findSite } from '../shelf/find-site.ts';
import { folderOf, nameOf, relative } from '../shelf/paths.ts';
import type { Pattern } from '../shelf/patterns.ts';
import type { Source } from '../shelf/place.ts';
import type { Shelf } from '../shelf/shelf.ts';
import { libraryOver, type Library } from '../substances/library.ts';
import { siteSubstances } from '../substances/site-substances.ts';
import { BUILT_IN_SUBSTANCES } from '../substances/built-in-substances.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Tolerance } from '../units/measure.ts';
import { BUILT_IN_PROCESSES } from './built-in-processes.ts';
import { chamberFacts, type ChamberFacts } from './chamber.ts';
import { Chambers } from './chambers.ts';
import type { ProcessSpec } from './process.ts';
import { processesOver, type Processes } from './processes.ts';
import { PLAIN_SHOW, showOf, type Show } from './show.ts';
import { clearingOf, ratiosOf, tolerancesOf, type Clearing, type RatioSpec } from './site-rules.ts';
import { patternsOf, pathsOf } from './site-paths.ts';

/** What holds for every recipe below a folder. */
export interface Site {
  readonly shelf: Shelf;
  /** Its folder on the shelf; files are named relative to it. */
  readonly folder: string;
  /** Absent where no site document stands above. */
  readonly document?: SiteDocument;
  readonly name?: string;
  readonly show: Show;
  readonly clearing: Clearing;
  readonly tolerances: ReadonlyMap<Dimension, Tolerance>;
  readonly ratios: readonly RatioSpec[];
  /** Where the recipes are; empty for everywhere. */
  readonly recipes: readonly Pattern[];
  readonly passOver: readonly Pattern[];
  readonly library: Library;
  process(name: string): ProcessSpec | undefined;
  processNames(): readonly string[];
  /** The chamber that a recipe refers to, by name or by path. */
  chamber(reference: string, recipe: RecipeDocument): Outcome<ChamberDocument>;
  /** Names of the site's chambers. */
  chamberNames(): readonly string[];
  /** That chamber made ready for steps. */
  facts(reference: string, recipe: RecipeDocument): Outcome<ChamberFacts>;
}

/**
 * The site of a file or folder: the nearest `regimen.yaml` in it or above, else none but what is built in. Documents of
 * the site that are at fault are left out; what can be used is used.
 */
export function openSite(shelf: Shelf, near: string): Outcome<Site> {
  const path = findSite(shelf, near);
  if (path === undefined) return success(bareSite(shelf, shelf.kind(near) === 'folder' ? near : folderOf(near)));
  const folder = folderOf(path);
  const { value: source, faults } = shelf.read(path, nameOf(path));
  const { value: document, faults: wrong } = source === undefined ? { faults } : readSite(source);
  if (document === undefined) return success(bareSite(shelf, folder), wrong);
  return siteFrom(shelf, folder, document);
}

/** A folder without a site document: what is built in, and chambers by path. */
export function bareSite(shelf: Shelf, folder: string): Site {
  const plain = {
    name: undefined,
    show: PLAIN_SHOW,
    clearing: new Map(),
    tolerances: new Map(),
    ratios: [],
    recipes: [],
    passOver: [],
  };
  return assemble(shelf, folder, plain, BUILT_IN_LIBRARY, BUILT_IN_PROCESSES, new Chambers(shelf, folder, []));
}

const BUILT_IN_LIBRARY = libraryOver([BUILT_IN_SUBSTANCES]);

function siteFrom(shelf: Shelf, folder: string, document: SiteDocument): Outcome<Site> {
  const faults: Fault[] = [];
  const { content } = document;
  const paths = (key: 'chambers' | 'substances' | 'processes') => pathsOf(shelf, folder, document, key, faults);
  const substances = siteSubstances(readAll(shelf, folder, paths('substances'), readSubstances, faults));
  const processes = processesOver(readAll(shelf, folder, paths('processes'), readProcess, faults), BUILT_IN_PROCESSES);
  const chambers = new Chambers(shelf, folder, paths('chambers'));
  faults.push(...substances.faults, ...processes.faults, ...chambers.faults);
  const library = libraryOver([substances, BUILT_IN_SUBSTANCES]);
  const ground = { library, chamberNames: chambers.names, faults };
  const rules = {
    document,
    name: content.name,
    show: showOf(document, faults),
    clearing: clearingOf(document, ground),
    tolerances: tolerancesOf(document),
    ratios: ratiosOf(document, ground),
    recipes: patternsOf(document, 'recipes', faults),
    passOver: patternsOf(document, 'pass_over', faults),
  };
  return success(assemble(shelf, folder, rules, library, processes, chambers), faults);
}

type Rules = Pick<Site, 'show' | 'clearing' | 'tolerances' | 'ratios' | 'recipes' | 'passOver'> & {
  readonly document?: SiteDocument;
  readonly name: string | undefined;
};

function assemble(
  shelf: Shelf,
  folder: string,
  { name, ...rules }: Rules,
  library: Library,
  processes: Processes,
  chambers: Chambers,
): Site {
  const prepared = new WeakMap<ChamberDocument, Outcome<ChamberFacts>>();
  const chamber = (reference: string, recipe: RecipeDocument) => chambers.find(reference, recipe);
  return {
    shelf,
    folder,
    ...(name === undefined ? {} : { name }),
    ...rules,
    library,
    process: (one) => processes.named(one),
    processNames: () => processes.names(),
    chamber,
    chamberNames: () => chambers.names,
    facts: (reference, recipe) => {
      const { value: document, faults } = chamber(reference, recipe);
      if (document === undefined) return { faults };
      let facts = prepared.get(document);
      if (facts === undefined) {
        facts = chamberFacts(document, library, rules.tolerances);
        prepared.set(document, facts);
      }
      return facts;
    },
  };
}

/** Reads every document of a kind that a site names; those at fault are left out. */
function readAll<D>(
  shelf: Shelf,
  folder: string,
  paths: readonly string[],
  read: (source: Source) => Outcome<D>,
  faults: Fault[],
): readonly D[] {
  const documents: D[] = [];
  for (const path of paths) {
    const { value: source, faults: unread } = shelf.read(path, relative(folder, path));
    faults.push(...unread);
    if (source === undefined) continue;
    const { value, faults: wrong } = read(source);
    faults.push(...wrong);
    if (value !== undefined) documents.push(value);
  }
  return documents;
}
