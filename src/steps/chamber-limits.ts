import { isUnitFault, readMeasure } from '../units/read.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Place } from '../shelf/place.ts';
import { dimensionOf } from './addresses.ts';
import { STATED } from './accuracies.ts';
import { referredScale, type ChamberDraft } from './chamber-draft.ts';
import { unknownAddress } from './names.ts';

/** Puts the limits of a chamber's setpoints at `chamber.limits.ADDRESS.at_least` and `.at_most`. */
export function putLimits(draft: ChamberDraft): void {
  for (const [address, limits] of Object.entries(draft.content.limits ?? {})) {
    const dimension = dimensionOf(address);
    if (dimension === undefined) {
      draft.faults.push(unknownAddress(address, draft.document.place(['limits', address], 'key')));
      continue;
    }
    for (const side of ['at_least', 'at_most'] as const) {
      const text = limits[side];
      if (text !== undefined)
        putLimit(`${address}.${side}`, text, dimension, draft.document.place(['limits', address, side]), draft);
    }
    checkOrder(address, draft);
  }
}

function putLimit(key: string, text: string | number, dimension: Dimension, place: Place, draft: ChamberDraft): void {
  const measure = readMeasure(text, dimension);
  if (isUnitFault(measure)) {
    draft.faults.push({ place, found: `limit ${measure.found}`, right: measure.right });
    return;
  }
  const scale = dimension === 'flow' ? referredScale(draft.content) : STATED;
  draft.layer.put(`chamber.limits.${key}`, { kind: 'fixed', measure, place }, scale);
}

function checkOrder(address: string, { layer, document, faults }: ChamberDraft): void {
  const low = layer.givens.get(`chamber.limits.${address}.at_least`);
  const high = layer.givens.get(`chamber.limits.${address}.at_most`);
  if (low === undefined || high === undefined || low.value <= high.value) return;
  const place = document.place(['limits', address]);
  faults.push({ place, found: 'limits that are not in order', right: 'at_least is the lowest, at_most the highest' });
}
