import type { StepRun } from '../../quantities/run.ts';
import type { Given } from '../../steps/given.ts';
import { printNumber, printTime } from '../../units/display.ts';
import { inUnit, printGiven, type Shown } from '../shown.ts';

/** What a step is set to, in as few words as tell it from its neighbours. */
export interface StepFacts {
  readonly time: string;
  readonly pressure: string;
  readonly flows: string;
}

export function stepFacts(run: StepRun, shown: Shown): StepFacts {
  const time = run.givens.get('time');
  return {
    time: time === undefined ? '' : timeOf(time, shown),
    pressure: pressureOf(run, shown),
    flows: flowsOf(run, shown),
  };
}

function timeOf(time: Given, shown: Shown): string {
  return time.span === undefined && shown.asked.get('time') === undefined
    ? printTime(time.value)
    : spanned(time, shown);
}

function pressureOf({ step, givens }: StepRun, shown: Shown): string {
  const pressure = givens.get('pressure') ?? givens.get('fill_to');
  if (pressure !== undefined) return spanned(pressure, shown);
  if (step.unknown.has('pressure')) return 'unknown';
  const throttle = givens.get('throttle');
  if (throttle !== undefined) return `throttle ${printGiven(shown, throttle)}`;
  return step.setup.throttle === 'open' || step.setup.throttle === 'closed' ? step.setup.throttle : '';
}

/** A ramp with both its ends, a range by its usual value. */
function spanned(given: Given, shown: Shown): string {
  if (given.span?.kind !== 'ramp') return printGiven(shown, given);
  const unit = shown.asked.get(given.dimension) ?? given.unit;
  return `${printNumber(inUnit(shown, given.span.from, unit, given.dimension))} to ${printGiven(shown, given, given.span.to)}`;
}

/** Flows of one unit share it: `Ar 150, CHF3 40 sccm`. */
function flowsOf({ step, givens }: StepRun, shown: Shown): string {
  const parts: string[] = [];
  let unitBefore: string | undefined;
  for (const { name } of step.setup.lines) {
    const flow = givens.get(`flows.${name}`);
    if (flow === undefined) continue;
    const unit = shown.asked.get('flow') ?? flow.unit;
    if (unitBefore !== undefined && unitBefore !== unit) parts.push(`${parts.pop() ?? ''} ${unitBefore}`);
    parts.push(`${name} ${flowNumber(flow, unit, shown)}`);
    unitBefore = unit;
  }
  return unitBefore === undefined ? '' : `${parts.join(', ')} ${unitBefore}`;
}

function flowNumber({ value, span }: Given, unit: string, shown: Shown): string {
  const number = (flow: number): string => printNumber(inUnit(shown, flow, unit, 'flow'));
  return span?.kind === 'ramp' ? `${number(span.from)} to ${number(span.to)}` : number(value);
}
