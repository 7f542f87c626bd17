import type { Place } from './place.ts';

/**
 * What is wrong with an input: where, what was found there, and what would be right.
 * Faults are values; nothing throws for them.
 */
export interface Fault {
  /** A file that could not be read at all has a place in line 1, column 1. */
  readonly place: Place;
  /** What was found, as a clause: "pressure: '4 mtorr'". */
  readonly found: string;
  /** What would be right, as a clause: "write mTorr". */
  readonly right: string;
}

/**
 * The result of a step that may fail: a value, faults, or both where part of the job could be done.
 * Without a value there is at least one fault.
 */
export interface Outcome<T> {
  readonly value?: T;
  readonly faults: readonly Fault[];
}

export function success<T>(value: T, faults: readonly Fault[] = []): Outcome<T> {
  return { value, faults };
}

export function failure(...faults: readonly Fault[]): Outcome<never> {
  return { faults };
}

/** The place that stands for a whole file. */
export function wholeFile(file: string): Place {
  return { file, line: 1, column: 1 };
}
