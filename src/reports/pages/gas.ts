import { quantityNamed } from '../../quantities/catalogue.ts';
import type { Reference } from '../../quantities/reference.ts';
import { referenceName } from '../../quantities/reference.ts';
import type { StepRun } from '../../quantities/run.ts';
import type { Gas } from '../../substances/gas.ts';
import { printNumber } from '../../units/display.ts';
import type { Block, Page, Sheet } from '../page.ts';
import { dimensionOfNumber, filled } from '../number.ts';
import { print, type Shown } from '../shown.ts';
import { capital, listed, numberWords, sentence } from '../words.ts';
import { hazardClauses, practice } from '../cautions.ts';
import { condensingSentences } from '../condensing.ts';
import { numberCells } from './table.ts';

/** One gas or mixture at its temperature and pressure. */
export interface GasState {
  /** As it was asked for: `Ar`, or `Ar=4 CF4=1`. */
  readonly name: string;
  /** Temperature and pressure as they were asked for. */
  readonly at?: string;
  readonly run: StepRun;
}

/** What the collisions of a gas or mixture amount to. */
export function gasPage(states: readonly GasState[], shown: Shown): Page {
  return {
    blocks: [...states.flatMap((state) => stateBlocks(state, shown)), ...cautionBlocks(states)],
    sheet: () => gasSheet(states, shown),
  };
}

/** The numbers that `gas` tells: of a gas by itself, or of a mixture, its gases and their pairs. */
export function gasNumbers({ run }: GasState): readonly Reference[] {
  const { gases } = run.step.setup;
  const [only = ''] = gases;
  if (gases.length === 1)
    return [...WHOLE, ...SINGLE.map((id) => ({ id, of: id === 'collision-diameter' ? `${only}/${only}` : only }))];
  const each = gases.flatMap((of) => [
    ...EACH.map((id) => ({ id, of })),
    { id: 'collision-diameter', of: `${of}/${of}` },
  ]);
  const pairs = gases.flatMap((a, index) =>
    gases.slice(index + 1).map((b) => ({ id: 'diffusivity', of: `${a}/${b}` })),
  );
  return [...WHOLE, ...each, ...pairs];
}

const WHOLE: readonly Reference[] = [
  'molar-mass',
  'number-density',
  'mean-free-path',
  'viscosity',
  'thermal-conductivity',
].map((id) => ({ id }));
const SINGLE = ['mean-speed', 'collision-diameter', 'collision-frequency', 'diffusivity'] as const;
const EACH = ['mole-fraction', 'mean-speed', 'mean-free-path', 'diffusivity'] as const;

function stateBlocks(state: GasState, shown: Shown): readonly Block[] {
  const { run } = state;
  const numbers = gasNumbers(state);
  const remarks = [...new Set(numbers.flatMap((reference) => run.remarks(reference)))];
  return [
    { kind: 'heading', text: state.name, aside: asideOf(state, shown) },
    {
      kind: 'table',
      columns: [
        { title: 'number', align: 'left' },
        { title: 'value', align: 'left' },
        { title: 'law and source', align: 'left', wraps: true },
      ],
      rows: numbers.map((reference, index) => {
        const first = numbers.findIndex(({ id }) => id === reference.id) === index;
        return [
          wordsOf(reference, run),
          valueOf(reference, run, shown),
          first ? (quantityNamed(reference.id)?.source ?? '') : '',
        ];
      }),
      key: 0,
    },
    ...condensingSentences(run).map((text) => ({ kind: 'sentence' as const, weight: 'first' as const, text })),
    ...[...remarks.map(sentence), ...dataSentences(state)].map((text) => ({
      kind: 'sentence' as const,
      weight: 'detail' as const,
      text,
    })),
    { kind: 'sentence', weight: 'detail', text: `Uncertainties are expanded, k = ${printNumber(shown.coverage)}.` },
  ];
}

function wordsOf(reference: Reference, run: StepRun): string {
  if (reference.id !== 'diffusivity') return numberWords(reference, filled(reference, run));
  const [a = '', b] = (reference.of ?? '').split('/');
  if (b !== undefined) return `diffusivity of ${a} in ${b}`;
  return run.step.setup.gases.length === 1 ? `self-diffusivity of ${a}` : `diffusivity of ${a} in the mixture`;
}

function asideOf({ run, at }: GasState, shown: Shown): string {
  const given = (address: string): string => {
    const found = run.given(address);
    return found === undefined ? '' : print(shown, found.value, found.dimension);
  };
  const titles = run.step.setup.gases.map((gas) => run.plan.scope.gas(gas)?.title ?? gas);
  return `${listed(titles)} at ${at ?? `${given('temperatures.gas')} and ${given('pressure')}`}`;
}

function valueOf(reference: Reference, run: StepRun, shown: Shown): string {
  const reading = run.read(reference);
  if (reading.kind === 'missing') return `open, needs ${listed(reading.needs)}`;
  if (reading.kind === 'inapplicable') return reading.because;
  return print(shown, reading.value, dimensionOfNumber(reference), shown.coverage * run.uncertainty(reference));
}

/** Where the collision values come from, gas by gas, and what else is known of it. */
function dataSentences({ run }: GasState): readonly string[] {
  return run.step.setup.gases.flatMap((name) => {
    const gas = run.plan.scope.gas(name);
    if (gas === undefined) return [];
    const source = gas.sources.collision ?? gas.sources.critical ?? gas.sources.source;
    return [
      ...(source === undefined
        ? []
        : [
            sentence(`data of ${name}: ${source}${gas.estimated === undefined ? '' : `; estimated: ${gas.estimated}`}`),
          ]),
      ...(gas.associates === undefined ? [] : [sentence(`${name}: ${gas.associates}`)]),
      ...gas.remarks.map((remark) => sentence(`${name}: ${remark}`)),
    ];
  });
}

function cautionBlocks(states: readonly GasState[]): readonly Block[] {
  const gases = new Map<string, Gas>();
  for (const { run } of states) {
    for (const name of run.step.setup.gases) {
      const gas = run.plan.scope.gas(name);
      if (gas !== undefined && gas.hazards.length > 0) gases.set(name, gas);
    }
  }
  const entries = [...gases].flatMap(([name, { hazards }]) => hazards.map((hazard) => [hazard, [name]] as const));
  return entries.length === 0
    ? []
    : [{ kind: 'caution', text: `${capital(hazardClauses(entries).join('; '))}. ${practice()}` }];
}

function gasSheet(states: readonly GasState[], shown: Shown): Sheet {
  return {
    columns: ['gas', 'number', 'value', 'uncertainty', 'unit', 'band', 'of', 'absent', 'source'],
    rows: states.flatMap((state) =>
      gasNumbers(state).map((reference) => [
        state.name,
        referenceName(reference),
        ...numberCells(state.run, reference, shown),
        quantityNamed(reference.id)?.source ?? '',
      ]),
    ),
  };
}
