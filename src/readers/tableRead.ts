import type { Field, LabelColumn, NumberColumn, Reading, Table } from '../core/model/cells';
import type { ReadRows } from './readRows';
import type { BuiltColumns } from './wantedColumns';

/** A table as read: the columns that were wanted, and where each row came from. */
export class TableRead implements Table {
  readonly rows: number;

  constructor(
    readonly fields: readonly Field[],
    readonly readings: readonly Reading[],
    private readonly places: ReadRows,
    private readonly columns: BuiltColumns,
  ) {
    this.rows = places.total;
  }

  numbers(field: number): NumberColumn {
    const column = this.columns.numbers.get(field);
    if (column === undefined) throw new RangeError(`column ${field} was not read as numbers`);
    return column;
  }

  labels(field: number): LabelColumn {
    const column = this.columns.labels.get(field);
    if (column === undefined) throw new RangeError(`column ${field} was not read as labels`);
    return column;
  }

  line(row: number): number {
    return this.places.lineOf(row);
  }

  file(row: number): number {
    return this.places.fileOf(row);
  }

  rowAt(file: number, line: number): number {
    return this.places.rowAt(file, line);
  }

  cells(row: number): readonly string[] | null {
    return this.places.kept.get(row) ?? null;
  }
}
