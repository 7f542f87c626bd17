import type { Gas } from '../../substances/gas.ts';
import type { Film } from '../../substances/atom.ts';
import type { Library } from '../../substances/library.ts';
import { printMeasure } from '../../units/display.ts';
import type { Column, Page } from '../page.ts';

/** Every gas: name, formula, hazards, where its collision values come from. */
export function listGases(library: Library): Page {
  const gases = library.gasNames().flatMap((name) => library.gas(name) ?? []);
  return tableOf(
    [
      left('gas'),
      left('title', true),
      left('formula'),
      right('molar mass'),
      left('hazards', true),
      left('collision values', true),
    ],
    gases.map((gas) => [
      gas.name,
      gas.title,
      formulaText(gas),
      datum(library, `gases.${gas.name}.molar_mass`),
      gas.hazards.join(', '),
      collisionText(gas),
    ]),
  );
}

/** Every film: name, formula, density, molar mass, source. */
export function listFilms(library: Library): Page {
  const films = library.filmNames().flatMap((name) => library.film(name) ?? []);
  return tableOf(
    [left('film'), left('title', true), left('formula'), right('density'), right('molar mass'), left('source', true)],
    films.map((film) => [
      film.name,
      film.title,
      formulaText(film),
      datum(library, `films.${film.name}.density`),
      datum(library, `films.${film.name}.molar_mass`),
      film.sources.density ?? film.sources.source ?? '',
    ]),
  );
}

function tableOf(columns: readonly Column[], rows: readonly (readonly string[])[]): Page {
  return {
    blocks: [{ kind: 'table', columns, rows, key: 1 }],
    sheet: () => ({ columns: columns.map(({ title }) => title.replaceAll(' ', '_')), rows }),
  };
}

/** Elements in the order in which the formula names them. A substance named by its formula says no more. */
function formulaText({ formula }: Pick<Gas | Film, 'formula'>): string {
  return [...formula].map(([element, count]) => (count === 1 ? element : `${element}${count}`)).join('');
}

function collisionText({ estimated, sources, hasCollision }: Gas): string {
  if (!hasCollision) return 'none';
  return estimated === undefined ? (sources.collision ?? sources.source ?? '') : `estimated: ${estimated}`;
}

function datum(library: Library, address: string): string {
  const found = library.datum(address);
  return found === undefined ? '' : printMeasure(found.value, found.dimension, { unit: found.unit });
}

function left(title: string, wraps = false): Column {
  return { title, align: 'left', wraps };
}

function right(title: string): Column {
  return { title, align: 'right' };
}
