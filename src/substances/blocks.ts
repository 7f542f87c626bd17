import type { Atom, Film, Gas, Ion, Wall } from '../documents/generated/types.ts';
import type { Place } from '../shelf/place.ts';

/** Sorts of substances, each a map by name in a substances document. */
export interface BlocksBySort {
  readonly gases: Gas;
  readonly atoms: Atom;
  readonly films: Film;
  readonly ions: Ion;
  readonly walls: Wall;
}
export type Sort = keyof BlocksBySort;

/** A substance as a document describes it. */
export interface Block<T> {
  readonly content: T;
  /** Of its name. */
  readonly place: Place;
}

/** One place to look substances up: a document of the site, or what is built in. */
export interface Substances {
  find<S extends Sort>(sort: S, name: string): Block<BlocksBySort[S]> | undefined;
  names(sort: Sort): readonly string[];
}
