import type { Gas as GasBlock } from '../documents/generated/types.ts';
import type { Block } from './blocks.ts';
import type { Datum } from './datum.ts';
import { valueOf } from './gas.ts';

export type Property = 'viscosity' | 'diffusion';

/**
 * The factor that carries how well a property of a gas is known: 1, with the standard uncertainty that its block states.
 * All numbers built on the property move with it together.
 */
export function accuracyDatum(address: string, property: Property, { content }: Block<GasBlock>): Datum {
  const { spread, because } = accuracyOf(property, content);
  return {
    address,
    value: 1,
    uncertainty: spread,
    dimension: 'number',
    unit: '',
    origin: { default: 'accuracy', because },
  };
}

function accuracyOf(property: Property, { accuracy, collision }: GasBlock): { spread: number; because: string } {
  if (accuracy !== undefined) return { spread: valueOf(accuracy[property]), because: accuracy.source };
  const estimated = collision === undefined || collision.estimated !== undefined;
  return estimated ? { spread: ESTIMATED, because: BECAUSE_ESTIMATED } : { spread: FITTED, because: BECAUSE_FITTED };
}

const FITTED = 0.03;
const BECAUSE_FITTED = 'fitted collision values give viscosity and diffusion within some 3 %';
const ESTIMATED = 0.1;
const BECAUSE_ESTIMATED = 'estimated collision values give viscosity and diffusion within some 10 %';
