import { isDigit, numberEnd } from './number.ts';
import { plainUnit, skipBlanks } from './spelling.ts';
import { needed, quoted } from './unit-fault.ts';
import type { Dimensions } from './dimensions.ts';
import type { UnitFault } from './unit-fault.ts';

/** Why no number starts the text. */
export function noNumberFault(text: string, dimensions: Dimensions): UnitFault {
  const right = needed(dimensions);
  const word = text.trim();
  if (word === '') return { found: 'an empty value', right };
  if (NOT_FINITE.has(word.toLowerCase().replace(/^[-+]/, ''))) {
    return { found: `${quoted(text)} is no measurable number`, right: `a finite number; ${right}` };
  }
  return { found: `${quoted(text)} does not start with a number`, right: `a number, then its unit; ${right}` };
}

/** What is wrong with the way the number from `start` to `end` goes on, if that is what is wrong. */
export function spoiltNumberFault(text: string, start: number, end: number): UnitFault | undefined {
  return (
    commaFault(text, start, end) ??
    underscoreFault(text, start, end) ??
    otherBaseFault(text, start, end) ??
    powerOfTenFault(text, start, end) ??
    secondNumberFault(text, start, end)
  );
}

/** Characters that look like plain ones: dashes for the minus sign, full-width letters and digits. */
export function lookAlikeFault(text: string): UnitFault | undefined {
  for (let at = 0; at < text.length; at += 1) {
    const code = text.charCodeAt(at);
    if (code < 0x80) continue;
    if (DASHES.has(code)) return dashFault(text, at, code);
    if (isFullWidth(code)) {
      return { found: `${quoted(text)} has full-width characters`, right: `write ${narrow(text)}` };
    }
  }
  return undefined;
}

const NOT_FINITE: ReadonlySet<string> = new Set(['nan', '.nan', 'inf', '.inf', 'infinity']);

/** Hyphen, non-breaking hyphen, figure dash, en dash, em dash, bar, minus sign, small hyphen-minus. */
const DASHES: ReadonlySet<number> = new Set([0x2010, 0x2011, 0x2012, 0x2013, 0x2014, 0x2015, 0x2212, 0xfe63]);

const FULL_WIDTH_OFFSET = 0xfee0;

function dashFault(text: string, at: number, code: number): UnitFault {
  const before = text.slice(0, at).trimEnd();
  const between = isDigit(before.charCodeAt(before.length - 1)) && isDigit(text.charCodeAt(skipBlanks(text, at + 1)));
  const limits = between ? ', or limits as at_least and at_most' : '';
  return {
    found: `${quoted(text)} has the dash U+${code.toString(16).toUpperCase()}`,
    right: `write the minus sign of the keyboard, -${limits}`,
  };
}

function isFullWidth(code: number): boolean {
  return code >= 0xff01 && code <= 0xff5e;
}

function narrow(text: string): string {
  return Array.from(text, (character) => {
    const code = character.codePointAt(0) ?? 0;
    return isFullWidth(code) ? String.fromCodePoint(code - FULL_WIDTH_OFFSET) : character;
  }).join('');
}

function commaFault(text: string, start: number, end: number): UnitFault | undefined {
  if (text[end] !== ',' || !isDigit(text.charCodeAt(end + 1))) return undefined;
  const last = endOfDigits(text, end + 1);
  const whole = text.slice(start, end);
  const after = text.slice(end + 1, last);
  const grouped = after.length === 3 ? ` for a decimal comma, ${whole}${after} if it groups digits` : '';
  return { found: `${quoted(text)} has a comma in its number`, right: `write ${whole}.${after}${grouped}` };
}

function underscoreFault(text: string, start: number, end: number): UnitFault | undefined {
  if (text[end] !== '_') return undefined;
  let last = end;
  while (text[last] === '_' || isDigit(text.charCodeAt(last))) last += 1;
  const plain = text.slice(start, last).replaceAll('_', '');
  return { found: `${quoted(text)} has an underscore in its number`, right: `write ${plain}` };
}

function otherBaseFault(text: string, start: number, end: number): UnitFault | undefined {
  const letter = text[end]?.toLowerCase() ?? '';
  if (text.slice(start, end) !== '0' || !'xob'.includes(letter) || letter === '') return undefined;
  let last = end + 1;
  while (isHexDigit(text.charCodeAt(last))) last += 1;
  const value = Number(`0${letter}${text.slice(end + 1, last)}`);
  if (last === end + 1 || !Number.isFinite(value)) return undefined;
  return { found: `${quoted(text)} is not a decimal number`, right: `write ${value}` };
}

function isHexDigit(code: number): boolean {
  const lower = code | 0x20;
  return isDigit(code) || (lower >= 0x61 && lower <= 0x66);
}

/** `4 x 10^10`, `4×10¹⁰`, `4·10^10`. */
function powerOfTenFault(text: string, start: number, end: number): UnitFault | undefined {
  const sign = skipBlanks(text, end);
  if (sign === text.length || !'×xX*·⋅'.includes(text[sign] ?? '')) return undefined;
  const ten = skipBlanks(text, sign + 1);
  if (!text.startsWith('10', ten)) return undefined;
  const exponent = plainUnit(text.slice(ten + 2));
  const last = numberEnd(exponent, 0);
  if (last === 0) return undefined;
  const right = `write ${text.slice(start, end)}e${Number(exponent.slice(0, last))}`;
  return { found: `${quoted(text)} has a power of ten`, right };
}

function secondNumberFault(text: string, start: number, end: number): UnitFault | undefined {
  const next = skipBlanks(text, end);
  const word = BETWEEN.find((between) => text.startsWith(between, next)) ?? '';
  const at = skipBlanks(text, next + word.length);
  const last = numberEnd(text, at);
  if (last === at || (text[last] === '/' && word === '')) return undefined;
  const [first, second] = [text.slice(start, end), text.slice(at, last)];
  const found = `${quoted(text)} has two numbers`;
  if (word === '/') return { found, right: `write ${Number((Number(first) / Number(second)).toPrecision(6))}` };
  const grouped = word === '' && next > end && second.length === 3 ? `${first}${second} without a blank, or ` : '';
  return { found, right: `write ${grouped}one number; limits as at_least and at_most` };
}

/** What may stand between two numbers. */
const BETWEEN: readonly string[] = ['to', '/', '…', '..', ';', '~'];

function endOfDigits(text: string, start: number): number {
  let end = start;
  while (isDigit(text.charCodeAt(end))) end += 1;
  return end;
}
