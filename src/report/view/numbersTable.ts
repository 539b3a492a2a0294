import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { estimateName } from '../words/estimates';
import { groupLabels } from '../words/groupLabels';
import { measuredName } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { groupRows } from './groupRows';
import type { NumberRow, NumbersShown } from './shown';
import { moreNumbers, percentRows, percentSentence, pRows } from './testRows';

/** Groups across, quantities down; the difference in its own column where two groups are compared. */
export function numbersTable(comparison: Comparison, scale: Scale, t: Say): NumbersShown {
  const { groups, design, unit, measured } = comparison;
  const labels = groupLabels(comparison);
  const hasDifference = groups.length === 2 && design !== 'several';
  const rows = [...groupRows(comparison, scale, t), ...percentRows(comparison, t), ...pRows(comparison, t)];
  return {
    heading: t('Numbers'),
    caption:
      measured === '' ? t('Numbers of each group') : t('Numbers of {0} by group', measuredName(comparison)),
    quantity: t('quantity'),
    inUnit: unit === null ? '' : t('in {0}', unit),
    columns: hasDifference ? [...labels, estimateName(comparison, t)] : labels,
    rows: hasDifference ? rows : rows.map(withoutDifference).filter(hasCells),
    percent: percentSentence(comparison, t),
    more: moreNumbers(comparison, t),
  };
}

const withoutDifference = (row: NumberRow): NumberRow => ({ ...row, cells: row.cells.slice(0, -1) });

const hasCells = (row: NumberRow): boolean => row.cells.some(cell => cell !== null);
