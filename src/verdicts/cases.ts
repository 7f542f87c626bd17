import type { Change, StepRun } from '../quantities/run.ts';
import type { Given } from '../steps/given.ts';
import { spannedOf } from '../steps/givens.ts';
import type { Instance } from './verdict.ts';

/** One of the cases in which a step is judged: as it usually runs, at an instant of a ramp, at a limit of a range. */
export interface Case {
  readonly run: StepRun;
  readonly instance?: Instance;
}

/** Both ends of a ramp and eight instants between. */
const INSTANTS: readonly number[] = Array.from({ length: 10 }, (_, index) => index / 9);

/** Every case in which a step is judged; the first is as it usually runs. */
export function casesOf(run: StepRun): readonly Case[] {
  const spans = spannedOf(run.givens);
  if (spans.length === 0) return [{ run }];
  return [...rampCases(run, spans), ...rangeCases(run, spans)];
}

function rampCases(run: StepRun, spans: readonly Given[]): readonly Case[] {
  const ramps = (over: 'step' | 'laps') => spans.filter(({ span }) => span?.kind === 'ramp' && span.over === over);
  const [inStep, overLaps] = [ramps('step'), ramps('laps')];
  if (inStep.length === 0 && overLaps.length === 0) return [{ run }];
  const time = run.givens.get('time')?.value;
  const cases: Case[] = [];
  for (const fraction of inStep.length > 0 ? INSTANTS : []) {
    // A ramp over the laps stands still within one lap: its first and its last lap bound it.
    for (const lap of overLaps.length > 0 ? [0, 1] : [0]) {
      const changes = [...along(inStep, fraction), ...along(overLaps, lap)];
      const at = time === undefined ? {} : { time: fraction * time };
      cases.push({ run: run.with(...changes), instance: { kind: 'ramp', fraction, ...at, over: 'step' } });
    }
  }
  if (inStep.length > 0) return cases;
  return INSTANTS.map((fraction) => ({
    run: run.with(...along(overLaps, fraction)),
    instance: { kind: 'ramp', fraction, over: 'laps' },
  }));
}

function along(ramps: readonly Given[], fraction: number): readonly Change[] {
  return ramps.flatMap(({ address, span }) =>
    span?.kind === 'ramp' ? [{ address, value: span.from + fraction * (span.to - span.from) }] : [],
  );
}

/** Each range at its limits, the others at their usual values. */
function rangeCases(run: StepRun, spans: readonly Given[]): readonly Case[] {
  return spans.flatMap(({ address, span }) => {
    if (span?.kind !== 'range') return [];
    return [...limitCase(run, address, 'at_least', span.atLeast), ...limitCase(run, address, 'at_most', span.atMost)];
  });
}

function limitCase(
  run: StepRun,
  address: string,
  limit: 'at_least' | 'at_most',
  value: number | undefined,
): readonly Case[] {
  return value === undefined
    ? []
    : [{ run: run.with({ address, value }), instance: { kind: 'range', address, limit } }];
}
