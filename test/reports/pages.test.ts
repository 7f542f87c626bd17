import { describe, expect, test } from 'vitest';
import { allQuantities } from '../../src/quantities/catalogue.ts';
import { drawText } from '../../src/reports/formats/text.ts';
import { derivePage } from '../../src/reports/pages/derive.ts';
import { listProcesses } from '../../src/reports/pages/list-processes.ts';
import { listQuantities } from '../../src/reports/pages/list-quantities.ts';
import { listFilms, listGases } from '../../src/reports/pages/list-substances.ts';
import { listUnits } from '../../src/reports/pages/list-units.ts';
import { tablePage } from '../../src/reports/pages/table.ts';
import type { Block, Chain, Table } from '../../src/reports/page.ts';
import { deposit, judged, runOf } from './run.ts';

const UNITS = new Map();

function chainOf(blocks: readonly Block[]): Chain['links'] {
  return blocks.flatMap((block) => (block.kind === 'chain' ? block.links : []));
}

function tableOf(blocks: readonly Block[]): Table {
  const table = blocks.find((block) => block.kind === 'table');
  if (table?.kind !== 'table') throw new Error('the page has no table');
  return table;
}

describe('a derivation', () => {
  const judgement = judged(deposit('5 mTorr'));
  const [step] = judgement.steps;
  if (step === undefined) throw new Error('no step');
  const verdict = step.verdicts.find(({ assumption }) => assumption === 'free-throw');
  if (verdict === undefined) throw new Error('no verdict');
  const { blocks } = derivePage(judgement, step.run, { verdict }, UNITS);
  const links = chainOf(blocks);

  test('reads every line from lines above it, each number once', () => {
    for (const { number, from } of links) for (const one of from) expect(one).toBeLessThan(number);
    expect(new Set(links.map(({ number }) => number)).size).toBe(links.length);
  });

  test('starts at places of documents and ends at the number', () => {
    const pressure = links.find(({ symbol }) => symbol === 'pressure');
    expect(pressure).toMatchObject({ si: '0.66661 Pa', grounds: 'recipes/sample.yaml:9:15' });
    expect(pressure?.value).toMatch(/^5\.\d+ ± \d\.\d+ mTorr$/);
    expect(links.at(-1)).toMatchObject({ symbol: 'Kn_slow', name: 'slowing Knudsen number of Ti' });
  });

  test('says of a default why it stands in', () => {
    expect(links.find(({ symbol }) => symbol === 'accuracy.fast-path')?.grounds).toMatch(/^assumed: /);
  });

  test('says of a number that simply is another one which, not by what law', () => {
    const gas = links.find(({ name }) => name === 'gas pressure');
    const pressure = links.find(({ symbol }) => symbol === 'pressure');
    expect(gas).toMatchObject({ from: [], grounds: `the same as ${pressure?.number ?? NaN}` });
  });

  test('names the counts that formulas fix', () => {
    const impurity = derivePage(judgement, step.run, { reference: { id: 'impurity-ratio' } }, UNITS);
    expect(chainOf(impurity.blocks).at(-1)?.grounds).toMatch(/; with 1 and 1 atoms by formula$/);
  });

  test('closes with bound, source and verdict', () => {
    const text = drawText(blocks, { width: 132, colour: 0 }).replace(/\s+/g, ' ');
    expect(text).toContain('Bound: at least 1 (warning), at least 0.3 (error).');
    expect(text).toMatch(/Source of the bound: .+ 1978\./);
    expect(text).toContain('sputter-line-of-sight/free-throw: fail, error.');
  });
});

describe('the regime table', () => {
  test('shows pressure, path, Knudsen numbers with their bands, stay and turnovers', () => {
    const { columns, rows } = tableOf(tablePage(runOf(deposit('5 mTorr')), { units: UNITS }).blocks);
    const titles = columns.map(({ title }) => title);
    expect(titles).toEqual(
      expect.arrayContaining([
        'pressure',
        'mean-free-path',
        'Kn.gap',
        'Kn.throw:target',
        'residence-time',
        'turnovers',
      ]),
    );
    expect(rows[0]?.[titles.indexOf('Kn.gap')]).toMatch(/^0\.\d+ ± 0\.\d+ transition/);
  });

  test('leaves the throw blank where no generator of the chamber delivers power', () => {
    const wait = `  - name: wait
    process: settle
    time: 10 s
    pressure: 5 mTorr
    flows: { Ar: 40 sccm }
`;
    const { columns, rows } = tableOf(tablePage(runOf(deposit('5 mTorr') + wait), { units: UNITS }).blocks);
    const at = columns.findIndex(({ title }) => title === 'Kn.throw:target');
    expect(rows[0]?.[at]).toMatch(/^0\.\d+ ± /);
    expect(rows[1]?.[at]).toBe('');
    const idle = deposit('5 mTorr').replace('power: { magnetron: 4 kW }', 'power: { magnetron: 0 W }');
    const judgedAll = tableOf(tablePage(runOf(idle), { units: UNITS }).blocks);
    expect(judgedAll.columns.map(({ title }) => title)).toContain('Kn.throw:target');
  });

  test('takes other columns and other units', () => {
    const options = {
      units: new Map([['pressure', 'Pa'] as const]),
      columns: [{ id: 'gas-pressure' }, { id: 'mole-fraction', of: 'Ar' }],
    };
    const { columns, rows } = tableOf(tablePage(runOf(deposit('5 mTorr')), options).blocks);
    expect(columns.map(({ title }) => title)).toEqual(['', 'step', 'pressure', 'mole-fraction:Ar']);
    expect(rows[0]?.[2]).toMatch(/^0\.667 ± 0\.00\d Pa$|^0\.66\d+ ± 0\.00\d+ Pa$/);
  });

  test('tells of open cells what they need and of which steps', () => {
    const text = drawText(tablePage(runOf(deposit('unknown')), { units: UNITS }).blocks, { width: 120, colour: 0 });
    expect(text).toContain('Open for want of pressure (deposit).');
    expect(text).not.toMatch(/NaN|Infinity/);
  });
});

describe('lists', () => {
  const { site } = runOf(deposit('5 mTorr'));

  test('of numbers have every entry of the catalogue with statement and source', () => {
    const { rows } = listQuantities(site.library).sheet();
    expect(rows.map(([id]) => id)).toEqual(allQuantities().map(({ id }) => id));
    for (const row of rows) expect(row[3]).not.toBe('');
  });

  test('of numbers say what each is read from, without the names of one step', () => {
    const reads = new Map(
      listQuantities(site.library)
        .sheet()
        .rows.map((row) => [row[0], row[5]]),
    );
    expect(reads.get('knudsen')).toContain('mean-free-path');
    expect(reads.get('flow-rate')).toBe('flows.LINE');
    expect(reads.get('turnovers')).toBe('time residence-time');
    expect(reads.get('heat-capacity')).toBe(
      'gas-temperature gases.GAS.heat_capacity.N.temperature gases.GAS.heat_capacity.N.is',
    );
    expect(reads.get('mixture-free-path')).toBe('mole-fraction:SUBJECT mean-speed:SUBJECT mean-free-path:SUBJECT');
    for (const [id, text] of reads) expect(`${id}: ${text}`).not.toMatch(/[.:](?:Ar|N2|ti|al|process|plate)\b/);
  });

  test('of processes have each assumption with bound and source', () => {
    const processes = site.processNames().flatMap((name) => site.process(name) ?? []);
    const text = drawText(listProcesses(processes).blocks, { width: 132, colour: 0 });
    expect(text).toContain('free-throw: slowing-knudsen:target at least 1 (warning), 0.3 (error).');
    expect(text).toContain('Makes no assumption of its own.');
  });

  test('of gases have formula, hazards and where collision values come from', () => {
    const rows = new Map(
      listGases(site.library)
        .sheet()
        .rows.map((row) => [row[0], row]),
    );
    expect(rows.get('SiH4')).toEqual(expect.arrayContaining(['SiH4', expect.stringContaining('pyrophoric')]));
    for (const name of site.library.gasNames()) expect(rows.get(name)?.[5]).not.toBe('');
  });

  test('of units have factors to ten digits', () => {
    const factors = new Map(tableOf(listUnits().blocks).rows.map(([, unit, factor]) => [unit, factor]));
    expect(factors.get('atm')).toBe('101325 Pa');
    expect(factors.get('Torr')).toBe('133.3223684 Pa');
    expect(factors.get('angstrom')).toBe('1e-10 m');
  });

  test('of films and units have a source for each', () => {
    for (const row of listFilms(site.library).sheet().rows) expect(row.at(-1)).not.toBe('');
    for (const row of listUnits().sheet().rows) expect(row.at(-1)).not.toBe('');
  });
});
