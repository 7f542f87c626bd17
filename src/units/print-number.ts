/** Stands for a number that is not finite, which no caller should have. */
export const UNKNOWN = 'unknown';

/**
 * A number to the second digit of its expanded uncertainty (GUM 7.2.6), at most four digits; four significant digits where it
 * has none. Plain from 1e-3 to 1e5, else as `1.2e-6`. Never shows an infinity or NaN.
 */
export function printNumber(value: number, expandedUncertainty = 0): string {
  if (!Number.isFinite(value)) return UNKNOWN;
  const layout = layoutFor(value, expandedUncertainty);
  return layout === undefined ? fourDigits(value) : digits(value, layout);
}

/** A number and its expanded uncertainty to the same digit: "2.63 ± 0.52". One below the fourth digit is not shown. */
export function printUncertain(value: number, expandedUncertainty: number): string {
  const number = printNumber(value, expandedUncertainty);
  const layout = number === UNKNOWN ? undefined : layoutFor(value, expandedUncertainty);
  if (layout === undefined || expandedUncertainty < 0.5 * 10 ** layout.place) return number;
  return `${number} ± ${digits(expandedUncertainty, layout)}`;
}

/** The power of ten of the last digit shown, and that of the first digit where the number is shown with an exponent. */
interface Layout {
  readonly place: number;
  readonly exponent?: number;
}

const DIGITS = 4;
const PLAIN_FROM = 1e-3;
const PLAIN_BELOW = 1e5;
/** Below it powers of ten lose their digits. */
const SMALLEST = 1e-300;

/** Undefined without an uncertainty that could be shown. */
function layoutFor(value: number, uncertainty: number): Layout | undefined {
  if (!Number.isFinite(uncertainty) || uncertainty < SMALLEST) return undefined;
  const second = exponentOf(uncertainty, 2) - 1;
  const place = Math.abs(value) < SMALLEST ? second : Math.max(second, exponentOf(value, DIGITS) - DIGITS + 1);
  const size = Math.max(Math.abs(value), uncertainty);
  return isPlain(size) ? { place } : { place, exponent: Math.max(exponentOf(size, DIGITS), place) };
}

/** Power of ten of the first digit once the number is rounded to so many digits. */
function exponentOf(value: number, count: number): number {
  const text = value.toExponential(count - 1);
  return Number(text.slice(text.indexOf('e') + 1));
}

function isPlain(size: number): boolean {
  return size === 0 || (size >= PLAIN_FROM && size < PLAIN_BELOW);
}

function fourDigits(value: number): string {
  if (Math.abs(value) < SMALLEST) return '0';
  const rounded = Number(value.toPrecision(DIGITS));
  return isPlain(Math.abs(rounded)) ? String(rounded) : rounded.toExponential().replace('e+', 'e');
}

function digits(value: number, { place, exponent }: Layout): string {
  if (exponent !== undefined) return `${fixed(value / 10 ** exponent, exponent - place)}e${exponent}`;
  return place <= 0 ? fixed(value, -place) : fixed(Math.round(value / 10 ** place) * 10 ** place, 0);
}

function fixed(value: number, decimals: number): string {
  const text = value.toFixed(decimals);
  return Number(text) === 0 ? text.replace('-', '') : text;
}
