import type { Node } from '../quantities/plan.ts';
import type { Line, StepRun } from '../quantities/run.ts';
import { isDefault, type Given } from '../steps/given.ts';
import { DIMENSIONS, type Dimension } from '../units/dimensions.ts';
import { writtenUnit } from './number.ts';
import { nodeDimension, nodeName, nodeReference } from './nodes.ts';
import type { Link } from './page.ts';
import { bandOf, print, printGiven, type Shown } from './shown.ts';
import { listed, sentence } from './words.ts';

/** The lines of a derivation as links, each with the numbers of those it is read from. */
export function linksOf(lines: readonly Line[], step: StepRun, shown: Shown): readonly Link[] {
  const numbers = new Map(lines.map(({ node }, index) => [node, index + 1]));
  return lines.map((line) => linkOf(line, numbers, step, shown));
}

function linkOf(line: Line, numbers: ReadonlyMap<Node, number>, step: StepRun, shown: Shown): Link {
  const { node, given, remarks } = line;
  const { value, si } = valueOf(line, step, shown);
  return {
    number: numbers.get(node) ?? 0,
    symbol: symbolOf(node),
    name: given === undefined ? nodeName(node, step) : '',
    value,
    ...(si === undefined ? {} : { si }),
    ...groundsOf(line, numbers),
    remarks: remarks.map(sentence),
  };
}

function symbolOf(node: Node): string {
  if (node.kind === 'given' || node.kind === 'constant') return node.name;
  return node.quantity?.symbol ?? node.name;
}

/** The value as it is printed everywhere, and in SI to five digits, since a pocket calculator starts from there. */
function valueOf(
  { node, reading, uncertainty, given }: Line,
  step: StepRun,
  shown: Shown,
): { value: string; si?: string } {
  if (reading.kind === 'missing') return { value: `open, needs ${listed(reading.needs)}` };
  if (reading.kind === 'inapplicable') return { value: `does not apply: ${reading.because}` };
  if (given !== undefined) {
    const value = printGiven(shown, given, reading.value, true);
    return { value, ...siOf(value, reading.value, given.dimension) };
  }
  const dimension = nodeDimension(node);
  const unit = shown.asked.get(dimension) ?? writtenUnit(node, step);
  const regime = bandOf(shown, nodeReference(node)?.id ?? '', reading.value);
  const whose = node.kind === 'choice' && reading.of !== undefined ? `, of ${reading.of}` : '';
  const value = `${print(shown, reading.value, dimension, shown.coverage * uncertainty, unit)}${regime === undefined ? '' : ` (${regime})`}${whose}`;
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

/** The law and the lines it is read from; a number that only stands for another says for which. */
function groundsOf({ node, given }: Line, numbers: ReadonlyMap<Node, number>): Pick<Link, 'from' | 'grounds'> {
  if (given !== undefined) return { from: [], grounds: originOf(given) };
  const from = node.inputs.flatMap((input) => numbers.get(input) ?? []);
  if (node.kind === 'same') return { from: [], grounds: `the same as ${from.join(', ')}` };
  if (node.kind === 'choice')
    return { from, grounds: `the ${node.quantity.worst ?? 'largest'} of ${listed(node.subjects)}` };
  if (node.kind === 'given' || node.kind === 'constant') return { from, grounds: '' };
  const { id, source } = node.quantity ?? { id: '', source: '' };
  return { from, grounds: [source, countsOf(node, COUNTED.get(id))].filter((text) => text !== '').join('; ') };
}

/** Counts that formulas fix. Those of a gas's atoms and charges, which its formula tells anybody, are left out. */
function countsOf({ inputs }: Node, noun: string | undefined): string {
  const counts = inputs.flatMap((input) => (input.kind === 'constant' ? [input.value] : []));
  if (noun === undefined || counts.length === 0) return '';
  const [last] = counts.slice(-1);
  return `with ${listed(counts.map(String))} ${last === 1 && counts.length === 1 ? noun : `${noun}s`} by formula`;
}

/** What is counted in the laws that count in formulas. */
const COUNTED: ReadonlyMap<string, string> = new Map([
  ['impurity-ratio', 'atom'],
  ['utilisation', 'atom'],
  ['surface-rate', 'molecule'],
]);

function originOf({ origin }: Given): string {
  if (isDefault(origin)) return `assumed: ${origin.because}`;
  const { file, line, column } = origin.place;
  return `${file}:${line}:${column}`;
}
