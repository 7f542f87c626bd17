import type { Gas as GasBlock } from '../documents/generated/types.ts';
import type { Fixed } from '../documents/setpoint.ts';
import type { Place } from '../shelf/place.ts';
import type { Block } from './blocks.ts';
import { CRITICAL_POINT_RULE } from './estimate.ts';
import { countElements } from './formula.ts';

export type Hazard = NonNullable<GasBlock['hazards']>[number];

/** A gas apart from the numbers that laws read: those are asked for by address. */
export interface Gas {
  readonly name: string;
  readonly title: string;
  /** Elements counted; empty where no formula is known. */
  readonly formula: ReadonlyMap<string, number>;
  readonly hazards: readonly Hazard[];
  readonly inert: boolean;
  /** Whether surfaces hold it. */
  readonly clings: boolean;
  readonly hasCollision: boolean;
  /** Whether the collision values were fitted together with the dipole. */
  readonly polar: boolean;
  /** The correlation that gave the collision values, where they were not fitted. */
  readonly estimated?: string;
  readonly heatCapacity?: readonly { readonly temperature: number; readonly is: number }[];
  /** Temperatures between which the vapour pressure holds. */
  readonly vapourPressure?: { readonly from: number; readonly to: number };
  readonly flammableRange?: { readonly atLeast: number; readonly atMost?: number };
  readonly decomposesAbove?: number;
  /** What its molecules gather to, and when. */
  readonly associates?: string;
  readonly remarks: readonly string[];
  /** Source by key of the block; of the gas itself under `source`. */
  readonly sources: Readonly<Record<string, string>>;
  readonly place: Place;
}

export function gasFrom(name: string, { content, place }: Block<GasBlock>): Gas {
  const estimated =
    content.collision === undefined && content.critical !== undefined
      ? CRITICAL_POINT_RULE
      : content.collision?.estimated;
  return {
    name,
    title: content.title ?? name,
    formula: formulaOf(content.formula, name),
    hazards: content.hazards ?? [],
    inert: content.inert ?? false,
    clings: content.clings ?? false,
    hasCollision: content.collision !== undefined || content.critical !== undefined,
    polar: content.collision?.form === 'stockmayer',
    ...(estimated === undefined ? {} : { estimated }),
    ...tables(content),
    ...(content.associates === undefined ? {} : { associates: content.associates }),
    remarks: remarksOf(content),
    sources: sourcesOf(content),
    place,
  };
}

function tables({ heat_capacity, vapour_pressure, flammable_range, decomposes_above }: GasBlock) {
  return {
    ...(heat_capacity === undefined
      ? {}
      : {
          heatCapacity: heat_capacity.at.map((row) => ({ temperature: valueOf(row.temperature), is: valueOf(row.is) })),
        }),
    ...(vapour_pressure === undefined
      ? {}
      : { vapourPressure: { from: valueOf(vapour_pressure.from), to: valueOf(vapour_pressure.to) } }),
    ...(flammable_range === undefined ? {} : { flammableRange: limitsOf(flammable_range) }),
    ...(decomposes_above === undefined ? {} : { decomposesAbove: valueOf(decomposes_above) }),
  };
}

function limitsOf({ at_least, at_most }: NonNullable<GasBlock['flammable_range']>): NonNullable<Gas['flammableRange']> {
  return { atLeast: valueOf(at_least), ...(at_most === undefined ? {} : { atMost: valueOf(at_most) }) };
}

/** The formula stated, else what the name spells if it is one. */
export function formulaOf(stated: string | undefined, name: string): ReadonlyMap<string, number> {
  return countElements(stated ?? name) ?? new Map();
}

export function remarksOf({
  remark,
  remarks = [],
}: {
  readonly remark?: string;
  readonly remarks?: readonly string[];
}): readonly string[] {
  return remark === undefined ? remarks : [remark, ...remarks];
}

/** Sources of a block by key: its own, and those of the values in it. */
export function sourcesOf(block: object): Readonly<Record<string, string>> {
  const sources: Record<string, string> = {};
  const entries: readonly [string, unknown][] = Object.entries(block);
  for (const [key, value] of entries) {
    if (key === 'source' && typeof value === 'string') sources[key] = value;
    if (typeof value !== 'object' || value === null || !('source' in value)) continue;
    if (typeof value.source === 'string') sources[key] = value.source;
  }
  return sources;
}

/** A value in SI, with its own source or without. */
export function valueOf(value: Fixed | { readonly is: Fixed }): number {
  return 'is' in value ? value.is.measure.value : value.measure.value;
}
