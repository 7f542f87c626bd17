import { numberEnd } from './number.ts';
import { plainUnit, skipBlanks } from './spelling.ts';

/** A percentage and of what it is; `unsaid` where the text leaves that open, `other` where it names something else. */
export interface Share {
  readonly value: number;
  readonly of: 'reading' | 'full scale' | 'unsaid' | 'other';
}

/** Reads `1 %`, `0.25 % of reading`, `1 % of full scale`; undefined where the text is no percentage. */
export function readShare(text: string): Share | undefined {
  const start = skipBlanks(text, 0);
  const end = numberEnd(text, start);
  if (end === start) return undefined;
  const of = ofWhat(text.slice(skipBlanks(text, end)));
  const value = Number(text.slice(start, end)) / 100;
  return of === undefined || !Number.isFinite(value) ? undefined : { value, of };
}

const OF: ReadonlyMap<string, Share['of']> = new Map([
  ['%', 'unsaid'],
  ['% of reading', 'reading'],
  ['% of full scale', 'full scale'],
]);

function ofWhat(rest: string): Share['of'] | undefined {
  const spelled = OF.get(rest);
  if (spelled !== undefined) return spelled;
  const plain = plainUnit(rest).replace('percent', '%').replace('%of', '% of');
  return OF.get(plain) ?? (plain.startsWith('%') ? 'other' : undefined);
}
