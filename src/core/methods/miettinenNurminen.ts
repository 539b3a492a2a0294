import type { Designs } from '../model/groups';
import { method } from '../model/methods';
import { normalCurve } from './curve';
import { judge } from './judge';
import { allQuestions } from './questions';
import { restrictedShares } from './restrictedShares';
import { noOutcomes, shareDifference, sharesWhy, successOption } from './shares';

type Counts = Designs['counts'];

/** Score interval for a difference of two shares with the p of the same score: they agree by construction. */
export const miettinenNurminen = method({
  id: 'miettinen-nurminen',
  version: 1,
  design: 'counts',
  measure: 'proportion',
  questions: allQuestions,
  statistic: 'z',
  needs: 'summary',
  counted: true,
  options: [successOption],
  references: [
    'Miettinen & Nurminen 1985, Statistics in Medicine 4:213–226',
    'Campbell 2007, Statistics in Medicine 26:3661–3675 (the same statistic at a difference of 0)',
  ],
  work: () => 1,
  applies: data => noOutcomes(data),
  doubts: () => null,
  run: (data, ask) => {
    const estimate = shareDifference(data);
    return judge(
      {
        estimate,
        se: scoreError(data, ask.against),
        df: null,
        curve: normalCurve,
        at: value => score(data, value),
        lower: quantile => limit(data, -1, estimate, quantile),
        upper: quantile => limit(data, 1, estimate, -quantile),
      },
      ask,
    );
  },
  title: t => t('score interval'),
  assumes: t => t('outcomes are independent of one another'),
  explains: t =>
    t(
      'For each possible difference the two shares of greatest likelihood with that difference give a standard error; the interval holds every difference that this score does not reject (Miettinen and Nurminen). Its p-value comes from the same score, so p and interval always agree.',
    ),
  notWhen: t => t('The same units were measured twice, or units hold several outcomes each.'),
  why: sharesWhy,
});

/** Standard error of the difference under the hypothesis that it is `value`, with the factor N/(N − 1). */
function scoreError(data: Counts, value: number): number {
  const [test, reference] = restrictedShares(data, value);
  const variance = (test * (1 - test)) / data.test.n + (reference * (1 - reference)) / data.reference.n;
  const all = data.test.n + data.reference.n;
  return Math.sqrt((Math.max(0, variance) * all) / (all - 1));
}

/** (difference − value) over its standard error; 0 where the difference is exactly `value`. */
function score(data: Counts, value: number): number {
  const distance = shareDifference(data) - value;
  return distance === 0 ? 0 : distance / scoreError(data, value);
}

/** Where the score, which falls with the hypothesised difference, passes `wanted` between the estimate and −1 or 1. */
function limit(data: Counts, end: -1 | 1, estimate: number, wanted: number): number {
  let low = Math.min(end, estimate);
  let high = Math.max(end, estimate);
  for (let middle = (low + high) / 2; middle > low && middle < high; middle = (low + high) / 2) {
    if (score(data, middle) > wanted) low = middle;
    else high = middle;
  }
  return end < 0 ? high : low;
}
