import { execFileSync, spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { buildSync } from 'esbuild';
import { beforeAll, describe, expect, test } from 'vitest';
import { byteReader } from '../../src/shelf/bytes.ts';
import { temporaryFolder } from './temporary.ts';

const folder = temporaryFolder();

beforeAll(() => {
  const contents = `import { readStandardInput } from './input.ts';
    const { value, faults } = readStandardInput('given');
    console.log(JSON.stringify({ length: value?.length, start: value?.slice(0, 20), faults }));`;
  const resolveDir = fileURLToPath(new URL('../../src/shelf', import.meta.url));
  const outfile = `${folder}/read.mjs`;
  buildSync({ stdin: { contents, resolveDir }, bundle: true, platform: 'node', format: 'esm', outfile });
});

/** What reading standard input gave in a process whose input a shell line provides. */
function answer(line: string): unknown {
  const run = `"${process.execPath}" "${folder}/read.mjs"`;
  return JSON.parse(execFileSync('sh', ['-c', line.replace('RUN', run)]).toString());
}

describe('standard input', () => {
  test.each([
    ['a pipe', 'printf "regimen: µ" | RUN', { length: 10, start: 'regimen: µ', faults: [] }],
    ['a slow writer', '(printf a; sleep 0.3; printf b) | RUN', { length: 2, start: 'ab', faults: [] }],
    ['nothing', 'RUN < /dev/null', { length: 0, start: '', faults: [] }],
    ['a closed one', 'RUN <&-', { length: 0, start: '', faults: [] }],
    ['a folder', 'RUN < /', { faults: [{ found: 'a folder', place: { file: 'given', line: 1, column: 1 } }] }],
    ['bad bytes', `printf 'a\\n\\377' | RUN`, { faults: [{ place: { line: 2, column: 1 } }] }],
    ['no end', 'yes | RUN', { faults: [{ found: 'more than 1 MiB of text' }] }],
  ])('%s', (_, line, expected) => {
    expect(answer(line)).toMatchObject(expected);
  });

  const perl = spawnSync('perl', ['-e', '1']).status === 0;

  test.skipIf(!perl)('a writer that has nothing ready is waited for where reading does not wait by itself', () => {
    const line = "(sleep 0.5; printf ab) | perl -MFcntl -e 'fcntl(STDIN, F_SETFL, O_NONBLOCK); exec @ARGV' sh -c 'RUN'";
    expect(answer(line)).toMatchObject({ length: 2, faults: [] });
  });
});

describe('reading bytes to their end', () => {
  test('pieces of any size are put together', () => {
    const given = Buffer.from('0123456789'.repeat(30_000));
    let at = 0;
    const read = byteReader(2 ** 20, (_, into, start, room) => {
      const got = given.copy(into, start, at, at + Math.min(room, 1 + (at % 977)));
      at += got;
      return got;
    });
    expect(read(0, 0).equals(given)).toBe(true);
  });
});
