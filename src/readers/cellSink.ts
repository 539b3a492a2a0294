/** Takes the cells of one column, row by row. */
export interface CellSink {
  /** One cell: the bytes of its text (UTF-8, quotes taken off), and the line on which its row starts. */
  take(bytes: Uint8Array, start: number, end: number, line: number): void;
  /** A row that is too short to reach this column. */
  absent(): void;
}

/** A column that is wanted in two ways. */
export class BothSinks implements CellSink {
  constructor(
    private readonly first: CellSink,
    private readonly second: CellSink,
  ) {}

  take(bytes: Uint8Array, start: number, end: number, line: number): void {
    this.first.take(bytes, start, end, line);
    this.second.take(bytes, start, end, line);
  }

  absent(): void {
    this.first.absent();
    this.second.absent();
  }
}
