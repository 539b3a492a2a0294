import type { Designs } from '../model/groups';
import { method, type Ask } from '../model/methods';
import type { Reason } from '../model/say';
import { wholeOffsets } from '../numeric/wholeOffsets';
import { flippedSums } from './flippedSums';
import { cannotReach, judgeWays, waysQuestions, waysWhy } from './ways';

type Pairs = Designs['pairs'];

/** All 2ⁿ ways are gone through up to here: about a million. */
const MOST_PAIRS = 20;

/** The mean difference of pairs held against all ways of exchanging the two values within pairs. */
export const signFlip = method({
  id: 'sign-flip',
  version: 1,
  design: 'pairs',
  measure: 'mean',
  questions: waysQuestions,
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
  doubts: ({ differences }, ask) => {
    const ways = 2 ** differences.n;
    return cannotReach((ask.question === 'differs' ? 2 : 1) / ways, ways, ask);
  },
  run: ({ differences }, ask, tick) => {
    const whole = wholeOffsets(differences.numbers, ask.against);
    if (whole === null) throw new RangeError('the differences are no whole numbers of one step');
    const { mean } = differences.moments();
    const met = { estimate: mean, se: null, statistic: (mean - ask.against) * differences.n };
    return judgeWays(met, flippedSums(whole, tick), ask);
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
    const n = Number(reason.facts['n']);
    switch (reason.code) {
      case 'one-pair':
        return t('{0} complete pair: one difference has no spread', n);
      case 'too-many-ways':
        return t('{0} pairs: there are too many ways of exchanging them to go through all', n);
      default:
        return waysWhy(reason, t);
    }
  },
});

function tooFewOrMany({ differences }: Pairs, { against }: Ask): Reason | null {
  const { n } = differences;
  if (n < 2) return { code: 'one-pair', facts: { n } };
  if (n > MOST_PAIRS) return { code: 'too-many-ways', facts: { n } };
  return wholeOffsets(differences.numbers, against) === null ? { code: 'too-many-digits', facts: {} } : null;
}
