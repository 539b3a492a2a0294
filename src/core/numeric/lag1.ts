import type { Sample } from '../model/groups';
import { exactProducts, exactSum } from './exactSums';
import { quotient } from './quotient';
import { CompensatedSum } from './sums';

/**
 * Lag-1 autocorrelation: Σ (y[i] − m)(y[i+1] − m) / Σ (y[i] − m)², m the mean, in the order of the sample (NIST/SEMATECH
 * e-Handbook of Statistical Methods, 1.3.5.12). NaN when all values are equal or there are fewer than two.
 */
export function lag1(sample: Sample): number {
  const { numbers, n } = sample;
  if (n < 2) return NaN;
  if (numbers.form === 'steps') return lag1OfSteps(numbers.steps);
  const { offset, ss } = sample.moments();
  const { offsets } = numbers;
  const products = new CompensatedSum();
  for (let i = 0; i + 1 < n; i++)
    products.add(((offsets[i] ?? 0) - offset) * ((offsets[i + 1] ?? 0) - offset));
  return ss === 0 ? NaN : products.value / ss;
}

/** Both sums times n², as exact integers. */
function lag1OfSteps(steps: Int32Array | Float64Array): number {
  const n = BigInt(steps.length);
  const sum = exactSum(steps);
  const ends = BigInt(steps[0] ?? 0) + BigInt(steps[steps.length - 1] ?? 0);
  const numerator = n * n * exactProducts(steps, 1) - n * sum * (2n * sum - ends) + (n - 1n) * sum * sum;
  const denominator = n * (n * exactProducts(steps) - sum * sum);
  return denominator === 0n ? NaN : quotient(numerator, denominator);
}
