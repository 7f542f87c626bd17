import type { Place, Source } from '../shelf/place.ts';
import type { Chamber, Process, Recipe, Site, Substances } from './generated/types.ts';
import type { Sort } from './sort.ts';

/** The content of each sort of document, every physical value read. */
export interface Contents {
  readonly recipe: Recipe;
  readonly chamber: Chamber;
  readonly substances: Substances;
  readonly process: Process;
  readonly site: Site;
}

/** Keys and indices that lead from the top of a content to one of its values. */
export type Pointer = readonly (string | number)[];

/** Content in which every value knows its place. */
export interface Placed<Content> {
  readonly content: Content;
  /** Where the value stands, or its key; the nearest that does exist, where the pointer leads past the content. */
  place(pointer: Pointer, part?: 'key' | 'value'): Place;
}

/** A validated document. */
export interface Document<S extends Sort, Content = Contents[S]> extends Placed<Content> {
  readonly sort: S;
  readonly source: Source;
}

export type RecipeDocument = Document<'recipe'>;
export type ChamberDocument = Document<'chamber'>;
export type SubstancesDocument = Document<'substances'>;
export type ProcessDocument = Document<'process'>;
export type SiteDocument = Document<'site'>;

/** A document of any sort, told apart by `sort`. */
export type AnyDocument = RecipeDocument | ChamberDocument | SubstancesDocument | ProcessDocument | SiteDocument;
