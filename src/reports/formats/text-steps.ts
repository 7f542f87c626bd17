import type { CycleBlock, Finding, StepBlock, Steps } from '../page.ts';
import type { Canvas } from './text.ts';
import { padEnd, padStart, widthOf, wrap } from './wrap.ts';

/** Steps with common columns: number, path, process, time, pressure, flows, and to the right the outcome. */
export function drawSteps({ steps }: Steps, canvas: Canvas): readonly string[] {
  const widths = columnsOf(steps);
  return steps.flatMap((step) =>
    step.kind === 'cycle'
      ? [cycleLine(step, canvas)]
      : [...stepLines(step, widths, canvas), ...findingLines(step, canvas)],
  );
}

/** Indent of what belongs to a step. */
const INDENT = 4;
const GAP = 2;

interface Widths {
  readonly path: number;
  readonly process: number;
  readonly time: number;
  readonly pressure: number;
  readonly flows: number;
}

function columnsOf(steps: Steps['steps']): Widths {
  const widths = { path: 0, process: 0, time: 0, pressure: 0, flows: 0 };
  for (const step of steps) {
    if (step.kind === 'cycle') continue;
    for (const key of COLUMNS) widths[key] = Math.max(widths[key], widthOf(step[key]));
  }
  return widths;
}

const COLUMNS = ['path', 'process', 'time', 'pressure', 'flows'] as const;

function cycleLine({ path, repeat }: CycleBlock, { styles }: Canvas): string {
  return `    ${path}   ${styles.faint(repeat)}`;
}

function stepLines(step: StepBlock, widths: Widths, { width, styles }: Canvas): readonly string[] {
  const name = `${padStart(String(step.number), 2)}  ${padEnd(step.path, widths.path)}`;
  const process = padEnd(step.process, widths.process);
  const facts = [padStart(step.time, widths.time), padStart(step.pressure, widths.pressure), step.flows];
  const outcome = step.outcome.join(', ');
  const left = [name, process, ...facts].join('  ');
  const styled = styles.strong(name) + left.slice(name.length);
  // Whether the outcome stands in the same line must not change from step to step.
  const fits = widthOf(name) + widths.process + widths.time + widths.pressure + 4 * GAP + widths.flows + GAP <= width;
  if (fits) return withRight(styled, widthOf(left), outcome, { width, styles });
  const short = `${name}  ${process}`;
  const below = wrap(
    facts
      .map((fact) => fact.trim())
      .filter((fact) => fact !== '')
      .join('  '),
    width - INDENT,
  );
  return [
    ...withRight(styles.strong(name) + short.slice(name.length), widthOf(short.trimEnd()), outcome, { width, styles }),
    ...below.map((line) => ' '.repeat(INDENT) + styles.faint(line)),
  ];
}

/** A line with something faint at its right edge, or below where there is no room. */
function withRight(styled: string, taken: number, right: string, { width, styles }: Canvas): readonly string[] {
  if (right === '') return [styled];
  const room = width - taken - widthOf(right);
  if (room >= GAP) return [styled.trimEnd() + ' '.repeat(room + widthOfTrimmed(styled)) + styles.faint(right)];
  return [styled, ...wrap(right, width - INDENT).map((line) => ' '.repeat(INDENT) + styles.faint(line))];
}

/** Blanks at the end of a text. */
function widthOfTrimmed(text: string): number {
  return text.length - text.trimEnd().length;
}

/** Where the text of a finding begins: behind its kind and its grade. */
const TEXT_AT = INDENT + 6 + GAP + 7 + GAP;

function findingLines({ findings }: StepBlock, canvas: Canvas): readonly string[] {
  return findings.flatMap((finding) => drawFinding(finding, canvas));
}

function drawFinding({ word, level, lead, sentences, where }: Finding, canvas: Canvas): readonly string[] {
  const { width, styles } = canvas;
  const kind = padEnd(word, 6) + ' '.repeat(GAP) + padEnd(level ?? '', 7) + ' '.repeat(GAP);
  const strong =
    word === 'fail'
      ? styles.strong
      : word === 'pass' || word === 'open' || word === 'waived'
        ? styles.faint
        : styles.plain;
  // A note is not worth a hue.
  const begin = level === 'note' ? strong : styles.word[word];
  const room = width - TEXT_AT;
  const lines = [
    ...wrap(lead, room).map((line) => ({ line, style: strong })),
    ...sentences.flatMap(({ text, weight }) =>
      wrap(text, room).map((line) => ({ line, style: weight === 'detail' ? styles.faint : styles.plain })),
    ),
  ];
  const drawn = lines.map(({ line, style }, index) => {
    const indent = index === 0 ? ' '.repeat(INDENT) + begin(kind) : ' '.repeat(TEXT_AT);
    return indent + style(line);
  });
  return withWhere(drawn, widthOf(lines[0]?.line ?? ''), where, canvas);
}

/** Where a finding stands: at the right edge of its first line if there is room, else below. */
function withWhere(
  lines: readonly string[],
  firstWidth: number,
  where: readonly string[],
  { width, styles }: Canvas,
): readonly string[] {
  if (where.length === 0) return lines;
  const text = where.join('  ');
  const [first = '', ...rest] = lines;
  const room = width - TEXT_AT - firstWidth - widthOf(text);
  if (room >= GAP) return [first + ' '.repeat(room) + styles.faint(text), ...rest];
  return [...lines, ...wrap(text, width - TEXT_AT).map((line) => ' '.repeat(TEXT_AT) + styles.faint(line))];
}
