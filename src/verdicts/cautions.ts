import type { Run, StepRun } from '../quantities/run.ts';
import type { Hazard } from '../substances/gas.ts';
import type { Caution, FuelWithOxidiser, GasHazard } from './verdict.ts';

/** Hazards that call for a caution, gravest first. */
const HAZARDS: readonly Hazard[] = ['pyrophoric', 'toxic', 'flammable', 'corrosive', 'oxidising'];
const FUELS: readonly Hazard[] = ['pyrophoric', 'flammable'];

/** What the gases of a recipe call for: one caution for each hazard, and one for each pair of fuels and oxidisers in one step. */
export function cautionsOf(run: Run): readonly Caution[] {
  return [...fuelsWithOxidisers(run), ...HAZARDS.flatMap((hazard) => gasHazard(run, hazard))];
}

function gasHazard(run: Run, hazard: Hazard): readonly GasHazard[] {
  const gases = new Set<string>();
  const steps: string[] = [];
  for (const step of run.steps) {
    const here = gasesWith(step, [hazard]);
    if (here.length > 0) steps.push(step.step.path);
    for (const gas of here) gases.add(gas);
  }
  return gases.size === 0 ? [] : [{ kind: 'hazard', hazard, gases: [...gases].sort(), steps }];
}

function fuelsWithOxidisers(run: Run): readonly FuelWithOxidiser[] {
  const found = new Map<string, { fuels: readonly string[]; oxidisers: readonly string[]; steps: string[] }>();
  for (const step of run.steps) {
    const [fuels, oxidisers] = [gasesWith(step, FUELS), gasesWith(step, ['oxidising'])];
    if (fuels.length === 0 || oxidisers.length === 0) continue;
    const key = `${fuels.join()} ${oxidisers.join()}`;
    const known = found.get(key);
    if (known === undefined) found.set(key, { fuels, oxidisers, steps: [step.step.path] });
    else known.steps.push(step.step.path);
  }
  return [...found.values()].map((one) => ({ kind: 'fuel-with-oxidiser', ...one }));
}

/** Gases that flow in a step and have one of the hazards. */
function gasesWith(run: StepRun, hazards: readonly Hazard[]): readonly string[] {
  const { scope } = run.plan;
  const flowing = run.step.setup.lines.flatMap(({ name, brings }) => {
    const flow = run.givens.get(`flows.${name}`)?.value ?? NaN;
    return flow === 0 ? [] : brings.map(({ gas }) => gas);
  });
  return [...new Set(flowing)].filter((gas) => scope.gas(gas)?.hazards.some((hazard) => hazards.includes(hazard))).sort();
}
