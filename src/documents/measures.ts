import { isMap, isScalar, isSeq } from 'yaml';
import { PLAN, ROOTS } from './generated/plan.ts';
import { keyText, nodePlace, writtenNode } from './nodes.ts';
import { readSingle } from './single-value.ts';
import { isSpan, readSpan } from './span.ts';
import { needed, quoted } from '../units/unit-fault.ts';
import type { ParsedNode, Scalar, YAMLMap, YAMLSeq } from 'yaml';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { MeasurePlan, Pass, PlanNode } from './measure-plan.ts';
import type { Value } from './plain.ts';
import type { Sort } from './sort.ts';

/** Puts a setpoint in the place of every physical value of a content, in place; values that cannot be read are faults. */
export function readMeasures(source: Source, root: ParsedNode, content: Value, sort: Sort, faults: Fault[]): void {
  readChildren({ source, faults }, root, content, nodeAt(ROOTS[sort]), '');
}

function readChildren(pass: Pass, node: ParsedNode, value: Value, plan: PlanNode, name: string): void {
  if (isMap(node)) readMap(pass, node, value, plan);
  else if (isSeq(node) && plan.items !== undefined) readList(pass, node, value, nodeAt(plan.items), name);
}

function readMap(pass: Pass, map: YAMLMap.Parsed, value: Value, { keys, rest }: PlanNode): void {
  if (!isValueMap(value)) return;
  for (const pair of map.items) {
    const key = keyText(pair);
    const index = keys !== undefined && Object.hasOwn(keys, key) ? keys[key] : rest;
    const old = value[key];
    if (index === undefined || old === undefined) continue;
    value[key] = readNode(pass, writtenNode(pair.key, pair.value), pair.value, old, nodeAt(index), key);
  }
}

function readList(pass: Pass, list: YAMLSeq.Parsed, value: Value, plan: PlanNode, name: string): void {
  if (!Array.isArray(value)) return;
  list.items.forEach((item, index) => {
    const old = value[index];
    if (old !== undefined) value[index] = readNode(pass, item, item, old, plan, name);
  });
}

function readNode(
  pass: Pass,
  at: ParsedNode,
  node: ParsedNode | null,
  old: Value,
  plan: PlanNode,
  name: string,
): Value {
  const { measure } = plan;
  if (measure === undefined || (node !== null && goesOn(node, plan))) {
    if (node !== null) readChildren(pass, node, old, plan, name);
    return old;
  }
  return readValue(pass, at, node, measure, name) ?? old;
}

/** Whether a list or map at a physical value's place is one of further values, such as speeds by gas, and no span. */
function goesOn(node: ParsedNode, { keys, rest, items }: PlanNode): boolean {
  if (isSeq(node)) return items !== undefined;
  return isMap(node) && (keys !== undefined || rest !== undefined) && !isSpan(node);
}

function readValue(
  pass: Pass,
  at: ParsedNode,
  node: ParsedNode | null,
  measure: MeasurePlan,
  name: string,
): Value | undefined {
  if (isMap(node)) return readSpan(pass, node, measure, name);
  if (isScalar(node) && isText(node)) return readSingle(pass, node, measure, name);
  const found = isSeq(node) ? 'a list' : isScalar(node) && node.value !== null ? quoted(node.source) : 'no value';
  pass.faults.push({
    place: nodePlace(pass.source, at),
    found: `${name}: ${found}`,
    right: needed(measure.dimensions),
  });
  return undefined;
}

function isText({ value }: Scalar.Parsed): boolean {
  return typeof value === 'string' || typeof value === 'number';
}

function isValueMap(value: Value): value is Record<string, Value> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

const NOTHING: PlanNode = {};

function nodeAt(index: number): PlanNode {
  return PLAN[index] ?? NOTHING;
}
