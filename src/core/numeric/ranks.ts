import type { Numbers } from '../model/cells';
import { keysOf } from './numbers';

export interface Ranks {
  /** Rank of each value from 1; tied values get the mean of the ranks they take. */
  readonly ranks: Float64Array;
  /** How many values share each tie of two or more, ascending by value. */
  readonly tieSizes: readonly number[];
}

/** Mid-ranks; ties are decided on the exact decimals. */
export const midRanks = (numbers: Numbers): Ranks => midRanksOf([keysOf(numbers)]);

/**
 * Mid-ranks over several lists of one frame taken together, in the order of the lists.
 * @param lists keys that order the values and are equal exactly where those are (`keysOf`)
 */
export function midRanksOf(lists: readonly ArrayLike<number>[]): Ranks {
  const keys = new Float64Array(lists.reduce((total, list) => total + list.length, 0));
  let filled = 0;
  for (const list of lists) {
    keys.set(list, filled);
    filled += list.length;
  }
  const sorted = keys.slice().sort();
  const ranks = new Float64Array(keys.length);
  for (let i = 0; i < keys.length; i++) {
    const key = keys[i] ?? 0;
    ranks[i] = (countBelow(sorted, key, false) + countBelow(sorted, key, true) + 1) / 2;
  }
  return { ranks, tieSizes: tieSizesOf(sorted) };
}

/** How many of the ascending values are below the key, or up to it. */
function countBelow(sorted: Float64Array, key: number, included: boolean): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    const value = sorted[middle] ?? 0;
    if (value < key || (included && value === key)) low = middle + 1;
    else high = middle;
  }
  return low;
}

function tieSizesOf(sorted: Float64Array): readonly number[] {
  const sizes: number[] = [];
  let start = 0;
  for (let i = 1; i <= sorted.length; i++) {
    if (i < sorted.length && sorted[i] === sorted[start]) continue;
    if (i - start > 1) sizes.push(i - start);
    start = i;
  }
  return sizes;
}
