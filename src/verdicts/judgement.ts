import type { Run, StepRun } from '../quantities/run.ts';
import type { Caution, Note, Verdict } from './verdict.ts';

/** All that was found of one recipe. */
export interface Judgement {
  readonly run: Run;
  readonly steps: readonly JudgedStep[];
  readonly cautions: readonly Caution[];
  readonly notes: readonly Note[];
}

export interface JudgedStep {
  readonly run: StepRun;
  /** Of the intended process first, then of the chamber, in the order of their documents. */
  readonly verdicts: readonly Verdict[];
}
