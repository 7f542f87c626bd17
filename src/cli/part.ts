import type { Counts } from '../reports/counts.ts';
import type { CheckOptions } from '../reports/options.ts';
import type { Style } from './style.ts';
import type { ToldFault } from './told-fault.ts';

/** What to do with each recipe of a run. Plain data: workers are told. */
export interface Work {
  readonly command: 'check' | 'table';
  readonly styles: readonly Style[];
  readonly check: CheckOptions;
  /** Names of numbers to show in a table; its own choice where none. */
  readonly columns: readonly string[];
  readonly today?: string;
  readonly site?: string;
}

/** What came of one recipe: printed texts and counts, no results. */
export interface Part {
  /** One for each style; undefined where the recipe could not be read. */
  readonly texts?: readonly Drawn[];
  readonly counts: Counts;
  readonly faults: readonly ToldFault[];
  /** Should the program itself have failed on this recipe. */
  readonly failure?: Failure;
}

export interface Drawn {
  /** What stands once before the texts of all parts. */
  readonly header: string;
  readonly text: string;
  /** Records of cautions, as far as the format keeps them apart. */
  readonly cautions: readonly object[];
}

export interface Failure {
  readonly message: string;
  readonly stack: string;
}

export function failureOf(error: unknown): Failure {
  if (!(error instanceof Error)) return { message: String(error), stack: '' };
  return { message: `${error.name}: ${error.message}`, stack: error.stack ?? '' };
}
