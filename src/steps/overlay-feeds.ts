import type { Pointer } from '../documents/document.ts';
import type { Flows } from '../documents/generated/types.ts';
import type { Setpoint } from '../documents/setpoint.ts';
import type { FlowLine } from './flow-line.ts';
import type { Layer } from './layer.ts';
import { unknownName } from './names.ts';
import { placeIn, type Ground } from './ground.ts';
import { isWritten, usualMeasure, type Written } from './written.ts';

/** Puts flows at `flows.LINE`, as what the lines deliver. `{}` says that nothing flows. */
export function putFlows(layer: Layer, flows: Flows, pointer: Pointer, ground: Ground): void {
  const entries = Object.entries(flows);
  if (entries.length === 0) {
    for (const name of layer.parts.lines) layer.drop(`flows.${name}`);
    layer.amounts = new Map();
    layer.parts.lines = [];
    return;
  }
  const { lines } = ground.chamber;
  const named: string[] = [];
  for (const [name, setpoint] of entries) {
    const line = lines.get(name);
    if (line === undefined) {
      const place = placeIn(ground, pointer, ['flows', name], 'key');
      ground.faults.push(
        unknownName(place, 'gas line', name, [...lines.keys()], 'describe it under `gas_lines` of the chamber'),
      );
      continue;
    }
    putFlow(layer, name, setpoint, line, ground);
    if (!layer.parts.lines.includes(name)) named.push(name);
  }
  if (named.length > 0) layer.parts.lines = [...layer.parts.lines, ...named];
}

function putFlow(layer: Layer, name: string, setpoint: Setpoint, line: FlowLine, ground: Ground): void {
  if (layer.amounts.has(name)) layer.amounts = new Map([...layer.amounts].filter(([line]) => line !== name));
  if (isWritten(setpoint) && usualMeasure(setpoint).dimension === 'amount') {
    putAmount(layer, name, setpoint, line, ground);
  } else if (line.scale !== undefined) {
    layer.put(line.address, setpoint, line.scale);
  } else {
    layer.mark(line.address, 'unknown');
  }
}

/** An amount becomes a flow once the step's time is known: see `settleAmounts`. */
function putAmount(
  layer: Layer,
  name: string,
  setpoint: Written,
  { draws, address }: FlowLine,
  { faults }: Ground,
): void {
  layer.drop(address);
  if (draws) layer.amounts = new Map([...layer.amounts, [name, setpoint]]);
  else
    faults.push({
      place: setpoint.place,
      found: `an amount through line ${name}`,
      right: 'a flow, in sccm: the line has a controller',
    });
}

/** Puts powers or duties at `power.GENERATOR` and `duty.GENERATOR`. */
export function putGenerators(
  layer: Layer,
  key: 'power' | 'duty',
  map: Readonly<Record<string, Setpoint>>,
  pointer: Pointer,
  ground: Ground,
): void {
  const { generators, plain } = ground.chamber;
  const named: string[] = [];
  for (const [name, setpoint] of Object.entries(map)) {
    if (!generators.includes(name)) {
      const place = placeIn(ground, pointer, [key, name], 'key');
      ground.faults.push(
        unknownName(place, 'generator', name, generators, 'describe it under `generators` of the chamber'),
      );
      continue;
    }
    layer.put(`${key}.${name}`, setpoint, plain);
    if (key === 'power' && !layer.parts.generators.includes(name)) named.push(name);
  }
  if (named.length > 0) layer.parts.generators = [...layer.parts.generators, ...named];
}
