import type { Designs } from '../model/groups';
import { method, type Ask } from '../model/methods';
import type { Reason } from '../model/say';
import { meanDifference } from '../numeric/meanDifference';
import { wholeOffsets } from '../numeric/wholeOffsets';
import { allottedStatistics } from './allottedStatistics';
import { separatePrecision } from './precision';
import { spreadMissing } from './reasons';
import { cannotReach, judgeWays, waysQuestions, waysWhy } from './ways';

type Two = Designs['two'];

const MOST_WAYS = 200_000;

/** The separate-variance statistic held against all ways of allotting the values to the two groups. */
export const permutation = method({
  id: 'permutation',
  version: 1,
  design: 'two',
  measure: 'mean',
  questions: waysQuestions,
  statistic: 't',
  needs: 'values',
  counted: true,
  options: [],
  references: [
    'Fisher 1935, The Design of Experiments, section 21',
    'Janssen 1997, Statistics & Probability Letters 36:9–21',
    'Box, Hunter & Hunter 2005, Statistics for Experimenters, chapter 3',
  ],
  work: n => n * MOST_WAYS,
  applies: missing,
  doubts: ({ test, reference }, ask) => {
    const ways = waysOf(test.n, reference.n);
    // Groups of one size can change places: each statistic is then met from both sides.
    const sides = ask.question === 'differs' && test.n === reference.n ? 2 : 1;
    return cannotReach(sides / ways, ways, ask);
  },
  run: (data, ask, tick) => {
    const whole = wholeGroups(data, ask.against);
    if (whole === null) throw new RangeError('the values are no whole numbers of one step');
    const estimate = meanDifference(data.test, data.reference);
    const { se } = separatePrecision(data.test, data.reference);
    const met = { estimate, se, statistic: (estimate - ask.against) / se };
    return judgeWays(met, allottedStatistics(...whole, tick), ask);
  },
  title: t => t('permutation'),
  assumes: t => t('chance alone allotted the units to the groups'),
  explains: t =>
    t(
      'The difference of the two means divided by its standard error, each group with its own SD, held against the same statistic of all ways of allotting the values to groups of these sizes; ties are decided exactly. p is the share of ways at least as far. It has no interval.',
    ),
  notWhen: t =>
    t(
      'The units were not allotted by lot. More than {0} ways, about 10 values in each group: there are too many to go through.',
      MOST_WAYS,
    ),
  why: (reason, t) => {
    switch (reason.code) {
      case 'no-values':
        return t('only n, mean and SD are known, not the values');
      case 'too-many-ways':
        return t(
          'there are too many ways of allotting {0} and {1} values to go through all',
          Number(reason.facts['n']),
          Number(reason.facts['m']),
        );
      default:
        return waysWhy(reason, t);
    }
  },
});

/** How many ways there are of choosing n of n + m; stops counting where it no longer matters. */
function waysOf(n: number, m: number): number {
  let ways = 1;
  for (let taken = 1; taken <= Math.min(n, m); taken++) {
    ways = (ways * (n + m - Math.min(n, m) + taken)) / taken;
    if (ways > 1e12) return Infinity;
  }
  return Math.round(ways);
}

function missing(data: Two, { against }: Ask): Reason | null {
  const { test, reference } = data;
  const lacking = spreadMissing(data);
  if (lacking !== null) return lacking;
  if (test.sample === null || reference.sample === null) return { code: 'no-values', facts: {} };
  if (waysOf(test.n, reference.n) > MOST_WAYS)
    return { code: 'too-many-ways', facts: { n: test.n, m: reference.n } };
  return wholeGroups(data, against) === null ? { code: 'too-many-digits', facts: {} } : null;
}

/** Both groups as whole numbers in one proportion, the test values less what the difference is held against. */
function wholeGroups(
  { test, reference }: Two,
  against: number,
): readonly [Float64Array, Float64Array] | null {
  if (test.sample === null || reference.sample === null) return null;
  const shifted = wholeOffsets(test.sample.numbers, against);
  const plain = wholeOffsets(reference.sample.numbers, 0, against);
  return shifted === null || plain === null ? null : [shifted, plain];
}
