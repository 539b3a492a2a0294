import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { printPercent, printThree, sayP } from '../numbersPrinted';
import { shareWords } from '../words/count';
import { estimateName } from '../words/estimates';
import { groupLabel } from '../words/groupLabels';
import { visible } from '../words/label';
import { measuredName, subjectOf } from '../words/measuredName';
import { assumptionPhrase } from '../words/methodWords';
import type { Scale } from '../words/scale';
import { statisticOf } from './answer';
import type { ViewContext } from './context';
import { designSentence } from './designSentence';
import { headline } from './headline';
import { leftOutOf } from './leftOut';
import { mattersSentence } from './matters';
import { isStated } from './stated';
import { verdictSentence } from './verdictSentence';

/** The comparison in one paragraph that stands for itself in a notebook. */
export function notebookParagraph(comparison: Comparison, context: ViewContext, scale: Scale): string {
  const { t, provenance, table, files } = context;
  const { groups } = comparison;
  const described = groups.map(group => groupWords(group, groupLabel(group.label, comparison), scale, t));
  const name = comparison.measured === '' ? subjectOf(comparison, t) : measuredName(comparison);
  const unit =
    comparison.unit === null || comparison.groups.some(group => group.count !== null)
      ? ''
      : ` (${comparison.unit})`;
  const source = files.map(file => t('{0}, SHA-256 {1}…', visible(file.path), file.sha256.slice(0, 12)));
  const opening = t('{0}{1} in {2}', name, unit, joined(described, t));
  const left = leftOutOf(comparison, table, scale, t);
  const excluded =
    left.rows.length === 0
      ? t('Left out: none.')
      : t('Left out: {0}. {1}', left.rows.map(row => row.sentence).join('; '), left.kept ?? '').trim();
  return [
    source.length === 0 ? `${opening}.` : t('{0}; {1}.', opening, source.join('; ')),
    designSentence(comparison, t),
    differenceSentence(comparison, scale, t),
    `${headline(comparison, scale, t)}.`,
    comparison.settings.matters === null ? '' : mattersSentence(comparison, scale, t).full,
    verdictSentence(comparison, scale, t),
    excluded,
    isStated(provenance.sampling)
      ? t(
          'How the samples were drawn, as stated and not examined by this analysis: {0}.',
          visible(provenance.sampling),
        )
      : t('How the samples were drawn was not stated, nor examined by this analysis.'),
  ]
    .filter(sentence => sentence !== '')
    .join(' ');
}

function groupWords(group: Comparison['groups'][number], label: string, scale: Scale, t: Say): string {
  if (group.count !== null) return t('{0} {1}', label, shareWords(group.count));
  const mean = scale.mean(group.mean, group.se).text;
  return Number.isFinite(group.sd)
    ? t('{0} (n = {1}, mean {2}, SD {3})', label, group.n, mean, printThree(group.sd))
    : t('{0} (n = {1}, value {2})', label, group.n, mean);
}

const joined = (parts: readonly string[], t: Say): string =>
  parts.length === 2 ? t('{0} and {1}', parts[0] ?? '', parts[1] ?? '') : parts.join(', ');

/** "slow cool − standard = 22.6 MPa (95% confidence interval 8.6 to 36.6); p = 0.003 (t 3.38 on …); separate variances." */
function differenceSentence(comparison: Comparison, scale: Scale, t: Say): string {
  const { chosen, settings } = comparison;
  const result = chosen.result;
  const estimate = result?.estimate ?? null;
  if (result === null || estimate === null) return '';
  const interval = t(
    '{0}% confidence interval {1}',
    printPercent(result.confidence),
    scale.interval(result).text,
  );
  const size = t('{0} = {1} ({2})', estimateName(comparison, t), scale.difference(estimate), interval);
  const statistic = statisticOf(comparison, t);
  const p = result.p === null ? null : sayP(result.p, settings.confidence);
  const held = p === null ? statistic : statistic === null ? p : `${p} (${statistic})`;
  return `${[size, held, assumptionPhrase(chosen.id, t)].filter(part => part !== null).join('; ')}.`;
}
