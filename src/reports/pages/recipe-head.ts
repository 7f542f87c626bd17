import type { Run } from '../../quantities/run.ts';
import { printTime } from '../../units/display.ts';
import type { RecipeHead } from '../page.ts';
import { counted } from '../words.ts';

/** Which recipe on which chamber, and how large it is. */
export function recipeHeadOf({ recipe, steps }: Pick<Run, 'recipe' | 'steps'>): RecipeHead & { readonly file: string } {
  const { name, revision, chamber, file, duration } = recipe;
  return {
    kind: 'recipe',
    name,
    ...(revision === undefined ? {} : { revision }),
    chamber: chamber.revision === undefined ? chamber.name : `${chamber.name} rev ${chamber.revision}`,
    file,
    size: [counted(steps.length, 'step'), ...(duration === undefined ? [] : [printTime(duration)])],
  };
}
