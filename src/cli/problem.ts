import { nearest } from '../units/suggest.ts';

/** What is wrong with a command line: what was found, and what would be right. */
export interface Problem {
  readonly found: string;
  readonly right: string;
}

/** The problem of a word that is none of those allowed. */
export function unknownWord(what: string, word: string, allowed: readonly string[]): Problem {
  const meant = nearest(word, allowed);
  return {
    found: `${what} '${word}' is unknown`,
    right: meant === undefined ? `one of ${allowed.join(', ')}` : `did you mean ${meant}?`,
  };
}
