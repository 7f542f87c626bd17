import type { Place } from '../shelf/place.ts';
import type { Reference } from '../quantities/reference.ts';
import type { Bound } from './verdict.ts';

/** An assumption of a process, ready to be held against a step: its numbers are named, its bound is in SI. */
export interface Assumption {
  readonly process: string;
  readonly name: string;
  readonly statement: string;
  readonly source: string;
  readonly reference: Reference;
  readonly over?: Reference;
  readonly bound: Bound;
  /** Judged only if the recipe supplies what the number needs; else it does not apply. */
  readonly whenGiven: boolean;
  readonly cure: readonly string[];
  readonly place: Place;
}
