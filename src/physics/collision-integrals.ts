/**
 * Reduced temperatures for which the fits were made [1]. Beyond 100 the leading power carries on smoothly, below 0.3 the fits fall short:
 * 6 % at T* = 0.1. Whoever shows a number that rests on them outside this range says so.
 */
export const COLLISION_INTEGRAL_RANGE = { from: 0.3, to: 100 } as const;

/**
 * Reduced collision integral of diffusion, Ω(1,1)*: momentum-transfer cross-section over that of a hard sphere of diameter σ.
 *
 *     Ω11* = 1.06036 T*^-0.15610 + 0.19300 e^(-0.47635 T*) + 1.03587 e^(-1.52996 T*) + 1.76474 e^(-3.89411 T*) + 0.19 δ²/T*
 *
 * Range: 0.3 <= T* <= 100, within 0.1 % of the tabulated integrals of the 12-6 potential; the dipole term for δ up to 2.5.
 * Weakness: the 12-6 wall is too hard at high energy, so that Ω falls too slowly for hot helium and hydrogen.
 *
 * @param reducedTemperature T*: temperature over well depth [1]
 * @param polarity δ²: square of the pair's reduced dipole [1]
 * @returns Ω11*: reduced collision integral [1]
 * @source Neufeld, Janzen & Aziz, J. Chem. Phys. 57, 1100 (1972); dipole term Brokaw, Ind. Eng. Chem. Process Des. Dev. 8, 240 (1969)
 * @example omega11(100) -> 0.5167177
 * @example omega11(2, 0.5) -> 1.12286
 */
export function omega11(reducedTemperature: number, polarity = 0): number {
  const t = reducedTemperature;
  if (!(t > 0)) return NaN;
  // Beyond 80 the exponentials are below the last digit; fast atoms come here often.
  if (t > 80) return 1.06036 * t ** -0.1561 + (0.19 * polarity) / t;
  return (
    1.06036 * t ** -0.1561 +
    0.193 * Math.exp(-0.47635 * t) +
    1.03587 * Math.exp(-1.52996 * t) +
    1.76474 * Math.exp(-3.89411 * t) +
    (0.19 * polarity) / t
  );
}

/**
 * Reduced collision integral of viscosity, Ω(2,2)*.
 *
 *     Ω22* = 1.16145 T*^-0.14874 + 0.52487 e^(-0.77320 T*) + 2.16178 e^(-2.43787 T*)
 *            - 6.435e-4 T*^0.14874 sin(18.0323 T*^-0.76830 - 7.27371) + 0.2 δ²/T*
 *
 * Range: 0.3 <= T* <= 100, within 0.1 % of the tabulated integrals of the 12-6 potential; the dipole term for δ up to 2.5.
 * Weakness: as that of Ω11*.
 *
 * @param reducedTemperature T*: temperature over well depth [1]
 * @param polarity δ²: square of the pair's reduced dipole [1]
 * @returns Ω22*: reduced collision integral [1]
 * @source Neufeld, Janzen & Aziz, J. Chem. Phys. 57, 1100 (1972); dipole term Brokaw, Ind. Eng. Chem. Process Des. Dev. 8, 240 (1969)
 * @example omega22(1) -> 1.59315
 * @example omega22(1, 0.5) -> 1.69315
 */
export function omega22(reducedTemperature: number, polarity = 0): number {
  const t = reducedTemperature;
  if (!(t > 0)) return NaN;
  const power = t ** 0.14874;
  return (
    1.16145 / power +
    0.52487 * Math.exp(-0.7732 * t) +
    2.16178 * Math.exp(-2.43787 * t) -
    6.435e-4 * power * Math.sin(18.0323 * t ** -0.7683 - 7.27371) +
    (0.2 * polarity) / t
  );
}
