import { allQuantities, quantityNamed } from '../quantities/catalogue.ts';
import { parseReference, referenceName } from '../quantities/reference.ts';
import { dimensionOf } from '../steps/addresses.ts';
import { nearest } from '../units/suggest.ts';
import type { Reference } from '../quantities/reference.ts';
import type { Problem } from './problem.ts';

/** The number that a name of the command line spells, or what is wrong with it. */
export function checkedReference(name: string): Checked {
  const reference = parseReference(name);
  if (reference === undefined)
    return {
      problem: { found: `'${name}' is no name of a number`, right: 'write id[.length][:subject]: knudsen.gap' },
    };
  if (quantityNamed(reference.id) !== undefined) return { reference };
  // A setpoint is named by its address alone.
  if (dimensionOf(name) !== undefined) return { reference: { id: 'setpoint', of: name } };
  const meant = nearest(
    reference.id,
    allQuantities().map(({ id }) => id),
  );
  const right = meant === undefined ? 'regimen list quantities tells all names' : `did you mean ${meant}?`;
  return { problem: { found: `no number is named '${reference.id}'`, right } };
}

/** A name of the command line as the catalogue spells it. */
export function fullName(name: string): string {
  const { reference } = checkedReference(name);
  return reference === undefined ? name : referenceName(reference);
}

type Checked =
  | { readonly reference: Reference; readonly problem?: undefined }
  | { readonly problem: Problem; readonly reference?: undefined };
