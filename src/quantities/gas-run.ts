import type { Given } from '../steps/given.ts';
import type { Setup, Step } from '../steps/step.ts';
import type { Library } from '../substances/library.ts';
import type { Dimension } from '../units/dimensions.ts';
import { Plan } from './plan.ts';
import { StepRun } from './run.ts';
import { Scope } from './scope.ts';

/** State of a gas that is asked about outside any recipe. */
export interface GasState {
  /** Parts of each gas, in any measure; only their ratios count. */
  readonly parts: ReadonlyMap<string, number>;
  /** K. */
  readonly temperature: number;
  /** Pa. */
  readonly pressure: number;
}

/** A gas by itself as a run of one step, so that its numbers come from the same catalogue as those of any recipe. */
export function gasRun(library: Library, { parts, temperature, pressure }: GasState): StepRun {
  const total = [...parts.values()].reduce((sum, part) => sum + part, 0);
  const givens = [
    asked('pressure', pressure, 'pressure', 'Pa'),
    asked('temperatures.gas', temperature, 'temperature', 'K'),
    asked('temperatures.wall', temperature, 'temperature', 'K'),
    ...[...parts].map(([gas, part]) => asked(`composition.${gas}`, part / total, 'fraction', '')),
  ];
  const step: Step = {
    path: 'gas',
    name: 'gas',
    number: 1,
    process: 'unassessed',
    place: NOWHERE,
    processPlace: NOWHERE,
    givens: new Map(givens.map((given) => [given.address, given])),
    unknown: new Set(),
    none: new Set(['wafer']),
    setup: setupOf([...parts.keys()]),
    waivers: [],
  };
  return new StepRun(step, new Plan(new Scope(step, library)));
}

const NOWHERE = { file: '', line: 1, column: 1 };

function asked(address: string, value: number, dimension: Dimension, unit: string): Given {
  return { address, value, uncertainty: 0, dimension, unit, origin: { default: 'asked', because: 'asked for' } };
}

function setupOf(gases: readonly string[]): Setup {
  return {
    lines: [],
    gases,
    composition: true,
    residual: [],
    flow: 'mixed',
    pumpSpeed: 'none',
    pumpRows: 0,
    throttle: 'holds',
    wafer: 'none',
    inlets: [],
    gauges: [],
    powered: [],
  };
}
