import type { Run, StepRun } from '../quantities/run.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Caution, Note, Verdict } from './verdict.ts';

/** All that was found of one recipe. */
export interface Judgement {
  readonly run: Run;
  readonly steps: readonly JudgedStep[];
  readonly cautions: readonly Caution[];
  readonly notes: readonly Note[];
  /** What only judging could find wrong: a waiver that holds to a value in a wrong unit. */
  readonly faults: readonly Fault[];
}

export interface JudgedStep {
  readonly run: StepRun;
  /** Of the intended process first, then of the chamber, in the order of their documents. */
  readonly verdicts: readonly Verdict[];
}
