import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { showLabel } from './label';

/** The measured column without the unit that its header carries: "gloss" for "gloss (GU)". */
export const measuredName = ({ measured, unit }: Pick<Comparison, 'measured' | 'unit'>): string =>
  withoutUnit(measured, unit);

/** A header without its unit. */
export function withoutUnit(header: string, unit: string | null): string {
  const name = header.trim();
  const endings = unit === null ? [] : [`(${unit})`, `[${unit}]`, `, ${unit}`, `/${unit}`];
  const ending = endings.find(end => name.endsWith(end) && name.length > end.length);
  return showLabel(ending === undefined ? header : name.slice(0, -ending.length).trim());
}

/** What the sentence is about: the measured column, the share of an outcome, or the mean where no column is named. */
export function subjectOf(comparison: Comparison, t: Say): string {
  const named = comparison.measured.trim() !== '';
  if (comparison.design !== 'counts' && comparison.design !== 'pairedCounts')
    return named ? measuredName(comparison) : t('the mean');
  const outcome = outcomeOf(comparison);
  return outcome === null ? t('the share') : t('the share of {0}', outcome);
}

/** "crazed = yes": the outcome that is counted, or null where it has no name. */
export function outcomeOf(comparison: Comparison): string | null {
  const { success } = comparison.settings.options;
  if (success === undefined) return null;
  const value = showLabel(String(success));
  return comparison.measured.trim() === '' ? value : `${measuredName(comparison)} = ${value}`;
}
