import type { Fixed, Ramp, Range, Setpoint } from '../documents/setpoint.ts';
import type { Measure } from '../units/measure.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Given, Span } from './given.ts';

/** A setpoint that has a value, as against `unknown` and `none`. */
export type Written = Fixed | Ramp | Range;

/** How a written value becomes a given: its value in SI and its standard uncertainty. */
export interface Scale {
  value(measure: Measure): number;
  uncertainty(measure: Measure): number;
  /** Where the given is not in the unit in which it was written. */
  readonly shown?: { readonly dimension: Dimension; readonly unit: string };
}

/** What stands at an address by a document. A ramp starts with its first value, a range with its usual one. */
export function givenFrom(address: string, setpoint: Written, scale: Scale): Given {
  const measure = usualMeasure(setpoint);
  const { dimension, unit } = scale.shown ?? measure;
  const value = scale.value(measure);
  const uncertainty = scale.uncertainty(measure);
  const origin = { place: setpoint.place };
  if (setpoint.kind === 'fixed') return { address, value, uncertainty, dimension, unit, origin };
  return { address, value, uncertainty, dimension, unit, origin, span: spanOf(setpoint, scale) };
}

export function isWritten(setpoint: Setpoint): setpoint is Written {
  return setpoint.kind === 'fixed' || setpoint.kind === 'ramp' || setpoint.kind === 'range';
}

/** Whether a node of a document is a value that the reader has read. */
export function isSetpoint(node: unknown): node is Setpoint {
  return (
    typeof node === 'object' && node !== null && 'kind' in node && typeof node.kind === 'string' && 'place' in node
  );
}

/** The value that stands for a setpoint: the start of a ramp, the usual value of a range, else the middle of its limits. */
export function usualMeasure(setpoint: Written): Measure {
  if (setpoint.kind === 'fixed') return setpoint.measure;
  if (setpoint.kind === 'ramp') return setpoint.from.measure;
  const { usually, at_least: low, at_most: high } = setpoint;
  if (usually !== undefined) return usually.measure;
  if (low !== undefined && high !== undefined) return middle(low.measure, high.measure);
  return (low ?? high)?.measure ?? NOTHING;
}

/** Of a range without any limit, which no schema lets pass. */
const NOTHING: Measure = { value: NaN, dimension: 'number', unit: '' };

function middle(low: Measure, high: Measure): Measure {
  return { value: (low.value + high.value) / 2, dimension: low.dimension, unit: low.unit };
}

function spanOf(setpoint: Ramp | Range, scale: Scale): Span {
  if (setpoint.kind === 'ramp') {
    const { from, to, over } = setpoint;
    return { kind: 'ramp', from: scale.value(from.measure), to: scale.value(to.measure), over };
  }
  const { at_least: low, at_most: high } = setpoint;
  return {
    kind: 'range',
    ...(low === undefined ? {} : { atLeast: scale.value(low.measure) }),
    ...(high === undefined ? {} : { atMost: scale.value(high.measure) }),
  };
}
