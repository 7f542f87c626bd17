import type { Given } from '../steps/given.ts';
import { evaluate, lawMoved, type Values } from './evaluate.ts';
import type { Law, Node } from './plan.ts';
import type { Slope } from './reading.ts';

/*
 * Slopes are found as one would by hand: each law is called again with each of its own inputs moved a little, and the
 * slopes are chained from the number back to the givens. Since inputs have lower slots than what is read from them, one
 * pass down the slots does it.
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

/** Walks from a number down to the givens with the slope of the number to each node on the way. */
function chain(
  values: Values,
  target: Node,
  onlyUncertain: boolean,
  visit: (given: Given, slope: number, address: string) => void,
): void {
  const slopes = new Float64Array(target.slot + 1);
  slopes[target.slot] = 1;
  for (let slot = target.slot; slot >= 0; slot--) {
    const slope = slopes[slot] ?? 0;
    const node = values.plan.nodes[slot];
    if (slope === 0 || node === undefined) continue;
    if (node.kind === 'given') {
      const given = values.givens.get(node.address) ?? node.fallback;
      if (given !== undefined) visit(given, slope, node.address);
      continue;
    }
    const partials = partialsOf(values, node, onlyUncertain);
    for (const [index, input] of node.inputs.entries()) {
      if (onlyUncertain && !values.uncertain[input.slot]) continue;
      slopes[input.slot] = (slopes[input.slot] ?? 0) + slope * (partials[index] ?? 0);
    }
  }
}

/** Slopes of a node's value to its own inputs. NaN marks those not asked for so far. */
function partialsOf(values: Values, node: Node, onlyUncertain: boolean): readonly number[] {
  if (node.kind === 'same') return ITSELF;
  if (node.kind === 'choice') return chosenSlopes(values, node.inputs, node);
  if (node.kind !== 'law') return [];
  const partials = [...(values.partials[node.slot] ?? [])];
  for (const [index, input] of node.inputs.entries()) {
    const wanted = !onlyUncertain || values.uncertain[input.slot];
    const kept = partials[index] ?? NaN;
    partials[index] = wanted && Number.isNaN(kept) ? partial(values, node, index, input) : kept;
  }
  values.partials[node.slot] = partials;
  return partials;
}

/** The worst of several moves with the one that was chosen. */
function chosenSlopes(values: Values, inputs: readonly Node[], node: Node): readonly number[] {
  const reading = evaluate(values, node);
  if (node.kind !== 'choice' || reading.kind !== 'known') return [];
  return inputs.map((_, index) => (node.subjects[index] === reading.of ? 1 : 0));
}

const ITSELF: readonly number[] = [1];
const RELATIVE_MOVE = 1e-5;
const MOVE_FROM_ZERO = 1e-9;

/** Up to this relative difference the slopes to both sides are those of a smooth law; beyond, the law has a kink or a jump there. */
const SMOOTH = 0.01;

/**
 * Slope of a law to one input: the mean of the slopes to both sides. At a kink or a jump (the worst of several changes, a table
 * goes on to its next row) the flatter side counts, since a jump is no slope; where the law has a value on one side only, that side.
 */
function partial(values: Values, node: Law, index: number, input: Node): number {
  const at = evaluate(values, input);
  const centre = evaluate(values, node);
  if (at.kind !== 'known' || centre.kind !== 'known') return 0;
  const move = Math.abs(at.value) * RELATIVE_MOVE || MOVE_FROM_ZERO;
  const up = (lawMoved(values, node, index, at.value + move) - centre.value) / move;
  const down = (centre.value - lawMoved(values, node, index, at.value - move)) / move;
  if (!Number.isFinite(up)) return Number.isFinite(down) ? down : 0;
  if (!Number.isFinite(down)) return up;
  const smooth = Math.abs(up - down) <= SMOOTH * Math.max(Math.abs(up), Math.abs(down));
  if (smooth) return (up + down) / 2;
  return Math.abs(up) < Math.abs(down) ? up : down;
}
