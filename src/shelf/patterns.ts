import { quoted } from '../units/unit-fault.ts';
import { failure, success } from './fault.ts';
import { isAbsolute } from './paths.ts';
import { meets, nameMeets } from './wildcard.ts';
import type { Outcome } from './fault.ts';
import type { Place } from './place.ts';

/** A pattern of paths below a site's folder, such as `chambers/*.yaml` or `recipes/**`. */
export interface Pattern {
  /** As the site wrote it. */
  readonly text: string;
  /** The pattern between its slashes; `**` stands for any number of folders, at the end also for what lies in them. */
  readonly parts: readonly string[];
}

/**
 * Reads a pattern relative to the site's document: `*` stands for any characters of a name, `?` for one, `**` between
 * slashes for any number of folders. It never leads above the site's folder.
 */
export function readPattern(text: string, place: Place): Outcome<Pattern> {
  const parts = text.split('/').filter((part) => part !== '' && part !== '.');
  const wrong = wrongPattern(text, parts);
  if (wrong === undefined) return success({ text, parts });
  return failure({ place, found: `the pattern ${quoted(text)} ${wrong.found}`, right: wrong.right });
}

/** Whether a path, relative to the site's folder, meets the pattern. A folder that does is meant with all that lies in it. */
export function matches(pattern: Pattern, path: string): boolean {
  return meets(pattern.parts, path.split('/'), isAnyDepth, nameMeets);
}

/** Whether anything below the folder, relative to the site's, could meet the pattern. */
export function reachesBelow(pattern: Pattern, folder: string): boolean {
  const names = folder === '.' ? [] : folder.split('/');
  for (const [at, name] of names.entries()) {
    const part = pattern.parts[at];
    if (part === '**') return true;
    if (part === undefined || !nameMeets(part, name)) return false;
  }
  return pattern.parts.length > names.length;
}

function isAnyDepth(part: string | undefined): boolean {
  return part === '**';
}

const LONGEST_PATTERN = 1000;

interface Wrong {
  readonly found: string;
  readonly right: string;
}

function wrongPattern(text: string, parts: readonly string[]): Wrong | undefined {
  if (parts.length === 0) return { found: 'is empty', right: 'such as chambers/*.yaml' };
  if (text.length > LONGEST_PATTERN) return { found: 'is too long', right: `at most ${LONGEST_PATTERN} characters` };
  if (isAbsolute(text)) return { found: 'starts at the root', right: BELOW };
  if (parts.includes('..')) return { found: 'leads upwards', right: BELOW };
  return wrongCharacter(text) ?? wrongStars(parts);
}

const BELOW = "a path below the site's folder, relative to it";

function wrongCharacter(text: string): Wrong | undefined {
  if (text.includes('\\')) return { found: 'has a backslash', right: 'separate folders with /' };
  if (text.includes('\0')) return { found: 'has a NUL character', right: 'a pattern without it' };
  const special = Array.from('{}[]!').find((character) => text.includes(character));
  if (special === undefined) return undefined;
  return { found: `has ${quoted(special)}`, right: 'only *, ? and ** stand for others; write a pattern each' };
}

function wrongStars(parts: readonly string[]): Wrong | undefined {
  const part = parts.find((one) => one.includes('**') && one !== '**');
  if (part === undefined) return undefined;
  return { found: `has ** within ${quoted(part)}`, right: '** between slashes, as in recipes/**/*.yaml' };
}
