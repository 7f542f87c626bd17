import { DIMENSIONS } from './dimensions.ts';
import type { Dimension, Dimensions } from './dimensions.ts';

/** What is wrong with the text of a value: the clauses of a fault, without its place. */
export interface UnitFault {
  /** As a clause: "'30 s' is a time". */
  readonly found: string;
  /** As a clause: "a pressure is needed, in mTorr, Torr, Pa or mbar". */
  readonly right: string;
}

/** Tells a fault from a measure or a tolerance. */
export function isUnitFault(result: object): result is UnitFault {
  return 'found' in result;
}

/** The text in quotes, shortened, with characters that would disturb a terminal written as their code. */
export function quoted(text: string): string {
  const trimmed = text.trim();
  const shown = trimmed.length > LONGEST_QUOTE ? `${trimmed.slice(0, LONGEST_QUOTE)}…` : trimmed;
  return `'${Array.from(shown, visible).join('')}'`;
}

/** Longer texts are refused unread. */
export const LONGEST_TEXT = 200;

export function tooLongFault(text: string): UnitFault {
  return { found: `${quoted(text)} has ${text.length} characters`, right: `a value of at most ${LONGEST_TEXT}` };
}

/** "a pressure is needed, in mTorr, Torr, Pa or mbar". */
export function needed(dimensions: Dimensions): string {
  const list = typeof dimensions === 'string' ? [dimensions] : dimensions;
  const [only] = list;
  if (only !== undefined && list.length === 1) return `${DIMENSIONS[only].words} is needed${units(only, ', ')}`;
  return `needed is ${list.map((one) => DIMENSIONS[one].words + units(one, ' ')).join(', or ')}`;
}

/** "mTorr, Torr or Pa". */
export function either(names: readonly string[]): string {
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} or ${names.at(-1) ?? ''}`;
}

const LONGEST_QUOTE = 60;

function units(dimension: Dimension, lead: string): string {
  const names = DIMENSIONS[dimension].units;
  if (dimension === 'number') return `${lead}without a unit`;
  return `${lead}${dimension === 'fraction' ? 'bare or ' : ''}in ${either(names)}`;
}

function visible(character: string): string {
  const code = character.codePointAt(0) ?? 0;
  const hidden = code < 0x20 || (code >= 0x7f && code < 0xa0) || (code >= 0x2028 && code <= 0x202e) || code === 0xfeff;
  const lone = code >= 0xd800 && code <= 0xdfff;
  return hidden || lone ? `U+${code.toString(16).toUpperCase().padStart(4, '0')}` : character;
}
