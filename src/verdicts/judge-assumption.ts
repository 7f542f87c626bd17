import type { Reference } from '../quantities/reference.ts';
import type { Reading } from '../quantities/reading.ts';
import type { StepRun } from '../quantities/run.ts';
import type { Place } from '../shelf/place.ts';
import { isDefault, type Given } from '../steps/given.ts';
import type { Assumption } from './assumption.ts';
import type { Case } from './cases.ts';
import { hold, isGraver, type Standing } from './hold.ts';
import type { Assumed, Instance, Kind, Level, Verdict } from './verdict.ts';

/** The verdict on one assumption of a step: the worst over all cases and subjects. */
export function judgeAssumption(assumption: Assumption, cases: readonly Case[], coverage: number): Verdict {
  const [usual] = cases;
  const references = usual === undefined ? [] : usual.run.plan.each(assumption.reference);
  let worst: Finding | undefined;
  let varies = false;
  for (const one of cases) {
    for (const reference of references) {
      // What a case moves may not reach the number: then it stands as it usually does.
      if (one !== usual && !one.run.reaches(one.run.plan.node(reference, assumption.over))) continue;
      varies ||= one !== usual;
      const finding = find(assumption, reference, one, coverage);
      if (worst === undefined || graver(finding, worst)) worst = finding;
    }
  }
  if (worst !== undefined) return verdictOf(assumption, varies ? worst : { ...worst, of: { run: worst.of.run } });
  return { ...templateOf(assumption), because: 'the step has nothing that it speaks of' };
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

function verdictOf(assumption: Assumption, finding: Finding): Verdict {
  const { kind, level, reading, standing, uncertainty, of } = finding;
  const place = placeOf(kind, assumption.cure, of.run);
  const template = templateOf(assumption);
  if (reading.kind === 'known' && kind === 'pass') {
    const verdict = passed(template, place, reading.value, uncertainty, standing);
    const subject = subjectOf(assumption, finding);
    return subject === NOTHING && of.instance === undefined ? verdict : { ...verdict, ...instanceOf(of), ...subject };
  }
  const common = { ...template, kind, level, place, ...instanceOf(of), ...subjectOf(assumption, finding) };
  if (reading.kind === 'inapplicable') return { ...common, because: reading.because };
  if (reading.kind === 'known') {
    return { ...common, value: reading.value, uncertainty, ...standing, ...groundsOf(assumption, finding) };
  }
  if (kind === 'open') return { ...common, needs: reading.needs };
  return { ...common, because: `not given: ${reading.needs.join(', ')}` };
}

/** Most verdicts pass, and of those there is little to tell: key by key, since a check in bulk makes a hundred of them for every recipe. */
function passed(
  { name, process, assumption, statement, source, reference, level, bound, remarks, assumed, cure, over }: Verdict,
  place: Place,
  value: number,
  uncertainty: number,
  standing: Standing | undefined,
): Verdict {
  const told: Writable<Verdict> = {
    name,
    process,
    assumption,
    statement,
    source,
    reference,
    kind: 'pass',
    level,
    value,
    uncertainty,
    bound,
    remarks,
    assumed,
    cure,
    place,
  };
  if (over !== undefined) told.over = over;
  if (standing?.limit !== undefined) told.limit = standing.limit;
  if (standing?.margin !== undefined) told.margin = standing.margin;
  return told;
}

type Writable<T> = { -readonly [K in keyof T]: T[K] };

function instanceOf({ instance }: Case): { instance?: Instance } {
  return instance === undefined ? NOTHING : { instance };
}

const NOTHING = {};

/** What every verdict on an assumption has. */
const TEMPLATES = new WeakMap<Assumption, Verdict>();

function templateOf(assumption: Assumption): Verdict {
  let template = TEMPLATES.get(assumption);
  if (template === undefined) {
    template = newTemplate(assumption);
    TEMPLATES.set(assumption, template);
  }
  return template;
}

function newTemplate({ process, name, over, limits, ...rest }: Assumption): Verdict {
  const { statement, source, reference, bound, cure, place } = rest;
  return {
    name: `${process}/${name}`,
    process,
    assumption: name,
    statement,
    source,
    reference,
    ...(over === undefined ? {} : { over }),
    kind: 'notApplicable',
    level: limits[0]?.level ?? 'note',
    bound,
    remarks: [],
    assumed: [],
    cure,
    place,
  };
}

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
function subjectOf({ reference: named }: Assumption, { reference, reading }: Finding): { subject?: string } {
  const chosen = reading.kind === 'known' ? reading.of : undefined;
  const subject = (reference === named ? chosen : reference.of)?.split('/').at(-1);
  return subject === undefined ? NOTHING : { subject };
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
  const contributions = new Map<string, number>();
  let variance = 0;
  for (const { address, contribution } of run.contributions(reference, over)) {
    contributions.set(address, contribution ** 2);
    variance += contribution ** 2;
  }
  return run.defaults(reference, over).map((given) => {
    const part = contributions.get(given.address) ?? 0;
    return { given, share: part > 0 ? part / variance : 0 };
  });
}

/** Accuracies of laws and data are known; what merely stands in for a setpoint is a guess. */
function isGuess({ address }: Given): boolean {
  return !address.startsWith('accuracy.');
}

function told({ address, value, uncertainty, unit, origin }: Given, share: number): Assumed {
  return { address, value, uncertainty, unit, because: isDefault(origin) ? origin.because : '', share };
}
