import type { YAMLError } from 'yaml';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';

/**
 * Errors of YAML's syntax in our words. An error that leaves the rest readable is told wherever it occurs, once a line;
 * of those behind which nothing can be trusted only the first.
 */
export function syntaxFaults(source: Source, errors: readonly YAMLError[]): readonly Fault[] {
  const inOrder = [...errors].sort((a, b) => a.pos[0] - b.pos[0]);
  const faults: Fault[] = [];
  let line = 0;
  for (const error of inOrder) {
    const start = startOf(source.text, error);
    const place = source.place(start, Math.max(start + 1, error.pos[1]));
    if (place.line === line) continue;
    const passing = isPassing(source.text, error);
    if (!passing && faults.length > 0) break;
    faults.push({ place, ...wording(source.text, start, error) });
    if (!passing) break;
    line = place.line;
  }
  return faults;
}

interface Wording {
  readonly found: string;
  readonly right: string;
}

function isPassing(text: string, error: YAMLError): boolean {
  if (error.code === 'BLOCK_AS_IMPLICIT_KEY') return hasColon(lineFrom(text, error.pos[0]));
  return PASSING.has(error.code);
}

const PASSING: ReadonlySet<string> = new Set([
  'BAD_SCALAR_START',
  'TAG_RESOLVE_FAILED',
  'BAD_DQ_ESCAPE',
  'BLOCK_IN_FLOW',
]);

const QUOTES = 'put the text in quotes';

/** What is not closed is told where it opens, all else at its first character. */
function startOf(text: string, { pos, message }: YAMLError): number {
  const [start] = pos;
  const quote = /Missing closing (["'])/.exec(message)?.[1];
  if (quote !== undefined) return openingQuote(text, start, quote);
  const bracket = /end with a ([}\]])/.exec(message)?.[1];
  if (bracket !== undefined) return openingBracket(text, start);
  let first = start;
  while (text[first] === ' ') first += 1;
  return first;
}

/** The last quote that neither is escaped by a backslash nor stands for one within single quotes. */
function openingQuote(text: string, end: number, quote: string): number {
  let at = text.lastIndexOf(quote, end - 1);
  while (at > 0 && (text[at - 1] === '\\' || (quote === "'" && text[at - 1] === quote))) {
    at = text.lastIndexOf(quote, text[at - 1] === quote ? at - 2 : at - 1);
  }
  return Math.max(0, at);
}

function openingBracket(text: string, end: number): number {
  let closed = 0;
  for (let at = end - 1; at >= 0; at -= 1) {
    const character = text.charAt(at);
    if (character === '}' || character === ']') closed += 1;
    if (character !== '{' && character !== '[') continue;
    if (closed === 0) return at;
    closed -= 1;
  }
  return end;
}

function wording(text: string, start: number, { code, message }: YAMLError): Wording {
  const rest = lineFrom(text, start);
  switch (code) {
    case 'BLOCK_AS_IMPLICIT_KEY':
      if (/^-\s/.test(rest)) return listEntry;
      return hasColon(rest) ? colonInText : deeperLine;
    case 'BLOCK_IN_FLOW':
      return colonInText;
    case 'BAD_SCALAR_START':
      return { found: `a text that starts with ${rest.slice(0, 1)}`, right: QUOTES };
    case 'TAG_RESOLVE_FAILED':
      return { found: `the tag ${firstWord(rest)}`, right: `remove it, or ${QUOTES}` };
    case 'BAD_ALIAS':
    case 'ALIAS_PROPS':
    case 'MULTIPLE_ANCHORS':
    case 'MULTIPLE_TAGS':
    case 'BAD_PROP_ORDER':
      return { found: 'an anchor, alias or tag', right: `write the value itself, or ${QUOTES}` };
    case 'TAB_AS_INDENT':
      return { found: 'a tab in the indentation', right: 'indent with blanks' };
    case 'BAD_DQ_ESCAPE':
      return {
        found: `the escape ${firstWord(rest).slice(0, 2)} in a quoted text`,
        right: 'write \\\\ for a backslash, or use single quotes',
      };
    case 'BAD_INDENT':
      return badIndent(text, start, message);
    case 'MULTILINE_IMPLICIT_KEY':
      return withoutColon(rest);
    case 'KEY_OVER_1024_CHARS':
      return { found: 'a key of more than 1,024 characters', right: 'write a key and a colon' };
    case 'NON_STRING_KEY':
      return { found: 'a key that is a list or a map', right: 'write a name as the key' };
    case 'MISSING_CHAR':
      return missingCharacter(rest, message);
    default:
      return unexpected(rest, message);
  }
}

const colonInText: Wording = { found: 'a colon and a blank within a text', right: QUOTES };
const listEntry: Wording = { found: 'a list entry where a key is wanted', right: 'indent the list below its key' };
const deeperLine: Wording = {
  found: 'a value, and below it a line that is indented deeper',
  right: 'align the lines of one map, or leave the value behind the colon out',
};

/** Whether what follows on the line would be read as a key and a value. */
function hasColon(rest: string): boolean {
  return /:(\s|$)/.test(rest);
}

function badIndent(text: string, start: number, message: string): Wording {
  const open = /must be sufficiently indented and end with a ([}\]])/.exec(message)?.[1];
  if (open !== undefined) return unclosed(open);
  return text[start] === '-'
    ? { found: 'a list entry that is indented otherwise than those above', right: 'align the entries of a list' }
    : { found: 'a line that is indented otherwise than those above', right: 'align the keys of a map' };
}

function unclosed(bracket: string): Wording {
  const opening = bracket === '}' ? '{' : '[';
  return { found: `a ${opening} that is not closed`, right: `add ${bracket}` };
}

function withoutColon(rest: string): Wording {
  if (/^-\s/.test(rest)) return listEntry;
  const tight = /^([A-Za-z_][\w.-]*):(?=\S)/.exec(rest)?.[1];
  return tight === undefined
    ? { found: `${shortened(rest)} without a colon`, right: 'write a key, a colon and a value' }
    : { found: `no blank behind the colon of ${tight}`, right: `write ${tight}: and a blank` };
}

function missingCharacter(rest: string, message: string): Wording {
  const quote = /Missing closing ["'](.)?/.exec(message) === null ? undefined : message.includes('"') ? '"' : "'";
  if (quote !== undefined) return { found: 'a quote that is not closed', right: `add ${quote} at the end of the text` };
  const bracket = /end with a ([}\]])/.exec(message)?.[1];
  if (bracket !== undefined) return unclosed(bracket);
  if (message.startsWith('Comments')) return { found: 'a # right behind a value', right: 'put a blank before the #' };
  if (message.includes('Sequence item'))
    return { found: 'a line that is indented otherwise than those above', right: 'align the keys of a map' };
  if (message.includes('followed by map values')) return withoutColon(rest);
  if (message.includes('Missing ,'))
    return { found: `${shortened(rest)} within braces or brackets`, right: 'put a comma between two entries' };
  return unexpected(rest, message);
}

function unexpected(rest: string, message: string): Wording {
  if (message.includes('Block scalar header')) {
    return { found: 'text behind | or >', right: 'start the text on the next line' };
  }
  if (message.includes('at node end'))
    return { found: `${shortened(rest)} behind a closed value`, right: 'quote the whole text' };
  if (message.includes('empty item') || message.includes('Unexpected ,')) {
    return { found: 'a comma without a value before it', right: 'remove the comma' };
  }
  return { found: `${shortened(rest)} where it cannot stand`, right: 'check brackets, quotes and indentation here' };
}

function shortened(rest: string): string {
  const text = rest.trim();
  if (text === '') return 'the end of a line';
  return `'${text.length > 30 ? `${text.slice(0, 30)}…` : text}'`;
}

function firstWord(rest: string): string {
  return /^\S{0,40}/.exec(rest)?.[0] ?? '';
}

function lineFrom(text: string, start: number): string {
  const end = text.indexOf('\n', start);
  return text.slice(start, Math.min(end === -1 ? text.length : end, start + 200)).trimEnd();
}
