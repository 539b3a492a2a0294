import type { Facts } from '../model/say';
import { curveOf } from './curve';
import type { Pivot } from './judge';

/** Standard error of a difference of two means, its degrees of freedom (null: normal curve), and that of each mean. */
export interface Precision {
  readonly se: number;
  readonly df: number | null;
  /** Variance of each mean under the assumption made: test, reference. */
  readonly meanVariances: readonly [number, number];
  /** Covariance of the two means; 0 unless they are paired. */
  readonly covariance: number;
}

/** The pivot (estimate − value) / se of a difference of means; limits are estimate ∓ quantile · se. */
export function meanPivot(estimate: number, precision: Precision, extra: Facts = {}): Pivot {
  const { se, df, meanVariances, covariance } = precision;
  return {
    estimate,
    se,
    df,
    curve: curveOf(df),
    at: value => (estimate - value) / se,
    lower: quantile => estimate - quantile * se,
    upper: quantile => estimate + quantile * se,
    extra: { meanVariances, covariance, ...extra },
  };
}
