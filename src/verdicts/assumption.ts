import { allQuantities, dimensionOfNumber, quantityNamed } from '../quantities/catalogue.ts';
import { parseReference, type Reference } from '../quantities/reference.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import { dimensionOf } from '../steps/addresses.ts';
import type { AssumptionSpec, GradedLimits, ProcessSpec } from '../steps/process.ts';
import type { Dimension } from '../units/dimensions.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import { nearest } from '../units/suggest.ts';
import { LEVELS, limitsOf, type GradedLimit } from './hold.ts';
import type { Bound, Grades, Level } from './verdict.ts';

/** An assumption of a process, ready to be held against a step: its numbers are named, its bound is in SI. */
export interface Assumption {
  readonly process: string;
  readonly name: string;
  readonly statement: string;
  readonly source: string;
  readonly reference: Reference;
  readonly over?: Reference;
  readonly bound: Bound;
  /** The same, gravest grade first. */
  readonly limits: readonly GradedLimit[];
  /** Judged only if the recipe supplies what the number needs; else it does not apply. */
  readonly whenGiven: boolean;
  /** Judged at the value as set: its uncertainty does not count. */
  readonly nominal: boolean;
  /** Grade of a review, where the process states it. */
  readonly reviewLevel?: Level;
  readonly cure: readonly string[];
  readonly place: Place;
}

/** The assumptions of a process; a number that nobody knows, or a bound in a wrong unit, is a fault and leaves its assumption out. */
export function assumptionsOf(process: ProcessSpec): Outcome<readonly Assumption[]> {
  const known = KEPT.get(process);
  if (known !== undefined) return known;
  const faults: Fault[] = [];
  const value = process.assumptions.flatMap((spec) => read(process.name, spec, faults) ?? []);
  const outcome = { value, faults };
  KEPT.set(process, outcome);
  return outcome;
}

/** Every step of a process asks for its assumptions. */
const KEPT = new WeakMap<ProcessSpec, Outcome<readonly Assumption[]>>();

function read(process: string, spec: AssumptionSpec, faults: Fault[]): Assumption | undefined {
  const reference = numberNamed(spec.quantity, spec.quantityPlace, faults);
  const over = spec.over === undefined ? undefined : divisorNamed(spec.over, spec.overPlace ?? spec.place, faults);
  if (reference === undefined || (spec.over !== undefined && over === undefined)) return undefined;
  const bound = boundIn(dimensionOfNumber(reference, over), spec, faults);
  return {
    process,
    name: spec.name,
    statement: spec.statement,
    source: spec.source,
    reference,
    ...(over === undefined ? {} : { over }),
    bound,
    limits: limitsOf(bound),
    whenGiven: spec.when === 'given',
    nominal: quantityNamed(reference.id)?.nominal === true,
    ...(spec.reviewLevel === undefined ? {} : { reviewLevel: spec.reviewLevel }),
    cure: spec.cure,
    place: spec.place,
  };
}

/** A bound read in the dimension of the number that it bounds. */
export function boundIn(
  dimension: Dimension,
  { atLeast, atMost }: { readonly atLeast?: GradedLimits; readonly atMost?: GradedLimits },
  faults: Fault[],
): Bound {
  return {
    ...(atLeast === undefined ? {} : { at_least: gradesIn(dimension, atLeast, faults) }),
    ...(atMost === undefined ? {} : { at_most: gradesIn(dimension, atMost, faults) }),
  };
}

function gradesIn(dimension: Dimension, limits: GradedLimits, faults: Fault[]): Grades {
  const grades: Partial<Record<Level, number>> = {};
  for (const level of LEVELS) {
    const limit = limits[level];
    if (limit === undefined) continue;
    const measure = readMeasure(limit.is, dimension);
    if (isUnitFault(measure)) faults.push({ place: limit.place, ...measure });
    else grades[level] = measure.value;
  }
  return grades;
}

function numberNamed(name: string, place: Place, faults: Fault[]): Reference | undefined {
  const reference = parseReference(name);
  if (reference !== undefined && quantityNamed(reference.id) !== undefined) return reference;
  const meant = nearest(
    reference?.id ?? name,
    allQuantities().map(({ id }) => id),
  );
  const right = meant === undefined ? 'name a number of the catalogue: regimen list quantities' : `write ${meant}`;
  faults.push({ place, found: `no number is named '${name}'`, right });
  return undefined;
}

/** What a number is divided by: another number, or a setpoint by its address. */
function divisorNamed(name: string, place: Place, faults: Fault[]): Reference | undefined {
  const reference = parseReference(name);
  const isNumber = reference !== undefined && quantityNamed(reference.id) !== undefined;
  if (!isNumber && dimensionOf(name) !== undefined) return { id: 'setpoint', of: name };
  return numberNamed(name, place, faults);
}
