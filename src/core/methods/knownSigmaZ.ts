import { method, type OptionSpec } from '../model/methods';
import type { OptionValue } from '../model/settings';
import { meanDifference } from '../numeric/meanDifference';
import { judge } from './judge';
import { meanPivot, type Precision } from './meanPivot';
import { allQuestions } from './questions';
import { commonWhy } from './reasons';

const sigmaOption: OptionSpec = {
  key: 'sigma',
  flag: 'sigma',
  kind: 'numbers',
  default: null,
  min: 0,
  says: t => t('known standard deviations of single values, from long experience: test,reference'),
};

/** z with standard deviations known beforehand; the only method for means that one value a group is enough for. */
export const knownSigmaZ = method({
  id: 'known-sigma-z',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: allQuestions,
  statistic: 'z',
  needs: 'summary',
  counted: true,
  options: [sigmaOption],
  references: ['ISO 2854:1976, comparison of two means, variances known'],
  work: n => n,
  applies: (_, ask) => (sigmasOf(ask.option('sigma')) === null ? { code: 'sigma-absent', facts: {} } : null),
  doubts: () => null,
  run: ({ test, reference }, ask) => {
    const sigmas = sigmasOf(ask.option('sigma'));
    if (sigmas === null) throw new RangeError('known-sigma-z was run without two known standard deviations');
    return judge(
      meanPivot(meanDifference(test, reference), knownPrecision(test.n, reference.n, sigmas)),
      ask,
    );
  },
  title: t => t('known SDs'),
  assumes: t => t('the SDs are known from long experience, not from these values'),
  explains: t =>
    t(
      'The difference of the two means divided by its standard error, formed from standard deviations stated beforehand, held against the normal curve.',
    ),
  notWhen: t => t('The stated SDs were computed from these values, or these values contradict them.'),
  why: (reason, t) => (reason.code === 'sigma-absent' ? t('no known SDs were stated') : commonWhy(reason, t)),
});

function knownPrecision(
  nTest: number,
  nReference: number,
  [test, reference]: readonly [number, number],
): Precision {
  const seTest = test / Math.sqrt(nTest);
  const seReference = reference / Math.sqrt(nReference);
  return {
    se: Math.hypot(seTest, seReference),
    df: null,
    meanVariances: [seTest ** 2, seReference ** 2],
    covariance: 0,
  };
}

function sigmasOf(value: OptionValue | null): readonly [number, number] | null {
  if (typeof value !== 'object' || value === null) return null;
  const [test, reference] = value;
  return test === undefined || reference === undefined ? null : [test, reference];
}
