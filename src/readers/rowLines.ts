/** The line on which each row starts; rows on consecutive lines cost nothing. */
export class RowLines {
  count = 0;
  /** Rows that do not follow on the line after the row before, ascending, and their lines. */
  private readonly rows: number[] = [];
  private readonly lines: number[] = [];
  private expected = -1;

  add(line: number): void {
    if (line !== this.expected) {
      this.rows.push(this.count);
      this.lines.push(line);
    }
    this.expected = line + 1;
    this.count++;
  }

  line(row: number): number {
    const run = lastAtMost(this.rows, row);
    return (this.lines[run] ?? 0) + row - (this.rows[run] ?? 0);
  }

  /** The row that starts on this line, or −1. */
  rowAt(line: number): number {
    const run = lastAtMost(this.lines, line);
    if (run < 0) return -1;
    const row = (this.rows[run] ?? 0) + line - (this.lines[run] ?? 0);
    return row < (this.rows[run + 1] ?? this.count) ? row : -1;
  }
}

/** Index of the last of the ascending numbers that is not above x, or −1. */
function lastAtMost(ascending: readonly number[], x: number): number {
  let low = 0;
  let high = ascending.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((ascending[middle] ?? 0) <= x) low = middle + 1;
    else high = middle;
  }
  return low - 1;
}
