import { dispersion, peclet, PLUG_ABOVE_PECLET, plugRemainder, STIRRED_BELOW_PECLET } from '../physics/flow.ts';
import { inapplicable, quantity, type Ingredient } from './quantity.ts';
import type { Inapplicable } from './reading.ts';
import type { Reference } from './reference.ts';
import { gasesOf, gasOf, type Scope } from './scope.ts';

/* How the gas of a tube is replaced: stirred by its own diffusion, or pushed out as a plug. */

export const axialDispersion = quantity<[diffusivity: number, velocity: number, diameter: number]>({
  id: 'axial-dispersion',
  symbol: 'D_ax',
  dimension: 'diffusivity',
  statement: 'Dispersion of a gas along a tube: its diffusion, and the flow that is faster in the middle.',
  source: 'D (1 + (u d/D)²/192), Taylor 1953 and Aris 1956',
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = axialGas(reference, scope);
    return typeof of === 'string' ? [{ id: 'diffusivity', of }, { id: 'bulk-velocity' }, { id: 'flow-length' }] : of;
  },
  value: dispersion,
});

export const axialPeclet = quantity<[velocity: number, length: number, dispersion: number]>({
  id: 'axial-peclet',
  symbol: 'Pe_ax',
  dimension: 'number',
  statement:
    'Péclet number of a gas over the length of the tube: below 2 the tube is stirred, above 10 gas passes as a plug.',
  source: 'u L/D_ax; Levenspiel, Chemical Reaction Engineering, 3rd ed. 1999, ch. 13',
  subjects: gasesOf,
  from: (reference, scope) => {
    const of = axialGas(reference, scope);
    return typeof of === 'string' ? [{ id: 'bulk-velocity' }, 'body.length', { id: 'axial-dispersion', of }] : of;
  },
  value: peclet,
});

export const remainingFraction = quantity<[turnovers: number, peclet: readonly number[]]>({
  id: 'remaining-fraction',
  symbol: 'f_rest',
  dimension: 'fraction',
  statement:
    'Share of the gas before the step that is left at its end: of a stirred chamber, or of a tube that gas passes as a plug.',
  source: 'exp(-t/τ), stirred; ½ erfc((θ - 1) sqrt(Pe/(4 θ))), plug with dispersion, Levenspiel 1999, ch. 13',
  subjects: gasesOf,
  whole: true,
  from: (reference, scope) => {
    const turnovers: Ingredient = { id: 'turnovers' };
    if (scope.setup.flow !== 'axial') return [turnovers, []];
    const of = axialGas(reference, scope);
    return typeof of === 'string' ? [turnovers, [{ id: 'axial-peclet', of }]] : of;
  },
  value: (turnovers, [tube]) => {
    const stirred = Math.exp(-turnovers);
    if (tube === undefined || tube < STIRRED_BELOW_PECLET) return stirred;
    const plug = plugRemainder(turnovers, tube);
    // Between both pictures neither holds: the larger remainder counts.
    return tube > PLUG_ABOVE_PECLET ? plug : Math.max(stirred, plug);
  },
  remarks: (_, __, [turnovers, [tube = 0]]) =>
    tube >= STIRRED_BELOW_PECLET && tube <= PLUG_ABOVE_PECLET
      ? [
          `the tube is neither stirred nor passed as a plug: ${Math.exp(-turnovers).toPrecision(2)} or ${plugRemainder(turnovers, tube).toPrecision(2)} remains`,
        ]
      : [],
});

/** The gas that is followed along a tube: the one asked for, else the first of the feed. */
function axialGas(reference: Reference, scope: Scope): string | Inapplicable {
  if (scope.setup.flow !== 'axial') return inapplicable('gas does not pass the chamber from end to end');
  return gasOf(reference, scope) ?? scope.gases[0] ?? inapplicable('no gas flows');
}
