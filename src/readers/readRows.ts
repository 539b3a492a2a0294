import { RowLines } from './rowLines';
import type { RowSink } from './scanner';

/** The rows of one or more files: the line of each, and the cells of those that are kept as they stand. */
export class ReadRows implements RowSink {
  readonly kept = new Map<number, readonly string[]>();
  private readonly files: { readonly first: number; readonly lines: RowLines }[] = [];
  private current = new RowLines();
  private before = 0;

  constructor(private readonly wanted: ReadonlySet<number> | 'all') {}

  startFile(): void {
    this.before += this.current.count;
    this.current = new RowLines();
    this.files.push({ first: this.before, lines: this.current });
  }

  /** Rows of the file under way. */
  get count(): number {
    return this.current.count;
  }

  get total(): number {
    return this.before + this.current.count;
  }

  row(line: number): void {
    this.current.add(line);
  }

  keeps(line: number): boolean {
    return this.wanted === 'all' || (this.wanted.size > 0 && this.wanted.has(line));
  }

  keep(cells: readonly string[]): void {
    this.kept.set(this.total - 1, cells);
  }

  fileOf(row: number): number {
    let file = 0;
    while (file + 1 < this.files.length && (this.files[file + 1]?.first ?? 0) <= row) file++;
    return file;
  }

  lineOf(row: number): number {
    const file = this.files[this.fileOf(row)];
    return file === undefined ? 0 : file.lines.line(row - file.first);
  }

  rowAt(file: number, line: number): number {
    const found = this.files[file];
    const row = found?.lines.rowAt(line) ?? -1;
    return row < 0 ? -1 : row + (found?.first ?? 0);
  }
}
