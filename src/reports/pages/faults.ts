import type { Fault } from '../../shelf/fault.ts';
import type { Block } from '../page.ts';
import { counted } from '../words.ts';

/** More faults in one file than a reader works through at once. */
const MOST_PER_FILE = 20;

/** Faults of documents in the order given, at most twenty a file and then how many more. */
export function faultBlocks(faults: readonly Fault[]): readonly Block[] {
  const byFile = new Map<string, Fault[]>();
  for (const fault of faults) {
    const { file } = fault.place;
    const before = byFile.get(file);
    if (before === undefined) byFile.set(file, [fault]);
    else before.push(fault);
  }
  return [...byFile.values()].flatMap(fileBlocks);
}

function fileBlocks(faults: readonly Fault[]): readonly Block[] {
  const told: Block[] = faults.slice(0, MOST_PER_FILE).map(({ place, found, right }) => ({
    kind: 'fault',
    where: `${place.file}:${place.line}:${place.column}`,
    found,
    right,
  }));
  const more = faults.length - told.length;
  return more === 0
    ? told
    : [...told, { kind: 'sentence', weight: 'first', text: `${counted(more, 'more fault')} in this file.` }];
}
