import { deviancePower } from './deviance';
import { stirlingError } from './stirlingError';

const MOST_TERMS = 100_000;
const CONVERGED = 1.2e-16;

/** Both tails of a distribution at one point. The smaller one keeps its relative accuracy. */
export interface Tails {
  readonly lower: number;
  readonly upper: number;
}

/**
 * Regularised incomplete beta function I_x(a, b) and its complement, a, b > 0. x and y = 1 − x are given separately so
 * that neither loses digits; so is λ = a·y − b·x where the caller knows it better than the difference gives it. Source: Didonato & Morris 1992, ACM TOMS 18:360 (algorithm 708, continued fraction BFRAC),
 * with the prefactor in the saddle-point form of Loader 2000. NaN where an argument is.
 */
export function incompleteBeta(x: number, y: number, a: number, b: number, lambda = a * y - b * x): Tails {
  if ([x, y, a, b, lambda].some(Number.isNaN)) return { lower: NaN, upper: NaN };
  if (!(x > 0)) return { lower: 0, upper: 1 };
  if (!(y > 0)) return { lower: 1, upper: 0 };
  if (lambda >= 0) {
    const lower = smallerTail(x, y, a, b, lambda);
    return { lower, upper: 1 - lower };
  }
  const upper = smallerTail(y, x, b, a, -lambda);
  return { lower: 1 - upper, upper };
}

/** Below the smallest double the tail is 0, whatever the fraction would say. */
function smallerTail(x: number, y: number, a: number, b: number, lambda: number): number {
  const prefactor = betaPrefactor(x, y, a, b, lambda);
  return prefactor === 0 ? 0 : prefactor * continuedFraction(x, y, a, b, lambda);
}

/**
 * x^a y^b / B(a, b) for x + y = 1, to the relative accuracy of its exponent. x times the density of the beta
 * distribution is this over y. Source: Loader 2000.
 */
export function betaPrefactor(x: number, y: number, a: number, b: number, lambda = a * y - b * x): number {
  const n = a + b;
  const stirling = Math.exp(stirlingError(n) - stirlingError(a) - stirlingError(b));
  const powers = deviancePower(a, n * x, lambda) * deviancePower(b, n * y, -lambda);
  return Math.sqrt(((a / n) * b) / (2 * Math.PI)) * stirling * powers;
}

/** BFRAC of TOMS 708: the fraction that times the prefactor gives the tail below x. λ = a·y − b·x must be ≥ 0. */
function continuedFraction(x: number, y: number, a: number, b: number, lambda: number): number {
  const c = 1 + lambda;
  const c0 = b / a;
  const c1 = 1 + 1 / a;
  let p = 1;
  let s = a + 1;
  let numerator = 0;
  let denominator = 1;
  let nextNumerator = 1;
  let nextDenominator = c / c1;
  let fraction = c1 / c;
  for (let n = 1; n < MOST_TERMS; n += 1) {
    const t = n / a;
    const e = a / s;
    const alpha = p * (p + c0) * e * e * (n * (b - n) * x) * x;
    const g = (t + 1) / (c1 + t + t);
    const beta = n + (n * (b - n) * x) / s + g * (c + n * (y + 1));
    p = t + 1;
    s += 2;
    const newNumerator = alpha * numerator + beta * nextNumerator;
    const newDenominator = alpha * denominator + beta * nextDenominator;
    const previous = fraction;
    fraction = newNumerator / newDenominator;
    if (Math.abs(fraction - previous) <= CONVERGED * Math.abs(fraction)) return fraction;
    numerator = nextNumerator / newDenominator;
    denominator = nextDenominator / newDenominator;
    nextNumerator = fraction;
    nextDenominator = 1;
  }
  return fraction;
}
