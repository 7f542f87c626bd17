import { readTolerance, toleranceSign } from './tolerance.ts';
import { isUnitFault, LONGEST_TEXT, quoted, tooLongFault } from './unit-fault.ts';
import { anyValue, bareValue, spelledValue } from './value.ts';
import type { Dimensions } from './dimensions.ts';
import type { Measure } from './measure.ts';
import type { ToleranceSign } from './tolerance.ts';
import type { UnitFault } from './unit-fault.ts';

export { readAccuracy } from './accuracy.ts';
export { isUnitFault } from './unit-fault.ts';
export type { UnitFault } from './unit-fault.ts';

/** What may stand beside the value. */
export interface Allowed {
  readonly tolerance?: boolean;
}

/**
 * Reads a value with its unit, `30 mTorr`, in the dimension that its key expects, or in the first of several that has the
 * unit. Where `allowed.tolerance`, `+/- 1 %` or `± 0.5 mTorr` may follow.
 */
export function readMeasure(
  text: string | number,
  dimensions: Dimensions,
  allowed: Allowed = ALONE,
): Measure | UnitFault {
  if (typeof text === 'number') return bareValue(text, dimensions);
  if (text.length > LONGEST_TEXT) return tooLongFault(text);
  const spelled = spelledValue(text, dimensions);
  if (spelled !== undefined) return spelled;
  const sign = toleranceSign(text);
  if (sign === undefined) return anyValue(text, dimensions);
  return allowed.tolerance === true ? measureWithTolerance(text, sign, dimensions) : unexpectedTolerance(text, sign);
}

const ALONE: Allowed = {};

function measureWithTolerance(text: string, sign: ToleranceSign, dimensions: Dimensions): Measure | UnitFault {
  const measure = anyValue(text.slice(0, sign.start).trimEnd(), dimensions);
  if (isUnitFault(measure)) return measure;
  const tolerance = readTolerance(text.slice(sign.end).trimEnd(), measure);
  return isUnitFault(tolerance) ? tolerance : { ...measure, tolerance };
}

function unexpectedTolerance(text: string, sign: ToleranceSign): UnitFault {
  const alone = text.slice(0, sign.start).trim();
  return { found: `${quoted(text)} has a tolerance`, right: `a value alone${alone === '' ? '' : `: ${alone}`}` };
}
