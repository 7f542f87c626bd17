import { PLAN, ROOTS } from './generated/plan.ts';
import { nodePlace } from './nodes.ts';
import { readSingle } from './single-value.ts';
import { isSpan, readSpan } from './span.ts';
import { needed, quoted } from '../units/unit-fault.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { MeasurePlan, Pass, PlanNode } from './measure-plan.ts';
import type { ListNode, MapNode, Node, ScalarNode } from './nodes.ts';
import type { Value } from './plain.ts';
import type { Sort } from './sort.ts';

/** Puts a setpoint in the place of every physical value of a content, in place; values that cannot be read are faults. */
export function readMeasures(source: Source, root: Node, content: Value, sort: Sort, faults: Fault[]): void {
  readChildren({ source, faults }, root, content, nodeAt(ROOTS[sort]), '');
}

function readChildren(pass: Pass, node: Node, value: Value, plan: PlanNode, name: string): void {
  if (node.kind === 'map') readMap(pass, node, value, plan);
  else if (node.kind === 'list' && plan.items !== undefined) readList(pass, node, value, nodeAt(plan.items), name);
}

function readMap(pass: Pass, map: MapNode, value: Value, { keys, rest }: PlanNode): void {
  if (!isValueMap(value)) return;
  for (const { key: keyNode, value: node } of map.pairs) {
    const key = keyNode.text;
    const index = keys !== undefined && Object.hasOwn(keys, key) ? keys[key] : rest;
    const old = value[key];
    if (index === undefined || old === undefined) continue;
    value[key] = readNode(pass, node, old, nodeAt(index), key);
  }
}

function readList(pass: Pass, list: ListNode, value: Value, plan: PlanNode, name: string): void {
  if (!Array.isArray(value)) return;
  list.items.forEach((item, index) => {
    const old = value[index];
    if (old !== undefined) value[index] = readNode(pass, item, old, plan, name);
  });
}

function readNode(pass: Pass, node: Node, old: Value, plan: PlanNode, name: string): Value {
  const { measure } = plan;
  if (measure === undefined || goesOn(node, plan)) {
    readChildren(pass, node, old, plan, name);
    return old;
  }
  return readValue(pass, node, measure, name) ?? old;
}

/** Whether a list or map at a physical value's place is one of further values, such as speeds by gas, and no span. */
function goesOn(node: Node, { keys, rest, items }: PlanNode): boolean {
  if (node.kind === 'list') return items !== undefined;
  return node.kind === 'map' && (keys !== undefined || rest !== undefined) && !isSpan(node);
}

function readValue(pass: Pass, node: Node, measure: MeasurePlan, name: string): Value | undefined {
  if (node.kind === 'map') return readSpan(pass, node, measure, name);
  if (node.kind === 'scalar' && isText(node)) return readSingle(pass, node, measure, name);
  const found = node.kind === 'list' ? 'a list' : node.value !== null ? quoted(node.source) : 'no value';
  pass.faults.push({
    place: nodePlace(pass.source, node),
    found: `${name}: ${found}`,
    right: needed(measure.dimensions),
  });
  return undefined;
}

function isText({ value }: ScalarNode): boolean {
  return typeof value === 'string' || typeof value === 'number';
}

function isValueMap(value: Value): value is Record<string, Value> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

const NOTHING: PlanNode = {};

function nodeAt(index: number): PlanNode {
  return PLAN[index] ?? NOTHING;
}
