import { method } from '../model/methods';
import { meanDifference } from '../numeric/meanDifference';
import { judge } from './judge';
import { meanPivot } from './meanPivot';
import { separatePrecision } from './precision';
import { allQuestions } from './questions';
import { commonWhy, spreadMissing } from './reasons';

/** The separate-variance t held against the t of the smaller group: a bound that hand calculation can follow. */
export const conservativeT = method({
  id: 'conservative-t',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: allQuestions,
  statistic: 't',
  needs: 'summary',
  counted: false,
  options: [],
  references: [
    'Hsu 1938, Statistical Research Memoirs 2:1–24',
    'Mickey & Brown 1966, Annals of Mathematical Statistics 37:639–642',
    'Moore & McCabe, Introduction to the Practice of Statistics, two-sample t procedures',
  ],
  work: n => n,
  applies: data => spreadMissing(data),
  doubts: () => ({ code: 'bound', facts: {} }),
  run: ({ test, reference }, ask) => {
    const precision = { ...separatePrecision(test, reference), df: Math.min(test.n, reference.n) - 1 };
    return judge(meanPivot(meanDifference(test, reference), precision), ask);
  },
  title: t => t('smaller df'),
  assumes: t => t('each group may scatter its own way, to the safe side'),
  explains: t =>
    t(
      'The separate-variance t, held against Student’s t on the degrees of freedom of the smaller group (its n − 1). It can only say less than the separate-variance t does.',
    ),
  notWhen: t => t('As the only method: it is a bound and wastes power.'),
  why: (reason, t) => (reason.code === 'bound' ? t('a bound, not counted') : commonWhy(reason, t)),
});
