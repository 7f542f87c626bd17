import { fromSi } from './convert.ts';
import { displayUnit } from './display-unit.ts';
import { referenceFactor, STANDARD_REFERENCE } from './flow-reference.ts';
import { unitSpelled } from './lookup.ts';
import { printNumber, printUncertain } from './print-number.ts';
import type { Dimension } from './dimensions.ts';
import type { FlowReference } from './flow-reference.ts';

export { displayUnit } from './display-unit.ts';
export { printNumber, printUncertain } from './print-number.ts';
export { printTime } from './print-time.ts';

export interface PrintOptions {
  /** Unit to print in; else the dimension's own choice by size. */
  readonly unit?: string;
  /** Expanded, absolute, in SI. */
  readonly uncertainty?: number;
  /** What "standard" means on the chamber, for flows. */
  readonly reference?: FlowReference;
}

/** A value with its unit, and its expanded uncertainty where it has one: "2.63 ± 0.52 mm". */
export function printMeasure(value: number, dimension: Dimension, options: PrintOptions = {}): string {
  if (!Number.isFinite(value)) return printNumber(value);
  const { unit = displayUnit(value, dimension), uncertainty = 0, reference } = options;
  const number = toUnit(value, unit, dimension, reference);
  const zero = toUnit(0, unit, dimension, reference);
  const text = printUncertain(number, toUnit(uncertainty, unit, dimension, reference) - zero);
  return isBare(unit) ? text : `${text} ${unit}`;
}

/**
 * The SI value as a number of units. `unit` is a name in the table of units, or `1` or nothing for a bare number.
 * A name that the dimension does not have leaves the value in SI.
 */
export function toUnit(
  value: number,
  unit: string,
  dimension: Dimension,
  reference: FlowReference = STANDARD_REFERENCE,
): number {
  const found = unitSpelled(isBare(unit) ? '' : unit, dimension);
  if (found === undefined) return value;
  const number = fromSi(value, found);
  return found.standard === undefined ? number : number / referenceFactor(unit, reference);
}

function isBare(unit: string): boolean {
  return unit === '' || unit === '1';
}
