import { plainValueOf } from './plain-scalar.ts';
import type { KeyNode, ListNode, MapNode, Node, NodePair, ScalarNode } from './nodes.ts';

/** Where a reader of ordinary text is. */
export interface Reader {
  readonly text: string;
  /** Offset of the next character to read. */
  at: number;
  /** Indentation of the line to read, where `at` is at its first character. */
  indent: number;
}

/** A value behind a key or a dash: in braces, brackets or quotes, or plain up to a comment or the end of the line. */
export function readInline(reader: Reader, indent: number, depth: number): Node | undefined {
  return readEnclosed(reader, indent, depth, readLinePlain);
}

/** A key and its colon, if there is one here. */
export function readKey(reader: Reader): KeyNode | undefined {
  if (!isAtKey(reader)) return undefined;
  const { text, at: start } = reader;
  const end = KEY.lastIndex - 1;
  reader.at = end + 1;
  return { start, end, text: text.slice(start, end) };
}

export function isAtKey({ text, at }: Reader): boolean {
  KEY.lastIndex = at;
  return KEY.test(text);
}

const KEY = /[A-Za-z0-9_][\w.+-]{0,99}:(?=[ \r\n]|$)/y;

export function pastBlanks(text: string, start: number): number {
  let at = start;
  while (text.charCodeAt(at) === BLANK) at += 1;
  return at;
}

export function isLineEnd(text: string, at: number): boolean {
  const code = text.charCodeAt(at);
  return code === NEWLINE || code === RETURN || at >= text.length;
}

export const BLANK = 0x20;
const NEWLINE = 0x0a;
const RETURN = 0x0d;

type PlainReader = (reader: Reader) => ScalarNode | undefined;

function readEnclosed(reader: Reader, indent: number, depth: number, plain: PlainReader): Node | undefined {
  if (depth === 0) return undefined;
  switch (reader.text.charAt(reader.at)) {
    case '{':
      return readBraces(reader, indent, depth);
    case '[':
      return readBrackets(reader, indent, depth);
    case '"':
      return readQuoted(reader, '"');
    case "'":
      return readQuoted(reader, "'");
    default:
      return plain(reader);
  }
}

function readBraces(reader: Reader, indent: number, depth: number): MapNode | undefined {
  const start = reader.at;
  const pairs: NodePair[] = [];
  for (let more = opens(reader, indent, '}'); more; more = goesOn(reader, indent, '}')) {
    const key = readKey(reader);
    if (key === undefined) return undefined;
    skip(reader, indent);
    const value = readEnclosed(reader, indent, depth - 1, readFlowPlain);
    if (value === undefined) return undefined;
    pairs.push({ key, value });
  }
  return closes(reader, '}') ? { kind: 'map', start, end: reader.at, pairs } : undefined;
}

function readBrackets(reader: Reader, indent: number, depth: number): ListNode | undefined {
  const start = reader.at;
  const items: Node[] = [];
  for (let more = opens(reader, indent, ']'); more; more = goesOn(reader, indent, ']')) {
    const item = readEnclosed(reader, indent, depth - 1, readFlowPlain);
    if (item === undefined) return undefined;
    items.push(item);
  }
  return closes(reader, ']') ? { kind: 'list', start, end: reader.at, items } : undefined;
}

/** Past the opening brace or bracket; whether there is anything in it. */
function opens(reader: Reader, indent: number, closing: string): boolean {
  reader.at += 1;
  skip(reader, indent);
  return reader.text.charAt(reader.at) !== closing;
}

/** Past a comma; whether anything follows it. */
function goesOn(reader: Reader, indent: number, closing: string): boolean {
  skip(reader, indent);
  return reader.text.charAt(reader.at) === ',' && opens(reader, indent, closing);
}

function closes(reader: Reader, closing: string): boolean {
  if (reader.text.charAt(reader.at) !== closing) return false;
  reader.at += 1;
  return true;
}

/** Past blanks and line ends. A line within braces or brackets that is not indented deeper than its key is not ordinary. */
function skip(reader: Reader, indent: number): void {
  const { text } = reader;
  let at = pastBlanks(text, reader.at);
  let deep = true;
  while (at < text.length && isLineEnd(text, at)) {
    const start = text.charCodeAt(at) === RETURN ? at + 2 : at + 1;
    at = pastBlanks(text, start);
    deep = at - start > indent;
  }
  reader.at = deep ? at : text.length;
}

/** A text in quotes on one line, without escapes. */
function readQuoted(reader: Reader, quote: string): ScalarNode | undefined {
  const { text, at: start } = reader;
  const close = text.indexOf(quote, start + 1);
  if (close === -1) return undefined;
  const source = text.slice(start + 1, close);
  if (source.includes('\n') || (quote === '"' && source.includes('\\'))) return undefined;
  reader.at = close + 1;
  return { kind: 'scalar', start, end: close + 1, value: source, source };
}

function readLinePlain(reader: Reader): ScalarNode | undefined {
  const { text, at: start } = reader;
  const newline = text.indexOf('\n', start);
  const end = newline === -1 ? text.length : newline;
  const line = text.slice(start, end);
  const comment = line.indexOf(' #');
  return plainScalar(reader, comment === -1 ? end : start + comment);
}

function readFlowPlain(reader: Reader): ScalarNode | undefined {
  FLOW_TEXT.lastIndex = reader.at;
  return FLOW_TEXT.test(reader.text) ? plainScalar(reader, FLOW_TEXT.lastIndex) : undefined;
}

/** Up to what ends a text within braces or brackets; a colon, or a sign that may start a comment, is not ordinary there. */
const FLOW_TEXT = /[^,[\]{}:#\r\n]+(?=[,\]}\r\n])/y;

/** The text without quotes that ends at an offset, or in the blanks before it. */
function plainScalar(reader: Reader, limit: number): ScalarNode | undefined {
  const { text, at: start } = reader;
  let end = limit;
  while (end > start && (text.charCodeAt(end - 1) === BLANK || isLineEnd(text, end - 1))) end -= 1;
  const source = text.slice(start, end);
  if (!PLAIN.test(source) || source.includes(': ')) return undefined;
  const value = plainValueOf(source);
  if (value === undefined) return undefined;
  reader.at = end;
  return { kind: 'scalar', start, end, value, source };
}

/** Starts with no sign that means something in YAML, except for a minus before a number, and does not end in a colon. */
const PLAIN = /^(?:[^-?:,[\]{}#&*!|>'"%@`\s]|-[0-9.])(?:.*[^:])?$/;
