import type { ChamberFacts } from './chamber.ts';
import type { Given } from './given.ts';
import type { Layer, Parts } from './layer.ts';
import type { Emitter, Line, Setup } from './step.ts';

/** What a step is made of, once all its layers have been put. */
export function setupOf({ parts, givens }: Layer, chamber: ChamberFacts): Setup {
  const lines = flowingLines(parts.lines, givens, chamber);
  const composition = parts.composition.length > 0;
  const setup: Writable<Setup> = {
    lines,
    gases: composition ? parts.composition : gasesOf(lines),
    composition,
    residual: chamber.residual,
    flow: parts.flow ?? chamber.flow,
    pumpSpeed: chamber.pumpSpeed,
    pumpRows: chamber.pumpRows,
    throttle: parts.throttle,
    wafer: parts.wafer,
    inlets: chamber.inlets,
    gauges: chamber.gauges,
    powered: poweredOf(parts.generators, givens),
  };
  putOptional(setup, parts, chamber);
  return setup;
}

type Writable<T> = { -readonly [K in keyof T]: T[K] };

function putOptional(setup: Writable<Setup>, parts: Parts, chamber: ChamberFacts): void {
  const target = runningOf(parts.targets, chamber.targets);
  const melt = runningOf(parts.melts, chamber.melts);
  if (target !== undefined) setup.target = target;
  if (melt !== undefined) setup.melt = melt;
  if (parts.surface !== undefined) setup.surface = parts.surface;
  if (parts.reactant !== undefined) setup.reactant = parts.reactant;
  if (parts.ion !== undefined) setup.ion = parts.ion;
  if (parts.backside !== undefined) setup.backside = parts.backside;
  if (parts.feature !== undefined) setup.feature = parts.feature;
  if (chamber.walls !== undefined) setup.walls = chamber.walls;
}

/** Lines with a flow; one that is set to nothing brings nothing. */
function flowingLines(
  names: readonly string[],
  givens: ReadonlyMap<string, Given>,
  { lines }: ChamberFacts,
): readonly Line[] {
  const flowing: Line[] = [];
  for (const name of names) {
    const line = lines.get(name);
    if (line === undefined) continue;
    const given = givens.get(line.address);
    if (given === undefined || isOn(given)) flowing.push(line.line);
  }
  return flowing;
}

function gasesOf(lines: readonly Line[]): readonly string[] {
  const gases: string[] = [];
  for (const { brings } of lines) {
    for (const { gas } of brings) if (!gases.includes(gas)) gases.push(gas);
  }
  return gases;
}

/** Generators that deliver power. */
function poweredOf(names: readonly string[], givens: ReadonlyMap<string, Given>): readonly string[] {
  return names.length === 0 ? names : names.filter((name) => isOn(givens.get(`power.${name}`)));
}

function isOn(given: Given | undefined): boolean {
  return given !== undefined && (given.value > 0 || given.span !== undefined);
}

/** The target or melt that the step names, else the chamber's only one. */
function runningOf([named]: readonly string[], emitters: ReadonlyMap<string, Emitter>): Emitter | undefined {
  if (named !== undefined) return emitters.get(named);
  const [only, second] = emitters.values();
  return second === undefined ? only : undefined;
}
