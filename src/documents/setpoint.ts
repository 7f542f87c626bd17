import type { Place } from '../shelf/place.ts';
import type { Measure, Tolerance } from '../units/measure.ts';

/** A physical value as a document writes it. `place` is that of the whole value. */
export type Setpoint = Fixed | Ramp | Range | Unknown | None;

/** One value: `4 mTorr`, `4 mTorr +/- 1 %`. */
export interface Fixed {
  readonly kind: 'fixed';
  readonly measure: Measure;
  readonly place: Place;
}

/** `{ from: 400 degC, to: 700 degC }` over the step, or with `over: laps` from a cycle's first lap to its last. */
export interface Ramp {
  readonly kind: 'ramp';
  readonly from: Fixed;
  readonly to: Fixed;
  readonly over: 'step' | 'laps';
  readonly place: Place;
}

/** `{ usually: 60 s, at_least: 45 s, at_most: 90 s }`. Without `usually` the middle of both limits stands for it. */
export interface Range {
  readonly kind: 'range';
  readonly usually?: Fixed;
  readonly at_least?: Fixed;
  readonly at_most?: Fixed;
  readonly place: Place;
}

/** `unknown`: missing, whatever the default. */
export interface Unknown {
  readonly kind: 'unknown';
  readonly place: Place;
}

/** `none`: does not apply. */
export interface None {
  readonly kind: 'none';
  readonly place: Place;
}

/** `rest`: what the other shares leave of one. */
export interface Rest {
  readonly kind: 'rest';
  readonly place: Place;
}

/** How well a gauge, a gas line or a site's setpoints hold: `1 % of full scale`, `0.25 % of reading`, `0.1 s`. */
export interface Accuracy {
  readonly kind: 'accuracy';
  readonly tolerance: Tolerance;
  readonly place: Place;
}
