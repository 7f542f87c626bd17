import type { StepRun } from '../quantities/run.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Site } from '../steps/site.ts';
import type { RatioSpec } from '../steps/site-rules.ts';
import { boundIn, type Assumption } from './assumption.ts';
import type { Case } from './cases.ts';
import { limitsOf } from './hold.ts';
import { judgeAssumption } from './judge-assumption.ts';
import type { Bound, Verdict } from './verdict.ts';

/** The ratios of flows that a site keeps within bounds, judged for a step on a chamber for which they hold. */
export function judgeRatios(run: StepRun, chamber: string, site: Site, cases: readonly Case[]): readonly Verdict[] {
  return site.ratios
    .filter(({ chambers }) => chambers === undefined || chambers.includes(chamber))
    .map((ratio) => judgeRatio(ratio, run, cases, site.show.coverageFactor));
}

/** Bounds of ratios that can't be read. */
export function ratioFaults({ ratios }: Site): readonly Fault[] {
  const faults: Fault[] = [];
  for (const ratio of ratios) boundIn('number', ratio, faults);
  return faults;
}

function judgeRatio(ratio: RatioSpec, run: StepRun, cases: readonly Case[], coverage: number): Verdict {
  const assumption = assumptionOf(ratio, run);
  // Where the gas flows without the one it is held against, the ratio has no number and is above every bound.
  const beyond = cases.find((one) => flows(ratio.of, one.run) === true && flows(ratio.to, one.run) === false);
  if (beyond === undefined) return judgeAssumption(assumption, cases, coverage);
  const most = assumption.limits.find(({ side }) => side === 'at_most');
  if (most !== undefined) {
    const verdict = aboveEvery(judgeAssumption(assumption, [beyond], coverage), ratio);
    const { instance } = beyond;
    return { ...verdict, kind: 'fail', level: most.level, ...(instance === undefined ? {} : { instance }) };
  }
  // Without an upper bound it is no finding; one that the ratio has elsewhere stays.
  const verdict = judgeAssumption(assumption, cases, coverage);
  return verdict.kind === 'notApplicable' ? aboveEvery(verdict, ratio) : verdict;
}

/** In place of why the ratio has no number, which gas flows alone. */
function aboveEvery(verdict: Verdict, { of, to }: RatioSpec): Verdict {
  const { because, ...rest } = verdict;
  return { ...rest, kind: 'pass', remarks: because === undefined ? rest.remarks : [`${of} flows without ${to}`] };
}

function assumptionOf({ name, of, to, statement, source, place, ...stated }: RatioSpec, run: StepRun): Assumption {
  const bound = kept(stated);
  return {
    process: 'site',
    name,
    statement: statement ?? `The flow of ${of} over that of ${to} stays within the site's bounds.`,
    source: source ?? 'stated by the site',
    reference: { id: 'flow-ratio', of: `${of}/${to}` },
    bound,
    limits: limitsOf(bound),
    whenGiven: false,
    nominal: false,
    cure: run.step.setup.lines
      .filter(({ brings }) => brings.some(({ gas }) => gas === of || gas === to))
      .map((line) => `flows.${line.name}`),
    place,
  };
}

function kept(limits: Pick<RatioSpec, 'atLeast' | 'atMost'>): Bound {
  // What can't be read was told when the site was opened.
  return boundIn('number', limits, []);
}

/** Whether a gas flows in a case; undefined where nobody knows. */
function flows(gas: string, run: StepRun): boolean | undefined {
  if (!run.plan.scope.fedGases.includes(gas)) return false;
  const reading = run.read({ id: 'flow-rate', of: gas });
  return reading.kind === 'known' ? reading.value > 0 : undefined;
}
