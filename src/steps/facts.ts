import type { Fixed, Unknown } from '../documents/setpoint.ts';

/** A fact of a document that has a value; `unknown` says as little as nothing. */
export function fixedOf(fact: Fixed | Unknown | undefined): Fixed | undefined {
  return fact?.kind === 'fixed' ? fact : undefined;
}
