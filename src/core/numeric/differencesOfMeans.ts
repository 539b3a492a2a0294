import type { Group } from '../model/groups';
import { exactSumOfOffsets } from './exactSums';
import { meanDifference } from './meanDifference';
import { quotient } from './quotient';
import { scaleOf } from './steps';

/** What the mean of a group is formed from. */
export type MeanOf = Pick<Group, 'n' | 'mean' | 'sample'>;

/** Mean of group i − mean of group j, by their places in the list; for decimals as written exact and rounded once. */
export type MeanDifferences = (i: number, j: number) => number;

/** The differences between the means of several groups, each group's sum formed once. */
export function differencesOfMeans(groups: readonly MeanOf[]): MeanDifferences {
  const means = groups.map(exactMean);
  return (i, j) => {
    const [a, b] = [groups[i], groups[j]];
    if (a === undefined || b === undefined) throw new RangeError(`no groups ${i} and ${j}`);
    const [exactA, exactB] = [means[i] ?? null, means[j] ?? null];
    if (exactA === null || exactB === null) return meanDifference(a, b);
    return quotient(exactA.over * exactB.under - exactB.over * exactA.under, exactA.under * exactB.under);
  };
}

interface Fraction {
  readonly over: bigint;
  readonly under: bigint;
}

function exactMean({ n, sample }: MeanOf): Fraction | null {
  const sum = sample === null ? null : exactSumOfOffsets(sample.numbers);
  if (sample === null || sum === null || n === 0) return null;
  const { decimals, per, shift } = sample.numbers;
  return { over: shift * BigInt(n) + sum, under: BigInt(n) * scaleOf(decimals, per) };
}

/**
 * Σ w (m − m̄)² about the mean m̄ weighted with w, formed as Σ w·w′ (m − m′)² / Σ w over all pairs (Lagrange’s identity): a
 * sum of squares that each keep their digits, with nothing taken off again.
 */
export function weightedSquares(weights: readonly number[], difference: MeanDifferences): number {
  const all = weights.reduce((sum, weight) => sum + weight, 0);
  let squares = 0;
  for (let i = 1; i < weights.length; i += 1) {
    for (let j = 0; j < i; j += 1) {
      squares += ((weights[i] ?? 0) / all) * (weights[j] ?? 0) * difference(i, j) ** 2;
    }
  }
  return squares;
}
