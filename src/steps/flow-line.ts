import { referenceFactor, type FlowReference } from '../units/flow-reference.ts';
import type { Measure, Tolerance } from '../units/measure.ts';
import { standardUncertainty } from '../units/standard-uncertainty.ts';
import type { Line } from './step.ts';
import type { Scale } from './written.ts';

/** A gas line of a chamber, and what a flow set on it delivers. */
export interface FlowLine {
  readonly line: Line;
  /** Of its flow in a step. */
  readonly address: string;
  /** Absent where a bubbler does not tell how much vapour its carrier takes along. */
  readonly scale?: Scale;
  /** Whether it draws vapour without a controller, so that an amount may be fed. */
  readonly draws: boolean;
}

/** What turns the flow that a step names into what the line delivers. */
export interface Delivery {
  readonly reference: FlowReference;
  /** True flow over set flow, and true flow at a set flow of zero, 1/s; with standard uncertainties. */
  readonly gain: Uncertain;
  readonly offset: Uncertain;
  /** Share of vapour behind a bubbler, 0 on other lines. */
  readonly vapour: number;
  readonly accuracy: Tolerance | undefined;
  /** 1/s. */
  readonly fullScale: number;
}

export interface Uncertain {
  readonly value: number;
  readonly uncertainty: number;
}

/** Flows are molecules per second that the line delivers in total: carrier, vapour and dilution. */
export function flowScale(delivery: Delivery): Scale {
  const { reference, gain, offset, vapour, accuracy, fullScale } = delivery;
  const delivered = 1 / (1 - vapour);
  return {
    value: ({ value, unit }) => {
      // A controller set to zero shuts its valve: the offset is that of an open one.
      if (value === 0) return 0;
      return Math.max(0, gain.value * value * referenceFactor(unit, reference) + offset.value) * delivered;
    },
    uncertainty: ({ value, unit, tolerance }: Measure) => {
      if (value === 0) return 0;
      const factor = referenceFactor(unit, reference);
      const set =
        tolerance === undefined
          ? standardUncertainty(value * factor, accuracy, fullScale)
          : standardUncertainty(value, tolerance) * factor;
      return Math.hypot(gain.value * set, gain.uncertainty * value * factor, offset.uncertainty) * delivered;
    },
  };
}
