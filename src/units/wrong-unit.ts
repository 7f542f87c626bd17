import { DIMENSIONS } from './dimensions.ts';
import { dimensionOf, otherCases, spellingsOf } from './lookup.ts';
import { refusedUnit } from './refused-units.ts';
import { nearest } from './suggest.ts';
import { either, needed, quoted } from './unit-fault.ts';
import type { Dimension, Dimensions } from './dimensions.ts';
import type { UnitFault } from './unit-fault.ts';

/** Why `unit`, in plain spelling, is no unit of these dimensions; `text` is the whole value, `number` what stands before. */
export function wrongUnitFault(text: string, number: string, unit: string, dimensions: Dimensions): UnitFault {
  const list = typeof dimensions === 'string' ? [dimensions] : dimensions;
  if (unit === '') return noUnitFault(text, number, list);
  const question = first(list, (dimension) => refusedUnit(unit, dimension));
  if (question !== undefined) return { found: quoted(text), right: question };
  const cases = list.flatMap((dimension) => otherCases(unit, dimension));
  if (cases.length > 0) return { found: quoted(text), right: `write ${either(cases)}` };
  const other = dimensionOf(unit);
  if (other !== undefined) return { found: `${quoted(text)} is ${DIMENSIONS[other].words}`, right: needed(list) };
  return unknownUnitFault(text, unit, list);
}

function noUnitFault(text: string, number: string, dimensions: readonly Dimension[]): UnitFault {
  const sample = first(dimensions, (dimension) => DIMENSIONS[dimension].units[0]);
  const example = sample === undefined ? '' : `, such as ${number} ${sample}`;
  return { found: `${quoted(text)} has no unit`, right: `${needed(dimensions)}${example}` };
}

function unknownUnitFault(text: string, unit: string, dimensions: readonly Dimension[]): UnitFault {
  const near = nearest(
    unit,
    dimensions.flatMap((dimension) => [...spellingsOf(dimension)]),
  );
  const meant = near === undefined || near === '' ? '' : `perhaps ${near}; `;
  return { found: `${quoted(text)} has no known unit`, right: `${meant}${needed(dimensions)}` };
}

function first(
  dimensions: readonly Dimension[],
  look: (dimension: Dimension) => string | undefined,
): string | undefined {
  for (const dimension of dimensions) {
    const found = look(dimension);
    if (found !== undefined) return found;
  }
  return undefined;
}
