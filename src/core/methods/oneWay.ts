import { method } from '../model/methods';
import { fUpperTail } from '../numeric/fisherF';
import { meanSquaresRatio, oneWaySquares } from '../numeric/oneWaySquares';
import { constantGroup, ofAllGroups, severalQuestions, severalRefused, severalWhy } from './severalGroups';

/** F with one SD for all groups. */
export const oneWay = method({
  id: 'one-way',
  version: 1,
  design: 'several',
  measure: 'mean',
  questions: severalQuestions,
  statistic: 'F',
  needs: 'summary',
  counted: true,
  options: [],
  references: [
    'Fisher 1925, Statistical Methods for Research Workers, chapter VII',
    'NIST/SEMATECH e-Handbook of Statistical Methods, 7.4.3',
    'NIST Statistical Reference Datasets, Analysis of Variance',
  ],
  work: n => n,
  applies: (data, ask) => {
    const scatters = data.groups.some(({ sd }) => sd > 0);
    return severalRefused(data, ask) ?? (scatters ? null : { code: 'no-spread-in-any', facts: {} });
  },
  doubts: ({ groups }) => {
    const constant = constantGroup(groups);
    return constant === undefined ? null : { code: 'one-constant-group', facts: { label: constant.label } };
  },
  run: ({ groups }, ask) => {
    const squares = oneWaySquares(groups);
    const { between, within, df } = squares;
    const statistic = meanSquaresRatio(squares);
    return ofAllGroups(ask, {
      statistic,
      df,
      p: fUpperTail(statistic, df[0], df[1]),
      extra: {
        betweenSquares: between,
        withinSquares: within,
        rSquared: between / (between + within),
        residualSd: Math.sqrt(within / df[1]),
      },
    });
  },
  title: t => t('one-way, pooled'),
  assumes: t => t('all groups scatter alike'),
  explains: t =>
    t(
      'The mean square between the group means divided by the mean square within the groups, with one SD pooled from all groups, held against F on groups − 1 and values − groups degrees of freedom. With two groups F is the square of the pooled t.',
    ),
  notWhen: t =>
    t(
      'The SDs differ and the groups are of unequal size: with the smaller groups the more variable, false alarms come several times as often as stated.',
    ),
  why: severalWhy,
});
