import { quantityNamed } from '../quantities/catalogue.ts';
import type { Reference } from '../quantities/reference.ts';
import type { Reading } from '../quantities/reading.ts';
import type { StepRun } from '../quantities/run.ts';
import type { Place } from '../shelf/place.ts';
import { isDefault, type Given } from '../steps/given.ts';
import type { Assumption } from './assumption.ts';
import type { Case } from './cases.ts';
import { hold, isGraver, type Standing } from './hold.ts';
import type { Assumed, Kind, Level, Verdict } from './verdict.ts';

/** The verdict on one assumption of a step: the worst over all cases and subjects. */
export function judgeAssumption(assumption: Assumption, cases: readonly Case[], coverage: number): Verdict {
  const [usual] = cases;
  const references = usual === undefined ? [] : referencesOf(assumption.reference, usual.run);
  let worst: Finding | undefined;
  for (const one of cases) {
    for (const reference of references) {
      // What a case moves may not reach the number: then it stands as it usually does.
      if (one !== usual && !one.run.reaches(one.run.plan.node(reference, assumption.over))) continue;
      const finding = find(assumption, reference, one, coverage);
      if (worst === undefined || graver(finding, worst)) worst = finding;
    }
  }
  if (worst !== undefined) return verdictOf(assumption, worst);
  return blank(assumption, 'notApplicable', cases[0], { because: 'the step has nothing that it speaks of' });
}

/** How one number of one case stands, before it is told in full. */
interface Finding {
  readonly kind: Kind;
  readonly level: Level;
  readonly margin: number;
  readonly reference: Reference;
  readonly reading: Reading;
  readonly uncertainty: number;
  readonly standing: Standing | undefined;
  readonly of: Case;
}

function find(assumption: Assumption, reference: Reference, of: Case, coverage: number): Finding {
  const { over, nominal, limits, whenGiven } = assumption;
  const reading = of.run.read(reference, over);
  if (reading.kind !== 'known') {
    const kind = reading.kind === 'missing' && !whenGiven ? 'open' : 'notApplicable';
    const level = limits[0]?.level ?? 'note';
    return { kind, level, margin: Infinity, reference, reading, uncertainty: 0, standing: undefined, of };
  }
  const uncertainty = nominal ? 0 : coverage * of.run.uncertainty(reference, over);
  const standing = hold(reading.value, uncertainty, limits);
  const { kind, level, margin = Infinity } = standing;
  return { kind, level, margin, reference, reading, uncertainty, standing, of };
}

const GRAVITY: readonly Kind[] = ['notApplicable', 'pass', 'open', 'review', 'fail'];

/** Whether one finding on an assumption is worse than another: by kind, then grade, then margin. */
function graver(one: Finding, other: Finding): boolean {
  const kinds = GRAVITY.indexOf(one.kind) - GRAVITY.indexOf(other.kind);
  if (kinds !== 0) return kinds > 0;
  return one.level === other.level ? one.margin < other.margin : isGraver(one.level, other.level);
}

/** The numbers that are judged where one stands for several: each subject by itself. */
function referencesOf(reference: Reference, { plan }: StepRun): readonly Reference[] {
  const { id, of } = reference;
  if (of !== 'worst' && of !== 'target' && of !== 'melt') return [reference];
  const subjects = of === 'worst' ? (quantityNamed(id)?.subjects?.(plan.scope) ?? []) : plan.scope.emittedSubjects(of);
  if (of !== 'worst' && subjects.length <= 1) return [reference];
  return subjects.map((subject) => ({ ...reference, of: subject }));
}

function verdictOf(assumption: Assumption, finding: Finding): Verdict {
  const { reading, standing, kind, of } = finding;
  const subject = subjectOf(assumption, finding);
  if (reading.kind === 'inapplicable') return blank(assumption, kind, of, { because: reading.because, ...subject });
  if (reading.kind === 'missing') {
    const absence = kind === 'open' ? { needs: reading.needs } : { because: `not given: ${reading.needs.join(', ')}` };
    return blank(assumption, kind, of, { ...absence, ...subject });
  }
  const told = { value: reading.value, uncertainty: finding.uncertainty, ...standing, ...subject };
  return blank(assumption, kind, of, kind === 'pass' ? told : { ...told, ...groundsOf(assumption, finding) });
}

/** A verdict of a kind with what is told of it. */
function blank(assumption: Assumption, kind: Kind, of: Case | undefined, told: Partial<Verdict>): Verdict {
  const { process, name, statement, source, reference, over, bound, limits, cure } = assumption;
  return {
    name: `${process}/${name}`,
    process,
    assumption: name,
    statement,
    source,
    reference,
    ...(over === undefined ? {} : { over }),
    kind,
    level: limits[0]?.level ?? 'note',
    bound,
    cure,
    ...(of?.instance === undefined ? {} : { instance: of.instance }),
    remarks: NOTHING,
    assumed: NOTHING,
    place: of === undefined ? assumption.place : placeOf(kind, cure, of.run),
    ...told,
  };
}

const NOTHING: readonly never[] = [];

/** A finding stands at the first setpoint that could cure it and that the recipe states, else at the step. */
function placeOf(kind: Kind, cure: readonly string[], { step }: StepRun): Place {
  if (kind !== 'pass' && kind !== 'notApplicable') {
    for (const address of cure) {
      const origin = (step.givens.get(address) ?? firstBelow(step.givens, address))?.origin;
      if (origin !== undefined && !isDefault(origin) && origin.place.file === step.place.file) return origin.place;
    }
  }
  return step.place;
}

/** The first given under an address that stands for several: `flows` for `flows.Ar`. */
function firstBelow(givens: ReadonlyMap<string, Given>, address: string): Given | undefined {
  const prefix = `${address}.`;
  for (const [key, given] of givens) if (key.startsWith(prefix)) return given;
  return undefined;
}

/** The gas or atom that a role, or the worst of several, stands for; of an alloy the atom. */
function subjectOf({ reference: named }: Assumption, { reference, reading }: Finding): Pick<Verdict, 'subject'> {
  const chosen = reading.kind === 'known' ? reading.of : undefined;
  const subject = reference === named ? chosen : reference.of;
  return subject === undefined ? {} : { subject: subject.split('/').at(-1) ?? subject };
}

/** What a verdict that does not pass rests on; a review that mostly rests on assumed values has the grade note. */
function groundsOf(
  { over, reviewLevel }: Assumption,
  { reference, kind, level, of: { run } }: Finding,
): Pick<Verdict, 'remarks' | 'assumed' | 'level'> {
  const assumed = assumedIn(run, reference, over);
  const guessed = assumed.reduce((sum, { share, given }) => sum + (isGuess(given) ? share : 0), 0);
  return {
    remarks: run.remarks(reference, over),
    assumed: assumed.map(({ given, share }) => told(given, share)),
    level: kind === 'review' && guessed > 0.5 ? (reviewLevel ?? 'note') : level,
  };
}

interface Share {
  readonly given: Given;
  /** Of the variance. */
  readonly share: number;
}

/** The defaults that a number is read from. */
function assumedIn(run: StepRun, reference: Reference, over: Reference | undefined): readonly Share[] {
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
