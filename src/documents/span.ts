import { nearest } from '../units/suggest.ts';
import { either, needed, quoted } from '../units/unit-fault.ts';
import { readFixed } from './single-value.ts';
import { nodePlace } from './nodes.ts';
import type { MeasurePlan, Pass } from './measure-plan.ts';
import type { MapNode, NodePair } from './nodes.ts';
import type { Fixed, Ramp, Range } from './setpoint.ts';

/** Whether a map is written as a ramp or a range. */
export function isSpan(map: MapNode): boolean {
  return map.pairs.some((pair) => RAMP_KEYS.includes(pair.key.text) || RANGE_KEYS.includes(pair.key.text));
}

/** A ramp (`from`, `to`, `over`) or a range (`usually`, `at_least`, `at_most`) in the place of one value. */
export function readSpan(pass: Pass, map: MapNode, plan: MeasurePlan, name: string): Ramp | Range | undefined {
  const wrong = (found: string, right: string): undefined => {
    pass.faults.push({ place: nodePlace(pass.source, map), found: `${name}: ${found}`, right });
  };
  const ramp = map.pairs.some((pair) => pair.key.text === 'from' || pair.key.text === 'to');
  if (!isNearSpan(map)) {
    wrong('a map', needed(plan.dimensions));
    return;
  }
  if (ramp && plan.ramp !== true) {
    wrong('a ramp cannot stand here', needed(plan.dimensions));
    return;
  }
  if (!ramp && plan.range !== true) {
    wrong('a range cannot stand here', needed(plan.dimensions));
    return;
  }
  const values = readValues(pass, map, plan, name, ramp ? RAMP_KEYS : RANGE_KEYS);
  if (values === undefined) return undefined;
  return ramp ? toRamp(pass, map, values, name, wrong) : toRange(pass, map, values, wrong);
}

function isNearSpan(map: MapNode): boolean {
  return map.pairs.some((pair) => nearest(pair.key.text, [...RAMP_KEYS, ...RANGE_KEYS]) !== undefined);
}

const RAMP_KEYS: readonly string[] = ['from', 'to', 'over'];
const RANGE_KEYS: readonly string[] = ['usually', 'at_least', 'at_most'];

type Wrong = (found: string, right: string) => undefined;
type Values = ReadonlyMap<string, Fixed>;

/** The values of a span by key; undefined where one of them, or a key, is wrong. */
function readValues(
  pass: Pass,
  map: MapNode,
  plan: MeasurePlan,
  name: string,
  keys: readonly string[],
): Values | undefined {
  const values = new Map<string, Fixed>();
  let sound = true;
  for (const pair of map.pairs) {
    const key = pair.key.text;
    const known = keys.includes(key);
    if (!known) unknownKey(pass, pair, key, name, keys);
    const fixed = known && key !== 'over' ? readEnd(pass, pair, plan, key) : undefined;
    if (fixed !== undefined) values.set(key, fixed);
    else if (key !== 'over') sound = false;
  }
  return sound ? values : undefined;
}

function unknownKey(pass: Pass, pair: NodePair, key: string, name: string, keys: readonly string[]): void {
  const meant = nearest(key, keys);
  const right = meant === undefined ? `write ${either(keys)}` : `write ${meant}`;
  pass.faults.push({ place: nodePlace(pass.source, pair.key), found: `unknown key ${quoted(key)} in ${name}`, right });
}

function readEnd(pass: Pass, pair: NodePair, plan: MeasurePlan, key: string): Fixed | undefined {
  const { value } = pair;
  if (value.kind === 'scalar' && (typeof value.value === 'string' || typeof value.value === 'number')) {
    return readFixed(pass, value, plan, key);
  }
  const place = nodePlace(pass.source, value);
  pass.faults.push({ place, found: `${key}: no single value`, right: needed(plan.dimensions) });
  return undefined;
}

function toRamp(pass: Pass, map: MapNode, values: Values, name: string, wrong: Wrong): Ramp | undefined {
  const from = values.get('from');
  const to = values.get('to');
  const over = overOf(pass, map);
  if (over === undefined) return undefined;
  if (from === undefined || to === undefined) {
    const missing = from === undefined ? 'from' : 'to';
    wrong(`a ramp without ${missing}`, `add ${missing}`);
    return;
  }
  if (from.measure.dimension !== to.measure.dimension) {
    wrong('a ramp between values of two kinds', `give ${name} in units of one kind`);
    return;
  }
  return { kind: 'ramp', from, to, over, place: nodePlace(pass.source, map) };
}

function overOf(pass: Pass, map: MapNode): 'step' | 'laps' | undefined {
  const pair = map.pairs.find((candidate) => candidate.key.text === 'over');
  if (pair === undefined) return 'step';
  const value = pair.value.kind === 'scalar' ? pair.value.value : undefined;
  if (value === 'step' || value === 'laps') return value;
  const found = typeof value === 'string' ? `over: ${quoted(value)}` : 'over: no word';
  pass.faults.push({
    place: nodePlace(pass.source, pair.value),
    found,
    right: 'write step or laps',
  });
  return undefined;
}

function toRange(pass: Pass, map: MapNode, values: Values, wrong: Wrong): Range | undefined {
  const usually = values.get('usually');
  const least = values.get('at_least');
  const most = values.get('at_most');
  const inOrder = [least, usually, most].filter((value) => value !== undefined);
  if (usually === undefined && (least === undefined || most === undefined)) {
    wrong(
      'a range without usually',
      least === most ? 'add usually, at_least and at_most' : 'add usually, or both limits',
    );
    return;
  }
  for (const [index, value] of inOrder.entries()) {
    const before = inOrder[index - 1];
    if (before === undefined) continue;
    if (before.measure.dimension !== value.measure.dimension) {
      wrong('a range of values of two kinds', 'give it in units of one kind');
      return;
    }
    if (before.measure.value > value.measure.value) {
      wrong('a range that is not in order', 'at_least is the lowest, at_most the highest');
      return;
    }
  }
  return {
    kind: 'range',
    ...(usually === undefined ? {} : { usually }),
    ...(least === undefined ? {} : { at_least: least }),
    ...(most === undefined ? {} : { at_most: most }),
    place: nodePlace(pass.source, map),
  };
}
