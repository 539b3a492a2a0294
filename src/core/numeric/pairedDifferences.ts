import type { Sample } from '../model/groups';
import { numbersFromIntegers } from './fromIntegers';
import { alignFrames, countOf, integerAt } from './numbers';
import { makeSample, sampleFromDoubles } from './sample';
import { compactSteps, LARGEST_STEP } from './steps';

/**
 * test − reference for each pair: exact, so that pairs without a difference are exactly 0 and equal differences are ties.
 * @param test values of the test group, one a pair
 * @param reference values of the reference group, in the same order of pairs
 * @returns the differences with the rows of the test values; the shift is 0
 */
export function pairedDifferences(test: Sample, reference: Sample): Sample {
  const [a, b] = alignFrames([test.numbers, reference.numbers]);
  if (a === undefined || b === undefined) return test;
  const { rows } = test;
  if (a.form === 'steps' && b.form === 'steps') {
    const differences = Float64Array.from(a.steps, (step, i) => step - (b.steps[i] ?? 0));
    if (differences.every(difference => Math.abs(difference) < LARGEST_STEP)) {
      return makeSample({ ...a, shift: 0n, steps: compactSteps(differences) }, rows);
    }
  }
  const exact = exactDifferences(a, b);
  if (exact === null) {
    const subtrahends = reference.values();
    return sampleFromDoubles(
      test.values().map((value, i) => value - (subtrahends[i] ?? 0)),
      rows,
    );
  }
  const [numbers = a] = numbersFromIntegers([exact], { decimals: a.decimals, per: BigInt(a.per), shift: 0n });
  return makeSample(numbers, rows);
}

function exactDifferences(a: Sample['numbers'], b: Sample['numbers']): bigint[] | null {
  const differences: bigint[] = [];
  for (let i = 0; i < countOf(a); i++) {
    const [left, right] = [integerAt(a, i), integerAt(b, i)];
    if (left === null || right === null) return null;
    differences.push(left - right);
  }
  return differences;
}
