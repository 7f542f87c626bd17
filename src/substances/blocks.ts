import type { Substances as Content } from '../documents/generated/types.ts';
import type { Place } from '../shelf/place.ts';

/** Sorts of substances, each a map by name in a substances document. */
export const SORTS = ['gases', 'atoms', 'films', 'ions', 'walls'] as const;
export type Sort = (typeof SORTS)[number];

/** What a document says of one substance of each sort. */
export type BlocksBySort = { readonly [S in Sort]: NonNullable<Content[S]>[string] };

/** A substance as a document describes it. */
export interface Block<T> {
  readonly content: T;
  /** Of its name. */
  readonly place: Place;
}

/** One place to look substances up: the documents of a site, or what is built in. */
export interface Substances {
  find<S extends Sort>(sort: S, name: string): Block<BlocksBySort[S]> | undefined;
  names(sort: Sort): readonly string[];
}
