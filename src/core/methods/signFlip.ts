import type { Designs } from '../model/groups';
import { method, type Ask } from '../model/methods';
import type { Reason } from '../model/say';
import { wholeOffsets } from '../numeric/wholeOffsets';
import { alphaOf } from './confidence';
import { flippedSums } from './flippedSums';
import { commonWhy } from './reasons';

type Pairs = Designs['pairs'];

/** All 2ⁿ ways are gone through up to here: about a million. */
const MOST_PAIRS = 20;

/** The mean difference of pairs held against all ways of exchanging the two values within pairs. */
export const signFlip = method({
  id: 'sign-flip',
  version: 1,
  design: 'pairs',
  measure: 'mean',
  questions: ['differs', 'higher', 'lower'],
  statistic: 'sum',
  needs: 'values',
  counted: true,
  options: [],
  references: [
    'Fisher 1935, The Design of Experiments, section 21',
    'Box, Hunter & Hunter 2005, Statistics for Experimenters, chapter 3',
  ],
  work: n => (n > MOST_PAIRS ? n : 2 ** n),
  applies: tooFewOrMany,
  doubts: (data, ask) => {
    const least = leastP(data, ask);
    return least < alphaOf(ask.confidence)
      ? null
      : { code: 'cannot-reach', facts: { n: data.differences.n, least } };
  },
  run: ({ differences }, { question, against, confidence }, tick) => {
    const whole = wholeOffsets(differences.numbers, against) ?? new Float64Array(0);
    const { atLeast, atMost, asFar, ways } = flippedSums(whole, tick);
    const twoSided = { p: asFar / ways, lower: null, upper: null };
    const { mean } = differences.moments();
    const common = {
      estimate: mean,
      se: null,
      statistic: (mean - against) * differences.n,
      df: null,
      lower: null,
      upper: null,
      confidence,
      extra: { ways },
    };
    if (question === 'differs') return { ...common, p: twoSided.p };
    return { ...common, twoSided, p: (question === 'higher' ? atLeast : atMost) / ways };
  },
  title: t => t('sign flips'),
  assumes: t => t('within each pair it was left to chance which value came under which condition'),
  explains: t =>
    t(
      'The sum of the differences within pairs, held against the sums of all 2ⁿ ways of exchanging the two values of a pair; equal sums are equal exactly. p is the share of ways at least as far from what it is held against. It has no interval.',
    ),
  notWhen: t =>
    t(
      'Fewer than 6 pairs: no p below 0.05 can come of them. More than 20: there are too many ways to go through them all.',
    ),
  why: (reason, t) => {
    const { n, least } = reason.facts;
    switch (reason.code) {
      case 'one-pair':
        return t('{0} complete pair: one difference has no spread', Number(n));
      case 'too-many-ways':
        return t('{0} pairs: there are too many ways of exchanging them to go through all', Number(n));
      case 'too-many-digits':
        return t('the values have too many digits for exact sums');
      case 'cannot-reach':
        return t('with {0} pairs no p below {1} can come of it', Number(n), Number(least));
      default:
        return commonWhy(reason, t);
    }
  },
});

function tooFewOrMany({ differences }: Pairs, { against }: Ask): Reason | null {
  const { n } = differences;
  if (n < 2) return { code: 'one-pair', facts: { n } };
  if (n > MOST_PAIRS) return { code: 'too-many-ways', facts: { n } };
  return wholeOffsets(differences.numbers, against) === null ? { code: 'too-many-digits', facts: {} } : null;
}

/** The smallest p that the number of pairs allows. */
const leastP = ({ differences }: Pairs, { question }: Ask): number =>
  (question === 'differs' ? 2 : 1) / 2 ** differences.n;
