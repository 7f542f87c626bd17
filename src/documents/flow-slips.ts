import { nodePlace } from './nodes.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Source } from '../shelf/place.ts';
import type { KeyNode } from './nodes.ts';

/**
 * What happened where a map in braces has an entry without a value: a decimal comma has ended the value before it
 * (`{ Ar: 1,5 sccm }`), or the blank behind a colon is missing (`{ Ar:15 sccm }`).
 */
export function slipIn(source: Source, before: KeyNode | undefined, key: KeyNode): Fault | undefined {
  return decimalComma(source, before, key) ?? missingBlank(source, key);
}

function decimalComma(source: Source, before: KeyNode | undefined, key: KeyNode): Fault | undefined {
  const after = key.text;
  if (before === undefined || !/^[0-9]/.test(after)) return undefined;
  const { text: whole } = before;
  if (!/[0-9]$/.test(whole) || source.text.charCodeAt(before.end) !== COMMA) return undefined;
  const place = source.place(before.start, key.end);
  const digits = /^[0-9]+/.exec(after)?.[0] ?? '';
  const grouped = digits.length === 3 ? `, or ${whole}${after} if the comma groups digits` : '';
  return { place, found: `the comma in ${whole},${after} ends the value`, right: `write ${whole}.${after}${grouped}` };
}

const COMMA = 0x2c;

function missingBlank(source: Source, node: KeyNode): Fault | undefined {
  const parts = /^([A-Za-z][\w.-]*):(\S.*)$/.exec(node.text);
  if (parts === null) return undefined;
  const [, key = '', value = ''] = parts;
  return {
    place: nodePlace(source, node),
    found: `no blank behind the colon of ${key}`,
    right: `write ${key}: ${value.slice(0, 40)}`,
  };
}
