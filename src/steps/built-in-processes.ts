// TEMPORARY until built-in/generated/data.ts is there
import { readdirSync, readFileSync } from 'node:fs';
import { readProcess } from '../documents/read.ts';
import { Source } from '../shelf/place.ts';
import { processesOver } from './processes.ts';
const dir = new URL('../built-in/processes/', import.meta.url);
const docs = readdirSync(dir).flatMap((n) => {
  const o = readProcess(new Source(`built-in/processes/${n}`, readFileSync(new URL(n, dir), 'utf8')));
  if (o.value === undefined) console.error(n, o.faults.slice(0, 3).map((f) => [f.place.line, f.found, f.right]));
  return o.value === undefined ? [] : [o.value];
});
export const BUILT_IN_PROCESSES = processesOver(docs, { named: () => undefined, names: () => [] });
