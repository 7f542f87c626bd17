import type { Place } from '../shelf/place.ts';
import type { Dimension } from '../units/dimensions.ts';
import type { Tolerance } from '../units/measure.ts';
import type { Pointer } from './document.ts';
import type { Fixed, Range } from './setpoint.ts';

/**
 * A value of the built-in data as it is kept in JSON: its place (line times a thousand plus column) and what it is made
 * of; a text, a number or yes-or-no by itself, anything else behind a word that says what it is.
 */
export type Encoded = EncodedPlain | EncodedMap | EncodedList | EncodedFixed | EncodedRange | EncodedWord;

export type EncodedPlain = readonly [place: number, value: string | number | boolean];
export type EncodedMap = readonly [place: number, kind: 'map', values: { readonly [key: string]: Encoded }];
export type EncodedList = readonly [place: number, kind: 'list', entries: readonly Encoded[]];
export type EncodedFixed = readonly [
  place: number,
  kind: 'fixed',
  value: number,
  dimension: Dimension,
  unit: string,
  tolerance: EncodedTolerance | 0,
];
export type EncodedTolerance = readonly [value: number, of: Tolerance['of']];
export type EncodedRange = readonly [
  place: number,
  kind: 'range',
  usually: EncodedFixed | 0,
  atLeast: EncodedFixed | 0,
  atMost: EncodedFixed | 0,
];
export type EncodedWord = readonly [place: number, kind: 'word', word: 'unknown' | 'none' | 'rest'];

export function encodedPlace(line: number, column: number): number {
  return line * LINE + column;
}

const LINE = 1000;

/** What the content of a document would hold in the place of an encoded value. */
export function decoded(file: string, node: Encoded): unknown {
  if (node.length === 2) return node[1];
  switch (node[1]) {
    case 'map':
      return decodedMap(file, node[2]);
    case 'list':
      return node[2].map((entry) => decoded(file, entry));
    case 'fixed':
      return decodedFixed(file, node);
    case 'range':
      return decodedRange(file, node);
    case 'word':
      return { kind: node[2], place: placeIn(file, node[0]) };
  }
}

/** The place of the value that a pointer leads to, or of the last one on its way. */
export function encodedPlaceAt(file: string, root: Encoded, pointer: Pointer): Place {
  let node = root;
  for (const step of pointer) node = childOf(node, step) ?? node;
  return placeIn(file, node[0]);
}

function childOf(node: Encoded, step: string | number): Encoded | undefined {
  if (node.length === 2) return undefined;
  if (node[1] === 'map') return Object.hasOwn(node[2], step) ? node[2][step] : undefined;
  return node[1] === 'list' ? node[2][Number(step)] : undefined;
}

function placeIn(file: string, place: number): Place {
  return { file, line: Math.floor(place / LINE), column: place % LINE };
}

function decodedMap(file: string, values: EncodedMap[2]): unknown {
  const map: Record<string, unknown> = { __proto__: null };
  for (const [key, value] of Object.entries(values)) map[key] = decoded(file, value);
  return map;
}

function decodedFixed(file: string, [place, kind, value, dimension, unit, tolerance]: EncodedFixed): Fixed {
  const measure = { value, dimension, unit };
  if (tolerance === 0) return { kind, measure, place: placeIn(file, place) };
  const [width, of] = tolerance;
  return { kind, measure: { ...measure, tolerance: { value: width, of } }, place: placeIn(file, place) };
}

function decodedRange(file: string, [place, kind, usually, least, most]: EncodedRange): Range {
  return {
    kind,
    ...(usually === 0 ? {} : { usually: decodedFixed(file, usually) }),
    ...(least === 0 ? {} : { at_least: decodedFixed(file, least) }),
    ...(most === 0 ? {} : { at_most: decodedFixed(file, most) }),
    place: placeIn(file, place),
  };
}
