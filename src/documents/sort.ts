import { nearest } from '../units/suggest.ts';
import { quoted } from '../units/unit-fault.ts';

/** The sorts of document, as the first key of a file names them. */
export const SORTS = ['recipe', 'chamber', 'substances', 'process', 'site'] as const;
export type Sort = (typeof SORTS)[number];

/** The one version of every sort that this program reads. */
const VERSION = 1;

/**
 * Which sort of document a text is, told from its first key without parsing it: undefined where that key is not
 * `regimen`, so that the file is not ours; `unclear` where it is ours and reading it will tell what is wrong.
 */
export function sortOf(text: string): Sort | 'unclear' | undefined {
  const line = firstLine(text);
  const heading = line === undefined ? null : HEADING.exec(line);
  if (heading === null) return undefined;
  const word = heading[1] ?? '';
  return isSort(word) ? word : 'unclear';
}

export function isSort(word: string): word is Sort {
  return SORTS.some((sort) => sort === word);
}

/** The sort that a value of `regimen` names, or what is wrong with it. */
export function readHeading(value: unknown): Sort | { readonly found: string; readonly right: string } {
  if (typeof value !== 'string') return { found: 'regimen: no sort of document', right: CHOICE };
  const [word = '', version, ...more] = value.trim().split(/\s+/);
  const sort = isSort(word) ? word : nearest(word, SORTS);
  if (sort === undefined || !isSort(sort)) return { found: `regimen: ${quoted(value)}`, right: CHOICE };
  const right = `write ${sort} ${VERSION}`;
  if (word !== sort || more.length > 0 || version === undefined) return { found: `regimen: ${quoted(value)}`, right };
  if (version === String(VERSION)) return sort;
  return /^[1-9][0-9]*$/.test(version)
    ? { found: `regimen: ${quoted(value)} is newer than this program reads`, right: `${right}, or use a newer program` }
    : { found: `regimen: ${quoted(value)} has no such version`, right };
}

/** What the first line of a file may be. */
export const CHOICE = `start the file with regimen: recipe ${VERSION} (or ${SORTS.slice(1).join(', ')})`;

const HEADING = /^\s*\{?\s*["']?regimen["']?\s*:(?:\s+["']?([a-z]*)|$)/;

/** The first line that is not blank, a comment, a directive or the mark of a document's start. */
function firstLine(text: string): string | undefined {
  for (let start = text.startsWith('\uFEFF') ? 1 : 0; start < text.length;) {
    const end = text.indexOf('\n', start);
    const line = text.slice(start, Math.min(end === -1 ? text.length : end, start + LONGEST_LINE));
    if (!PASSED_OVER.test(line)) return line;
    if (end === -1) return undefined;
    start = end + 1;
  }
  return undefined;
}

const LONGEST_LINE = 200;
const PASSED_OVER = /^\s*(?:#.*|%.*|---\s*(?:#.*)?)?$/;
