import { carriedOff, steadyPressure } from '../physics/pump.ts';
import { impurityRatio } from '../physics/residual.ts';
import { impingement } from '../physics/surfaces.ts';
import { inapplicable, missing, quantity, type Ingredient } from './quantity.ts';
import type { Inapplicable } from './reading.ts';
import type { Scope } from './scope.ts';

/* Residual gas: what leaks in or comes off the walls, and what of it can end in the film. */

export const basePumpSpeed = quantity<[]>({
  id: 'base-pump-speed',
  symbol: 'S_base',
  dimension: 'speed',
  statement: 'Full speed of the pump at base pressure.',
  source: 'stated by the chamber: its speed, its speed for nitrogen, or the first row of its table by pressure',
  from: (_, scope) => basePump(scope),
  value: () => NaN,
});

function basePump(scope: Scope): Ingredient | Inapplicable {
  switch (scope.setup.pumpSpeed) {
    case 'none':
      return inapplicable('the chamber has no pump');
    case 'one':
      return 'chamber.pump.speed';
    case 'by-pressure':
      return 'chamber.pump.speed.0.is';
    case 'by-gas':
      return scope.has('chamber.pump.speed.N2')
        ? 'chamber.pump.speed.N2'
        : (scope.addresses('chamber.pump.speed.')[0] ?? 'chamber.pump.speed.N2');
  }
}

type ResidualArguments = [
  base: readonly number[],
  speed: readonly number[],
  temperature: number,
  leak: readonly number[],
];

export const residualFlow = quantity<ResidualArguments>({
  id: 'residual-flow',
  symbol: 'F_r',
  dimension: 'flow',
  statement: 'Molecules of residual gas that enter: the larger of what base pressure and leak-up rate tell.',
  source: 'p_base S/(k T_wall); V (dp/dt)/(k T_wall), rate-of-rise test',
  from: (_, scope) => {
    const base = scope.has('chamber.pump.base_pressure') && scope.setup.pumpSpeed !== 'none';
    const leak = scope.has('chamber.pump.leak_up_rate');
    if (!base && !leak) return missing('chamber.pump.base_pressure', 'chamber.pump.leak_up_rate');
    return [
      base ? ['chamber.pump.base_pressure'] : [],
      base ? [{ id: 'base-pump-speed' }] : [],
      'temperatures.wall',
      leak ? [{ id: 'leak-rate' }] : [],
    ];
  },
  value: ([base], [speed], temperature, [leak = 0]) =>
    base === undefined || speed === undefined ? leak : Math.max(leak, carriedOff(base, speed, temperature)),
});

export const residualPressureOf = quantity<[flow: number, temperature: number, speed: number]>({
  id: 'residual-pressure',
  symbol: 'p_r',
  dimension: 'pressure',
  statement: 'Partial pressure of the residual gas while the step runs.',
  source: 'F_r k T_wall/S, S the speed at which this step is pumped',
  from: (_, scope) => {
    if (!scope.fed) return { id: 'gas-pressure' };
    const speed = scope.setup.throttle === 'open' ? 'pump-speed' : 'pumping-speed';
    return [{ id: 'residual-flow' }, 'temperatures.wall', { id: speed }];
  },
  value: steadyPressure,
});

type ImpurityArguments = [
  pressure: number,
  fractions: readonly number[],
  masses: readonly number[],
  atoms: readonly number[],
  temperature: number,
  flux: number,
  filmAtoms: number,
  sticking: number,
];

export const impurityRatioOf = quantity<ImpurityArguments>({
  id: 'impurity-ratio',
  symbol: 'N_imp/N_film',
  dimension: 'number',
  statement: 'Reactive atoms (O, N, C) that the film takes up from the residual gas over its own atoms.',
  source: 's Σ Γ_i a_i/(J a_film), Γ by Hertz-Knudsen; Ohring, Materials Science of Thin Films, 2nd ed. 2002, ch. 3',
  from: (_, scope) => {
    const { surface } = scope.setup;
    const film = surface === undefined ? undefined : scope.library.film(surface.film)?.formula;
    if (surface !== undefined && film === undefined) return missing(`films.${surface.film}.formula`);
    const residual = residualShares(scope);
    return [
      { id: 'residual-pressure' },
      residual.map(({ share }) => share),
      residual.map(({ gas }) => `gases.${gas}.molar_mass`),
      residual.map(({ gas }) => reactiveAtoms(gas, scope)),
      'temperatures.wall',
      { id: 'film-flux' },
      // Without a film its flux is missing, and is told together with all else.
      [...(film?.values() ?? [])].reduce((sum, count) => sum + count, 0),
      'assumed.residual-sticking',
    ];
  },
  value: (pressure, fractions, masses, atoms, temperature, flux, filmAtoms, sticking) => {
    const arriving = fractions.map((share, index) => impingement(share * pressure, masses[index] ?? NaN, temperature));
    return sticking * impurityRatio(arriving, atoms, flux, filmAtoms);
  },
});

function residualShares(scope: Scope): readonly { gas: string; share: string }[] {
  const { residual } = scope.setup;
  if (residual.length === 0) return [{ gas: 'H2O', share: 'assumed.residual.H2O' }];
  return residual.map((gas) => ({ gas, share: `chamber.pump.residual.${gas}` }));
}

/** Atoms of a residual molecule that a growing film takes up: oxygen, nitrogen and carbon of gases that are not inert. */
function reactiveAtoms(gas: string, scope: Scope): number {
  const found = scope.gas(gas);
  if (found === undefined || found.inert) return 0;
  return ['O', 'N', 'C'].reduce((sum, element) => sum + (found.formula.get(element) ?? 0), 0);
}
