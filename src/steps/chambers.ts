import type { ChamberDocument, RecipeDocument } from '../documents/document.ts';
import { readChamber } from '../documents/read.ts';
import { sortOf } from '../documents/sort.ts';
import { failure, type Fault, type Outcome } from '../shelf/fault.ts';
import { folderOf, inside, join, relative } from '../shelf/paths.ts';
import type { Place } from '../shelf/place.ts';
import type { Shelf } from '../shelf/shelf.ts';
import { unknownName } from './names.ts';

/** The chambers of a site, by name and by path; each document is read once, when it is first asked for. */
export class Chambers {
  readonly faults: readonly Fault[];
  readonly #shelf: Shelf;
  readonly #folder: string;
  readonly #paths: ReadonlyMap<string, string>;
  readonly #read = new Map<string, Outcome<ChamberDocument>>();

  constructor(shelf: Shelf, folder: string, paths: readonly string[]) {
    this.#shelf = shelf;
    this.#folder = folder;
    const { byName, faults } = this.#index(paths);
    this.#paths = byName;
    this.faults = faults;
  }

  get names(): readonly string[] {
    return [...this.#paths.keys()];
  }

  /** The chamber that a recipe refers to: a name of the site's, or a path relative to the recipe's file. */
  find(reference: string, recipe: RecipeDocument): Outcome<ChamberDocument> {
    const place = recipe.place(['chamber']);
    return isPath(reference) ? this.#byPath(reference, recipe, place) : this.named(reference, place);
  }

  named(name: string, place: Place): Outcome<ChamberDocument> {
    const path = this.#paths.get(name);
    if (path !== undefined) return this.#open(path);
    const orElse = 'the name of a chamber of the site, or a relative path with a `/`';
    return failure(unknownName(place, 'chamber', name, this.names, orElse));
  }

  #byPath(reference: string, recipe: RecipeDocument, place: Place): Outcome<ChamberDocument> {
    const from = join(this.#folder, folderOf(recipe.source.file));
    const path = join(from, reference);
    if (!inside(this.#shelf, this.#folder, path)) {
      return failure({
        place,
        found: `the path '${reference}' leads out of the site's folder`,
        right: 'a chamber inside it',
      });
    }
    if (relative(this.#folder, path) === recipe.source.file) {
      return failure({ place, found: 'the recipe itself as its chamber', right: "the path of a chamber's document" });
    }
    const { value: source, faults } = this.#shelf.read(path, relative(this.#folder, path));
    if (source !== undefined) return this.#open(path);
    return { faults: faults.map(({ found, right }) => ({ place, found: `chamber '${reference}': ${found}`, right })) };
  }

  #open(path: string): Outcome<ChamberDocument> {
    const known = this.#read.get(path);
    if (known !== undefined) return known;
    const { value: source, faults } = this.#shelf.read(path, relative(this.#folder, path));
    const document = source === undefined ? { faults } : readChamber(source);
    this.#read.set(path, document);
    return document;
  }

  /** Finds out the names without parsing more than needs be: one recipe wants one chamber. */
  #index(paths: readonly string[]): { byName: Map<string, string>; faults: readonly Fault[] } {
    const byName = new Map<string, string>();
    const faults: Fault[] = [];
    for (const path of paths) {
      const name = this.#nameIn(path, faults);
      if (name === undefined) continue;
      const first = byName.get(name);
      if (first === undefined) byName.set(name, path);
      else faults.push(this.#secondFault(name, path, relative(this.#folder, first)));
    }
    return { byName, faults };
  }

  #nameIn(path: string, faults: Fault[]): string | undefined {
    const { value: source, faults: unread } = this.#shelf.read(path, relative(this.#folder, path));
    faults.push(...unread);
    if (source === undefined || sortOf(source.text) === undefined) return undefined;
    const peeked = NAME.exec(source.text)?.[1];
    if (peeked !== undefined && sortOf(source.text) === 'chamber') return peeked;
    const document = this.#open(path);
    faults.push(...document.faults);
    return document.value?.content.name;
  }

  #secondFault(name: string, path: string, first: string): Fault {
    const file = relative(this.#folder, path);
    const place = this.#open(path).value?.place(['name']) ?? { file, line: 1, column: 1 };
    return { place, found: `a second chamber '${name}', the first is in ${first}`, right: 'a name of its own' };
  }
}

/** The name on a line of its own, as all but a document in braces has it. */
const NAME = /^name:[ \t]+["']?([a-z0-9-]+)["']?[ \t]*(?:#.*)?$/m;

/** Whether a reference to a chamber is a path and no name. */
function isPath(reference: string): boolean {
  return reference.includes('/') || reference.endsWith('.yaml') || reference.endsWith('.yml');
}
