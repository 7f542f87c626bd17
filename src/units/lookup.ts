import { DIMENSIONS, DIMENSION_NAMES } from './dimensions.ts';
import { UNITS } from './table.ts';
import type { Dimension, Dimensions } from './dimensions.ts';
import type { Unit } from './table.ts';

/** The unit of the dimension that is spelled so, letter for letter. */
export function unitSpelled(spelling: string, dimension: Dimension): Unit | undefined {
  return SPELLINGS.get(dimension)?.get(spelling);
}

/** Spellings that the dimension accepts, names of units first among their own. */
export function spellingsOf(dimension: Dimension): Iterable<string> {
  return SPELLINGS.get(dimension)?.keys() ?? [];
}

/** The unit that is spelled so in the first of these dimensions that has one. */
export function unitIn(spelling: string, dimensions: Dimensions): Unit | undefined {
  if (typeof dimensions === 'string') return unitSpelled(spelling, dimensions);
  for (const dimension of dimensions) {
    const unit = unitSpelled(spelling, dimension);
    if (unit !== undefined) return unit;
  }
  return undefined;
}

/** What the spelling would be but for the case of its letters, once for each unit of the dimension that it fits. */
export function otherCases(spelling: string, dimension: Dimension): readonly string[] {
  return LOWERED.get(dimension)?.get(spelling.toLowerCase()) ?? [];
}

/** The first dimension in which this is a unit. */
export function dimensionOf(spelling: string): Dimension | undefined {
  return DIMENSION_NAMES.find((dimension) => unitSpelled(spelling, dimension) !== undefined);
}

/** Units of the dimension, in the order of the table. */
export function unitsOf(dimension: Dimension): readonly Unit[] {
  const lender = DIMENSIONS[dimension].unitsOf ?? dimension;
  const units = UNITS.filter((unit) => unit.dimension === lender);
  return lender === dimension ? units : units.map((unit) => ({ ...unit, dimension }));
}

const SPELLINGS: ReadonlyMap<Dimension, ReadonlyMap<string, Unit>> = new Map(
  DIMENSION_NAMES.map((dimension) => [dimension, bySpelling(unitsOf(dimension))]),
);

const LOWERED: ReadonlyMap<Dimension, ReadonlyMap<string, readonly string[]>> = new Map(
  DIMENSION_NAMES.map((dimension) => [dimension, byLowerCase(dimension)]),
);

function bySpelling(units: readonly Unit[]): Map<string, Unit> {
  const map = new Map<string, Unit>();
  for (const unit of units) {
    map.set(unit.name, unit);
    for (const other of unit.others ?? []) map.set(other, unit);
  }
  return map;
}

function byLowerCase(dimension: Dimension): Map<string, string[]> {
  const map = new Map<string, string[]>();
  for (const spelling of spellingsOf(dimension)) {
    const lowered = spelling.toLowerCase();
    const before = map.get(lowered) ?? [];
    const unit = unitSpelled(spelling, dimension);
    if (before.some((other) => unitSpelled(other, dimension) === unit)) continue;
    map.set(lowered, [...before, spelling]);
  }
  return map;
}
