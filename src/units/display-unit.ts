import { ELEMENTARY_CHARGE } from '../physics/constants.ts';
import { DIMENSIONS } from './dimensions.ts';
import { SCCM, TORR } from './table.ts';
import type { Dimension } from './dimensions.ts';

/**
 * The name of the unit in which a value of this size is printed where neither recipe nor site says; empty for a bare number.
 * Zero is printed in the first unit of the dimension.
 */
export function displayUnit(value: number, dimension: Dimension): string {
  if (dimension === 'fraction') return '';
  const [usual = ''] = DIMENSIONS[dimension].units;
  const size = Math.abs(value);
  if (size === 0) return usual;
  if (dimension === 'pressure' && size < HIGH_VACUUM) return 'Torr';
  return LADDERS.get(dimension)?.findLast(([, from]) => size >= from)?.[0] ?? usual;
}

/** Smaller pressures are written with an exponent, and then in Torr. */
const HIGH_VACUUM = 1e-5 * TORR;

/** Which unit is printed from which size on, in SI. */
const FROM = {
  pressure: { mTorr: 0, Torr: TORR },
  length: { nm: 0, um: 1e-6, mm: 1e-3, m: 10, km: 1e4 },
  area: { mm2: 0, cm2: 1e-5, m2: 1 },
  volume: { mm3: 0, cm3: 1e-7, L: 1e-3, m3: 10 },
  time: { ns: 0, us: 1e-6, ms: 1e-3, s: 0.1 },
  flow: { sccm: 0, slm: 1e4 * SCCM },
  amount: { nmol: 0, umol: 1e-6, mmol: 1e-3, mol: 1 },
  mass: { mg: 0, g: 1e-3, kg: 10 },
  'pressure-rate': { 'mTorr/min': 0, 'Torr/min': (10 * TORR) / 60 },
  rate: { 'nm/min': 0, 'um/min': 1e-6 / 60 },
  power: { mW: 0, W: 0.1, kW: 1e4 },
  voltage: { mV: 0, V: 0.1, kV: 1e4 },
  energy: { meV: 0, eV: 0.1 * ELEMENTARY_CHARGE, keV: 1e4 * ELEMENTARY_CHARGE },
  frequency: { Hz: 0, kHz: 1e3, MHz: 1e6, GHz: 1e9 },
  exposure: { langmuir: 0, 'Torr s': 1e-4 * TORR },
  'pressure-length': { 'mTorr cm': 0, 'Torr cm': 1e-2 * TORR },
} as const satisfies Partial<Record<Dimension, Readonly<Record<string, number>>>>;

const LADDERS: ReadonlyMap<string, readonly [unit: string, from: number][]> = new Map(
  Object.entries(FROM).map(([dimension, ladder]) => [dimension, Object.entries(ladder)]),
);
