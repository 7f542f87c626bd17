import type { Waiver } from '../steps/step.ts';
import type { Note, Verdict } from './verdict.ts';

/** Verdicts of a step with its waivers applied, and what is to be said of the waivers. */
export interface Waived {
  readonly verdicts: readonly Verdict[];
  /** Waivers that met a finding and hold. */
  readonly used: readonly Waiver[];
  readonly notes: readonly Note[];
}

/** Reads the value up to which a waiver holds, in SI, in the dimension of the verdict's number; undefined where it can't be read. */
export type ReadHoldsTo = (text: string | number, verdict: Verdict) => number | undefined;

/** A waiver holds up to its last day and up to the value for which it was granted; beyond, the finding comes back. */
export function applyWaivers(
  step: string,
  verdicts: readonly Verdict[],
  waivers: readonly Waiver[],
  today: string,
  readHoldsTo: ReadHoldsTo,
): Waived {
  const used: Waiver[] = [];
  const notes: Note[] = [];
  const applied = verdicts.map((verdict) => {
    const waiver = waivers.find((one) => isFinding(verdict) && names(one, verdict));
    if (waiver === undefined) return verdict;
    used.push(waiver);
    if (waiver.until < today) {
      notes.push({ kind: 'waiver-expired', step, waiver });
      return verdict;
    }
    const holdsTo = waiver.holdsTo === undefined ? undefined : readHoldsTo(waiver.holdsTo, verdict);
    if (outgrown(verdict, holdsTo)) {
      notes.push({ kind: 'waiver-outgrown', step, waiver });
      return verdict;
    }
    return { ...verdict, waived: grantOf(waiver, holdsTo) };
  });
  return { verdicts: applied, used, notes };
}

function isFinding({ kind }: Verdict): boolean {
  return kind === 'fail' || kind === 'review' || kind === 'open';
}

function names({ assumption }: Waiver, verdict: Verdict): boolean {
  return assumption === verdict.assumption || assumption === verdict.name;
}

function outgrown({ value, limit }: Verdict, holdsTo: number | undefined): boolean {
  if (holdsTo === undefined || value === undefined || limit === undefined) return false;
  return limit.side === 'at_most' ? value > holdsTo : value < holdsTo;
}

function grantOf({ reason, approvedBy, until }: Waiver, holdsTo: number | undefined): NonNullable<Verdict['waived']> {
  return { reason, approved_by: approvedBy, until, ...(holdsTo === undefined ? {} : { holds_to: holdsTo }) };
}
