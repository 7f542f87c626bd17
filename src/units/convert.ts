import type { Unit } from './table.ts';

/** The number of units, in SI. Divides by whole divisors, so that 70 % is 0.7 and 3 mm is 0.003 to the last digit. */
export function toSi(number: number, unit: Unit): number {
  const scaled = unit.divisor === undefined ? number * unit.factor : number / unit.divisor;
  return unit.offset === undefined ? scaled : scaled + unit.offset;
}

/** The SI value, as a number of units. */
export function fromSi(value: number, unit: Unit): number {
  const scaled = unit.offset === undefined ? value : value - unit.offset;
  return unit.divisor === undefined ? scaled / unit.factor : scaled * unit.divisor;
}
