import type { Fault } from '../shelf/fault.ts';
import { dimensionOf } from '../steps/addresses.ts';
import type { LateValue, ProcessSpec, UsualRange } from '../steps/process.ts';
import type { Step } from '../steps/step.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import type { Assumption } from './assumption.ts';
import type { Bound } from './verdict.ts';

/* Setpoints held against limits that a document states for them: the chamber's, and what is usual for the process. */

/** A setpoint outside its usual range by this factor makes one ask whether its unit is right. */
const UNUSUAL_FACTOR = 10;

/** The limits that a step's chamber sets to its setpoints: `chamber.limits.pressure.at_most`. */
export function chamberLimits(step: Step): readonly Assumption[] {
  const limited = new Map<string, Bound>();
  for (const [address, { value }] of step.givens) {
    if (!address.startsWith(LIMITS)) continue;
    const cut = address.lastIndexOf('.');
    const setpoint = address.slice(LIMITS.length, cut);
    const side = address.slice(cut + 1) === 'at_least' ? 'at_least' : 'at_most';
    limited.set(setpoint, { ...limited.get(setpoint), [side]: { error: value } });
  }
  return [...limited].map(([setpoint, bound]) => ({
    ...about(setpoint, step),
    process: 'chamber-fit',
    name: `${setpoint}-limits`,
    statement: `The chamber allows the setpoint of ${setpoint}.`,
    source: 'limits stated by the chamber',
    bound,
  }));
}

const LIMITS = 'chamber.limits.';

/** Setpoints of a step that a factor of ten separates from what is usual for its process. */
export function usualRanges(process: ProcessSpec, step: Step): readonly Assumption[] {
  return process.usual.map((range) => ({
    ...about(range.address, step),
    process: process.name,
    name: `usual-${range.address}`,
    statement: `The setpoint of ${range.address} is near what is usual; else: is the unit right?`,
    source: `usual range of ${process.name}, widened by a factor ${UNUSUAL_FACTOR}`,
    bound: widened(range),
  }));
}

function about(address: string, step: Step) {
  return {
    reference: { id: 'setpoint', of: address },
    whenGiven: true,
    nominal: true,
    cure: [address],
    place: step.place,
  };
}

function widened({ address, atLeast, atMost }: UsualRange): Bound {
  const least = inSi(address, atLeast);
  const most = inSi(address, atMost);
  return {
    ...(least === undefined ? {} : { at_least: { note: least / UNUSUAL_FACTOR } }),
    ...(most === undefined ? {} : { at_most: { note: most * UNUSUAL_FACTOR } }),
  };
}

function inSi(address: string, limit: LateValue | undefined): number | undefined {
  const dimension = dimensionOf(address);
  if (limit === undefined || dimension === undefined) return undefined;
  const measure = readMeasure(limit.is, dimension);
  return isUnitFault(measure) ? undefined : measure.value;
}

/** Usual ranges of a process that can't be read. */
export function usualFaults({ usual }: ProcessSpec): readonly Fault[] {
  return usual.flatMap(({ address, atLeast, atMost }) => {
    const dimension = dimensionOf(address);
    return [atLeast, atMost].flatMap((limit) => {
      if (limit === undefined || dimension === undefined) return [];
      const measure = readMeasure(limit.is, dimension);
      return isUnitFault(measure) ? [{ place: limit.place, ...measure }] : [];
    });
  });
}
