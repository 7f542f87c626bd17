import type { Grades, Level, Verdict } from '../../verdicts/verdict.ts';
import { verdictDimension } from '../sentences.ts';
import { print, type Shown } from '../shown.ts';
import { sentence } from '../words.ts';

/** The bound of an assumption grade by grade, what it stands for, and its source. */
export function boundSentences({ bound, statement, source, ...verdict }: Verdict, shown: Shown): readonly string[] {
  const dimension = verdictDimension(verdict);
  const side = (words: string, grades: Grades = {}): readonly string[] =>
    LEVELS.flatMap((level) => {
      const limit = grades[level];
      return limit === undefined ? [] : [`${words} ${print(shown, limit, dimension)} (${level})`];
    });
  const limits = [...side('at least', bound.at_least), ...side('at most', bound.at_most)];
  return [`Bound: ${limits.join(', ')}. ${sentence(statement)}`, `Source of the bound: ${sentence(source)}`];
}

const LEVELS: readonly Level[] = ['note', 'warning', 'error'];
