import { dimensionOfNumber } from '../quantities/catalogue.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Step, Waiver } from '../steps/step.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import type { Note, Verdict } from './verdict.ts';

/** Verdicts of a step with its waivers applied, and what is to be said of the waivers. */
export interface Waived {
  readonly verdicts: readonly Verdict[];
  /** Waivers that met a finding. */
  readonly used: readonly Waiver[];
  readonly notes: readonly Note[];
  readonly faults: readonly Fault[];
}

/** A waiver holds up to its last day and up to the value for which it was granted; beyond, the finding comes back. */
export function applyWaivers(step: Step, verdicts: readonly Verdict[], today: string): Waived {
  const used: Waiver[] = [];
  const notes: Note[] = [];
  const faults: Fault[] = [];
  const applied = verdicts.map((verdict) => {
    const waiver = step.waivers.find((one) => isFinding(verdict) && names(one, verdict));
    if (waiver === undefined) return verdict;
    used.push(waiver);
    const holdsTo = readHoldsTo(waiver, verdict, faults);
    const over = waiver.until < today ? 'waiver-expired' : outgrown(verdict, holdsTo) ? 'waiver-outgrown' : undefined;
    if (over === undefined) return { ...verdict, waived: grantOf(waiver, holdsTo) };
    notes.push({ kind: over, step: step.path, waiver });
    return verdict;
  });
  return { verdicts: applied, used, notes, faults };
}

/** The value up to which a waiver holds, in the dimension of the number that is judged. */
function readHoldsTo(waiver: Waiver, { reference, over }: Verdict, faults: Fault[]): number | undefined {
  if (waiver.holdsTo === undefined) return undefined;
  const measure = readMeasure(waiver.holdsTo, dimensionOfNumber(reference, over));
  if (!isUnitFault(measure)) return measure.value;
  faults.push({ place: waiver.place, found: `holds_to: ${measure.found}`, right: measure.right });
  return undefined;
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
