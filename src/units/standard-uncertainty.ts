import type { Tolerance } from './measure.ts';

/**
 * Standard uncertainty of a value that surely lies within a tolerance: half-width over the root of three (GUM 4.3.7).
 * A share of full scale needs the full scale; without one it says nothing.
 */
export function standardUncertainty(value: number, tolerance: Tolerance | undefined, fullScale = 0): number {
  return tolerance === undefined ? 0 : halfWidth(value, tolerance, fullScale) / ROOT_OF_THREE;
}

const ROOT_OF_THREE = Math.sqrt(3);

function halfWidth(value: number, tolerance: Tolerance, fullScale: number): number {
  switch (tolerance.of) {
    case 'value':
      return tolerance.value;
    case 'reading':
      return tolerance.value * Math.abs(value);
    case 'full scale':
      return tolerance.value * fullScale;
  }
}
