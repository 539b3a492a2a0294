import { deviancePower } from './deviance';
import type { Tails } from './incompleteBeta';
import { rootOfLogTail } from './rootOfLogTail';
import { chiSquareStart } from './startingValue';
import { stirlingError } from './stirlingError';

const MOST_TERMS = 100_000;
const CONVERGED = 1e-16;

/** P(X ≥ x) for x ≥ 0 and real df > 0. */
export const chiSquareUpperTail = (x: number, df: number): number => incompleteGamma(df / 2, x / 2).upper;

/** P(X ≤ x). */
export const chiSquareLowerTail = (x: number, df: number): number => incompleteGamma(df / 2, x / 2).lower;

/** x with P(X ≥ x) = p, for p in (0, 1). */
export function chiSquareUpperQuantile(p: number, df: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? Infinity : p === 1 ? 0 : NaN;
  const start = chiSquareStart(1 - p, df);
  const density = (x: number): number => gammaPrefactor(df / 2, x / 2) / x;
  if (p <= 0.5) return rootOfLogTail(start, p, x => chiSquareUpperTail(x, df), density);
  return chiSquareLowerQuantile(1 - p, df);
}

/** x with P(X ≤ x) = p, for p in (0, 1). */
export function chiSquareLowerQuantile(p: number, df: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? 0 : p === 1 ? Infinity : NaN;
  if (p > 0.5) return chiSquareUpperQuantile(1 - p, df);
  // The lower tail falls with 1/x, so its root is sought there.
  const inverse = rootOfLogTail(
    1 / chiSquareStart(p, df),
    p,
    y => chiSquareLowerTail(1 / y, df),
    y => gammaPrefactor(df / 2, 0.5 / y) / y,
  );
  return 1 / inverse;
}

/**
 * Regularised incomplete gamma functions P(a, x) and Q(a, x), a > 0, x ≥ 0. Source: series DLMF 8.7.1 below a + 1,
 * continued fraction DLMF 8.9.2 above, prefactor in the saddle-point form of Loader 2000.
 */
function incompleteGamma(a: number, x: number): Tails {
  if (!(x > 0)) return { lower: 0, upper: 1 };
  if (x === Infinity) return { lower: 1, upper: 0 };
  if (x < a + 1) {
    const lower = gammaPrefactor(a, x) * lowerSeries(a, x);
    return { lower, upper: 1 - lower };
  }
  const upper = gammaPrefactor(a, x) * upperFraction(a, x);
  return { lower: 1 - upper, upper };
}

/** x^a e^−x / Γ(a). */
function gammaPrefactor(a: number, x: number): number {
  return Math.sqrt(a / (2 * Math.PI)) * Math.exp(-stirlingError(a)) * deviancePower(a, x, a - x);
}

function lowerSeries(a: number, x: number): number {
  let sum = 1 / a;
  let term = sum;
  for (let n = 1; n < MOST_TERMS && term > sum * 1e-17; n += 1) {
    term *= x / (a + n);
    sum += term;
  }
  return sum;
}

/** Modified Lentz evaluation. */
function upperFraction(a: number, x: number): number {
  let b = x + 1 - a;
  let c = 1e300;
  let d = 1 / b;
  let fraction = d;
  for (let n = 1; n < MOST_TERMS; n += 1) {
    const numerator = -n * (n - a);
    b += 2;
    d = 1 / (numerator * d + b);
    c = b + numerator / c;
    const factor = c * d;
    fraction *= factor;
    if (Math.abs(factor - 1) < CONVERGED) break;
  }
  return fraction;
}
