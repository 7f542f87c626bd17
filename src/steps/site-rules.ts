import type { SiteDocument } from '../documents/document.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import type { Library } from '../substances/library.ts';
import { isDimension, type Dimension } from '../units/dimensions.ts';
import type { Tolerance } from '../units/measure.ts';
import { fixedOf } from './facts.ts';
import { checkGas } from './names.ts';
import { gradedLimits, type GradedLimits } from './process.ts';

/** A ratio of flows that a site keeps within bounds, at every instant. */
export interface RatioSpec {
  readonly name: string;
  /** Gas whose flow is divided. */
  readonly of: string;
  /** Gas by whose flow it is divided. */
  readonly to: string;
  readonly atLeast?: GradedLimits;
  readonly atMost?: GradedLimits;
  /** Chambers on which it holds; on all, where absent. */
  readonly chambers?: readonly string[];
  readonly statement?: string;
  readonly source?: string;
  /** Of its name. */
  readonly place: Place;
}

/** How long a gas that clings takes to leave, by wall temperature in K; time in s. Coldest wall first. */
export type Clearing = ReadonlyMap<string, readonly ClearingPoint[]>;
export interface ClearingPoint {
  readonly wall: number;
  readonly time: number;
}

export function ratiosOf({ content, place }: SiteDocument, library: Library, faults: Fault[]): readonly RatioSpec[] {
  return Object.entries(content.ratios ?? {}).map(([name, ratio]) => {
    const { of, to, at_least, at_most, chambers, statement, source, level = 'warning' } = ratio;
    for (const key of ['of', 'to'] as const) checkGas(ratio[key], () => place(['ratios', name, key]), { library, faults });
    const limits = (side: 'at_least' | 'at_most', bound: NonNullable<typeof at_least>) =>
      gradedLimits(bound, level, (grade) => place(['ratios', name, side, ...grade]));
    return {
      name,
      of,
      to,
      ...(at_least === undefined ? {} : { atLeast: limits('at_least', at_least) }),
      ...(at_most === undefined ? {} : { atMost: limits('at_most', at_most) }),
      ...(chambers === undefined ? {} : { chambers }),
      ...(statement === undefined ? {} : { statement }),
      ...(source === undefined ? {} : { source }),
      place: place(['ratios', name], 'key'),
    };
  });
}

export function clearingOf({ content, place }: SiteDocument, library: Library, faults: Fault[]): Clearing {
  const clearing = new Map<string, readonly ClearingPoint[]>();
  for (const [gas, rows] of Object.entries(content.clearing ?? {})) {
    checkGas(gas, () => place(['clearing', gas], 'key'), { library, faults });
    const points = rows.flatMap((row) => {
      const wall = fixedOf(row.wall);
      const time = fixedOf(row.time);
      return wall === undefined || time === undefined ? [] : [{ wall: wall.measure.value, time: time.measure.value }];
    });
    clearing.set(gas, points.sort((a, b) => a.wall - b.wall));
  }
  return clearing;
}

/** Tolerances of setpoints that give none of their own, by dimension. */
export function tolerancesOf({ content }: SiteDocument): ReadonlyMap<Dimension, Tolerance> {
  const tolerances = new Map<Dimension, Tolerance>();
  for (const [dimension, accuracy] of Object.entries(content.tolerances ?? {})) {
    if (isDimension(dimension)) tolerances.set(dimension, accuracy.tolerance);
  }
  return tolerances;
}
