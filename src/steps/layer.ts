import type { Setpoint } from '../documents/setpoint.ts';
import type { Given } from './given.ts';
import type { Setup } from './step.ts';
import { givenFrom, isSetpoint, isWritten, type Scale, type Written } from './written.ts';

/**
 * Setpoints as far as documents have stated them: the chamber's at the bottom, over it `throughout` of the recipe and of
 * its cycles from the outside in, the step's own on top. Each layer starts as a copy of the one below.
 */
export class Layer {
  readonly givens: Map<string, Given>;
  readonly unknown: Set<string>;
  readonly none: Set<string>;
  /** Amounts fed in the step, by line: they become flows once the time is known. */
  readonly amounts: Map<string, Written>;
  parts: Parts;

  constructor(below?: Layer) {
    this.givens = new Map(below?.givens);
    this.unknown = new Set(below?.unknown);
    this.none = new Set(below?.none);
    this.amounts = new Map(below?.amounts);
    this.parts = below?.parts ?? NO_PARTS;
  }

  put(address: string, setpoint: Setpoint, scale: Scale): void {
    if (isWritten(setpoint)) this.give(givenFrom(address, setpoint, scale));
    else this.mark(address, setpoint.kind);
  }

  give(given: Given): void {
    const { address } = given;
    this.givens.set(address, given);
    if (this.unknown.size > 0) this.unknown.delete(address);
    if (this.none.size > 0) this.none.delete(address);
  }

  /** States that an address, or a whole part such as the wafer, is unknown or does not apply. */
  mark(address: string, as: 'unknown' | 'none'): void {
    this.forget(address);
    (as === 'unknown' ? this.unknown : this.none).add(address);
  }

  /** Drops what lower layers say of one address. */
  drop(address: string): void {
    this.givens.delete(address);
    this.unknown.delete(address);
    this.none.delete(address);
  }

  /** Takes back that a part is unknown or does not apply. */
  unmark(address: string): void {
    this.unknown.delete(address);
    this.none.delete(address);
  }

  /** Drops what lower layers say of an address and of all below it. */
  forget(address: string): void {
    const within = `${address}.`;
    for (const stated of [this.givens, this.unknown, this.none]) {
      for (const one of stated.keys()) if (one === address || one.startsWith(within)) stated.delete(one);
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

  with(parts: Partial<Parts>): void {
    this.parts = { ...this.parts, ...parts };
  }
}

/** What a step is made of as far as its layers have told. */
export interface Parts extends Pick<Setup, 'throttle' | 'wafer'> {
  /** How gas flows through the chamber, where the step says so. */
  readonly flow: Setup['flow'] | undefined;
  /** Lines with a flow, in order of first mention. */
  readonly lines: readonly string[];
  /** Gases of the stated composition. */
  readonly composition: readonly string[];
  readonly generators: readonly string[];
  /** Targets and melts that the innermost layer to name any names. */
  readonly targets: readonly string[];
  readonly melts: readonly string[];
  readonly surface: Setup['surface'];
  readonly reactant: string | undefined;
  readonly ion: string | undefined;
  readonly backside: string | undefined;
  readonly feature: Setup['feature'];
}

const NO_PARTS: Parts = {
  throttle: 'holds',
  wafer: 'unknown',
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
  feature: undefined,
};
