import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { shareWords } from '../words/count';
import { groupLabel } from '../words/groupLabels';
import { subjectOf } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { counted, unitNoun } from '../words/unitNoun';
import { intervalSentence } from './interval';

/** The figure in words: each group, then the difference with its interval. */
export function figureSentence(comparison: Comparison, scale: Scale, t: Say): string {
  const { groups, chosen } = comparison;
  const noun = unitNoun(comparison, t);
  const described = groups.map(group => {
    const label = groupLabel(group.label, comparison);
    if (group.count !== null) return t('{0}: {1}', label, shareWords(group.count));
    const mean = meanWords(group, comparison, scale, t);
    const range =
      group.min === null || group.max === null
        ? ''
        : `, ${t('{0} to {1}', scale.observed(group.min).text, scale.observed(group.max).text)}`;
    return t('{0}: {1}, {2}{3}', label, counted(group.n, noun), mean, range);
  });
  const estimate = chosen.result?.estimate ?? null;
  const interval = intervalSentence(comparison, scale, t);
  const difference =
    estimate === null
      ? ''
      : ` ${t('Difference {0}', scale.difference(estimate))}${interval === null ? '' : `, ${interval}`}.`;
  return t('Figure of {0}. {1}.{2}', subjectOf(comparison, t), described.join('; '), difference);
}

function meanWords(
  { mean }: Comparison['groups'][number],
  { unit }: Comparison,
  scale: Scale,
  t: Say,
): string {
  const text = scale.number(mean).text;
  return unit === null ? t('mean {0}', text) : t('mean {0} {1}', text, unit);
}
