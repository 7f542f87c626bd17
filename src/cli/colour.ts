/** Depth of colour: none, 16, 256 or all. */
export type ColourLevel = 0 | 1 | 2 | 3;

export const COLOUR_CHOICES = ['auto', 'always', 'never'] as const;
export type ColourChoice = (typeof COLOUR_CHOICES)[number];

export function isColourChoice(word: string): word is ColourChoice {
  return COLOUR_CHOICES.some((choice) => choice === word);
}

/** What is known of where standard output leads. */
export interface Surroundings {
  readonly isTerminal: boolean;
  /** Bits of colour that the terminal has: 1, 4, 8 or 24. */
  readonly depth: number;
  readonly env: Readonly<Record<string, string | undefined>>;
}

/** Whether and how deeply to colour: the flag decides, else NO_COLOR, else FORCE_COLOR, else the terminal. */
export function colourLevel(choice: ColourChoice, { isTerminal, depth, env }: Surroundings): ColourLevel {
  if (choice === 'never') return 0;
  if (choice === 'always') return depth >= 8 ? levelOfDepth(depth) : 1;
  if (isSet(env.NO_COLOR)) return 0;
  const forced = env.FORCE_COLOR;
  if (forced !== undefined) return levelForced(forced);
  return isTerminal ? levelOfDepth(depth) : 0;
}

function isSet(value: string | undefined): boolean {
  return value !== undefined && value !== '';
}

function levelForced(value: string): ColourLevel {
  switch (value) {
    case '0':
    case 'false':
      return 0;
    case '2':
      return 2;
    case '3':
      return 3;
    default:
      return 1;
  }
}

function levelOfDepth(depth: number): ColourLevel {
  if (depth >= 24) return 3;
  if (depth >= 8) return 2;
  return depth >= 4 ? 1 : 0;
}
