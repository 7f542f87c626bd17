import { printNumber, UNKNOWN } from './print-number.ts';

/** A duration as people say it: "85 s", "3 min 47 s", "2 h 5 min"; seconds up to two minutes, no seconds above an hour. */
export function printTime(seconds: number): string {
  if (!Number.isFinite(seconds)) return UNKNOWN;
  const whole = Math.round(seconds);
  if (whole < 2 * MINUTE) return `${printNumber(seconds)} s`;
  if (whole < HOUR) return pair(whole, MINUTE, 'min', 's');
  return pair(Math.round(seconds / MINUTE), MINUTE, 'h', 'min');
}

const MINUTE = 60;
const HOUR = 3600;

function pair(total: number, size: number, large: string, small: string): string {
  const rest = total % size;
  const first = `${Math.floor(total / size)} ${large}`;
  return rest === 0 ? first : `${first} ${rest} ${small}`;
}
