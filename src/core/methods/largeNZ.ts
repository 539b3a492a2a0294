import { method } from '../model/methods';
import { meanDifference } from '../numeric/meanDifference';
import { judge } from './judge';
import { meanPivot } from './meanPivot';
import { separatePrecision } from './precision';
import { allQuestions } from './questions';
import { commonWhy, spreadMissing } from './reasons';

/** Both groups must have more values than this for the normal curve (a textbook rule; common practice, no source). */
export const LARGE_N = 30;

/** The separate-variance statistic held against the normal curve. */
export const largeNZ = method({
  id: 'large-n-z',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: allQuestions,
  statistic: 'z',
  needs: 'summary',
  counted: true,
  options: [],
  references: ['Brownlee, Industrial Experimentation, HMSO', 'ISO 2854:1976'],
  work: n => n,
  applies: data => spreadMissing(data),
  doubts: ({ test, reference }) => {
    const small = [test, reference].find(group => group.n <= LARGE_N);
    return small === undefined
      ? null
      : { code: 'too-few-for-normal', facts: { label: small.label, n: small.n } };
  },
  run: ({ test, reference }, ask) =>
    judge(
      meanPivot(meanDifference(test, reference), { ...separatePrecision(test, reference), df: null }),
      ask,
    ),
  title: t => t('normal curve'),
  assumes: t => t('the SDs are as good as known, because both groups are large'),
  explains: t =>
    t(
      'The difference of the two means divided by its standard error, each group with its own SD, held against the normal curve as if those SDs were known.',
    ),
  notWhen: t =>
    t(
      '30 or fewer values in a group: false alarms at a nominal 5% reach 8.6% at 5 and 5, 6.5% at 10 and 10 (simulated).',
    ),
  why: (reason, t) =>
    reason.code === 'too-few-for-normal'
      ? t(
          'normal curve, {0} values in {1} are too few',
          Number(reason.facts['n']),
          String(reason.facts['label']),
        )
      : commonWhy(reason, t),
});
