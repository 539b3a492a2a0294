import { differencesOfMeans, weightedSquares, type MeanOf } from './differencesOfMeans';
import { CompensatedSum } from './sums';

/** A group as the analysis of variance takes it: its mean, and its SD where only that is known. */
export type SquaresOf = MeanOf & { readonly sd: number };

/** Sums of squares of a one-way analysis of variance, in squared units of the values, with their degrees of freedom. */
export interface Squares {
  readonly between: number;
  readonly within: number;
  /** Between the groups, within the groups. */
  readonly df: readonly [number, number];
}

/**
 * Between the groups Σ n (m − m̄)², within them Σ (n − 1) s². From decimals as written the differences of means and the
 * squares within each group are exact and rounded once. At least two groups; one value is enough for a group.
 * Source: NIST/SEMATECH e-Handbook of Statistical Methods 7.4.3.
 */
export function oneWaySquares(groups: readonly SquaresOf[]): Squares {
  const within = new CompensatedSum();
  for (const group of groups) within.add(squaresWithin(group));
  const sizes = groups.map(({ n }) => n);
  const all = sizes.reduce((sum, n) => sum + n, 0);
  return {
    between: weightedSquares(sizes, differencesOfMeans(groups)),
    within: within.value,
    df: [groups.length - 1, all - groups.length],
  };
}

function squaresWithin({ n, sd, sample }: SquaresOf): number {
  if (n < 2) return 0;
  return sample === null ? (n - 1) * sd ** 2 : sample.moments().ss;
}

/** The mean square between the groups over that within them. */
export const meanSquaresRatio = ({ between, within, df }: Squares): number =>
  between / df[0] / (within / df[1]);
