import { writeSync } from 'node:fs';
import { codeOf } from '../../shelf/path-fault.ts';

/** Something that texts are written to, one after the other. */
export interface Sink {
  write(text: string): void;
}

export interface Stream extends Sink {
  /** Whether whoever read it has gone. */
  readonly closed: boolean;
}

/** Whoever reads may go at any time (EPIPE): that is no failure, and what is written from then on goes nowhere. */
export function stream(descriptor: number): Stream {
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
        closed = true;
        if (codeOf(error) !== 'EPIPE')
          throw new Error(`output cannot be written: ${codeOf(error) ?? 'unknown'}`, { cause: error });
      }
    },
  };
}

/** Writes a text to its end, however slowly it is taken. */
export function writeAll(descriptor: number, text: string): void {
  const bytes = Buffer.from(text);
  for (let at = 0; at < bytes.length;) {
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
