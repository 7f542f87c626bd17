import { COLOUR_CHOICES, isColourChoice } from './colour.ts';
import { outProblem } from './out-targets.ts';
import { readValue } from './read-value.ts';
import { ENDINGS, FORMATS, formatOf, isFormat } from './formats.ts';
import { siteProblem } from './sites.ts';
import { diskShelf } from '../shelf/disk.ts';
import { unknownWord } from './problem.ts';
import { DIMENSION_NAMES, isDimension } from '../units/dimensions.ts';
import { spellingsOf, unitSpelled } from '../units/lookup.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Level } from '../verdicts/verdict.ts';
import type { Options } from './call.ts';
import type { Given } from './command-line.ts';
import type { OptionName } from './options.ts';
import type { Problem } from './problem.ts';

/** The options of a command line that has these arguments, or the first thing that is wrong with them. */
export function readOptions(given: Given, args: readonly string[]): Read {
  const problems: Problem[] = [];
  const options = optionsFrom(given, args, (problem) => problems.push(problem));
  const [problem] = problems;
  return problem === undefined ? { options } : { problem };
}

type Read =
  | { readonly options: Options; readonly problem?: undefined }
  | { readonly problem: Problem; readonly options?: undefined };

/** Also by the environment, for runs that nobody watches. */
export function wantsTrace(given: Given): boolean {
  const { REGIMEN_TRACE = '' } = process.env;
  return given.has('trace') || REGIMEN_TRACE !== '';
}

type Complain = (problem: Problem) => void;

function optionsFrom(given: Given, args: readonly string[], complain: Complain): Options {
  const last = (name: OptionName): string | undefined => given.get(name)?.at(-1);
  return {
    out: readOut(given.get('out') ?? [], args, complain),
    format: readWord('--format', last('format') ?? 'text', FORMATS, isFormat, complain) ?? 'text',
    color: readWord('--color', last('color') ?? 'auto', COLOUR_CHOICES, isColourChoice, complain) ?? 'auto',
    units: readUnits(last('units') ?? '', complain),
    columns: itemsOf(last('columns') ?? ''),
    blockAt: readWord('--block-at', last('block-at') ?? 'error', BLOCK_AT, isBlockAt, complain) ?? 'error',
    unproven: given.has('unproven'),
    trace: wantsTrace(given),
    ...optional('site', readSite(last('site'), complain)),
    ...optional('at', last('at')),
    ...optional('jobs', readJobs(last('jobs'), complain)),
    ...optional('today', readDay(last('today'), complain)),
    ...optional('temperature', readValue('temperature', last('temperature'), complain)),
    ...optional('pressure', readValue('pressure', last('pressure'), complain)),
  };
}

function optional<K extends string, V>(key: K, value: V | undefined): Partial<Record<K, V>> {
  const made: Partial<Record<K, V>> = {};
  if (value !== undefined) made[key] = value;
  return made;
}

const BLOCK_AT = ['error', 'warning', 'note', 'never'] as const;

function isBlockAt(word: string): word is Level | 'never' {
  return BLOCK_AT.some((level) => level === word);
}

function readWord<W extends string>(
  what: string,
  word: string,
  allowed: readonly string[],
  isAllowed: (word: string) => word is W,
  complain: Complain,
): W | undefined {
  if (isAllowed(word)) return word;
  complain(unknownWord(what, word, allowed));
  return undefined;
}

function readOut(paths: readonly string[], inputs: readonly string[], complain: Complain): readonly string[] {
  if (paths.length === 0) return paths;
  const unnamed = paths.find((path) => formatOf(path) === undefined);
  if (unnamed !== undefined) complain({ found: `the ending of --out ${unnamed} names no format`, right: ENDS });
  const problem = outProblem(diskShelf(), paths, inputs);
  if (problem !== undefined) complain(problem);
  return paths;
}

const ENDS = `end it in ${[...ENDINGS.keys()].map((ending) => `.${ending}`).join(' ')}`;

function readUnits(list: string, complain: Complain): ReadonlyMap<Dimension, string> {
  const units = new Map<Dimension, string>();
  for (const item of itemsOf(list)) {
    const [name = '', unit] = item.split('=').map((part) => part.trim());
    if (!isDimension(name)) complain(unknownWord('dimension', name, DIMENSION_NAMES));
    else if (unit === undefined) complain({ found: `--units ${item} names no unit`, right: `${name}=UNIT` });
    else {
      const known = unitSpelled(unit, name);
      if (known === undefined) complain(unknownWord('unit', unit, [...spellingsOf(name)]));
      else units.set(name, known.name);
    }
  }
  return units;
}

function itemsOf(list: string): readonly string[] {
  return list
    .split(',')
    .map((item) => item.trim())
    .filter((item) => item !== '');
}

function readSite(path: string | undefined, complain: Complain): string | undefined {
  const problem = path === undefined ? undefined : siteProblem(diskShelf(), path);
  if (problem !== undefined) complain(problem);
  return path;
}

function readJobs(text: string | undefined, complain: Complain): number | undefined {
  if (text === undefined) return undefined;
  const jobs = /^[0-9]{1,3}$/.test(text) ? Number(text) : 0;
  if (jobs < 1 || jobs > MOST_JOBS)
    complain({ found: `--jobs ${text}`, right: `a whole number from 1 to ${MOST_JOBS}` });
  return jobs;
}

const MOST_JOBS = 64;

function readDay(text: string | undefined, complain: Complain): string | undefined {
  if (text === undefined) return undefined;
  const day = new Date(`${text}T00:00:00Z`);
  const isDay = /^\d{4}-\d{2}-\d{2}$/.test(text) && !Number.isNaN(day.getTime()) && day.toISOString().startsWith(text);
  if (!isDay) complain({ found: `--today ${text} is no day`, right: 'write YYYY-MM-DD' });
  return text;
}
