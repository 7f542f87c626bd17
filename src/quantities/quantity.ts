import type { Dimension } from '../units/dimensions.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Reference } from './reference.ts';
import type { Scope } from './scope.ts';

/** What a number is read from: the address of a given, another number, or a count that the scope itself fixes. */
export type Ingredient = string | Reference | number;

/** One argument of a law: one number, or a list of them (one a gas, say). */
export type Argument = number | readonly number[];

/** Where the arguments of a law come from, in order. */
export type Recipe<A extends readonly Argument[]> = {
  readonly [K in keyof A]: A[K] extends number ? Ingredient : readonly Ingredient[];
};

/** One entry of the catalogue, as the topics write it. */
export interface Entry<A extends readonly Argument[]> {
  readonly id: string;
  readonly symbol: string;
  readonly dimension: Dimension;
  readonly statement: string;
  /** Law and where it was published; 'definition' for what is one. */
  readonly source: string;
  /** Lengths that may follow the id, as in `knudsen.gap`. */
  readonly lengths?: (scope: Scope) => readonly string[];
  /** Subjects that the number can be read of, as in `mean-free-path:Ar`; the candidates for `worst`. */
  readonly subjects?: (scope: Scope) => readonly string[];
  /** Whether the number is also defined without a subject. Default: only where there are no subjects. */
  readonly whole?: boolean;
  /** Which of several candidates is the worst. Default: the largest. */
  readonly worst?: 'largest' | 'smallest';
  /** Judged at the setpoint: its uncertainty does not count. */
  readonly nominal?: boolean;
  /** The ingredients of the law; one ingredient alone (not in a list) where the number simply is that one; or why there is none. */
  readonly from: (reference: Reference, scope: Scope) => Recipe<A> | Ingredient | Missing | Inapplicable;
  readonly value: (...values: A) => number | Missing | Inapplicable;
  /** What would supply the number where the law itself finds that something is missing. */
  readonly needs?: (reference: Reference, scope: Scope) => readonly string[];
  /** What a reader must know of this value: limits of the law, estimated data. Asked for only when it is printed. */
  readonly remarks?: (reference: Reference, scope: Scope, values: A) => readonly string[];
}

/** An entry whose arguments are no longer told apart: what the machinery works with. */
export interface Quantity extends Omit<Entry<readonly Argument[]>, 'value' | 'from' | 'remarks'> {
  readonly from: (
    reference: Reference,
    scope: Scope,
  ) => readonly (Ingredient | readonly Ingredient[])[] | Ingredient | Missing | Inapplicable;
  readonly value: (values: readonly Argument[]) => number | Missing | Inapplicable;
  readonly remarks: (reference: Reference, scope: Scope, values: readonly Argument[]) => readonly string[];
}

/** An entry of the catalogue. The arguments that `value` takes are those that `from` names, one for one. */
export function quantity<A extends readonly Argument[]>(entry: Entry<A>): Quantity {
  // The machinery builds the values from what `from` returned, so they have the shape of A by construction.
  const shaped = (values: readonly Argument[]): A => values as A;
  return {
    ...entry,
    value: (values) => entry.value(...shaped(values)),
    remarks: (reference, scope, values) => entry.remarks?.(reference, scope, shaped(values)) ?? [],
  };
}

export function missing(...needs: readonly string[]): Missing {
  return { kind: 'missing', needs };
}

export function inapplicable(because: string): Inapplicable {
  return { kind: 'inapplicable', because };
}

/** Whether a law's answer says why there is no number. */
export function isAbsent(value: object | number): value is Missing | Inapplicable {
  return typeof value === 'object' && 'kind' in value;
}
