import { csvHeader, csvRows } from '../reports/formats/csv.ts';
import { drawMarkdown } from '../reports/formats/markdown.ts';
import { drawText } from '../reports/formats/text.ts';
import type { Block, Page } from '../reports/page.ts';
import type { Format } from './formats.ts';
import type { Style } from './style.ts';

/** A page in every format but JSON, which is made from results. A page of CSV is its rows. */
export function drawPage(page: Page, style: Style): string {
  return style.format === 'csv' ? csvRows(page.sheet()) : drawBlocks(page.blocks, style);
}

/** What stands once before the rows of all pages. */
export function drawHeader(page: Page, { format }: Style): string {
  return format === 'csv' ? csvHeader(page.sheet()) : '';
}

/** Blocks as a reader sees them; formats for programs have none. */
export function drawBlocks(blocks: readonly Block[], { format, width, colour }: Style): string {
  if (blocks.length === 0) return '';
  if (format === 'text') return drawText(blocks, { width, colour });
  return format === 'markdown' ? drawMarkdown(blocks) : '';
}

/** Whether a format has room for sentences: faults, cautions, sums. */
export function isProse(format: Format): boolean {
  return format === 'text' || format === 'markdown';
}
