import type { StepRun } from '../../quantities/run.ts';
import type { Cycle } from '../../steps/step.ts';
import type { JudgedStep } from '../../verdicts/judgement.ts';
import type { Verdict } from '../../verdicts/verdict.ts';
import { assumedSentences, groundsSentence } from '../grounds.ts';
import type { CycleBlock, Finding, StepBlock, Told } from '../page.ts';
import { instanceClause, perhapsSentence, verdictClause, verdictNumber } from '../sentences.ts';
import type { Shown } from '../shown.ts';
import { printNumber } from '../../units/display.ts';
import { listed, sentence } from '../words.ts';
import { stepFacts } from './step-facts.ts';

/** One step: what it is set to, and what was found. */
export function stepBlock({ run, verdicts }: JudgedStep, file: string, shown: Shown): StepBlock {
  const { number, path, process, reason } = run.step;
  const findings = findingsOf(run, verdicts, file, shown);
  const passes = verdicts.filter(({ kind }) => kind === 'pass').length;
  const told = findings.length > 0;
  if (told && passes > 0) findings.push({ word: 'pass', lead: `${passes} more`, sentences: [], where: [] });
  return {
    kind: 'step',
    number,
    path,
    process,
    ...stepFacts(run, shown),
    outcome: told ? [] : [passes > 0 ? `pass ${passes}` : nothingJudged(reason)],
    findings,
  };
}

export function cycleBlock({ path, repeat }: Cycle): CycleBlock {
  return { kind: 'cycle', path, repeat: repeatWords(repeat) };
}

function repeatWords({ value, span }: Cycle['repeat']): string {
  if (span?.kind !== 'range') return `${printNumber(value)} times`;
  const limits = [span.atLeast, span.atMost].flatMap((limit) => (limit === undefined ? [] : [printNumber(limit)]));
  return `${printNumber(value)} times (${limits.join(' to ')})`;
}

function nothingJudged(reason: string | undefined): string {
  return reason === undefined ? 'nothing judged' : `nothing judged: ${reason}`;
}

/** Findings, gravest first as the verdicts stand; what is open in one line; waived ones last. */
function findingsOf(run: StepRun, verdicts: readonly Verdict[], file: string, shown: Shown): Finding[] {
  const findings: Finding[] = [];
  for (const verdict of verdicts) {
    if (verdict.waived !== undefined || (verdict.kind !== 'fail' && verdict.kind !== 'review')) continue;
    findings.push(finding(verdict, run, file, shown));
  }
  const open = verdicts.filter(({ kind, waived }) => kind === 'open' && waived === undefined);
  if (open.length > 0) findings.push(openFinding(open, run, file));
  for (const verdict of verdicts) if (verdict.waived !== undefined) findings.push(waivedFinding(verdict, run, file, shown));
  return findings;
}

function finding(verdict: Verdict, run: StepRun, file: string, shown: Shown): Finding {
  const { kind, level, instance, statement, remarks } = verdict;
  const sentences: (Told | undefined)[] = [
    first(instance === undefined ? undefined : sentence(`worst ${instanceClause(instance, run, shown)}`)),
    first(groundsSentence(verdict, run, shown)),
    first(perhapsSentence(verdict, shown)),
    detail(`Intended: ${statement}`),
    ...assumedSentences(verdict, run, shown).map(detail),
    ...remarks.map((remark) => detail(sentence(remark))),
  ];
  return {
    word: kind,
    level,
    lead: verdictClause(verdict, run, shown),
    sentences: sentences.filter((told) => told !== undefined),
    where: whereOf([verdict], run, file),
  };
}

/** All that a step lacks, in one line. */
function openFinding(open: readonly Verdict[], run: StepRun, file: string): Finding {
  const needs = [...new Set(open.flatMap(({ needs = [] }) => needs))];
  const numbers = [...new Set(open.map((verdict) => verdictNumber(verdict, run)))];
  return { word: 'open', lead: `${listed(numbers)}: needs ${listed(needs)}`, sentences: [], where: whereOf(open, run, file) };
}

function waivedFinding(verdict: Verdict, run: StepRun, file: string, shown: Shown): Finding {
  const { kind, level, waived } = verdict;
  const grant = waived === undefined ? '' : `Waived until ${waived.until} by ${waived.approved_by}: ${waived.reason}`;
  return {
    word: 'waived',
    level,
    lead: `${kind}, ${verdictClause(verdict, run, shown)}`,
    sentences: [{ weight: 'detail', text: sentence(grant) }],
    where: whereOf([verdict], run, file),
  };
}

/** Names of the assumptions, and the line of the recipe where there is one. */
function whereOf(verdicts: readonly Verdict[], { step }: StepRun, file: string): readonly string[] {
  const names = verdicts.map(({ name, process, assumption }) => (process === step.process ? assumption : name));
  const lines = new Set(verdicts.map(({ place }) => (place.file === file ? place.line : step.place.line)));
  return [...names, `line ${[...lines].join(', ')}`];
}

function first(text: string | undefined): Told | undefined {
  return text === undefined ? undefined : { weight: 'first', text };
}

function detail(text: string): Told {
  return { weight: 'detail', text };
}
