import { allQuantities, quantityNamed } from '../quantities/catalogue.ts';
import { parseReference } from '../quantities/reference.ts';
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
  const meant = nearest(
    reference.id,
    allQuantities().map(({ id }) => id),
  );
  const right = meant === undefined ? 'regimen list quantities tells all names' : `did you mean ${meant}?`;
  return { problem: { found: `no number is named '${reference.id}'`, right } };
}

type Checked =
  | { readonly reference: Reference; readonly problem?: undefined }
  | { readonly problem: Problem; readonly reference?: undefined };
