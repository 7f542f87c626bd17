import type { Atom as AtomBlock, Film as FilmBlock } from '../documents/generated/types.ts';
import type { Place } from '../shelf/place.ts';
import type { Block } from './blocks.ts';
import { formulaOf, remarksOf, sourcesOf } from './gas.ts';

/** An atom, or a molecule, that leaves a sputter target or a melt. */
export interface Atom {
  readonly name: string;
  readonly title: string;
  readonly formula: ReadonlyMap<string, number>;
  /** Gases for which it has collision values of its own. */
  readonly partners: readonly string[];
  /** Whose values hold for a gas: its own, else those of nitrogen stand in; undefined where neither is known. */
  pairFor(gas: string): Partner | undefined;
  /** The correlation that gave the values of a pair, where they were not fitted. */
  estimated(partner: string): string | undefined;
  readonly remarks: readonly string[];
  readonly sources: Readonly<Record<string, string>>;
  readonly place: Place;
}

export interface Partner {
  readonly partner: string;
  readonly standsIn?: true;
}

/** What grows on a wafer or is etched from it. */
export interface Film {
  readonly name: string;
  readonly title: string;
  readonly formula: ReadonlyMap<string, number>;
  readonly remarks: readonly string[];
  readonly sources: Readonly<Record<string, string>>;
  readonly place: Place;
}

/** Its molecules are of middling size and mass among those of the gases without values of their own. */
const STAND_IN = 'N2';

export function atomFrom(name: string, { content, place }: Block<AtomBlock>): Atom {
  const pairs = content.pairs ?? {};
  return {
    name,
    title: content.title ?? name,
    formula: formulaOf(content.formula, name),
    partners: Object.keys(pairs),
    pairFor: (gas) => {
      if (Object.hasOwn(pairs, gas)) return { partner: gas };
      return Object.hasOwn(pairs, STAND_IN) ? { partner: STAND_IN, standsIn: true } : undefined;
    },
    estimated: (partner) => (Object.hasOwn(pairs, partner) ? pairs[partner]?.estimated : undefined),
    remarks: remarksOf(content),
    sources: sourcesOf(content),
    place,
  };
}

export function filmFrom(name: string, { content, place }: Block<FilmBlock>): Film {
  return {
    name,
    title: content.title ?? name,
    formula: formulaOf(content.formula, name),
    remarks: remarksOf(content),
    sources: sourcesOf(content),
    place,
  };
}
