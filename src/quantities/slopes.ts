import type { Given } from '../steps/given.ts';
import { argumentsOf, numberOf, settle, type Values } from './evaluate.ts';
import type { Law, Node } from './plan.ts';
import type { Slope } from './reading.ts';

/*
 * Slopes are found as one would by hand: each law is called again with each of its own inputs moved a little, and the
 * slopes are chained from the number back to the givens. Since inputs have lower slots than what is read from them, one
 * walk down the slots does it.
 */

/** Standard uncertainty of a number: root of the sum of squares of what each given contributes (GUM 5.1.2). */
export function standardUncertainty(values: Values, node: Node): number {
  if (settle(values, node) !== undefined || values.uncertain[node.slot] !== true) return 0;
  const kept = values.deviations[node.slot];
  if (kept !== undefined) return kept;
  const { origin } = values;
  const shared = origin !== undefined && !values.reaches(node);
  const deviation = shared ? standardUncertainty(origin, node) : combined(values, node);
  values.deviations[node.slot] = deviation;
  return deviation;
}

function combined(values: Values, node: Node): number {
  let sum = 0;
  chain(values, node, true, (given, slope) => {
    sum += (slope * given.uncertainty) ** 2;
  });
  return Math.sqrt(sum);
}

/** Slope of a number to every given it is read from, strongest contribution first, then by address. */
export function slopesOf(values: Values, node: Node): readonly Slope[] {
  return strongestFirst(values, node, false);
}

/** The same for the uncertain givens alone. */
export function contributionsTo(values: Values, node: Node): readonly Slope[] {
  const known = settle(values, node) === undefined;
  return known && values.uncertain[node.slot] === true ? strongestFirst(values, node, true) : [];
}

function strongestFirst(values: Values, node: Node, onlyUncertain: boolean): readonly Slope[] {
  if (settle(values, node) !== undefined) return [];
  const slopes: Slope[] = [];
  chain(values, node, onlyUncertain, (given, slope, address) => {
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
    } else {
      pass(values, node, slope, onlyUncertain);
    }
  }
}

/** Hands a slope on from a node to its inputs. */
function pass(values: Values, node: Node, slope: number, onlyUncertain: boolean): void {
  // What a run shares with the one it comes from, inputs and all, was worked out there.
  if (values.origin !== undefined && !values.reaches(node)) pass(values.origin, node, slope, onlyUncertain);
  else if (node.kind === 'law') passThroughLaw(values, node, slope, onlyUncertain);
  else if (node.kind === 'same') add(node.inputs[0], slope);
  // The worst of several moves with the one that was chosen.
  else if (node.kind === 'choice') add(node.inputs[values.chosen[node.slot] ?? -1], slope);
}

function passThroughLaw(values: Values, node: Law, slope: number, onlyUncertain: boolean): void {
  const partials = partialsOf(values, node, onlyUncertain);
  for (let index = 0; index < partials.length; index++) {
    const input = node.inputs[index];
    if (input === undefined || (onlyUncertain && values.uncertain[input.slot] !== true)) continue;
    add(input, slope * (partials[index] ?? 0));
  }
}

function add(node: Node | undefined, slope: number): void {
  if (node !== undefined) slopeTo[node.slot] = (slopeTo[node.slot] ?? 0) + slope;
}

/** Slopes of a law's value to its own inputs, worked out as far as they are wanted and kept. NaN marks those not wanted so far. */
function partialsOf(values: Values, node: Law, onlyUncertain: boolean): readonly number[] {
  let partials = values.partials[node.slot];
  if (partials === undefined) {
    partials = node.inputs.map(() => NaN);
    values.partials[node.slot] = partials;
  }
  let filled = false;
  for (let index = 0; index < partials.length; index++) {
    const input = node.inputs[index];
    const wanted = input !== undefined && (!onlyUncertain || values.uncertain[input.slot] === true);
    if (!wanted || !Number.isNaN(partials[index])) continue;
    if (!filled) argumentsOf(values, node);
    filled = true;
    partials[index] = partial(node, index, numberOf(values, input), numberOf(values, node));
  }
  return partials;
}

const RELATIVE_MOVE = 1e-7;
const MOVE_FROM_ZERO = 1e-9;
/** A law whose value changes by this many times the relative change of an input may stand at a jump. */
const STEEP = 30;

/**
 * Slope of a law to one of its inputs: how much its value changes over a small move upward. Where it has no value above, or stands
 * at a jump (a table goes on to its next row), the move downward counts, and of two the flatter: a jump is no slope.
 */
function partial(node: Law, index: number, at: number, centre: number): number {
  const move = Math.abs(at) * RELATIVE_MOVE || MOVE_FROM_ZERO;
  const up = (moved(node, index, at + move, at) - centre) / move;
  if (Math.abs(up * at) <= STEEP * Math.abs(centre)) return up;
  const down = (centre - moved(node, index, at - move, at)) / move;
  if (!Number.isFinite(up)) return Number.isFinite(down) ? down : 0;
  return Math.abs(down) < Math.abs(up) ? down : up;
}

/** The value of a law with one input replaced for the moment; NaN where it has none. */
function moved({ args, quantity }: Law, index: number, value: number, back: number): number {
  put(args, index, value);
  const answer = quantity.value(args);
  put(args, index, back);
  return typeof answer === 'number' ? answer : NaN;
}

/** Puts a number at its place among the arguments, counting through lists. */
function put(args: (number | number[])[], index: number, value: number): void {
  let left = index;
  for (let position = 0; position < args.length; position++) {
    const arg = args[position];
    if (typeof arg === 'object') {
      if (left < arg.length) {
        arg[left] = value;
        return;
      }
      left -= arg.length;
    } else if (left-- === 0) {
      args[position] = value;
      return;
    }
  }
}
