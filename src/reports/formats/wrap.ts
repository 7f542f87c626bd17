import stringWidth from 'fast-string-width';

/** Text broken at blanks into lines of at most so many columns. A word that is longer stands on a line of its own. */
export function wrap(text: string, width: number): readonly string[] {
  if (widthOf(text) <= width) return [text];
  const lines: string[] = [];
  let line = '';
  for (const word of wordsOf(text, width)) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && widthOf(longer) > width) {
      lines.push(line);
      line = word;
    } else line = longer;
  }
  return line === '' ? lines : [...lines, line];
}

/** Words, a number with its uncertainty and its unit being one where the width allows it. */
function wordsOf(text: string, width: number): readonly string[] {
  const words: string[] = [];
  let last = '';
  let before = '';
  for (const piece of text.split(' ')) {
    const joined = `${last} ${piece}`;
    const isTied = before === '±' || (isNumber(before) && !isNumber(piece));
    if (isTied && widthOf(joined) <= width) last = joined;
    else {
      words.push(last);
      last = piece;
    }
    before = piece;
  }
  return [...words.slice(1), last];
}

/** Whether a word is a number, as far as its ends tell; a unit such as `1/(cm2` has a stroke. */
function isNumber(word: string): boolean {
  const begin = word.charCodeAt(word.startsWith('-') ? 1 : 0);
  return isDigit(begin) && isDigit(word.charCodeAt(word.length - 1)) && !word.includes('/');
}

function isDigit(code: number): boolean {
  return code >= 48 && code <= 57;
}

/** Columns that a text without styles takes up. Most texts are Latin and Greek, which are counted without further ado. */
export function widthOf(text: string): number {
  return NARROW.test(text) ? text.length : stringWidth(text);
}

export function padEnd(text: string, width: number): string {
  return text + ' '.repeat(Math.max(0, width - widthOf(text)));
}

export function padStart(text: string, width: number): string {
  return ' '.repeat(Math.max(0, width - widthOf(text))) + text;
}

/** Characters of one column each. */
const NARROW = /^[\x20-\x7e\u00a1-\u00ac\u00ae-\u02ff\u0391-\u03c9\u2018\u2019\u2212]*$/;
