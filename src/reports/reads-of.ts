import type { Ingredient, Quantity } from '../quantities/quantity.ts';
import type { Reference } from '../quantities/reference.ts';
import { referenceName } from '../quantities/reference.ts';
import type { Scope } from '../quantities/scope.ts';
import type { Library } from '../substances/library.ts';
import { sampleScopes } from './sample-scopes.ts';

/** What a number is read from in a step that has everything, names of gases and lines left open. */
export function readsOf(quantity: Quantity, library: Library): readonly string[] {
  const names = new Set<string>();
  for (const scope of sampleScopes(library)) {
    for (const reference of referencesOf(quantity, scope)) {
      const recipe = quantity.from(reference, scope);
      if (typeof recipe === 'object' && 'kind' in recipe) continue;
      const parts: readonly (Ingredient | readonly Ingredient[])[] = isList(recipe) ? recipe : [recipe];
      for (const part of parts.flat()) {
        const name = spelled(part);
        if (name !== undefined) names.add(name);
      }
    }
  }
  return [...names];
}

/** Whether a number stands for nothing without a length. Of the others the plain form is told: a length changes none of its laws. */
export function needsLength(id: string): boolean {
  return NEED_LENGTH.has(id);
}

const NEED_LENGTH: ReadonlySet<string> = new Set([
  'length',
  'pressure-distance',
  'collisions-straight',
  'collisions-walk',
  'diffusion-time',
]);

function isList(
  recipe: Ingredient | readonly (Ingredient | readonly Ingredient[])[],
): recipe is readonly (Ingredient | readonly Ingredient[])[] {
  return Array.isArray(recipe);
}

function referencesOf({ id, lengths, subjects, whole }: Quantity, scope: Scope): readonly Reference[] {
  const [length] = needsLength(id) ? (lengths?.(scope) ?? []) : [];
  const [of] = subjects?.(scope) ?? [];
  const plain = length === undefined ? { id } : { id, length };
  if (of === undefined) return [plain];
  return whole === true ? [plain, { ...plain, of }] : [{ ...plain, of }];
}

/** A name with what differs from step to step written large. */
function spelled(part: Ingredient): string | undefined {
  if (typeof part === 'number') return undefined;
  const name = typeof part === 'string' ? part : referenceName(part);
  return name
    .replace(
      /^(flows|composition|gases|atoms|films|power)\.[A-Za-z0-9-]+/,
      (_, family: string) => `${family}.${LARGE.get(family) ?? 'NAME'}`,
    )
    .replace(/^(targets|melts)\.[a-z]+/, '$1.NAME')
    .replace(/^chamber\.(gas_lines|gauges|inlets)\.[A-Za-z]+/, 'chamber.$1.NAME')
    .replace(/^(accuracy\.(?:viscosity|diffusion))\.[A-Za-z0-9]+/, '$1.GAS')
    .replace(/\.\d+\./, '.N.')
    .replace(/(residual|speed|pairs|flows)\.(?:Ar|N2)\b/, '$1.GAS')
    .replace(/:(?:Ar|N2)\/(?:Ar|N2)$/, ':GAS/GAS')
    .replace(/:(?:Ar|N2|feed|plate)$/, ':SUBJECT');
}

const LARGE: ReadonlyMap<string, string> = new Map([
  ['flows', 'LINE'],
  ['composition', 'GAS'],
  ['gases', 'GAS'],
  ['atoms', 'ATOM'],
  ['films', 'FILM'],
  ['power', 'GENERATOR'],
]);
