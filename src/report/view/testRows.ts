import type { Comparison, Effect } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { clearOf, effectPlace, fullText, printAt, printP } from '../numbersPrinted';
import { boundsWords } from '../words/boundsWords';
import { groupLabels } from '../words/groupLabels';
import { statisticOf } from './answer';
import { effectName, effectSpecial } from './effects';
import { evidenceSentence } from './findings';
import type { NumberRow, NumbersShown, Printed } from './shown';

/** The difference in percent of the reference: "2.8% (1.0 to 4.5)"; no row where it has no meaning. */
export function percentRows(comparison: Comparison, t: Say): readonly NumberRow[] {
  const percent = comparison.effects.find(({ id }) => id === 'percent');
  if (percent === undefined) return [];
  const name = t('percent of {0}', groupLabels(comparison)[1] ?? '');
  return [
    {
      key: 'percent',
      name,
      short: name,
      cells: [...comparison.groups.map(() => null), percentCell(percent, t)],
    },
  ];
}

/** "2.8% of standard (1.0 to 4.5)"; null where it has no meaning. */
export function percentSentence(comparison: Comparison, t: Say): string | null {
  const percent = comparison.effects.find(({ id }) => id === 'percent');
  if (percent === undefined) return null;
  const [, reference = ''] = groupLabels(comparison);
  const { value, limits } = percentParts(percent, t);
  return t('{0}% of {1} ({2})', value, reference, limits);
}

function percentParts(
  { value, lower, upper }: Effect,
  t: Say,
): { readonly value: string; readonly limits: string } {
  const place = effectPlace(value, lower, upper, [0]);
  const open = lower === null && upper === null;
  return {
    value: printAt(value, place),
    limits: open ? t('no finite interval') : boundsWords(lower, upper, limit => printAt(limit, place), t),
  };
}

function percentCell(percent: Effect, t: Say): Printed {
  const { value, limits } = percentParts(percent, t);
  const { lower, upper } = percent;
  const full = fullText(percent.value);
  const open = lower === null && upper === null;
  return {
    text: `${value}% (${limits})`,
    full: open ? full : `${full} (${boundsWords(lower, upper, fullText, t)})`,
  };
}

/** "0.003 (t 3.38 on 19.4 degrees of freedom)". */
export function pRows(comparison: Comparison, t: Say): readonly NumberRow[] {
  const { chosen, groups, settings } = comparison;
  const p = chosen.result?.p ?? null;
  if (p === null) return [];
  const statistic = statisticOf(comparison, t);
  const text = printP(p, settings.confidence);
  const cell = { text: statistic === null ? text : `${text} (${statistic})`, full: fullText(p) };
  return [{ key: 'p', name: 'p', short: 'p', cells: [...groups.map(() => null), cell] }];
}

/** Effect sizes but the percent, and the evidence on the assumptions: folded under the table. */
export function moreNumbers(comparison: Comparison, t: Say): NumbersShown['more'] {
  const effects = comparison.effects
    .filter(({ id }) => id !== 'percent')
    .map(effect => ({ name: effectName(effect.id, t), value: effectText(effect, t) }));
  const evidence = comparison.evidence.map(found => evidenceSentence(found, comparison, t));
  if (effects.length === 0 && evidence.length === 0) return null;
  const summary =
    effects.length === 0 ? t('Evidence on the assumptions') : t('Size in SDs, evidence on the assumptions');
  return { summary, effects, evidence };
}

function effectText({ id, value, lower, upper }: Effect, t: Say): Printed {
  const special = effectSpecial(id);
  const full = fullText(value);
  if (lower === null && upper === null) return { text: printAt(value, clearOf(2, [value], special)), full };
  const place = effectPlace(value, lower, upper, special);
  return {
    text: `${printAt(value, place)} (${boundsWords(lower, upper, limit => printAt(limit, place), t)})`,
    full: `${full} (${boundsWords(lower, upper, fullText, t)})`,
  };
}
