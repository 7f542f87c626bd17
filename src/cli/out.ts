import { isatty } from 'node:tty';
import { openDraft } from './out/draft.ts';
import { writeNew } from './out/new-files.ts';
import { stream } from './out/stream.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';
import type { Sink } from './out/stream.ts';

/*
 * The one way out: whatever the program writes, to standard output, to standard error or to files, goes through here.
 */

export type { Sink } from './out/stream.ts';

export interface Out extends Sink {
  /** Whether whoever read standard output has gone: nothing more need be done. */
  readonly closed: boolean;
  /** A line on standard error. */
  tell(text: string): void;
  /** A line on a terminal's standard error that the next one, or any text, replaces. Elsewhere nothing. */
  progress(text: string): void;
  openFile(path: string): Outcome<OutFile>;
  /** Writes files into a folder, all or none; one that is there already is a fault. */
  writeNew(folder: string, files: ReadonlyMap<string, string>): Fault | undefined;
  readonly terminal: Terminal;
}

/** A file that appears whole under its name once it is finished, or not at all. */
export interface OutFile extends Sink {
  /** Gives the file its name. What went wrong on the way is told now. */
  finish(): Fault | undefined;
  abandon(): void;
}

/** What standard output leads to. */
export interface Terminal {
  readonly isTerminal: boolean;
  readonly columns: number | undefined;
  /** Bits of colour: 1, 4, 8 or 24. */
  readonly depth: number;
}

export function standardOut(): Out {
  const output = stream(STANDARD_OUTPUT);
  const errors = stream(STANDARD_ERROR);
  const showsProgress = isatty(STANDARD_ERROR);
  let line = '';
  const clearLine = (): void => {
    if (line !== '') errors.write(`\r${' '.repeat(line.length)}\r`);
    line = '';
  };
  return {
    get closed() {
      return output.closed;
    },
    write(text) {
      clearLine();
      output.write(text);
    },
    tell(text) {
      clearLine();
      errors.write(`${text}\n`);
    },
    progress(text) {
      if (!showsProgress || text === line) return;
      clearLine();
      errors.write(text);
      line = text;
    },
    openFile: openDraft,
    writeNew,
    get terminal() {
      return terminal();
    },
  };
}

const STANDARD_OUTPUT = 1;
const STANDARD_ERROR = 2;

function terminal(): Terminal {
  if (!isatty(STANDARD_OUTPUT)) return { isTerminal: false, columns: undefined, depth: 1 };
  return { isTerminal: true, columns: process.stdout.columns, depth: process.stdout.getColorDepth() };
}
