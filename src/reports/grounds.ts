import { quantityNamed } from '../quantities/catalogue.ts';
import type { Node } from '../quantities/plan.ts';
import type { Line, StepRun } from '../quantities/run.ts';
import type { Given } from '../steps/given.ts';
import { printMeasure } from '../units/display.ts';
import { casesOf } from '../verdicts/cases.ts';
import type { Assumed, Verdict } from '../verdicts/verdict.ts';
import { bandOf, print, printGiven, type Shown } from './shown.ts';
import { nodeDimension, nodeName, nodeReference } from './nodes.ts';

/** What a verdict's number was worked out from, one level down: "From emitted free path 300 mm, throw 270 mm." */
export function groundsSentence(verdict: Verdict, run: StepRun, shown: Shown): string | undefined {
  const at = runOf(verdict, run);
  if (at === undefined) return undefined;
  const lines = new Map(at.derive(judgedReference(verdict, run), verdict.over).map((line) => [line.node, line]));
  const [target] = lines.keys();
  if (target === undefined) return undefined;
  const inputs = plainInputs(lines, target)
    .flatMap((node) => lines.get(node) ?? [])
    .filter(isTelling);
  if (inputs.length === 0 || inputs.length > MOST_INPUTS) return undefined;
  return `From ${inputs.map((input) => inputWords(input, lines, at, shown)).join(', ')}.`;
}

/** Defaults that a reader must know of: those that carry a notable share of the uncertainty, and whatever stands in for a setpoint. */
export function assumedSentence(verdict: Verdict, run: StepRun, shown: Shown): string | undefined {
  const words = verdict.assumed.filter(isNotable).map((assumed) => assumedWords(assumed, run, shown));
  return words.length === 0 ? undefined : `Assumed: ${words.join('; ')}.`;
}

function isNotable({ address, share }: Assumed): boolean {
  return share > 0.1 || !address.startsWith('accuracy.');
}

function assumedWords({ address, because }: Assumed, run: StepRun, shown: Shown): string {
  const given = run.given(address);
  if (given === undefined) return because;
  const [family, property, gas] = address.split('.');
  if (family === 'accuracy' && gas !== undefined) {
    return `${property} of ${gas} known to ${printMeasure(shown.coverage * given.uncertainty, 'fraction', { unit: '%' })}`;
  }
  if (family === 'accuracy' || family === 'assumed') return because;
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
  if (reference.of === 'worst')
    return { ...reference, of: subjectNamed(subject, quantityNamed(reference.id)?.subjects?.(plan.scope) ?? []) };
  const role = reference.of;
  if (role !== 'target' && role !== 'melt') return reference;
  return { ...reference, of: subjectNamed(subject, plan.scope.emittedSubjects(role)) };
}

function subjectNamed(subject: string, subjects: readonly string[]): string {
  return subjects.find((one) => one === subject || one.endsWith(`/${subject}`)) ?? subject;
}

/** Inputs of the law that gives a number, behind names that merely stand for another number. */
function plainInputs(lines: ReadonlyMap<Node, Line>, node: Node): readonly Node[] {
  if (node.kind === 'same') return node.inputs.flatMap((input) => plainInputs(lines, input));
  if (node.kind !== 'choice') return node.inputs;
  const reading = lines.get(node)?.reading;
  const chosen = reading?.kind === 'known' ? node.subjects.indexOf(reading.of ?? '') : -1;
  return node.inputs.filter((_, index) => index === chosen).flatMap((input) => plainInputs(lines, input));
}

/** Data and counts tell a reader of a verdict nothing. */
function isTelling({ node, reading }: Line): boolean {
  return reading.kind === 'known' && node.kind !== 'constant' && !DATA.test(node.name);
}

const DATA = /^(?:gases|atoms|films|accuracy|assumed)\./;

function inputWords({ node, reading }: Line, lines: ReadonlyMap<Node, Line>, run: StepRun, shown: Shown): string {
  const value = reading.kind === 'known' ? reading.value : NaN;
  const given = givenBehind(lines, node);
  const text = given === undefined ? print(shown, value, nodeDimension(node)) : printGiven(shown, given, value);
  const regime = bandOf(shown, nodeReference(node)?.id ?? '', value);
  return `${nodeName(node, run)} ${text}${regime === undefined ? '' : ` (${regime})`}`;
}

/** The given that a number simply is. */
function givenBehind(lines: ReadonlyMap<Node, Line>, node: Node): Given | undefined {
  const [only] = node.inputs;
  return node.kind === 'same' && only !== undefined ? givenBehind(lines, only) : lines.get(node)?.given;
}
