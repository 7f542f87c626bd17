import { referenceName, type Reference } from '../../quantities/reference.ts';
import type { Run, StepRun } from '../../quantities/run.ts';
import { printNumber } from '../../units/display.ts';
import type { Block, Page, Sheet } from '../page.ts';
import { dimensionOfNumber, unitOfNumber } from '../number.ts';
import { knudsenNumbers, noThrow, STATE, STAY } from '../regime-numbers.ts';
import { bandOf, inUnit, print, shownFor, spreadInUnit, type AskedUnits, type Shown } from '../shown.ts';
import { listed } from '../words.ts';
import { recipeHeadOf } from './recipe-head.ts';

export interface TableOptions {
  readonly units: AskedUnits;
  /** Numbers to show; those that tell the regime where none are asked for. */
  readonly columns?: readonly Reference[];
}

/** The numbers of every step, one row a step. What was not asked for is left out where it means nothing. */
export function tablePage(run: Run, { units, columns: asked }: TableOptions): Page {
  const shown = shownFor(run, units);
  const columns = asked === undefined ? regimeColumns(run) : asked.map((reference) => ({ reference }));
  return { blocks: tableBlocks(run, columns, shown), sheet: () => tableSheet(run, columns, shown) };
}

interface Column {
  readonly reference: Reference;
  /** Why the number means nothing in a step, should that be so. */
  readonly idle?: (step: StepRun) => string | undefined;
}

function regimeColumns({ steps, site }: Run): readonly Column[] {
  const over = new Map<string, Reference>();
  for (const step of steps) {
    for (const reference of knudsenNumbers(step, site)) over.set(referenceName(reference), reference);
  }
  return [...STATE, ...over.values(), ...STAY].map((reference) => ({
    reference,
    idle: (step) => noThrow(step, reference, site),
  }));
}

function tableBlocks(run: Run, columns: readonly Column[], shown: Shown): readonly Block[] {
  const lacking = lackingSentence(run, columns);
  return [
    recipeHeadOf(run),
    {
      kind: 'table',
      columns: [
        { title: '', align: 'right' },
        { title: 'step', align: 'left' },
        ...columns.map(({ reference }) => ({ title: columnTitle(reference), align: 'right' as const })),
      ],
      rows: rowsOf(run, columns, shown),
      key: 2,
    },
    { kind: 'sentence', weight: 'detail', text: `Uncertainties are expanded, k = ${printNumber(shown.coverage)}.` },
    ...(lacking === undefined ? [] : [{ kind: 'sentence' as const, weight: 'first' as const, text: lacking }]),
  ];
}

function rowsOf({ steps }: Run, columns: readonly Column[], shown: Shown): readonly (readonly string[])[] {
  const cells = columns.map((column) => withBands(steps.map((step) => cellOf(step, column, shown))));
  return steps.map(({ step }, row) => [String(step.number), step.path, ...cells.map((column) => column[row] ?? '')]);
}

/** Cells of one column; behind aligned numbers the bands begin at one edge. */
function withBands(cells: readonly Cell[]): readonly string[] {
  const widest = Math.max(...cells.map(({ band }) => band.length));
  return widest === 0
    ? cells.map(({ text }) => text)
    : cells.map(({ text, band }) => (text === '' ? '' : `${text} ${band.padEnd(widest)}`));
}

interface Cell {
  readonly text: string;
  readonly band: string;
}

/** The number's own name, by which it can be asked for; a Knudsen number by its symbol. */
function columnTitle(reference: Reference): string {
  const name = referenceName(reference);
  if (reference.id === 'knudsen') return `Kn${name.slice('knudsen'.length)}`;
  return SHORT.get(name) ?? name;
}

const SHORT: ReadonlyMap<string, string> = new Map([
  ['gas-pressure', 'pressure'],
  ['gas-temperature', 'temperature'],
]);

const BLANK: Cell = { text: '', band: '' };

function cellOf(step: StepRun, { reference, idle }: Column, shown: Shown): Cell {
  if (idle?.(step) !== undefined) return BLANK;
  const reading = step.read(reference);
  if (reading.kind === 'missing') return { text: 'open', band: '' };
  if (reading.kind === 'inapplicable') return BLANK;
  const expanded = shown.coverage * step.uncertainty(reference);
  const unit = unitOfNumber(shown, step, reference, reading.value);
  const text = print(shown, reading.value, dimensionOfNumber(reference), expanded, unit);
  const whose = reading.of === undefined ? '' : ` (${reading.of})`;
  return { text: text + whose, band: bandOf(shown, reference.id, reading.value) ?? '' };
}

/** What would supply the numbers that are open, all at once. */
function lackingSentence({ steps }: Run, columns: readonly Column[]): string | undefined {
  const needs = new Map<string, string[]>();
  for (const step of steps) {
    const own = new Set<string>();
    for (const { reference, idle } of columns) {
      if (idle?.(step) !== undefined) continue;
      const reading = step.read(reference);
      if (reading.kind === 'missing') for (const need of reading.needs) own.add(need);
    }
    for (const need of own) needs.set(need, [...(needs.get(need) ?? []), step.step.path]);
  }
  if (needs.size === 0) return undefined;
  return `Open for want of ${[...needs].map(([need, paths]) => `${need} (${listed(paths)})`).join(', ')}.`;
}

function tableSheet({ recipe, steps }: Run, columns: readonly Column[], shown: Shown): Sheet {
  const rows = steps.flatMap((step) =>
    columns.map(({ reference, idle }) => {
      const because = idle?.(step);
      return [
        recipe.file,
        recipe.name,
        String(step.step.number),
        step.step.path,
        referenceName(reference),
        ...(because === undefined ? numberCells(step, reference, shown) : absentCells(because)),
      ];
    }),
  );
  return {
    columns: [
      'file',
      'recipe',
      'step_number',
      'step',
      'number',
      'value',
      'uncertainty',
      'unit',
      'band',
      'of',
      'absent',
    ],
    rows,
  };
}

/** Value, uncertainty, unit, band, whose number, and why there is none. */
export function numberCells(step: StepRun, reference: Reference, shown: Shown): readonly string[] {
  const reading = step.read(reference);
  if (reading.kind === 'missing') return absentCells(`needs ${listed(reading.needs)}`);
  if (reading.kind === 'inapplicable') return absentCells(reading.because);
  const dimension = dimensionOfNumber(reference);
  const unit = unitOfNumber(shown, step, reference, reading.value);
  return [
    printNumber(inUnit(shown, reading.value, unit, dimension)),
    printNumber(spreadInUnit(shown, shown.coverage * step.uncertainty(reference), unit, dimension)),
    unit,
    bandOf(shown, reference.id, reading.value) ?? '',
    reading.of ?? '',
    '',
  ];
}

function absentCells(because: string): readonly string[] {
  return ['', '', '', '', '', because];
}
