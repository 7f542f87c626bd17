import type { Source, TextPlace } from '../shelf/place.ts';

/** What a text spells, with offsets into it; whichever reader has read it, the same text makes the same nodes. */
export type Node = ScalarNode | MapNode | ListNode;

/** A text, a number, yes-or-no or nothing. What is empty stands where its key stands: `pressure:` and the end of the line. */
export interface ScalarNode {
  readonly kind: 'scalar';
  readonly start: number;
  readonly end: number;
  readonly value: string | number | boolean | null;
  /** As it is written, without quotes. */
  readonly source: string;
}

/** A map ends behind its brace, or with its last value. */
export interface MapNode {
  readonly kind: 'map';
  readonly start: number;
  readonly end: number;
  readonly pairs: readonly NodePair[];
}

export interface NodePair {
  readonly key: KeyNode;
  readonly value: Node;
}

export interface KeyNode {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

/** A list ends behind its bracket, or with its last item. */
export interface ListNode {
  readonly kind: 'list';
  readonly start: number;
  readonly end: number;
  readonly items: readonly Node[];
}

/** Where a node or a key stands. */
export function nodePlace(source: Source, { start, end }: Node | KeyNode): TextPlace {
  return source.place(start, end);
}

/** Nothing, behind a key. */
export function emptyAt({ start, end }: KeyNode): ScalarNode {
  return { kind: 'scalar', start, end, value: null, source: '' };
}
