import type { Designs } from '../model/groups';
import { method, type Ask } from '../model/methods';
import type { Reason } from '../model/say';
import { differencesOfMeans, weightedSquares } from '../numeric/differencesOfMeans';
import { fUpperTail } from '../numeric/fisherF';
import { constantGroup, ofAllGroups, severalQuestions, severalRefused, severalWhy } from './severalGroups';

type Several = Designs['several'];

/** F with each group's own SD and real degrees of freedom: the default for several means. */
export const welchOneWay = method({
  id: 'welch-one-way',
  version: 1,
  design: 'several',
  measure: 'mean',
  questions: severalQuestions,
  statistic: 'F',
  needs: 'summary',
  counted: true,
  options: [],
  references: [
    'Welch 1951, Biometrika 38:330–336',
    'Delacre, Leys, Mora & Lakens 2019, International Review of Social Psychology 32:13',
  ],
  work: n => n,
  applies: missing,
  doubts: () => null,
  run: ({ groups }, ask) => {
    const { statistic, df } = welchF(groups);
    return ofAllGroups(ask, { statistic, df, p: fUpperTail(statistic, df[0], df[1]) });
  },
  title: t => t('one-way, separate'),
  assumes: t => t('each group may scatter its own way'),
  explains: t =>
    t(
      'The squared distances of the group means from their common mean, each weighted with n/s² of its own group, corrected for the SDs being estimated and held against F. The second degrees of freedom are a real number and never rounded. With two groups F is the square of the separate t.',
    ),
  notWhen: t =>
    t('Fewer than about 6 values in a group, or many small groups: the level is then not held closely.'),
  why: severalWhy,
});

function missing(data: Several, ask: Ask): Reason | null {
  const refused = severalRefused(data, ask);
  if (refused !== null) return refused;
  const single = data.groups.find(({ n }) => n < 2);
  if (single !== undefined) return { code: 'one-value', facts: { label: single.label, n: single.n } };
  const constant = constantGroup(data.groups);
  return constant === undefined ? null : { code: 'known-exactly', facts: { label: constant.label } };
}

/**
 * F = A / (1 + 2(k − 2)L/(k² − 1)) on k − 1 and (k² − 1)/3L degrees of freedom, with w = n/s², A = Σ w (m − m̄)²/(k − 1) and
 * L = Σ (1 − w/Σw)²/(n − 1). The weights are formed relative to the largest, so that no square overflows.
 * Source: Welch 1951, Biometrika 38:330–336.
 */
function welchF(groups: Several['groups']): {
  readonly statistic: number;
  readonly df: readonly [number, number];
} {
  const k = groups.length;
  const ses = groups.map(({ n, sd }) => sd / Math.sqrt(n));
  const least = Math.min(...ses);
  const weights = ses.map(se => (least / se) ** 2);
  const all = weights.reduce((sum, weight) => sum + weight, 0);
  const looseness = groups.reduce((sum, { n }, i) => sum + restShare(weights, i, all) ** 2 / (n - 1), 0);
  const squares = weightedSquares(weights, differencesOfMeans(groups));
  const between = squares / least / least / (k - 1);
  return {
    statistic: between / (1 + (2 * (k - 2) * looseness) / (k * k - 1)),
    df: [k - 1, (k * k - 1) / (3 * looseness)],
  };
}

/** 1 − w/Σw as the share of the other groups: nothing is lost where one group has nearly all the weight. */
function restShare(weights: readonly number[], own: number, all: number): number {
  return weights.reduce((sum, weight, i) => (i === own ? sum : sum + weight), 0) / all;
}
