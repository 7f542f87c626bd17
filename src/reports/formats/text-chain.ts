import type { Chain, Link } from '../page.ts';
import type { Canvas } from './text.ts';
import { padEnd, padStart, widthOf, wrap } from './wrap.ts';

/** A derivation, one number after another: number, symbol, value; below it its name, what it is read from and by which law. */
export function drawChain({ links }: Chain, canvas: Canvas): readonly string[] {
  const numbers = Math.max(0, ...links.map(({ number }) => String(number).length));
  const symbols = Math.min(LONGEST_SYMBOL, Math.max(0, ...links.map(({ symbol }) => widthOf(symbol))));
  return links.flatMap((link) => drawLink(link, { numbers, symbols }, canvas));
}

const LONGEST_SYMBOL = 14;

function drawLink(link: Link, { numbers, symbols }: { numbers: number; symbols: number }, { width, styles }: Canvas): readonly string[] {
  const { number, symbol, name, value, si, from, grounds, remarks } = link;
  const begin = `${padStart(String(number), numbers)}  ${padEnd(symbol, symbols)} = `;
  const indent = ' '.repeat(numbers + 2);
  const sources = from.length === 0 ? '' : `from ${from.join(', ')}`;
  const first = `${begin}${value}${si === undefined ? '' : `  = ${si}`}`;
  const named = `${first}   ${name}`;
  const room = width - indent.length;
  const head = widthOf(named) <= width ? [styles.strong(first) + named.slice(first.length)] : [styles.strong(first), ...wrap(name, room).map((line) => indent + line)];
  const below = [grounds, sources].filter((text) => text !== '').join('; ');
  return [
    ...head,
    ...wrap(below, room).map((line) => indent + styles.faint(line)),
    ...remarks.flatMap((remark) => wrap(remark, room).map((line) => indent + line)),
  ];
}
