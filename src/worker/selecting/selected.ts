import type { TextSpan } from '../../protocol/files';
import { cellSpans, type CellSpan } from './cellSpans';
import { lastLineTouched, touches } from './touched';

/** A file as text with the places of its rows: everything by lines from 1, as the reader counts. */
export interface SelectableText {
  readonly lines: readonly string[];
  readonly delimiter: string;
  readonly headerLine: number;
  /** The line each data row starts on, ascending. */
  readonly rowLines: readonly number[];
  readonly fields: readonly string[];
}

export interface Selected {
  /** Closed ranges of line numbers; null: every row. */
  readonly rows: readonly (readonly [number, number])[] | null;
  /** Indices of columns, ascending; null: none was singled out. */
  readonly columns: readonly number[] | null;
  readonly rowCount: number;
  /** Whether the spans did not touch the same columns everywhere. */
  readonly uneven: boolean;
}

const whole = (text: SelectableText): Selected => ({
  rows: null,
  columns: null,
  rowCount: text.rowLines.length,
  uneven: false,
});

/**
 * What selected text stands for. Nothing, one place, or fewer than two data rows: the whole table. Inside the header
 * line: those columns of every row. One range: the rows it touches with all columns. Several ranges or a box: the rows
 * and columns they touch.
 */
export function selected(spans: readonly TextSpan[], text: SelectableText): Selected {
  const inHeader = spans.filter(span => isWithinHeader(span, text));
  const others = spans.filter(span => !inHeader.includes(span));
  const touched = spans.map(span => rowsTouched(span, text));
  const rows = [...new Set(touched.flat())].sort((a, b) => a - b);
  if (rows.length < 2) {
    const named = inHeader.filter(
      span => span.endLine > span.startLine || span.endCharacter > span.startCharacter,
    );
    const columns = headerColumns(named, text);
    const narrows = columns.length > 0 && columns.length < text.fields.length && others.length === 0;
    return narrows ? { ...whole(text), columns } : whole(text);
  }
  const taken = { rows: ranges(rows, text), rowCount: rows.length };
  if (spans.length === 1) return { ...taken, columns: null, uneven: false };
  const bySpan = spans.map((span, index) => columnsTouched(span, touched[index] ?? [], text));
  const inRows = bySpan.filter(columns => columns.size > 0);
  const union = new Set([...inRows.flatMap(columns => [...columns]), ...headerColumns(inHeader, text)]);
  const columns = [...union].sort((a, b) => a - b);
  const first = inRows[0] ?? new Set<number>();
  const uneven = inRows.some(set => set.size !== first.size || [...set].some(column => !first.has(column)));
  return { ...taken, columns: columns.length === text.fields.length ? null : columns, uneven };
}

function isWithinHeader(span: TextSpan, text: SelectableText): boolean {
  const firstRow = (text.rowLines[0] ?? text.lines.length + 1) - 1;
  return span.startLine >= text.headerLine - 1 && lastLineTouched(span) < firstRow;
}

function headerColumns(spans: readonly TextSpan[], text: SelectableText): readonly number[] {
  const line = text.headerLine - 1;
  const next = (text.rowLines[0] ?? text.lines.length + 1) - 1;
  const cells = cellSpans(text.lines, line, next, text.delimiter);
  return cells.flatMap((cell, index) => (spans.some(span => touches(span, cell)) ? [index] : []));
}

/** Indices of the data rows that a span touches; a row reaches to the line before the next one starts. */
function rowsTouched(span: TextSpan, text: SelectableText): readonly number[] {
  const rows: number[] = [];
  const last = lastLineTouched(span) + 1;
  for (let row = firstRowEndingAtOrAfter(span.startLine + 1, text); row < text.rowLines.length; row++) {
    if ((text.rowLines[row] ?? Infinity) > last) break;
    if (endLine(row, text) >= span.startLine) rows.push(row);
  }
  return rows;
}

/** The line (from 0) a row ends on: below it may stand blank lines, comments or a totals row that belong to no row. */
const endLine = (row: number, text: SelectableText): number => rowCells(row, text).at(-1)?.endLine ?? 0;

function rowCells(row: number, text: SelectableText): readonly CellSpan[] {
  const line = (text.rowLines[row] ?? 1) - 1;
  const next = (text.rowLines[row + 1] ?? text.lines.length + 1) - 1;
  return cellSpans(text.lines, line, next, text.delimiter);
}

function firstRowEndingAtOrAfter(line: number, { rowLines }: SelectableText): number {
  let low = 0;
  let high = rowLines.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((rowLines[middle + 1] ?? Infinity) <= line) low = middle + 1;
    else high = middle;
  }
  return low;
}

function columnsTouched(span: TextSpan, rows: readonly number[], text: SelectableText): ReadonlySet<number> {
  const columns = new Set<number>();
  for (const row of rows) {
    const cells = rowCells(row, text);
    cells.slice(0, text.fields.length).forEach((cell, index) => {
      if (touches(span, cell)) columns.add(index);
    });
    if (columns.size === text.fields.length) break;
  }
  return columns;
}

/** Rows that follow each other become one range of lines; every row together: null. */
function ranges(rows: readonly number[], text: SelectableText): Selected['rows'] {
  if (rows.length === text.rowLines.length) return null;
  const found: [number, number][] = [];
  let previous = -2;
  for (const row of rows) {
    const line = text.rowLines[row] ?? 0;
    const last = found.at(-1);
    if (last !== undefined && row === previous + 1) last[1] = line;
    else found.push([line, line]);
    previous = row;
  }
  return found;
}
