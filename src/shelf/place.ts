/**
 * A place in a text: which file, and the line and column of its first character, both counted from 1,
 * columns in UTF-16 units. `end` is the offset behind its last character where the text is at hand.
 */
export interface Place {
  readonly file: string;
  readonly line: number;
  readonly column: number;
}

/** A text and the name under which it is reported. Lines are counted only when a place is asked for. */
export class Source {
  readonly file: string;
  readonly text: string;
  #lineStarts: readonly number[] | undefined;

  constructor(file: string, text: string) {
    this.file = file;
    this.text = text;
  }

  /** The place between two offsets, in UTF-16 units from the start of the text. */
  place(start: number, end: number = start): TextPlace {
    return new TextPlace(this, start, end);
  }

  /** Offsets at which lines start, in order. */
  lineStarts(): readonly number[] {
    this.#lineStarts ??= startsOfLines(this.text);
    return this.#lineStarts;
  }
}

/** A place that keeps offsets and works out line and column when asked. */
export class TextPlace implements Place {
  readonly source: Source;
  readonly start: number;
  readonly end: number;

  constructor(source: Source, start: number, end: number) {
    this.source = source;
    this.start = start;
    this.end = end;
  }

  get file(): string {
    return this.source.file;
  }

  get line(): number {
    return lineIndex(this.source.lineStarts(), this.start) + 1;
  }

  get column(): number {
    const starts = this.source.lineStarts();
    return this.start - (starts[lineIndex(starts, this.start)] ?? 0) + 1;
  }
}

function startsOfLines(text: string): number[] {
  const starts = [0];
  for (let at = text.indexOf('\n'); at !== -1; at = text.indexOf('\n', at + 1)) starts.push(at + 1);
  return starts;
}

/** Index of the last line that starts at or before the offset. */
function lineIndex(starts: readonly number[], offset: number): number {
  let low = 0;
  let high = starts.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if ((starts[middle] ?? 0) <= offset) low = middle;
    else high = middle - 1;
  }
  return low;
}
