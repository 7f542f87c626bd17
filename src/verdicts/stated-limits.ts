import type { Plan } from '../quantities/plan.ts';
import type { StepRun } from '../quantities/run.ts';
import type { Fault } from '../shelf/fault.ts';
import { dimensionOf } from '../steps/addresses.ts';
import type { LateValue, ProcessSpec, UsualRange } from '../steps/process.ts';
import type { Given } from '../steps/given.ts';
import type { Step } from '../steps/step.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import type { Assumption } from './assumption.ts';
import { limitsOf } from './hold.ts';
import type { Bound } from './verdict.ts';

/* Setpoints held against limits that a document states for them: the chamber's, and what is usual for the process. */

/** A setpoint outside its usual range by this factor makes one ask whether its unit is right. */
const UNUSUAL_FACTOR = 10;

/** The limits that a step's chamber sets to its setpoints: `chamber.limits.pressure.at_most`. */
export function chamberLimits({ plan, step }: StepRun): readonly Assumption[] {
  let addresses = LIMITED.get(plan);
  if (addresses === undefined) {
    addresses = limitAddresses(plan.scope.addresses(LIMITS));
    LIMITED.set(plan, addresses);
  }
  return addresses.map((setpoint) => limitOf(setpoint, step));
}

const LIMITS = 'chamber.limits.';

/** Setpoints with limits, by plan: steps of one plan have the same. */
const LIMITED = new WeakMap<Plan, readonly string[]>();

function limitAddresses(addresses: readonly string[]): readonly string[] {
  return [...new Set(addresses.map((address) => address.slice(LIMITS.length, address.lastIndexOf('.'))))];
}

/** The limit of a setpoint as an assumption; made once for each limit of a chamber, since its every step asks for it. */
function limitOf(setpoint: string, step: Step): Assumption {
  const least = step.givens.get(`${LIMITS}${setpoint}.at_least`);
  const most = step.givens.get(`${LIMITS}${setpoint}.at_most`);
  const key = least ?? most;
  let limit = key === undefined ? undefined : MADE.get(key);
  if (limit === undefined) {
    limit = newLimit(setpoint, least?.value, most?.value, step);
    if (key !== undefined) MADE.set(key, limit);
  }
  return limit;
}

const MADE = new WeakMap<Given, Assumption>();

function newLimit(setpoint: string, least: number | undefined, most: number | undefined, { place }: Step): Assumption {
  return about(setpoint, {
    process: 'chamber-fit',
    name: `${setpoint}-limits`,
    statement: `The chamber allows the setpoint of ${setpoint}.`,
    source: 'limits stated by the chamber',
    bound: {
      ...(least === undefined ? {} : { at_least: { error: least } }),
      ...(most === undefined ? {} : { at_most: { error: most } }),
    },
    place,
  });
}

/** Setpoints that a factor of ten separates from what is usual for a process. */
export function usualRanges(process: ProcessSpec): readonly Assumption[] {
  let ranges = USUAL.get(process);
  if (ranges === undefined) {
    ranges = process.usual.map((range) => usualOf(range, process));
    USUAL.set(process, ranges);
  }
  return ranges;
}

const USUAL = new WeakMap<ProcessSpec, readonly Assumption[]>();

function usualOf(range: UsualRange, { name, place }: ProcessSpec): Assumption {
  return about(range.address, {
    process: name,
    name: `usual-${range.address}`,
    statement: `The setpoint of ${range.address} is near what is usual; else: is the unit right?`,
    source: `usual range of ${name}, widened by a factor ${UNUSUAL_FACTOR}`,
    bound: widened(range),
    place,
  });
}

type Stated = Pick<Assumption, 'process' | 'name' | 'statement' | 'source' | 'bound' | 'place'>;

/** An assumption on a setpoint itself, as set. */
function about(address: string, stated: Stated): Assumption {
  return {
    ...stated,
    reference: { id: 'setpoint', of: address },
    limits: limitsOf(stated.bound),
    whenGiven: true,
    nominal: true,
    cure: [address],
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
