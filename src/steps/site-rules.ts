import type { SiteDocument } from '../documents/document.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import type { Library } from '../substances/library.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Tolerance } from '../units/measure.ts';
import { fixedOf } from './facts.ts';
import { checkGas, unknownName } from './names.ts';
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

/** What the rules of a site are read against. */
export interface RuleGround {
  readonly library: Library;
  readonly chamberNames: readonly string[];
  readonly faults: Fault[];
}

export function ratiosOf(document: SiteDocument, ground: RuleGround): readonly RatioSpec[] {
  return Object.entries(document.content.ratios ?? {}).map(([name, ratio]) => {
    const { of, to, at_least, at_most, chambers, statement, source, level = 'warning' } = ratio;
    for (const key of ['of', 'to'] as const) {
      checkGas(ratio[key], () => document.place(['ratios', name, key]), ground);
    }
    checkChambers(name, chambers ?? [], document, ground);
    const limits = (side: 'at_least' | 'at_most', bound: NonNullable<typeof at_least>) =>
      gradedLimits(bound, level, (grade) => document.place(['ratios', name, side, ...grade]));
    return {
      name,
      of,
      to,
      ...(at_least === undefined ? {} : { atLeast: limits('at_least', at_least) }),
      ...(at_most === undefined ? {} : { atMost: limits('at_most', at_most) }),
      ...(chambers === undefined ? {} : { chambers }),
      ...(statement === undefined ? {} : { statement }),
      ...(source === undefined ? {} : { source }),
      place: document.place(['ratios', name], 'key'),
    };
  });
}

export function clearingOf(document: SiteDocument, ground: RuleGround): Clearing {
  const clearing = new Map<string, readonly ClearingPoint[]>();
  for (const [gas, rows] of Object.entries(document.content.clearing ?? {})) {
    checkGas(gas, () => document.place(['clearing', gas], 'key'), ground);
    const points = rows.flatMap((row) => {
      const wall = fixedOf(row.wall);
      const time = fixedOf(row.time);
      return wall === undefined || time === undefined ? [] : [{ wall: wall.measure.value, time: time.measure.value }];
    });
    clearing.set(
      gas,
      points.sort((a, b) => a.wall - b.wall),
    );
  }
  return clearing;
}

function checkChambers(ratio: string, chambers: readonly string[], document: SiteDocument, ground: RuleGround): void {
  const { chamberNames, faults } = ground;
  for (const [index, chamber] of chambers.entries()) {
    if (chamberNames.includes(chamber)) continue;
    const place = document.place(['ratios', ratio, 'chambers', index]);
    faults.push(unknownName(place, 'chamber', chamber, chamberNames, 'the name of a chamber of the site'));
  }
}

/** Tolerances of setpoints that give none of their own, by dimension. */
export function tolerancesOf({ content }: SiteDocument): ReadonlyMap<Dimension, Tolerance> {
  const tolerances = new Map<Dimension, Tolerance>();
  for (const dimension of WITH_TOLERANCE) {
    const accuracy = content.tolerances?.[dimension];
    if (accuracy !== undefined) tolerances.set(dimension, accuracy.tolerance);
  }
  return tolerances;
}

const WITH_TOLERANCE = ['time', 'temperature', 'pressure', 'flow', 'power', 'length'] as const;
