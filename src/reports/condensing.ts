import type { StepRun } from '../quantities/run.ts';
import { printNumber } from '../units/display.ts';

/** The gases of a state that are beyond their vapour pressure at its temperature. */
export function condensingSentences(run: StepRun): readonly string[] {
  return run.step.setup.gases.flatMap((of) => {
    if (run.plan.scope.gas(of)?.vapourPressure === undefined) return [];
    const saturation = run.read({ id: 'saturation', of });
    if (saturation.kind !== 'known' || saturation.value <= 1) return [];
    const times = printNumber(saturation.value);
    return [`${of} condenses: its partial pressure is ${times} times its vapour pressure at this temperature.`];
  });
}
