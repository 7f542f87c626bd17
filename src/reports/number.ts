import { quantityNamed } from '../quantities/catalogue.ts';
import type { Node } from '../quantities/plan.ts';
import type { Reference } from '../quantities/reference.ts';
import type { StepRun } from '../quantities/run.ts';
import { dimensionOf } from '../steps/addresses.ts';
import type { Dimension } from '../units/dimensions.ts';
import { unitFor, type Shown } from './shown.ts';

/** The unit of a number of a step: that of the setpoint which it simply is, else the one by dimension and size. */
export function unitOfNumber(shown: Shown, run: StepRun, reference: Reference, value: number): string {
  const dimension = dimensionOfNumber(reference);
  const written = shown.asked.has(dimension) ? undefined : writtenUnit(run.plan.number(reference), run);
  return written ?? unitFor(shown, value, dimension);
}

export function dimensionOfNumber({ id, of = '' }: Reference): Dimension {
  if (id === 'setpoint') return dimensionOf(of) ?? 'number';
  return quantityNamed(id)?.dimension ?? 'number';
}

/** The gas or atom that fills a role in this step. */
export function filled({ of }: Reference, { step }: Pick<StepRun, 'step'>): string | undefined {
  const { reactant, target, melt } = step.setup;
  if (of === 'reactant') return reactant;
  if (of === 'target') return target?.atoms[0]?.atom;
  return of === 'melt' ? melt?.atoms[0]?.atom : undefined;
}

/** The unit in which somebody wrote what a number simply is: the pressure of the gas in the unit of the setpoint. */
export function writtenUnit(node: Node, run: Pick<StepRun, 'given'>): string | undefined {
  const [only] = node.inputs;
  if (node.kind === 'same' && only !== undefined) return writtenUnit(only, run);
  return node.kind === 'given' ? run.given(node.address)?.unit : undefined;
}
