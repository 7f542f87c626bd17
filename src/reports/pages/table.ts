import { quantityNamed } from '../../quantities/catalogue.ts';
import { referenceName, type Reference } from '../../quantities/reference.ts';
import type { Run, StepRun } from '../../quantities/run.ts';
import { printNumber } from '../../units/display.ts';
import type { Block, Page, Sheet } from '../page.ts';
import { dimensionOfNumber, unitOfNumber } from '../number.ts';
import { bandOf, inUnit, print, shownFor, spreadInUnit, type AskedUnits, type Shown } from '../shown.ts';
import { listed } from '../words.ts';
import { recipeHeadOf } from './recipe-head.ts';

export interface TableOptions {
  readonly units: AskedUnits;
  /** Numbers to show; those that tell the regime where none are asked for. */
  readonly columns?: readonly Reference[];
}

/** The numbers of every step, one row a step. */
export function tablePage(run: Run, { units, columns = regimeColumns(run) }: TableOptions): Page {
  const shown = shownFor(run, units);
  return { blocks: tableBlocks(run, columns, shown), sheet: () => tableSheet(run, columns, shown) };
}

/** Pressure, mean free path, the Knudsen number over each length that a step names, residence time and turnovers. */
export function regimeColumns({ steps }: Pick<Run, 'steps'>): readonly Reference[] {
  const lengths = new Set(steps.flatMap(lengthsKnown));
  return [
    { id: 'gas-pressure' },
    { id: 'gas-temperature' },
    { id: 'mean-free-path' },
    ...[...lengths].map((length) => ({ id: 'knudsen', length })),
    { id: 'residence-time' },
    { id: 'turnovers' },
  ];
}

function lengthsKnown(step: StepRun): readonly string[] {
  const lengths = quantityNamed('knudsen')?.lengths?.(step.plan.scope) ?? [];
  return lengths.filter((length) => step.read({ id: 'length', length }).kind === 'known');
}

function tableBlocks(run: Run, columns: readonly Reference[], shown: Shown): readonly Block[] {
  const lacking = lackingSentence(run, columns);
  return [
    recipeHeadOf(run),
    {
      kind: 'table',
      columns: [
        { title: '', align: 'right' },
        { title: 'step', align: 'left' },
        ...columns.map((reference) => ({ title: columnTitle(reference), align: 'right' as const })),
      ],
      rows: rowsOf(run, columns, shown),
      key: 2,
    },
    { kind: 'sentence', weight: 'detail', text: `Uncertainties are expanded, k = ${printNumber(shown.coverage)}.` },
    ...(lacking === undefined ? [] : [{ kind: 'sentence' as const, weight: 'first' as const, text: lacking }]),
  ];
}

function rowsOf({ steps }: Run, columns: readonly Reference[], shown: Shown): readonly (readonly string[])[] {
  const cells = columns.map((reference) => withBands(steps.map((step) => cellOf(step, reference, shown))));
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

function cellOf(step: StepRun, reference: Reference, shown: Shown): Cell {
  const reading = step.read(reference);
  if (reading.kind === 'missing') return { text: 'open', band: '' };
  if (reading.kind === 'inapplicable') return { text: '', band: '' };
  const expanded = shown.coverage * step.uncertainty(reference);
  const unit = unitOfNumber(shown, step, reference, reading.value);
  const text = print(shown, reading.value, dimensionOfNumber(reference), expanded, unit);
  const whose = reading.of === undefined ? '' : ` (${reading.of})`;
  return { text: text + whose, band: bandOf(shown, reference.id, reading.value) ?? '' };
}

/** What would supply the numbers that are open, all at once. */
function lackingSentence({ steps }: Run, columns: readonly Reference[]): string | undefined {
  const needs = new Map<string, string[]>();
  for (const step of steps) {
    const own = new Set<string>();
    for (const reference of columns) {
      const reading = step.read(reference);
      if (reading.kind === 'missing') for (const need of reading.needs) own.add(need);
    }
    for (const need of own) needs.set(need, [...(needs.get(need) ?? []), step.step.path]);
  }
  if (needs.size === 0) return undefined;
  return `Open for want of ${[...needs].map(([need, paths]) => `${need} (${listed(paths)})`).join(', ')}.`;
}

function tableSheet({ recipe, steps }: Run, columns: readonly Reference[], shown: Shown): Sheet {
  const rows = steps.flatMap((step) =>
    columns.map((reference) => [
      recipe.file,
      recipe.name,
      String(step.step.number),
      step.step.path,
      referenceName(reference),
      ...numberCells(step, reference, shown),
    ]),
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
  if (reading.kind === 'missing') return ['', '', '', '', '', `needs ${listed(reading.needs)}`];
  if (reading.kind === 'inapplicable') return ['', '', '', '', '', reading.because];
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
