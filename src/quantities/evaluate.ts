import type { Given } from '../steps/given.ts';
import type { Choice, Law, Leaf, Node, Plan, Same } from './plan.ts';
import { inapplicable, isAbsent, type Argument } from './quantity.ts';
import type { Inapplicable, Missing, Reading } from './reading.ts';

/*
 * Numbers are worked out on demand and kept by the slots of the plan. Nothing is made on the way that nobody asked for: a check
 * in bulk works out some thousand numbers for every recipe.
 */

/** Where the numbers of a run are kept, by slot. */
export interface Values {
  readonly plan: Plan;
  readonly givens: ReadonlyMap<string, Given>;
  /** The run that this one comes from, which has every number that the changes do not reach. */
  readonly origin: Values | undefined;
  reaches(node: Node): boolean;
  /** Whether a number was worked out; then it is in `numbers`, or `absent` says why there is none. */
  readonly settled: (boolean | undefined)[];
  readonly numbers: number[];
  readonly absent: (Missing | Inapplicable | undefined)[];
  /** Whether any given that a number is read from is uncertain. */
  readonly uncertain: boolean[];
  /** Of the worst of several: which it was. */
  readonly chosen: number[];
  /** Slopes of a law's value to each of its own inputs, as far as they were worked out. */
  readonly partials: (number[] | undefined)[];
  /** Standard uncertainties that were asked for. */
  readonly deviations: (number | undefined)[];
}

/** The reading of a node. */
export function readingOf(values: Values, node: Node): Reading {
  const absent = settle(values, node);
  if (absent !== undefined) return absent;
  const value = values.numbers[node.slot] ?? NaN;
  const of = chosenSubject(values, node);
  return of === undefined ? { kind: 'known', value } : { kind: 'known', value, of };
}

/** Of the worst of several, which it was. */
function chosenSubject(values: Values, node: Node): string | undefined {
  if (node.kind === 'choice') return node.subjects[values.chosen[node.slot] ?? -1];
  const [input] = node.inputs;
  if (node.kind !== 'same' || input === undefined) return undefined;
  settle(values, input);
  return chosenSubject(values, input);
}

/** Works out a node and whatever it needs; the answer says why there is no number, where there is none. */
export function settle(values: Values, node: Node): Missing | Inapplicable | undefined {
  const { slot } = node;
  if (values.settled[slot] === true) return values.absent[slot];
  const absent =
    values.origin !== undefined && !values.reaches(node) ? share(values, values.origin, node) : work(values, node);
  values.settled[slot] = true;
  if (absent !== undefined) values.absent[slot] = absent;
  return absent;
}

/** The arguments of a law whose inputs are all known; they hold until the law is asked for again. */
export function argumentsOf(values: Values, { args, inputs }: Law): readonly Argument[] {
  let index = 0;
  for (let position = 0; position < args.length; position++) {
    const arg = args[position];
    if (typeof arg !== 'object') {
      args[position] = numberOf(values, inputs[index++]);
      continue;
    }
    for (let i = 0; i < arg.length; i++) arg[i] = numberOf(values, inputs[index++]);
  }
  return args;
}

function share(values: Values, origin: Values, node: Node): Missing | Inapplicable | undefined {
  const absent = settle(origin, node);
  keep(values, node, origin.numbers[node.slot] ?? NaN, origin.uncertain[node.slot] ?? false);
  values.chosen[node.slot] = origin.chosen[node.slot] ?? -1;
  return absent;
}

function work(values: Values, node: Node): Missing | Inapplicable | undefined {
  switch (node.kind) {
    case 'absent':
      return node.reading;
    case 'given':
      return workGiven(values, node);
    case 'constant':
      keep(values, node, node.value, false);
      return undefined;
    case 'law':
      return workLaw(values, node);
    case 'same':
      return workSame(values, node);
    case 'choice':
      return workChoice(values, node);
  }
}

function keep(values: Values, { slot }: Node, value: number, uncertain: boolean): void {
  values.numbers[slot] = value;
  values.uncertain[slot] = uncertain;
}

function workGiven(values: Values, node: Leaf): Missing | undefined {
  const given = values.givens.get(node.address) ?? node.fallback;
  if (given === undefined) return { kind: 'missing', needs: [node.address] };
  keep(values, node, given.value, given.uncertainty > 0);
  return undefined;
}

function workLaw(values: Values, node: Law): Missing | Inapplicable | undefined {
  const absent = absentInput(values, node.inputs);
  if (absent !== undefined) return absent;
  const { quantity } = node;
  const answer = quantity.value(argumentsOf(values, node));
  if (isAbsent(answer)) return named(values, node, answer);
  if (!Number.isFinite(answer)) return inapplicable(`${quantity.id} is undefined at these values`);
  keep(values, node, answer, quantity.nominal !== true && anyUncertain(values, node.inputs));
  return undefined;
}

/** A law that finds something missing does not know by which address; its entry does. */
function named(values: Values, { quantity, reference }: Law, absent: Missing | Inapplicable): Missing | Inapplicable {
  if (absent.kind === 'inapplicable' || absent.needs.length > 0) return absent;
  return { kind: 'missing', needs: quantity.needs?.(reference, values.plan.scope) ?? [] };
}

function workSame(values: Values, node: Same): Missing | Inapplicable | undefined {
  const [input] = node.inputs;
  if (input === undefined) return inapplicable('it has no input');
  const absent = settle(values, input);
  if (absent !== undefined) return absent;
  keep(values, node, numberOf(values, input), node.quantity.nominal !== true && anyUncertain(values, node.inputs));
  return undefined;
}

function workChoice(values: Values, node: Choice): Missing | Inapplicable | undefined {
  const largest = (node.quantity.worst ?? 'largest') === 'largest';
  let chosen = -1;
  let worst = NaN;
  const absences: (Missing | Inapplicable)[] = [];
  for (const [index, input] of node.inputs.entries()) {
    const absent = settle(values, input);
    if (absent !== undefined) {
      absences.push(absent);
      continue;
    }
    const value = numberOf(values, input);
    if (chosen !== -1 && (largest ? value <= worst : value >= worst)) continue;
    chosen = index;
    worst = value;
  }
  // A candidate that is missing could be the worst; one that does not apply could not.
  const needs = needsOf(absences);
  if (needs.length > 0) return { kind: 'missing', needs };
  const input = node.inputs[chosen];
  if (input === undefined) return absences[0] ?? inapplicable('none of them applies');
  values.chosen[node.slot] = chosen;
  keep(values, node, worst, values.uncertain[input.slot] ?? false);
  return undefined;
}

/** The first input that does not apply, else all that is missing, else nothing. */
function absentInput(values: Values, inputs: readonly Node[]): Missing | Inapplicable | undefined {
  let absences: (Missing | Inapplicable)[] | undefined;
  for (const input of inputs) {
    const absent = settle(values, input);
    if (absent === undefined) continue;
    absences ??= [];
    absences.push(absent);
  }
  if (absences === undefined) return undefined;
  return absences.find(({ kind }) => kind === 'inapplicable') ?? { kind: 'missing', needs: needsOf(absences) };
}

/** All that is missing, each once. */
function needsOf(absences: readonly (Missing | Inapplicable)[]): readonly string[] {
  const needs = absences.flatMap((absent) => (absent.kind === 'missing' ? absent.needs : []));
  return [...new Set(needs)].sort();
}

function anyUncertain(values: Values, inputs: readonly Node[]): boolean {
  for (const { slot } of inputs) if (values.uncertain[slot] === true) return true;
  return false;
}

export function numberOf(values: Values, node: Node | undefined): number {
  return node === undefined ? NaN : (values.numbers[node.slot] ?? NaN);
}
