import type { ChamberDocument } from '../documents/document.ts';
import type { Chamber } from '../documents/generated/types.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Library } from '../substances/library.ts';
import { STANDARD_REFERENCE, type FlowReference } from '../units/flow-reference.ts';
import type { Accuracies } from './accuracies.ts';
import { fixedOf } from './facts.ts';
import { flowScale } from './flow-line.ts';
import type { Layer } from './layer.ts';
import type { Scale } from './written.ts';

/** A chamber on its way to be ready for steps: what its parts read and write. */
export interface ChamberDraft {
  readonly document: ChamberDocument;
  readonly content: Chamber;
  readonly library: Library;
  readonly accuracies: Accuracies;
  readonly plain: Scale;
  readonly layer: Layer;
  readonly faults: Fault[];
}

/** The scale of flows that no line of the chamber delivers: only what "standard" means counts. */
export function referredScale(content: Chamber): Scale {
  const certain = { value: 0, uncertainty: 0 };
  return flowScale({
    reference: flowReference(content),
    gain: { value: 1, uncertainty: 0 },
    offset: certain,
    vapour: 0,
    accuracy: undefined,
    fullScale: 0,
  });
}

/** What "standard" means on a chamber. */
export function flowReference({ flow_reference }: Chamber): FlowReference {
  return {
    temperature: fixedOf(flow_reference?.temperature)?.measure.value ?? STANDARD_REFERENCE.temperature,
    pressure: fixedOf(flow_reference?.pressure)?.measure.value ?? STANDARD_REFERENCE.pressure,
  };
}
