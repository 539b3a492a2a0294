import { incompleteBeta, type Tails } from './incompleteBeta';

/** P(X ≤ k) and P(X ≥ k) for X successes of n at probability p, both including k. Source: DLMF 8.17.5 by incompleteBeta. */
export function binomialTails(k: number, n: number, p: number): Tails {
  return {
    lower: k >= n ? 1 : k < 0 ? 0 : incompleteBeta(p, 1 - p, k + 1, n - k).upper,
    upper: k <= 0 ? 1 : k > n ? 0 : incompleteBeta(p, 1 - p, k, n - k + 1).lower,
  };
}
