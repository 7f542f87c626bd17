import { isUnitFault, readMeasure } from '../units/read.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Problem } from './problem.ts';

/** A value with its unit from the command line, in SI; undefined where none stands there or it is wrong. */
export function readValue(
  dimension: Dimension,
  text: string | undefined,
  complain: (problem: Problem) => void,
): number | undefined {
  if (text === undefined) return undefined;
  const measure = readMeasure(text, dimension);
  if (!isUnitFault(measure)) return measure.value;
  complain({ found: `--${dimension} ${measure.found}`, right: measure.right });
  return undefined;
}
