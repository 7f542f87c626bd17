import type { Run, StepRun } from '../quantities/run.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Recipe, Waiver } from '../steps/step.ts';
import type { Site } from '../steps/site.ts';
import { BESIDE_EVERY_STEP } from '../steps/waivable.ts';
import { assumptionsOf, type Assumption } from './assumption.ts';
import { casesOf } from './cases.ts';
import { cautionsOf } from './cautions.ts';
import { judgeAssumption } from './judge-assumption.ts';
import type { JudgedStep, Judgement } from './judgement.ts';
import { judgeRatios, ratioFaults } from './ratios.ts';
import { chamberLimits, usualFaults, usualRanges } from './stated-limits.ts';
import type { Note, Verdict } from './verdict.ts';
import { applyWaivers } from './waivers.ts';

/** Every assumption of every step held against its number. `today` (YYYY-MM-DD) decides which waivers still hold. */
export function judge(run: Run, today: string = localDate(new Date())): Judgement {
  const used = new Set<Waiver>();
  const notes: Note[] = revisionNotes(run.recipe);
  const faults: Fault[] = [];
  const steps = run.steps.map((step) => {
    const verdicts = verdictsOf(step, run);
    const waived = applyWaivers(step.step, verdicts, today);
    for (const waiver of waived.used) used.add(waiver);
    notes.push(...waived.notes);
    faults.push(...waived.faults);
    return { run: step, verdicts: waived.verdicts } satisfies JudgedStep;
  });
  notes.push(...unusedWaivers(run, used));
  return { run, steps, cautions: cautionsOf(run), notes, faults };
}

/** What is wrong with the processes and ratios of a site: numbers that nobody knows, bounds in a wrong unit. */
export function processFaults(site: Site): readonly Fault[] {
  const processes = site.processNames().flatMap((name) => site.process(name) ?? []);
  return [
    ...processes.flatMap((process) => [...assumptionsOf(process).faults, ...usualFaults(process)]),
    ...ratioFaults(site),
  ];
}

function verdictsOf(run: StepRun, { site, recipe }: Run): readonly Verdict[] {
  const cases = casesOf(run);
  const coverage = site.show.coverageFactor;
  const verdicts = assumptionsFor(run, site).map((assumption) => judgeAssumption(assumption, cases, coverage));
  return [...verdicts, ...judgeRatios(run, recipe.chamber.name, site, cases)];
}

/** Those of the intended process, then those held beside every step. */
function assumptionsFor(run: StepRun, site: Site): readonly Assumption[] {
  const own = site.process(run.step.process);
  const assumptions = own === undefined ? [] : [...(assumptionsOf(own).value ?? []), ...usualRanges(own)];
  for (const name of BESIDE_EVERY_STEP) {
    const process = site.process(name);
    if (process !== undefined) assumptions.push(...(assumptionsOf(process).value ?? []));
  }
  assumptions.push(...chamberLimits(run));
  return assumptions;
}

function revisionNotes({ qualifiedOn, chamber, place }: Recipe): Note[] {
  if (qualifiedOn === undefined || qualifiedOn === chamber.revision) return [];
  return [{ kind: 'chamber-revision', qualifiedOn, revision: chamber.revision, place }];
}

/** Waivers that met no finding in any step they stand for. */
function unusedWaivers({ steps }: Run, used: ReadonlySet<Waiver>): readonly Note[] {
  const seen = new Set<Waiver>();
  return steps.flatMap(({ step }) =>
    step.waivers.flatMap((waiver): Note[] => {
      if (used.has(waiver) || seen.has(waiver)) return [];
      seen.add(waiver);
      return [{ kind: 'waiver-unused', step: step.path, waiver }];
    }),
  );
}

function localDate(now: Date): string {
  const two = (number: number) => String(number).padStart(2, '0');
  return `${String(now.getFullYear())}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
