import { alphaOf } from '../../core/methods/confidence';
import { curveOf } from '../../core/methods/curve';
import type { Comparison } from '../../core/model/comparison';
import type { IntervalShown } from './figureShown';

/**
 * The mean of one group with the interval of its own SD, mean ∓ t(1 − α/2; n − 1)·SD/√n, whatever the comparison assumes.
 * A group of one value or of equal values has none, nor has a share. Source: NIST/SEMATECH e-Handbook 1.3.5.2.
 */
export function meanInterval(
  { n, mean, se, count }: Comparison['groups'][number],
  confidence: number,
): IntervalShown {
  if (count !== null || se === null || n < 2 || !(se > 0))
    return { estimate: mean, lower: null, upper: null };
  const reach = curveOf(n - 1).upperQuantile(alphaOf(confidence) / 2) * se;
  return { estimate: mean, lower: mean - reach, upper: mean + reach };
}
