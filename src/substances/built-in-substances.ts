// TEMPORARY until built-in/generated/data.ts is there
import { readFileSync } from 'node:fs';
import { readSubstances } from '../documents/read.ts';
import { Source } from '../shelf/place.ts';
import { siteSubstances } from './site-substances.ts';

const docs = ['gases', 'atoms', 'films'].flatMap((n) => {
  const o = readSubstances(new Source(`built-in/${n}.yaml`, readFileSync(new URL(`../built-in/${n}.yaml`, import.meta.url), 'utf8')));
  if (o.value === undefined) console.error(o.faults.slice(0, 3).map((f) => [f.place.line, f.found, f.right]));
  return o.value === undefined ? [] : [o.value];
});
export const BUILT_IN_SUBSTANCES = siteSubstances(docs);
