import type { Setpoint } from '../documents/setpoint.ts';
import type { Given } from './given.ts';
import { Givens } from './givens.ts';
import type { Setup } from './step.ts';
import { givenFrom, isSetpoint, isWritten, type Scale, type Written } from './written.ts';

/**
 * Setpoints as far as documents have stated them: the chamber's at the bottom, over it `throughout` of the recipe and of
 * its cycles from the outside in, the step's own on top.
 */
export class Layer {
  readonly givens: Givens;
  /** Addresses, and whole parts such as the wafer, that are stated to be unknown. */
  unknown: ReadonlySet<string>;
  /** Addresses, and whole parts, that are stated not to apply. */
  none: ReadonlySet<string>;
  /** Amounts fed in the step, by line: they become flows once the time is known. */
  amounts: ReadonlyMap<string, Written>;
  readonly parts: Parts;

  constructor(below?: Layer) {
    this.givens = new Givens(below?.givens.flattened());
    this.unknown = below?.unknown ?? NOTHING;
    this.none = below?.none ?? NOTHING;
    this.amounts = below?.amounts ?? NO_AMOUNTS;
    this.parts = { ...(below?.parts ?? NO_PARTS) };
  }

  put(address: string, setpoint: Setpoint, scale: Scale): void {
    if (isWritten(setpoint)) this.give(givenFrom(address, setpoint, scale));
    else this.mark(address, setpoint.kind);
  }

  give(given: Given): void {
    this.givens.set(given);
    this.unmark(given.address);
  }

  /** States that an address, or a whole part such as the wafer, is unknown or does not apply. */
  mark(address: string, as: 'unknown' | 'none'): void {
    this.forget(address);
    this[as] = new Set([...this[as], address]);
  }

  /** Takes back that an address or part is unknown or does not apply. */
  unmark(address: string): void {
    if (this.unknown.has(address)) this.unknown = without(this.unknown, address);
    if (this.none.has(address)) this.none = without(this.none, address);
  }

  /** Drops what lower layers say of one address. */
  drop(address: string): void {
    this.givens.delete(address);
    this.unmark(address);
  }

  /** Drops what lower layers say of an address and of all below it. */
  forget(address: string): void {
    const within = `${address}.`;
    for (const stated of [this.givens, this.unknown, this.none]) {
      for (const one of [...stated.keys()]) if (one === address || one.startsWith(within)) this.drop(one);
    }
  }

  /** Puts every value of a map, and of the maps in it, at its key path. Texts are none. */
  putAll(prefix: string, map: object, scale: Scale): void {
    const entries: readonly [string, unknown][] = Object.entries(map);
    for (const [key, node] of entries) {
      if (isSetpoint(node)) this.put(`${prefix}.${key}`, node, scale);
      else if (typeof node === 'object' && node !== null) this.putAll(`${prefix}.${key}`, node, scale);
    }
  }
}

/** What a step is made of as far as its layers have told. */
export interface Parts {
  throttle: Setup['throttle'];
  wafer: Setup['wafer'];
  feature: Setup['feature'];
  /** How gas flows through the chamber, where the recipe says so. */
  flow: Setup['flow'] | undefined;
  /** Lines with a flow, in order of first mention. */
  lines: readonly string[];
  /** Gases of the stated composition. */
  composition: readonly string[];
  generators: readonly string[];
  /** Targets and melts that the innermost layer to name any names. */
  targets: readonly string[];
  melts: readonly string[];
  surface: Setup['surface'];
  reactant: string | undefined;
  ion: string | undefined;
  backside: string | undefined;
}

const NO_PARTS: Parts = {
  throttle: 'holds',
  wafer: 'unknown',
  feature: undefined,
  flow: undefined,
  lines: [],
  composition: [],
  generators: [],
  targets: [],
  melts: [],
  surface: undefined,
  reactant: undefined,
  ion: undefined,
  backside: undefined,
};

const NOTHING: ReadonlySet<string> = new Set();
const NO_AMOUNTS: ReadonlyMap<string, Written> = new Map();

function without(set: ReadonlySet<string>, one: string): ReadonlySet<string> {
  const rest = new Set(set);
  rest.delete(one);
  return rest;
}
