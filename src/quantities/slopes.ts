import type { Given } from '../steps/given.ts';
import { evaluate, lawAt, type Values } from './evaluate.ts';
import type { Choice, Law, Node } from './plan.ts';
import type { Argument } from './quantity.ts';
import type { Slope } from './reading.ts';

/*
 * Slopes are found as one would by hand: each law is called again with each of its own inputs moved a little, and the
 * slopes are chained from the number back to the givens. Since inputs have lower slots than what is read from them, one
 * walk down the slots does it.
 */

/** Standard uncertainty of a number: root of the sum of squares of what each given contributes (GUM 5.1.2). */
export function standardUncertainty(values: Values, node: Node): number {
  if (evaluate(values, node).kind !== 'known' || !values.uncertain[node.slot]) return 0;
  let sum = 0;
  chain(values, node, true, (given, slope) => {
    sum += (slope * given.uncertainty) ** 2;
  });
  return Math.sqrt(sum);
}

/** Slope of a number to every given it is read from, strongest contribution first, then by address. */
export function slopesOf(values: Values, node: Node): readonly Slope[] {
  if (evaluate(values, node).kind !== 'known') return [];
  const slopes: Slope[] = [];
  chain(values, node, false, (given, slope, address) => {
    slopes.push({ address, slope, contribution: Math.abs(slope) * given.uncertainty });
  });
  return slopes.sort((a, b) => b.contribution - a.contribution || (a.address < b.address ? -1 : 1));
}

/** Slopes from the number to the nodes on the way, by slot; kept between walks, and left all zero by each. */
const slopeTo: number[] = [];

/** Walks from a number down to the givens with the slope of the number to each node on the way. */
function chain(
  values: Values,
  target: Node,
  onlyUncertain: boolean,
  visit: (given: Given, slope: number, address: string) => void,
): void {
  const { nodes } = values.plan;
  while (slopeTo.length < nodes.length) slopeTo.push(0);
  slopeTo[target.slot] = 1;
  for (let slot = target.slot; slot >= 0; slot--) {
    const slope = slopeTo[slot] ?? 0;
    const node = nodes[slot];
    if (slope === 0 || node === undefined) continue;
    slopeTo[slot] = 0;
    if (node.kind === 'given') {
      const given = values.givens.get(node.address) ?? node.fallback;
      if (given !== undefined) visit(given, slope, node.address);
    } else if (node.kind === 'same') {
      for (const { slot: input } of node.inputs) slopeTo[input] = (slopeTo[input] ?? 0) + slope;
    } else {
      pass(values, node, slope, onlyUncertain);
    }
  }
}

/** Hands a slope on from a node to its inputs. */
function pass(values: Values, node: Node, slope: number, onlyUncertain: boolean): void {
  const partials = partialsOf(values, node, onlyUncertain);
  for (let index = 0; index < node.inputs.length; index++) {
    const input = node.inputs[index];
    if (input === undefined || (onlyUncertain && !values.uncertain[input.slot])) continue;
    slopeTo[input.slot] = (slopeTo[input.slot] ?? 0) + slope * (partials[index] ?? 0);
  }
}

/** Slopes of a node's value to its own inputs, worked out as far as they are wanted and kept. NaN marks those not wanted so far. */
function partialsOf(values: Values, node: Node, onlyUncertain: boolean): readonly number[] {
  if (values.origin !== undefined && !values.reaches(node)) return partialsOf(values.origin, node, onlyUncertain);
  if (node.kind === 'choice') return chosenSlopes(values, node);
  if (node.kind !== 'law') return [];
  let partials = values.partials[node.slot];
  if (partials === undefined) {
    partials = node.inputs.map(() => NaN);
    values.partials[node.slot] = partials;
  }
  const args = lawAt(values, node);
  let index = 0;
  for (const [position, arg] of args.entries()) {
    const count = typeof arg === 'number' ? 1 : arg.length;
    for (let i = 0; i < count; i++, index++) {
      const input = node.inputs[index];
      const wanted = input !== undefined && (!onlyUncertain || values.uncertain[input.slot]);
      if (wanted && Number.isNaN(partials[index])) partials[index] = partial(values, node, args, position, i);
    }
  }
  return partials;
}

/** The worst of several moves with the one that was chosen. */
function chosenSlopes(values: Values, node: Choice): readonly number[] {
  const reading = evaluate(values, node);
  return node.subjects.map((subject) => (reading.kind === 'known' && subject === reading.of ? 1 : 0));
}

const RELATIVE_MOVE = 1e-7;
const MOVE_FROM_ZERO = 1e-9;
/** A law whose value changes by this many times the relative change of an input may stand at a jump. */
const STEEP = 30;

/**
 * Slope of a law to one of its arguments: how much its value changes over a small move upward. Where it has no value above, or
 * stands at a jump (a table goes on to its next row), the move downward counts, and of two the flatter: a jump is no slope.
 */
function partial(values: Values, node: Law, args: readonly Argument[], position: number, index: number): number {
  const centre = evaluate(values, node);
  if (centre.kind !== 'known') return 0;
  const at = valueAt(args, position, index);
  const move = Math.abs(at) * RELATIVE_MOVE || MOVE_FROM_ZERO;
  const up = (moved(node, args, position, index, at + move) - centre.value) / move;
  if (Math.abs(up * at) <= STEEP * Math.abs(centre.value)) return up;
  const down = (centre.value - moved(node, args, position, index, at - move)) / move;
  if (!Number.isFinite(up)) return Number.isFinite(down) ? down : 0;
  return Math.abs(down) < Math.abs(up) ? down : up;
}

function valueAt(args: readonly Argument[], position: number, index: number): number {
  const arg = args[position];
  return (typeof arg === 'object' ? arg[index] : arg) ?? NaN;
}

/** The value of a law with one number among its arguments replaced; NaN where it has none. */
function moved({ quantity }: Law, args: readonly Argument[], position: number, index: number, value: number): number {
  const arg = args[position];
  const replaced = typeof arg === 'object' ? arg.with(index, value) : value;
  const answer = quantity.value(args.with(position, replaced));
  return typeof answer === 'number' ? answer : NaN;
}
