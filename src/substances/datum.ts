import type { Fixed } from '../documents/setpoint.ts';
import type { Place } from '../shelf/place.ts';
import type { Dimension } from '../units/dimensions.ts';
import { standardUncertainty } from '../units/standard-uncertainty.ts';
import type { Block } from './blocks.ts';

/** A value of a substance. A step takes it as it takes its own givens. */
export interface Datum {
  readonly address: string;
  /** In the SI unit of the dimension. */
  readonly value: number;
  /** Standard uncertainty, absolute. */
  readonly uncertainty: number;
  readonly dimension: Dimension;
  readonly unit: string;
  readonly origin: { readonly place: Place } | { readonly default: string; readonly because: string };
}

/** The value at a key path within a block: `collision.diameter`, `heat_capacity.0.is`. */
export function datumOf(address: string, keys: readonly string[], block: Block<object>): Datum | undefined {
  let node: unknown = block.content;
  for (const key of keys) node = below(node, key);
  const stated = isMap(node) && 'is' in node ? node.is : node;
  if (isFixed(stated)) return fixedDatum(address, stated);
  if (typeof stated !== 'number') return undefined;
  return { address, value: stated, uncertainty: 0, dimension: 'number', unit: '', origin: { place: block.place } };
}

function fixedDatum(address: string, { measure, place }: Fixed): Datum {
  const { value, dimension, unit, tolerance } = measure;
  return { address, value, uncertainty: standardUncertainty(value, tolerance), dimension, unit, origin: { place } };
}

/** What stands at a key; the rows of a table stand under `at`, which an address leaves out. */
function below(node: unknown, key: string): unknown {
  if (Array.isArray(node)) return node[Number(key)];
  if (!isMap(node)) return undefined;
  if (Object.hasOwn(node, key)) return node[key];
  return Array.isArray(node.at) ? below(node.at, key) : undefined;
}

function isMap(node: unknown): node is Readonly<Record<string, unknown>> {
  return typeof node === 'object' && node !== null;
}

function isFixed(node: unknown): node is Fixed {
  return isMap(node) && node.kind === 'fixed';
}
