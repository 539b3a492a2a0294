import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { fullText, printP } from '../numbersPrinted';
import { showLabel } from '../words/label';
import type { Scale } from '../words/scale';
import type { Printed, TableShown } from './shown';

/** Pairs among several groups, and the family of several columns; in the order asked, never by p. */
export function severalTables(comparison: Comparison, scale: Scale, t: Say): readonly TableShown[] {
  const { pairsOfGroups, family, settings } = comparison;
  const p = (value: number): Printed => ({ text: printP(value, settings.confidence), full: fullText(value) });
  const words = (text: string): Printed => ({ text, full: '' });
  const tables: TableShown[] = [];
  if (pairsOfGroups.length > 0)
    tables.push({
      heading: t('Pairs of groups'),
      caption: t('{0} pairwise comparisons among {1} groups', pairsOfGroups.length, comparison.groups.length),
      columns: [t('pair'), t('difference'), t('interval'), t('adjusted p')],
      rows: pairsOfGroups.map(({ a, b, row, pAdjusted }) => [
        words(`${showLabel(a)} \u2212 ${showLabel(b)}`),
        row.result === null || row.result.estimate === null ? words('') : scale.number(row.result.estimate),
        scale.interval(row.result),
        p(pAdjusted),
      ]),
    });
  if (family.length > 0)
    tables.push({
      heading: t('Columns compared'),
      caption: t('{0} columns compared in one run', family.length),
      columns: [t('column'), 'p', t('p by Holm'), t('q by Benjamini and Hochberg')],
      rows: family.map(({ column, p: raw, holm, benjaminiHochberg }) => [
        words(showLabel(column)),
        p(raw),
        p(holm),
        p(benjaminiHochberg),
      ]),
    });
  return tables;
}
