import { execFileSync } from 'node:child_process';
import { chmodSync, linkSync, mkdirSync, symlinkSync, truncateSync } from 'node:fs';
import { createServer } from 'node:net';
import { describe, expect, test } from 'vitest';
import { diskShelf } from '../../src/shelf/disk.ts';
import { temporaryFolder, write } from './temporary.ts';
import type { Fault } from '../../src/shelf/fault.ts';

const shelf = diskShelf();

function faultOf(path: string): Fault | undefined {
  const { value, faults } = shelf.read(path);
  expect(value).toBeUndefined();
  expect(faults).toHaveLength(1);
  return faults[0];
}

/** Rights do not bind the superuser, under whom tests may run: gives them up for a moment. */
function asOrdinaryUser(act: () => void): void {
  if (process.geteuid?.() !== 0) {
    act();
    return;
  }
  process.seteuid?.(65534);
  try {
    act();
  } finally {
    process.seteuid?.(0);
  }
}

function bytes(...parts: (string | number[])[]): Buffer {
  return Buffer.concat(parts.map((part) => (typeof part === 'string' ? Buffer.from(part) : Buffer.from(part))));
}

describe('reading a text from disk', () => {
  const folder = temporaryFolder();

  test('a text comes as it stands, reported under its path or the name given', () => {
    write(folder, { 'a.yaml': 'gap: 27 mm # µ Å\n' });
    expect(shelf.read(`${folder}/a.yaml`).value).toMatchObject({
      text: 'gap: 27 mm # µ Å\n',
      file: `${folder}/a.yaml`,
    });
    expect(shelf.read(`${folder}/a.yaml`, 'a.yaml').value?.file).toBe('a.yaml');
  });

  test('texts read one after the other do not share their bytes', () => {
    write(folder, {
      'one.yaml': 'one: 1',
      'two.yaml': 'another: 2',
      'long.yaml': 'x'.repeat(300_000),
      'none.yaml': '',
    });
    const one = shelf.read(`${folder}/one.yaml`).value;
    const long = shelf.read(`${folder}/long.yaml`).value;
    const two = shelf.read(`${folder}/two.yaml`).value;
    expect([one?.text, two?.text, long?.text.length]).toEqual(['one: 1', 'another: 2', 300_000]);
    expect(shelf.read(`${folder}/none.yaml`).value?.text).toBe('');
  });

  test('a byte order mark is dropped, one inside the text is kept', () => {
    write(folder, { 'bom.yaml': bytes([0xef, 0xbb, 0xbf], 'a: \uFEFF1') });
    expect(shelf.read(`${folder}/bom.yaml`).value?.text).toBe('a: \uFEFF1');
  });

  test('a file whose size the system does not tell is read to its end', () => {
    expect(diskShelf().read('/proc/self/status').value?.text).toMatch(/^Name:.*\n[^]*\n$/);
  });

  test('a hard link and a link are read like the file', () => {
    write(folder, { 'kept.yaml': 'kept' });
    linkSync(`${folder}/kept.yaml`, `${folder}/hard.yaml`);
    symlinkSync('kept.yaml', `${folder}/soft.yaml`);
    expect(shelf.read(`${folder}/hard.yaml`).value?.text).toBe('kept');
    expect(shelf.read(`${folder}/soft.yaml`).value?.text).toBe('kept');
  });

  test.each(['newline\nin.yaml', `"quotes' .yaml`, 'ünïcødé 🐦.yaml', ' blank.yaml', '-dash.yaml', '%00$(id).yaml'])(
    'a file may be called %j',
    (name) => {
      write(folder, { [name]: name });
      expect(shelf.read(`${folder}/${name}`).value?.text).toBe(name);
    },
  );
});

describe('bytes that are no text', () => {
  const folder = temporaryFolder();

  test.each([
    ['a lone continuation byte', bytes('a: 1\nb: ', [0x80]), 2, 4, '80'],
    ['a sequence cut short by the end', bytes('µ', [0xe2, 0x82]), 1, 2, 'E2'],
    ['a sequence cut short by another character', bytes('a\n\nµ🐦x', [0xc3], '(µ'), 3, 5, 'C3'],
    ['an overlong slash', bytes([0xc0, 0xaf]), 1, 1, 'C0'],
    ['a surrogate in UTF-8', bytes('x', [0xed, 0xa0, 0x80]), 1, 2, 'ED'],
    ['Latin-1 after real replacement characters', bytes('\uFFFD\uFFFD 20 ', [0xb0], 'C'), 1, 7, 'B0'],
    ['Latin-1 behind a byte order mark', bytes([0xef, 0xbb, 0xbf], '20 ', [0xb0]), 1, 4, 'B0'],
  ])('%s is named with its place', (_, content, line, column, code) => {
    write(folder, { 'bad.yaml': content });
    const fault = faultOf(`${folder}/bad.yaml`);
    expect(fault).toEqual({
      place: { file: `${folder}/bad.yaml`, line, column },
      found: `the byte ${code}, which is not UTF-8`,
      right: 'save it as UTF-8',
    });
  });

  test('a replacement character that is written out is text', () => {
    write(folder, { 'odd.yaml': '\uFFFD' });
    expect(shelf.read(`${folder}/odd.yaml`).value?.text).toBe('\uFFFD');
  });

  test('a megabyte of replacement characters with one bad byte at the end is placed at once', () => {
    write(folder, { 'many.yaml': bytes('\uFFFD'.repeat(340_000), [0xff]) });
    const start = performance.now();
    expect(faultOf(`${folder}/many.yaml`)?.place.column).toBe(340_001);
    expect(performance.now() - start).toBeLessThan(1000);
  });

  test('UTF-16 is called so', () => {
    write(folder, { 'le.yaml': bytes([0xff, 0xfe, 0x61, 0]), 'be.yaml': bytes([0xfe, 0xff, 0, 0x61]) });
    expect(faultOf(`${folder}/le.yaml`)?.found).toBe('text in UTF-16 (its mark is FF FE)');
    expect(faultOf(`${folder}/be.yaml`)?.found).toBe('text in UTF-16 (its mark is FE FF)');
  });

  test('a NUL character is named with its place', () => {
    write(folder, { 'nul.yaml': 'a: 1\nb: \0' });
    expect(faultOf(`${folder}/nul.yaml`)).toMatchObject({ found: 'a NUL character', place: { line: 2, column: 4 } });
  });
});

describe('the size limit', () => {
  const folder = temporaryFolder();

  test('a file of just 1 MiB is read, one byte more is refused with size and limit', () => {
    write(folder, { 'full.yaml': 'x'.repeat(2 ** 20), 'over.yaml': 'x'.repeat(2 ** 20 + 1) });
    expect(shelf.read(`${folder}/full.yaml`).value?.text).toHaveLength(2 ** 20);
    expect(faultOf(`${folder}/over.yaml`)).toMatchObject({ right: 'at most 1 MiB; split the document' });
  });

  test('50 MB are refused by their size alone', () => {
    write(folder, { 'huge.yaml': '' });
    truncateSync(`${folder}/huge.yaml`, 50e6);
    const before = process.memoryUsage.rss();
    const start = performance.now();
    for (let again = 0; again < 100; again += 1) shelf.read(`${folder}/huge.yaml`);
    expect(performance.now() - start).toBeLessThan(200);
    expect(process.memoryUsage.rss() - before).toBeLessThan(40e6);
    expect(faultOf(`${folder}/huge.yaml`)?.found).toBe('a size of 48 MiB');
  });

  test('the limit may be set', () => {
    write(folder, { 'small.yaml': 'x'.repeat(2500) });
    const fault = diskShelf({ sizeLimit: 2000 }).read(`${folder}/small.yaml`).faults[0];
    expect(fault).toMatchObject({ found: 'a size of 2.4 KiB', right: 'at most 2.0 KiB; split the document' });
  });

  test('a file that says it is empty and never ends is stopped at the limit', () => {
    const fault = diskShelf({ sizeLimit: 100 }).read('/proc/self/status').faults[0];
    expect(fault?.found).toBe('more than 100 bytes of text');
  });
});

describe('paths that lead to no text', () => {
  const folder = temporaryFolder();
  chmodSync(folder, 0o755);
  write(folder, { 'recipes/contact-open.yaml': 'x', plain: 'x' });

  test('what is not a file is called what it is, without waiting for it', async () => {
    execFileSync('mkfifo', [`${folder}/queue.yaml`]);
    const server = createServer().listen(`${folder}/plug.yaml`);
    await new Promise((ready) => server.once('listening', ready));
    expect(faultOf(folder)?.found).toBe('a folder');
    expect(faultOf(`${folder}/queue.yaml`)?.found).toBe('a pipe');
    expect(faultOf(`${folder}/plug.yaml`)?.found).toBe('a socket');
    expect(faultOf('/dev/zero')?.found).toBe('a device');
    server.close();
  });

  test('a misspelt name is answered with the one that is there', () => {
    expect(faultOf(`${folder}/recipes/contact-opne.yaml`)).toMatchObject({
      found: "nothing named 'contact-opne.yaml' there",
      right: "'contact-open.yaml' is there; check the name",
    });
    expect(faultOf(`${folder}/recipes/elsewhere.yaml`)?.right).toBe('check the path');
    expect(faultOf(`${folder}/receipts/contact-open.yaml`)?.found).toBe("no folder 'receipts' to find it in");
  });

  test('links that lead nowhere or round in a circle are told apart', () => {
    symlinkSync('gone.yaml', `${folder}/dangling.yaml`);
    symlinkSync('loop.yaml', `${folder}/loop.yaml`);
    expect(faultOf(`${folder}/dangling.yaml`)?.found).toBe('a link that leads nowhere');
    expect(faultOf(`${folder}/loop.yaml`)?.found).toBe('links that lead round in a circle');
    expect(shelf.real(`${folder}/loop.yaml`)).toBeUndefined();
    expect(shelf.kind(`${folder}/loop.yaml`)).toBe('other');
  });

  test('a path that runs through a file, is too long, empty or has a NUL is a fault', () => {
    expect(faultOf(`${folder}/plain/below.yaml`)?.found).toMatch(/runs through a file|no folder 'plain'/);
    expect(faultOf(`${folder}/${'x'.repeat(5000)}`)?.found).toBe('a name longer than the system allows');
    expect(faultOf(`${folder}/a\0b`)?.found).toBe('a path with a NUL character');
    expect(faultOf('')?.found).toBe('an empty path');
    expect(faultOf(`${folder}/bad\uFFFDname.yaml`)?.found).toBe('a name that is not UTF-8');
  });

  test.skipIf(process.geteuid === undefined)('a file or folder that may not be read says what is missing', () => {
    write(folder, { 'shut/a.yaml': 'x', 'locked.yaml': 'x' });
    chmodSync(`${folder}/locked.yaml`, 0);
    chmodSync(`${folder}/shut`, 0);
    const refused = 'no permission to read it';
    asOrdinaryUser(() => {
      expect(faultOf(`${folder}/locked.yaml`)?.found).toBe(refused);
      expect(faultOf(`${folder}/shut/a.yaml`)?.found).toBe(refused);
      expect(shelf.list(`${folder}/shut`).faults[0]?.found).toBe(refused);
      expect(shelf.kind(`${folder}/shut/a.yaml`)).toBeUndefined();
    });
    chmodSync(`${folder}/shut`, 0o700);
  });

  test.each(['', '\0', 'x'.repeat(100_000), '\uD800', '/', '../'.repeat(500), `${folder}/plain/`, '/dev/tty'])(
    'no path throws (%#)',
    (path) => {
      for (const result of [shelf.read(path), shelf.list(path)]) {
        expect(result.value === undefined).toBe(result.faults.length > 0);
      }
      shelf.kind(path);
      shelf.real(path);
    },
  );
});

describe('listing a folder', () => {
  const folder = temporaryFolder();

  test('entries are sorted by code unit and links are told apart', () => {
    write(folder, { 'b.yaml': '', 'B.yaml': '', 'a/x.yaml': '', 'é.yaml': '', '10': '', '9': '' });
    symlinkSync('a', `${folder}/to-folder`);
    symlinkSync('b.yaml', `${folder}/to-file`);
    symlinkSync('gone', `${folder}/to-nothing`);
    expect(shelf.list(folder).value).toEqual([
      { name: '10', kind: 'file' },
      { name: '9', kind: 'file' },
      { name: 'B.yaml', kind: 'file' },
      { name: 'a', kind: 'folder' },
      { name: 'b.yaml', kind: 'file' },
      { name: 'to-file', kind: 'linked-file' },
      { name: 'to-folder', kind: 'linked-folder' },
      { name: 'to-nothing', kind: 'other' },
      { name: 'é.yaml', kind: 'file' },
    ]);
  });

  test('what an entry is agrees with what its path is', () => {
    for (const { name, kind } of shelf.list(folder).value ?? []) expect(shelf.kind(`${folder}/${name}`)).toBe(kind);
    expect(shelf.kind(`${folder}/absent`)).toBeUndefined();
  });

  test('10,000 entries come sorted', { timeout: 60_000 }, () => {
    const many = temporaryFolder();
    write(many, { one: '' });
    mkdirSync(`${many}/many`);
    for (let at = 0; at < 10_000; at += 1) linkSync(`${many}/one`, `${many}/many/${(at * 7919) % 10_000}.yaml`);
    const names = (shelf.list(`${many}/many`).value ?? []).map((entry) => entry.name);
    expect(names).toHaveLength(10_000);
    expect(names.every((name, at) => at === 0 || (names[at - 1] ?? '') < name)).toBe(true);
  });

  test('a folder that is not there, or is a file, is a fault', () => {
    expect(shelf.list(`${folder}/absent`).faults[0]?.found).toBe('no such folder');
    expect(shelf.list(`${folder}/b.yaml`).faults[0]?.found).toBe('a file');
  });
});
