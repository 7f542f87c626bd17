import { hazardClauses, practice } from '../cautions.ts';
import { blocking, type Counts } from '../counts.ts';
import { hazardEntries } from '../hazards.ts';
import type { CheckOptions } from '../options.ts';
import type { Block } from '../page.ts';
import { counted } from '../words.ts';
import { countsWords } from './outcome.ts';

/** What all recipes of a run add up to. */
export function checkClosing(counts: Counts, options: CheckOptions): readonly Block[] {
  return [...cautionBlocks(counts, options), { kind: 'sentence', weight: 'first', text: closingText(counts, options) }];
}

function closingText(counts: Counts, options: CheckOptions): string {
  const { recipes, steps, stepsByWorst, waived, faults, passedOver } = counts;
  const judged =
    recipes === 0
      ? 'No recipe was judged.'
      : `${counted(recipes, 'recipe')}, ${counted(steps, 'step')}: ${countsWords(stepsByWorst)}.`;
  const blocks = blocking(counts, options);
  const asides = [
    ...(waived === 0 ? [] : [`${counted(waived, 'finding')} waived.`]),
    ...(passedOver === 0 ? [] : [`${counted(passedOver, 'other YAML file')} passed over.`]),
    ...(faults === 0 ? [] : [`${counted(faults, 'fault')}: the job could not be done in full.`]),
    recipes === 0
      ? ''
      : blocks === 0
        ? 'Nothing blocks.'
        : `${counted(blocks, 'finding')} ${blocks === 1 ? 'blocks' : 'block'}.`,
  ];
  return [judged, ...asides].filter((text) => text !== '').join('  ');
}

/** With many recipes their cautions are told once, together. */
function cautionBlocks({ hazards, fuelWithOxidiser }: Counts, { fold }: CheckOptions): readonly Block[] {
  const entries = hazardEntries(hazards);
  if (fold === 'none' || (entries.length === 0 && fuelWithOxidiser === 0)) return [];
  const together =
    fuelWithOxidiser === 0 ? [] : [`fuel and oxidiser flow together in ${counted(fuelWithOxidiser, 'recipe')}`];
  return [{ kind: 'caution', text: `${[...hazardClauses(entries), ...together].join('; ')}. ${practice()}` }];
}
