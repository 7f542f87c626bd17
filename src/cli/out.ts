import { closeSync, mkdirSync, openSync, realpathSync, renameSync, rmdirSync, statSync, unlinkSync, writeSync } from 'node:fs';
import { dirname, join, basename } from 'node:path';
import { isatty } from 'node:tty';
import { failure, success, wholeFile } from '../shelf/fault.ts';
import { codeOf } from '../shelf/path-fault.ts';
import type { Fault, Outcome } from '../shelf/fault.ts';

/*
 * The one way out: whatever the program writes, to standard output, to standard error or to files, is written here.
 */

/** Something that texts are written to, one after the other. */
export interface Sink {
  write(text: string): void;
}

/** A file that appears whole under its name once it is finished, or not at all. */
export interface OutFile extends Sink {
  /** Gives the file its name. What went wrong on the way is told now. */
  finish(): Fault | undefined;
  abandon(): void;
}

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
    openFile,
    writeNew,
    get terminal() {
      return terminal();
    },
  };
}

const STANDARD_OUTPUT = 1;
const STANDARD_ERROR = 2;

interface Stream extends Sink {
  readonly closed: boolean;
}

/** Whoever reads may go at any time (EPIPE): that is no failure, and what is written from then on goes nowhere. */
function stream(descriptor: number): Stream {
  let closed = false;
  return {
    get closed() {
      return closed;
    },
    write(text) {
      if (closed || text === '') return;
      try {
        writeAll(descriptor, text);
      } catch (error) {
        if (descriptor === STANDARD_OUTPUT && codeOf(error) !== 'EPIPE') throw error;
        closed = true;
      }
    },
  };
}

function writeAll(descriptor: number, text: string): void {
  const bytes = Buffer.from(text);
  for (let at = 0; at < bytes.length; ) {
    try {
      at += writeSync(descriptor, bytes, at);
    } catch (error) {
      const code = codeOf(error);
      if (code !== 'EAGAIN' && code !== 'EINTR') throw error;
      Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, PAUSE);
    }
  }
}

/** How long to wait for a reader that is not ready, in milliseconds. */
const PAUSE = 2;

function terminal(): Terminal {
  if (!isatty(STANDARD_OUTPUT)) return { isTerminal: false, columns: undefined, depth: 1 };
  return { isTerminal: true, columns: process.stdout.columns, depth: process.stdout.getColorDepth() };
}

function openFile(path: string): Outcome<OutFile> {
  const target = realOr(path);
  const draft = join(dirname(target), `.${basename(target)}.${process.pid}.draft`);
  if (isFolder(target)) return failure(notWritten(path, 'a folder of that name is there'));
  let descriptor: number;
  try {
    descriptor = openSync(draft, 'wx');
  } catch (error) {
    return failure(notWritten(path, reason(error)));
  }
  return success(outFile(path, target, draft, descriptor));
}

function outFile(path: string, target: string, draft: string, descriptor: number): OutFile {
  let failed: Fault | undefined;
  const attempt = (action: () => void): void => {
    if (failed !== undefined) return;
    try {
      action();
    } catch (error) {
      failed = notWritten(path, reason(error));
    }
  };
  const abandon = (): void => {
    quietly(() => { closeSync(descriptor); });
    quietly(() => { unlinkSync(draft); });
  };
  return {
    write(text) {
      attempt(() => { writeAll(descriptor, text); });
    },
    finish() {
      attempt(() => { closeSync(descriptor); });
      attempt(() => { renameSync(draft, target); });
      if (failed !== undefined) abandon();
      return failed;
    },
    abandon,
  };
}

function writeNew(folder: string, files: ReadonlyMap<string, string>): Fault | undefined {
  const made: (() => void)[] = [];
  try {
    for (const [name, text] of files) writeOne(join(folder, name), text, made);
    return undefined;
  } catch (error) {
    for (const undo of made.reverse()) quietly(undo);
    return notWritten(folder, reason(error));
  }
}

function writeOne(path: string, text: string, made: (() => void)[]): void {
  const first = mkdirSync(dirname(path), { recursive: true });
  if (first !== undefined) made.push(() => { removeEmpty(dirname(path), first); });
  const descriptor = openSync(path, 'wx');
  made.push(() => { unlinkSync(path); });
  try {
    writeAll(descriptor, text);
  } finally {
    closeSync(descriptor);
  }
}

/** Removes a folder and those above it up to the first that was made, as long as they are empty. */
function removeEmpty(folder: string, first: string): void {
  for (let path = folder; ; path = dirname(path)) {
    rmdirSync(path);
    if (path === first || dirname(path) === path) return;
  }
}

function realOr(path: string): string {
  try {
    return realpathSync(path);
  } catch {
    return path;
  }
}

function isFolder(path: string): boolean {
  return statSync(path, { throwIfNoEntry: false })?.isDirectory() === true;
}

function quietly(action: () => void): void {
  try {
    action();
  } catch {
    // Nothing is lost by a draft that cannot be cleared away.
  }
}

function notWritten(path: string, found: string): Fault {
  return { place: wholeFile(path), found: `cannot be written: ${found}`, right: 'nothing was written there; check the path' };
}

function reason(error: unknown): string {
  const code = codeOf(error);
  return REASONS.get(code) ?? `an answer of the system: ${code}`;
}

const REASONS: ReadonlyMap<string, string> = new Map([
  ['EACCES', 'no permission'],
  ['EPERM', 'no permission'],
  ['EROFS', 'the disk is read-only'],
  ['ENOENT', 'there is no such folder'],
  ['ENOTDIR', 'its folder is a file'],
  ['EEXIST', 'a file of that name is there'],
  ['ENOSPC', 'the disk is full'],
  ['EDQUOT', 'the disk quota is used up'],
  ['EISDIR', 'it is a folder'],
  ['ENAMETOOLONG', 'the name is too long'],
]);
