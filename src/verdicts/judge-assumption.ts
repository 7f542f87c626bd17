import { quantityNamed } from '../quantities/catalogue.ts';
import type { Reference } from '../quantities/reference.ts';
import type { StepRun } from '../quantities/run.ts';
import { isDefault, type Given } from '../steps/given.ts';
import type { Assumption } from './assumption.ts';
import type { Case } from './cases.ts';
import { gravest, hold, LEVELS, type Standing } from './hold.ts';
import type { Assumed, Kind, Verdict } from './verdict.ts';

/** The verdict on one assumption of a step: the worst over all cases and subjects. */
export function judgeAssumption(assumption: Assumption, cases: readonly Case[], coverage: number): Verdict {
  let worst: Verdict | undefined;
  for (const one of cases) {
    for (const subject of subjectsOf(assumption.reference, one.run)) {
      const verdict = judgeOne(assumption, subject, one, coverage);
      if (worst === undefined || graver(verdict, worst)) worst = verdict;
    }
  }
  return worst ?? absentVerdict(assumption, { kind: 'notApplicable', because: 'the step has nothing that it speaks of' });
}

/** The subjects of a number that stands for several, each judged by itself; undefined stands for the number as named. */
function subjectsOf({ id, of }: Reference, run: StepRun): readonly (string | undefined)[] {
  const { scope } = run.plan;
  if (of === 'worst') return quantityNamed(id)?.subjects?.(scope) ?? [];
  if (of === 'target' || of === 'melt') {
    const subjects = scope.emittedSubjects(of);
    if (subjects.length > 1) return subjects;
  }
  return [undefined];
}

function judgeOne(assumption: Assumption, subject: string | undefined, { run, instance }: Case, coverage: number): Verdict {
  const reference = subject === undefined ? assumption.reference : { ...assumption.reference, of: subject };
  const reading = run.read(reference, assumption.over);
  const about = {
    ...(instance === undefined ? {} : { instance }),
    ...subjectName(subject, reading.kind === 'known' ? reading.of : undefined),
  };
  if (reading.kind === 'inapplicable') {
    return { ...absentVerdict(assumption, { kind: 'notApplicable', because: reading.because }), ...about };
  }
  if (reading.kind === 'missing') {
    const because = `not given: ${reading.needs.join(', ')}`;
    const absence = assumption.whenGiven ? { kind: 'notApplicable' as const, because } : { kind: 'open' as const, needs: reading.needs };
    return { ...absentVerdict(assumption, absence), ...about };
  }
  const uncertainty = assumption.nominal ? 0 : coverage * run.uncertainty(reference, assumption.over);
  const standing = hold(reading.value, uncertainty, assumption.bound);
  return {
    ...basics(assumption),
    ...about,
    ...standing,
    value: reading.value,
    uncertainty,
    ...(standing.kind === 'pass' ? NOTHING_TO_SAY : grounds(reference, assumption, run, standing)),
  };
}

const NOTHING_TO_SAY = { remarks: [], assumed: [] };

/** What a verdict that does not pass rests on; a review that mostly rests on assumed values has the grade note. */
function grounds(
  reference: Reference,
  { over, reviewLevel }: Assumption,
  run: StepRun,
  { kind, level }: Standing,
): Pick<Verdict, 'remarks' | 'assumed' | 'level'> {
  const assumed = assumedIn(run, reference, over);
  const restsOnAssumed = assumed.reduce((sum, { share, given }) => sum + (isGuess(given) ? share : 0), 0) > 0.5;
  return {
    remarks: run.remarks(reference, over),
    assumed: assumed.map(({ given, share }) => told(given, share)),
    level: kind === 'review' && restsOnAssumed ? (reviewLevel ?? 'note') : level,
  };
}

/** The defaults that a number is read from, with their shares of its variance. */
function assumedIn(run: StepRun, reference: Reference, over: Reference | undefined): readonly { given: Given; share: number }[] {
  const slopes = run.slopes(reference, over);
  const variance = slopes.reduce((sum, { contribution }) => sum + contribution ** 2, 0);
  return slopes.flatMap(({ address, slope, contribution }) => {
    const given = run.given(address);
    if (given === undefined || slope === 0 || !isDefault(given.origin)) return [];
    return [{ given, share: variance > 0 ? contribution ** 2 / variance : 0 }];
  });
}

/** Accuracies of laws and data are known; what merely stands in for a setpoint is a guess. */
function isGuess({ address }: Given): boolean {
  return !address.startsWith('accuracy.');
}

function told({ address, value, uncertainty, unit, origin }: Given, share: number): Assumed {
  return { address, value, uncertainty, unit, because: isDefault(origin) ? origin.because : '', share };
}

function subjectName(subject: string | undefined, winner: string | undefined): { subject?: string } {
  const name = subject ?? winner;
  return name === undefined ? {} : { subject: name.split('/').at(-1) ?? name };
}

type Absence =
  | { readonly kind: 'notApplicable'; readonly because: string }
  | { readonly kind: 'open'; readonly needs: readonly string[] };

function absentVerdict(assumption: Assumption, absence: Absence): Verdict {
  return { ...basics(assumption), ...absence, level: gravest(assumption.bound) };
}

function basics(assumption: Assumption): Omit<Verdict, 'kind' | 'level'> {
  const { process, name, statement, source, reference, over, bound, cure, place } = assumption;
  return {
    name: `${process}/${name}`,
    process,
    assumption: name,
    statement,
    source,
    reference,
    ...(over === undefined ? {} : { over }),
    bound,
    cure,
    place,
    ...NOTHING_TO_SAY,
  };
}

const GRAVITY: readonly Kind[] = ['notApplicable', 'pass', 'open', 'review', 'fail'];

/** Whether one verdict on an assumption is worse than another: by kind, then grade, then margin. */
function graver(one: Verdict, other: Verdict): boolean {
  const kinds = GRAVITY.indexOf(one.kind) - GRAVITY.indexOf(other.kind);
  if (kinds !== 0) return kinds > 0;
  const levels = LEVELS.indexOf(one.level) - LEVELS.indexOf(other.level);
  if (levels !== 0) return levels < 0;
  return (one.margin ?? Infinity) < (other.margin ?? Infinity);
}
