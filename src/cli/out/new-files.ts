import { closeSync, existsSync, mkdirSync, openSync, rmdirSync, unlinkSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { notWritten, reason } from './reason.ts';
import { writeAll } from './stream.ts';
import type { Fault } from '../../shelf/fault.ts';

/** Writes files into a folder, all or none. Where one is there already nothing is written. */
export function writeNew(folder: string, files: ReadonlyMap<string, string>): Fault | undefined {
  const undo: (() => void)[] = [];
  let path = folder;
  try {
    for (const [name, text] of files) {
      path = join(folder, name);
      if (existsSync(path)) return undone(undo, notWritten(path, 'a file of that name is there'));
      writeOne(path, text, undo);
    }
    return undefined;
  } catch (error) {
    return undone(undo, notWritten(path, reason(error)));
  }
}

function writeOne(path: string, text: string, undo: (() => void)[]): void {
  makeFolder(dirname(path), undo);
  const descriptor = openSync(path, 'wx');
  undo.push(() => {
    unlinkSync(path);
  });
  try {
    writeAll(descriptor, text);
  } finally {
    closeSync(descriptor);
  }
}

/** Makes a folder and those above it that are not there. (Node's own way to do so never ends where the system makes none.) */
function makeFolder(folder: string, undo: (() => void)[]): void {
  if (existsSync(folder)) return;
  if (dirname(folder) !== folder) makeFolder(dirname(folder), undo);
  mkdirSync(folder);
  undo.push(() => {
    rmdirSync(folder);
  });
}

function undone(undo: readonly (() => void)[], fault: Fault): Fault {
  for (const step of [...undo].reverse()) {
    try {
      step();
    } catch {
      // What cannot be taken back was changed by somebody else meanwhile, and is left to them.
    }
  }
  return fault;
}
