import type { Node } from '../quantities/plan.ts';
import type { Reference } from '../quantities/reference.ts';
import type { StepRun } from '../quantities/run.ts';
import type { Dimension } from '../units/dimensions.ts';
import { dimensionOfNumber, filled } from './number.ts';
import { numberWords } from './words.ts';

/** What a line of a derivation is called: a given by its address, a number in words. */
export function nodeName(node: Node, run: StepRun): string {
  const reference = nodeReference(node);
  return reference === undefined ? node.name : numberWords(reference, filled(reference, run));
}

/** The number that a line stands for; none for a given, a count, and one number over another. */
export function nodeReference(node: Node): Reference | undefined {
  if (node.kind === 'given' || node.kind === 'constant' || isRatio(node)) return undefined;
  return node.reference;
}

export function nodeDimension(node: Node): Dimension {
  const reference = nodeReference(node);
  return reference === undefined ? 'number' : dimensionOfNumber(reference);
}

/** One number over another refers to the first of both, whose words and unit are not its own. */
function isRatio(node: Node): boolean {
  return node.kind === 'law' && node.quantity.id === 'ratio';
}
