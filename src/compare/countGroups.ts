import type { Table } from '../core/model/cells';
import type { Count, Unit } from '../core/model/groups';
import { Refusal } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { successOf } from './pairCounts';
import { usedRows, type Selection } from './selection';

/** The outcomes of one group. */
interface CountedGroup {
  readonly count: Count;
  /** Used rows; equals n unless units were named. */
  readonly readings: number;
  readonly units: readonly Unit[] | null;
}

/**
 * Successes of each group. Where units were named each unit counts once: a unit whose readings disagree is neither, and is
 * refused ('units-disagree').
 */
export function countGroups(table: Table, selection: Selection, settings: Settings): readonly CountedGroup[] {
  return selection.groups.map((label, group) => {
    const rows = usedRows(selection, group);
    const isSuccess = successOf(selection, group, settings);
    if (settings.relation.kind !== 'units') {
      return {
        count: { label, x: rows.filter(isSuccess).length, n: rows.length },
        readings: rows.length,
        units: null,
      };
    }
    const field = selection.measured[group]?.field ?? 0;
    const units = [...agreedUnits(table, selection, { rows, field }, isSuccess).values()];
    const x = units.filter(unit => unit.success).length;
    return { count: { label, x, n: units.length }, readings: rows.length, units };
  });
}

function agreedUnits(
  table: Table,
  selection: Selection,
  { rows, field }: { readonly rows: Int32Array; readonly field: number },
  isSuccess: (row: number) => boolean,
): ReadonlyMap<number, Unit & { readonly success: boolean }> {
  const [ids] = selection.ids;
  const units = new Map<number, Unit & { readonly success: boolean }>();
  for (const row of rows) {
    const unit = ids?.codes[row] ?? 0;
    const success = isSuccess(row);
    const id = ids?.levels[unit] ?? '';
    const before = units.get(unit);
    if (before !== undefined && before.success !== success) {
      const where = { file: table.file(row), line: table.line(row), field };
      throw new Refusal('units-disagree', { column: ids?.name ?? '', unit: id }, where);
    }
    units.set(unit, { path: [id], readings: (before?.readings ?? 0) + 1, success });
  }
  return units;
}
