import { readFileSync } from 'node:fs';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { describe, expect, test } from 'vitest';
import { gasRun } from '../../src/quantities/gas-run.ts';
import { addCounts, countJudgement, NO_COUNTS } from '../../src/reports/counts.ts';
import { cautionRecords, faultRecord, recipeRecord, summaryRecord } from '../../src/reports/records/check.ts';
import { frameClosing, frameOpening, frameRecipe } from '../../src/reports/records/frame.ts';
import { gasRecord } from '../../src/reports/records/gas.ts';
import { gasPage } from '../../src/reports/pages/gas.ts';
import { shownOf } from '../../src/reports/shown.ts';
import type { Judgement } from '../../src/verdicts/judgement.ts';
import { deposit, judged, runOf } from './run.ts';

function schema(name: string): object {
  const parsed: unknown = JSON.parse(readFileSync(new URL(`../../schemas/${name}.json`, import.meta.url), 'utf8'));
  if (typeof parsed !== 'object' || parsed === null) throw new Error(`${name} is no schema`);
  return parsed;
}

const ajv = new Ajv2020({ strict: false, allErrors: true });
ajv.addSchema(schema('common'));
const CHECK = ajv.compile(schema('check'));
const GAS = ajv.compile(schema('gas'));

function resultOf(judgements: readonly Judgement[]): string {
  const counts = judgements.map((one) => countJudgement(one)).reduce(addCounts, NO_COUNTS);
  const tail = {
    cautions: judgements.flatMap(cautionRecords),
    faults: [
      faultRecord({
        place: { file: 'a.yaml', line: 1, column: 1 },
        found: 'an empty file',
        right: 'begin with regimen:',
      }),
    ],
    summary: summaryRecord(counts, { blockAt: 'error', unproven: false }),
  };
  const recipes = judgements.map((one, index) => frameRecipe(recipeRecord(one), index === 0)).join('');
  return (
    frameOpening({ version: '0.1.0', site: 'saltmarsh', coverageFactor: 2, bands: 'gas-dynamics' }) +
    recipes +
    frameClosing(tail, judgements.length > 0)
  );
}

describe('the result of check', () => {
  const steps = [deposit('5 mTorr'), deposit('unknown'), deposit('{ from: 1 mTorr, to: 6 mTorr }')];

  test.each([0, 1, 3])('follows its schema with %i recipes', (count) => {
    const result: unknown = JSON.parse(resultOf(steps.slice(0, count).map((one) => judged(one))));
    CHECK(result);
    expect(CHECK.errors).toBeNull();
  });

  test('reads as one text that was written at once', () => {
    const text = resultOf(steps.map((one) => judged(one)));
    expect(text).toBe(`${JSON.stringify(JSON.parse(text), undefined, 2)}\n`);
  });

  test('does not depend on the day where no waiver does', () => {
    expect(resultOf([judged(steps[0] ?? '', { today: '2026-01-01' })])).toBe(
      resultOf([judged(steps[0] ?? '', { today: '2031-12-31' })]),
    );
  });

  test('has values in SI and uncertainties expanded', () => {
    const [step] = recipeRecord(judged(deposit('5 mTorr +/- 0.1 mTorr'))).steps;
    const pressure = step?.givens.find(({ address }) => address === 'pressure');
    expect(pressure?.value).toBeCloseTo(0.666612, 6);
    expect(pressure?.uncertainty).toBeCloseTo((2 * 0.0133322) / Math.sqrt(3), 6);
    expect(pressure).toMatchObject({ unit: 'Pa', origin: { file: 'recipes/sample.yaml', line: 9 } });
  });

  test('tells each number once, in the order of the catalogue', () => {
    const [step] = recipeRecord(judged(deposit('5 mTorr'))).steps;
    const names = step?.quantities.map(({ id, length, of, at }) => [id, length, of, at].join()) ?? [];
    expect(new Set(names).size).toBe(names.length);
    expect(names).toContain('slowing-knudsen,,target,');
  });

  test('has a message that is the sentence of the page', () => {
    const [step] = recipeRecord(judged(deposit('5 mTorr'))).steps;
    const verdict = step?.verdicts.find(({ assumption }) => assumption === 'free-throw');
    expect(verdict?.message).toMatch(/^Slowing Knudsen number of Ti 0\.\d+ ± 0\.\d+, at least 0\.3\.$/);
  });
});

describe('the result of gas', () => {
  const { site } = runOf(deposit('5 mTorr'));
  const stateOf = (name: string, parts: readonly (readonly [string, number])[]) => ({
    name,
    run: gasRun(site.library, { parts: new Map(parts), temperature: 293.15, pressure: 1 }),
  });
  const states = [
    stateOf('Ar', [['Ar', 1]]),
    stateOf('Ar=4 SiH4=1', [
      ['Ar', 4],
      ['SiH4', 1],
    ]),
  ];

  test('follows its schema', () => {
    GAS(gasRecord(states, shownOf(site)));
    expect(GAS.errors).toBeNull();
  });

  test('says of a gas beyond its vapour pressure that it condenses', () => {
    const at = (temperature: number) => {
      const run = gasRun(site.library, { parts: new Map([['H2O', 1]]), temperature, pressure: 2700 });
      return gasRecord([{ name: 'H2O', run }], shownOf(site)).gases[0]?.remarks ?? [];
    };
    expect(at(293.15)).toEqual([expect.stringMatching(/^H2O condenses: .* is 1\.1\d* times its vapour pressure/)]);
    expect(at(303.15)).toEqual([]);
  });

  test('gives argon at 1 Pa and 20 degC a mean free path near 7 mm', () => {
    const path = gasRecord(states, shownOf(site)).gases[0]?.quantities.find(({ id }) => id === 'mean-free-path');
    expect(path !== undefined && 'value' in path ? path.value : NaN).toBeCloseTo(0.0071, 3);
  });

  test('shows a mixture with its gases and their pairs, and its hazards', () => {
    const rows = gasPage(states, shownOf(site)).blocks.flatMap((block) =>
      block.kind === 'table' ? block.rows.map(([name]) => name) : [],
    );
    expect(rows).toEqual(
      expect.arrayContaining([
        'self-diffusivity of Ar',
        'diffusivity of SiH4 in the mixture',
        'diffusivity of Ar in SiH4',
      ]),
    );
    const last = gasPage(states, shownOf(site)).blocks.at(-1);
    expect(last?.kind === 'caution' ? last.text : '').toContain('SiH4 is');
  });
});
