import { quantityNamed } from '../quantities/catalogue.ts';
import type { Node } from '../quantities/plan.ts';
import type { Derivation, StepRun } from '../quantities/run.ts';
import { casesOf } from '../verdicts/cases.ts';
import type { Assumed, Verdict } from '../verdicts/verdict.ts';
import { bandOf, print, printGiven, type Shown } from './shown.ts';
import { filled } from './sentences.ts';
import { numberWords } from './words.ts';

/** What a verdict's number was worked out from, one level down: "From emitted free path 300 mm, throw 270 mm." */
export function groundsSentence(verdict: Verdict, run: StepRun, shown: Shown): string | undefined {
  const at = runOf(verdict, run);
  if (at === undefined) return undefined;
  const inputs = plainInputs(at.derive(judgedReference(verdict, run), verdict.over)).filter(isTelling);
  if (inputs.length === 0 || inputs.length > MOST_INPUTS) return undefined;
  return `From ${inputs.map((input) => inputWords(input, at, shown)).join(', ')}.`;
}

/** Defaults that a reader must know of: those that carry a notable share of the uncertainty, and whatever stands in for a setpoint. */
export function assumedSentences(verdict: Verdict, run: StepRun, shown: Shown): readonly string[] {
  return verdict.assumed.filter(isNotable).map((assumed) => `Assumed: ${assumedWords(assumed, run, shown)}.`);
}

function isNotable({ address, share }: Assumed): boolean {
  return share > 0.1 || !address.startsWith('accuracy.');
}

function assumedWords({ address, because }: Assumed, run: StepRun, shown: Shown): string {
  const given = run.given(address);
  if (given === undefined || address.startsWith('assumed.') || address.startsWith('accuracy.')) return because;
  return `${address} ${printGiven(shown, given, given.value, true)}; ${because}`;
}

/** More inputs than a reader takes in at a glance are left to `derive`. */
const MOST_INPUTS = 5;

/** The run at the instant or limit at which the verdict's value stands. */
function runOf(verdict: Verdict, run: StepRun): StepRun | undefined {
  if (verdict.instance === undefined) return run;
  const reference = judgedReference(verdict, run);
  return casesOf(run).find((one) => {
    const reading = one.run.read(reference, verdict.over);
    return reading.kind === 'known' && reading.value === verdict.value;
  })?.run;
}

/** The number that decided: of `worst` or an alloy's role that of the subject. */
function judgedReference({ reference, subject }: Verdict, { plan }: StepRun): Verdict['reference'] {
  if (subject === undefined) return reference;
  if (reference.of === 'worst') return { ...reference, of: subjectNamed(subject, quantityNamed(reference.id)?.subjects?.(plan.scope) ?? []) };
  const role = reference.of;
  if (role !== 'target' && role !== 'melt') return reference;
  return { ...reference, of: subjectNamed(subject, plan.scope.emittedSubjects(role)) };
}

function subjectNamed(subject: string, subjects: readonly string[]): string {
  return subjects.find((one) => one === subject || one.endsWith(`/${subject}`)) ?? subject;
}

/** Inputs of the law that gives a number, behind names that merely stand for another number. */
function plainInputs(derivation: Derivation): readonly Derivation[] {
  const { node, inputs, reading } = derivation;
  if (node.kind === 'same') return inputs.flatMap(plainInputs);
  if (node.kind !== 'choice') return inputs;
  const chosen = reading.kind === 'known' ? node.subjects.indexOf(reading.of ?? '') : -1;
  return inputs.filter((_, index) => index === chosen).flatMap(plainInputs);
}

/** Data and counts tell a reader of a verdict nothing. */
function isTelling({ node, reading }: Derivation): boolean {
  if (reading.kind !== 'known' || node.kind === 'constant') return false;
  return !DATA.test(node.name);
}

const DATA = /^(?:gases|atoms|films|accuracy|assumed)\./;

function inputWords(input: Derivation, run: StepRun, shown: Shown): string {
  const { node, reading } = input;
  const value = reading.kind === 'known' ? reading.value : NaN;
  const given = givenBehind(input);
  const text = given === undefined ? print(shown, value, dimensionOf(node)) : printGiven(shown, given, value);
  const regime = node.kind === 'given' || node.kind === 'constant' ? undefined : bandOf(shown, node.reference?.id ?? '', value);
  return `${nameOf(node, run)} ${text}${regime === undefined ? '' : ` (${regime})`}`;
}

/** The given that a number simply is. */
function givenBehind({ node, given, inputs }: Derivation): Derivation['given'] {
  const [only] = inputs;
  return node.kind === 'same' && only !== undefined ? givenBehind(only) : given;
}

function dimensionOf(node: Node): Parameters<typeof print>[2] {
  return node.kind === 'given' || node.kind === 'constant' ? 'number' : (node.quantity?.dimension ?? 'number');
}

function nameOf(node: Node, run: StepRun): string {
  if (node.kind === 'given' || node.kind === 'constant' || node.reference === undefined) return node.name;
  return numberWords(node.reference, filled(node.reference, run));
}
