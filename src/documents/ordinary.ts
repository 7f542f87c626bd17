import { emptyAt } from './nodes.ts';
import { plainScalar } from './plain-scalar.ts';
import type { KeyNode, ListNode, MapNode, Node, NodePair, ScalarNode } from './nodes.ts';

/**
 * Reads a text of nothing but the ordinary at a fraction of the cost: maps and lists by indentation, maps in braces and
 * lists in brackets, texts with and without quotes on one line, comments. It knows no fault: of any other text it makes
 * nothing, and YAML's own reader judges it. What it does read reads the same there.
 */
export function readOrdinary(text: string): Node | undefined {
  if (text.includes('\t') || text.includes('\r')) return undefined;
  const reader: Reader = { text, at: 0, indent: 0 };
  toNextLine(reader);
  const root = reader.indent === 0 ? readBlock(reader, DEEPEST) : undefined;
  return reader.indent === NO_LINE ? root : undefined;
}

/** Far deeper than any document; what is nested deeper still is not ordinary. */
const DEEPEST = 32;

interface Reader {
  readonly text: string;
  /** Offset of the next character to read. */
  at: number;
  /** Indentation of the line to read, where `at` is at its first character. */
  indent: number;
}

const NO_LINE = -1;

/** To the first character of the next line that is neither blank nor a comment; `at` is at the start of a line. */
function toNextLine(reader: Reader): void {
  const { text } = reader;
  for (let start = reader.at; start < text.length;) {
    const at = pastBlanks(text, start);
    const code = text.charCodeAt(at);
    if (code !== NEWLINE && code !== HASH && at < text.length) {
      reader.at = at;
      reader.indent = at - start;
      return;
    }
    const end = text.indexOf('\n', at);
    start = end === -1 ? text.length : end + 1;
  }
  reader.at = text.length;
  reader.indent = NO_LINE;
}

/** To the next line, where nothing but blanks and a comment follow on this one. */
function endLine(reader: Reader): boolean {
  const { text } = reader;
  const at = pastBlanks(text, reader.at);
  const code = text.charCodeAt(at);
  if (at < text.length && code !== NEWLINE && (code !== HASH || at === reader.at)) return false;
  const end = text.indexOf('\n', at);
  reader.at = end === -1 ? text.length : end + 1;
  toNextLine(reader);
  return true;
}

function pastBlanks(text: string, start: number): number {
  let at = start;
  while (text.charCodeAt(at) === BLANK) at += 1;
  return at;
}

const BLANK = 0x20;
const NEWLINE = 0x0a;
const HASH = 0x23;

/** The map or list that starts at the line to read, with all lines of its indentation. */
function readBlock(reader: Reader, depth: number): MapNode | ListNode | undefined {
  if (depth === 0) return undefined;
  return isAtDash(reader) ? readBlockList(reader, depth) : readBlockMap(reader, reader.indent, depth);
}

function readBlockMap(reader: Reader, indent: number, depth: number): MapNode | undefined {
  const start = reader.at;
  const pairs: NodePair[] = [];
  let end = start;
  do {
    const key = readKey(reader);
    const value = key === undefined ? undefined : readBlockValue(reader, key, indent, depth);
    if (key === undefined || value === undefined) return undefined;
    pairs.push({ key, value });
    end = value.end;
  } while (reader.indent === indent);
  return reader.indent > indent ? undefined : { kind: 'map', start, end, pairs };
}

/** What stands behind a key, on its line or below it. A list may stand as far left as its key. */
function readBlockValue(reader: Reader, key: KeyNode, indent: number, depth: number): Node | undefined {
  if (!endLine(reader)) return readRestOfLine(reader, indent, depth);
  if (reader.indent > indent) return readBlock(reader, depth - 1);
  return reader.indent === indent && isAtDash(reader) ? readBlockList(reader, depth - 1) : emptyAt(key);
}

/** The items at the indentation of the first. */
function readBlockList(reader: Reader, depth: number): ListNode | undefined {
  const { at: start, indent } = reader;
  const items: Node[] = [];
  let end = start;
  do {
    const item = readBlockItem(reader, indent, depth);
    if (item === undefined) return undefined;
    items.push(item);
    end = item.end;
  } while (reader.indent === indent && isAtDash(reader));
  return reader.indent > indent ? undefined : { kind: 'list', start, end, items };
}

function readBlockItem(reader: Reader, indent: number, depth: number): Node | undefined {
  const at = pastBlanks(reader.text, reader.at + 1);
  const inner = indent + at - reader.at;
  reader.at = at;
  KEY.lastIndex = at;
  if (!KEY.test(reader.text)) return readRestOfLine(reader, indent, depth);
  return depth === 1 ? undefined : readBlockMap(reader, inner, depth - 1);
}

function isAtDash({ text, at }: Reader): boolean {
  return text.charCodeAt(at) === DASH && text.charCodeAt(at + 1) === BLANK;
}

const DASH = 0x2d;

/** A key and its colon, if there is one here. */
function readKey(reader: Reader): KeyNode | undefined {
  const { text, at: start } = reader;
  KEY.lastIndex = start;
  if (!KEY.test(text)) return undefined;
  reader.at = KEY.lastIndex;
  const end = reader.at - 1;
  return { start, end, text: text.slice(start, end) };
}

const KEY = /[A-Za-z0-9_][\w.+-]{0,99}:(?=[ \n]|$)/y;

function readRestOfLine(reader: Reader, indent: number, depth: number): Node | undefined {
  reader.at = pastBlanks(reader.text, reader.at);
  const value = readFlowOrQuoted(reader, indent, depth) ?? readBlockPlain(reader);
  return value !== undefined && endLine(reader) ? value : undefined;
}

/** A text without quotes that ends with its line or before a comment. */
function readBlockPlain(reader: Reader): ScalarNode | undefined {
  const { text, at: start } = reader;
  if (!isPlainStart(text, start)) return undefined;
  const newline = text.indexOf('\n', start);
  const line = text.slice(start, newline === -1 ? text.length : newline);
  const comment = line.indexOf(' #');
  return endPlain(reader, comment === -1 ? line : line.slice(0, comment));
}
