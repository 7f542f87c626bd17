import { readRecipe } from '../documents/read.ts';
import { Source } from '../shelf/place.ts';
import { resolveRecipe } from '../steps/resolve.ts';
import { runOf } from './run.ts';
import type { RecipeDocument } from '../documents/document.ts';
import type { Outcome } from '../shelf/fault.ts';
import type { Site } from '../steps/site.ts';
import type { Run } from './run.ts';

/**
 * A recipe on its chamber as a run whose steps can be read. The recipe is a text under the name it has below the site's
 * folder, or a document that was read from one. Faults of single values leave those out; what can be read still can.
 */
export function openRun(site: Site, recipe: Source | RecipeDocument): Outcome<Run> {
  const document = recipe instanceof Source ? readRecipe(recipe) : { value: recipe, faults: [] };
  if (document.value === undefined) return { faults: document.faults };
  const resolved = resolveRecipe(site, document.value);
  const faults = [...document.faults, ...resolved.faults];
  return resolved.value === undefined ? { faults } : { value: runOf(site, resolved.value), faults };
}
