import type { Block, Chain, Entries, Finding, RecipeHead, StepBlock, Steps, Table } from '../page.ts';
import { padEnd, padStart, widthOf } from './wrap.ts';

/** Blocks as Markdown that pastes into a change request and reads well as plain text. */
export function drawMarkdown(blocks: readonly Block[]): string {
  return blocks.map((block) => `${drawBlock(block).join('\n')}\n\n`).join('');
}

function drawBlock(block: Block): readonly string[] {
  switch (block.kind) {
    case 'heading':
      return [`## ${escaped(block.text)}`, ...(block.aside === undefined ? [] : ['', escaped(block.aside)])];
    case 'recipe':
      return drawRecipe(block);
    case 'steps':
      return drawSteps(block);
    case 'table':
      return drawTable(block);
    case 'entries':
      return drawEntries(block);
    case 'chain':
      return drawChain(block);
    case 'sentence':
      return [escaped(block.text)];
    case 'note':
      return [`**Note:** ${escaped(block.text)}`];
    case 'caution':
      return [`**Caution:** ${escaped(block.text)}`];
    case 'fault':
      return [`- **fault** \`${block.where}\`: ${escaped(block.found)}; ${escaped(block.right)}`];
  }
}

function drawRecipe({ name, revision, chamber, file, size, outcome }: RecipeHead): readonly string[] {
  const facts = [
    ...(revision === undefined ? [] : [`rev ${revision}`]),
    `chamber ${chamber}`,
    ...size,
    ...(outcome === undefined ? [] : [outcome]),
  ];
  return [`## ${escaped(name)}`, '', `${file === undefined ? '' : `\`${file}\`: `}${escaped(facts.join(', '))}`];
}

/** Steps as a table, then what was found in each. */
function drawSteps({ steps }: Steps): readonly string[] {
  const columns = [
    RIGHT('#'),
    LEFT('step'),
    LEFT('process'),
    RIGHT('time'),
    RIGHT('pressure'),
    LEFT('flows'),
    LEFT('outcome'),
  ];
  const rows = steps.map((step) =>
    step.kind === 'cycle'
      ? ['', step.path, '', step.repeat, '', '', '']
      : [String(step.number), step.path, step.process, step.time, step.pressure, step.flows, outcomeOf(step)],
  );
  return [
    ...drawTable({ kind: 'table', columns, rows, key: 0 }),
    ...steps.flatMap((step) => (step.kind === 'cycle' ? [] : drawFindings(step))),
  ];
}

const LEFT = (title: string) => ({ title, align: 'left' as const });
const RIGHT = (title: string) => ({ title, align: 'right' as const });

function outcomeOf({ outcome, findings }: StepBlock): string {
  if (findings.length === 0) return outcome.join(', ');
  return findings.map(({ word, lead }) => (word === 'pass' ? `pass ${lead}` : word)).join(', ');
}

function drawFindings({ number, path, findings }: StepBlock): readonly string[] {
  const told = findings.filter(({ word }) => word !== 'pass');
  if (told.length === 0) return [];
  return ['', `### ${number} ${escaped(path)}`, '', ...told.flatMap(drawFinding)];
}

function drawFinding({ word, level, lead, sentences, where }: Finding): readonly string[] {
  const grade = level === undefined ? '' : ` (${level})`;
  return [
    `- **${word}**${grade}: ${escaped(lead)} (${escaped(where.join(', '))})`,
    ...sentences.map(({ text }) => `  ${escaped(text)}`),
  ];
}

function drawTable({ columns, rows }: Omit<Table, 'key'> & { readonly key: number }): readonly string[] {
  const cells = rows.map((row) => columns.map((_, index) => inCell(row[index] ?? '')));
  const widths = columns.map(({ title }, index) =>
    Math.max(3, widthOf(inCell(title)), ...cells.map((row) => widthOf(row[index] ?? ''))),
  );
  const line = (texts: readonly string[]): string =>
    `| ${texts.map((text, index) => (columns[index]?.align === 'right' ? padStart : padEnd)(text, widths[index] ?? 0)).join(' | ')} |`;
  const rule = columns.map(({ align }, index) =>
    align === 'right' ? `${'-'.repeat((widths[index] ?? 3) - 1)}:` : '-'.repeat(widths[index] ?? 3),
  );
  return [line(columns.map(({ title }) => inCell(title))), line(rule), ...cells.map(line)];
}

function drawEntries({ entries }: Entries): readonly string[] {
  return entries.flatMap(({ name, aside, lines }) => [
    `- **${escaped(name)}**${aside === undefined ? '' : ` ${escaped(aside)}`}`,
    ...lines.map(({ text }) => `  ${escaped(text)}`),
  ]);
}

function drawChain({ links }: Chain): readonly string[] {
  return links.flatMap(({ number, symbol, name, value, si, from, grounds, remarks }) => {
    const sources = [grounds, from.length === 0 ? '' : `from ${from.join(', ')}`, ...remarks].filter(
      (text) => text !== '',
    );
    const named = name === '' ? `\`${symbol}\`` : `${escaped(symbol)} (${escaped(name)})`;
    return [
      `${number}. ${named} = ${escaped(value)}${si === undefined ? '' : ` = ${escaped(si)}`}`,
      ...sources.map((text) => `   ${escaped(text)}`),
    ];
  });
}

/** Characters that Markdown would take for marks. A hyphen, an underscore within a word and a dot mean nothing where these texts use them. */
function escaped(text: string): string {
  return text.replace(MARKS, '\\$&');
}

const MARKS = /[\\`*<>[\]|]|(?<![A-Za-z0-9])_|_(?![A-Za-z0-9])/g;

function inCell(text: string): string {
  return escaped(text).replace(/\s+/g, ' ').trim();
}
