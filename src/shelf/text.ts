import { isUtf8 } from 'node:buffer';
import { failure, success, wholeFile } from './fault.ts';
import { Source } from './place.ts';
import type { Fault, Outcome } from './fault.ts';

/** The largest text that is read where nothing else is said: 1 MiB. */
export const SIZE_LIMIT = 2 ** 20;

/**
 * The text that the bytes spell in UTF-8, without its byte order mark. Another encoding is a fault that
 * names the first byte that does not fit.
 */
export function decoded(file: string, bytes: Buffer): Outcome<Source> {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return failure(utf16Fault(file, 'FF FE'));
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return failure(utf16Fault(file, 'FE FF'));
  const body = bytes.subarray(markLength(bytes));
  if (!isUtf8(body)) return failure(badByteFault(file, body));
  return checked(file, body.toString('utf8'));
}

/** A text that is at hand already, held to the same rules. */
export function checkedText(file: string, text: string, sizeLimit: number): Outcome<Source> {
  if (text.length * LONGEST_UNIT > sizeLimit) {
    const size = Buffer.byteLength(text);
    if (size > sizeLimit) return failure(sizeFault(file, size, sizeLimit));
  }
  return checked(file, text.startsWith('\uFEFF') ? text.slice(1) : text);
}

/** "a size of 48 MiB", "at most 1 MiB". Where the size is not known the text is just too long. */
export function sizeFault(file: string, size: number | undefined, limit: number): Fault {
  const found = size === undefined ? `more than ${bytesInWords(limit)} of text` : `a size of ${bytesInWords(size)}`;
  return { place: wholeFile(file), found, right: `at most ${bytesInWords(limit)}; split the document` };
}

/** Bytes of UTF-8 that one UTF-16 unit takes at most. */
const LONGEST_UNIT = 3;

function markLength(bytes: Buffer): number {
  return bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf ? 3 : 0;
}

function checked(file: string, text: string): Outcome<Source> {
  const source = new Source(file, text);
  const at = text.indexOf('\0');
  if (at === -1) return success(source);
  return failure({
    place: plainPlace(source, at),
    found: 'a NUL character',
    right: 'plain text in UTF-8; this may be a binary file, or UTF-16 without its mark',
  });
}

function utf16Fault(file: string, mark: string): Fault {
  return { place: wholeFile(file), found: `text in UTF-16 (its mark is ${mark})`, right: 'save it as UTF-8' };
}

function badByteFault(file: string, bytes: Buffer): Fault {
  const text = bytes.toString('utf8');
  const { index, byte } = firstBadByte(bytes, text);
  const code = byte.toString(16).toUpperCase().padStart(2, '0');
  return {
    place: plainPlace(new Source(file, text), index),
    found: `the byte ${code}, which is not UTF-8`,
    right: 'save it as UTF-8',
  };
}

/**
 * Where decoding first put a replacement character that is not in the bytes. Up to there text and bytes agree, so the
 * length of the one tells the place in the other.
 */
function firstBadByte(bytes: Buffer, text: string): { readonly index: number; readonly byte: number } {
  let index = 0;
  let offset = 0;
  for (;;) {
    const next = text.indexOf('\uFFFD', index);
    offset += Buffer.byteLength(text.slice(index, next));
    const written = bytes[offset] === 0xef && bytes[offset + 1] === 0xbf && bytes[offset + 2] === 0xbd;
    if (next === -1 || !written) return { index: next, byte: bytes[offset] ?? 0 };
    index = next + 1;
    offset += 3;
  }
}

/** A place that does not keep the text. */
function plainPlace(source: Source, offset: number): Fault['place'] {
  const { file, line, column } = source.place(offset);
  return { file, line, column };
}

function bytesInWords(size: number): string {
  if (size < 1024) return `${size} bytes`;
  const [value, unit] = size < 2 ** 20 ? [size / 1024, 'KiB'] : [size / 2 ** 20, 'MiB'];
  return `${value < 10 && !Number.isInteger(value) ? value.toFixed(1) : Math.round(value)} ${unit}`;
}
