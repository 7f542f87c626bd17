import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { Dimension } from '../units/dimensions.ts';

/** Where physical values stand in a content: one node for each place that its schema tells apart. */
export interface PlanNode {
  readonly measure?: MeasurePlan;
  /** Nodes of the named keys, as indices into the plan. */
  readonly keys?: Readonly<Record<string, number>>;
  /** Node of every other key. */
  readonly rest?: number;
  /** Node of the entries of a list. */
  readonly items?: number;
}

/** What may be written at a place for a physical value. */
export interface MeasurePlan {
  readonly dimensions: readonly [Dimension, ...Dimension[]];
  /** An accuracy in the first dimension, instead of a value. */
  readonly accuracy?: true;
  readonly tolerance?: true;
  readonly ramp?: true;
  readonly range?: true;
  /** Words that may stand instead: `unknown`, `none`, `rest`, `open`. */
  readonly words?: readonly string[];
  /** Only whole numbers. */
  readonly whole?: true;
  readonly least?: number;
}

/** The text whose values are read, and what was wrong so far. */
export interface Pass {
  readonly source: Source;
  readonly faults: Fault[];
}
