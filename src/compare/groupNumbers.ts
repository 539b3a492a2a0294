import type { Numbers } from '../core/model/cells';
import type { GroupNumbers } from '../core/model/comparison';
import type { Group } from '../core/model/groups';
import { keysOf, valueAt } from '../core/numeric/numbers';
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
  if (!sorting) return { se, median: null, q1: null, q3: null, ...rangeOf(sample.numbers) };
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

/** Found on the exact order of the values, so that only two of them need to become doubles. */
function rangeOf(numbers: Numbers): { readonly min: number; readonly max: number } {
  const keys = keysOf(numbers);
  let lowest = 0;
  let highest = 0;
  for (let i = 1; i < keys.length; i += 1) {
    const key = keys[i] ?? 0;
    if (key < (keys[lowest] ?? 0)) lowest = i;
    else if (key > (keys[highest] ?? 0)) highest = i;
  }
  return { min: valueAt(numbers, lowest), max: valueAt(numbers, highest) };
}
