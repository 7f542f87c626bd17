import type { BandConvention } from '../physics/regime.ts';
import { band } from '../physics/regime.ts';
import type { Run } from '../quantities/run.ts';
import type { Site } from '../steps/site.ts';
import type { Given } from '../steps/given.ts';
import type { Dimension } from '../units/dimensions.ts';
import { displayUnit, printMeasure, toUnit } from '../units/display.ts';
import type { FlowReference } from '../units/flow-reference.ts';

/** Units asked for on the command line, by dimension. */
export type AskedUnits = ReadonlyMap<Dimension, string>;

/**
 * How the numbers of one recipe are shown: a setpoint in the unit in which it was written, another number in the site's unit, else
 * in that of the recipe's setpoints, else in one that fits its size. A unit asked for on the command line wins over all.
 */
export interface Shown {
  /** Factor from a standard uncertainty to the one that is printed. */
  readonly coverage: number;
  readonly bands: BandConvention;
  readonly asked: AskedUnits;
  readonly ofSite: ReadonlyMap<Dimension, string>;
  readonly ofRecipe: ReadonlyMap<Dimension, string>;
  readonly reference: FlowReference | undefined;
}

export function shownFor({ site, steps }: Run, asked: AskedUnits = new Map()): Shown {
  const givens = steps[0]?.givens;
  const temperature = givens?.get('chamber.flow_reference.temperature')?.value;
  const pressure = givens?.get('chamber.flow_reference.pressure')?.value;
  return {
    ...shownOf(site, asked),
    ofRecipe: unitsWritten(steps.map((step) => step.givens)),
    reference: temperature === undefined || pressure === undefined ? undefined : { temperature, pressure },
  };
}

/** How numbers are shown that belong to no recipe. */
export function shownOf({ show }: Pick<Site, 'show'>, asked: AskedUnits = new Map()): Shown {
  return {
    coverage: show.coverageFactor,
    bands: show.bands,
    asked,
    ofSite: show.units,
    ofRecipe: new Map(),
    reference: undefined,
  };
}

/** A value with its unit, and its expanded uncertainty where it has one. `unit` fixes the unit, so that two numbers can be compared. */
export function print(shown: Shown, value: number, dimension: Dimension, expanded = 0, unit?: string): string {
  return printMeasure(value, dimension, {
    unit: unit ?? unitFor(shown, value, dimension),
    uncertainty: expanded,
    ...(shown.reference === undefined ? {} : { reference: shown.reference }),
  });
}

/** A given in the unit in which it was written, with or without its uncertainty. */
export function printGiven(shown: Shown, given: Given, value = given.value, withUncertainty = false): string {
  const expanded = withUncertainty ? shown.coverage * given.uncertainty : 0;
  return print(shown, value, given.dimension, expanded, shown.asked.get(given.dimension) ?? given.unit);
}

/** The unit of a number that was not written by anybody. */
export function unitFor({ asked, ofSite, ofRecipe }: Shown, value: number, dimension: Dimension): string {
  const wanted = asked.get(dimension);
  if (wanted !== undefined) return wanted;
  const usual = ofSite.get(dimension) ?? ofRecipe.get(dimension);
  return usual !== undefined && isHandy(value, usual, dimension) ? usual : displayUnit(value, dimension);
}

/** A number in a unit, for a cell of its own. */
export function inUnit({ reference }: Shown, value: number, unit: string, dimension: Dimension): number {
  return toUnit(value, unit, dimension, reference);
}

/** An expanded uncertainty in a unit; a unit with an offset does not shift it. */
export function spreadInUnit(shown: Shown, expanded: number, unit: string, dimension: Dimension): number {
  return inUnit(shown, expanded, unit, dimension) - inUnit(shown, 0, unit, dimension);
}

/** The regime of a Knudsen number by the site's convention. */
export function bandOf({ bands }: Shown, id: string, value: number): string | undefined {
  return id === 'knudsen' ? band(value, bands) : undefined;
}

/** A mean free path of a micrometre is not told in millimetres because the gap is. */
function isHandy(value: number, unit: string, dimension: Dimension): boolean {
  if (dimension === 'temperature' || value === 0) return true;
  const size = Math.abs(toUnit(value, unit, dimension));
  return size >= 0.1 && size < 1e4;
}

/** Setpoints whose units stand for all numbers of their dimension. */
function unitsWritten(steps: readonly ReadonlyMap<string, Given>[]): ReadonlyMap<Dimension, string> {
  const units = new Map<Dimension, string>();
  for (const givens of steps) {
    for (const address of LEADING) note(units, givens.get(address));
    if (units.size === LEADING.length) break;
  }
  return units;
}

const LEADING = ['pressure', 'temperatures.wall'] as const;

function note(units: Map<Dimension, string>, given: Given | undefined): void {
  if (given !== undefined && !units.has(given.dimension)) units.set(given.dimension, given.unit);
}
