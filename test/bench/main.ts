import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { writeFleet } from './fleet.ts';

/*
 * What the program costs against a floor measured in the same run on the same machine: a bare node, and the same files parsed
 * to positions by the YAML library alone. Ratios are what to hold; milliseconds are the machine's.
 */

const COMMAND = 'dist/regimen.js';
const RUNS = 9;

interface Measured {
  readonly milliseconds: number;
  readonly megabytes: number;
}

/** Wall time and peak memory of a whole process, median of several runs, the first not counted. */
function measure(args: readonly string[], runs = RUNS): Measured {
  const results = Array.from({ length: runs + 1 }, () => once(args)).slice(1);
  return {
    milliseconds: median(results.map((one) => one.milliseconds)),
    megabytes: median(results.map((one) => one.megabytes)),
  };
}

function once(args: readonly string[]): Measured {
  const started = process.hrtime.bigint();
  const { stderr, error } = spawnSync('/usr/bin/env', ['time', '-f', 'peak %M', process.execPath, ...args], {
    encoding: 'utf8',
    maxBuffer: 1 << 30,
  });
  if (error !== undefined) throw error;
  const milliseconds = Number(process.hrtime.bigint() - started) / 1e6;
  const peak = /peak (\d+)/.exec(stderr)?.[1];
  return { milliseconds, megabytes: peak === undefined ? NaN : Number(peak) / 1024 };
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[sorted.length >> 1] ?? NaN;
}

const rows: string[][] = [];

function row(what: string, measured: Measured, floor: Measured | undefined, most: string): void {
  const ratio = floor === undefined ? '' : `${(measured.milliseconds / floor.milliseconds).toFixed(2)} x`;
  const memory = Number.isNaN(measured.megabytes) ? '' : `${measured.megabytes.toFixed(0)} MB`;
  rows.push([what, `${measured.milliseconds.toFixed(0)} ms`, memory, ratio, most]);
}

function startUp(): void {
  const bare = measure(['-e', '0']);
  row('node -e 0', bare, undefined, '');
  row('--version', measure([COMMAND, '--version']), bare, 'at most 1.5 x');
  row(
    'check of one file',
    measure([COMMAND, 'check', 'recipes/recipes/etch/contact-open.yaml']),
    bare,
    'at most 2.5 x',
  );
}

function bulk(folder: string, count: number): void {
  const site = join(folder, String(count));
  writeFleet(site, count);
  const runs = count > 5000 ? 1 : 3;
  const parser = join(folder, 'parse.mjs');
  writeFileSync(parser, PARSE);
  const floor = measure([parser, join(site, 'recipes')], runs);
  row(`${count} recipes: yaml to positions`, floor, undefined, '');
  row(
    `${count} recipes: check, one core`,
    measure([COMMAND, 'check', site, '--jobs', '1'], runs),
    floor,
    'at most 1.5 x',
  );
  row(`${count} recipes: check`, measure([COMMAND, 'check', site], runs), floor, '');
}

/** The floor: every file read and parsed to a document whose nodes know their places. */
const PARSE = `import { readdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { pathToFileURL } from 'node:url';
const require = createRequire(pathToFileURL(process.cwd() + '/package.json'));
const { LineCounter, parseDocument } = require('yaml');
const folder = process.argv[2];
let lines = 0;
for (const name of readdirSync(folder)) {
  const lineCounter = new LineCounter();
  const document = parseDocument(readFileSync(folder + '/' + name, 'utf8'), { lineCounter });
  if (document.errors.length > 0) throw document.errors[0];
  lines += lineCounter.lineStarts.length;
}
console.log(lines);
`;

const folder = mkdtempSync(join(tmpdir(), 'regimen-bench-'));
try {
  startUp();
  bulk(folder, 2000);
  if (process.argv.includes('--large')) bulk(folder, 20000);
} finally {
  rmSync(folder, { recursive: true });
}
const widths = [0, 1, 2, 3, 4].map((column) => Math.max(...rows.map((cells) => cells[column]?.length ?? 0)));
for (const cells of rows) {
  console.log(
    cells
      .map((cell, column) => (column === 0 ? cell.padEnd(widths[0] ?? 0) : cell.padStart(widths[column] ?? 0)))
      .join('   ')
      .trimEnd(),
  );
}
