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
    from: node.inputs.flatMap((input) => numbers.get(input) ?? []),
    grounds:
      given === undefined ? [lawOf(line), countsOf(node)].filter((text) => text !== '').join('; ') : originOf(given),
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

/** A law with its source; a number that only stands for another says so. */
function lawOf({ node }: Line): string {
  if (node.kind === 'given' || node.kind === 'constant') return '';
  if (node.kind === 'choice') return `the ${node.quantity.worst ?? 'largest'} of ${listed(node.subjects)}`;
  if (node.quantity === undefined) return '';
  return node.quantity.source;
}

/** Counts that the substances fix: atoms in a formula, an atomic number. */
function countsOf({ inputs }: Node): string {
  const counts = inputs.flatMap((input) => (input.kind === 'constant' ? [String(input.value)] : []));
  return counts.length === 0 ? '' : `with the fixed ${counts.length === 1 ? 'count' : 'counts'} ${listed(counts)}`;
}

function originOf({ origin }: Given): string {
  if (isDefault(origin)) return `assumed: ${origin.because}`;
  const { file, line, column } = origin.place;
  return `${file}:${line}:${column}`;
}
