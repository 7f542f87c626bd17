import type { Hazard } from '../substances/gas.ts';

/** Gases by what they threaten with. */
export type GasesByHazard = Readonly<Partial<Record<Hazard, readonly string[]>>>;

/** The gases of two recipes together. */
export function joined(a: GasesByHazard, b: GasesByHazard): GasesByHazard {
  const all: Partial<Record<Hazard, readonly string[]>> = { ...a };
  for (const [hazard, gases] of hazardEntries(b)) {
    const before = all[hazard] ?? [];
    const more = gases.filter((gas) => !before.includes(gas));
    all[hazard] = more.length === 0 ? before : [...before, ...more].sort();
  }
  return all;
}

export function hazardEntries(hazards: GasesByHazard): readonly (readonly [Hazard, readonly string[]])[] {
  return HAZARDS.flatMap((hazard) => {
    const gases = hazards[hazard];
    return gases === undefined ? [] : [[hazard, gases] as const];
  });
}

/** In the order in which they are told. */
const HAZARDS: readonly Hazard[] = ['pyrophoric', 'flammable', 'oxidising', 'toxic', 'corrosive', 'asphyxiant'];
