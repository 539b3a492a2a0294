import type { Designs } from '../model/groups';
import type { OptionSpec } from '../model/methods';
import type { Reason, Say } from '../model/say';
import { commonWhy } from './reasons';

type Counts = Designs['counts'];

/** Below this expected count the normal approximation is not relied on. Source: Cochran 1954, Biometrics 10:417–451. */
const LEAST_EXPECTED = 5;

export const successOption: OptionSpec = {
  key: 'success',
  flag: 'success',
  kind: 'text',
  default: null,
  says: t => t('the outcome that is counted, as written in the measured column'),
};

/** x₁/n₁ − x₂/n₂, rounded once where the products are whole numbers below 2⁵³. */
export function shareDifference({ test, reference }: Counts): number {
  return (test.x * reference.n - reference.x * test.n) / (test.n * reference.n);
}

/** A group without a single outcome has no share. */
export function noOutcomes({ test, reference }: Counts): Reason | null {
  const empty = [test, reference].find(count => count.n < 1);
  return empty === undefined ? null : { code: 'no-outcomes', facts: { label: empty.label } };
}

/** The smallest expected count (row total times column total over N) when it is too small for a normal approximation. */
export function fewExpected({ test, reference }: Counts): Reason | null {
  const all = test.n + reference.n;
  const successes = test.x + reference.x;
  const expected = (Math.min(test.n, reference.n) * Math.min(successes, all - successes)) / all;
  return expected < LEAST_EXPECTED
    ? { code: 'few-expected', facts: { expected, least: LEAST_EXPECTED } }
    : null;
}

export function sharesWhy(reason: Reason, t: Say): string {
  switch (reason.code) {
    case 'no-outcomes':
      return t('{0} has no outcome', String(reason.facts['label']));
    case 'few-expected':
      return t(
        'an expected count is below {0}, so the normal approximation is not relied on',
        Number(reason.facts['least']),
      );
    case 'no-variation':
      return t('every outcome is the same: the pooled share has no spread');
    case 'against-not-zero':
      return t('the pooled share is only right for a hypothesised difference of 0');
    default:
      return commonWhy(reason, t);
  }
}
