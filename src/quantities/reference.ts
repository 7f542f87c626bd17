/** How a number is named: `id[.length][:subject][@when]`, `knudsen.gap`, `diffusivity:SiH4/N2`, `carry-over:O2@end`. */
export interface Reference {
  readonly id: string;
  /** A length of the chamber, step or feature: `gap`, `throw`. */
  readonly length?: string;
  /** A gas, a pair `a/b`, an element, or a role that the step fills: `reactant`, `target`, `melt`, `ion`, `worst`. */
  readonly of?: string;
  readonly at?: 'start' | 'end' | 'mean';
}

const SHAPE = /^([a-z0-9-]+)(?:\.([a-z0-9_-]+))?(?::([^:@\s]+))?(?:@(start|end|mean))?$/;

/** The reference that a name spells, or undefined where it is none. */
export function parseReference(name: string): Reference | undefined {
  const match = name.length > 200 ? null : SHAPE.exec(name);
  if (match === null) return undefined;
  const [, id = '', length, of, at] = match;
  return {
    id,
    ...(length === undefined ? {} : { length }),
    ...(of === undefined ? {} : { of }),
    ...(at === 'start' || at === 'end' || at === 'mean' ? { at } : {}),
  };
}

/** The name that a reference spells. */
export function referenceName({ id, length, of, at }: Reference): string {
  let name = id;
  if (length !== undefined) name += `.${length}`;
  if (of !== undefined) name += `:${of}`;
  if (at !== undefined) name += `@${at}`;
  return name;
}
