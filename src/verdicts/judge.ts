import type { Run, StepRun } from '../quantities/run.ts';
import type { Fault } from '../shelf/fault.ts';
import { isDefault } from '../steps/given.ts';
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
  const verdicts = assumptionsFor(run, site).map((assumption) =>
    placed(judgeAssumption(assumption, cases, coverage), run),
  );
  return [...verdicts, ...judgeRatios(run, recipe.chamber.name, site, cases)];
}

/** Those of the intended process, then those held beside every step. */
function assumptionsFor(run: StepRun, site: Site): readonly Assumption[] {
  const { step } = run;
  const own = site.process(step.process);
  const beside = BESIDE_EVERY_STEP.flatMap((name) => site.process(name) ?? []);
  return [
    ...(own === undefined ? [] : [...(assumptionsOf(own).value ?? []), ...usualRanges(own, step)]),
    ...beside.flatMap((process) => assumptionsOf(process).value ?? []),
    ...chamberLimits(step),
  ];
}

/** A verdict stands at the first setpoint that could cure it and that the recipe states, else at the step. */
function placed(verdict: Verdict, { step }: StepRun): Verdict {
  if (verdict.kind === 'pass' || verdict.kind === 'notApplicable') return { ...verdict, place: step.place };
  for (const address of verdict.cure) {
    const origin = (step.givens.get(address) ?? firstBelow(step.givens, address))?.origin;
    if (origin !== undefined && !isDefault(origin) && origin.place.file === step.place.file) {
      return { ...verdict, place: origin.place };
    }
  }
  return { ...verdict, place: step.place };
}

/** The first given under an address that stands for several: `flows` for `flows.Ar`. */
function firstBelow<T>(givens: ReadonlyMap<string, T>, address: string): T | undefined {
  const prefix = `${address}.`;
  for (const [key, given] of givens) if (key.startsWith(prefix)) return given;
  return undefined;
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
