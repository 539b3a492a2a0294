import { method } from '../model/methods';
import { meanDifference } from '../numeric/meanDifference';
import { judge } from './judge';
import { meanPivot } from './meanPivot';
import { separatePrecision } from './precision';
import { allQuestions } from './questions';
import { commonWhy, spreadMissing } from './reasons';

/** t with each group's own SD and real degrees of freedom: the default for two means. */
export const separateT = method({
  id: 'separate-t',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: allQuestions,
  statistic: 't',
  needs: 'summary',
  counted: true,
  options: [],
  references: [
    'Welch 1938, Biometrika 29:350–362',
    'Satterthwaite 1946, Biometrics Bulletin 2:110–114',
    'Welch 1947, Biometrika 34:28–35',
    'NIST/SEMATECH e-Handbook of Statistical Methods, 7.3.1',
    'Delacre, Lakens & Leys 2017, International Review of Social Psychology 30:92–101',
  ],
  work: n => n,
  applies: data => spreadMissing(data),
  doubts: () => null,
  run: ({ test, reference }, ask) =>
    judge(meanPivot(meanDifference(test, reference), separatePrecision(test, reference)), ask),
  title: t => t('separate'),
  assumes: t => t('each group may scatter its own way'),
  explains: t =>
    t(
      'The difference of the two means divided by its standard error, each group with its own SD, held against Student’s t. The degrees of freedom are a real number between the smaller group’s and the sum of both; they are never rounded.',
    ),
  notWhen: t =>
    t(
      'Fewer than 4 values in a group, or markedly skewed values in groups of very unequal size: the level is then not held.',
    ),
  why: commonWhy,
});
