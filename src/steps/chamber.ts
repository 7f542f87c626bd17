import type { ChamberDocument } from '../documents/document.ts';
import type { Library } from '../substances/library.ts';
import { success, type Outcome } from '../shelf/fault.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Tolerance } from '../units/measure.ts';
import { plainScale, pressureScale, STATED } from './accuracies.ts';
import { referredScale, type ChamberDraft } from './chamber-draft.ts';
import { chamberLines } from './chamber-lines.ts';
import { putLimits } from './chamber-limits.ts';
import { chamberPump, type PumpFacts } from './chamber-pump.ts';
import { chamberEmitters, type Emitters } from './chamber-emitters.ts';
import { putGauges, gaugeAccuracies } from './chamber-gauges.ts';
import type { FlowLine } from './flow-line.ts';
import { Layer } from './layer.ts';
import { putTemperatures } from './temperatures.ts';
import type { Setup } from './step.ts';
import type { Scale } from './written.ts';

/** A chamber made ready for the steps that run on it: worked out once for a document. */
export interface ChamberFacts extends PumpFacts, Emitters {
  readonly document: ChamberDocument;
  /** What holds on the chamber before a recipe says anything. */
  readonly layer: Layer;
  readonly lines: ReadonlyMap<string, FlowLine>;
  readonly generators: readonly string[];
  readonly inlets: readonly string[];
  readonly gauges: readonly string[];
  readonly flow: Setup['flow'];
  readonly walls: string | undefined;
  readonly plain: Scale;
  readonly pressure: Scale;
}

export function chamberFacts(
  document: ChamberDocument,
  library: Library,
  bySite: ReadonlyMap<Dimension, Tolerance>,
): Outcome<ChamberFacts> {
  const { content } = document;
  const accuracies = { bySite, gauges: gaugeAccuracies(content.gauges) };
  const plain = plainScale(accuracies);
  const draft: ChamberDraft = { document, content, library, accuracies, plain, layer: new Layer(), faults: [] };
  putPlainFacts(draft);
  putGauges(draft);
  putLimits(draft);
  const facts: ChamberFacts = {
    ...chamberPump(draft),
    ...chamberEmitters(draft),
    document,
    layer: draft.layer,
    lines: chamberLines(draft),
    generators: Object.keys(content.generators ?? {}),
    inlets: Object.keys(content.inlets ?? {}),
    gauges: Object.keys(content.gauges ?? {}),
    flow: content.body?.flow ?? 'mixed',
    walls: content.walls?.material,
    plain,
    pressure: pressureScale(accuracies),
  };
  return success(facts, draft.faults);
}

/** Facts that go to their key path as they are: those that a step may set at its own address, others below `chamber`. */
function putPlainFacts({ content, layer, plain }: ChamberDraft): void {
  if (content.body !== undefined) layer.putAll('body', content.body, plain);
  if (content.lengths !== undefined) layer.putAll('lengths', content.lengths, plain);
  if (content.temperatures !== undefined) putTemperatures(layer, content.temperatures, plain);
  for (const key of BELOW_CHAMBER) {
    const part = content[key];
    if (part !== undefined) layer.putAll(`chamber.${key}`, part, STATED);
  }
  const { exhaust } = content;
  if (exhaust !== undefined) layer.put('chamber.exhaust.dilution', exhaust.dilution, referredScale(content));
}

const BELOW_CHAMBER = ['inlets', 'generators', 'electrode', 'walls', 'chuck', 'boat', 'flow_reference'] as const;
