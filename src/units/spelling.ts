/**
 * Plain spelling of a unit: both micro signs, the angstrom, degree and middle-dot signs, superscripts and all blanks of
 * Unicode become the ASCII in which the table of units is written; `^`, `**` and blanks around `/` go.
 */
export function plainUnit(text: string): string {
  let plain = '';
  for (const character of text.normalize('NFC')) plain += PLAIN.get(character) ?? character;
  plain = words(plain).join(' ').replaceAll('**', '').replaceAll('^', '').replaceAll('*', ' ');
  plain = plain.replaceAll(' /', '/').replaceAll('/ ', '/');
  return plain.startsWith('/') ? `1${plain}` : plain;
}

/** Whether the UTF-16 unit is a blank: those of ASCII, and the no-break, thin and other typographic spaces. */
export function isBlank(code: number): boolean {
  if (code <= 0x20) return code === 0x20 || (code >= 0x09 && code <= 0x0d);
  if (code < 0xa0) return false;
  return code === 0xa0 || (code >= 0x2000 && code <= 0x200b) || OTHER_BLANKS.includes(code);
}

/** Offset of the first character at or behind `at` that is no blank. */
export function skipBlanks(text: string, at: number): number {
  let offset = at;
  while (offset < text.length && isBlank(text.charCodeAt(offset))) offset += 1;
  return offset;
}

/** Ogham, narrow no-break, medium mathematical and ideographic spaces, word joiner. */
const OTHER_BLANKS: readonly number[] = [0x1680, 0x202f, 0x205f, 0x2060, 0x3000];

const PLAIN: ReadonlyMap<string, string> = new Map([
  ['\u00b5', 'u'], // micro sign
  ['\u03bc', 'u'], // Greek mu
  ['\u00c5', 'angstrom'], // A with ring, to which NFC turns the angstrom sign
  ['\u00b0', 'deg'],
  ['\u2103', 'degC'],
  ['\u00b7', ' '], // middle dot
  ['\u22c5', ' '], // dot operator
  ['\u2219', ' '], // bullet operator
  ['\u2044', '/'], // fraction slash
  ['\u2215', '/'], // division slash
  ['\u207b', '-'], // superscript minus
  ...Array.from('⁰¹²³⁴⁵⁶⁷⁸⁹', (sign, digit): [string, string] => [sign, String(digit)]),
]);

function words(text: string): string[] {
  const found: string[] = [];
  let start = skipBlanks(text, 0);
  while (start < text.length) {
    let end = start;
    while (end < text.length && !isBlank(text.charCodeAt(end))) end += 1;
    found.push(text.slice(start, end));
    start = skipBlanks(text, end);
  }
  return found;
}
