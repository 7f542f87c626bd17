import type { Library } from '../substances/library.ts';
import type { Fault } from '../shelf/fault.ts';
import type { Place } from '../shelf/place.ts';
import { nearest } from '../units/suggest.ts';
import { nearestAddress } from './addresses.ts';

/** The fault of a name that nothing has: which was probably meant, else all there are, else what to do. */
export function unknownName(place: Place, sort: string, name: string, known: readonly string[], orElse: string): Fault {
  const found = `${sort} '${name}' is not known`;
  const meant = nearest(name, known);
  if (meant !== undefined) return { place, found, right: `'${meant}'?` };
  const few = known.length > 0 && known.length <= MOST_LISTED;
  return { place, found, right: few ? `one of ${known.join(', ')}` : orElse };
}

const MOST_LISTED = 12;

export interface Checking {
  readonly library: Library;
  readonly faults: Fault[];
}

/** A fault where neither the site nor what is built in knows a gas. */
export function checkGas(gas: string, place: () => Place, { library, faults }: Checking): void {
  if (library.gas(gas) !== undefined) return;
  faults.push(unknownName(place(), 'gas', gas, library.gasNames(), 'describe it in a substances document of the site'));
}

/** A fault where no atom or molecule of this name is known to leave a target or melt. */
export function checkAtom(atom: string, place: () => Place, { library, faults }: Checking): void {
  if (library.atom(atom) !== undefined) return;
  faults.push(
    unknownName(place(), 'atom', atom, library.atomNames(), 'describe it in a substances document of the site'),
  );
}

/** A fault where no film of this name is known. */
export function checkFilm(film: string, place: () => Place, { library, faults }: Checking): void {
  if (library.film(film) !== undefined) return;
  faults.push(
    unknownName(place(), 'film', film, library.filmNames(), 'describe it in a substances document of the site'),
  );
}

/** The fault of an address at which no step has a setpoint. */
export function unknownAddress(address: string, place: Place): Fault {
  const meant = nearestAddress(address);
  const right = meant === undefined ? 'an address such as pressure, flows.Ar or lengths.gap' : `'${meant}'?`;
  return { place, found: `no step has a setpoint '${address}'`, right };
}
