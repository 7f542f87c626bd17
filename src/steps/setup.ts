import type { ChamberFacts } from './chamber.ts';
import type { Given } from './given.ts';
import type { Layer } from './layer.ts';
import type { Emitter, Line, Setup } from './step.ts';

/** What a step is made of, once all its layers have been put. */
export function setupOf({ parts, givens }: Layer, chamber: ChamberFacts): Setup {
  const lines = flowingLines(parts.lines, givens, chamber);
  const composition = parts.composition.length > 0;
  const target = runningOf(parts.targets, chamber.targets);
  const melt = runningOf(parts.melts, chamber.melts);
  return {
    lines,
    gases: composition ? parts.composition : gasesOf(lines),
    composition,
    residual: chamber.residual,
    flow: parts.flow ?? chamber.flow,
    pumpSpeed: chamber.pumpSpeed,
    pumpRows: chamber.pumpRows,
    throttle: parts.throttle,
    ...(target === undefined ? {} : { target }),
    ...(melt === undefined ? {} : { melt }),
    ...(parts.surface === undefined ? {} : { surface: parts.surface }),
    ...(parts.reactant === undefined ? {} : { reactant: parts.reactant }),
    ...(parts.ion === undefined ? {} : { ion: parts.ion }),
    ...(parts.backside === undefined ? {} : { backside: parts.backside }),
    ...(chamber.walls === undefined ? {} : { walls: chamber.walls }),
    wafer: parts.wafer,
    ...(parts.feature === undefined ? {} : { feature: parts.feature }),
    inlets: chamber.inlets,
    gauges: chamber.gauges,
    powered: parts.generators.filter((name) => isOn(givens.get(`power.${name}`))),
  };
}

/** Lines with a flow; one that is set to nothing brings nothing. */
function flowingLines(names: readonly string[], givens: ReadonlyMap<string, Given>, { lines }: ChamberFacts): readonly Line[] {
  const flowing: Line[] = [];
  for (const name of names) {
    const line = lines.get(name);
    const given = givens.get(`flows.${name}`);
    if (line !== undefined && (given === undefined || isOn(given))) flowing.push(line.line);
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

function isOn(given: Given | undefined): boolean {
  return given !== undefined && (given.value > 0 || given.span !== undefined);
}

/** The target or melt that the step names, else the chamber's only one. */
function runningOf([named]: readonly string[], emitters: ReadonlyMap<string, Emitter>): Emitter | undefined {
  if (named !== undefined) return emitters.get(named);
  const [only, second] = emitters.values();
  return second === undefined ? only : undefined;
}
