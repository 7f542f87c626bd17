import { dimensionOfNumber } from '../quantities/catalogue.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Step, Waiver } from '../steps/step.ts';
import { isUnitFault, readMeasure } from '../units/read.ts';
import { beyondBy } from './hold.ts';
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
    if (!isFinding(verdict)) return verdict;
    const standings = step.waivers.filter((one) => meets(one, verdict)).map((one) => standingOf(one, verdict, today));
    used.push(...standings.map(({ waiver }) => waiver));
    const holding = standings.find(({ why }) => why === undefined);
    if (holding !== undefined) return { ...verdict, waived: grantOf(holding) };
    for (const { waiver, why } of standings) {
      if (typeof why === 'string') notes.push({ kind: why, step: step.path, waiver });
      else if (why !== undefined) faults.push(why);
    }
    return verdict;
  });
  return { verdicts: applied, used, notes, faults };
}

/** How a waiver stands to a finding that it names. */
interface Standing {
  readonly waiver: Waiver;
  /** Value up to which it holds. */
  readonly holdsTo?: number;
  /** Why it does not hold: a note, or that its value can't be read. */
  readonly why?: 'waiver-expired' | 'waiver-outgrown' | Fault;
}

function standingOf(waiver: Waiver, verdict: Verdict, today: string): Standing {
  if (waiver.until < today) return { waiver, why: 'waiver-expired' };
  if (waiver.holdsTo === undefined) return { waiver };
  const measure = readMeasure(waiver.holdsTo, dimensionOfNumber(verdict.reference, verdict.over));
  if (isUnitFault(measure)) {
    return { waiver, why: { place: waiver.place, found: `holds_to: ${measure.found}`, right: measure.right } };
  }
  const holdsTo = measure.value;
  return outgrown(verdict, holdsTo) ? { waiver, holdsTo, why: 'waiver-outgrown' } : { waiver, holdsTo };
}

function isFinding({ kind }: Verdict): boolean {
  return kind === 'fail' || kind === 'review' || kind === 'open';
}

/** A waiver granted up to a value says nothing of a number that nobody knows. */
function meets({ assumption, holdsTo }: Waiver, { name, assumption: own, kind }: Verdict): boolean {
  return (assumption === own || assumption === name) && (holdsTo === undefined || kind !== 'open');
}

function outgrown({ value, limit }: Verdict, holdsTo: number): boolean {
  return value !== undefined && limit !== undefined && beyondBy(value, { side: limit.side, value: holdsTo }) > 0;
}

function grantOf({ waiver: { reason, approvedBy, until }, holdsTo }: Standing): NonNullable<Verdict['waived']> {
  return { reason, approved_by: approvedBy, until, ...(holdsTo === undefined ? {} : { holds_to: holdsTo }) };
}
