/** What the command line may say beside paths and names. */
export interface OptionFacts {
  /** Name of its value; an option without one is a switch. */
  readonly value?: string;
  /** May stand several times. */
  readonly repeats?: true;
  readonly short?: string;
  /** For the help. */
  readonly says: string;
}

export const OPTIONS = {
  out: {
    value: 'FILE',
    repeats: true,
    says: 'write to FILE as well; its ending chooses: .md .csv .txt (check, gas: .json)',
  },
  format: { value: 'FORMAT', says: 'of standard output: text, markdown, csv (check, gas: json)' },
  units: { value: 'LIST', says: 'units to print in: pressure=Pa,length=mm' },
  columns: { value: 'LIST', says: 'names of the numbers to show: knudsen.gap,residence-time' },
  'block-at': { value: 'LEVEL', says: 'failed verdicts that block: error (default), warning, note or never' },
  unproven: { says: 'what is to review or open blocks too' },
  site: { value: 'PATH', says: "use this site's folder or document instead of the nearest" },
  at: { value: 'NAME', says: 'the name that standard input would have as a file' },
  jobs: { value: 'N', says: 'recipes to work on at a time (default: as many as pay)' },
  today: { value: 'DATE', says: 'hold waivers against this day, YYYY-MM-DD' },
  temperature: { value: 'VALUE', says: "of the gas: '20 degC' (default), '500 K'" },
  pressure: { value: 'VALUE', says: "of the gas: '1 Torr' (default), '101325 Pa'" },
  color: { value: 'WHEN', says: 'auto (default), always or never' },
  trace: { says: 'where the program itself failed, should it do so' },
  help: { short: 'h', says: 'this text' },
} as const satisfies Readonly<Record<string, OptionFacts>>;

export type OptionName = keyof typeof OPTIONS;

/** Options that every command has. */
export const COMMON: readonly OptionName[] = ['color', 'trace', 'help'];

export function optionFacts(name: OptionName): OptionFacts {
  return OPTIONS[name];
}
