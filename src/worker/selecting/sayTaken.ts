import type { Say } from '../../core/model/say';
import type { Selected } from './selected';

const NAMED = 4;

/** What was taken, in a few words: "lines 2–41, 3 columns", "all 72 rows, 6 columns". */
export function sayTaken(taken: Selected, fields: readonly string[], t: Say): string {
  const rows =
    taken.rows === null ? t('all {0} rows', taken.rowCount) : t('lines {0}', lineList(taken.rows, t));
  return `${rows}, ${columnWords(taken, fields, t)}`;
}

function columnWords(taken: Selected, fields: readonly string[], t: Say): string {
  const columns = taken.columns ?? fields.map((_, index) => index);
  const named = columns.map(index => fields[index] ?? '').join(', ');
  if (taken.columns === null || columns.length > NAMED) return t('{0} columns', columns.length);
  return columns.length === 1 ? t('column {0}', named) : t('columns {0}', named);
}

function lineList(rows: readonly (readonly [number, number])[], t: Say): string {
  const parts = rows
    .slice(0, NAMED)
    .map(([first, last]) => (first === last ? String(first) : `${first}–${last}`));
  const more = rows.length - parts.length;
  return more > 0 ? t('{0} and {1} more ranges', parts.join(', '), more) : parts.join(', ');
}
