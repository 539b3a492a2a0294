import type { GroupNumbers } from '../core/model/comparison';
import type { Group } from '../core/model/groups';
import { quantileSorted } from '../core/numeric/quantile';

/**
 * Standard error of the mean, median, quartiles and range. Without raw values only the standard error; without `sorting`
 * (a long file of which only the chosen row is wanted) the range but no median or quartiles.
 */
export function groupNumbers(group: Group, sorting: boolean): GroupNumbers {
  const se = group.n > 1 ? group.sd / Math.sqrt(group.n) : null;
  const { sample } = group;
  if (sample === null || sample.n === 0)
    return { se, median: null, q1: null, q3: null, min: null, max: null };
  if (!sorting) return { se, median: null, q1: null, q3: null, ...rangeOf(sample.values()) };
  const sorted = sample.sorted();
  return {
    se,
    median: quantileSorted(sorted, 0.5),
    q1: quantileSorted(sorted, 0.25),
    q3: quantileSorted(sorted, 0.75),
    min: sorted[0] ?? null,
    max: sorted[sorted.length - 1] ?? null,
  };
}

function rangeOf(values: Float64Array): { readonly min: number; readonly max: number } {
  let min = Infinity;
  let max = -Infinity;
  for (const value of values) {
    if (value < min) min = value;
    if (value > max) max = value;
  }
  return { min, max };
}
