import type { Given } from '../steps/given.ts';
import { assumedGiven } from './assumed.ts';
import { quantityNamed } from './catalogue.ts';
import { inapplicable, missing, quantity, type Ingredient, type Quantity } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import { referenceName, type Reference } from './reference.ts';
import type { Scope } from './scope.ts';

/** How one number of a scope comes about. Inputs have lower slots than what is read from them. */
export type Node = Leaf | Constant | Law | Same | Choice | Absent;

interface Common {
  readonly slot: number;
  readonly name: string;
  readonly inputs: readonly Node[];
}

/** A given: the step's, a substance's, or a default of the program. */
export interface Leaf extends Common {
  readonly kind: 'given';
  readonly address: string;
  /** What stands in where the step has none: data of a substance, a default. */
  readonly fallback: Given | undefined;
}

/** A count that the scope fixes: atoms of an element in a formula. */
export interface Constant extends Common {
  readonly kind: 'constant';
  readonly value: number;
}

/** A law of the catalogue with its arguments. */
export interface Law extends Common {
  readonly kind: 'law';
  readonly quantity: Quantity;
  readonly reference: Reference;
  /** Room for the law's arguments, filled anew for each step: a plain number, or a list as long as it will be. */
  readonly args: (number | number[])[];
}

/** A number that in this scope simply is another one, or a given. */
export interface Same extends Common {
  readonly kind: 'same';
  readonly quantity: Quantity;
  readonly reference: Reference;
}

/** The worst of several subjects. */
export interface Choice extends Common {
  readonly kind: 'choice';
  readonly quantity: Quantity;
  readonly reference: Reference;
  readonly subjects: readonly string[];
}

export interface Absent extends Common {
  readonly kind: 'absent';
  readonly reference?: Reference;
  readonly quantity?: Quantity;
  readonly reading: Missing | Inapplicable;
}

/** The numbers of one scope and what each is read from; grows as numbers are asked for. */
export class Plan {
  readonly scope: Scope;
  readonly nodes: Node[] = [];
  readonly #byName = new Map<string, Node>();
  /** The same, for those who ask with one reference again and again. */
  readonly #byReference = new WeakMap<Reference, Node>();
  readonly #each = new WeakMap<Reference, readonly Reference[]>();
  readonly #ratios = new WeakMap<Reference, { readonly over: Reference; readonly node: Node }>();
  readonly #open = new Set<string>();

  constructor(scope: Scope) {
    this.scope = scope;
  }

  /** The node of a number, or of one number over another. */
  node(reference: Reference, over?: Reference): Node {
    return over === undefined ? this.number(reference) : this.ratio(reference, over);
  }

  /** The node of a number. */
  number(reference: Reference): Node {
    let node = this.#byReference.get(reference);
    if (node === undefined) {
      node = this.#named(reference, referenceName(reference));
      this.#byReference.set(reference, node);
    }
    return node;
  }

  #named(reference: Reference, name: string): Node {
    const known = this.#byName.get(name);
    if (known !== undefined) return known;
    if (this.#open.has(name)) throw new Error(`${name} is read from itself`);
    this.#open.add(name);
    const node = this.#build(reference, name);
    this.#open.delete(name);
    this.#byName.set(name, node);
    return node;
  }

  /** The numbers that one stands for: of the worst of several, or of a role that several atoms fill, each by itself. */
  each(reference: Reference): readonly Reference[] {
    let all = this.#each.get(reference);
    if (all === undefined) {
      const quantity = quantityNamed(reference.id);
      const subjects = quantity === undefined ? undefined : this.#several(quantity, reference);
      all = subjects?.map((of) => ({ ...reference, of })) ?? [reference];
      this.#each.set(reference, all);
    }
    return all;
  }

  /** The node of one number over another. */
  ratio(reference: Reference, over: Reference): Node {
    const kept = this.#ratios.get(reference);
    if (kept?.over === over) return kept.node;
    const name = `${referenceName(reference)} over ${referenceName(over)}`;
    const node = this.#byName.get(name) ?? this.#newRatio(reference, over, name);
    this.#ratios.set(reference, { over, node });
    return node;
  }

  #newRatio(reference: Reference, over: Reference, name: string): Node {
    const inputs = [this.number(reference), this.number(over)];
    const node = this.#add({ kind: 'law', name, inputs, quantity: RATIO, reference, args: [NaN, NaN] });
    this.#byName.set(name, node);
    return node;
  }

  /** The node of a given. Addresses and names of numbers are told apart by a leading `=`. */
  given(address: string): Node {
    const key = `=${address}`;
    const known = this.#byName.get(key);
    if (known !== undefined) return known;
    const node = this.#leaf(address);
    this.#byName.set(key, node);
    return node;
  }

  #leaf(address: string): Node {
    const { scope } = this;
    const fallback = scope.isUnknown(address) ? undefined : (scope.library.datum(address) ?? assumedGiven(address));
    if (fallback === undefined && !scope.has(address)) {
      return this.#add({ kind: 'absent', name: address, inputs: [], reading: missing(address) });
    }
    return this.#add({ kind: 'given', name: address, inputs: [], address, fallback });
  }

  #build(reference: Reference, name: string): Node {
    const quantity = quantityNamed(reference.id);
    if (quantity === undefined) throw new Error(`no number is named ${reference.id}`);
    const subjects = this.#several(quantity, reference);
    if (subjects !== undefined) return this.#choice(quantity, reference, name, subjects);
    const recipe = quantity.from(reference, this.scope);
    if (isAbsence(recipe)) {
      return this.#add({ kind: 'absent', name, inputs: [], reading: recipe, quantity, reference });
    }
    if (isIngredient(recipe)) {
      return this.#add({ kind: 'same', name, inputs: [this.#ingredient(recipe)], quantity, reference });
    }
    const inputs = recipe.flat().map((ingredient) => this.#ingredient(ingredient));
    const args = recipe.map((part) => (isList(part) ? part.map(() => NaN) : NaN));
    return this.#add({ kind: 'law', name, inputs, quantity, reference, args });
  }

  /** The subjects that a reference stands for where it stands for several: `worst`, or a role of an alloy. */
  #several(quantity: Quantity, { of }: Reference): readonly string[] | undefined {
    if (of === 'worst') return quantity.subjects?.(this.scope) ?? [];
    if (of !== 'target' && of !== 'melt') return undefined;
    const subjects = this.scope.emittedSubjects(of);
    return subjects.length > 1 ? subjects : undefined;
  }

  #choice(quantity: Quantity, reference: Reference, name: string, subjects: readonly string[]): Node {
    if (subjects.length === 0) {
      const reading = inapplicable('there is nothing to choose the worst of');
      return this.#add({ kind: 'absent', name, inputs: [], reading, quantity, reference });
    }
    const inputs = subjects.map((of) => this.number({ ...reference, of }));
    return this.#add({ kind: 'choice', name, inputs, quantity, reference, subjects });
  }

  #ingredient(ingredient: Ingredient): Node {
    if (typeof ingredient === 'number') return this.#add({ kind: 'constant', name: '', inputs: [], value: ingredient });
    return typeof ingredient === 'string' ? this.given(ingredient) : this.number(ingredient);
  }

  #add(node: WithoutSlot<Node>): Node {
    const placed = { ...node, slot: this.nodes.length };
    this.nodes.push(placed);
    return placed;
  }
}

const RATIO = quantity<[dividend: number, divisor: number]>({
  id: 'ratio',
  symbol: 'a/b',
  dimension: 'number',
  statement: 'One number over another.',
  source: 'definition',
  from: () => missing(),
  value: (dividend, divisor) => dividend / divisor,
});

type WithoutSlot<T> = T extends Node ? Omit<T, 'slot'> : never;

type Drawn = ReturnType<Quantity['from']>;

function isAbsence(drawn: Drawn): drawn is Missing | Inapplicable {
  return typeof drawn === 'object' && 'kind' in drawn;
}

function isIngredient(drawn: Exclude<Drawn, Missing | Inapplicable>): drawn is Ingredient {
  return !Array.isArray(drawn);
}

function isList(part: Ingredient | readonly Ingredient[]): part is readonly Ingredient[] {
  return Array.isArray(part);
}
