import type { Table } from '../core/model/cells';
import type { LeftOutRow } from '../core/model/comparison';
import type { Settings } from '../core/model/settings';
import { exactText } from '../core/numeric/numbers';
import { groupingOf } from './grouping';
import type { Measured } from './measuredValues';
import { rolesOf, idNames } from './roles';
import type { Selection } from './selection';

/** Every left-out row as it stands in the file: value, group and units, in the order in which they were left out. */
export function leftOutRows(table: Table, settings: Settings, selection: Selection): readonly LeftOutRow[] {
  const roles = rolesOf(settings, table.fields);
  const grouping = groupingOf(table, settings, roles);
  const names = idNames(settings.relation);
  return settings.leftOut.map(leftOut => {
    const row = table.rowAt(leftOut.file, leftOut.line);
    const positions = Array.from({ length: grouping.valuesPerRow }, (_, position) =>
      grouping.labelOf(row, position),
    );
    const labels = positions
      .map(label => grouping.labels[label] ?? '')
      .filter(label => selection.groups.includes(label));
    const values = labels.map(label =>
      writtenAt(table, selection.measured[selection.groups.indexOf(label)], row),
    );
    const unit = selection.ids.map(
      ({ levels, codes }, depth) => [names[depth] ?? '', levels[codes[row] ?? 0] ?? ''] as const,
    );
    return { ...leftOut, row, value: values.join(', '), group: labels.join(', '), unit };
  });
}

/** The cell as written where the reader kept the row, else what was read from it. */
function writtenAt(table: Table, measured: Measured | undefined, row: number): string {
  if (measured === undefined) return '';
  const kept = table.cells(row)?.[measured.field];
  if (kept !== undefined) return kept;
  if (measured.kind === 'outcomes') return measured.column.levels[measured.column.codes[row] ?? 0] ?? '';
  return exactText(measured.column.numbers, row);
}
