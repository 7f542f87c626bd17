/**
 * Error function.
 *
 *     erf x = (2/sqrtπ) ∫0^x e^(-t²) dt = (2/sqrtπ) e^(-x²) Σ_n 2^n x^(2n+1)/(1·3·…·(2n+1))
 *
 * Range: all x, relative error below 1e-14. All terms of the series have one sign, so that nothing cancels.
 *
 * @param x argument [1]
 * @returns erf x [1]
 * @source Abramowitz & Stegun, Handbook of Mathematical Functions, 1964, eq. 7.1.6
 * @example erf(1) -> 0.8427007929497
 */
export function erf(x: number): number {
  if (x < 0) return -erf(-x);
  if (x > SERIES_TO) return 1 - erfcTail(x);
  let term = x;
  let sum = x;
  for (let n = 1; term > 1e-17 * sum; n++) {
    term *= (2 * x * x) / (2 * n + 1);
    sum += term;
  }
  return (2 / Math.sqrt(Math.PI)) * Math.exp(-x * x) * sum;
}

/** Where the series hands over to the continued fraction [1]. */
const SERIES_TO = 2;

/**
 * Complementary error function, accurate in its tail.
 *
 *     erfc x = 1 - erf x
 *
 * Range: all x, relative error below 1e-12; underflows to zero beyond x = 26.5.
 *
 * @param x argument [1]
 * @returns erfc x [1]
 * @source Abramowitz & Stegun 1964, eq. 7.1.14 (continued fraction)
 * @example erfc(3) -> 2.209049699859e-5
 */
export function erfc(x: number): number {
  return x > SERIES_TO ? erfcTail(x) : 1 - erf(x);
}

/** erfc x = e^(-x²)/sqrtπ · 1/(x + (1/2)/(x + 1/(x + (3/2)/(x + …)))), for x > 2. */
function erfcTail(x: number): number {
  if (x > 27) return 0;
  let fraction = x;
  for (let n = x > 5 ? 25 : 75; n > 0; n--) fraction = x + n / 2 / fraction;
  return Math.exp(-x * x) / (Math.sqrt(Math.PI) * fraction);
}

/**
 * Exponential integral of integer order.
 *
 *     E_n(x) = ∫1^∞ e^(-x t)/t^n dt
 *
 * By the series of E_1 and the upward recurrence up to x = 1, by the continued fraction above.
 *
 * Range: n = 1, 2, 3, …; x >= 0 (E_1 at zero is infinite: NaN). Relative error below 1e-11 for n up to 5.
 *
 * @param n order [1]
 * @param x argument [1]
 * @returns E_n(x) [1]
 * @source Abramowitz & Stegun 1964, eq. 5.1.11, 5.1.14 and 5.1.22; values in Table 5.4
 * @example exponentialIntegral(3, 1) -> 0.109691967198
 * @example exponentialIntegral(1, 1) -> 0.219383934396
 */
export function exponentialIntegral(n: number, x: number): number {
  if (!Number.isInteger(n) || n < 1 || !(x >= 0)) return NaN;
  if (x === 0) return n === 1 ? NaN : 1 / (n - 1);
  return x > 1 ? integralFraction(n, x) : integralByRecurrence(n, x);
}

const EULER_GAMMA = 0.5772156649015329;

function integralByRecurrence(n: number, x: number): number {
  let integral = -EULER_GAMMA - Math.log(x);
  let power = 1;
  for (let k = 1; k <= 20; k++) {
    power *= -x / k;
    integral -= power / k;
  }
  for (let order = 1; order < n; order++) integral = (Math.exp(-x) - x * integral) / order;
  return integral;
}

/** E_n(x) = e^(-x)/(x + n - 1·n/(x + n + 2 - 2(n+1)/(x + n + 4 - …))). */
function integralFraction(n: number, x: number): number {
  const depth = Math.ceil(20 + 100 / x);
  let fraction = x + n + 2 * depth;
  for (let k = depth; k > 0; k--) fraction = x + n + 2 * (k - 1) - (k * (n + k - 1)) / fraction;
  return Math.exp(-x) / fraction;
}
