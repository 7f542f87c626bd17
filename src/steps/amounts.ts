import { AVOGADRO } from '../physics/constants.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Given } from './given.ts';
import type { Layer } from './layer.ts';
import { STATED } from './accuracies.ts';
import type { Scale } from './written.ts';

/** Turns amounts fed in a step into mean flows over its time. Without a time they have none. */
export function settleAmounts(layer: Layer, faults: Fault[]): void {
  const time = layer.givens.get('time');
  for (const [line, setpoint] of layer.amounts) {
    if (time !== undefined && time.value > 0) {
      layer.put(`flows.${line}`, setpoint, amountScale(time));
      continue;
    }
    layer.mark(`flows.${line}`, 'unknown');
    if (layer.unknown.has('time')) continue;
    faults.push({
      place: setpoint.place,
      found: `an amount through line ${line} in a step without time`,
      right: 'a time, over which it is fed',
    });
  }
}

function amountScale(time: Given): Scale {
  const perMole = AVOGADRO / time.value;
  return {
    value: ({ value }) => value * perMole,
    uncertainty: (measure) =>
      perMole * Math.hypot(STATED.uncertainty(measure), (measure.value * time.uncertainty) / time.value),
    shown: { dimension: 'flow', unit: 'umol/s' },
  };
}
