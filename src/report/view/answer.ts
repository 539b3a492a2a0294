import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { cautionsFor, quietCaution } from '../cautions';
import { printDf, printThree, sayP } from '../numbersPrinted';
import { shareWords } from '../words/count';
import { estimateName } from '../words/estimates';
import { groupLabel } from '../words/groupLabels';
import { assumptionPhrase, reasonWords, statisticName } from '../words/methodWords';
import { noteWords } from '../words/noteWords';
import { outcomeOf } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { controlsOf } from './controls';
import { designSentence } from './designSentence';
import { findingSentence } from './findings';
import { headline } from './headline';
import { besideSentence, intervalSentence } from './interval';
import { mattersSentence } from './matters';
import type { AnswerShown } from './shown';

/** The answer: what is decided, by how much, under what, and what stays open. */
export function answerOf(comparison: Comparison, questionInWords: string, scale: Scale, t: Say): AnswerShown {
  const { chosen, settings, findings } = comparison;
  const result = chosen.result;
  const matters = mattersSentence(comparison, scale, t);
  return {
    shares: sharesWords(comparison, t),
    headline: headline(comparison, scale, t),
    difference: differenceOf(comparison, scale, t),
    interval: intervalSentence(comparison, scale, t),
    beside: besideSentence(comparison, scale, t),
    matters: matters.full,
    mattersShort: matters.short,
    p: result === null || result.p === null ? null : sayP(result.p, settings.confidence),
    statistic: statisticOf(comparison, t),
    design: designSentence(comparison, t),
    variance: assumptionPhrase(chosen.id, t),
    doubt: reasonWords(chosen, t),
    open: findings.filter(finding => finding.level === 'ask').map(finding => findingSentence(finding, t)),
    controls: controlsOf(comparison, scale, t),
    caution: quietCaution(t),
    cautions: cautionsFor(comparison, questionInWords, scale, t),
    notes: comparison.notes.filter(({ code }) => code !== 'summary-only').map(note => noteWords(note, t)),
  };
}

/** "t 3.38 on 19.4 degrees of freedom"; null where the chosen row has no statistic. */
export function statisticOf({ chosen }: Comparison, t: Say): string | null {
  const result = chosen.result;
  if (result === null || result.statistic === null) return null;
  const name = statisticName(chosen.id, t);
  const value = printThree(result.statistic);
  const ways = result.extra?.['ways'];
  if (typeof ways === 'number') return t('{0} {1} among {2} ways', name, value, ways);
  if (result.df === null) return t('{0} {1} on the normal curve', name, value);
  if (typeof result.df === 'number')
    return t('{0} {1} on {2} degrees of freedom', name, value, printDf(result.df));
  return t(
    '{0} {1} on {2} and {3} degrees of freedom',
    name,
    value,
    printDf(result.df[0]),
    printDf(result.df[1]),
  );
}

/** "crazed = yes: 12/36 (33%) in slow cool, 6/36 (17%) in standard": counts stand before any difference of shares. */
export function sharesWords(comparison: Comparison, t: Say): string | null {
  const parts = comparison.groups.flatMap(({ count, label }) =>
    count === null ? [] : [t('{0} in {1}', shareWords(count), groupLabel(label, comparison))],
  );
  if (parts.length === 0) return null;
  const outcome = outcomeOf(comparison);
  return outcome === null ? parts.join(', ') : `${outcome}: ${parts.join(', ')}`;
}

/** The difference where the headline does not name its size. */
function differenceOf(comparison: Comparison, scale: Scale, t: Say): string | null {
  const { decision, result } = comparison.chosen;
  const estimate = result?.estimate ?? null;
  if (estimate === null || decision === 'differs' || decision === 'higher' || decision === 'lower')
    return null;
  return t('{0} is {1}', estimateName(comparison, t), scale.difference(estimate));
}
