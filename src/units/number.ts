/**
 * End of the decimal number that starts at `start`: sign, digits, point, exponent. `start` itself where there is none.
 * A single pass; what ends there is what `Number` reads.
 */
export function numberEnd(text: string, start: number): number {
  const first = text.charCodeAt(start);
  const unsigned = first === PLUS || first === MINUS ? start + 1 : start;
  const whole = digitsEnd(text, unsigned);
  let end = whole;
  if (text.charCodeAt(whole) === POINT) {
    end = digitsEnd(text, whole + 1);
    if (end === whole + 1 && whole === unsigned) return start;
  } else if (whole === unsigned) return start;
  return exponentEnd(text, end);
}

export function isDigit(code: number): boolean {
  return code >= ZERO && code <= NINE;
}

const PLUS = 0x2b;
const MINUS = 0x2d;
const POINT = 0x2e;
const ZERO = 0x30;
const NINE = 0x39;
const CAPITAL_E = 0x45;
const SMALL_E = 0x65;

function digitsEnd(text: string, start: number): number {
  let end = start;
  while (isDigit(text.charCodeAt(end))) end += 1;
  return end;
}

/** An `e` without digits behind it belongs to the unit: `4eV`. */
function exponentEnd(text: string, end: number): number {
  const letter = text.charCodeAt(end);
  if (letter !== SMALL_E && letter !== CAPITAL_E) return end;
  const sign = text.charCodeAt(end + 1);
  const digits = sign === PLUS || sign === MINUS ? end + 2 : end + 1;
  const last = digitsEnd(text, digits);
  return last === digits ? end : last;
}
