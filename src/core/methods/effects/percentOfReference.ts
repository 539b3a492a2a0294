import type { MethodResult } from '../../model/methods';
import { alphaOf } from '../confidence';
import { curveOf } from '../curve';

/** A percent of the reference mean with its limits; null: open end, or no finite interval (reference mean near 0). */
interface Percent {
  readonly value: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/**
 * 100·difference/reference mean with Fieller's limits for the ratio of two means, formed with the variances of the means,
 * the curve and the confidence of the given row, so that it excludes 0 exactly when that row's interval does (against 0).
 * With v₁, v₂ the variances of the means, c their covariance, q the quantile and g = q²v₂/m₂²:
 *   R + (−g·c/v₂ ± (q/m₂)·√(v₁ − 2Rc + R²v₂ − g(v₁ − c²/v₂))) after division by 1 − g; for g ≥ 1 no finite interval.
 * null when the reference mean is not above 0 (or so near it that the percent overflows) or the row carries no variances. Means in units of the measured column.
 * Source: Fieller 1954, Journal of the Royal Statistical Society B 16:175–185.
 */
export function percentOfReference(
  difference: number,
  referenceMean: number,
  row: MethodResult,
): Percent | null {
  const [testVariance, referenceVariance] = variancesOf(row);
  if (!(referenceMean > 0) || testVariance === undefined || referenceVariance === undefined) return null;
  const value = (100 * difference) / referenceMean;
  if (!Number.isFinite(value)) return null;
  const quantile = quantileOf(row);
  const covariance = Number(row.extra?.['covariance'] ?? 0);
  const g = (quantile / referenceMean) ** 2 * referenceVariance;
  if (quantile === 0 || g >= 1) return { value, lower: null, upper: null };

  const change = difference / referenceMean;
  const ratio = 1 + change;
  const shift = (quantile / referenceMean) ** 2 * covariance;
  const product = testVariance * referenceVariance - covariance ** 2;
  const spread =
    testVariance -
    2 * ratio * covariance +
    ratio ** 2 * referenceVariance -
    (quantile / referenceMean) ** 2 * Math.max(0, product);
  const reach = (quantile / referenceMean) * Math.sqrt(Math.max(0, spread));
  const limit = (sign: -1 | 1): number => (100 * (change + g - shift + sign * reach)) / (1 - g);
  return {
    value,
    lower: row.lower === null ? null : limit(-1),
    upper: row.upper === null ? null : limit(1),
  };
}

function variancesOf(row: MethodResult): readonly (number | undefined)[] {
  const variances = row.extra?.['meanVariances'];
  return Array.isArray(variances) ? variances.map(Number) : [];
}

/** The quantile behind the row's interval or bound. */
function quantileOf(row: MethodResult): number {
  const alpha = alphaOf(row.confidence);
  const ends = Number(row.lower !== null) + Number(row.upper !== null);
  if (ends === 0) return 0;
  return curveOf(typeof row.df === 'number' ? row.df : null).upperQuantile(alpha / ends);
}
