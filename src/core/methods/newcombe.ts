import { method } from '../model/methods';
import { normalCurve } from './curve';
import { judge } from './judge';
import { newcombeLower, newcombeUpper } from './newcombeLimits';
import { allQuestions } from './questions';
import { noOutcomes, shareDifference, sharesWhy, successOption } from './shares';

/** Newcombe's interval for a difference of two shares. It has no p of its own: the decision is read off the interval. */
export const newcombe = method({
  id: 'newcombe',
  version: 1,
  design: 'counts',
  measure: 'proportion',
  questions: allQuestions,
  statistic: 'z',
  needs: 'summary',
  counted: true,
  options: [successOption],
  references: [
    'Newcombe 1998, Statistics in Medicine 17:873–890 (method 10)',
    'Wilson 1927, Journal of the American Statistical Association 22:209–212',
  ],
  work: () => 1,
  applies: data => noOutcomes(data),
  doubts: () => null,
  run: (data, ask) =>
    judge(
      {
        estimate: shareDifference(data),
        se: null,
        df: null,
        curve: normalCurve,
        at: null,
        lower: quantile => newcombeLower(data, quantile),
        upper: quantile => newcombeUpper(data, quantile),
      },
      ask,
    ),
  title: t => t('Newcombe’s interval'),
  assumes: t => t('outcomes are independent of one another'),
  explains: t =>
    t(
      'An interval for the difference of two shares, put together from the Wilson limits of each. It stays between −1 and 1 and does not shrink to nothing at shares of 0 or 1. It gives no p-value: the decision is read off the interval.',
    ),
  notWhen: t => t('The same units were measured twice, or units hold several outcomes each.'),
  why: sharesWhy,
});
