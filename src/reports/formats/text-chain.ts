import type { Chain, Link } from '../page.ts';
import type { Canvas } from './text.ts';
import { padEnd, padStart, widthOf, wrap } from './wrap.ts';

/** A derivation, one number after another: number, symbol, value; below it its name, what it is read from and by which law. */
export function drawChain({ links }: Chain, canvas: Canvas): readonly string[] {
  const numbers = Math.max(0, ...links.map(({ number }) => String(number).length));
  const symbols = Math.min(
    LONGEST_SYMBOL,
    Math.max(0, ...links.map(({ symbol, name }) => (name === '' ? 0 : widthOf(symbol)))),
  );
  return links.flatMap((link) => drawLink(link, { numbers, symbols }, canvas));
}

const LONGEST_SYMBOL = 14;

function drawLink(
  link: Link,
  { numbers, symbols }: { numbers: number; symbols: number },
  { width, styles }: Canvas,
): readonly string[] {
  const { number, symbol, name, value, si, from, grounds, remarks } = link;
  const begin = `${padStart(String(number), numbers)}  ${padEnd(symbol, symbols)} = `;
  const indent = ' '.repeat(numbers + 2);
  const sources = from.length === 0 ? '' : `from ${from.join(', ')}`;
  const first = `${begin}${value}${si === undefined ? '' : `  = ${si}`}`;
  const room = width - indent.length;
  // A given needs no more than a line: what it is, and where it stands.
  const beside = name === '' ? grounds : name;
  const named = beside === '' ? first : `${first}   ${beside}`;
  const head =
    widthOf(named) <= width
      ? [styles.strong(first) + styles.faint(named.slice(first.length))]
      : [styles.strong(first), ...wrap(beside, room).map((line) => indent + styles.faint(line))];
  const below = [name === '' ? '' : grounds, sources].filter((text) => text !== '').join('; ');
  return [
    ...head,
    ...(below === '' ? [] : wrap(below, room)).map((line) => indent + styles.faint(line)),
    ...remarks.flatMap((remark) => wrap(remark, room).map((line) => indent + line)),
  ];
}
