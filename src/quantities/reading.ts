/**
 * What reading a number gives: it is known, missing (with every setpoint that would supply it), or it does not apply (and why).
 * No known value is infinite or NaN.
 */
export type Reading = Known | Missing | Inapplicable;

export interface Known {
  readonly kind: 'known';
  readonly value: number;
  /** Whose number it is, where the reference named a role or the worst of several. */
  readonly of?: string;
}

export interface Missing {
  readonly kind: 'missing';
  /** Addresses of the setpoints, or names of the data, that would supply it. */
  readonly needs: readonly string[];
}

export interface Inapplicable {
  readonly kind: 'inapplicable';
  readonly because: string;
}

/** How strongly one given moves a number, and how much it contributes to its uncertainty. */
export interface Slope {
  readonly address: string;
  /** Change of the number per change of the given, both in SI. */
  readonly slope: number;
  /** Standard uncertainty that this given alone would cause. */
  readonly contribution: number;
}
