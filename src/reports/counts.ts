import type { Judgement } from '../verdicts/judgement.ts';
import type { Kind, Level, Verdict } from '../verdicts/verdict.ts';
import type { Hazard } from '../substances/gas.ts';
import { cautionCount } from './cautions.ts';
import { joined, type GasesByHazard } from './hazards.ts';

/** What many recipes add up to. Plain data: parts of a run add theirs. */
export interface Counts {
  readonly recipes: number;
  readonly steps: number;
  /** Steps by their worst verdict that is not waived; they add up to `steps`. */
  readonly stepsByWorst: Readonly<Record<StepOutcome, number>>;
  /** All verdicts by kind, waived ones included. */
  readonly verdicts: Readonly<Record<Kind, number>>;
  /** What may block: verdicts that are not waived, by kind and grade. */
  readonly unwaived: Readonly<Record<Blocking, Readonly<Record<Level, number>>>>;
  readonly waived: number;
  readonly cautions: number;
  readonly notes: number;
  readonly faults: number;
  /** YAML files that are none of ours. */
  readonly passedOver: number;
  /** Gases met by hazard, for the caution at the end of many recipes. */
  readonly hazards: GasesByHazard;
  /** Recipes in which a fuel and an oxidiser flow in one step. */
  readonly fuelWithOxidiser: number;
}

export type StepOutcome = 'pass' | 'review' | 'fail' | 'open' | 'nothingJudged';
export type Blocking = 'fail' | 'review' | 'open';

const NO_LEVELS: Readonly<Record<Level, number>> = { error: 0, warning: 0, note: 0 };

export const NO_COUNTS: Counts = {
  recipes: 0,
  steps: 0,
  stepsByWorst: { pass: 0, review: 0, fail: 0, open: 0, nothingJudged: 0 },
  verdicts: { pass: 0, review: 0, fail: 0, open: 0, notApplicable: 0 },
  unwaived: { fail: NO_LEVELS, review: NO_LEVELS, open: NO_LEVELS },
  waived: 0,
  cautions: 0,
  notes: 0,
  faults: 0,
  passedOver: 0,
  hazards: {},
  fuelWithOxidiser: 0,
};

export function countJudgement({ steps, cautions, notes }: Judgement): Counts {
  const stepsByWorst = { ...NO_COUNTS.stepsByWorst };
  const verdicts = { ...NO_COUNTS.verdicts };
  const unwaived = { fail: { ...NO_LEVELS }, review: { ...NO_LEVELS }, open: { ...NO_LEVELS } };
  let waived = 0;
  for (const step of steps) {
    stepsByWorst[outcomeOf(step.verdicts)] += 1;
    for (const verdict of step.verdicts) {
      verdicts[verdict.kind] += 1;
      if (verdict.waived !== undefined) waived += 1;
      else if (isBlocking(verdict.kind)) unwaived[verdict.kind][verdict.level] += 1;
    }
  }
  const hazards: Partial<Record<Hazard, readonly string[]>> = {};
  for (const caution of cautions) if (caution.kind === 'hazard') hazards[caution.hazard] = caution.gases;
  return {
    recipes: 1,
    steps: steps.length,
    stepsByWorst,
    verdicts,
    unwaived,
    waived,
    cautions: cautionCount(cautions),
    notes: notes.length,
    faults: 0,
    passedOver: 0,
    hazards,
    fuelWithOxidiser: cautions.some(({ kind }) => kind === 'fuel-with-oxidiser') ? 1 : 0,
  };
}

export function addCounts(a: Counts, b: Counts): Counts {
  return {
    recipes: a.recipes + b.recipes,
    steps: a.steps + b.steps,
    stepsByWorst: sum(a.stepsByWorst, b.stepsByWorst),
    verdicts: sum(a.verdicts, b.verdicts),
    unwaived: {
      fail: sum(a.unwaived.fail, b.unwaived.fail),
      review: sum(a.unwaived.review, b.unwaived.review),
      open: sum(a.unwaived.open, b.unwaived.open),
    },
    waived: a.waived + b.waived,
    cautions: a.cautions + b.cautions,
    notes: a.notes + b.notes,
    faults: a.faults + b.faults,
    passedOver: a.passedOver + b.passedOver,
    hazards: joined(a.hazards, b.hazards),
    fuelWithOxidiser: a.fuelWithOxidiser + b.fuelWithOxidiser,
  };
}

/** What of a run blocks. */
export interface BlockOptions {
  readonly blockAt: Level | 'never';
  /** Whether what is to review or open blocks too. */
  readonly unproven: boolean;
}

/** How many verdicts block. */
export function blocking({ unwaived }: Counts, { blockAt, unproven }: BlockOptions): number {
  if (blockAt === 'never') return 0;
  const levels = BLOCKED_FROM[blockAt];
  const kinds: readonly Blocking[] = unproven ? ['fail', 'review', 'open'] : ['fail'];
  let total = 0;
  for (const kind of kinds) for (const level of levels) total += unwaived[kind][level];
  return total;
}

/** The worst of a step's verdicts that is not waived. A waived finding leaves the step as its other verdicts find it. */
export function outcomeOf(verdicts: readonly Verdict[]): StepOutcome {
  let worst = -1;
  for (const { kind, waived } of verdicts) {
    const rank = waived === undefined ? RANKS[kind] : 0;
    if (rank > worst) worst = rank;
  }
  return OUTCOMES[worst] ?? 'nothingJudged';
}

const BLOCKED_FROM: Readonly<Record<Level, readonly Level[]>> = {
  error: ['error'],
  warning: ['error', 'warning'],
  note: ['error', 'warning', 'note'],
};

const RANKS: Readonly<Record<Kind, number>> = { notApplicable: -1, pass: 0, open: 1, review: 2, fail: 3 };
const OUTCOMES: readonly StepOutcome[] = ['pass', 'open', 'review', 'fail'];

function isBlocking(kind: Kind): kind is Blocking {
  return kind === 'fail' || kind === 'review' || kind === 'open';
}

function sum<K extends string>(a: Readonly<Record<K, number>>, b: Readonly<Record<K, number>>): Record<K, number> {
  const total: Record<K, number> = { ...a };
  for (const key in b) total[key] += b[key];
  return total;
}
