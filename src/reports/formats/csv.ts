import type { Sheet } from '../page.ts';

/** The header line of a sheet. */
export function csvHeader({ columns }: Pick<Sheet, 'columns'>): string {
  return csvLine(columns);
}

/** The rows of a sheet without its header, so that the parts of a run follow each other. */
export function csvRows({ rows }: Sheet): string {
  let text = '';
  for (const row of rows) text += csvLine(row);
  return text;
}

/** One record of RFC 4180, ended by CR LF. */
function csvLine(cells: readonly string[]): string {
  return `${cells.map(csvCell).join(',')}\r\n`;
}

/** A cell in quotes where it needs them. What a spreadsheet would take for a formula is set off by an apostrophe. */
function csvCell(text: string): string {
  const plain = FORMULA.test(text) && !NUMBER.test(text) ? `'${text}` : text;
  return QUOTED.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
}

const QUOTED = /[",\r\n]/;
const FORMULA = /^[=+\-@\t]/;
const NUMBER = /^-?\d/;
