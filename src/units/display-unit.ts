import { DIMENSIONS } from './dimensions.ts';
import type { Dimension } from './dimensions.ts';

/**
 * The name of the unit in which a value of this size is printed where neither recipe nor site says; empty for a bare number.
 * Zero is printed in the first unit of the dimension.
 */
export function displayUnit(value: number, dimension: Dimension): string {
  if (dimension === 'fraction') return '';
  const [usual = ''] = DIMENSIONS[dimension].units;
  if (value === 0) return usual;
  return LADDERS[dimension]?.findLast(([from]) => Math.abs(value) >= from)?.[1] ?? usual;
}

const TORR = 101325 / 760;
const SCCM = 4.477962e17;
const EV = 1.602176634e-19;

/** From which size on, in SI, which unit is printed. */
const LADDERS: Readonly<Partial<Record<Dimension, readonly (readonly [from: number, unit: string])[]>>> = {
  pressure: [
    [0, 'Torr'],
    [1e-5 * TORR, 'mTorr'],
    [TORR, 'Torr'],
  ],
  length: [
    [0, 'nm'],
    [1e-6, 'um'],
    [1e-3, 'mm'],
    [10, 'm'],
    [1e4, 'km'],
  ],
  area: [
    [0, 'mm2'],
    [1e-5, 'cm2'],
    [1, 'm2'],
  ],
  volume: [
    [0, 'mm3'],
    [1e-7, 'cm3'],
    [1e-3, 'L'],
    [10, 'm3'],
  ],
  time: [
    [0, 'ns'],
    [1e-6, 'us'],
    [1e-3, 'ms'],
    [0.1, 's'],
  ],
  flow: [
    [0, 'sccm'],
    [1e4 * SCCM, 'slm'],
  ],
  amount: [
    [0, 'nmol'],
    [1e-6, 'umol'],
    [1e-3, 'mmol'],
    [1, 'mol'],
  ],
  mass: [
    [0, 'mg'],
    [1e-3, 'g'],
    [10, 'kg'],
  ],
  'pressure-rate': [
    [0, 'mTorr/min'],
    [(10 * TORR) / 60, 'Torr/min'],
  ],
  rate: [
    [0, 'nm/min'],
    [1e-6 / 60, 'um/min'],
  ],
  power: [
    [0, 'mW'],
    [0.1, 'W'],
    [1e4, 'kW'],
  ],
  voltage: [
    [0, 'mV'],
    [0.1, 'V'],
    [1e4, 'kV'],
  ],
  energy: [
    [0, 'meV'],
    [0.1 * EV, 'eV'],
    [1e4 * EV, 'keV'],
  ],
  frequency: [
    [0, 'Hz'],
    [1e3, 'kHz'],
    [1e6, 'MHz'],
    [1e9, 'GHz'],
  ],
  exposure: [
    [0, 'langmuir'],
    [1e-4 * TORR, 'Torr s'],
  ],
  'pressure-length': [
    [0, 'mTorr cm'],
    [1e-2 * TORR, 'Torr cm'],
  ],
};
