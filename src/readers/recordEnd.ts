import { CR, LF, QUOTE, SPACE, TAB } from './byteCodes';

/** The extent of one record, which a quoted cell may carry over several lines. */
export interface RecordExtent {
  /** Behind its last character, before its line end. */
  readonly end: number;
  /** Where the next record starts. */
  readonly next: number;
  /** How many line ends it takes, its own included. */
  readonly lineEnds: number;
  /** Where each of its cells starts. */
  readonly cells: readonly number[];
  /** Whether its line end was seen. */
  readonly complete: boolean;
  /** Where the quote stands that was open when the text ended; −1: none. */
  readonly openQuote: number;
  /** Where a quoted cell goes on behind its closing quote ("abc"def), and whether such a cell runs over a line end. */
  readonly oddQuote: number;
  readonly oddAcrossLines: boolean;
}

/**
 * Finds the end of the record that starts at `start`, and its cells. A quote opens only as the first character of a cell;
 * doubled quotes stand for one; behind the closing quote blanks may stand; CR, LF and CRLF each end a line.
 */
export function recordEnd(
  codes: ArrayLike<number>,
  start: number,
  to: number,
  delimiter: number,
): RecordExtent {
  const cells = [start];
  let lineEnds = 0;
  let oddQuote = -1;
  let oddAcrossLines = false;
  let at = start;
  for (;;) {
    if (at < to && codes[at] === QUOTE) {
      const quoted = quotedEnd(codes, at, to, delimiter);
      if (quoted.odd) {
        oddQuote = at;
        oddAcrossLines ||= quoted.lineEnds > 0;
      }
      lineEnds += quoted.lineEnds;
      if (!quoted.closed) {
        return {
          end: to,
          next: to,
          lineEnds,
          cells,
          complete: false,
          openQuote: at,
          oddQuote,
          oddAcrossLines,
        };
      }
      at = quoted.end;
    }
    while (at < to && codes[at] !== delimiter && codes[at] !== LF && codes[at] !== CR) at++;
    if (at >= to || codes[at] !== delimiter) break;
    at++;
    cells.push(at);
  }
  const complete = at < to;
  const next = complete ? at + (codes[at] === CR && codes[at + 1] === LF && at + 1 < to ? 2 : 1) : to;
  lineEnds += complete ? 1 : 0;
  return { end: at, next, lineEnds, cells, complete, openQuote: -1, oddQuote, oddAcrossLines };
}

interface QuotedExtent {
  /** Behind the closing quote and the blanks that follow it. */
  readonly end: number;
  readonly lineEnds: number;
  readonly closed: boolean;
  readonly odd: boolean;
}

function quotedEnd(codes: ArrayLike<number>, open: number, to: number, delimiter: number): QuotedExtent {
  let lineEnds = 0;
  let odd = false;
  for (let at = open + 1; at < to; at++) {
    const code = codes[at];
    if (code === LF || (code === CR && codes[at + 1] !== LF)) lineEnds++;
    if (code !== QUOTE) continue;
    if (at + 1 < to && codes[at + 1] === QUOTE) {
      at++;
      continue;
    }
    let end = at + 1;
    while (end < to && (codes[end] === SPACE || codes[end] === TAB) && codes[end] !== delimiter) end++;
    const after = codes[end];
    if (end >= to || after === delimiter || after === LF || after === CR)
      return { end, lineEnds, closed: true, odd };
    odd = true;
  }
  return { end: to, lineEnds, closed: false, odd };
}
