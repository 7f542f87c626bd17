import { emptyAt } from './nodes.ts';
import { BLANK, isAtKey, isLineEnd, pastBlanks, readInline, readKey } from './ordinary-inline.ts';
import type { KeyNode, ListNode, MapNode, Node, NodePair } from './nodes.ts';
import type { Reader } from './ordinary-inline.ts';

/**
 * Reads a text of nothing but the ordinary at a fraction of the cost: maps and lists by indentation, in braces and in
 * brackets, texts on one line with and without quotes, comments. It knows no fault: of any other text it makes nothing,
 * and YAML's own reader judges it. What is read here reads the same there. Forbidden characters have been looked for.
 */
export function readOrdinary(text: string): Node | undefined {
  if (text.includes('\t')) return undefined;
  const reader: Reader = { text, at: 0, indent: 0 };
  toNextLine(reader);
  const root = reader.indent === 0 && isAtKey(reader) ? readMap(reader, 0, DEEPEST) : undefined;
  return reader.indent === NO_LINE ? root : undefined;
}

/** Deeper than any document; what is nested deeper still is not ordinary. */
const DEEPEST = 32;

/** Indentation behind the last line. */
const NO_LINE = -1;

/** The map whose first key is next, with all keys of its indentation. */
function readMap(reader: Reader, indent: number, depth: number): MapNode | undefined {
  const start = reader.at;
  const pairs: NodePair[] = [];
  let end = start;
  do {
    const key = readKey(reader);
    const value = key === undefined ? undefined : readValue(reader, key, indent, depth - 1);
    if (key === undefined || value === undefined) return undefined;
    pairs.push({ key, value });
    end = value.end;
  } while (reader.indent === indent);
  return reader.indent > indent ? undefined : { kind: 'map', start, end, pairs };
}

/** What stands behind a key, on its line or below it, where a text is not ordinary; a list may stand as far left as its key. */
function readValue(reader: Reader, key: KeyNode, indent: number, depth: number): Node | undefined {
  if (depth === 0) return undefined;
  if (!endLine(reader)) return readLine(reader, indent, depth);
  if (isAtDash(reader) && reader.indent >= indent) return readList(reader, reader.indent, depth);
  if (reader.indent <= indent) return emptyAt(key);
  if (isAtKey(reader)) return readMap(reader, reader.indent, depth);
  return isAtBracket(reader) ? readLine(reader, indent, depth) : undefined;
}

/** The list whose first dash is next, with all items of its indentation. */
function readList(reader: Reader, indent: number, depth: number): ListNode | undefined {
  const start = reader.at;
  const items: Node[] = [];
  let end = start;
  do {
    const item = readItem(reader, indent, depth - 1);
    if (item === undefined) return undefined;
    items.push(item);
    end = item.end;
  } while (reader.indent === indent && isAtDash(reader));
  return reader.indent > indent ? undefined : { kind: 'list', start, end, items };
}

/** What stands behind a dash, on its line; a map goes on below its first key. */
function readItem(reader: Reader, indent: number, depth: number): Node | undefined {
  if (depth === 0) return undefined;
  const dash = reader.at;
  reader.at = pastBlanks(reader.text, dash + 1);
  return isAtKey(reader) ? readMap(reader, indent + reader.at - dash, depth) : readLine(reader, indent, depth);
}

function isAtDash({ text, at }: Reader): boolean {
  return text.charCodeAt(at) === DASH && text.charCodeAt(at + 1) === BLANK;
}

function isAtBracket({ text, at }: Reader): boolean {
  return text.charAt(at) === '{' || text.charAt(at) === '[';
}

/** A value that starts on this line and ends its line: behind it stands nothing but a comment. */
function readLine(reader: Reader, indent: number, depth: number): Node | undefined {
  reader.at = pastBlanks(reader.text, reader.at);
  const value = readInline(reader, indent, depth);
  return value !== undefined && endLine(reader) ? value : undefined;
}

/** To the next line, if nothing but blanks and a comment follow on this one. */
function endLine(reader: Reader): boolean {
  const { text } = reader;
  const at = pastBlanks(text, reader.at);
  if (!isLineEnd(text, at) && (text.charCodeAt(at) !== HASH || at === reader.at)) return false;
  const end = text.indexOf('\n', at);
  reader.at = end === -1 ? text.length : end + 1;
  toNextLine(reader);
  return true;
}

/** From the start of a line to the first character of the next that is neither blank nor a comment. */
function toNextLine(reader: Reader): void {
  const { text } = reader;
  for (let start = reader.at; start < text.length;) {
    const at = pastBlanks(text, start);
    if (!isLineEnd(text, at) && text.charCodeAt(at) !== HASH) {
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

const HASH = 0x23;
const DASH = 0x2d;
