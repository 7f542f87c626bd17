import type { Given } from './given.ts';

/**
 * Givens by address over those of the layer below, which many steps share: what a layer states wins, and what it drops
 * is gone, without a copy of all that stays.
 */
export class Givens implements ReadonlyMap<string, Given> {
  readonly #own = new Map<string, Given>();
  readonly #below: ReadonlyMap<string, Given>;
  #dropped: Set<string> | undefined;
  #flat: ReadonlyMap<string, Given> | undefined;

  constructor(below: ReadonlyMap<string, Given> = NONE) {
    this.#below = below;
  }

  get(address: string): Given | undefined {
    return this.#own.get(address) ?? (this.#dropped?.has(address) ? undefined : this.#below.get(address));
  }

  has(address: string): boolean {
    return this.get(address) !== undefined;
  }

  set(given: Given): void {
    this.#flat = undefined;
    this.#own.set(given.address, given);
  }

  delete(address: string): void {
    this.#flat = undefined;
    this.#own.delete(address);
    if (!this.#below.has(address)) return;
    this.#dropped ??= new Set();
    this.#dropped.add(address);
  }

  get size(): number {
    return this.flattened().size;
  }

  /** Addresses: those of the layer below in their order, whoever states them, then the layer's own. */
  *keys(): MapIterator<string> {
    for (const address of this.#below.keys()) {
      if (this.#own.has(address) || !this.#dropped?.has(address)) yield address;
    }
    for (const address of this.#own.keys()) if (!this.#below.has(address)) yield address;
  }

  *entries(): MapIterator<[string, Given]> {
    for (const address of this.keys()) {
      const given = this.get(address);
      if (given !== undefined) yield [address, given];
    }
  }

  *values(): MapIterator<Given> {
    for (const [, given] of this.entries()) yield given;
  }

  [Symbol.iterator](): MapIterator<[string, Given]> {
    return this.entries();
  }

  forEach(visit: (given: Given, address: string, all: ReadonlyMap<string, Given>) => void): void {
    for (const [address, given] of this.entries()) visit(given, address, this);
  }

  /** Those that change over the step or are set as a range. */
  spanned(): readonly Given[] {
    const spanned: Given[] = spannedOf(this.#below).filter(
      ({ address }) => this.get(address)?.span !== undefined && !this.#own.has(address),
    );
    for (const given of this.#own.values()) if (given.span !== undefined) spanned.push(given);
    return spanned;
  }

  /** Which addresses there are, as one text: givens of one shape have the same. */
  shape(): string {
    let shape = shapeOf(this.#below);
    for (const address of this.#own.keys()) shape += `\n${address}`;
    for (const address of this.#dropped ?? []) shape += `\n-${address}`;
    return shape;
  }

  /** The same in one map, for others to stand on: made once, since many do. */
  flattened(): ReadonlyMap<string, Given> {
    this.#flat ??= this.#merged();
    return this.#flat;
  }

  #merged(): ReadonlyMap<string, Given> {
    const merged = new Map(this.#below);
    for (const address of this.#dropped ?? []) merged.delete(address);
    for (const [address, given] of this.#own) merged.set(address, given);
    return merged;
  }
}

const NONE: ReadonlyMap<string, Given> = new Map();

const SPANNED = new WeakMap<ReadonlyMap<string, Given>, readonly Given[]>();

/** Givens that change over a step or are set as a range. */
export function spannedOf(givens: ReadonlyMap<string, Given>): readonly Given[] {
  if (givens instanceof Givens) return givens.spanned();
  let spanned = SPANNED.get(givens);
  if (spanned === undefined) {
    spanned = [...givens.values()].filter(({ span }) => span !== undefined);
    SPANNED.set(givens, spanned);
  }
  return spanned;
}

/** Layers that many steps stand on are asked for their shape again and again. */
const SHAPES = new WeakMap<ReadonlyMap<string, Given>, string>();

export function shapeOf(givens: ReadonlyMap<string, Given>): string {
  if (givens instanceof Givens) return givens.shape();
  let shape = SHAPES.get(givens);
  if (shape === undefined) {
    shape = [...givens.keys()].join('\n');
    SHAPES.set(givens, shape);
  }
  return shape;
}
