import type { Numbers } from '../model/cells';
import type { Moments } from '../model/groups';
import { exactProducts, exactSumOfOffsets } from './exactSums';
import { countOf } from './numbers';
import { quotient } from './quotient';
import { scaleOf } from './steps';
import { CompensatedSum, compensatedSum } from './sums';

/**
 * Mean, mean − shift, and the sum of squares about the mean, in units of the values. The means come from exact integer
 * sums and are rounded once; so is the sum of squares of steps. That of wide numbers is taken over their offsets with
 * compensated sums, corrected for the rounding of the mean (Chan, Golub & LeVeque 1983, Am. Stat. 37: 242–247, the
 * corrected two-pass algorithm), and so are all sums of computed doubles.
 * @param numbers at least one value; an empty list gives NaN
 */
export function momentsOf(numbers: Numbers): Moments {
  const n = countOf(numbers);
  const sum = exactSumOfOffsets(numbers);
  if (n === 0) return { mean: NaN, offset: NaN, ss: NaN };
  if (numbers.form === 'wide' && sum === null) return momentsOfDoubles(numbers.offsets);
  const count = BigInt(n);
  const scale = scaleOf(numbers.decimals, numbers.per);
  const total = sum ?? 0n;
  const offset = quotient(total, count * scale);
  const mean = quotient(numbers.shift * count + total, count * scale);
  if (numbers.form === 'wide') return { mean, offset, ss: squaresAbout(numbers.offsets, offset) };
  const squares = exactProducts(numbers.steps);
  return { mean, offset, ss: quotient(count * squares - total * total, count * scale * scale) };
}

function momentsOfDoubles(values: Float64Array): Moments {
  const mean = compensatedSum(values) / values.length;
  return { mean, offset: mean, ss: squaresAbout(values, mean) };
}

function squaresAbout(values: Float64Array, mean: number): number {
  const squares = new CompensatedSum();
  const rest = new CompensatedSum();
  for (const value of values) {
    const deviation = value - mean;
    squares.add(deviation * deviation);
    rest.add(deviation);
  }
  return squares.value - (rest.value * rest.value) / values.length;
}
