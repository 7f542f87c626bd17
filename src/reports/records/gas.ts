import { gasNumbers, type GasState } from '../pages/gas.ts';
import type { Shown } from '../shown.ts';
import { condensingSentences } from '../condensing.ts';
import { inCatalogueOrder, quantityRecord } from './quantity.ts';

/** What is known of gases and mixtures, in SI. */
export function gasRecord(states: readonly GasState[], shown: Shown) {
  return { format: 1, gases: states.map((state) => stateRecord(state, shown)) };
}

function stateRecord(state: GasState, shown: Shown) {
  const { name, run } = state;
  const { gases } = run.step.setup;
  const estimates = gases.flatMap((gas) => {
    const estimated = run.plan.scope.gas(gas)?.estimated;
    return estimated === undefined ? [] : [`collision values of ${gas} are estimated: ${estimated}`];
  });
  const remarks = [...condensingSentences(run), ...estimates];
  return {
    gas: name,
    ...(gases.length > 1
      ? { shares: Object.fromEntries(gases.map((gas) => [gas, run.given(`composition.${gas}`)?.value ?? 0])) }
      : {}),
    temperature: run.given('temperatures.gas')?.value ?? 0,
    pressure: run.given('pressure')?.value ?? 0,
    quantities: inCatalogueOrder(gasNumbers(state)).map((reference) => quantityRecord(run, reference, shown)),
    ...(remarks.length === 0 ? {} : { remarks }),
  };
}
