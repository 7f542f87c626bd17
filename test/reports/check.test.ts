import { describe, expect, test } from 'vitest';
import { addCounts, blocking, countJudgement, NO_COUNTS, outcomeOf } from '../../src/reports/counts.ts';
import { drawText, gapBetween } from '../../src/reports/formats/text.ts';
import { foldFor, type CheckOptions } from '../../src/reports/options.ts';
import { checkPart } from '../../src/reports/pages/check.ts';
import { faultBlocks } from '../../src/reports/pages/faults.ts';
import { checkClosing } from '../../src/reports/pages/closing.ts';
import type { Block, Finding } from '../../src/reports/page.ts';
import { deposit, judged } from './run.ts';

const OPTIONS: CheckOptions = { units: new Map(), fold: 'none', blockAt: 'error', unproven: false };
const PLAIN = { width: 100, colour: 0 } as const;

function findings(blocks: readonly Block[]): readonly Finding[] {
  return blocks.flatMap((block) =>
    block.kind === 'steps' ? block.steps.flatMap((step) => (step.kind === 'step' ? step.findings : [])) : [],
  );
}

function closing(blocks: readonly Block[]): string {
  return blocks.map((block) => ('text' in block ? block.text : '')).join('\n');
}

describe('a recipe that fails', () => {
  const judgement = judged(deposit('5 mTorr'));
  const { blocks, counts } = checkPart(judgement, OPTIONS);

  test('has its finding with kind, grade, value, bound, name and line', () => {
    const [finding] = findings(blocks);
    expect(finding).toMatchObject({ word: 'fail', level: 'error', where: ['free-throw', 'line 9'] });
    expect(finding?.lead).toMatch(/^slowing Knudsen number of Ti 0\.\d+ ± 0\.\d+, at least 0\.3$/);
  });

  test('says from what the number was worked out, what was intended and what was assumed', () => {
    const told = findings(blocks)[0]?.sentences.map(({ text }) => text) ?? [];
    expect(told[0]).toMatch(/^From fast free path of Ti [\d.]+ mm, .*targets\.ti\.throw 200 mm\.$/);
    expect(told).toContain('Intended: A sputtered atom keeps its line over the throw.');
    expect(told.some((text) => text.startsWith('Assumed: '))).toBe(true);
  });

  test('counts one failing step, which blocks from error on', () => {
    expect(counts.stepsByWorst.fail).toBe(1);
    expect(blocking(counts, OPTIONS)).toBe(1);
    expect(blocking(counts, { blockAt: 'never', unproven: true })).toBe(0);
    expect(closing(checkClosing(counts, OPTIONS))).toBe('1 recipe, 1 step: 1 fail.  1 finding blocks.');
  });

  test('ends its findings with how many pass beside', () => {
    const last = findings(blocks).at(-1);
    expect(last?.word).toBe('pass');
    expect(last?.lead).toMatch(/^\d+ more$/);
  });
});

describe('what is open', () => {
  const judgement = judged(deposit('unknown'));
  const { blocks, counts } = checkPart(judgement, OPTIONS);

  test('is one line that lists what to supply', () => {
    const open = findings(blocks).filter(({ word }) => word === 'open');
    expect(open).toHaveLength(1);
    expect(open[0]?.lead).toBe('slowing Knudsen number of Ti and impurity ratio: needs pressure');
  });

  test('blocks only where the unproven blocks', () => {
    expect(blocking(counts, OPTIONS)).toBe(0);
    expect(blocking(counts, { blockAt: 'error', unproven: true })).toBeGreaterThan(0);
  });

  test('shows an unknown pressure as unknown', () => {
    expect(drawText(blocks, PLAIN)).toMatch(/30 s {2}unknown {2}Ar 40 sccm/);
  });
});

describe('a review', () => {
  test('says that the bound lies within the uncertainty', () => {
    const [finding] = findings(checkPart(judged(deposit('0.8 mTorr')), OPTIONS).blocks);
    expect(finding).toMatchObject({ word: 'review', level: 'warning' });
    expect(finding?.lead).toMatch(/, at least 1: within the uncertainty$/);
  });
});

describe('a ramp', () => {
  test('is shown with both ends and judged at its worst instant', () => {
    const { blocks } = checkPart(judged(deposit('{ from: 1 mTorr, to: 6 mTorr }')), OPTIONS);
    expect(drawText(blocks, PLAIN)).toContain('1 to 6 mTorr');
    expect(findings(blocks)[0]?.sentences[0]?.text).toBe('Worst at the end of the step.');
  });
});

describe('a waived finding', () => {
  const waiver = `    waivers:
      - assumption: free-throw
        reason: "Qualified on lot 12."
        approved_by: process integration
        until: 2030-01-01
`;
  const { blocks, counts } = checkPart(judged(deposit('5 mTorr', waiver)), OPTIONS);

  test('keeps its words under another first word and blocks nothing', () => {
    const [finding] = findings(blocks);
    expect(finding?.word).toBe('waived');
    expect(finding?.sentences.map(({ text }) => text)).toEqual([
      'Waived until 2030-01-01 by process integration: Qualified on lot 12.',
    ]);
    expect(counts).toMatchObject({ waived: 1, verdicts: { fail: 1 } });
    expect(blocking(counts, { blockAt: 'note', unproven: true })).toBe(0);
  });

  test('leaves its step as the other verdicts find it', () => {
    expect(counts.stepsByWorst).toMatchObject({ pass: 1, fail: 0 });
  });

  test('comes back with a note after its last day', () => {
    const late = checkPart(judged(deposit('5 mTorr', waiver), { today: '2030-01-02' }), OPTIONS);
    expect(findings(late.blocks)[0]?.word).toBe('fail');
    expect(late.blocks).toContainEqual({
      kind: 'note',
      text: 'deposit: the waiver for free-throw ended on 2030-01-01; the finding is back.',
    });
  });
});

describe('the grounds of an assumption', () => {
  test('are told at its first finding of a recipe only', () => {
    const again = deposit('5 mTorr').replace('name: deposit', 'name: again');
    const all = findings(checkPart(judged(deposit('5 mTorr') + again), OPTIONS).blocks).filter(
      ({ word }) => word === 'fail',
    );
    const told = all.map(({ sentences }) => sentences.some(({ text }) => text.startsWith('Intended')));
    expect(told).toEqual([true, false]);
  });
});

describe('folding', () => {
  const clean = `  - name: fill
    process: soak
    time: 10 s
    pressure: 5 mTorr
    flows: { Ar: 40 sccm }
`;

  test('of many recipes leaves a clean one out, of some makes it one line', () => {
    const part = (fold: CheckOptions['fold']) => drawText(checkPart(judged(clean), { ...OPTIONS, fold }).blocks, PLAIN);
    expect(part('recipes')).toBe('');
    expect(part('steps')).toMatch(/^sample {3}rev 2 {3}stint rev 4 +1 step {3}10 s {3}1 pass\n$/);
    expect(part('none').split('\n')[1]).toMatch(/^ 1 {2}fill {2}soak {2}10 s {2}5 mTorr {2}Ar 40 sccm +pass \d+$/);
  });

  test('of many recipes tells findings without what was intended and what passes beside', () => {
    const text = drawText(checkPart(judged(deposit('5 mTorr')), { ...OPTIONS, fold: 'recipes' }).blocks, PLAIN);
    expect(text).toContain('From fast free path');
    expect(text).not.toMatch(/Intended|more$/m);
  });

  test('of steps keeps those with a finding', () => {
    const text = drawText(checkPart(judged(clean + deposit('5 mTorr')), { ...OPTIONS, fold: 'steps' }).blocks, PLAIN);
    expect(text).not.toContain('fill');
    expect(text).toContain(' 2  deposit');
  });

  test('goes by the number of recipes', () => {
    expect([1, 2, 25, 26].map(foldFor)).toEqual(['none', 'steps', 'steps', 'recipes']);
  });

  test('puts a blank line between texts unless both are one line', () => {
    expect(gapBetween('a\n', 'b\n')).toBe('');
    expect(gapBetween('a\nb\n', 'c\n')).toBe('\n');
    expect(gapBetween('', 'c\nd\n')).toBe('');
  });
});

describe('counts', () => {
  test('add up, and nothing added changes nothing', () => {
    const one = countJudgement(judged(deposit('5 mTorr')));
    expect(addCounts(one, NO_COUNTS)).toEqual(one);
    const two = addCounts(one, countJudgement(judged(deposit('unknown'))));
    expect(two).toMatchObject({ recipes: 2, steps: 2, stepsByWorst: { fail: 1, open: 1 } });
  });

  test('are plain data that a worker can send', () => {
    const one = countJudgement(judged(deposit('5 mTorr')));
    expect(structuredClone(one)).toEqual(one);
  });

  test('call a step without any verdict that applies nothing judged, never pass', () => {
    expect(outcomeOf([])).toBe('nothingJudged');
  });
});

describe('cautions', () => {
  const burn = `  - name: mix
    process: soak
    time: 10 s
    pressure: 5 mTorr
    flows: { SiH4: 20 sccm, O2: 20 sccm }
`;

  test('name hazards, fuel with oxidiser and its step, and whom to follow', () => {
    const text = drawText(checkPart(judged(burn), OPTIONS).blocks, { width: 300, colour: 0 }).replace(/\s+/g, ' ');
    expect(text).toContain('SiH4 with O2, fuel with oxidiser, in mix');
    expect(text).toContain("Follow local codes, the equipment's interlocks and licensed practice.");
  });

  test('of many recipes are told once at the end', () => {
    const many = { ...OPTIONS, fold: 'steps' } as const;
    const part = checkPart(judged(burn), many);
    expect(part.blocks.some(({ kind }) => kind === 'caution')).toBe(false);
    expect(closing(checkClosing(addCounts(part.counts, part.counts), many))).toContain(
      'fuel and oxidiser flow together in 2 recipes',
    );
  });
});

describe('faults', () => {
  const place = { file: 'recipes/sample.yaml', line: 12, column: 15 };

  test('stand with file, line and column, twenty a file, then how many more', () => {
    const faults = Array.from({ length: 23 }, () => ({ place, found: "pressure: '28 mtorr'", right: 'write mTorr' }));
    const blocks = faultBlocks(faults);
    expect(blocks.filter(({ kind }) => kind === 'fault')).toHaveLength(20);
    expect(blocks).toContainEqual({ kind: 'sentence', weight: 'first', text: '3 more faults in this file.' });
    expect(drawText(blocks, PLAIN)).toContain(
      "fault    recipes/sample.yaml:12:15\n         pressure: '28 mtorr'; write mTorr\n",
    );
  });
});
