import type { Designs } from '../core/model/groups';

/**
 * Pearson's correlation of the two values of each pair, from the sums of squares of both and of their differences; null
 * where one of them does not scatter.
 */
export function pairCorrelation({ test, reference, differences }: Designs['pairs']): number | null {
  const own = test.sample?.moments().ss ?? 0;
  const other = reference.sample?.moments().ss ?? 0;
  if (!(own > 0) || !(other > 0)) return null;
  const root = Math.sqrt(own) * Math.sqrt(other);
  return Math.max(-1, Math.min(1, (own + other - differences.moments().ss) / (2 * root)));
}
