import type { Tails } from './incompleteBeta';

/** Tables whose probability is at most this factor above the observed one count as no more likely: equal probabilities differ by rounding. */
const TIE = 1 + 1e-7;

/** Tails that both include the observed count, and the sum of all counts that are no more likely. */
export interface HypergeometricTails extends Tails {
  readonly twoSided: number;
}

/**
 * Tails of the hypergeometric distribution at k: k marked of n drawn without return from N of which K are marked. By ratio
 * recurrence outwards from the mode and sums from small to large: whole numbers, no gamma functions. Source: Fisher 1935.
 */
export function hypergeometricTails(k: number, N: number, K: number, n: number): HypergeometricTails {
  const low = Math.max(0, n + K - N);
  const high = Math.min(n, K);
  const weights = weightsFromMode(low, high, N, K, n);
  const total = sumInwards(weights, 0, high - low);
  const at = k - low;
  if (at < 0) return { lower: 0, upper: 1, twoSided: 0 };
  if (at > high - low) return { lower: 1, upper: 0, twoSided: 0 };
  return {
    lower: sumInwards(weights, 0, at) / total,
    upper: sumInwards(weights, at, high - low) / total,
    twoSided: Math.min(1, sumBelow(weights, (weights[at] ?? 0) * TIE) / total),
  };
}

function weightsFromMode(low: number, high: number, N: number, K: number, n: number): Float64Array {
  const mode = Math.max(low, Math.min(high, Math.floor(((n + 1) * (K + 1)) / (N + 2))));
  const weights = new Float64Array(high - low + 1);
  weights[mode - low] = 1;
  for (let i = mode; i < high; i += 1) {
    const ratio = ((K - i) * (n - i)) / ((i + 1) * (N - K - n + i + 1));
    weights[i + 1 - low] = (weights[i - low] ?? 0) * ratio;
  }
  for (let i = mode; i > low; i -= 1) {
    const ratio = (i * (N - K - n + i)) / ((K - i + 1) * (n - i + 1));
    weights[i - 1 - low] = (weights[i - low] ?? 0) * ratio;
  }
  return weights;
}

/** Sum of a unimodal run, the smaller end first. */
function sumInwards(weights: Float64Array, first: number, last: number): number {
  let sum = 0;
  let [left, right] = [first, last];
  while (left <= right) {
    const [a, b] = [weights[left] ?? 0, weights[right] ?? 0];
    sum += Math.min(a, b);
    if (a <= b) left += 1;
    else right -= 1;
  }
  return sum;
}

/** Sum of the weights of both ends that do not exceed a limit. */
function sumBelow(weights: Float64Array, limit: number): number {
  let left = 0;
  let right = weights.length - 1;
  while (left < weights.length && (weights[left] ?? 0) <= limit) left += 1;
  if (left === weights.length) return sumInwards(weights, 0, right);
  while ((weights[right] ?? 0) <= limit) right -= 1;
  return sumInwards(weights, 0, left - 1) + sumInwards(weights, right + 1, weights.length - 1);
}
