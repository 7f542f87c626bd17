import type { JudgedStep, Judgement } from '../../verdicts/judgement.ts';
import { cautionSummary } from '../cautions.ts';
import { countJudgement, outcomeOf, type Counts } from '../counts.ts';
import { noteText } from '../notes.ts';
import type { CheckOptions, Fold } from '../options.ts';
import type { Block, CycleBlock, Page, RecipeHead, StepBlock } from '../page.ts';
import { shownFor, type Shown } from '../shown.ts';
import { checkSheet } from './check-sheet.ts';
import { cycleBlock, stepBlock } from './check-step.ts';
import { outcomeWords } from './outcome.ts';
import { recipeHeadOf } from './recipe-head.ts';

/** What `check` tells of one recipe, and what it adds to the counts of the run. */
export interface Part extends Page {
  readonly counts: Counts;
}

/**
 * One recipe, judged. It depends on nothing but that recipe. Its faults are not told here: those of a chamber come with
 * each of its recipes, and a run tells them once.
 */
export function checkPart(judgement: Judgement, options: CheckOptions): Part {
  const shown = shownFor(judgement.run, options.units);
  return {
    blocks: recipeBlocks(judgement, shown, options),
    counts: countJudgement(judgement),
    sheet: () => checkSheet(judgement, shown),
  };
}

function recipeBlocks(judgement: Judgement, shown: Shown, { fold }: CheckOptions): readonly Block[] {
  const told = fold === 'none' ? judgement.steps : judgement.steps.filter(hasFinding);
  const notes = judgement.notes.map((note) => ({ kind: 'note' as const, text: noteText(note, judgement).text }));
  if (told.length === 0 && notes.length === 0 && fold === 'recipes') return [];
  const head = recipeHead(judgement, fold, told.length + notes.length > 0);
  const steps = { kind: 'steps' as const, steps: withCycles(told, judgement, { shown, fold }) };
  return [head, ...(told.length === 0 ? [] : [steps]), ...notes, ...(fold === 'none' ? cautionBlock(judgement) : [])];
}

function hasFinding({ verdicts }: JudgedStep): boolean {
  const outcome = outcomeOf(verdicts);
  return outcome !== 'pass' && outcome !== 'nothingJudged';
}

function recipeHead({ run, steps }: Judgement, fold: Fold, anything: boolean): RecipeHead {
  const { file, ...head } = recipeHeadOf(run);
  const outcome = fold === 'none' ? {} : { outcome: outcomeWords(steps.map(({ verdicts }) => outcomeOf(verdicts))) };
  return { ...head, ...outcome, ...(anything || fold === 'none' ? { file } : {}) };
}

/** The steps, each cycle told before its first step that is told. */
function withCycles(
  steps: readonly JudgedStep[],
  { run }: Judgement,
  { shown, fold }: { readonly shown: Shown; readonly fold: Fold },
): readonly (StepBlock | CycleBlock)[] {
  const open = new Set<string>();
  const telling = { file: run.recipe.file, shown, told: new Set<string>(), brief: fold === 'recipes' };
  return steps.flatMap((step) => {
    const entered = run.recipe.cycles.filter(
      ({ path }) => !open.has(path) && step.run.step.path.startsWith(`${path}/`),
    );
    for (const { path } of entered) open.add(path);
    return [...entered.map((cycle) => cycleBlock(cycle)), stepBlock(step, telling)];
  });
}

function cautionBlock({ cautions }: Judgement): readonly Block[] {
  const text = cautionSummary(cautions);
  return text === undefined ? [] : [{ kind: 'caution', text }];
}
