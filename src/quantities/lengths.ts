import { quantity, inapplicable, missing, type Ingredient } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Scope } from './scope.ts';

/* Lengths against which free paths are taken. */

export const lengthOf = quantity<[lengths: readonly number[]]>({
  id: 'length',
  symbol: 'L',
  dimension: 'length',
  statement:
    'A length of the chamber, step or feature, as in length.gap; of the chamber the smallest of its diameter and height.',
  source: 'definition',
  lengths: lengthsOf,
  from: ({ length = '' }, scope) => lengthIngredient(length, scope),
  value: (lengths) => Math.min(...lengths),
});

/** Every length that a step has. */
export function lengthsOf(scope: Scope): readonly string[] {
  const named = scope.addresses('lengths.').map((address) => address.slice('lengths.'.length));
  const derived = ['chamber', 'throw', 'pitch', 'hole', 'feature'].filter((length) => {
    const ingredient = named.includes(length) ? undefined : lengthIngredient(length, scope);
    return ingredient !== undefined && !(typeof ingredient === 'object' && 'kind' in ingredient);
  });
  return [...derived, ...named];
}

function lengthIngredient(length: string, scope: Scope): [readonly string[]] | Ingredient | Missing | Inapplicable {
  const stated = `lengths.${length}`;
  if (scope.states(stated)) return stated;
  switch (length) {
    case 'chamber':
      return chamberLengths(scope);
    case 'throw':
      return throwOf(scope);
    case 'pitch':
      return scope.has('chamber.boat.pitch') ? 'chamber.boat.pitch' : inapplicable('the chamber has no boat');
    case 'hole':
      return holeOf(scope);
    case 'feature':
      return featureWidth(scope);
    default:
      return missing(stated);
  }
}

function chamberLengths(scope: Scope): [readonly string[]] | Missing {
  const sizes = ['body.diameter', 'body.height', 'body.length'].filter((address) => scope.has(address));
  return sizes.length > 0 ? [sizes] : missing('body.diameter', 'body.height');
}

function throwOf(scope: Scope): Ingredient | Inapplicable {
  const emitted = scope.emitted('target') ?? scope.emitted('melt');
  return emitted === undefined ? inapplicable('no target or melt runs') : scope.emitterAddress(emitted, 'throw');
}

function holeOf(scope: Scope): [readonly string[]] | Inapplicable {
  const { inlets } = scope.setup;
  if (inlets.length === 0) return inapplicable('the chamber has no inlet with holes');
  return [inlets.map((inlet) => `chamber.inlets.${inlet}.diameter`)];
}

function featureWidth(scope: Scope): Ingredient | Inapplicable {
  if (scope.isNone('wafer') || scope.isNone('wafer.feature')) return inapplicable('the wafer has no feature');
  return 'wafer.feature.width';
}
