import type { SubstancesDocument } from '../documents/document.ts';
import type { Fault } from '../shelf/fault.ts';
import { SORTS, type Block, type BlocksBySort, type Sort, type Substances } from './blocks.ts';

/** The substances that a site's documents describe. One that a second document describes again is a fault. */
export function siteSubstances(
  documents: readonly SubstancesDocument[],
): Substances & { readonly faults: readonly Fault[] } {
  return {
    find: (sort, name) => {
      for (const document of documents) {
        const block = blockIn(document, sort, name);
        if (block !== undefined) return block;
      }
      return undefined;
    },
    names: (sort) => documents.flatMap(({ content }) => Object.keys(content[sort] ?? {})),
    faults: secondFaults(documents),
  };
}

function blockIn<S extends Sort>(
  document: SubstancesDocument,
  sort: S,
  name: string,
): Block<BlocksBySort[S]> | undefined {
  const blocks = document.content[sort];
  if (blocks === undefined || !Object.hasOwn(blocks, name)) return undefined;
  const block = blocks[name];
  return block === undefined ? undefined : { content: block, place: document.place([sort, name], 'key') };
}

function secondFaults(documents: readonly SubstancesDocument[]): readonly Fault[] {
  const first = new Map<string, string>();
  const faults: Fault[] = [];
  for (const document of documents) {
    for (const [sort, name] of namesIn(document)) {
      const file = first.get(`${sort}.${name}`);
      if (file === undefined) first.set(`${sort}.${name}`, document.source.file);
      else {
        const place = document.place([sort, name], 'key');
        faults.push({ place, found: `${name} is also described in ${file}`, right: 'one description of it' });
      }
    }
  }
  return faults;
}

function namesIn({ content }: SubstancesDocument): readonly (readonly [Sort, string])[] {
  return SORTS.flatMap((sort) => Object.keys(content[sort] ?? {}).map((name) => [sort, name] as const));
}
