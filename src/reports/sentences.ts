import type { StepRun } from '../quantities/run.ts';
import type { Dimension } from '../units/dimensions.ts';
import { printMeasure, printTime } from '../units/display.ts';
import type { Instance, Verdict } from '../verdicts/verdict.ts';
import { dimensionOfNumber, filled, unitOfNumber } from './number.ts';
import { bandOf, print, printGiven, type Shown } from './shown.ts';
import { listed, numberWords, sentence } from './words.ts';

/* The sentence for a verdict, which exists once: pages, records and whatever else tells of it take it from here. */

/** What was found and what the bound is, as a clause: "sheath collisions 2.6 ± 0.5, at most 1". */
export function verdictClause(verdict: Verdict, run: StepRun, shown: Shown): string {
  const name = verdictNumber(verdict, run);
  switch (verdict.kind) {
    case 'open':
      return `${name}: needs ${listed(verdict.needs ?? [])}`;
    case 'notApplicable':
      return `${name}: ${verdict.because ?? 'does not apply'}`;
    default:
      return `${name} ${valueClause(verdict, run, shown)}`;
  }
}

/** The finding in one sentence, with the instant or limit at which it stands. */
export function verdictMessage(verdict: Verdict, run: StepRun, shown: Shown): string {
  const clause = verdictClause(verdict, run, shown);
  const at = verdict.instance === undefined ? '' : `, ${instanceClause(verdict.instance, run, shown)}`;
  return sentence(clause + at);
}

/** The number that a verdict judges, in words. */
export function verdictNumber({ reference, over, subject }: Verdict, run: StepRun): string {
  const name = numberWords(reference, subject ?? filled(reference, run));
  return over === undefined ? name : `${name} over ${numberWords(over, filled(over, run))}`;
}

/** At which instant of a changing step, or at which limit of a range, the value stands. */
export function instanceClause(instance: Instance, run: StepRun, shown: Shown): string {
  if (instance.kind === 'ramp') return rampClause(instance);
  const { address, limit } = instance;
  const given = run.given(address);
  const side = limit === 'at_least' ? 'least' : 'most';
  if (given?.span?.kind !== 'range') return `with ${address} at its ${side}`;
  const value = limit === 'at_least' ? given.span.atLeast : given.span.atMost;
  return value === undefined
    ? `with ${address} at its ${side}`
    : `with ${address} at its ${side}, ${printGiven(shown, given, value)}`;
}

/** The limit of a verdict alone: "at most 1". */
export function limitClause({ limit }: Verdict, dimension: Dimension, unit: string, shown: Shown): string {
  if (limit === undefined) return '';
  const side = limit.side === 'at_most' ? 'at most' : 'at least';
  return `${side} ${print(shown, limit.value, dimension, 0, unit)}`;
}

/** A graver grade that the uncertainty leaves open, as a sentence. */
export function perhapsSentence(verdict: Verdict, run: StepRun, shown: Shown): string | undefined {
  const { perhaps, bound, limit, value = 0 } = verdict;
  if (perhaps === undefined || limit === undefined) return undefined;
  const graver = bound[limit.side]?.[perhaps];
  if (graver === undefined) return `The uncertainty does not rule out ${perhaps}.`;
  const dimension = verdictDimension(verdict);
  const clause = limitClause(
    { ...verdict, limit: { ...limit, value: graver } },
    dimension,
    verdictUnit(verdict, value, run, shown),
    shown,
  );
  return `The uncertainty does not rule out ${perhaps}: ${clause}.`;
}

/** The unit in which value and limits of a verdict are told. */
export function verdictUnit({ reference, over }: Verdict, value: number, run: StepRun, shown: Shown): string {
  return over === undefined ? unitOfNumber(shown, run, reference, value) : '';
}

/** The dimension of what a verdict judges. */
export function verdictDimension({ reference, over }: Pick<Verdict, 'reference' | 'over'>): Dimension {
  return over === undefined ? dimensionOfNumber(reference) : 'number';
}

function valueClause(verdict: Verdict, run: StepRun, shown: Shown): string {
  const { value, uncertainty = 0, reference, over, limit } = verdict;
  if (value === undefined) return '';
  const dimension = verdictDimension(verdict);
  const unit = verdictUnit(verdict, value, run, shown);
  let clause = print(shown, value, dimension, uncertainty, unit);
  const regime = over === undefined ? bandOf(shown, reference.id, value) : undefined;
  if (regime !== undefined) clause += ` (${regime})`;
  if (limit === undefined) return clause;
  clause += `, ${limitClause(verdict, dimension, unit, shown)}`;
  return isWithin(verdict) ? `${clause}: within the uncertainty` : clause;
}

function isWithin({ kind, value = NaN, uncertainty = 0, limit }: Verdict): boolean {
  return kind === 'review' && limit !== undefined && Math.abs(value - limit.value) <= uncertainty;
}

function rampClause({ fraction, time, over }: Extract<Instance, { kind: 'ramp' }>): string {
  if (fraction <= 0) return over === 'laps' ? 'on the first lap' : 'at the start of the step';
  if (fraction >= 1) return over === 'laps' ? 'on the last lap' : 'at the end of the step';
  if (time !== undefined) return `${printTime(time)} into the step`;
  const share = printMeasure(fraction, 'fraction', { unit: '%' });
  return over === 'laps' ? `${share} of the way through the laps` : `${share} of the way through the step`;
}
