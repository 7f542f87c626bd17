import type { BlockOptions } from './counts.ts';
import type { AskedUnits } from './shown.ts';

/** How much of a recipe `check` tells. */
export type Fold =
  /** Every step; one line where all is well. */
  | 'none'
  /** Only steps with something to tell; a recipe without any is one line. */
  | 'steps'
  /** Recipes without anything to tell are counted at the end, not listed; of the others only findings and what they come from. */
  | 'recipes';

export interface CheckOptions extends BlockOptions {
  readonly units: AskedUnits;
  readonly fold: Fold;
}

/** As few words as a reader of so many recipes can use. */
export function foldFor(recipes: number): Fold {
  if (recipes <= 1) return 'none';
  return recipes <= 25 ? 'steps' : 'recipes';
}
