import type { Numbers } from '../model/cells';
import type { Moments } from '../model/groups';
import { exactProducts, exactSum } from './exactSums';
import { countOf, shiftedBack } from './numbers';
import { quotient } from './quotient';
import { scaleOf } from './steps';
import { CompensatedSum } from './sums';

/**
 * Mean, mean − shift, and the sum of squares about the mean, in units of the values. Steps: from exact integer sums, each
 * result rounded once. Wide numbers: two passes over the offsets with compensated sums, the second corrected for the
 * rounding of the mean (Chan, Golub & LeVeque 1983, Am. Stat. 37: 242–247, the corrected two-pass algorithm).
 * @param numbers at least one value; an empty list gives NaN
 */
export function momentsOf(numbers: Numbers): Moments {
  const n = countOf(numbers);
  if (n === 0) return { mean: NaN, offset: NaN, ss: NaN };
  if (numbers.form === 'wide') return momentsOfOffsets(numbers, numbers.offsets);
  const count = BigInt(n);
  const scale = scaleOf(numbers.decimals, numbers.per);
  const sum = exactSum(numbers.steps);
  const squares = exactProducts(numbers.steps);
  return {
    mean: quotient(numbers.shift * count + sum, count * scale),
    offset: quotient(sum, count * scale),
    ss: quotient(count * squares - sum * sum, count * scale * scale),
  };
}

function momentsOfOffsets(numbers: Numbers, offsets: Float64Array): Moments {
  const n = offsets.length;
  const sum = new CompensatedSum();
  for (const offset of offsets) sum.add(offset);
  const offset = sum.value / n;
  const squares = new CompensatedSum();
  const rest = new CompensatedSum();
  for (const value of offsets) {
    const deviation = value - offset;
    squares.add(deviation * deviation);
    rest.add(deviation);
  }
  return { mean: shiftedBack(numbers, offset), offset, ss: squares.value - (rest.value * rest.value) / n };
}
