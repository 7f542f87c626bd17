import type { Site } from './site.ts';
import type { Step } from './step.ts';

/** The names under which findings of a step can be waived: an assumption's, alone or behind its process and a slash. */
export function waivableNames(site: Site, step: Step): readonly string[] {
  const names: string[] = [];
  for (const process of [step.process, ...BESIDE_EVERY_STEP]) {
    const spec = site.process(process).value;
    if (spec === undefined) continue;
    const own = [...spec.assumptions.map(({ name }) => name), ...spec.usual.map(({ address }) => `usual-${address}`)];
    names.push(...own, ...own.map((name) => `${process}/${name}`));
  }
  for (const { name } of site.ratios) names.push(name, `site/${name}`);
  return names;
}

/** Processes that are judged beside whatever a step intends. */
export const BESIDE_EVERY_STEP = ['chamber-fit', 'backside-cooling'] as const;
