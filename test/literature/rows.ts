import { readdirSync, readFileSync } from 'node:fs';
import { si } from './units.ts';

/** One published or recomputed number, as test/literature/data holds it. */
export interface Row {
  readonly id: string;
  readonly states: string;
  readonly inputs: Readonly<Record<string, Value>>;
  readonly expected: string | number;
  /** Relative tolerance; a row without it expects a word. */
  readonly within?: number;
  /** Printed numbers carry the rounding of their source, recomputed ones follow from the formula and the constants. */
  readonly kind: 'printed' | 'recomputed';
  readonly source: string;
}

export type Value = string | number | readonly (string | number)[];

const DATA = new URL('./data/', import.meta.url);
const NOT_ROWS = ['tables.json'];

/** Names of the files of rows, without their ending. */
export function rowFiles(): readonly string[] {
  return readdirSync(DATA)
    .filter((name) => name.endsWith('.json') && !NOT_ROWS.includes(name))
    .map((name) => name.slice(0, -5));
}

export function rowsOf(file: string): readonly Row[] {
  return listOf(file, isRow);
}

/** The list that a file of data holds, if all of it is of the kind. */
function listOf<T>(file: string, isOfKind: (entry: unknown) => entry is T): readonly T[] {
  const list: unknown = JSON.parse(readFileSync(new URL(`${file}.json`, DATA), 'utf8'));
  if (Array.isArray(list) && list.every(isOfKind)) return list;
  throw new Error(`${file}.json holds something else`);
}

function isRow(entry: unknown): entry is Row {
  return has(entry, 'id', 'states', 'inputs', 'expected', 'kind', 'source');
}

function isTable(entry: unknown): entry is Table {
  return has(entry, 'table', 'columns', 'source', 'values');
}

function has(entry: unknown, ...keys: readonly string[]): boolean {
  return typeof entry === 'object' && entry !== null && keys.every((key) => key in entry);
}

/** Reads the inputs of a row, in SI. */
export class Inputs {
  readonly #inputs: Row['inputs'];

  constructor({ inputs }: Row) {
    this.#inputs = inputs;
  }

  number(name: string): number {
    const value = this.#inputs[name];
    if (typeof value === 'number' || typeof value === 'string') return si(value);
    throw new Error(`the row has no number ${name}`);
  }

  list(name: string): readonly number[] {
    const value = this.#inputs[name];
    if (typeof value === 'object') return value.map(si);
    throw new Error(`the row has no list ${name}`);
  }
}

/** Lines of a table of comma-separated values under its heading; a field with a comma stands in double quotes. */
export function csvOf(file: string): readonly (readonly string[])[] {
  const [, ...lines] = readFileSync(new URL(`${file}.csv`, DATA), 'utf8')
    .trimEnd()
    .split('\n');
  return lines.map((line) =>
    [...line.matchAll(/("[^"]*"|[^,]*)(?:,|$)/g)].map(([, field = '']) => field.replaceAll('"', '')),
  );
}

export interface Table {
  readonly table: string;
  readonly columns: readonly string[];
  readonly source: string;
  readonly values: Readonly<Record<string, readonly (number | null)[]>>;
}

export function table(name: string): Table {
  const found = listOf('tables', isTable).find((one) => one.table === name);
  if (found === undefined) throw new Error(`no table ${name}`);
  return found;
}
