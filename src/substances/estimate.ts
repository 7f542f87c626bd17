import type { Gas } from '../documents/generated/types.ts';

/** The rule by which a gas that has only critical values gets a collision pair. */
export const CRITICAL_POINT_RULE = 'critical-point rule of Bird, Stewart & Lightfoot';

const ATMOSPHERE = 101325;
const ANGSTROM = 1e-10;

/**
 * Collision pair from the critical point: σ = 2.44 (Tc/pc)^(1/3) angstrom with pc in atm, ε/k = 0.77 Tc
 * (Bird, Stewart & Lightfoot, Transport Phenomena, 2nd ed. 2002, section 1.4).
 */
export function estimatedPair(critical: NonNullable<Gas['critical']>): {
  readonly diameter: number;
  readonly wellDepth: number;
} {
  const temperature = critical.temperature.measure.value;
  const pressure = critical.pressure.measure.value / ATMOSPHERE;
  return { diameter: 2.44 * Math.cbrt(temperature / pressure) * ANGSTROM, wellDepth: 0.77 * temperature };
}
