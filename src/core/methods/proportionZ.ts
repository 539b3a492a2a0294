import type { Designs } from '../model/groups';
import { method } from '../model/methods';
import type { Reason } from '../model/say';
import { normalCurve } from './curve';
import { judge } from './judge';
import { newcombeLower, newcombeUpper } from './newcombeLimits';
import { fewExpected, noOutcomes, shareDifference, sharesWhy, successOption } from './shares';

/**
 * z with one share pooled from both groups. Its p stands with Newcombe's interval: p and interval come from two methods
 * and may fall on two sides of the line; the decision follows the p.
 */
export const proportionZ = method({
  id: 'proportion-z',
  version: 1,
  design: 'counts',
  measure: 'proportion',
  questions: ['differs', 'higher', 'lower'],
  statistic: 'z',
  needs: 'summary',
  counted: true,
  options: [successOption],
  references: [
    'NIST/SEMATECH e-Handbook of Statistical Methods, 7.3.3',
    'Newcombe 1998, Statistics in Medicine 17:873–890 (the interval)',
    'Cochran 1954, Biometrics 10:417–451 (expected counts)',
  ],
  work: () => 1,
  applies: (data, ask) =>
    noOutcomes(data) ??
    noVariation(data) ??
    (ask.against === 0 ? null : { code: 'against-not-zero', facts: {} }),
  doubts: data => fewExpected(data),
  run: (data, ask) => {
    const estimate = shareDifference(data);
    const se = pooledError(data);
    return judge(
      {
        estimate,
        se,
        df: null,
        curve: normalCurve,
        at: () => estimate / se,
        lower: quantile => newcombeLower(data, quantile),
        upper: quantile => newcombeUpper(data, quantile),
        extra: { interval: 'newcombe' },
      },
      ask,
    );
  },
  title: t => t('pooled share'),
  assumes: t => t('outcomes are independent; p from the pooled share, interval by Newcombe'),
  explains: t =>
    t(
      'The difference of two shares divided by the standard error it would have if both groups had the pooled share, held against the normal curve. The interval beside it is Newcombe’s: p and interval come from two methods and can fall on two sides of the line.',
    ),
  notWhen: t =>
    t(
      'An expected count is below 5, the same units were measured twice, or units hold several outcomes each.',
    ),
  why: sharesWhy,
});

function noVariation({ test, reference }: Designs['counts']): Reason | null {
  const successes = test.x + reference.x;
  return successes === 0 || successes === test.n + reference.n ? { code: 'no-variation', facts: {} } : null;
}

/** √(p̄(1 − p̄)(1/n₁ + 1/n₂)) with p̄ = (x₁ + x₂)/N. */
function pooledError({ test, reference }: Designs['counts']): number {
  const all = test.n + reference.n;
  const successes = test.x + reference.x;
  return Math.sqrt((successes / all) * ((all - successes) / test.n / reference.n));
}
