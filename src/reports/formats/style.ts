import { Chalk } from 'chalk';
import type { Finding } from '../page.ts';

/** How much colour a terminal takes, as `chalk` counts it; 0 for none, and then there is no bold or faint either. */
export type ColourLevel = 0 | 1 | 2 | 3;

type Style = (text: string) => string;

/** Weight carries the kind of a finding; colour repeats it in two hues that also differ in grey. */
export interface Styles {
  readonly strong: Style;
  readonly faint: Style;
  readonly plain: Style;
  readonly word: Readonly<Record<Finding['word'] | 'fault' | 'note' | 'caution', Style>>;
}

export function stylesFor(level: ColourLevel): Styles {
  const chalk = new Chalk({ level });
  const plain: Style = (text) => text;
  const grave: Style = (text) => chalk.bold.red(text);
  const doubtful: Style = (text) => chalk.yellow(text);
  const faint: Style = (text) => chalk.dim(text);
  return {
    strong: (text) => chalk.bold(text),
    faint,
    plain,
    word: {
      fail: grave,
      fault: grave,
      review: doubtful,
      caution: doubtful,
      pass: faint,
      open: faint,
      notApplicable: faint,
      waived: faint,
      note: plain,
    },
  };
}
