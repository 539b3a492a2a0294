import { method } from '../model/methods';
import { meanDifference } from '../numeric/meanDifference';
import { judge } from './judge';
import { meanPivot } from './meanPivot';
import { pooledPrecision } from './precision';
import { allQuestions } from './questions';
import { commonWhy, spreadMissing } from './reasons';

/** t with one SD for both groups. */
export const pooledT = method({
  id: 'pooled-t',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: allQuestions,
  statistic: 't',
  needs: 'summary',
  counted: true,
  options: [],
  references: [
    'Student 1908, Biometrika 6:1–25',
    'NIST/SEMATECH e-Handbook of Statistical Methods, 7.3.1 and 1.3.5.3',
    'ISO 2854:1976, Statistical interpretation of data: techniques of estimation and tests relating to means and variances',
    'Moser & Stevens 1992, The American Statistician 46:19–21',
  ],
  work: n => n,
  applies: data => spreadMissing(data),
  doubts: ({ test, reference }) => {
    const constant = [test, reference].find(group => group.sd === 0);
    return constant === undefined ? null : { code: 'one-constant-group', facts: { label: constant.label } };
  },
  run: ({ test, reference }, ask) =>
    judge(meanPivot(meanDifference(test, reference), pooledPrecision(test, reference)), ask),
  title: t => t('pooled'),
  assumes: t => t('both groups scatter alike'),
  explains: t =>
    t(
      'The difference of the two means divided by its standard error, with one SD pooled from both groups, held against Student’s t on n₁ + n₂ − 2 degrees of freedom.',
    ),
  notWhen: t =>
    t(
      'The SDs differ and the groups are of unequal size: with the smaller group the more variable, false alarms at a nominal 5% can pass 20%. A test of the variances cannot be trusted to warn of it.',
    ),
  why: (reason, t) =>
    reason.code === 'one-constant-group'
      ? t(
          '{0} does not scatter at all, so the groups cannot be taken to scatter alike',
          String(reason.facts['label']),
        )
      : commonWhy(reason, t),
});
