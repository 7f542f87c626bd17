import type { Chamber } from '../documents/generated/types.ts';
import { STATED, type GaugeAccuracy } from './accuracies.ts';
import type { ChamberDraft } from './chamber-draft.ts';
import { fixedOf } from './facts.ts';

/** Gauges that say how well they measure, smallest full scale first. */
export function gaugeAccuracies(gauges: Chamber['gauges'] = {}): readonly GaugeAccuracy[] {
  const known: GaugeAccuracy[] = [];
  for (const { full_scale, accuracy } of Object.values(gauges)) {
    const fullScale = fixedOf(full_scale)?.measure.value;
    if (fullScale !== undefined && accuracy !== undefined) known.push({ fullScale, accuracy: accuracy.tolerance });
  }
  return known.sort((a, b) => a.fullScale - b.fullScale);
}

/** Puts what gauges hold at `chamber.gauges.NAME`; a usable share of full scale becomes a pressure. */
export function putGauges({ content, layer }: ChamberDraft): void {
  for (const [name, { full_scale, usable_from }] of Object.entries(content.gauges ?? {})) {
    const address = `chamber.gauges.${name}`;
    layer.put(`${address}.full_scale`, full_scale, STATED);
    if (usable_from === undefined) continue;
    const fullScale = layer.givens.get(`${address}.full_scale`);
    const share = fixedOf(usable_from);
    if (share?.measure.dimension !== 'fraction') layer.put(`${address}.usable_from`, usable_from, STATED);
    else if (fullScale !== undefined) {
      const { dimension, unit } = fullScale;
      const scale = {
        value: ({ value }: { readonly value: number }) => value * fullScale.value,
        uncertainty: () => 0,
        shown: { dimension, unit },
      };
      layer.put(`${address}.usable_from`, share, scale);
    }
  }
}
