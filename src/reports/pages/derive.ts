import type { Reference } from '../../quantities/reference.ts';
import type { Line, StepRun } from '../../quantities/run.ts';
import type { Node } from '../../quantities/plan.ts';
import { isDefault, type Given } from '../../steps/given.ts';
import { DIMENSIONS, type Dimension } from '../../units/dimensions.ts';
import type { Judgement } from '../../verdicts/judgement.ts';
import type { Verdict } from '../../verdicts/verdict.ts';
import { nodeDimension, nodeName, nodeReference } from '../nodes.ts';
import type { Block, Link, Page, Sheet } from '../page.ts';
import { filled, verdictMessage, verdictNumber } from '../sentences.ts';
import { bandOf, print, printGiven, shownFor, type AskedUnits, type Shown } from '../shown.ts';
import { capital, listed, numberWords, sentence } from '../words.ts';
import { boundSentences } from './bound.ts';

/** What is derived: a number of a step, one over another, or what a verdict judges, with the verdict. */
export type Derived = { readonly reference: Reference; readonly over?: Reference } | { readonly verdict: Verdict };

/** How a number comes about, from the lines of the recipe through every law to the number, and its bound where it is judged. */
export function derivePage({ run }: Pick<Judgement, 'run'>, step: StepRun, derived: Derived, units: AskedUnits): Page {
  const shown = shownFor(run, units);
  const { reference, over } = 'verdict' in derived ? derived.verdict : derived;
  const lines = [...step.derive(reference, over)].filter(({ node }) => node.kind !== 'constant').reverse();
  const links = linksOf(lines, step, shown);
  return {
    blocks: [
      headOf(step, derived, run.recipe.name),
      { kind: 'chain', links },
      ...shareBlocks(step, reference, over, shown),
      ...('verdict' in derived ? verdictBlocks(derived.verdict, step, shown) : []),
    ],
    sheet: () => chainSheet(links),
  };
}

function headOf(step: StepRun, derived: Derived, recipe: string): Block {
  const name =
    'verdict' in derived
      ? verdictNumber(derived.verdict, step)
      : numberWords(derived.reference, filled(derived.reference, step)) + (derived.over === undefined ? '' : ` over ${numberWords(derived.over, filled(derived.over, step))}`);
  return { kind: 'heading', text: capital(name), aside: `${recipe}, step ${step.step.number} ${step.step.path}, ${step.step.process}` };
}

function linksOf(lines: readonly Line[], step: StepRun, shown: Shown): readonly Link[] {
  const numbers = new Map(lines.map(({ node }, index) => [node, index + 1]));
  return lines.map((line) => linkOf(line, numbers, step, shown));
}

function linkOf(line: Line, numbers: ReadonlyMap<Node, number>, step: StepRun, shown: Shown): Link {
  const { node, given, remarks } = line;
  const { value, si } = valueOf(line, shown);
  return {
    number: numbers.get(node) ?? 0,
    symbol: symbolOf(node),
    name: given === undefined ? nodeName(node, step) : '',
    value,
    ...(si === undefined ? {} : { si }),
    from: node.inputs.flatMap((input) => numbers.get(input) ?? []),
    grounds: given === undefined ? [lawOf(line), countsOf(node)].filter((text) => text !== '').join('; ') : originOf(given),
    remarks: remarks.map(sentence),
  };
}

function symbolOf(node: Node): string {
  if (node.kind === 'given' || node.kind === 'constant') return node.name;
  return node.quantity?.symbol ?? node.name;
}

/** The value as it is printed everywhere, and in SI to five digits, since a pocket calculator starts from there. */
function valueOf({ node, reading, uncertainty, given }: Line, shown: Shown): { value: string; si?: string } {
  if (reading.kind === 'missing') return { value: `open, needs ${listed(reading.needs)}` };
  if (reading.kind === 'inapplicable') return { value: `does not apply: ${reading.because}` };
  if (given !== undefined) {
    const value = printGiven(shown, given, reading.value, true);
    return { value, ...siOf(value, reading.value, given.dimension) };
  }
  const dimension = nodeDimension(node);
  const regime = bandOf(shown, nodeReference(node)?.id ?? '', reading.value);
  const whose = node.kind === 'choice' && reading.of !== undefined ? `, of ${reading.of}` : '';
  const value = `${print(shown, reading.value, dimension, shown.coverage * uncertainty)}${regime === undefined ? '' : ` (${regime})`}${whose}`;
  return { value, ...siOf(value, reading.value, dimension) };
}

/** The value in SI, unless it was printed so. */
function siOf(printed: string, value: number, dimension: Dimension): { si?: string } {
  const si = siText(value, dimension);
  return si === printed ? {} : { si };
}

function siText(value: number, dimension: Dimension): string {
  const unit = DIMENSIONS[dimension].si;
  const number = Number(value.toPrecision(5));
  const plain = number === 0 || (Math.abs(number) >= 1e-3 && Math.abs(number) < 1e5);
  const text = plain ? String(number) : number.toExponential().replace('e+', 'e');
  return unit === '1' ? text : `${text} ${unit}`;
}

/** A law with its source; a number that only stands for another says so. */
function lawOf({ node }: Line): string {
  if (node.kind === 'given' || node.kind === 'constant') return '';
  if (node.kind === 'choice') return `the ${node.quantity.worst ?? 'largest'} of ${listed(node.subjects)}`;
  if (node.quantity === undefined) return '';
  return node.quantity.source;
}

/** Counts that the formula of a substance fixes. */
function countsOf({ inputs }: Node): string {
  const counts = inputs.flatMap((input) => (input.kind === 'constant' ? [String(input.value)] : []));
  return counts.length === 0 ? '' : `atoms counted ${listed(counts)}`;
}

function originOf({ origin }: Given): string {
  if (isDefault(origin)) return `assumed: ${origin.because}`;
  const { file, line, column } = origin.place;
  return `${file}:${line}:${column}`;
}

/** Which givens carry the uncertainty, down to a twentieth of it. */
function shareBlocks(step: StepRun, reference: Reference, over: Reference | undefined, shown: Shown): readonly Block[] {
  const slopes = step.slopes(reference, over);
  const variance = slopes.reduce((sum, { contribution }) => sum + contribution ** 2, 0);
  if (variance === 0) return [];
  const shares = slopes
    .map(({ address, contribution }) => ({ address, share: contribution ** 2 / variance }))
    .filter(({ share }) => share >= 0.05)
    .map(({ address, share }) => `${address} ${Math.round(100 * share)} %`);
  return [{ kind: 'sentence', weight: 'detail', text: `Uncertainties are expanded, k = ${shown.coverage}; of the variance ${listed(shares)}.` }];
}

function verdictBlocks(verdict: Verdict, step: StepRun, shown: Shown): readonly Block[] {
  const { kind, level, name } = verdict;
  const grade = kind === 'fail' || kind === 'review' || kind === 'open' ? `, ${level}` : '';
  const word = kind === 'notApplicable' ? 'does not apply' : kind;
  return [
    ...boundSentences(verdict, shown).map((text) => ({ kind: 'sentence' as const, weight: 'first' as const, text })),
    { kind: 'sentence', weight: 'first', text: `${name}: ${word}${grade}. ${verdictMessage(verdict, step, shown)}` },
  ];
}

function chainSheet(links: readonly Link[]): Sheet {
  return {
    columns: ['number', 'symbol', 'name', 'value', 'si', 'from', 'grounds'],
    rows: links.map(({ number, symbol, name, value, si = '', from, grounds }) => [String(number), symbol, name, value, si, from.join(' '), grounds]),
  };
}
