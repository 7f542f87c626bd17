import type { Given } from '../steps/given.ts';
import type { Choice, Law, Leaf, Node, Plan, Same } from './plan.ts';
import { inapplicable, isAbsent, type Argument } from './quantity.ts';
import type { Inapplicable, Known, Missing, Reading } from './reading.ts';

/** Where readings are kept, by the slots of a plan. */
export interface Values {
  readonly plan: Plan;
  /** The run that this one comes from, which has every number that the changes do not reach. */
  readonly origin: Values | undefined;
  reaches(node: Node): boolean;
  readonly givens: ReadonlyMap<string, Given>;
  readonly readings: (Reading | undefined)[];
  /** Whether any given that a number is read from is uncertain. */
  readonly uncertain: boolean[];
  /** Slopes of a law's value to each of its own inputs, once they were worked out. */
  readonly partials: (number[] | undefined)[];
}

/** The reading of a node; whatever it needs is read first. */
export function evaluate(values: Values, node: Node): Reading {
  const kept = values.readings[node.slot];
  if (kept !== undefined) return kept;
  const { origin } = values;
  const shared = origin !== undefined && !values.reaches(node);
  const reading = shared ? evaluate(origin, node) : read(values, node);
  values.readings[node.slot] = reading;
  if (shared) values.uncertain[node.slot] = origin.uncertain[node.slot] ?? false;
  return reading;
}

/** The arguments of a law whose inputs are all known. */
export function lawAt(values: Values, node: Law): Argument[] {
  const args: Argument[] = [];
  let index = 0;
  for (const count of node.shape) {
    if (count === 'one') {
      args.push(valueOf(values, node.inputs[index++]));
      continue;
    }
    const list: number[] = [];
    for (let i = 0; i < count; i++) list.push(valueOf(values, node.inputs[index++]));
    args.push(list);
  }
  return args;
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

function valueOf(values: Values, node: Node | undefined): number {
  const reading = node === undefined ? undefined : values.readings[node.slot];
  return reading?.kind === 'known' ? reading.value : NaN;
}

const NO_REMARKS: readonly string[] = [];

function known(value: number): Known {
  return { kind: 'known', value, remarks: NO_REMARKS };
}
