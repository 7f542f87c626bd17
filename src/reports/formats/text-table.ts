import type { Column, Table } from '../page.ts';
import type { Canvas } from './text.ts';
import { padEnd, padStart, widthOf, wrap } from './wrap.ts';

const GAP = 2;
/** A column that wraps is not made narrower than this. */
const NARROWEST = 12;

/** A table as wide as its cells need. One too wide is drawn in pieces, each with the key columns. */
export function drawTable(table: Table, canvas: Canvas): readonly string[] {
  const widths = widthsOf(table, canvas.width);
  return piecesOf(table, widths, canvas.width).flatMap((piece, index) => [
    ...(index === 0 ? [] : ['']),
    ...drawPiece(table, piece, widths, canvas),
  ]);
}

/** What each column needs; where that is too much, the widest of those that wrap give way first. */
function widthsOf({ columns, rows }: Table, width: number): readonly number[] {
  const widths = columns.map(({ title }, index) =>
    rows.reduce((widest, row) => Math.max(widest, widthOf(row[index] ?? '')), widthOf(title)),
  );
  const floors = columns.map((_, index) =>
    rows.reduce((longest, row) => Math.max(longest, longestWord(row[index] ?? '')), NARROWEST),
  );
  let excess = widths.reduce((sum, one) => sum + one + GAP, -GAP) - width;
  while (excess > 0) {
    const widest = widestWrapping(columns, widths, floors);
    if (widest === undefined) break;
    widths[widest] = (widths[widest] ?? 0) - 1;
    excess -= 1;
  }
  return widths;
}

function longestWord(text: string): number {
  return text.split(' ').reduce((longest, word) => Math.max(longest, widthOf(word)), 0);
}

function widestWrapping(
  columns: readonly Column[],
  widths: readonly number[],
  floors: readonly number[],
): number | undefined {
  let found: number | undefined;
  for (const [index, { wraps }] of columns.entries()) {
    const width = widths[index] ?? 0;
    if (wraps === true && width > (floors[index] ?? 0) && width > (found === undefined ? 0 : (widths[found] ?? 0)))
      found = index;
  }
  return found;
}

/** Which columns stand together. */
function piecesOf({ columns, key }: Table, widths: readonly number[], width: number): readonly (readonly number[])[] {
  const keys = columns.map((_, index) => index).slice(0, key);
  const taken = keys.reduce((sum, index) => sum + (widths[index] ?? 0) + GAP, 0);
  const pieces: number[][] = [];
  let piece = [...keys];
  let room = width - taken;
  for (let index = key; index < columns.length; index += 1) {
    const needed = widths[index] ?? 0;
    if (needed > room && piece.length > key) {
      pieces.push(piece);
      piece = [...keys];
      room = width - taken;
    }
    piece.push(index);
    room -= needed + GAP;
  }
  return [...pieces, piece];
}

function drawPiece(
  { columns, rows }: Table,
  piece: readonly number[],
  widths: readonly number[],
  { styles }: Canvas,
): readonly string[] {
  const chosen = piece.flatMap((index) => columns[index] ?? []);
  const sizes = piece.map((index) => widths[index] ?? 0);
  const title = drawRow(
    chosen.map((column) => column.title),
    chosen,
    sizes,
  ).map(styles.faint);
  return [
    ...title,
    ...rows.flatMap((row) =>
      drawRow(
        piece.map((index) => row[index] ?? ''),
        chosen,
        sizes,
      ),
    ),
  ];
}

/** A row of cells, of as many lines as its longest cell needs. */
function drawRow(cells: readonly string[], columns: readonly Column[], widths: readonly number[]): readonly string[] {
  const broken = cells.map((cell, index) => (columns[index]?.wraps === true ? wrap(cell, widths[index] ?? 0) : [cell]));
  const height = Math.max(...broken.map((lines) => lines.length));
  return Array.from({ length: height }, (_, line) =>
    broken.map((lines, index) => aligned(lines[line] ?? '', columns[index], widths[index] ?? 0)).join(' '.repeat(GAP)),
  );
}

function aligned(text: string, column: Column | undefined, width: number): string {
  return column?.align === 'right' ? padStart(text, width) : padEnd(text, width);
}
