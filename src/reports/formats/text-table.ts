import type { Column, Table } from '../page.ts';
import type { Canvas } from './text.ts';
import { padEnd, padStart, widthOf, wrap } from './wrap.ts';

const GAP = 2;
/** A column that wraps is not made narrower than this. */
const NARROWEST = 24;

/** A table as wide as its cells need. One too wide is drawn in pieces, each with the key columns. */
export function drawTable(table: Table, canvas: Canvas): readonly string[] {
  const widths = widthsOf(table, canvas.width);
  return piecesOf(table, widths, canvas.width).flatMap((piece, index) => [...(index === 0 ? [] : ['']), ...drawPiece(table, piece, widths, canvas)]);
}

function widthsOf({ columns, rows }: Table, width: number): readonly number[] {
  const natural = columns.map(({ title }, index) => rows.reduce((widest, row) => Math.max(widest, widthOf(row[index] ?? '')), widthOf(title)));
  const total = natural.reduce((sum, one) => sum + one + GAP, -GAP);
  if (total <= width) return natural;
  return natural.map((one, index) => (columns[index]?.wraps === true ? Math.max(NARROWEST, Math.min(one, one - (total - width))) : one));
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

function drawPiece({ columns, rows }: Table, piece: readonly number[], widths: readonly number[], { styles }: Canvas): readonly string[] {
  const chosen = piece.flatMap((index) => columns[index] ?? []);
  const sizes = piece.map((index) => widths[index] ?? 0);
  const title = drawRow(chosen.map((column) => column.title), chosen, sizes).map(styles.faint);
  return [...title, ...rows.flatMap((row) => drawRow(piece.map((index) => row[index] ?? ''), chosen, sizes))];
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
