import {
  effectiveSticking,
  exposure,
  filmFlux,
  impingement,
  monolayerTime,
  surfaceRateFromGrowth,
  surfaceRateFromSticking,
  utilisation,
} from '../physics/surfaces.ts';
import { BOLTZMANN } from '../physics/constants.ts';
import { balanceOf, limitingElements, moleculesPerFormula } from './element-balance.ts';
import { inapplicable, missing, quantity, type Ingredient, type Recipe } from './quantity.ts';
import type { Inapplicable, Missing } from './reading.ts';
import type { Reference } from './reference.ts';
import { gasOf, gasesOf, type Scope } from './scope.ts';

/* What arrives at a surface, and what the surface takes up. */

export const impingementOf = quantity<[pressure: number, mass: number, temperature: number]>({
  id: 'impingement',
  symbol: 'Γ',
  dimension: 'flux',
  statement: 'Molecules of a gas that hit a surface, per area and time.',
  source: 'Hertz-Knudsen, Γ = p_i/sqrt(2π m k T)',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    return [{ id: 'partial-pressure', of: gas }, `gases.${gas}.molar_mass`, { id: 'gas-temperature' }];
  },
  value: impingement,
});

export const monolayerTimeOf = quantity<[sites: number, sticking: readonly number[], flux: number]>({
  id: 'monolayer-time',
  symbol: 't_mono',
  dimension: 'time',
  statement:
    'Time in which a gas covers every site of a surface, each molecule sticking unless the step says how many do.',
  source: 'N_s/(s Γ)',
  subjects: gasesOf,
  from: (reference, scope) => {
    const gas = gasOf(reference, scope);
    if (gas === undefined) return missing('reactant.gas');
    const own = gas === scope.setup.reactant && scope.states('reactant.sticking');
    return ['reactant.site_density', own ? ['reactant.sticking'] : [], { id: 'impingement', of: gas }];
  },
  value: (sites, [sticking = 1], flux) => monolayerTime(sites, sticking, flux),
});

export const exposureOf = quantity<[pressure: number, time: number]>({
  id: 'exposure',
  symbol: 'p t',
  dimension: 'exposure',
  statement: 'Partial pressure of a gas times the step’s time.',
  source: 'definition; 1 langmuir = 1e-6 Torr s',
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = gasOf(reference, scope);
    return of === undefined ? missing('reactant.gas') : [{ id: 'partial-pressure', of }, 'time'];
  },
  value: exposure,
});

export const filmFluxOf = quantity<[rate: number, density: number, mass: number]>({
  id: 'film-flux',
  symbol: 'J',
  dimension: 'flux',
  statement: 'Formula units of film grown or etched, per area and time.',
  source: 'rate ρ_film N_A/M_film',
  from: (_, { setup }) => {
    if (setup.wafer === 'none') return inapplicable('no wafer is in the chamber');
    if (setup.surface === undefined) return missing('surface.grows', 'surface.rate');
    return ['surface.rate', `films.${setup.surface.film}.density`, `films.${setup.surface.film}.molar_mass`];
  },
  value: filmFlux,
});

export const activeArea = quantity<
  [wafer: number, count: number, faces: number, open: number, deposited: readonly number[]]
>({
  id: 'active-area',
  symbol: 'A_s',
  dimension: 'area',
  statement:
    'Area on which film grows or is etched: coated faces of all wafers, their open share, and the wall that is coated too.',
  source: 'definition',
  from: (_, scope) => [
    { id: 'wafer-area' },
    'wafer.count',
    'wafer.coated_faces',
    'surface.open_area',
    scope.states('chamber.walls.deposited_area') ? ['chamber.walls.deposited_area'] : [],
  ],
  value: (wafer, count, faces, open, [deposited = 0]) => wafer * count * faces * open + deposited,
  remarks: (_, scope) =>
    scope.states('chamber.walls.deposited_area')
      ? []
      : [
          'what the walls take up is not counted, since chamber.walls.deposited_area is not given: the true utilisation is higher',
        ],
});

export const utilisationOf = quantity<
  [flux: number, area: number, atoms: number, flows: readonly number[], counts: readonly number[]]
>({
  id: 'utilisation',
  symbol: 'U',
  dimension: 'fraction',
  statement:
    'What the surface takes up of an element over what the feed brings; without a subject, of the element of which it takes most.',
  source: 'element balance, J A n_X/Σ F_i n_X',
  subjects: limitingElements,
  from: (reference, scope) => utilisationIngredients(reference, scope),
  value: (flux, area, atoms, flows, counts) => {
    const feed = flows.reduce((sum, flow, index) => sum + flow * (counts[index] ?? 0), 0);
    return feed > 0 ? utilisation(flux, area, atoms, feed) : inapplicable('the feed does not bring the element');
  },
});

function utilisationIngredients(
  { of }: Reference,
  scope: Scope,
): UtilisationRecipe | Ingredient | Missing | Inapplicable {
  const balance = balanceOf(scope);
  if ('kind' in balance) return balance;
  if (of === undefined) return { id: 'utilisation', of: 'worst' };
  const atoms = balance.atomsPerFormula.get(of) ?? 0;
  const carriers = scope.fedGases.filter((gas) => (scope.gas(gas)?.formula.get(of) ?? 0) > 0);
  if (atoms === 0 || carriers.length === 0) return inapplicable(`the feed brings no ${of} that the film takes up`);
  return [
    { id: 'film-flux' },
    { id: 'active-area' },
    atoms,
    carriers.map((gas) => ({ id: 'flow-rate', of: gas })),
    carriers.map((gas) => scope.gas(gas)?.formula.get(of) ?? 0),
  ];
}

type UtilisationRecipe = Recipe<[number, number, number, readonly number[], readonly number[]]>;

export const surfaceConcentration = quantity<[fraction: number, pressure: number, used: number, temperature: number]>({
  id: 'reactant-density',
  symbol: 'n_i',
  dimension: 'number-density',
  statement: 'Molecules of the reactant per volume that are left beside what the surface takes up.',
  source: 'x_i p (1 - U)/(k T), well mixed',
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = gasOf(reference, scope);
    if (of === undefined) return missing('reactant.gas');
    return [{ id: 'mole-fraction', of }, { id: 'gas-pressure' }, { id: 'utilisation' }, { id: 'gas-temperature' }];
  },
  value: (fraction, pressure, used, temperature) =>
    used < 1
      ? (fraction * pressure * (1 - used)) / (BOLTZMANN * temperature)
      : inapplicable('the surface takes up more than the feed brings'),
});

export const surfaceRate = quantity<[a: number, b: number, perFormula: readonly number[]]>({
  id: 'surface-rate',
  symbol: 'k_s',
  dimension: 'velocity',
  statement:
    'First-order rate of the surface: from the sticking coefficient where one is given, else from the measured rate.',
  source: 'Motz & Wise, J. Chem. Phys. 32, 1893 (1960); else k_s = ν J/n_i by the element balance',
  from: (_, scope) => {
    if (scope.setup.reactant === undefined) return missing('reactant.gas');
    if (scope.states('reactant.sticking')) return ['reactant.sticking', { id: 'mean-speed', of: 'reactant' }, []];
    const molecules = moleculesPerFormula(scope);
    if (typeof molecules !== 'number') return molecules;
    return [{ id: 'film-flux' }, { id: 'reactant-density', of: 'reactant' }, [molecules]];
  },
  value: (a, b, [perFormula]) =>
    perFormula === undefined ? surfaceRateFromSticking(a, b) : surfaceRateFromGrowth(perFormula, a, b),
  remarks: (_, scope) =>
    scope.has('reactant.sticking')
      ? []
      : ['an average over all that deposits: a lower bound for what really sticks where the feed reacts in the gas'],
});

export const effectiveStickingOf = quantity<[rate: number, speed: number]>({
  id: 'effective-sticking',
  symbol: 's_eff',
  dimension: 'fraction',
  statement: 'Share of the reactant’s hits that react, as the surface rate tells it.',
  source: '4 k_s/v',
  from: () => [{ id: 'surface-rate' }, { id: 'mean-speed', of: 'reactant' }],
  value: effectiveSticking,
});
