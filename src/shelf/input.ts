import { readSync } from 'node:fs';
import { byteReader } from './bytes.ts';
import { failure, success, wholeFile } from './fault.ts';
import { codeOf, systemFault } from './path-fault.ts';
import { decoded, sizeFault, SIZE_LIMIT } from './text.ts';
import type { Fault, Outcome } from './fault.ts';

/** All of standard input as text, held to the rules of a file and reported under `name`. Waits until it ends. */
export function readStandardInput(
  name = 'standard input',
  options: { readonly sizeLimit?: number } = {},
): Outcome<string> {
  const { sizeLimit = SIZE_LIMIT } = options;
  try {
    const bytes = byteReader(sizeLimit, readWaiting)(STANDARD_INPUT, 0);
    if (bytes.length > sizeLimit) return failure(sizeFault(name, undefined, sizeLimit));
    const { value, faults } = decoded(name, bytes);
    return value === undefined ? { faults } : success(value.text, faults);
  } catch (error) {
    return failure(codeOf(error) === 'EBADF' ? closedFault(name) : systemFault(name, error));
  }
}

const STANDARD_INPUT = 0;

/** How long to wait for a writer that has nothing ready, in milliseconds. */
const PAUSE = 5;

/** Reads what is there; where the other end is slower (EAGAIN), waits for it. */
function readWaiting(descriptor: number, into: Buffer, at: number, room: number): number {
  for (;;) {
    try {
      return readSync(descriptor, into, at, room, null);
    } catch (error) {
      const code = codeOf(error);
      if (code === 'EOF') return 0;
      if (code !== 'EAGAIN' && code !== 'EINTR') throw error;
      Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, PAUSE);
    }
  }
}

function closedFault(name: string): Fault {
  return { place: wholeFile(name), found: 'a closed standard input', right: 'pipe a document into it, or name a file' };
}
