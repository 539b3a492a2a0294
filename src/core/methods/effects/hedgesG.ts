import type { Summary } from '../../model/groups';
import { pooledSd } from '../precision';
import { smallSampleFactor } from './smallSampleFactor';

/**
 * Hedges' g: the difference in pooled SDs, with the exact small-sample factor applied. null where the pooled SD is 0 or
 * has fewer than 2 degrees of freedom. Source: Hedges 1981, Journal of Educational Statistics 6:107–128.
 */
export function hedgesG(test: Summary, reference: Summary, difference: number): number | null {
  const g = (smallSampleFactor(test.n + reference.n - 2) * difference) / pooledSd(test, reference);
  return Number.isFinite(g) ? g : null;
}
