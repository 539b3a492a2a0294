import type { Comparison, LeftOutRow } from '../../core/model/comparison';
import type { Table } from '../../core/model/cells';
import type { Say } from '../../core/model/say';
import { sayP } from '../numbersPrinted';
import { showLabel, visible } from '../words/label';
import { measuredField, placeWords } from '../words/places';
import type { Scale } from '../words/scale';
import { putsBack } from './rowTitle';
import type { LeftOutShown } from './shown';

/** Every row left out, with its value, its reason and when; and the answer with all of them kept. */
export function leftOutOf(comparison: Comparison, table: Table | null, scale: Scale, t: Say): LeftOutShown {
  const { leftOut, settings } = comparison;
  return {
    heading: t('Left out'),
    none: leftOut.length === 0 ? t('None.') : null,
    rows: leftOut.map(row => {
      const place = placeWords(row, settings.files, t);
      const field = table === null ? null : measuredField(comparison, table, groupIndex(comparison, row));
      return {
        sentence: leftOutSentence(row, place, scale, t),
        short: t('{0}, {1}: {2}', place, showLabel(row.value), visible(row.reason)),
        place,
        file: row.file,
        line: row.line,
        at: { file: row.file, line: row.line, field: field ?? 0 },
      };
    }),
    kept: keptSentence(comparison, scale, t),
  };
}

const groupIndex = ({ groups }: Comparison, row: LeftOutRow): number =>
  Math.max(
    0,
    groups.findIndex(group => group.label === row.group),
  );

function leftOutSentence(row: LeftOutRow, place: string, scale: Scale, t: Say): string {
  const unit = row.unit.map(([column, id]) => `${showLabel(column)} ${showLabel(id)}`);
  const where = [place, ...unit].join(', ');
  const value = /\d/.test(row.value) ? scale.valueWithUnit(visible(row.value)) : showLabel(row.value);
  return row.afterResult
    ? t('{0}, {1}: {2} (after the result was seen)', where, value, visible(row.reason))
    : t('{0}, {1}: {2} (before the result)', where, value, visible(row.reason));
}

/** "With it kept: 20.7 MPa (4.0 to 37.3), p = 0.018."; null where nothing was left out or that row has no number. */
function keptSentence(comparison: Comparison, scale: Scale, t: Say): string | null {
  const { whatIf, leftOut, settings } = comparison;
  if (leftOut.length === 0) return null;
  const row = whatIf.rows.find(other => putsBack(other, comparison));
  const result = row?.result ?? null;
  const estimate = result?.estimate ?? null;
  if (result === null || estimate === null) return null;
  const interval = scale.interval(result).text;
  const size = `${scale.difference(estimate)} (${interval})`;
  const text = result.p === null ? size : `${size}, ${sayP(result.p, settings.confidence)}`;
  return leftOut.length === 1 ? t('With it kept: {0}.', text) : t('With them kept: {0}.', text);
}
