import { fullName } from './checked-reference.ts';
import { setImmediate } from 'node:timers/promises';
import { addCounts, NO_COUNTS } from '../reports/counts.ts';
import { foldFor } from '../reports/options.ts';
import { counted } from '../reports/words.ts';
import { givenShelf } from './given-shelf.ts';
import { jobStream } from './job-stream.ts';
import { openOutputs } from './outputs.ts';
import { AT_HAND, AT_HAND_LENGTH, partsOf } from './parts.ts';
import { findRecipes } from './recipe-files.ts';
import { reportsOn } from './reports.ts';
import { sitesOn } from './sites.ts';
import { formatProblem, tellFailure, tellProblem, tellUnwritten } from './tell.ts';
import { toldPathFault } from './told-fault.ts';
import type { Counts } from '../reports/counts.ts';
import type { Call, Options } from './call.ts';
import type { Format } from './formats.ts';
import type { JobStream } from './job-stream.ts';
import type { Out } from './out.ts';
import type { Outputs } from './outputs.ts';
import type { Part, Work } from './part.ts';
import type { Closing } from './report.ts';
import type { Reports } from './reports.ts';

/** A command that does the same with every recipe it is given. */
export interface RecipeCommand {
  readonly command: Work['command'];
  readonly formats: readonly Format[];
  closing(counts: Counts, work: Work): Closing;
}

export interface RunResult {
  readonly counts: Counts;
  /** Whether the job was done in full. */
  readonly whole: boolean;
}

/** Finds recipes, works on each and writes the parts in the order of their files, as they come. */
export async function runRecipes({ args, options, out }: Call, what: RecipeCommand): Promise<RunResult> {
  const problem = formatProblem(options, what.formats);
  if (problem !== undefined) {
    tellProblem(out, problem);
    return { counts: NO_COUNTS, whole: false };
  }
  const outputs = openOutputs(out, options);
  let ended = false;
  try {
    const result = await runOnto(outputs, { args, options, out }, what);
    ended = true;
    return finished(outputs, result, out);
  } finally {
    if (!ended) outputs.finish(false);
  }
}

async function runOnto(outputs: Outputs, { args, options, out }: Call, what: RecipeCommand): Promise<RunResult> {
  const { shelf, paths, faults } = givenShelf(args, options.at);
  const sites = sitesOn(shelf, options.site);
  const jobs = jobStream(findRecipes(shelf, sites, paths));
  const first = jobs.take(AT_HAND, AT_HAND_LENGTH);
  const work = workFor(what, options, outputs, first.length);
  const reports = reportsOn(outputs, shelf, sites.met(), out);
  const begun = reports.faults([...faults.map((fault) => toldPathFault(shelf, '', fault)), ...jobs.faults()]);
  const parts = partsOf(first, jobs, work, sites, options.jobs);
  const result = await writeParts(parts, { reports, outputs, out, trace: options.trace });
  const more = reports.faults(jobs.faults());
  const counts = { ...result.counts, faults: result.counts.faults + begun + more, passedOver: jobs.passedOver };
  const none = counts.recipes === 0 && counts.faults === 0;
  if (none) tellProblem(out, nothingFound(args, jobs));
  reports.close(what.closing(counts, work));
  return { counts, whole: result.whole && counts.faults === 0 && !none };
}

function workFor({ command }: RecipeCommand, options: Options, { each }: Outputs, recipes: number): Work {
  const { units, blockAt, unproven, columns, today, site } = options;
  return {
    command,
    styles: each.map(({ style }) => style),
    check: { units, blockAt, unproven, fold: foldFor(recipes) },
    columns: columns.map(fullName),
    ...(today === undefined ? {} : { today }),
    ...(site === undefined ? {} : { site }),
  };
}

interface Desk {
  readonly reports: Reports;
  readonly outputs: Outputs;
  readonly out: Out;
  readonly trace: boolean;
}

async function writeParts(parts: AsyncIterable<Part>, { reports, outputs, out, trace }: Desk): Promise<RunResult> {
  let counts = NO_COUNTS;
  let whole = true;
  const clock = progressClock(out);
  for await (const part of parts) {
    const fresh = reports.faults(part.faults);
    reports.part(part);
    counts = addCounts(counts, { ...part.counts, faults: fresh });
    if (part.failure !== undefined) {
      tellFailure(out, part.failure, trace);
      whole = false;
    }
    if (outputs.isIdle()) break;
    await clock.tick(counts.recipes);
  }
  return { counts, whole };
}

/** Lets interrupts through now and then, and tells on a terminal how far the run is once it takes long. */
function progressClock(out: Out): { tick(recipes: number): Promise<void> } {
  const start = Date.now();
  let last = start;
  return {
    async tick(recipes) {
      const now = Date.now();
      if (now - last < PERIOD) return;
      last = now;
      if (now - start > PATIENCE) out.progress(`${counted(recipes, 'recipe')} so far`);
      await setImmediate();
    },
  };
}

/** Between looks at the clock, and until a run takes long, in milliseconds. */
const PERIOD = 100;
const PATIENCE = 1000;

function nothingFound(args: readonly string[], { passedOver }: JobStream): { found: string; right: string } {
  const where = args.length === 0 ? 'here' : `in ${args.join(', ')}`;
  const others = passedOver === 0 ? '' : ` (${counted(passedOver, 'other YAML file')} passed over)`;
  return { found: `no recipe found ${where}${others}`, right: "a recipe's first line is 'regimen: recipe 1'" };
}

function finished(outputs: Outputs, { counts, whole }: RunResult, out: Out): RunResult {
  const faults = [...outputs.faults, ...outputs.finish(true)];
  for (const fault of faults) tellUnwritten(out, fault);
  return { counts, whole: whole && faults.length === 0 };
}
