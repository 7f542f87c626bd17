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

interface Limit {
  readonly side: 'at_least' | 'at_most';
  readonly value: number;
}

type Relation = 'crossed' | 'unsure' | 'kept';

/**
 * A value with its expanded uncertainty held against a bound. A limit is crossed if the value lies beyond it by more than
 * the uncertainty, kept if it lies on its good side by as much, else unsure. It fails at the gravest grade crossed; else it is to
 * be reviewed at the gravest grade unsure; else it passes.
 */
export function hold(value: number, uncertainty: number, bound: Bound): Standing {
  const held = limitsOf(bound).map(({ level, limit }) => ({ level, limit, relation: relate(value, uncertainty, limit) }));
  const crossed = held.find(({ relation }) => relation === 'crossed');
  const unsure = held.find(({ relation }) => relation === 'unsure');
  if (crossed !== undefined) {
    const graver = unsure !== undefined && LEVELS.indexOf(unsure.level) < LEVELS.indexOf(crossed.level);
    return {
      kind: 'fail',
      level: crossed.level,
      ...towards(value, crossed.limit),
      ...(graver ? { perhaps: unsure.level } : {}),
    };
  }
  if (unsure !== undefined) return { kind: 'review', level: unsure.level, ...towards(value, unsure.limit) };
  return { kind: 'pass', level: gravest(bound), ...nearest(value, held.map(({ limit }) => limit)) };
}

/** The gravest grade that a bound has. */
export function gravest({ at_least = {}, at_most = {} }: Bound): Level {
  return LEVELS.find((level) => at_least[level] !== undefined || at_most[level] !== undefined) ?? 'note';
}

/** Limits of a bound, gravest grade first. */
function limitsOf({ at_least = {}, at_most = {} }: Bound): readonly { level: Level; limit: Limit }[] {
  return LEVELS.flatMap((level) => [...sided('at_least', at_least, level), ...sided('at_most', at_most, level)]);
}

function sided(side: Limit['side'], grades: Grades, level: Level): readonly { level: Level; limit: Limit }[] {
  const value = grades[level];
  return value === undefined ? [] : [{ level, limit: { side, value } }];
}

/** A value that differs from its limit by no more than rounding lies on it. */
const ROUNDING = 1e-9;

function relate(value: number, uncertainty: number, { side, value: limit }: Limit): Relation {
  const good = side === 'at_most' ? limit - value : value - limit;
  if (good >= uncertainty - ROUNDING * Math.abs(limit)) return 'kept';
  return good < -uncertainty ? 'crossed' : 'unsure';
}

function towards(value: number, limit: Limit): { limit: Limit; margin?: number } {
  const factor = limit.side === 'at_most' ? limit.value / value : value / limit.value;
  return Number.isFinite(factor) ? { limit, margin: factor } : { limit };
}

/** Of several limits that are kept the one with the smallest margin. */
function nearest(value: number, limits: readonly Limit[]): { limit?: Limit; margin?: number } {
  let tightest: { limit: Limit; margin?: number } | undefined;
  for (const limit of limits) {
    const one = towards(value, limit);
    if (tightest === undefined || (one.margin ?? Infinity) < (tightest.margin ?? Infinity)) tightest = one;
  }
  return tightest ?? {};
}
