import type { Reference } from '../../quantities/reference.ts';
import type { StepRun } from '../../quantities/run.ts';
import type { Judgement } from '../../verdicts/judgement.ts';
import type { Verdict } from '../../verdicts/verdict.ts';
import { linksOf } from '../links.ts';
import type { Block, Link, Page, Sheet } from '../page.ts';
import { filled } from '../number.ts';
import { verdictMessage, verdictNumber } from '../sentences.ts';
import { shownFor, type AskedUnits, type Shown } from '../shown.ts';
import { capital, listed, numberWords } from '../words.ts';
import { boundSentences } from './bound.ts';

/** What is derived: a number of a step, one over another, or what a verdict judges, with the verdict. */
export type Derived = { readonly reference: Reference; readonly over?: Reference } | { readonly verdict: Verdict };

/** How a number comes about, from the lines of the recipe through every law to the number, and its bound where it is judged. */
export function derivePage({ run }: Pick<Judgement, 'run'>, step: StepRun, derived: Derived, units: AskedUnits): Page {
  const shown = shownFor(run, units);
  const { reference, over } = 'verdict' in derived ? derived.verdict : derived;
  const lines = [...step.derive(reference, over)].filter(({ node }) => node.kind !== 'constant').reverse();
  const links = linksOf(lines, step, shown);
  return {
    blocks: [
      headOf(step, derived, run.recipe.name),
      { kind: 'chain', links },
      ...shareBlocks(step, reference, over, shown),
      ...('verdict' in derived ? verdictBlocks(derived.verdict, step, shown) : []),
    ],
    sheet: () => chainSheet(links),
  };
}

function headOf(step: StepRun, derived: Derived, recipe: string): Block {
  const name =
    'verdict' in derived
      ? verdictNumber(derived.verdict, step)
      : numberWords(derived.reference, filled(derived.reference, step)) +
        (derived.over === undefined ? '' : ` over ${numberWords(derived.over, filled(derived.over, step))}`);
  return {
    kind: 'heading',
    text: capital(name),
    aside: `${recipe}, step ${step.step.number} ${step.step.path}, ${step.step.process}`,
  };
}

/** Which givens carry the uncertainty, down to a twentieth of it. */
function shareBlocks(step: StepRun, reference: Reference, over: Reference | undefined, shown: Shown): readonly Block[] {
  const slopes = step.slopes(reference, over);
  const variance = slopes.reduce((sum, { contribution }) => sum + contribution ** 2, 0);
  if (variance === 0) return [];
  const shares = slopes
    .map(({ address, contribution }) => ({ address, share: contribution ** 2 / variance }))
    .filter(({ share }) => share >= 0.05)
    .map(({ address, share }) => `${address} ${Math.round(100 * share)} %`);
  return [
    {
      kind: 'sentence',
      weight: 'detail',
      text: `Uncertainties are expanded, k = ${shown.coverage}; of the variance ${listed(shares)}.`,
    },
  ];
}

function verdictBlocks(verdict: Verdict, step: StepRun, shown: Shown): readonly Block[] {
  const { kind, level, name } = verdict;
  const grade = kind === 'fail' || kind === 'review' || kind === 'open' ? `, ${level}` : '';
  const word = kind === 'notApplicable' ? 'does not apply' : kind;
  return [
    ...boundSentences(verdict, shown).map((text) => ({ kind: 'sentence' as const, weight: 'first' as const, text })),
    { kind: 'sentence', weight: 'first', text: `${name}: ${word}${grade}. ${verdictMessage(verdict, step, shown)}` },
  ];
}

function chainSheet(links: readonly Link[]): Sheet {
  return {
    columns: ['number', 'symbol', 'name', 'value', 'si', 'from', 'grounds'],
    rows: links.map(({ number, symbol, name, value, si = '', from, grounds }) => [
      String(number),
      symbol,
      name,
      value,
      si,
      from.join(' '),
      grounds,
    ]),
  };
}
