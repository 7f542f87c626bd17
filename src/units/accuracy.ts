import { readShare } from './share.ts';
import { absoluteWidth, negativeFault, SCALE, toleranceSign } from './tolerance.ts';
import { skipBlanks } from './spelling.ts';
import { isUnitFault, LONGEST_TEXT, quoted, tooLongFault } from './unit-fault.ts';
import { bareValue } from './value.ts';
import type { Dimension } from './dimensions.ts';
import type { Tolerance } from './measure.ts';
import type { Share } from './share.ts';
import type { UnitFault } from './unit-fault.ts';

/**
 * Reads how well a gauge, a gas line or a site's setpoints hold: `1 % of full scale`, `0.25 % of reading`, or an absolute
 * half-width in the dimension of what it belongs to, `0.1 s`, `5 K`.
 */
export function readAccuracy(text: string | number, dimension: Dimension): Tolerance | UnitFault {
  if (typeof text === 'string' && text.length > LONGEST_TEXT) return tooLongFault(text);
  const width = typeof text === 'string' ? withoutSign(text) : text;
  const share = typeof width === 'string' ? readShare(width) : undefined;
  if (typeof width === 'string' && share !== undefined) return accuracyShare(width, share, dimension);
  const measure = typeof width === 'string' ? absoluteWidth(width, dimension) : bareValue(width, dimension);
  if (isUnitFault(measure)) return measure;
  return measure.value < 0 ? negativeFault(String(text)) : { value: measure.value, of: 'value' };
}

/** The text without a tolerance sign in front, which says nothing here. */
function withoutSign(text: string): string {
  const sign = toleranceSign(text);
  return sign?.start === skipBlanks(text, 0) ? text.slice(sign.end) : text;
}

function accuracyShare(text: string, { value, of }: Share, dimension: Dimension): Tolerance | UnitFault {
  if (value < 0) return negativeFault(text);
  if (dimension === 'temperature') {
    return { found: `${quoted(text)} of a temperature`, right: SCALE };
  }
  if (of === 'reading' || of === 'full scale') return { value, of };
  const percent = `${Number((value * 100).toPrecision(12))} %`;
  const found = `${quoted(text)} does not say of what`;
  return { found, right: `write ${percent} of reading or ${percent} of full scale` };
}
