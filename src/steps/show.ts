import type { SiteDocument } from '../documents/document.ts';
import { isDimension, type Dimension } from '../units/dimensions.ts';
import { spellingsOf, unitSpelled } from '../units/lookup.ts';
import type { Fault } from '../shelf/fault.ts';
import { unknownName } from './names.ts';

/** How a site wants its numbers shown. */
export interface Show {
  /** The unit to print a dimension in, by the unit's own spelling. */
  readonly units: ReadonlyMap<Dimension, string>;
  readonly bands: 'gas-dynamics' | 'vacuum';
  readonly coverageFactor: number;
}

export const PLAIN_SHOW: Show = { units: new Map(), bands: 'gas-dynamics', coverageFactor: 2 };

export function showOf(document: SiteDocument, faults: Fault[]): Show {
  const { bands, coverage_factor, ...written } = document.content.show ?? {};
  const units = new Map<Dimension, string>();
  for (const [key, unit] of Object.entries(written)) {
    const dimension = key.replaceAll('_', '-');
    if (!isDimension(dimension)) continue;
    const known = unitSpelled(unit, dimension);
    if (known !== undefined) units.set(dimension, known.name);
    else
      faults.push(
        unknownName(document.place(['show', key]), 'unit', unit, [...spellingsOf(dimension)], `a unit of ${dimension}`),
      );
  }
  return { units, bands: bands ?? PLAIN_SHOW.bands, coverageFactor: coverage_factor ?? PLAIN_SHOW.coverageFactor };
}
