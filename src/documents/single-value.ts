import { readAccuracy, readMeasure } from '../units/read.ts';
import { nearest } from '../units/suggest.ts';
import { isUnitFault, needed, quoted } from '../units/unit-fault.ts';
import { nodePlace } from './nodes.ts';
import type { TextPlace } from '../shelf/place.ts';
import type { MeasurePlan, Pass } from './measure-plan.ts';
import type { ScalarNode } from './nodes.ts';
import type { Accuracy, Fixed, None, Rest, Unknown } from './setpoint.ts';

/** One physical value, an accuracy, or one of the words that may stand instead; a word such as `open` stays text. */
export function readSingle(
  pass: Pass,
  node: ScalarNode,
  plan: MeasurePlan,
  name: string,
): Fixed | Accuracy | Unknown | None | Rest | string | undefined {
  const { words } = plan;
  const { value } = node;
  const place = nodePlace(pass.source, node);
  if (words !== undefined && typeof value === 'string' && words.includes(value)) return word(value, place);
  return plan.accuracy === true ? accuracy(pass, node, plan, name) : readFixed(pass, node, plan, name);
}

/** One value with its unit. Numbers are read from what is written, since YAML makes others of some. */
export function readFixed(pass: Pass, node: ScalarNode, plan: MeasurePlan, name: string): Fixed | undefined {
  const place = nodePlace(pass.source, node);
  const measure = readMeasure(node.source, plan.dimensions, plan.tolerance === true ? WITH_TOLERANCE : ALONE);
  const fault = isUnitFault(measure)
    ? (wordFault(node.source, plan) ?? measure)
    : countFault(node.source, plan, measure.value);
  if (fault !== undefined) pass.faults.push({ place, found: `${name}: ${fault.found}`, right: fault.right });
  return isUnitFault(measure) || fault !== undefined ? undefined : { kind: 'fixed', measure, place };
}

const WITH_TOLERANCE = { tolerance: true };
const ALONE = { tolerance: false };

function accuracy(pass: Pass, node: ScalarNode, plan: MeasurePlan, name: string): Accuracy | undefined {
  const place = nodePlace(pass.source, node);
  const tolerance = readAccuracy(node.source, plan.dimensions[0]);
  if (!isUnitFault(tolerance)) return { kind: 'accuracy', tolerance, place };
  const fault = wordFault(node.source, plan) ?? tolerance;
  pass.faults.push({ place, found: `${name}: ${fault.found}`, right: fault.right });
  return undefined;
}

function word(text: string, place: TextPlace): Unknown | None | Rest | string {
  return text === 'unknown' || text === 'none' || text === 'rest' ? { kind: text, place } : text;
}

/** What is wrong with a word where a value or another word is wanted. */
function wordFault(text: string, { dimensions, words = [] }: MeasurePlan): Wrong | undefined {
  if (!/^[A-Za-z]+$/.test(text)) return undefined;
  const meant = nearest(text, words);
  if (meant !== undefined) return { found: quoted(text), right: `write ${meant}` };
  return WORDS.has(text) ? { found: `${quoted(text)} cannot stand here`, right: needed(dimensions) } : undefined;
}

const WORDS: ReadonlySet<string> = new Set(['unknown', 'none', 'rest']);

interface Wrong {
  readonly found: string;
  readonly right: string;
}

function countFault(text: string, { whole, least }: MeasurePlan, value: number): Wrong | undefined {
  if (whole === true && !Number.isInteger(value))
    return { found: `${quoted(text)} is no whole number`, right: 'a whole number is needed' };
  if (least === undefined || value >= least) return undefined;
  return { found: quoted(text), right: `a number of at least ${least} is needed` };
}
