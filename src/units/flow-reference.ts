import { STANDARD_PRESSURE, STANDARD_TEMPERATURE } from '../physics/constants.ts';
import { unitSpelled } from './lookup.ts';

/** What "standard" means on a chamber: the temperature in K and pressure in Pa at which a volume of gas is counted. */
export interface FlowReference {
  readonly temperature: number;
  readonly pressure: number;
}

/** 0 degC and 101325 Pa (SEMI E12), at which the factors of the table of units hold. */
export const STANDARD_REFERENCE: FlowReference = {
  temperature: STANDARD_TEMPERATURE,
  pressure: STANDARD_PRESSURE,
};

/**
 * What a flow read in `unit` is multiplied by on a chamber with another reference. A standard volume holds
 * p/(k T) molecules; pressure times volume holds 1/(k T), whatever the reference pressure; moles and molecules stay.
 */
export function referenceFactor(unit: string, reference: FlowReference): number {
  const standard = (unitSpelled(unit, 'flow') ?? unitSpelled(unit, 'flux'))?.standard;
  if (standard === undefined) return 1;
  const cooler = STANDARD_REFERENCE.temperature / reference.temperature;
  return standard === 'pV' ? cooler : (cooler * reference.pressure) / STANDARD_REFERENCE.pressure;
}
