import type { Group, Sample } from '../model/groups';
import { exactSumOfOffsets } from './exactSums';
import { countOf } from './numbers';
import { quotient } from './quotient';
import { scaleOf } from './steps';

/**
 * Mean of the test group − mean of the reference group, in units of the measured column. Samples in one frame: exact,
 * rounded once. Summaries and computed doubles: plain subtraction.
 */
export function meanDifference(
  test: Pick<Group, 'mean' | 'sample'>,
  reference: Pick<Group, 'mean' | 'sample'>,
): number {
  if (test.sample === null || reference.sample === null) return test.mean - reference.mean;
  return differenceOfSamples(test.sample, reference.sample);
}

function differenceOfSamples(test: Sample, reference: Sample): number {
  const [a, b] = [test.numbers, reference.numbers];
  const sameFrame = a.decimals === b.decimals && BigInt(a.per) === BigInt(b.per) && a.shift === b.shift;
  if (!sameFrame) return test.moments().mean - reference.moments().mean;
  const [n1, n2] = [BigInt(countOf(a)), BigInt(countOf(b))];
  const [sum1, sum2] = [exactSumOfOffsets(a), exactSumOfOffsets(b)];
  if (n1 === 0n || n2 === 0n) return NaN;
  if (sum1 === null || sum2 === null) return test.moments().offset - reference.moments().offset;
  return quotient(sum1 * n2 - sum2 * n1, n1 * n2 * scaleOf(a.decimals, a.per));
}
