import { mkdirSync, mkdtempSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll } from 'vitest';
import { wholeFile } from '../../src/shelf/fault.ts';
import { readPattern } from '../../src/shelf/patterns.ts';
import type { Pattern } from '../../src/shelf/patterns.ts';

const made: string[] = [];

/** A fresh folder that is gone after the tests of the file. */
export function temporaryFolder(): string {
  const folder = realpathSync(mkdtempSync(join(tmpdir(), 'shelf-')));
  made.push(folder);
  return folder;
}

/** Writes the texts below the folder, making the folders they need. */
export function write(folder: string, texts: Readonly<Record<string, string | Uint8Array>>): void {
  for (const [path, text] of Object.entries(texts)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), text);
  }
}

afterAll(() => {
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true, force: true });
});

/** The pattern, which must be a sound one. */
export function pattern(text: string): Pattern {
  const { value, faults } = readPattern(text, wholeFile('regimen.yaml'));
  if (value === undefined) throw new Error(faults[0]?.found);
  return value;
}
