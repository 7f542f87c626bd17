import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

/*
 * The script of the commands as the build has made it, and what V8 has compiled of it.
 */

const RECIPE = resolve('recipes/recipes/etch/contact-open.yaml');

let home = '';
let cache = '';

beforeAll(() => {
  home = mkdtempSync(join(tmpdir(), 'regimen-script-'));
  cpSync('dist', join(home, 'dist'), { recursive: true });
  writeFileSync(join(home, 'package.json'), JSON.stringify({ name: 'regimen', type: 'module' }));
  cache = join(home, 'dist', 'commands.cjs.cache');
});

afterAll(() => {
  rmSync(home, { recursive: true, force: true });
});

function check(): string {
  return execFileSync(process.execPath, [join(home, 'dist', 'regimen.js'), 'check', RECIPE], { encoding: 'utf8' });
}

/** Asked of a process of its own: V8 would not look at the cache of a script that it has compiled before. */
function isRejected(): boolean {
  const answer = execFileSync(process.execPath, ['--eval', ASK, join(home, 'dist', 'commands.cjs')], {
    encoding: 'utf8',
  });
  return answer.trim() === 'true';
}

/** The digest before what V8 reads is 32 bytes long. */
const ASK = `
const { readFileSync } = require('node:fs');
const { Script } = require('node:vm');
const [, filename] = process.argv;
const cachedData = readFileSync(filename + '.cache').subarray(32);
console.log(new Script(readFileSync(filename, 'latin1'), { filename, cachedData }).cachedDataRejected);
`;

describe('what V8 has compiled of the commands', () => {
  test('is taken by the Node that built it, wherever it stands', () => {
    expect(isRejected()).toBe(false);
  });

  test('holds no path of the machine that built it', () => {
    expect(readFileSync(cache).includes(resolve('.'))).toBe(false);
  });

  test('makes no difference to what is printed, be it taken, of another V8, damaged, cut short or missing', () => {
    const taken = check();
    expect(taken).toContain('Nothing blocks.');
    const made = readFileSync(cache);
    const foreign = inverted(made, VERSION_AT);
    digest(foreign).copy(foreign);
    writeFileSync(cache, foreign);
    expect(isRejected()).toBe(true);
    for (const other of [foreign, inverted(made, made.length >> 1), made.subarray(0, 1000), Buffer.alloc(0)]) {
      writeFileSync(cache, other);
      expect(check()).toBe(taken);
    }
    rmSync(cache);
    expect(check()).toBe(taken);
  });
});

/** Where V8 notes its version: behind the digest and four bytes that tell a cache from other data. */
const VERSION_AT = 36;

function inverted(made: Buffer, at: number): Buffer {
  const other = Buffer.from(made);
  other.writeUInt8(0xff - other.readUInt8(at), at);
  return other;
}

function digest(kept: Buffer): Buffer {
  const code = readFileSync(join(home, 'dist', 'commands.cjs'));
  return createHash('sha256').update(code).update(kept.subarray(32)).digest();
}
