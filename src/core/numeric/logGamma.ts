import { stirlingError } from './stirlingError';

const HALF_LOG_2PI = 0.91893853320467274178;

/**
 * ln Γ(x) for x > 0, by Stirling's formula with its error (Loader 2000): ln Γ(x+1) − ln x. Near its zeros at 1 and 2 the
 * absolute error stays near 1e-16, the relative error does not.
 */
export function logGamma(x: number): number {
  return stirlingError(x) + (x + 0.5) * Math.log(x) - x + HALF_LOG_2PI - Math.log(x);
}
