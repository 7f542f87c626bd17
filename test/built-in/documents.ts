import { readFileSync } from 'node:fs';
import { parse } from 'yaml';
import { readMeasure } from '../../src/units/read.ts';
import { isUnitFault } from '../../src/units/unit-fault.ts';
import type { Dimension } from '../../src/units/dimensions.ts';

export type Block = Readonly<Record<string, unknown>>;

/** The substances of one built-in document, by name, as they stand in the file. */
export function substances(file: 'gases' | 'atoms' | 'films'): ReadonlyMap<string, Block> {
  const text = readFileSync(new URL(`../../src/built-in/${file}.yaml`, import.meta.url), 'utf8');
  return new Map(
    Object.entries(block(block(parse(text), file)[file], file)).map(([name, it]) => [name, block(it, name)]),
  );
}

/** One substance that must be there. */
export function substance(all: ReadonlyMap<string, Block>, name: string): Block {
  const found = all.get(name);
  if (found === undefined) throw new Error(`${name} is not in the document`);
  return found;
}

/** The block under a key; an error where there is none. */
export function block(value: unknown, what: string): Block {
  if (!isBlock(value)) throw new Error(`${what} is no block`);
  return value;
}

export function isBlock(value: unknown): value is Block {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Texts of a list; none where the key is absent. */
export function texts(value: unknown): readonly string[] {
  return Array.isArray(value) ? value.map(String) : [];
}

/** The value of a physical text in SI. */
export function si(value: unknown, dimension: Dimension): number {
  if (typeof value !== 'string' && typeof value !== 'number') throw new Error(`${String(value)} is no value`);
  const measure = readMeasure(value, [dimension], { tolerance: true });
  if (isUnitFault(measure)) throw new Error(`${String(value)}: ${measure.found}, ${measure.right}`);
  return measure.value;
}

/** The half-width written beside a value, as a fraction of it. */
export function halfWidth(value: unknown, dimension: Dimension): number | undefined {
  const measure = readMeasure(String(value), [dimension], { tolerance: true });
  return isUnitFault(measure) ? undefined : measure.tolerance?.value;
}

/** Molar heat capacities [J/(mol K)] by temperature [K]. */
export function heatCapacities(gas: Block): ReadonlyMap<number, number> {
  if (gas.heat_capacity === undefined) return new Map();
  const { at } = block(gas.heat_capacity, 'heat_capacity');
  if (!Array.isArray(at)) throw new Error('heat_capacity.at is no list');
  return new Map(
    at.map((point: unknown) => {
      const { temperature, is } = block(point, 'point');
      return [si(temperature, 'temperature'), si(is, 'heat-capacity')];
    }),
  );
}
