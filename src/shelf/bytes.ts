import { readSync } from 'node:fs';

/** Reads an open file to its end, or until it has more bytes than the limit. What it returns holds until the next call. */
export type ByteReader = (descriptor: number, expected: number) => Buffer;

/** As `readSync` of node:fs, as far as it is used here. */
type ReadSome = (descriptor: number, into: Buffer, at: number, room: number) => number;

/**
 * A reader that uses one buffer over and over. `expected` is the size the file is said to have: a file of just that size
 * takes one call of the system, any other is read until nothing comes.
 */
export function byteReader(limit: number, readSome: ReadSome = readNext): ByteReader {
  let buffer: Buffer = Buffer.allocUnsafeSlow(Math.min(limit + 1, FIRST_ROOM));
  return (descriptor, expected) => {
    buffer = withRoom(buffer, Math.min(limit, expected) + 1);
    for (let length = 0; ;) {
      if (length === buffer.length) buffer = withRoom(buffer, Math.min(limit + 1, 2 * length));
      const got = readSome(descriptor, buffer, length, buffer.length - length);
      length += got;
      if (got === 0 || length === expected || length > limit) return buffer.subarray(0, length);
    }
  };
}

const FIRST_ROOM = 2 ** 16;

function readNext(descriptor: number, into: Buffer, at: number, room: number): number {
  return readSync(descriptor, into, at, room, null);
}

function withRoom(buffer: Buffer, size: number): Buffer {
  if (buffer.length >= size) return buffer;
  const larger = Buffer.allocUnsafeSlow(size);
  buffer.copy(larger);
  return larger;
}
