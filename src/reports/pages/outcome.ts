import type { StepOutcome } from '../counts.ts';

/** How each outcome of a step is told after its count: "52 pass, 4 to review". */
export const OUTCOME_WORDS: readonly (readonly [StepOutcome, string])[] = [
  ['pass', 'pass'],
  ['review', 'to review'],
  ['fail', 'fail'],
  ['open', 'open'],
  ['nothingJudged', 'nothing judged'],
];

/** The outcomes of several steps: "5 pass, 1 fail, 2 nothing judged". */
export function outcomeWords(outcomes: readonly StepOutcome[]): string {
  const counts = { pass: 0, review: 0, fail: 0, open: 0, nothingJudged: 0 };
  for (const outcome of outcomes) counts[outcome] += 1;
  return countsWords(counts);
}

export function countsWords(counts: Readonly<Record<StepOutcome, number>>): string {
  return OUTCOME_WORDS.flatMap(([outcome, words]) =>
    counts[outcome] === 0 ? [] : [`${counts[outcome]} ${words}`],
  ).join(', ');
}
