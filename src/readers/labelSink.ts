import type { LabelColumn } from '../core/model/cells';
import { SPACE, TAB } from './byteCodes';
import type { CellSink } from './cellSink';
import { Levels } from './levels';

type Codes = LabelColumn['codes'];

const FIRST_CAPACITY = 1024;

/** Gathers a column of labels as codes of a list of levels: one byte each up to 256 levels, then two, then four. */
export class LabelSink implements CellSink {
  private readonly levels = new Levels();
  private codes: Codes;
  private rows = 0;

  constructor(expectedRows: number) {
    this.codes = new Uint8Array(Math.max(FIRST_CAPACITY, expectedRows));
  }

  take(bytes: Uint8Array, start: number, end: number): void {
    let at = start;
    while (at < end && (bytes[at] === SPACE || bytes[at] === TAB)) at++;
    this.push(at === end ? 0 : this.levels.codeOf(bytes, start, end));
  }

  absent(): void {
    this.push(0);
  }

  build(name: string): LabelColumn {
    const { codes, rows } = this;
    const roomy = codes.length > rows * 1.125 + FIRST_CAPACITY;
    const own = roomy ? codes.slice(0, rows) : codes.subarray(0, rows);
    return { kind: 'label', name, levels: this.levels.texts(), codes: own };
  }

  private push(code: number): void {
    if (code === 0x100 && this.codes instanceof Uint8Array) this.codes = Uint16Array.from(this.codes);
    if (code === 0x10000 && this.codes instanceof Uint16Array) this.codes = Int32Array.from(this.codes);
    if (this.rows === this.codes.length) {
      const grown = new (this.codes.constructor as new (length: number) => Codes)(this.rows * 2);
      grown.set(this.codes);
      this.codes = grown;
    }
    this.codes[this.rows++] = code;
  }
}
