import type { TextSpan } from '../../protocol/files';
import type { CellSpan } from './cellSpans';

interface Place {
  readonly line: number;
  readonly character: number;
}

const before = (a: Place, b: Place): boolean =>
  a.line < b.line || (a.line === b.line && a.character < b.character);
const start = (span: TextSpan | CellSpan): Place => ({
  line: span.startLine,
  character: span.startCharacter,
});
const end = (span: TextSpan | CellSpan): Place => ({ line: span.endLine, character: span.endCharacter });
const isEmpty = (span: TextSpan): boolean => !before(start(span), end(span));

/**
 * The last line a span touches: one that ends before the first character of a line does not touch that line. A caret
 * touches the line it stands in.
 */
export const lastLineTouched = (span: TextSpan): number =>
  span.endCharacter === 0 && span.endLine > span.startLine ? span.endLine - 1 : span.endLine;

/** Whether a span touches a cell: a caret the cell it stands in or beside, a selection those of which it holds a part. */
export function touches(span: TextSpan, cell: CellSpan): boolean {
  if (isEmpty(span)) return !before(start(span), start(cell)) && !before(end(cell), start(span));
  const cellIsEmpty = !before(start(cell), end(cell));
  if (cellIsEmpty) return !before(start(cell), start(span)) && before(start(cell), end(span));
  return before(start(span), end(cell)) && before(start(cell), end(span));
}
