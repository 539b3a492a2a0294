import type { Table } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import type { Roles } from './roles';

/**
 * Whether a row is taken: within one of the closed line ranges, and for each column named by `where` holding one of the
 * labels named for it. Refuses a range without a data row ('row-unknown') and a label that never occurs ('label-unknown').
 */
export function rowFilter(
  table: Table,
  { rows, where }: Pick<Settings, 'rows' | 'where'>,
  roles: Roles,
): (row: number) => boolean {
  const tests = [...inRanges(table, rows), ...holdingLabels(table, where, roles)];
  return row => tests.every(test => test(row));
}

function inRanges(table: Table, ranges: Settings['rows']): readonly ((row: number) => boolean)[] {
  if (ranges === 'all') return [];
  const hits = ranges.map(() => 0);
  for (let row = 0; row < table.rows; row += 1) {
    const at = table.line(row);
    ranges.forEach(([from, to], index) => {
      if (at >= from && at <= to) hits[index] = (hits[index] ?? 0) + 1;
    });
  }
  const empty = ranges[hits.indexOf(0)];
  if (empty !== undefined) {
    const last = table.rows === 0 ? 0 : table.line(table.rows - 1);
    throw new Refusal('row-unknown', {
      from: empty[0],
      to: empty[1],
      first: table.rows === 0 ? 0 : table.line(0),
      last,
    });
  }
  return [row => ranges.some(([from, to]) => table.line(row) >= from && table.line(row) <= to)];
}

function holdingLabels(
  table: Table,
  where: Settings['where'],
  roles: Roles,
): readonly ((row: number) => boolean)[] {
  const allowed = new Map<number, Set<number>>();
  where.forEach(([column, label], index) => {
    const field = roles.where[index];
    if (field === undefined) return;
    const { levels } = table.labels(field);
    const code = levels.indexOf(label);
    if (code < 0) throw new Refusal('label-unknown', { label, column, labels: levels.slice(1, 21) });
    allowed.set(field, (allowed.get(field) ?? new Set<number>()).add(code));
  });
  return [...allowed].map(([field, wanted]) => {
    const { codes } = table.labels(field);
    return row => wanted.has(codes[row] ?? 0);
  });
}
