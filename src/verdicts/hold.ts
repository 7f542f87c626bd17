import type { Bound, Grades, Kind, Level } from './verdict.ts';

/** Grades, gravest first. */
export const LEVELS: readonly Level[] = ['error', 'warning', 'note'];

/** How a value stands to a bound. */
export interface Standing {
  readonly kind: Extract<Kind, 'pass' | 'review' | 'fail'>;
  readonly level: Level;
  readonly limit?: Limit;
  readonly margin?: number;
  readonly perhaps?: Level;
}

export interface Limit {
  readonly side: 'at_least' | 'at_most';
  readonly value: number;
}

/** A limit of a bound with its grade. */
export interface GradedLimit extends Limit {
  readonly level: Level;
}

/**
 * A value with its expanded uncertainty held against the limits of a bound, gravest grade first. A limit is crossed if the value
 * lies beyond it by more than the uncertainty, kept if it lies on its good side by as much, else unsure. The value fails at the
 * gravest grade crossed; else it is to be reviewed at the gravest grade unsure; else it passes.
 */
export function hold(value: number, uncertainty: number, limits: readonly GradedLimit[]): Standing {
  let crossed: GradedLimit | undefined;
  let unsure: GradedLimit | undefined;
  for (const limit of limits) {
    const beyond = beyondBy(value, limit);
    if (beyond > uncertainty) crossed ??= limit;
    else if (beyond > -uncertainty) unsure ??= limit;
  }
  if (crossed !== undefined) {
    const perhaps = unsure !== undefined && isGraver(unsure.level, crossed.level) ? { perhaps: unsure.level } : {};
    return { kind: 'fail', level: crossed.level, ...towards(value, crossed), ...perhaps };
  }
  if (unsure !== undefined) return { kind: 'review', level: unsure.level, ...towards(value, unsure) };
  return { kind: 'pass', level: limits[0]?.level ?? 'note', ...nearest(value, limits) };
}

export function isGraver(one: Level, other: Level): boolean {
  return LEVELS.indexOf(one) < LEVELS.indexOf(other);
}

/** Limits of a bound, gravest grade first. */
export function limitsOf({ at_least = {}, at_most = {} }: Bound): readonly GradedLimit[] {
  return LEVELS.flatMap((level) => [...sided('at_least', at_least, level), ...sided('at_most', at_most, level)]);
}

function sided(side: Limit['side'], grades: Grades, level: Level): readonly GradedLimit[] {
  const value = grades[level];
  return value === undefined ? [] : [{ level, side, value }];
}

/** A value that differs from its limit by no more than rounding lies on it. */
const ROUNDING = 1e-9;

/** By how much a value lies beyond a limit; negative on its good side. */
export function beyondBy(value: number, { side, value: limit }: Limit): number {
  const beyond = side === 'at_most' ? value - limit : limit - value;
  return Math.abs(beyond) <= ROUNDING * Math.abs(limit) ? 0 : beyond;
}

/** The limit that decides, and the factor by which the value is on its good side. */
interface Towards {
  readonly limit: Limit;
  readonly margin?: number;
}

function towards(value: number, { side, value: limit }: Limit): Towards {
  const factor = side === 'at_most' ? limit / value : value / limit;
  const decides = { side, value: limit };
  return Number.isFinite(factor) ? { limit: decides, margin: factor } : { limit: decides };
}

/** Of several limits that are kept the one with the smallest margin. */
function nearest(value: number, limits: readonly Limit[]): Partial<Towards> {
  let tightest: Towards | undefined;
  for (const limit of limits) {
    const one = towards(value, limit);
    if (tightest === undefined || (one.margin ?? Infinity) < (tightest.margin ?? Infinity)) tightest = one;
  }
  return tightest ?? {};
}
