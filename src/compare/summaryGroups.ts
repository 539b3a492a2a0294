import { Cell, type Table } from '../core/model/cells';
import type { Count, Group, Summary } from '../core/model/groups';
import { Refusal, type CellRef } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { valueAt } from '../core/numeric/numbers';
import { rolesOf } from './roles';
import { Entry, type Selection } from './selection';
import type { SummaryFields } from './summaryFields';

/** The summaries of a file, one row a group: test, reference. A second row of a group is refused ('summary-invalid'). */
export function summaryRows(
  table: Table,
  selection: Selection,
  settings: Settings,
): readonly (Summary | Count)[] {
  const { summary } = rolesOf(settings, table.fields);
  if (summary === null) throw new RangeError('no summary columns');
  return selection.groups.map((label, group) => {
    const rows = selection.rows.filter(
      (_, at) => selection.group[at] === group && selection.state[at] !== Entry.LeftOut,
    );
    const [row, second] = rows;
    if (row === undefined) throw new Refusal('values-too-few', { label, n: 0 });
    const where = { file: table.file(second ?? row), line: table.line(second ?? row), field: summary.label };
    if (second !== undefined) throw new Refusal('summary-invalid', { label, what: 'repeated' }, where);
    return summaryOfRow(table, row, label, summary);
  });
}

function summaryOfRow(table: Table, row: number, label: string, fields: SummaryFields): Summary | Count {
  const n = numberAt(table, row, fields.n) ?? Number.NaN;
  if (fields.x !== null)
    return checkedSummary(
      { label, x: numberAt(table, row, fields.x) ?? Number.NaN, n },
      at(table, row, fields.x),
    );
  const mean = numberAt(table, row, fields.mean) ?? Number.NaN;
  const sd = numberAt(table, row, fields.sd) ?? Number.NaN;
  return checkedSummary({ label, n, mean, sd }, at(table, row, fields.n));
}

/** The summary as it is when it can be one, else refused with what is wrong ('summary-invalid'). */
export function checkedSummary<S extends Summary | Count>(summary: S, where: CellRef | string | null): S {
  const refuse = (what: string): Refusal =>
    new Refusal('summary-invalid', { label: summary.label, what }, where);
  if (!(Number.isInteger(summary.n) && summary.n >= 1)) throw refuse('n');
  if ('x' in summary) {
    if (!(Number.isInteger(summary.x) && summary.x >= 0 && summary.x <= summary.n)) throw refuse('x');
    return summary;
  }
  if (!Number.isFinite(summary.mean)) throw refuse('mean');
  if (!(summary.sd >= 0 && Number.isFinite(summary.sd)) && summary.n > 1) throw refuse('sd');
  return summary;
}

/** A group known by its summary only. The SD of one value is NaN whatever was written. */
export function groupOfSummary({ label, n, mean, sd }: Summary): Group {
  return {
    label,
    n,
    mean,
    sd: n > 1 ? sd : Number.NaN,
    sample: null,
    readings: n,
    missing: 0,
    leftOut: 0,
    units: null,
    readingSample: null,
    unitOf: null,
  };
}

function numberAt(table: Table, row: number, field: number | null): number | null {
  if (field === null) return null;
  const { numbers, state } = table.numbers(field);
  return (state?.[row] ?? Cell.Value) === Cell.Value ? valueAt(numbers, row) : null;
}

const at = (table: Table, row: number, field: number): CellRef => ({
  file: table.file(row),
  line: table.line(row),
  field,
});
