import type { Table } from '../../core/model/cells';
import type { Comparison } from '../../core/model/comparison';
import type { CellRef } from '../../core/model/problem';
import type { Say } from '../../core/model/say';
import { findField } from '../../readers/findField';
import { showLabel } from './label';

/** The field that holds the values of a group: a column of its own in the wide layout; null for summaries. */
export function measuredField(
  { settings, measured, groups }: Comparison,
  table: Table,
  group: number,
): number | null {
  const { layout } = settings;
  switch (layout.kind) {
    case 'long':
      return findField(table.fields, layout.measured[0] ?? measured);
    case 'files':
      return findField(table.fields, layout.measured);
    case 'wide':
      return findField(table.fields, groups[group]?.label ?? '');
    case 'summary':
    case 'typed':
      return null;
  }
}

/** "line 31", with the file's name where there is more than one. */
export function placeWords(
  { file, line }: Pick<CellRef, 'file' | 'line'>,
  files: readonly string[],
  t: Say,
): string {
  const name = files.length > 1 ? files[file] : undefined;
  return name === undefined ? t('line {0}', line) : t('{0} line {1}', showLabel(name), line);
}
