import type { Reference } from '../../quantities/reference.ts';
import { referenceName } from '../../quantities/reference.ts';
import { allQuantities } from '../../quantities/catalogue.ts';
import type { StepRun } from '../../quantities/run.ts';
import { DIMENSIONS } from '../../units/dimensions.ts';
import { dimensionOfNumber } from '../number.ts';
import { bandOf, type Shown } from '../shown.ts';

export interface ReferenceRecord {
  readonly id: string;
  readonly length?: string;
  readonly of?: string;
  readonly at?: string;
}

export type QuantityRecord = ReferenceRecord &
  (
    | {
        readonly subject?: string;
        readonly unit: string;
        readonly value: number;
        readonly uncertainty: number;
        readonly band?: string;
        readonly remarks?: readonly string[];
      }
    | { readonly missing: readonly string[] }
    | { readonly inapplicable: string }
  );

/** One number of a step in SI, its uncertainty expanded. */
export function quantityRecord(run: StepRun, reference: Reference, shown: Shown): QuantityRecord {
  const name = referenceRecord(reference);
  const reading = run.read(reference);
  if (reading.kind === 'missing') return { ...name, missing: reading.needs };
  if (reading.kind === 'inapplicable') return { ...name, inapplicable: reading.because };
  const band = bandOf(shown, reference.id, reading.value);
  const remarks = run.remarks(reference);
  return {
    ...name,
    ...(reading.of === undefined ? {} : { subject: reading.of }),
    unit: DIMENSIONS[dimensionOfNumber(reference)].si,
    value: reading.value,
    uncertainty: shown.coverage * run.uncertainty(reference),
    ...(band === undefined ? {} : { band }),
    ...(remarks.length === 0 ? {} : { remarks }),
  };
}

export function referenceRecord({ id, length, of, at }: Reference): ReferenceRecord {
  return {
    id,
    ...(length === undefined ? {} : { length }),
    ...(of === undefined ? {} : { of }),
    ...(at === undefined ? {} : { at }),
  };
}

/** Each number once, in the order of the catalogue. */
export function inCatalogueOrder(references: readonly Reference[]): readonly Reference[] {
  const byName = new Map(references.map((reference) => [referenceName(reference), reference]));
  return [...byName.values()].sort((a, b) => rank(a) - rank(b));
}

const RANKS: ReadonlyMap<string, number> = new Map(allQuantities().map(({ id }, index) => [id, index]));

function rank({ id }: Reference): number {
  return RANKS.get(id) ?? RANKS.size;
}
