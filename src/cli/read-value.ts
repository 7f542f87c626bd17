import { isUnitFault, readMeasure } from '../units/read.ts';
import type { Problem } from './problem.ts';

/** A value above zero with its unit from the command line, in SI; undefined where none stands there or it is wrong. */
export function readValue(
  dimension: 'temperature' | 'pressure',
  text: string | undefined,
  complain: (problem: Problem) => void,
): number | undefined {
  if (text === undefined) return undefined;
  const measure = readMeasure(text, dimension);
  if (isUnitFault(measure)) complain({ found: `--${dimension} ${measure.found}`, right: measure.right });
  else if (measure.value > 0) return measure.value;
  else complain({ found: `--${dimension} '${text}' is not above zero`, right: RIGHT[dimension] });
  return undefined;
}

const RIGHT = {
  temperature: "a gas is warmer than 0 K, which is -273.15 degC: '20 degC'",
  pressure: "a gas has a pressure above 0 Pa: '1 Torr'",
} as const;
