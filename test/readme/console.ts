import { cpSync } from 'node:fs';
import { join } from 'node:path';
import { DEMO, folderWith, regimen } from '../command/run.ts';
import { refreshed } from './elision.ts';
import type { Block } from './blocks.ts';

const PROMPT = '$ regimen ';
/** Waivers are held against a day: it may not be that of the run. */
const TODAY = '2026-01-31';

/** A folder to run the commands of the README in: the demo line stands in it as it does in the repository. */
export function stage(): string {
  const folder = folderWith({});
  cpSync(DEMO, join(folder, 'recipes'), { recursive: true });
  return folder;
}

/** A block of the console with the output that its commands give now; what it elides stays elided. */
export function rerun({ lines }: Block, cwd: string): readonly string[] {
  return commandsOf(lines).flatMap(({ command, shown }) => [
    PROMPT + command,
    ...refreshed(shown, outputOf(command, cwd)),
  ]);
}

interface Shown {
  readonly command: string;
  readonly shown: readonly string[];
}

function commandsOf(lines: readonly string[]): readonly Shown[] {
  const starts = lines.flatMap((line, index) => (line.startsWith(PROMPT) ? [index] : []));
  return starts.map((start, index) => ({
    command: (lines[start] ?? '').slice(PROMPT.length),
    shown: lines.slice(start + 1, starts[index + 1]),
  }));
}

function outputOf(command: string, cwd: string): readonly string[] {
  const day = command.startsWith('check') ? ['--today', TODAY] : [];
  const { out, err } = regimen([...wordsOf(command), ...day], { cwd, env: { COLUMNS: '100', NO_COLOR: '1' } });
  return `${out}${err}`
    .trimEnd()
    .split('\n')
    .map((line) => line.trimEnd());
}

/** The words of a command line; quotes hold one together. */
export function wordsOf(command: string): readonly string[] {
  return [...command.matchAll(/'([^']*)'|(\S+)/g)].map(([, quoted, bare]) => quoted ?? bare ?? '');
}
