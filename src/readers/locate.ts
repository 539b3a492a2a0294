import { recordEnd, type RecordExtent } from './recordEnd';

/** Where a cell stands in a text; lines and columns from 1, the end column behind its last character. */
export interface Location {
  readonly line: number;
  readonly startColumn: number;
  readonly endColumn: number;
}

const FIRST_WINDOW = 4096;

/**
 * Finds a cell, its quotes included, for the editor and for problems. A quoted cell that runs over several lines is marked
 * to the end of the line it begins on.
 * @param line the line on which the row starts, from 1
 * @param field from 0
 * @returns null when the text has no such line or the row no such cell
 */
export function locate(text: string, line: number, field: number, delimiter: string): Location | null {
  const start = startOfLine(text, line);
  if (start === null) return null;
  const { cells, end } = recordAt(text, start, delimiter.charCodeAt(0));
  const from = cells[field];
  if (from === undefined) return null;
  const next = cells[field + 1];
  return place(text, { start, line, from, to: next === undefined ? end : next - 1 });
}

function startOfLine(text: string, line: number): number | null {
  const lineEnds = /\r\n|\r|\n/g;
  for (let at = 1; at < line; at++) if (lineEnds.exec(text) === null) return null;
  return lineEnds.lastIndex;
}

/** Looks at a window of the text, doubled until the record ends inside of it. */
function recordAt(text: string, start: number, delimiter: number): RecordExtent {
  for (let size = FIRST_WINDOW; ; size *= 2) {
    const window = text.slice(start, start + size);
    const codes = Uint16Array.from({ length: window.length }, (_, i) => window.charCodeAt(i));
    const extent = recordEnd(codes, 0, codes.length, delimiter);
    if (extent.complete || start + size >= text.length) {
      return { ...extent, end: extent.end + start, cells: extent.cells.map(cell => cell + start) };
    }
  }
}

interface Extent {
  readonly start: number;
  readonly line: number;
  readonly from: number;
  readonly to: number;
}

function place(text: string, { start, line, from, to }: Extent): Location {
  const before = text.slice(start, from).split(/\r\n|\r|\n/);
  const cell = text.slice(from, to).split(/\r\n|\r|\n/)[0] ?? '';
  const startColumn = (before.at(-1) ?? '').length + 1;
  return { line: line + before.length - 1, startColumn, endColumn: startColumn + cell.length };
}
