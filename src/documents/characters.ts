import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';

/**
 * Characters that no document may hold, comments included, since a reader cannot see what they do: control characters,
 * a carriage return without its line feed, marks of writing direction, line separators, characters without width.
 */
export function forbiddenCharacters(source: Source): readonly Fault[] {
  const faults: Fault[] = [];
  for (const match of matches(source.text, FORBIDDEN)) {
    const code = source.text.charCodeAt(match);
    const what = code === CARRIAGE_RETURN ? 'a carriage return without a line feed' : characterName(code);
    const right = code === CARRIAGE_RETURN ? 'end lines with a line feed' : 'remove it';
    faults.push({ place: source.place(match, match + 1), found: `${what} in the text`, right });
  }
  return faults;
}

/** Blanks that YAML does not take for blanks, where they stand outside of comments. */
export function oddBlanks(source: Source): readonly Fault[] {
  const faults: Fault[] = [];
  for (const match of matches(source.text, ODD_BLANK)) {
    const line = source.text.slice(source.text.lastIndexOf('\n', match) + 1, match);
    if (/(?:^|\s)#/.test(line)) continue;
    const found = `${characterName(source.text.charCodeAt(match))} where a blank is wanted`;
    faults.push({ place: source.place(match, match + 1), found, right: 'write a plain blank' });
  }
  return faults;
}

/** The first character of a key that a reader would take for another or for nothing. */
export function oddCharacter(key: string): string | undefined {
  const match = ODD_IN_KEY.exec(key);
  return match === null ? undefined : characterName(key.charCodeAt(match.index));
}

/** Whether a text that was written with escapes holds a control character. */
export function hasControl(text: string): boolean {
  return CONTROL.test(text);
}

const CARRIAGE_RETURN = 0x0d;

const CONTROL = /[\0-\x08\x0b-\x1f\x7f-\x9f\u2028\u2029\u202a-\u202e\u2066-\u2069]/;
const FORBIDDEN =
  /[\0-\x08\x0b\x0c\x0e-\x1f\x7f-\x9f\u00ad\u061c\u200b-\u200f\u2028-\u202e\u2060-\u2069\ufeff\ufff9-\ufffb]|\r(?!\n)/g;

const DIRECTION = /[\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069]/;
const ODD_BLANK = /[\u00a0\u1680\u2000-\u200a\u202f\u205f\u3000]/g;
const ODD_IN_KEY = /[\u00a0\u1680\u2000-\u200a\u202f\u205f\u3000\u2010-\u2015\u2212\uff01-\uff5e]/;

const NAMES: ReadonlyMap<number, string> = new Map([
  [0x00, 'a NUL character'],
  [0x7f, 'a delete character'],
  [0x85, 'a next-line character'],
  [0xa0, 'a no-break blank'],
  [0xad, 'a soft hyphen'],
  [0x2028, 'a line separator'],
  [0x2029, 'a paragraph separator'],
  [0x200b, 'a blank without width'],
  [0x2212, 'a typographic minus sign'],
  [0xfeff, 'a byte order mark'],
]);

function characterName(code: number): string {
  const name = NAMES.get(code) ?? groupName(code);
  return `${name} (U+${code.toString(16).toUpperCase().padStart(4, '0')})`;
}

function groupName(code: number): string {
  if (code < 0xa0) return 'a control character';
  if (code >= 0x2010 && code <= 0x2015) return 'a typographic dash';
  if (DIRECTION.test(String.fromCharCode(code))) return 'a mark of writing direction';
  if (code >= 0xff01 && code <= 0xff5e) return 'a full-width character';
  if (ODD_IN_KEY.test(String.fromCharCode(code))) return 'a blank of another width';
  return 'an invisible character';
}

function* matches(text: string, pattern: RegExp): Generator<number> {
  pattern.lastIndex = 0;
  for (let match = pattern.exec(text); match !== null; match = pattern.exec(text)) {
    const next = pattern.lastIndex;
    yield match.index;
    pattern.lastIndex = next;
  }
  pattern.lastIndex = 0;
}
