import type { Ticker } from '../model/problem';
import type { Ways } from './ways';

const TICK = 1 << 16;

/**
 * Counts the sums of ± every value against the sum as it is. `values` are whole numbers whose sizes add up to less than
 * 2⁵³, so every sum is exact. Each step changes one sign (Gray code), so 2ⁿ steps are all it takes; n at most 30.
 * Source of the order: Knuth 2011, The Art of Computer Programming 4A, 7.2.1.1.
 */
export function flippedSums(values: Float64Array, tick: Ticker): Ways {
  const n = values.length;
  const ways = 2 ** n;
  const met = values.reduce((sum, value) => sum + value, 0);
  const far = Math.abs(met);
  const signed = values.slice();
  let sum = met;
  let [atLeast, atMost, asFar] = [0, 0, 0];
  for (let way = 1; ; way++) {
    if (sum >= met) atLeast++;
    if (sum <= met) atMost++;
    if (Math.abs(sum) >= far) asFar++;
    if (way === ways) return { ways, atLeast, atMost, asFar };
    if (way % TICK === 0) tick(way, ways);
    const flipped = 31 - Math.clz32(way & -way);
    const value = signed[flipped] ?? 0;
    sum -= 2 * value;
    signed[flipped] = -value;
  }
}
