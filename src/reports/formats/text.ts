import type { Block, Entries, FaultLine, Heading, RecipeHead, Remark, Sentence } from '../page.ts';
import { stylesFor, type ColourLevel, type Styles } from './style.ts';
import { drawChain } from './text-chain.ts';
import { drawSteps } from './text-steps.ts';
import { drawTable } from './text-table.ts';
import { padEnd, widthOf, wrap } from './wrap.ts';

export type { ColourLevel } from './style.ts';

export interface TextOptions {
  /** Columns to fill. */
  readonly width: number;
  readonly colour: ColourLevel;
}

/** How one block is drawn: into how many columns, in which styles. */
export interface Canvas {
  readonly width: number;
  readonly styles: Styles;
}

/** Longer lines are hard to follow however wide the terminal is; in shorter ones nothing fits. */
const WIDEST = 132;
const NARROWEST = 40;

/** Blocks as lines for a terminal, each ended by a line feed. */
export function drawText(blocks: readonly Block[], { width, colour }: TextOptions): string {
  const canvas = { width: Math.max(NARROWEST, Math.min(WIDEST, width)), styles: stylesFor(colour) };
  let text = '';
  for (const block of blocks) for (const line of drawBlock(block, canvas)) text += `${line.trimEnd()}\n`;
  return text;
}

/** What stands between two texts that follow each other: texts of one line each are a list. */
export function gapBetween(before: string, after: string): string {
  return before === '' || after === '' || (isOneLine(before) && isOneLine(after)) ? '' : '\n';
}

function isOneLine(text: string): boolean {
  return text.indexOf('\n') >= text.length - 1;
}

function drawBlock(block: Block, canvas: Canvas): readonly string[] {
  switch (block.kind) {
    case 'heading':
      return drawHeading(block, canvas);
    case 'recipe':
      return drawRecipe(block, canvas);
    case 'steps':
      return drawSteps(block, canvas);
    case 'table':
      return drawTable(block, canvas);
    case 'entries':
      return drawEntries(block, canvas);
    case 'chain':
      return drawChain(block, canvas);
    case 'sentence':
      return drawSentence(block, canvas);
    case 'note':
    case 'caution':
      return drawRemark(block, canvas);
    case 'fault':
      return drawFault(block, canvas);
  }
}

function drawHeading({ text, aside }: Heading, { width, styles }: Canvas): readonly string[] {
  const beside = aside === undefined ? '' : `   ${aside}`;
  if (widthOf(text + beside) <= width) return [styles.strong(text) + styles.faint(beside)];
  return [styles.strong(text), ...wrap(beside.trim(), width).map(styles.faint)];
}

/** Name, revisions and file to the left, size and outcome to the right; what finds no room stands below. */
function drawRecipe(
  { name, revision, chamber, file, size, outcome }: RecipeHead,
  { width, styles }: Canvas,
): readonly string[] {
  const facts = [...(revision === undefined ? [] : [`rev ${revision}`]), chamber];
  const right = [...size, ...(outcome === undefined ? [] : [outcome])].join(GAP);
  const bare = [name, ...facts].join(GAP);
  const full = file === undefined ? bare : `${bare}${GAP}${file}`;
  const head = (left: string): string => styles.strong(name) + styles.faint(left.slice(name.length));
  const line = (left: string): string => head(left) + ' '.repeat(width - widthOf(left) - widthOf(right)) + right;
  const below = (text: string | undefined): readonly string[] =>
    text === undefined ? [] : wrap(text, width - 4).map((one) => `    ${styles.faint(one)}`);
  const room = width - widthOf(right) - GAP.length;
  if (widthOf(full) <= room) return [line(full)];
  if (widthOf(bare) <= room) return [line(bare), ...below(file)];
  return [
    ...wrap(bare, width).map((one, index) => (index === 0 ? head(one) : styles.faint(one))),
    ...below(right),
    ...below(file),
  ];
}

const GAP = '   ';

function drawSentence({ text, weight }: Sentence, { width, styles }: Canvas): readonly string[] {
  const lines = wrap(text, width);
  return weight === 'detail' ? lines.map(styles.faint) : lines;
}

function drawRemark({ kind, text }: Remark, canvas: Canvas): readonly string[] {
  return underWord(kind, canvas.styles.word[kind], text, canvas);
}

/** The place in one line, so that an editor or a search finds it; below it what was found and what would be right. */
function drawFault({ where, found, right }: FaultLine, canvas: Canvas): readonly string[] {
  const { styles, width } = canvas;
  const indent = ' '.repeat(WORD_WIDTH);
  const below = wrap(`${found}; ${right}`, width - WORD_WIDTH).map((line) => indent + line);
  return [`${styles.word.fault(padEnd('fault', WORD_WIDTH))}${styles.strong(where)}`, ...below];
}

const WORD_WIDTH = 9;

function underWord(word: string, style: (text: string) => string, text: string, { width }: Canvas): readonly string[] {
  return wrap(text, width - WORD_WIDTH).map(
    (line, index) => (index === 0 ? style(padEnd(word, WORD_WIDTH)) : ' '.repeat(WORD_WIDTH)) + line,
  );
}

function drawEntries({ entries }: Entries, { width, styles }: Canvas): readonly string[] {
  return entries.flatMap(({ name, aside = '', lines }) => [
    styles.strong(name) + (aside === '' ? '' : `   ${aside}`),
    ...lines.flatMap(({ text, weight }) =>
      wrap(text, width - 4).map((line) => `    ${weight === 'detail' ? styles.faint(line) : line}`),
    ),
  ]);
}
