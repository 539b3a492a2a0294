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
 * The cells of the row that starts on `line` (from 0) and ends before `next`. A quoted cell may hold delimiters, doubled
 * quotes and line ends.
 */
export function cellSpans(
  lines: readonly string[],
  line: number,
  next: number,
  delimiter: string,
): readonly CellSpan[] {
  const spans: CellSpan[] = [];
  let startLine = line;
  let startCharacter = 0;
  let quoted = false;
  for (let at = line; at < next; at++) {
    const text = lines[at] ?? '';
    for (let character = 0; character < text.length; character++) {
      const symbol = text[character];
      const opens = at === startLine && character === startCharacter;
      if (symbol === '"' && (quoted || opens)) {
        if (quoted && text[character + 1] === '"') character++;
        else quoted = !quoted;
      } else if (symbol === delimiter && !quoted) {
        spans.push({ startLine, startCharacter, endLine: at, endCharacter: character });
        startLine = at;
        startCharacter = character + 1;
      }
    }
    if (!quoted) {
      spans.push({ startLine, startCharacter, endLine: at, endCharacter: text.length });
      return spans;
    }
  }
  const end = Math.max(line, next - 1);
  spans.push({ startLine, startCharacter, endLine: end, endCharacter: (lines[end] ?? '').length });
  return spans;
}
