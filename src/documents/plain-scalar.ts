/**
 * What YAML's core schema makes of a text without quotes: a number, yes-or-no, nothing, else the text itself. Undefined
 * for ways of writing a number that are not ordinary.
 */
export function plainValueOf(text: string): string | number | boolean | null | undefined {
  const first = text.charCodeAt(0);
  if (first > NINE) return WORDS.has(text) ? WORDS.get(text) : text;
  if (text.includes(' ')) return text;
  if (DECIMAL.test(text)) return Number(text);
  return UNUSUAL.test(text) ? undefined : text;
}

/** Behind the digits come the letters, and `~`. */
const NINE = 0x39;

const DECIMAL = /^[-+]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][-+]?\d+)?$/;
const UNUSUAL = /^(?:0[ox]|[-+]?\.[in])/i;

const WORDS: ReadonlyMap<string, boolean | null> = new Map([
  ...['~', 'null', 'Null', 'NULL'].map((word) => [word, null] as const),
  ...['true', 'True', 'TRUE'].map((word) => [word, true] as const),
  ...['false', 'False', 'FALSE'].map((word) => [word, false] as const),
]);
