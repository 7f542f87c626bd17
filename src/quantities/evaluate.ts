import type { Given } from '../steps/given.ts';
import type { Choice, Law, Leaf, Node, Plan, Same } from './plan.ts';
import { inapplicable, isAbsent, type Argument } from './quantity.ts';
import type { Inapplicable, Known, Missing, Reading } from './reading.ts';

/** Where readings are kept, by the slots of a plan. */
export interface Values {
  readonly plan: Plan;
  readonly givens: ReadonlyMap<string, Given>;
  readonly readings: (Reading | undefined)[];
  /** Whether any given that a number is read from is uncertain. */
  readonly uncertain: boolean[];
  /** Slopes of a law's value to each of its own inputs, once they were worked out. */
  readonly partials: (readonly number[] | undefined)[];
}

/** The reading of a node; whatever it needs is read first. */
export function evaluate(values: Values, node: Node): Reading {
  const kept = values.readings[node.slot];
  if (kept !== undefined) return kept;
  const reading = read(values, node);
  values.readings[node.slot] = reading;
  return reading;
}

/** The arguments of a law whose inputs are all known. */
export function lawAt(values: Values, node: Law): readonly Argument[] {
  return shaped(node, (index) => valueOf(values, node.inputs[index]));
}

/** The value of a law with one of its inputs moved. */
export function lawMoved(values: Values, node: Law, moved: number, value: number): number {
  const answer = node.quantity.value(
    shaped(node, (index) => (index === moved ? value : valueOf(values, node.inputs[index]))),
  );
  return typeof answer === 'number' ? answer : NaN;
}

function read(values: Values, node: Node): Reading {
  switch (node.kind) {
    case 'absent':
      return node.reading;
    case 'given':
      return readGiven(values, node);
    case 'constant':
      return known(node.value);
    case 'law':
      return readLaw(values, node);
    case 'same':
      return readSame(values, node);
    case 'choice':
      return readChoice(values, node);
  }
}

function readGiven(values: Values, node: Leaf): Reading {
  const given = values.givens.get(node.address) ?? node.fallback;
  if (given === undefined) return { kind: 'missing', needs: [node.address] };
  values.uncertain[node.slot] = given.uncertainty > 0;
  return known(given.value);
}

function readLaw(values: Values, node: Law): Reading {
  const absent = absentInput(values, node.inputs);
  if (absent !== undefined) return absent;
  values.uncertain[node.slot] = !node.quantity.nominal && node.inputs.some((input) => values.uncertain[input.slot]);
  const answer = node.quantity.value(lawAt(values, node));
  if (isAbsent(answer)) return named(values, node, answer);
  return Number.isFinite(answer) ? known(answer) : inapplicable(`${node.quantity.id} is undefined at these values`);
}

/** A law that finds something missing does not know by which address; its entry does. */
function named(values: Values, { quantity, reference }: Law, absent: Missing | Inapplicable): Missing | Inapplicable {
  if (absent.kind === 'inapplicable' || absent.needs.length > 0) return absent;
  return { kind: 'missing', needs: quantity.needs?.(reference, values.plan.scope) ?? [] };
}

function readSame(values: Values, node: Same): Reading {
  const [input] = node.inputs;
  if (input === undefined) return inapplicable('it has no input');
  const reading = evaluate(values, input);
  values.uncertain[node.slot] = !node.quantity.nominal && (values.uncertain[input.slot] ?? false);
  return reading;
}

function readChoice(values: Values, node: Choice): Reading {
  const readings = node.inputs.map((input) => evaluate(values, input));
  const absent = gravestAbsence(readings);
  const chosen = worstOf(readings, node.quantity.worst ?? 'largest');
  if (chosen === undefined) return absent ?? inapplicable('none of them applies');
  // One candidate that is missing could be the worst.
  if (absent?.kind === 'missing') return absent;
  const input = node.inputs[chosen.index];
  if (input !== undefined) values.uncertain[node.slot] = values.uncertain[input.slot] ?? false;
  return { ...chosen.reading, of: node.subjects[chosen.index] ?? '' };
}

/** Index and reading of the worst known candidate. */
export function worstOf(
  readings: readonly Reading[],
  worst: 'largest' | 'smallest',
): { index: number; reading: Known } | undefined {
  let chosen: { index: number; reading: Known } | undefined;
  for (const [index, reading] of readings.entries()) {
    if (reading.kind !== 'known') continue;
    const beats = worst === 'largest' ? reading.value > (chosen?.reading.value ?? -Infinity) : reading.value < (chosen?.reading.value ?? Infinity);
    if (beats) chosen = { index, reading };
  }
  return chosen;
}

/** The first input that does not apply, else all that is missing, else nothing. */
function absentInput(values: Values, inputs: readonly Node[]): Missing | Inapplicable | undefined {
  let needs: Set<string> | undefined;
  let notApplying: Inapplicable | undefined;
  for (const input of inputs) {
    const reading = evaluate(values, input);
    if (reading.kind === 'inapplicable') notApplying ??= reading;
    if (reading.kind === 'missing') {
      needs ??= new Set();
      for (const need of reading.needs) needs.add(need);
    }
  }
  return notApplying ?? (needs === undefined ? undefined : { kind: 'missing', needs: [...needs].sort() });
}

function gravestAbsence(readings: readonly Reading[]): Missing | Inapplicable | undefined {
  const needs = new Set<string>();
  for (const reading of readings) if (reading.kind === 'missing') for (const need of reading.needs) needs.add(need);
  if (needs.size > 0) return { kind: 'missing', needs: [...needs].sort() };
  return readings.find((reading) => reading.kind === 'inapplicable');
}

function shaped(node: Law, at: (index: number) => number): readonly Argument[] {
  const args: Argument[] = [];
  let index = 0;
  for (const count of node.shape) {
    if (count === 'one') {
      args.push(at(index++));
      continue;
    }
    const list: number[] = [];
    for (let i = 0; i < count; i++) list.push(at(index++));
    args.push(list);
  }
  return args;
}

function valueOf(values: Values, node: Node | undefined): number {
  const reading = node === undefined ? undefined : values.readings[node.slot];
  return reading?.kind === 'known' ? reading.value : NaN;
}

const NO_REMARKS: readonly string[] = [];

function known(value: number): Known {
  return { kind: 'known', value, remarks: NO_REMARKS };
}
