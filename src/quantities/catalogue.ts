import * as collisions from './collisions.ts';
import * as emittedAtoms from './emitted-atoms.ts';
import * as equipment from './equipment.ts';
import * as flow from './flow.ts';
import * as gas from './gas.ts';
import * as lengths from './lengths.ts';
import * as pumping from './pumping.ts';
import * as regime from './regime.ts';
import * as residual from './residual.ts';
import * as surfaces from './surfaces.ts';
import * as thermalisation from './thermalisation.ts';
import * as transport from './transport.ts';
import * as tubeFlow from './tube-flow.ts';
import { dimensionOf } from '../steps/addresses.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Quantity } from './quantity.ts';
import type { Reference } from './reference.ts';

/** The topics of the catalogue, in the order in which lists print them. */
export const TOPICS = {
  gas,
  collisions,
  transport,
  lengths,
  flow,
  pumping,
  tubeFlow,
  regime,
  surfaces,
  residual,
  emittedAtoms,
  thermalisation,
  equipment,
};

const BY_ID: ReadonlyMap<string, Quantity> = new Map(
  Object.values(TOPICS)
    .flatMap((topic) => Object.values(topic).filter(isQuantity))
    .map((quantity) => [quantity.id, quantity]),
);

/** The entry of the catalogue with this id. */
export function quantityNamed(id: string): Quantity | undefined {
  return BY_ID.get(id);
}

/** Every entry of the catalogue, by topic. */
export function allQuantities(): readonly Quantity[] {
  return [...BY_ID.values()];
}

/** Dimension of a number: its entry's, or that of the setpoint which it names; a number over another has none. */
export function dimensionOfNumber({ id, of = '' }: Reference, over?: Reference): Dimension {
  if (over !== undefined) return 'number';
  if (id === 'setpoint') return dimensionOf(of) ?? 'number';
  return quantityNamed(id)?.dimension ?? 'number';
}

function isQuantity(exported: unknown): exported is Quantity {
  return typeof exported === 'object' && exported !== null && 'id' in exported && 'from' in exported;
}
