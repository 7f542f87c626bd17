import type { AskedUnits } from '../reports/shown.ts';
import type { Level } from '../verdicts/verdict.ts';
import type { ColourChoice } from './colour.ts';
import type { Format } from './formats.ts';
import type { Out } from './out.ts';

/** 0 nothing blocks, 1 a verdict blocks, 2 the job could not be done in full. */
export type ExitCode = 0 | 1 | 2;

/** One call of a command, its options read. */
export interface Call {
  readonly args: readonly string[];
  readonly options: Options;
  readonly out: Out;
}

/** What a command does. It writes through `out` only and never ends the process. */
export type Run = (call: Call) => ExitCode | Promise<ExitCode>;

/** Options of all commands; those that a command does not have are at their defaults. */
export interface Options {
  /** Files to write beside standard output; their endings choose the format. */
  readonly out: readonly string[];
  /** Format of standard output. */
  readonly format: Format;
  readonly color: ColourChoice;
  readonly units: AskedUnits;
  readonly columns: readonly string[];
  readonly blockAt: Level | 'never';
  readonly unproven: boolean;
  /** The site to use whatever lies nearest: its folder or its document. */
  readonly site?: string;
  /** The name that standard input would have as a file. */
  readonly at?: string;
  /** How many recipes to work on at a time; by default as many as pay. */
  readonly jobs?: number;
  /** The day on which waivers are held against, as YYYY-MM-DD. */
  readonly today?: string;
  /** K. */
  readonly temperature?: number;
  /** Pa. */
  readonly pressure?: number;
  /** Whether to tell where the program failed, should it. */
  readonly trace: boolean;
}
