import { recordEnd } from './recordEnd';
import { splitRecord } from './splitRecord';

/** One record of the head of a file that is not blank, cut by a delimiter that is on trial. */
export interface HeadRecord {
  readonly line: number;
  /** The line on which the next record starts. */
  readonly nextLine: number;
  readonly cells: readonly string[];
  readonly text: string;
  readonly quoted: boolean;
}

export interface Head {
  readonly records: readonly HeadRecord[];
  /** A quote that is never closed, or whose cell runs on behind it over a line end. */
  readonly openQuote: { readonly line: number; readonly field: number } | null;
}

const MOST_RECORDS = 300;

/**
 * Cuts the first bytes of a file into records.
 * @param whole whether the bytes are the whole file; else the last record may be cut off and is left away
 */
export function headRecords(bytes: Uint8Array, delimiter: string, whole: boolean): Head {
  const decoder = new TextDecoder('utf-8', { ignoreBOM: true });
  const text = (start: number, end: number): string => decoder.decode(bytes.subarray(start, end));
  const records: HeadRecord[] = [];
  let line = 1;
  for (let at = 0; at < bytes.length && records.length < MOST_RECORDS;) {
    const extent = recordEnd(bytes, at, bytes.length, delimiter.charCodeAt(0));
    if (!extent.complete && !whole) break;
    const quote = extent.openQuote >= 0 ? extent.openQuote : extent.oddAcrossLines ? extent.oddQuote : -1;
    if (quote >= 0) {
      const field = extent.cells.filter(cell => cell <= quote).length - 1;
      return { records, openQuote: { line: line + text(at, quote).split(/\r\n|\r|\n/).length - 1, field } };
    }
    const record = text(at, extent.end);
    const nextLine = line + extent.lineEnds;
    if (record.trim() !== '') {
      const cells = splitRecord(record, delimiter);
      records.push({ line, nextLine, cells, text: record, quoted: record.includes('"') });
    }
    line = nextLine;
    at = extent.next;
  }
  return { records, openQuote: null };
}
