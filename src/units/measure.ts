import type { Dimension } from './dimensions.ts';

/** A value with its unit, converted to SI. */
export interface Measure {
  /** In the SI unit of the dimension. */
  readonly value: number;
  readonly dimension: Dimension;
  /** The unit's own spelling in the table of units, whatever variant was written; empty for a bare number. */
  readonly unit: string;
  /** Half-width of the limits between which the value surely lies. */
  readonly tolerance?: Tolerance;
}

/**
 * `of`: `value` is absolute, in SI. `reading` and `full scale` are fractions of the value and of the instrument's full scale.
 */
export interface Tolerance {
  readonly value: number;
  readonly of: 'value' | 'reading' | 'full scale';
}
