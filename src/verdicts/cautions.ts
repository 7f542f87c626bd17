import type { Plan } from '../quantities/plan.ts';
import type { Run } from '../quantities/run.ts';
import type { Hazard } from '../substances/gas.ts';
import type { Caution, FuelWithOxidiser, GasHazard } from './verdict.ts';

/** Hazards that call for a caution, gravest first. */
const HAZARDS: readonly Hazard[] = ['pyrophoric', 'toxic', 'flammable', 'corrosive', 'oxidising'];
const FUELS: readonly Hazard[] = ['pyrophoric', 'flammable'];

/** What the gases of a recipe call for: one caution for each hazard, and one for each set of fuels and oxidisers in one step. */
export function cautionsOf({ steps }: Run): readonly Caution[] {
  const hazards = new Map<Hazard, { gases: Set<string>; steps: string[] }>();
  const meetings = new Map<string, FuelWithOxidiser & { steps: string[] }>();
  for (const { step, plan } of steps) {
    const present = presentOf(plan);
    for (const [hazard, gases] of present.byHazard) note(hazards, hazard, gases, step.path);
    if (present.fuels.length > 0 && present.oxidisers.length > 0) meet(meetings, present, step.path);
  }
  return [...meetings.values(), ...HAZARDS.flatMap((hazard) => hazardCaution(hazard, hazards.get(hazard)))];
}

/** Gases that a step feeds, by hazard; steps of one plan feed the same. */
interface Present {
  readonly byHazard: ReadonlyMap<Hazard, readonly string[]>;
  readonly fuels: readonly string[];
  readonly oxidisers: readonly string[];
}

const PRESENT = new WeakMap<Plan, Present>();

function presentOf(plan: Plan): Present {
  let present = PRESENT.get(plan);
  if (present === undefined) {
    present = newPresent(plan);
    PRESENT.set(plan, present);
  }
  return present;
}

function newPresent({ scope }: Plan): Present {
  const fed = [...new Set(scope.setup.lines.flatMap(({ brings }) => brings.map(({ gas }) => gas)))].sort();
  const having = (hazards: readonly Hazard[]) =>
    fed.filter((gas) => scope.gas(gas)?.hazards.some((hazard) => hazards.includes(hazard)));
  const byHazard = HAZARDS.map((hazard) => [hazard, having([hazard])] as const).filter(([, gases]) => gases.length > 0);
  return { byHazard: new Map(byHazard), fuels: having(FUELS), oxidisers: having(['oxidising']) };
}

function note(
  hazards: Map<Hazard, { gases: Set<string>; steps: string[] }>,
  hazard: Hazard,
  gases: readonly string[],
  path: string,
): void {
  let known = hazards.get(hazard);
  if (known === undefined) hazards.set(hazard, (known = { gases: new Set(), steps: [] }));
  for (const gas of gases) known.gases.add(gas);
  known.steps.push(path);
}

function meet(meetings: Map<string, FuelWithOxidiser & { steps: string[] }>, present: Present, path: string): void {
  const { fuels, oxidisers } = present;
  const key = `${fuels.join()} ${oxidisers.join()}`;
  const known = meetings.get(key);
  if (known === undefined) meetings.set(key, { kind: 'fuel-with-oxidiser', fuels, oxidisers, steps: [path] });
  else known.steps.push(path);
}

function hazardCaution(
  hazard: Hazard,
  found: { gases: ReadonlySet<string>; steps: readonly string[] } | undefined,
): readonly GasHazard[] {
  return found === undefined ? [] : [{ kind: 'hazard', hazard, gases: [...found.gases].sort(), steps: found.steps }];
}
