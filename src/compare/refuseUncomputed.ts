import type { Table } from '../core/model/cells';
import type { Row } from '../core/model/comparison';
import { Refusal, type CellRef } from '../core/model/problem';
import type { Prepared } from './prepared';

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
  const short = groups.find(({ n }) => n < 2);
  if (code === 'one-value' && short !== undefined) {
    const met = selection?.group.filter(group => selection.groups[group] === short.label).length ?? short.n;
    const where = placeOf(table, short.sample?.rows[0], selection?.measured[0]?.field);
    const { label, n, missing, leftOut } = short;
    const about = { label, n, missing, leftOut, lines: where === null ? [] : [where.line] };
    throw new Refusal(met === 1 ? 'label-single-value' : 'values-too-few', about, where);
  }
  if (code === 'one-pair') throw new Refusal('values-too-few', { n: pairs?.complete ?? 0, what: 'pairs' });
  if (code === 'zero-spread' && facts['difference'] === 0) {
    const [test, reference] = groups;
    const labels = groups.map(({ label }) => label);
    throw new Refusal('values-all-equal', {
      labels,
      value: test?.mean ?? null,
      n: (test?.n ?? 0) + (reference?.n ?? 0),
    });
  }
  if (code === 'sigma-absent') throw new Refusal('sigma-needed', { method: chosen.id });
}

function placeOf(table: Table | null, row: number | undefined, field: number | undefined): CellRef | null {
  if (table === null || row === undefined) return null;
  return { file: table.file(row), line: table.line(row), field: field ?? 0 };
}
