import type { Site } from './site.ts';

/** The names under which findings of a step can be waived: an assumption's, alone or behind its process and a slash. */
export function waivableNames(site: Site, process: string): readonly string[] {
  const names: string[] = [];
  for (const one of [process, ...BESIDE_EVERY_STEP]) {
    const spec = site.process(one);
    if (spec === undefined) continue;
    const own = [...spec.assumptions.map(({ name }) => name), ...spec.usual.map(({ address }) => `usual-${address}`)];
    names.push(...own, ...own.map((name) => `${one}/${name}`));
  }
  for (const { name } of site.ratios) names.push(name, `site/${name}`);
  return names;
}

/** Processes that are judged beside whatever a step intends. */
export const BESIDE_EVERY_STEP = ['chamber-fit', 'backside-cooling'] as const;
