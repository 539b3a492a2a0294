import type { Group, Sample } from '../model/groups';
import { exactSum } from './exactSums';
import { countOf } from './numbers';
import { quotient } from './quotient';
import { scaleOf } from './steps';

/**
 * Mean of the test group − mean of the reference group, in units of the measured column. Samples in one frame of steps:
 * exact, rounded once. Wide samples of one frame: through their offsets, so that a common shift costs no digit. Summaries:
 * plain subtraction.
 */
export function meanDifference(test: Group, reference: Group): number {
  if (test.sample === null || reference.sample === null) return test.mean - reference.mean;
  return differenceOfSamples(test.sample, reference.sample);
}

function differenceOfSamples(test: Sample, reference: Sample): number {
  const [a, b] = [test.numbers, reference.numbers];
  const sameFrame = a.decimals === b.decimals && BigInt(a.per) === BigInt(b.per) && a.shift === b.shift;
  if (!sameFrame) return test.moments().mean - reference.moments().mean;
  if (a.form === 'wide' || b.form === 'wide') return test.moments().offset - reference.moments().offset;
  const [n1, n2] = [BigInt(countOf(a)), BigInt(countOf(b))];
  if (n1 === 0n || n2 === 0n) return NaN;
  const numerator = exactSum(a.steps) * n2 - exactSum(b.steps) * n1;
  return quotient(numerator, n1 * n2 * scaleOf(a.decimals, a.per));
}
