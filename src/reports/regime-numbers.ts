import { quantityNamed } from '../quantities/catalogue.ts';
import type { Reference } from '../quantities/reference.ts';
import type { StepRun } from '../quantities/run.ts';
import type { Site } from '../steps/site.ts';

type Processes = Pick<Site, 'process'>;

/**
 * The numbers that tell the regime of one step: pressure, mean free path, the Knudsen number over each length that the step
 * names, residence time and turnovers.
 */
export function regimeNumbers(step: StepRun, site: Processes): readonly Reference[] {
  return [...STATE, ...knudsenNumbers(step, site), ...STAY];
}

export const STATE: readonly Reference[] = ['gas-pressure', 'gas-temperature', 'mean-free-path'].map((id) => ({ id }));
export const STAY: readonly Reference[] = ['residence-time', 'turnovers'].map((id) => ({ id }));

/** The Knudsen number over each length that a step has. */
export function knudsenNumbers(step: StepRun, site: Processes): readonly Reference[] {
  const lengths = quantityNamed('knudsen')?.lengths?.(step.plan.scope) ?? [];
  return lengths.flatMap((length) => {
    if (step.read({ id: 'length', length }).kind !== 'known') return [];
    if (length !== 'throw') return [{ id: 'knudsen', length }];
    const of = emitterOf(step);
    return of === undefined || !emits(step, site) ? [] : [{ id: 'knudsen', length, of }];
  });
}

/** Why the Knudsen number over a throw means nothing in a step; undefined where it does. */
export function noThrow(step: StepRun, { length, of }: Reference, site: Processes): string | undefined {
  if (length !== 'throw') return undefined;
  if (of !== emitterOf(step)) return `no ${of ?? 'target or melt'} runs`;
  return emits(step, site) ? undefined : 'no generator delivers power';
}

/** Over a throw what counts is the free path of the atoms that fly it. */
function emitterOf({ step: { setup } }: StepRun): 'target' | 'melt' | undefined {
  if (setup.target !== undefined) return 'target';
  return setup.melt === undefined ? undefined : 'melt';
}

/**
 * Whether atoms may leave the target or melt that the step has. Nothing leaves it where the chamber has generators and none
 * delivers power, unless the intended process speaks of such atoms all the same.
 */
function emits({ step }: StepRun, site: Processes): boolean {
  if (step.setup.powered.length > 0 || !hasGenerators(step.givens.keys())) return true;
  const assumptions = site.process(step.process)?.assumptions ?? [];
  return assumptions.some(({ quantity, over }) => speaksOfEmitter(quantity) || speaksOfEmitter(over));
}

function hasGenerators(addresses: Iterable<string>): boolean {
  for (const address of addresses) if (address.startsWith('chamber.generators.')) return true;
  return false;
}

function speaksOfEmitter(number = ''): boolean {
  return /:(?:target|melt)\b/.test(number);
}
