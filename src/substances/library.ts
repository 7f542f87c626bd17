import { atomFrom, filmFrom, type Atom, type Film } from './atom.ts';
import { accuracyDatum } from './accuracy.ts';
import { SORTS, type Block, type BlocksBySort, type Sort, type Substances } from './blocks.ts';
import { datumOf, type Datum } from './datum.ts';
import { CRITICAL_POINT_RULE, estimatedPair } from './estimate.ts';
import { gasFrom, type Gas } from './gas.ts';

/** Every substance that a site can name: its own first, then the built-in ones. */
export interface Library {
  gas(name: string): Gas | undefined;
  atom(name: string): Atom | undefined;
  film(name: string): Film | undefined;
  gasNames(): readonly string[];
  atomNames(): readonly string[];
  filmNames(): readonly string[];
  /** A value by its address: `gases.Ar.collision.diameter`, `atoms.Ti.pairs.Ar.well_depth`, `accuracy.viscosity.SiH4`. */
  datum(address: string): Datum | undefined;
}

/** A library over several places, the first of which to know a name wins with its whole block. */
export function libraryOver(places: readonly Substances[]): Library {
  const find = <S extends Sort>(sort: S, name: string): Block<BlocksBySort[S]> | undefined => {
    for (const place of places) {
      const block = place.find(sort, name);
      if (block !== undefined) return block;
    }
    return undefined;
  };
  const view = <S extends Sort, V>(sort: S, from: (name: string, block: Block<BlocksBySort[S]>) => V) =>
    kept((name) => {
      const block = find(sort, name);
      return block === undefined ? undefined : from(name, block);
    });
  const names = (sort: Sort) => [...new Set(places.flatMap((place) => place.names(sort)))];
  return {
    gas: view('gases', gasFrom),
    atom: view('atoms', atomFrom),
    film: view('films', filmFrom),
    gasNames: () => names('gases'),
    atomNames: () => names('atoms'),
    filmNames: () => names('films'),
    datum: kept((address) => datumAt(address, find)),
  };
}

type Find = <S extends Sort>(sort: S, name: string) => Block<BlocksBySort[S]> | undefined;

function datumAt(address: string, find: Find): Datum | undefined {
  const [sort = '', name = '', ...keys] = address.split('.');
  if (sort === 'accuracy') return accuracyAt(address, name, keys[0] ?? '', find);
  if (!isSort(sort)) return undefined;
  const block = find(sort, name);
  if (block === undefined) return undefined;
  return (
    datumOf(address, keys, block) ?? (sort === 'gases' ? estimatedAt(address, keys, find('gases', name)) : undefined)
  );
}

function accuracyAt(address: string, property: string, gas: string, find: Find): Datum | undefined {
  const block = find('gases', gas);
  if (block === undefined || (property !== 'viscosity' && property !== 'diffusion')) return undefined;
  return accuracyDatum(address, property, block);
}

/** A collision value of a gas of which only the critical point is known. */
function estimatedAt(
  address: string,
  keys: readonly string[],
  block: Block<BlocksBySort['gases']> | undefined,
): Datum | undefined {
  const critical = block?.content.critical;
  if (critical === undefined || block?.content.collision !== undefined || keys[0] !== 'collision') return undefined;
  const { diameter, wellDepth } = estimatedPair(critical);
  const origin = { default: 'estimate', because: CRITICAL_POINT_RULE };
  const shared = { address, uncertainty: 0, origin };
  if (keys[1] === 'diameter') return { ...shared, value: diameter, dimension: 'length', unit: 'angstrom' };
  return keys[1] === 'well_depth' ? { ...shared, value: wellDepth, dimension: 'temperature', unit: 'K' } : undefined;
}

function isSort(text: string): text is Sort {
  return SORTS.some((sort) => sort === text);
}

/** Keeps every answer, also that there is none. */
function kept<V>(answer: (name: string) => V | undefined): (name: string) => V | undefined {
  const answers = new Map<string, V | undefined>();
  return (name) => {
    if (answers.has(name)) return answers.get(name);
    const found = answer(name);
    if (answers.size > MOST_KEPT) answers.clear();
    answers.set(name, found);
    return found;
  };
}

const MOST_KEPT = 5000;
