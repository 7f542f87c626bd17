import type { Place } from '../shelf/place.ts';
import type { Dimension } from '../units/dimensions.ts';

/** Where a value comes from: a place in a document, or a default with the reason why it stands in. */
export type Origin = { readonly place: Place } | { readonly default: string; readonly because: string };

/**
 * One value that a step is given: a setpoint, a fact of its chamber, or a default that stands in for one.
 * `address` is the key path in the step (`pressure`, `flows.Ar`), with `chamber.` before what only a chamber document holds.
 */
export interface Given {
  readonly address: string;
  /** In the SI unit of the dimension. */
  readonly value: number;
  /** Standard uncertainty, absolute, in the same unit. */
  readonly uncertainty: number;
  readonly dimension: Dimension;
  /** The unit in which it was written, or in which a default is shown. */
  readonly unit: string;
  readonly origin: Origin;
  readonly span?: Span;
}

/** What a changing or loosely set value runs through; `value` is then the start of the ramp, or the usual value of the range. */
export type Span =
  | { readonly kind: 'ramp'; readonly from: number; readonly to: number; readonly over: 'step' | 'laps' }
  | { readonly kind: 'range'; readonly atLeast?: number; readonly atMost?: number };

export function isDefault(origin: Origin): origin is { readonly default: string; readonly because: string } {
  return 'default' in origin;
}
