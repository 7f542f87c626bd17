import { closeSync, openSync, realpathSync, renameSync, statSync, unlinkSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { failure, success } from '../../shelf/fault.ts';
import { notWritten, reason } from './reason.ts';
import { writeAll } from './stream.ts';
import type { Fault, Outcome } from '../../shelf/fault.ts';
import type { OutFile } from '../out.ts';

/** A file written beside its name under another, which takes the name when it is whole. */
export function openDraft(path: string): Outcome<OutFile> {
  const target = linkedTo(path);
  if (isFolder(target)) return failure(notWritten(path, 'it is a folder'));
  const draft = join(dirname(target), `.${basename(target)}.${process.pid}.draft`);
  try {
    return success(draftFile(path, target, draft, openSync(draft, 'wx')));
  } catch (error) {
    return failure(notWritten(path, reason(error)));
  }
}

function draftFile(path: string, target: string, draft: string, descriptor: number): OutFile {
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
    quietly(() => {
      closeSync(descriptor);
    });
    quietly(() => {
      unlinkSync(draft);
    });
  };
  return {
    write(text) {
      attempt(() => {
        writeAll(descriptor, text);
      });
    },
    finish() {
      attempt(() => {
        closeSync(descriptor);
        renameSync(draft, target);
      });
      if (failed !== undefined) abandon();
      return failed;
    },
    abandon,
  };
}

/** A name that is a link keeps being one: what it leads to is replaced. */
function linkedTo(path: string): string {
  try {
    return realpathSync(path);
  } catch {
    return path;
  }
}

function isFolder(path: string): boolean {
  try {
    return statSync(path).isDirectory();
  } catch {
    return false;
  }
}

function quietly(action: () => void): void {
  try {
    action();
  } catch {
    // A draft that is closed or gone already needs no clearing up.
  }
}
