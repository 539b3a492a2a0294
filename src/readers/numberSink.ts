import { Cell, type NumberColumn } from '../core/model/cells';
import { Refusal, type CellRef } from '../core/model/problem';
import { NumbersBuilder } from '../core/numeric/numbersBuilder';
import type { CellSink } from './cellSink';
import { readCellText, UNUSABLE, type CellFormat } from './cellText';
import type { Met } from './met';
import { PlainNumber } from './numberCell';

const TEXTS_KEPT = 20;

/** Where the cells come from: changes from file to file. */
export interface CellOrigin {
  readonly format: CellFormat;
  readonly met: Met;
  readonly field: number;
  /** Whether a row is kept as it stands because a person named it: what it holds is no reason to refuse the file. */
  readonly isKept: (line: number) => boolean;
}

/** Gathers a column of numbers. */
export class NumberSink implements CellSink {
  private readonly builder: NumbersBuilder;
  private state: Uint8Array | null = null;
  private rows = 0;
  private readonly texts: { row: number; text: string }[] = [];
  private readonly number = new PlainNumber();
  private readonly decoder = new TextDecoder();
  private mark = 0;
  private missingNumbers: readonly number[] = [];
  private origin: CellOrigin | null = null;

  constructor(expectedRows: number) {
    this.builder = new NumbersBuilder(expectedRows);
  }

  /** The next cells come from here. */
  from(origin: CellOrigin): void {
    this.origin = origin;
    this.missingNumbers = origin.format.missingNumbers;
    this.mark = origin.format.decimal.charCodeAt(0);
  }

  take(bytes: Uint8Array, start: number, end: number, line: number): void {
    const { number } = this;
    if (number.read(bytes, start, end, this.mark) && !number.isAmong(this.missingNumbers)) {
      this.builder.add(number.mantissa, number.decimals);
    } else this.takeUnusual(bytes, start, end, line);
    this.rows++;
  }

  private takeUnusual(bytes: Uint8Array, start: number, end: number, line: number): void {
    const long = this.missingNumbers.length > 0 ? null : this.number.readLong(bytes, start, end, this.mark);
    if (long !== null) this.builder.addInteger(long, this.number.decimals);
    else this.takeText(this.decoder.decode(bytes.subarray(start, end)), line);
  }

  absent(): void {
    this.builder.addNothing();
    this.setState(Cell.Missing);
    this.rows++;
  }

  /** @throws Refusal number-unusable for a number that no double can hold, but in a row that is kept */
  private takeText(text: string, line: number): void {
    if (this.origin === null) throw new RangeError('cells without an origin');
    const { format, met, field, isKept } = this.origin;
    const read = readCellText(text, format);
    const { value, thousands, unclear } = read;
    const at: CellRef = { file: met.file, line, field };
    if (read.kind === UNUSABLE && !isKept(line))
      throw new Refusal('number-unusable', { text: text.trim() }, at);
    const kind = read.kind === UNUSABLE ? Cell.Text : read.kind;
    if (value === null || kind === Cell.Text) this.builder.addNothing();
    else this.builder.addInteger(value.digits, value.decimals);
    if (kind !== Cell.Value) this.setState(kind);
    if (kind === Cell.Text && this.texts.length < TEXTS_KEPT) this.texts.push({ row: this.rows, text });
    if (kind === Cell.Missing && text.trim() !== '') met.note('missing-word', line, text.trim(), field);
    if (thousands !== '') met.note('thousands-mark', line, text.trim(), field);
    if (unclear) met.note('thousands-unclear', line, text.trim(), field);
  }

  private setState(code: number): void {
    this.state ??= new Uint8Array(1024);
    if (this.rows >= this.state.length) {
      const grown = new Uint8Array(Math.max(this.rows + 1, this.state.length * 2));
      grown.set(this.state);
      this.state = grown;
    }
    this.state[this.rows] = code;
  }

  build(name: string, unit: string | null): NumberColumn {
    let state: Uint8Array | null = null;
    if (this.state !== null) {
      state = new Uint8Array(this.rows);
      state.set(this.state.subarray(0, this.rows));
    }
    return { kind: 'number', name, unit, numbers: this.builder.build(), state, texts: this.texts };
  }
}
