import type { Dimension } from '../units/dimensions.ts';
import type { Measure, Tolerance } from '../units/measure.ts';
import { standardUncertainty } from '../units/standard-uncertainty.ts';
import type { Scale } from './written.ts';

/** How well a chamber's setpoints hold where they give no tolerance of their own. */
export interface Accuracies {
  /** What the site says for a dimension. */
  readonly bySite: ReadonlyMap<Dimension, Tolerance>;
  /** Gauges with an accuracy, smallest full scale first. */
  readonly gauges: readonly GaugeAccuracy[];
}

export interface GaugeAccuracy {
  readonly fullScale: number;
  readonly accuracy: Tolerance;
}

/** The scale of setpoints that no gauge or gas line measures. A voltage counts by its size. */
export function plainScale({ bySite }: Accuracies): Scale {
  return {
    value: plainValue,
    uncertainty: (measure) => standardUncertainty(measure.value, measure.tolerance ?? bySite.get(measure.dimension)),
  };
}

/** The scale of chamber pressures: the gauge that measures them tells how well they are known. */
export function pressureScale({ bySite, gauges }: Accuracies): Scale {
  return {
    value: plainValue,
    uncertainty: ({ value, tolerance }) => {
      if (tolerance !== undefined) return standardUncertainty(value, tolerance);
      const gauge = gaugeFor(value, gauges);
      if (gauge !== undefined) return standardUncertainty(value, gauge.accuracy, gauge.fullScale);
      return standardUncertainty(value, bySite.get('pressure'));
    },
  };
}

/** The scale of values that have only their own tolerance. */
export const STATED: Scale = {
  value: plainValue,
  uncertainty: ({ value, tolerance }) => standardUncertainty(value, tolerance),
};

function plainValue({ value, dimension }: Measure): number {
  return dimension === 'voltage' ? Math.abs(value) : value;
}

/** The most sensitive gauge that still holds the pressure; beyond them all the coarsest. */
function gaugeFor(pressure: number, gauges: readonly GaugeAccuracy[]): GaugeAccuracy | undefined {
  for (const gauge of gauges) if (gauge.fullScale >= pressure) return gauge;
  return gauges.at(-1);
}
