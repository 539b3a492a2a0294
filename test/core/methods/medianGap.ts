import { method } from '../../../src/core/model/methods';
import { commonWhy } from '../../../src/core/methods/reasons';
import { quantileSorted } from '../../../src/core/numeric/quantile';

/** A method for tests alone: the difference of the medians times a scale, with neither error nor p. */
export const medianGap = method({
  id: 'median-gap',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: ['differs'],
  statistic: 'gap',
  needs: 'values',
  counted: false,
  options: [
    {
      key: 'gap-scale',
      flag: 'gap-scale',
      kind: 'number',
      default: 1,
      says: t => t('what the gap is multiplied with'),
    },
  ],
  references: ['common practice, no source'],
  work: n => n,
  applies: ({ test, reference }) =>
    test.sample === null || reference.sample === null ? { code: 'not-this-design', facts: {} } : null,
  doubts: () => null,
  run: ({ test, reference }, ask) => {
    const median = (group: typeof test): number => quantileSorted(group.sample!.sorted(), 0.5);
    const estimate = (median(test) - median(reference)) * Number(ask.option('gap-scale'));
    return {
      estimate,
      se: null,
      statistic: null,
      df: null,
      p: null,
      lower: null,
      upper: null,
      confidence: ask.confidence,
    };
  },
  title: t => t('median gap'),
  assumes: t => t('nothing at all'),
  explains: t => t('Takes the gap between two medians.').replace('T', 't'),
  notWhen: t => t('Whenever a number with an error is wanted.'),
  why: commonWhy,
});
