import type { Fixed, Rest, Unknown } from '../documents/setpoint.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Layer } from './layer.ts';
import { STATED } from './accuracies.ts';

/** Shares of a whole by name, as a document writes them; one of them may be the rest. */
export type WrittenShares = Readonly<Record<string, Fixed | Unknown | Rest>>;

/** Puts shares at their addresses, `rest` worked out. What does not add up to the whole is a fault. */
export function putShares(layer: Layer, prefix: string, shares: WrittenShares): readonly Fault[] {
  const sum = statedSum(shares);
  const rests: [string, Rest][] = [];
  for (const [name, share] of Object.entries(shares)) {
    if (share.kind === 'rest') rests.push([name, share]);
    else layer.put(`${prefix}.${name}`, share, STATED);
  }
  const [rest, second] = rests;
  if (second !== undefined)
    return [{ place: second[1].place, found: 'two shares are the rest', right: 'one of them in percent' }];
  if (rest === undefined) return sum === undefined ? [] : wholeFaults(shares, sum);
  return putRest(layer, `${prefix}.${rest[0]}`, rest[1], sum);
}

/** Shares may miss the whole by this much before they count as wrong: three thirds of 33.3 % are meant. */
const ROUNDING = 0.005;

interface Sum {
  readonly value: number;
  readonly uncertainty: number;
}

/** Sum of the stated shares; undefined where one of them is unknown. */
function statedSum(shares: WrittenShares): Sum | undefined {
  let value = 0;
  let squares = 0;
  for (const share of Object.values(shares)) {
    if (share.kind === 'unknown') return undefined;
    if (share.kind === 'rest') continue;
    value += share.measure.value;
    squares += STATED.uncertainty(share.measure) ** 2;
  }
  return { value, uncertainty: Math.sqrt(squares) };
}

function putRest(layer: Layer, address: string, { place }: Rest, sum: Sum | undefined): readonly Fault[] {
  if (sum === undefined) {
    layer.mark(address, 'unknown');
    return [];
  }
  const { uncertainty } = sum;
  const value = 1 - sum.value;
  if (value <= 0)
    return [
      {
        place,
        found: `the other shares add up to ${percent(sum.value)}`,
        right: 'less than 100 % where one is the rest',
      },
    ];
  layer.give({ address, value, uncertainty, dimension: 'fraction', unit: '%', origin: { place } });
  return [];
}

function wholeFaults(shares: WrittenShares, { value }: Sum): readonly Fault[] {
  const last = Object.values(shares).at(-1);
  if (last === undefined || Math.abs(value - 1) <= ROUNDING) return [];
  const right = value < 1 ? 'shares that add up to 100 %, or one share as rest' : 'shares that add up to 100 %';
  return [{ place: last.place, found: `the shares add up to ${percent(value)}`, right }];
}

function percent(share: number): string {
  return `${Number((share * 100).toPrecision(5))} %`;
}
