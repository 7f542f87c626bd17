import { inapplicable, missing } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Scope } from './scope.ts';
import { countElements } from '../substances/formula.ts';

/** Atoms of each element that one formula unit of film takes from the feed. */
export interface Balance {
  readonly atomsPerFormula: ReadonlyMap<string, number>;
}

/**
 * What a formula unit of film takes from the feed. Growing: the film's own atoms. Etching: the atoms of the volatile product
 * that are not the film's, so many products as carry the film's element away (SiO2 to SiF4: 4 F).
 */
export function balanceOf(scope: Scope): Balance | Missing | Inapplicable {
  const { surface, wafer } = scope.setup;
  if (wafer === 'none') return inapplicable('no wafer is in the chamber');
  if (surface === undefined) return missing('surface.grows', 'surface.rate');
  const film = scope.library.film(surface.film)?.formula;
  if (film === undefined) return missing(`films.${surface.film}.formula`);
  if (surface.mode === 'grows') return { atomsPerFormula: film };
  if (surface.product === undefined) return missing('surface.product');
  return (
    etchBalance(film, productFormula(surface.product, scope)) ??
    inapplicable(`${surface.product} carries off nothing of the film`)
  );
}

/** The elements that the film takes up and a gas of the feed carries. */
export function limitingElements(scope: Scope): readonly string[] {
  const balance = balanceOf(scope);
  if ('kind' in balance) return [];
  return [...balance.atomsPerFormula.keys()].filter((element) => carriers(element, scope).length > 0);
}

/** Molecules of the reactant that one formula unit of film uses up. */
export function moleculesPerFormula(scope: Scope): number | Missing | Inapplicable {
  const balance = balanceOf(scope);
  if ('kind' in balance) return balance;
  const formula = scope.gas(scope.setup.reactant ?? '')?.formula;
  if (formula === undefined) return missing('reactant.gas');
  let molecules = 0;
  for (const [element, atoms] of balance.atomsPerFormula) {
    const brought = formula.get(element) ?? 0;
    if (brought > 0) molecules = Math.max(molecules, atoms / brought);
  }
  return molecules > 0 ? molecules : inapplicable('the reactant brings nothing that the film takes up');
}

function carriers(element: string, scope: Scope): readonly string[] {
  return scope.fedGases.filter((gas) => (scope.gas(gas)?.formula.get(element) ?? 0) > 0);
}

function etchBalance(film: ReadonlyMap<string, number>, product: ReadonlyMap<string, number>): Balance | undefined {
  for (const [element, inProduct] of product) {
    const inFilm = film.get(element);
    if (inFilm === undefined) continue;
    const products = inFilm / inProduct;
    const taken = [...product]
      .filter(([other]) => !film.has(other))
      .map(([other, atoms]) => [other, atoms * products] as const);
    return { atomsPerFormula: new Map(taken) };
  }
  return undefined;
}

/** A product that is one of the gases, else a formula by itself. */
function productFormula(product: string, scope: Scope): ReadonlyMap<string, number> {
  return scope.gas(product)?.formula ?? countElements(product) ?? new Map();
}
