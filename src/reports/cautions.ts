import type { Caution } from '../verdicts/verdict.ts';
import type { Hazard } from '../substances/gas.ts';
import { capital, listed } from './words.ts';

/** One caution as it is told by itself. */
export interface CautionText {
  /** The step that it concerns; absent where several. */
  readonly path?: string;
  readonly gases: readonly string[];
  readonly text: string;
}

const PRACTICE = "follow local codes, the equipment's interlocks and licensed practice";

/** Every caution by itself: of a hazard one for the recipe, of a fuel with an oxidiser one for each step. */
export function cautionTexts(cautions: readonly Caution[]): readonly CautionText[] {
  return cautions.flatMap((caution) => {
    const { steps } = caution;
    if (caution.kind === 'hazard') {
      const { gases, hazard } = caution;
      const text = `${listed(gases)} ${gases.length === 1 ? 'is' : 'are'} ${hazardWord(hazard)}: ${PRACTICE}.`;
      const [only] = steps;
      return [{ ...(steps.length === 1 && only !== undefined ? { path: only } : {}), gases, text }];
    }
    const gases = [...caution.fuels, ...caution.oxidisers];
    const text = `${listed(caution.fuels)} and ${listed(caution.oxidisers)} flow together, fuel and oxidiser: ${PRACTICE}.`;
    return steps.map((path) => ({ path, gases, text }));
  });
}

export function cautionCount(cautions: readonly Caution[]): number {
  let count = 0;
  for (const caution of cautions) count += caution.kind === 'hazard' ? 1 : caution.steps.length;
  return count;
}

/** All cautions of a recipe in one breath; undefined where there are none. */
export function cautionSummary(cautions: readonly Caution[]): string | undefined {
  if (cautions.length === 0) return undefined;
  const hazards = new Map<Hazard, readonly string[]>();
  const clauses: string[] = [];
  for (const caution of cautions) {
    if (caution.kind === 'hazard') hazards.set(caution.hazard, caution.gases);
    else
      clauses.push(
        `${listed(caution.fuels)} with ${listed(caution.oxidisers)}, fuel with oxidiser, in ${listed(caution.steps)}`,
      );
  }
  return `${[...hazardClauses([...hazards]), ...clauses].join('; ')}. ${capital(PRACTICE)}.`;
}

/** "SiH4 is pyrophoric and toxic", gas by gas, gases alike together. */
export function hazardClauses(hazards: readonly (readonly [Hazard, readonly string[]])[]): readonly string[] {
  const byGas = new Map<string, string[]>();
  for (const [hazard, gases] of hazards) {
    for (const gas of gases) byGas.set(gas, [...(byGas.get(gas) ?? []), hazardWord(hazard)]);
  }
  const alike = new Map<string, string[]>();
  for (const [gas, own] of byGas) {
    const words = listed(own);
    alike.set(words, [...(alike.get(words) ?? []), gas]);
  }
  return [...alike].map(([words, gases]) => `${listed(gases)} ${gases.length === 1 ? 'is' : 'are'} ${words}`);
}

/** The hazard after "is" or "are". */
function hazardWord(hazard: Hazard): string {
  return hazard === 'asphyxiant' ? 'asphyxiating' : hazard;
}

/** What every caution says. */
export function practice(): string {
  return `${capital(PRACTICE)}.`;
}
