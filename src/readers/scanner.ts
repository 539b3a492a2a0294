import { Refusal } from '../core/model/problem';
import { CR, HASH, LF, QUOTE, SPACE, TAB } from './byteCodes';
import type { CellSink } from './cellSink';
import { footLength, isBlank } from './foot';
import type { Met } from './met';
import { splitQuoted } from './papa';
import { recordEnd, type RecordExtent } from './recordEnd';
import { splitRecord } from './splitRecord';
import type { TableShape } from './tableShape';

/** Bytes held back until the file ends: its foot is looked at as a whole. */
const FOOT_BYTES = 1 << 14;
const PIECE_BYTES = 1 << 20;
/** A quoted cell that runs on for longer was never closed. */
const LONGEST_RECORD = 1 << 24;
/** No table has lines as long as this. */
const LONGEST_LINE = 1 << 26;

/** Takes each data row as it ends; the cells have gone to their sinks before. */
export interface RowSink {
  row(line: number): void;
  /** Rows taken of the file under way. */
  readonly count: number;
  /** The line is wanted as it stands. */
  keeps(line: number): boolean;
  keep(cells: readonly string[]): void;
}

/**
 * Walks the UTF-8 bytes of a table once, piece by piece, and hands the cells of the wanted columns to their sinks without
 * making a string of any. Cells that need more than taking off their quotes are cut by Papa Parse.
 */
export class Scanner {
  /** Rows that do not belong to the table, in order; known at the end. */
  readonly footer: { readonly line: number; readonly text: string }[] = [];
  private buffer = new Uint8Array(PIECE_BYTES + FOOT_BYTES + 1);
  private at = 0;
  private filled = 0;
  private line = 1;
  private ended = false;
  /** How many cells of a quoted record that is not all there yet have gone to their sinks; −1: none is under way. */
  private underway = -1;
  private readonly delimiter: number;
  /** No byte above it ends a cell. */
  private readonly highest: number;
  private readonly decoder = new TextDecoder('utf-8', { ignoreBOM: true });
  private readonly encoder = new TextEncoder();

  /** @param sinks one a column, null for a column that is not wanted */
  constructor(
    private readonly shape: TableShape,
    private readonly sinks: readonly (CellSink | null)[],
    private readonly rows: RowSink,
    private readonly met: Met,
  ) {
    this.delimiter = shape.delimiter.charCodeAt(0);
    this.highest = Math.max(this.delimiter, CR);
  }

  /** How many lines the file has; known at the end. */
  get lines(): number {
    return Math.max(1, this.line - 1);
  }

  feed(chunk: Uint8Array): void {
    for (let start = 0; start < chunk.length; start += PIECE_BYTES) {
      this.append(chunk.subarray(start, start + PIECE_BYTES));
      const to = this.buffer[this.filled - 1] === CR ? this.filled - 1 : this.filled; // its LF may be still to come
      this.scan(Math.min(lastLineEnd(this.buffer, this.at, to) + 1, to - FOOT_BYTES), to);
    }
  }

  /** To be called behind the last byte. */
  end(): void {
    this.ended = true;
    this.skipHead(this.filled);
    const foot = this.footStart();
    this.scan(foot, this.filled);
    this.passFoot();
  }

  private append(piece: Uint8Array): void {
    const kept = this.filled - this.at;
    if (kept > LONGEST_LINE) throw new Refusal('file-binary', { line: this.line, byte: null }, null);
    if (kept + piece.length + 1 > this.buffer.length) {
      const larger = new Uint8Array(2 * (kept + piece.length) + 1);
      larger.set(this.buffer.subarray(this.at, this.filled));
      this.buffer = larger;
    } else this.buffer.copyWithin(0, this.at, this.filled);
    this.buffer.set(piece, kept);
    this.at = 0;
    this.filled = kept + piece.length;
  }

  private scan(limit: number, to: number): void {
    this.buffer[this.filled] = LF; // ends the search for a cell's end without asking for the buffer's
    this.skipHead(to);
    while (this.at < limit) {
      const next = this.underway >= 0 ? this.quotedRecord(this.at, to) : this.record(this.at, to);
      if (next < 0) return;
      this.at = next;
    }
  }

  /** Passes over the lines above the data. */
  private skipHead(to: number): void {
    const { buffer } = this;
    while (this.line < this.shape.dataLine && this.at < to) {
      const byte = buffer[this.at++];
      if (byte === CR && buffer[this.at] === LF && this.at < to) this.at++;
      if (byte === LF || byte === CR) this.line++;
    }
  }

  /** Takes the record that starts here; gives the start of the next one, or −1 when its end is not there yet. */
  private record(start: number, to: number): number {
    const { buffer, delimiter, highest, sinks, line } = this;
    const width = this.shape.width;
    const first = buffer[start] as number;
    if (first <= SPACE || first === delimiter || first === HASH) {
      const next = this.emptyRecord(start);
      if (next >= 0) return next;
    }
    let field = 0;
    let at = start;
    let byte: number;
    for (;;) {
      const sink = field < width ? (sinks[field] ?? null) : null;
      const cell = at;
      byte = buffer[at] as number;
      if (byte === QUOTE) {
        at = closingQuote(buffer, at, delimiter);
        if (at < 0) {
          this.underway = field;
          return this.quotedRecord(start, to);
        }
        if (sink !== null) sink.take(buffer, cell + 1, at, line);
        byte = buffer[++at] as number;
      } else {
        while (byte > highest || (byte !== delimiter && byte !== LF && byte !== CR))
          byte = buffer[++at] as number;
        if (sink !== null) sink.take(buffer, cell, at, line);
      }
      field++;
      if (byte !== delimiter) break;
      at++;
    }
    if (field !== width) this.ragged(field, start, at);
    this.rows.row(line);
    if (this.rows.keeps(line)) this.rows.keep(splitRecord(this.text(start, at), this.shape.delimiter));
    this.line = line + 1;
    return behindLineEnd(buffer, at);
  }

  /** Passes over a record without any content, and over a comment; −1: it is neither. */
  private emptyRecord(start: number): number {
    const { buffer, delimiter } = this;
    const isComment = buffer[start] === HASH && this.shape.width > 1;
    let delimiters = 0;
    let at = start;
    for (; buffer[at] !== LF && buffer[at] !== CR; at++) {
      const byte = buffer[at];
      if (byte === delimiter) delimiters++;
      if (isComment ? delimiters > 0 : byte !== delimiter && byte !== SPACE && byte !== TAB) return -1;
    }
    const what = isComment ? 'comment-line' : delimiters > 0 ? 'empty-row' : 'blank-line';
    this.met.note(what, this.line, this.text(start, at));
    this.line++;
    return behindLineEnd(buffer, at);
  }

  /** Takes what is left of a record that holds a cell with doubled quotes, or with line ends inside of quotes. */
  private quotedRecord(start: number, to: number): number {
    const extent = recordEnd(this.buffer, start, to, this.delimiter);
    const mayEnd = extent.openQuote < 0 || to - start < LONGEST_RECORD;
    if (!extent.complete && !this.ended && mayEnd) return -1;
    this.refuseOpenQuote(extent, start);
    const { line, sinks } = this;
    const { delimiter, width } = this.shape;
    const text = this.text(start, extent.end);
    const cells = splitQuoted(text, delimiter);
    for (let field = Math.max(0, this.underway); field < Math.min(cells.length, width); field++) {
      const bytes = this.encoder.encode(cells[field]);
      sinks[field]?.take(bytes, 0, bytes.length, line);
    }
    if (extent.oddQuote >= 0) this.met.note('quote-inside', line, text);
    if (cells.length !== width) this.ragged(cells.length, start, extent.end);
    this.rows.row(line);
    if (this.rows.keeps(line)) this.rows.keep(cells);
    this.underway = -1;
    this.line += Math.max(1, extent.lineEnds + (extent.complete ? 0 : 1));
    return extent.complete ? extent.next : to + 1;
  }

  private refuseOpenQuote({ openQuote, oddQuote, oddAcrossLines, cells }: RecordExtent, start: number): void {
    const quote = openQuote >= 0 ? openQuote : oddAcrossLines ? oddQuote : -1;
    if (quote < 0) return;
    const field = cells.filter(cell => cell <= quote).length - 1;
    const line = this.line + this.text(start, quote).split(/\r\n|\r|\n/).length - 1;
    throw new Refusal('quote-unclosed', { line }, { file: this.met.file, line, field });
  }

  private ragged(found: number, start: number, end: number): void {
    const { width, delimiter } = this.shape;
    for (let field = found; field < width; field++) this.sinks[field]?.absent();
    const text = this.text(start, end);
    if (found < width) this.met.note('ragged-short', this.line, text, found);
    else if (!isBlank(splitRecord(text, delimiter).slice(width)))
      this.met.note('ragged-long', this.line, text, width);
  }

  /** Where the records begin that do not belong to the table; the end when all of them do. */
  private footStart(): number {
    const starts: number[] = [];
    const records: { cells: readonly string[] }[] = [];
    for (let at = this.at; at < this.filled;) {
      const { end, next } = recordEnd(this.buffer, at, this.filled, this.delimiter);
      starts.push(at);
      records.push({ cells: splitRecord(this.text(at, end), this.shape.delimiter) });
      at = next;
    }
    const length = footLength(records, this.shape.sample, this.shape.width);
    return starts[records.length - length] ?? this.filled;
  }

  private passFoot(): void {
    while (this.at < this.filled) {
      const { end, next, lineEnds } = recordEnd(this.buffer, this.at, this.filled, this.delimiter);
      const text = this.text(this.at, end);
      const blank = isBlank(splitRecord(text, this.shape.delimiter));
      this.met.note(blank ? 'blank-line' : 'footer-row', this.line, text);
      if (!blank) this.footer.push({ line: this.line, text });
      this.line += Math.max(1, lineEnds);
      this.at = next;
    }
  }

  private text(start: number, end: number): string {
    return this.decoder.decode(this.buffer.subarray(start, end));
  }
}

const behindLineEnd = (buffer: Uint8Array, at: number): number =>
  buffer[at] === CR && buffer[at + 1] === LF ? at + 2 : at + 1;

/** Place of the last line end before `to`, or `from` − 1. */
function lastLineEnd(buffer: Uint8Array, from: number, to: number): number {
  let at = to - 1;
  while (at >= from && buffer[at] !== LF && buffer[at] !== CR) at--;
  return at;
}

/** Place of the quote that closes a cell without quotes or line ends inside; −1 for the harder kind. */
function closingQuote(buffer: Uint8Array, open: number, delimiter: number): number {
  let at = open + 1;
  let byte = buffer[at];
  while (byte !== QUOTE && byte !== LF && byte !== CR) byte = buffer[++at];
  const after = buffer[at + 1];
  return byte === QUOTE && (after === delimiter || after === LF || after === CR) ? at : -1;
}
