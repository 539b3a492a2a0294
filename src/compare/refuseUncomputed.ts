import type { Table } from '../core/model/cells';
import type { Row } from '../core/model/comparison';
import type { Group } from '../core/model/groups';
import { Refusal, type CellRef } from '../core/model/problem';
import { groupAt } from './groupAt';
import type { Prepared } from './prepared';
import type { Selection } from './selection';

/**
 * A chosen row that cannot be computed because there is too little or nothing to compare is a problem, not a row:
 * 'label-single-value' (the label stands on one row only), 'values-too-few', 'values-all-equal', 'sigma-needed'. Any other
 * reason stays with the row.
 */
export function refuseUncomputed(
  table: Table | null,
  { groups, selection, pairs }: Prepared,
  chosen: Row,
): void {
  if (chosen.applies || chosen.reason === null) return;
  const { code, facts } = chosen.reason;
  const labels = groups.map(({ label }) => label);
  const short = groups.findIndex(({ n }) => n < 2);
  if (code === 'one-value') refuseOneValue(table, groupAt(groups, short), selection, short, labels);
  if (code === 'one-pair') throw new Refusal('values-too-few', { n: pairs?.complete ?? 0, what: 'pairs' });
  if (code === 'zero-spread' && facts['difference'] === 0) {
    const [test, reference] = groups;
    throw new Refusal('values-all-equal', {
      labels,
      value: test?.mean ?? null,
      n: (test?.n ?? 0) + (reference?.n ?? 0),
    });
  }
  if (code === 'sigma-absent') throw new Refusal('sigma-needed', { method: chosen.id });
}

function refuseOneValue(
  table: Table | null,
  { label, n, missing, leftOut, sample }: Group,
  selection: Selection | null,
  group: number,
  labels: readonly string[],
): never {
  const where = placeOf(table, sample?.rows[0], selection?.measured[group]?.field);
  const facts = { label, n, missing, leftOut, lines: where === null ? [] : [where.line], labels };
  const isOnlyRow = selection?.group.filter(own => own === group).length === 1;
  throw new Refusal(isOnlyRow ? 'label-single-value' : 'values-too-few', facts, where);
}

function placeOf(table: Table | null, row: number | undefined, field: number | undefined): CellRef | null {
  if (table === null || row === undefined) return null;
  return { file: table.file(row), line: table.line(row), field: field ?? 0 };
}
