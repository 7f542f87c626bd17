import { colourLevel } from './colour.ts';
import type { ColourChoice, ColourLevel } from './colour.ts';
import type { Format } from './formats.ts';
import type { Terminal } from './out.ts';

/** How a result is drawn. Plain data: workers are told. */
export interface Style {
  readonly format: Format;
  /** Columns to fill with text. */
  readonly width: number;
  readonly colour: ColourLevel;
}

/** How standard output is drawn. */
export function outputStyle(format: Format, choice: ColourChoice, terminal: Terminal, env: NodeJS.ProcessEnv): Style {
  const { columns = PLAIN_WIDTH } = terminal;
  return { format, width: columns, colour: format === 'text' ? colourLevel(choice, { ...terminal, env }) : 0 };
}

/** How a file is drawn: the same wherever it was made. */
export function fileStyle(format: Format): Style {
  return { format, width: PLAIN_WIDTH, colour: 0 };
}

const PLAIN_WIDTH = 100;
