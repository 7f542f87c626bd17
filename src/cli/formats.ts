/** What results can be written as. */
export const FORMATS = ['text', 'markdown', 'csv', 'json'] as const;
export type Format = (typeof FORMATS)[number];

/** Endings that choose a format for `--out`. */
export const ENDINGS: ReadonlyMap<string, Format> = new Map([
  ['txt', 'text'],
  ['md', 'markdown'],
  ['csv', 'csv'],
  ['json', 'json'],
]);

/** The format that a file's ending chooses. */
export function formatOf(path: string): Format | undefined {
  const dot = path.lastIndexOf('.');
  return dot === -1 ? undefined : ENDINGS.get(path.slice(dot + 1).toLowerCase());
}

export function isFormat(word: string): word is Format {
  return FORMATS.some((format) => format === word);
}
