import type { Designs } from '../model/groups';
import { method } from '../model/methods';
import type { Reason } from '../model/say';
import { judge } from './judge';
import { meanPivot, type Precision } from './meanPivot';
import { allQuestions } from './questions';
import { commonWhy } from './reasons';

type Pairs = Designs['pairs'];

/** t of the differences of complete pairs. */
export const pairedT = method({
  id: 'paired-t',
  version: 1,
  design: 'pairs',
  measure: 'mean',
  questions: allQuestions,
  statistic: 't',
  needs: 'values',
  counted: true,
  options: [],
  references: [
    'Student 1908, Biometrika 6:1–25',
    'ISO 3301:1975, Comparison of two means in the case of paired observations',
    'NIST/SEMATECH e-Handbook of Statistical Methods, 7.3.1.1',
  ],
  work: n => n,
  applies: tooFewOrFlat,
  doubts: () => null,
  run: (data, ask) => judge(meanPivot(data.differences.moments().mean, pairedPrecision(data)), ask),
  title: t => t('pairs'),
  assumes: t => t('each pair was measured under both conditions; the differences scatter alike'),
  explains: t =>
    t(
      'The mean of the differences within pairs divided by its standard error, held against Student’s t on the number of pairs less one. What the two values of a pair share drops out.',
    ),
  notWhen: t => t('The values were matched after the fact, or ids only happen to start again in each group.'),
  why: (reason, t) =>
    reason.code === 'one-pair'
      ? t('{0} complete pair: one difference has no spread', Number(reason.facts['n']))
      : reason.code === 'equal-differences'
        ? t(
            'every pair differs by exactly {0}: a p-value would be meaningless',
            Number(reason.facts['difference']),
          )
        : commonWhy(reason, t),
});

function tooFewOrFlat({ differences }: Pairs): Reason | null {
  if (differences.n < 2) return { code: 'one-pair', facts: { n: differences.n } };
  const { mean, ss } = differences.moments();
  return ss === 0 ? { code: 'equal-differences', facts: { difference: mean } } : null;
}

/** Of the mean difference; the covariance of the two means follows from var(a − b) = var a + var b − 2 cov(a, b). */
function pairedPrecision({ test, reference, differences }: Pairs): Precision {
  const { n } = differences;
  const variance = differences.moments().ss / (n - 1) / n;
  const meanVariances = [test.sd ** 2 / n, reference.sd ** 2 / n] as const;
  const covariance = (meanVariances[0] + meanVariances[1] - variance) / 2;
  return { se: Math.sqrt(variance), df: n - 1, meanVariances, covariance };
}
