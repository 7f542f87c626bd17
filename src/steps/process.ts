import type { Placed } from '../documents/document.ts';
import type { Assumption, Process } from '../documents/generated/types.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';
import { success } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import type { Dimension } from '../units/dimensions.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import { dimensionOf } from './addresses.ts';
import { unknownAddress } from './names.ts';
import { readStandIn, type StandIn } from './stand-in.ts';

/** Grades of a bound, gravest first. */
export type Grade = 'error' | 'warning' | 'note';

/** An intended process, as the assumptions that it makes. */
export interface ProcessSpec {
  readonly name: string;
  readonly title: string;
  readonly remark?: string;
  readonly revision?: string;
  readonly basedOn?: string;
  readonly basedOnPlace?: Place;
  readonly assumptions: readonly AssumptionSpec[];
  /** Names of numbers that are printed beside, never judged. */
  readonly shows: readonly string[];
  readonly usual: readonly UsualRange[];
  readonly standsIn: readonly StandIn[];
  /** Of its name. */
  readonly place: Place;
}

export interface AssumptionSpec {
  readonly name: string;
  readonly statement: string;
  /** Name of the number that is judged. */
  readonly quantity: string;
  /** Name of the number, or address of the setpoint, that it is divided by. */
  readonly over?: string;
  readonly atLeast?: GradedLimits;
  readonly atMost?: GradedLimits;
  /** `given`: judged only where the recipe supplies what it needs. */
  readonly when?: 'given';
  /** Grade of a review that a rule forces, where the process states it. */
  readonly reviewLevel?: Grade;
  /** Addresses of setpoints that may be moved. */
  readonly cure: readonly string[];
  readonly remark?: string;
  readonly source: string;
  /** Of its name. */
  readonly place: Place;
  /** Of the number's name, and of what it is divided by. */
  readonly quantityPlace: Place;
  readonly overPlace?: Place;
}

/** Limits by grade; a plain bound has one, at its `level`. */
export type GradedLimits = Readonly<Partial<Record<Grade, LateValue>>>;

/** A value as written: its dimension is that of the number it bounds. */
export interface LateValue {
  readonly is: string | number;
  readonly place: Place;
}

/** Limits between which a setpoint of such a step usually lies; read in the dimension of the address. */
export interface UsualRange {
  readonly address: string;
  readonly atLeast?: LateValue;
  readonly atMost?: LateValue;
  readonly place: Place;
}

/** The process that one document states, without what it is based on. */
export function processFrom(document: Placed<Process>): Outcome<ProcessSpec> {
  const { content } = document;
  const faults: Fault[] = [];
  const assumptions = Object.entries(content.assumptions ?? {}).map(([name, one]) =>
    assumptionFrom(name, one, document),
  );
  const spec: ProcessSpec = {
    name: content.name,
    title: content.title,
    ...(content.remark === undefined ? {} : { remark: content.remark }),
    ...(content.revision === undefined ? {} : { revision: content.revision }),
    ...(content.based_on === undefined
      ? {}
      : { basedOn: content.based_on, basedOnPlace: document.place(['based_on']) }),
    assumptions,
    shows: content.shows ?? [],
    usual: usualRanges(document, faults),
    standsIn: standIns(document, faults),
    place: document.place(['name']),
  };
  return success(spec, faults);
}

/** A process over the one that it is based on: what it says itself wins, by name and address. */
export function basedOn(own: ProcessSpec, base: ProcessSpec): ProcessSpec {
  return {
    ...own,
    assumptions: merged(base.assumptions, own.assumptions, ({ name }) => name),
    shows: [...new Set([...base.shows, ...own.shows])],
    usual: merged(base.usual, own.usual, ({ address }) => address),
    standsIn: merged(base.standsIn, own.standsIn, ({ given }) => given.address),
  };
}

function merged<T>(base: readonly T[], own: readonly T[], key: (one: T) => string): readonly T[] {
  const byKey = new Map(base.map((one) => [key(one), one]));
  for (const one of own) byKey.set(key(one), one);
  return [...byKey.values()];
}

function assumptionFrom(name: string, assumption: Assumption, document: Placed<Process>): AssumptionSpec {
  const { level, over, at_least, at_most, when, review_level, remark } = assumption;
  const pointer = ['assumptions', name];
  const limits = (side: 'at_least' | 'at_most', bound: NonNullable<Assumption['at_least']>) =>
    gradedLimits(bound, level ?? 'warning', (grade) => document.place([...pointer, side, ...grade]));
  return {
    name,
    statement: assumption.statement,
    quantity: assumption.quantity,
    ...(over === undefined ? {} : { over, overPlace: document.place([...pointer, 'over']) }),
    ...(at_least === undefined ? {} : { atLeast: limits('at_least', at_least) }),
    ...(at_most === undefined ? {} : { atMost: limits('at_most', at_most) }),
    ...(when === undefined ? {} : { when }),
    ...(review_level === undefined ? {} : { reviewLevel: review_level }),
    cure: assumption.cure ?? [],
    ...(remark === undefined ? {} : { remark }),
    source: assumption.source,
    place: document.place(pointer, 'key'),
    quantityPlace: document.place([...pointer, 'quantity']),
  };
}

/** A bound as limits by grade. */
export function gradedLimits(
  bound: NonNullable<Assumption['at_least']>,
  level: Grade,
  placeOf: (grade: readonly string[]) => Place,
): GradedLimits {
  if (typeof bound !== 'object') return { [level]: { is: bound, place: placeOf([]) } };
  const limits: Partial<Record<Grade, LateValue>> = {};
  for (const grade of GRADES) {
    const is = bound[grade];
    if (is !== undefined) limits[grade] = { is, place: placeOf([grade]) };
  }
  return limits;
}

const GRADES: readonly Grade[] = ['error', 'warning', 'note'];

function usualRanges(document: Placed<Process>, faults: Fault[]): readonly UsualRange[] {
  const ranges: UsualRange[] = [];
  for (const [address, limits] of Object.entries(document.content.usual ?? {})) {
    const place = document.place(['usual', address], 'key');
    const dimension = dimensionOf(address);
    if (dimension === undefined) {
      faults.push(unknownAddress(address, place));
      continue;
    }
    const limit = (side: 'at_least' | 'at_most') =>
      usualLimit(limits[side], dimension, document.place(['usual', address, side]), faults);
    const atLeast = limit('at_least');
    const atMost = limit('at_most');
    ranges.push({
      address,
      ...(atLeast === undefined ? {} : { atLeast }),
      ...(atMost === undefined ? {} : { atMost }),
      place,
    });
  }
  return ranges;
}

/** A limit as written, once it is sure that it can be read. */
function usualLimit(
  is: string | number | undefined,
  dimension: Dimension,
  place: Place,
  faults: Fault[],
): LateValue | undefined {
  if (is === undefined) return undefined;
  const measure = readMeasure(is, dimension);
  if (!isUnitFault(measure)) return { is, place };
  faults.push({ place, found: measure.found, right: measure.right });
  return undefined;
}

function standIns(document: Placed<Process>, faults: Fault[]): readonly StandIn[] {
  const entries: readonly [string, NonNullable<Process['stands_in']>[string]][] = Object.entries(
    document.content.stands_in ?? {},
  );
  return entries.flatMap(([address, stated]) => {
    const placeOf = (side: readonly string[], part?: 'key') => document.place(['stands_in', address, ...side], part);
    const { value, faults: wrong } = readStandIn(address, stated, document.content.name, placeOf);
    faults.push(...wrong);
    return value === undefined ? [] : [value];
  });
}
