import { recordEnd } from '../../readers/recordEnd';

/** Where one cell stands in the text, its quotes included: lines from 0, characters from 0, the end is behind it. */
export interface CellSpan {
  readonly startLine: number;
  readonly startCharacter: number;
  readonly endLine: number;
  readonly endCharacter: number;
}

/** The lines of a text as an editor counts them: CR, LF and CRLF each end one. */
export const textLines = (text: string): readonly string[] => text.split(/\r\n|\r|\n/);

/**
 * The cells of the row that starts on `line` (from 0) and ends before `next`, parted as the reader parts them. A quoted
 * cell may hold delimiters, doubled quotes and line ends.
 */
export function cellSpans(
  lines: readonly string[],
  line: number,
  next: number,
  delimiter: string,
): readonly CellSpan[] {
  const own = lines.slice(line, Math.max(next, line + 1));
  const text = own.join('\n');
  const codes = Uint16Array.from({ length: text.length }, (_, at) => text.charCodeAt(at));
  const { cells, end } = recordEnd(codes, 0, codes.length, delimiter.charCodeAt(0));
  const place = placesIn(own);
  return cells.map((from, index) => {
    const [startLine, startCharacter] = place(from);
    const [endLine, endCharacter] = place(index + 1 < cells.length ? (cells[index + 1] ?? end) - 1 : end);
    return { startLine: line + startLine, startCharacter, endLine: line + endLine, endCharacter };
  });
}

/** Line and character of an offset in lines joined by one character, for offsets that only grow. */
function placesIn(lines: readonly string[]): (offset: number) => readonly [line: number, character: number] {
  let line = 0;
  let start = 0;
  return offset => {
    while (line + 1 < lines.length && offset > start + (lines[line] ?? '').length) {
      start += (lines[line] ?? '').length + 1;
      line += 1;
    }
    return [line, offset - start];
  };
}
