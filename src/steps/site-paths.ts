import type { SiteDocument } from '../documents/document.ts';
import type { Fault } from '../shelf/fault.ts';
import { readPattern, type Pattern } from '../shelf/patterns.ts';
import type { Shelf } from '../shelf/shelf.ts';
import { matching } from '../shelf/walk.ts';

type PatternKey = 'chambers' | 'substances' | 'processes' | 'recipes' | 'pass_over';

/** The patterns that a site document has under a key. */
export function patternsOf(document: SiteDocument, key: PatternKey, faults: Fault[]): readonly Pattern[] {
  const patterns: Pattern[] = [];
  for (const [index, text] of (document.content[key] ?? []).entries()) {
    const { value, faults: wrong } = readPattern(text, document.place([key, index]));
    faults.push(...wrong);
    if (value !== undefined) patterns.push(value);
  }
  return patterns;
}

/** The files below a site's folder that meet the patterns under a key. */
export function pathsOf(
  shelf: Shelf,
  folder: string,
  document: SiteDocument,
  key: PatternKey,
  faults: Fault[],
): readonly string[] {
  const { value = [], faults: unread } = matching(shelf, folder, patternsOf(document, key, faults));
  faults.push(...unread);
  return value;
}
