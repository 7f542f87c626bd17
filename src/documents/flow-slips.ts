import { isScalar } from 'yaml';
import { keyText, nodePlace } from './nodes.ts';
import type { NodePair } from './nodes.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';

/**
 * What happened where a map in braces has an entry without a value: a decimal comma has ended the value before it
 * (`{ Ar: 1,5 sccm }`), or the blank behind a colon is missing (`{ Ar:15 sccm }`).
 */
export function slipIn(source: Source, previous: NodePair | undefined, pair: NodePair): Fault | undefined {
  return decimalComma(source, previous, pair) ?? missingBlank(source, pair);
}

function decimalComma(source: Source, previous: NodePair | undefined, pair: NodePair): Fault | undefined {
  const after = keyText(pair);
  if (previous === undefined || !/^[0-9]/.test(after)) return undefined;
  const before = previous.value ?? previous.key;
  const whole = isScalar(before) ? before.source : '';
  if (!/[0-9]$/.test(whole) || source.text.charCodeAt(before.range[1]) !== COMMA) return undefined;
  const place = source.place(before.range[0], pair.key.range[1]);
  const digits = /^[0-9]+/.exec(after)?.[0] ?? '';
  const grouped = digits.length === 3 ? `, or ${whole}${after} if the comma groups digits` : '';
  return { place, found: `the comma in ${whole},${after} ends the value`, right: `write ${whole}.${after}${grouped}` };
}

const COMMA = 0x2c;

function missingBlank(source: Source, pair: NodePair): Fault | undefined {
  const parts = /^([A-Za-z][\w.-]*):(\S.*)$/.exec(keyText(pair));
  if (parts === null) return undefined;
  const [, key = '', value = ''] = parts;
  return {
    place: nodePlace(source, pair.key),
    found: `no blank behind the colon of ${key}`,
    right: `write ${key}: ${value.slice(0, 40)}`,
  };
}
