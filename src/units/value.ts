import { toSi } from './convert.ts';
import { DIMENSIONS } from './dimensions.ts';
import { unitIn } from './lookup.ts';
import { lookAlikeFault, noNumberFault, spoiltNumberFault } from './number-fault.ts';
import { numberEnd } from './number.ts';
import { plainUnit, skipBlanks } from './spelling.ts';
import { quoted } from './unit-fault.ts';
import { wrongUnitFault } from './wrong-unit.ts';
import type { Dimensions } from './dimensions.ts';
import type { Measure } from './measure.ts';
import type { Unit } from './table.ts';
import type { UnitFault } from './unit-fault.ts';

/** The value of a text that is spelled as in the table of units; undefined for any other, right or wrong. */
export function spelledValue(text: string, dimensions: Dimensions): Measure | UnitFault | undefined {
  const start = skipBlanks(text, 0);
  const end = numberEnd(text, start);
  if (end === start) return undefined;
  const unit = unitIn(text.slice(skipBlanks(text, end)), dimensions);
  return unit === undefined ? undefined : convert(text, text.slice(start, end), unit);
}

/** The value of a text in any accepted spelling, or what is wrong with it. */
export function anyValue(text: string, dimensions: Dimensions): Measure | UnitFault {
  return spelledValue(text, dimensions) ?? looseValue(text, dimensions);
}

/** The value of a number that is no text: it fits where no unit is needed. */
export function bareValue(number: number, dimensions: Dimensions): Measure | UnitFault {
  const text = String(number);
  const unit = unitIn('', dimensions);
  if (!Number.isFinite(number)) return noNumberFault(text, dimensions);
  return unit === undefined ? wrongUnitFault(text, text, '', dimensions) : convert(text, text, unit);
}

function looseValue(text: string, dimensions: Dimensions): Measure | UnitFault {
  const lookAlike = lookAlikeFault(text);
  if (lookAlike !== undefined) return lookAlike;
  const start = skipBlanks(text, 0);
  const end = numberEnd(text, start);
  if (end === start) return noNumberFault(text, dimensions);
  const spelling = plainUnit(text.slice(end));
  const number = text.slice(start, end);
  const unit = unitIn(spelling, dimensions);
  if (unit !== undefined) return convert(text, number, unit);
  return spoiltNumberFault(text, start, end) ?? wrongUnitFault(text, number, spelling, dimensions);
}

/** The fault of a measure that lies below what its dimension allows. */
function belowFault(text: string, { value, dimension }: Measure): UnitFault | undefined {
  const { atLeast, words } = DIMENSIONS[dimension];
  if (atLeast === undefined || value >= atLeast) return undefined;
  return dimension === 'temperature'
    ? { found: `${quoted(text)} is below absolute zero`, right: 'a temperature of at least -273.15 degC' }
    : { found: `${quoted(text)} is below zero`, right: `${words} of zero or more` };
}

function convert(text: string, number: string, unit: Unit): Measure | UnitFault {
  const value = toSi(Number(number), unit);
  if (!Number.isFinite(value) || vanishes(number, value, unit)) {
    return { found: `${quoted(text)} is beyond what can be computed with`, right: 'a number between 1e-290 and 1e290' };
  }
  const measure: Measure = { value: value === 0 ? 0 : value, dimension: unit.dimension, unit: unit.name };
  return belowFault(text, measure) ?? measure;
}

/** Whether a number that was not written as zero has become zero. */
function vanishes(number: string, value: number, unit: Unit): boolean {
  if (value !== 0 || unit.offset !== undefined) return false;
  for (const character of number) {
    if (character === 'e' || character === 'E') return false;
    if (character >= '1' && character <= '9') return true;
  }
  return false;
}
