import type { Table } from '../core/model/cells';
import type { Settings } from '../core/model/settings';
import { groupingOf } from './grouping';
import { rolesOf } from './roles';
import { rowFilter } from './rowFilter';

export interface LabelCount {
  readonly label: string;
  readonly count: number;
}

/** The labels of the rows taken, after merging, in order of first appearance in the file, with their number of rows. */
export function labelCounts(
  table: Table,
  settings: Pick<Settings, 'files' | 'layout' | 'relation' | 'same' | 'rows' | 'where'>,
): readonly LabelCount[] {
  const roles = rolesOf(settings, table.fields);
  const grouping = groupingOf(table, settings, roles);
  const taken = rowFilter(table, settings, roles);
  const counts = new Map<number, number>();
  for (let row = 0; row < table.rows; row += 1) {
    if (!taken(row)) continue;
    for (let position = 0; position < grouping.valuesPerRow; position += 1) {
      const label = grouping.labelOf(row, position);
      if (label >= 0) counts.set(label, (counts.get(label) ?? 0) + 1);
    }
  }
  return [...counts].map(([label, count]) => ({ label: grouping.labels[label] ?? '', count }));
}
