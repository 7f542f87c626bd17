import { ATOMS, FILES, FILMS, GASES, IONS, PROCESSES, WALLS } from '../built-in/generated/data.ts';
import { decoded, encodedPlaceAt } from './encoded.ts';
import type { Entry } from '../built-in/generated/data.ts';
import type { Placed, Pointer } from './document.ts';
import type { Encoded } from './encoded.ts';
import type { Atom, Film, Gas, Ion, Process, Wall } from './generated/types.ts';

/** What the program knows without a site, each value with its place in the built-in files; undefined for other names. */
export function builtInGas(name: string): Placed<Gas> | undefined {
  return gases(name);
}

export function builtInAtom(name: string): Placed<Atom> | undefined {
  return atoms(name);
}

export function builtInFilm(name: string): Placed<Film> | undefined {
  return films(name);
}

export function builtInIon(name: string): Placed<Ion> | undefined {
  return ions(name);
}

export function builtInWall(name: string): Placed<Wall> | undefined {
  return walls(name);
}

export function builtInProcess(name: string): Placed<Process> | undefined {
  return processes(name);
}

/** Names of everything of a kind, in the order of the built-in files. */
export function builtInNames(kind: keyof typeof KINDS): readonly string[] {
  return [...KINDS[kind].keys()];
}

const KINDS = { gases: GASES, atoms: ATOMS, films: FILMS, ions: IONS, walls: WALLS, processes: PROCESSES } as const;

const gases = reader<Gas>(GASES);
const atoms = reader<Atom>(ATOMS);
const films = reader<Film>(FILMS);
const ions = reader<Ion>(IONS);
const walls = reader<Wall>(WALLS);
const processes = reader<Process>(PROCESSES);

/** Reads an entry when it is asked for, and only once. The generator has validated what is read here. */
function reader<Content>(entries: ReadonlyMap<string, Entry>): (name: string) => Placed<Content> | undefined {
  const known = new Map<string, Placed<Content>>();
  return (name) => {
    const entry = known.has(name) ? undefined : entries.get(name);
    if (entry !== undefined) known.set(name, placed(entry));
    return known.get(name);
  };
}

function placed<Content>([fileIndex, json]: Entry): Placed<Content> {
  const file = FILES[fileIndex] ?? '';
  // The generator has read it as a document, and this is what it has made of its content.
  const root = JSON.parse(json) as Encoded;
  const content = decoded(file, root) as Content;
  return { content, place: (pointer: Pointer) => encodedPlaceAt(file, root, pointer) };
}
