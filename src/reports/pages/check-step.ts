import type { StepRun } from '../../quantities/run.ts';
import type { Cycle } from '../../steps/step.ts';
import type { JudgedStep } from '../../verdicts/judgement.ts';
import type { Verdict } from '../../verdicts/verdict.ts';
import { assumedSentence, groundsSentence } from '../grounds.ts';
import type { CycleBlock, Finding, StepBlock, Told } from '../page.ts';
import { instanceClause, perhapsSentence, verdictClause, verdictNumber } from '../sentences.ts';
import type { Shown } from '../shown.ts';
import { printNumber } from '../../units/display.ts';
import { listed, sentence } from '../words.ts';
import { stepFacts } from './step-facts.ts';

/** What the steps of one recipe have in common. */
export interface Telling {
  /** The recipe's. */
  readonly file: string;
  readonly shown: Shown;
  /** Assumptions whose grounds were told at an earlier step: nobody reads them twice. */
  readonly told: Set<string>;
  /** Among so many recipes that only findings and what they come from are told. */
  readonly brief: boolean;
}

/** One step: what it is set to, and what was found. */
export function stepBlock({ run, verdicts }: JudgedStep, telling: Telling): StepBlock {
  const { number, path, process, reason } = run.step;
  const findings = findingsOf(run, verdicts, telling);
  const passes = verdicts.filter(({ kind }) => kind === 'pass').length;
  const anything = findings.length > 0;
  if (anything && passes > 0 && !telling.brief)
    findings.push({ word: 'pass', lead: `${passes} more`, sentences: [], where: [] });
  return {
    kind: 'step',
    number,
    path,
    process,
    ...stepFacts(run, telling.shown),
    outcome: anything ? [] : [passes > 0 ? `pass ${passes}` : nothingJudged(reason)],
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
function findingsOf(run: StepRun, verdicts: readonly Verdict[], telling: Telling): Finding[] {
  const findings: Finding[] = [];
  for (const verdict of verdicts) {
    if (verdict.waived !== undefined || (verdict.kind !== 'fail' && verdict.kind !== 'review')) continue;
    findings.push(finding(verdict, run, telling));
  }
  const open = verdicts.filter(({ kind, waived }) => kind === 'open' && waived === undefined);
  if (open.length > 0) findings.push(openFinding(open, run, telling));
  for (const verdict of verdicts) if (verdict.waived !== undefined) findings.push(waivedFinding(verdict, run, telling));
  return findings;
}

function finding(verdict: Verdict, run: StepRun, { file, shown, told, brief }: Telling): Finding {
  const { kind, level, instance } = verdict;
  const sentences: (Told | undefined)[] = [
    first(instance === undefined ? undefined : sentence(`worst ${instanceClause(instance, run, shown)}`)),
    first(groundsSentence(verdict, run, shown)),
    first(perhapsSentence(verdict, run, shown)),
    ...(brief || told.has(verdict.name) ? [] : standingSentences(verdict, run, shown)),
  ];
  told.add(verdict.name);
  return {
    word: kind,
    level,
    lead: verdictClause(verdict, run, shown),
    sentences: sentences.filter((one) => one !== undefined),
    where: whereOf([verdict], run, file),
  };
}

/** What holds for an assumption in whichever step it is judged. */
function standingSentences(verdict: Verdict, run: StepRun, shown: Shown): readonly Told[] {
  const assumed = assumedSentence(verdict, run, shown);
  return [
    detail(`Intended: ${verdict.statement}`),
    ...(assumed === undefined ? [] : [detail(assumed)]),
    ...verdict.remarks.map((remark) => detail(sentence(remark))),
  ];
}

/** All that a step lacks, in one line. */
function openFinding(open: readonly Verdict[], run: StepRun, { file }: Telling): Finding {
  const needs = [...new Set(open.flatMap(({ needs = [] }) => needs))];
  const numbers = [...new Set(open.map((verdict) => verdictNumber(verdict, run)))];
  return {
    word: 'open',
    lead: `${listed(numbers)}: needs ${listed(needs)}`,
    sentences: [],
    where: whereOf(open, run, file),
  };
}

function waivedFinding(verdict: Verdict, run: StepRun, { file, shown, brief }: Telling): Finding {
  const { kind, level, waived } = verdict;
  const grant = waived === undefined ? '' : `Waived until ${waived.until} by ${waived.approved_by}: ${waived.reason}`;
  return {
    word: 'waived',
    level,
    lead: `${kind}, ${verdictClause(verdict, run, shown)}`,
    sentences: brief ? [] : [{ weight: 'detail', text: sentence(grant) }],
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
