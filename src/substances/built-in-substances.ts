import { builtInAtom, builtInFilm, builtInGas, builtInIon, builtInNames, builtInWall } from '../documents/built-in.ts';
import type { Placed } from '../documents/document.ts';
import type { BlocksBySort, Sort, Substances } from './blocks.ts';

/** The substances that the program knows without a site. */
export const BUILT_IN_SUBSTANCES: Substances = {
  find: (sort, name) => {
    const block = FINDERS[sort](name);
    return block === undefined ? undefined : { content: block.content, place: block.place([]) };
  },
  names: builtInNames,
};

const FINDERS: { readonly [S in Sort]: (name: string) => Placed<BlocksBySort[S]> | undefined } = {
  gases: builtInGas,
  atoms: builtInAtom,
  films: builtInFilm,
  ions: builtInIon,
  walls: builtInWall,
};
