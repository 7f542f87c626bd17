import { gapBetween } from '../reports/formats/text.ts';
import { faultBlocks } from '../reports/pages/faults.ts';
import { drawBlocks, isProse } from './draw.ts';
import type { Block } from '../reports/page.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Sink } from './out.ts';
import type { Drawn } from './part.ts';
import type { Style } from './style.ts';
import type { ToldFault } from './told-fault.ts';

/** One document that grows as the parts of a run come in. */
export interface Report {
  /** Whether faults are told in it. */
  readonly tellsFaults: boolean;
  part(drawn: Drawn): void;
  /** Faults as documents name them, and the same as seen from the working folder. */
  faults(told: readonly ToldFault[], fromHere: readonly Fault[]): void;
  close(closing: Closing): void;
}

/** What stands at the end of a run, in sentences and as a record. */
export interface Closing {
  readonly blocks: readonly Block[];
  readonly summary: object;
}

/** For readers: parts with a blank line between, those of one line each as a list, then what all add up to. */
export function proseReport(sink: Sink, style: Style): Report {
  let before = '';
  const write = (text: string, gap = gapBetween(before, text)): void => {
    if (text === '') return;
    sink.write(style.format === 'text' ? gap + text : text);
    before = text;
  };
  return {
    tellsFaults: isProse(style.format),
    part: ({ text }) => {
      write(text);
    },
    faults: (_, fromHere) => {
      write(drawBlocks(faultBlocks(fromHere), style));
    },
    close: ({ blocks }) => {
      write(drawBlocks(blocks, style), before === '' ? '' : '\n');
    },
  };
}

/** For spreadsheets: one header, then the rows of all parts. */
export function sheetReport(sink: Sink): Report {
  let begun = false;
  return {
    tellsFaults: false,
    part({ header, text }) {
      sink.write(begun ? text : header + text);
      begun = true;
    },
    faults: () => undefined,
    close: () => undefined,
  };
}
