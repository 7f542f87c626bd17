import { unitSpelled } from './lookup.ts';
import { readShare } from './share.ts';
import { isUnitFault, quoted } from './unit-fault.ts';
import { anyValue } from './value.ts';
import type { Dimension } from './dimensions.ts';
import type { Measure, Tolerance } from './measure.ts';
import type { Share } from './share.ts';
import type { UnitFault } from './unit-fault.ts';

/** Where the sign of a tolerance stands in a text: `+/-`, `±` or `+-`. */
export interface ToleranceSign {
  readonly start: number;
  readonly end: number;
}

export function toleranceSign(text: string): ToleranceSign | undefined {
  for (const sign of SIGNS) {
    const start = text.indexOf(sign);
    if (start !== -1) return { start, end: start + sign.length };
  }
  return undefined;
}

/** Reads what stands behind the sign, for the value before it: `1 %` of the reading, or an absolute `0.05 mTorr`. */
export function readTolerance(text: string, measure: Measure): Tolerance | UnitFault {
  if (text.trim() === '') return { found: 'an empty tolerance', right: WIDTH };
  const share = readShare(text);
  if (share !== undefined) return shareOfReading(text, share, measure);
  const width = absoluteWidth(text, measure.dimension);
  if (isUnitFault(width)) return { found: `tolerance ${width.found}`, right: width.right };
  if (flowKind(width) !== flowKind(measure)) {
    return {
      found: `tolerance ${quoted(text)} is counted otherwise than its flow`,
      right: `write it in ${measure.unit}`,
    };
  }
  return { value: width.value, of: 'value' };
}

/** A half-width with its unit, not negative, in the differences of the dimension. */
export function absoluteWidth(text: string, dimension: Dimension): Measure | UnitFault {
  const width = anyValue(text, dimension === 'temperature' ? 'temperature-difference' : dimension);
  if (isUnitFault(width) || width.value >= 0) return width;
  return negativeFault(text);
}

export function negativeFault(text: string): UnitFault {
  return { found: `${quoted(text)} is below zero`, right: 'half the width between the limits, zero or more' };
}

/** Why no percentage of a temperature is read. */
export const SCALE = 'write it in K: a percentage depends on the scale';

const WIDTH = 'a percentage of the reading, or a width with its unit';

const SIGNS: readonly string[] = ['+/-', '±', '+-'];

function shareOfReading(text: string, { value, of }: Share, { dimension, unit }: Measure): Tolerance | UnitFault {
  const share = text.trim();
  if (value < 0) return negativeFault(text);
  if (of === 'full scale' || of === 'other') {
    return { found: `tolerance ${quoted(text)}`, right: WIDTH };
  }
  if (dimension === 'temperature' && unit !== 'K') {
    return { found: `tolerance ${quoted(text)} of a temperature in ${unit}`, right: SCALE };
  }
  if (dimension === 'fraction' && of === 'unsaid') {
    const right = `write ${share} of reading, or ${Number(value.toPrecision(12))} for a share of the whole`;
    return { found: `tolerance ${quoted(text)} of a fraction`, right };
  }
  return { value, of: 'reading' };
}

function flowKind({ dimension, unit }: Measure): string | undefined {
  return dimension === 'flow' ? unitSpelled(unit, 'flow')?.standard : undefined;
}
