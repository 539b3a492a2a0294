import { Cell } from '../core/model/cells';
import { nearestDouble } from '../core/numeric/decimal';
import type { CellSink } from './cellSink';
import { readCellText, UNUSABLE, type CellFormat } from './cellText';
import { Levels } from './levels';
import { PlainNumber } from './numberCell';

export const MOST_DISTINCT = 1000;
const LABELS_NAMED = 50;
const NEARLY = 0.9;

/** What a column holds, without its values. */
export interface ColumnSurvey {
  /** 'mixed': numbers and texts; 'empty': neither. */
  readonly kind: 'number' | 'label' | 'mixed' | 'empty';
  /** Cells that are numbers, censored readings among them. */
  readonly values: number;
  readonly missing: number;
  /** Filled cells that are no numbers. */
  readonly texts: number;
  /** Different filled cells, as written; not counted beyond 1000. */
  readonly distinct: number;
  /** The first 50 of them, in order of first appearance. */
  readonly labels: readonly { readonly label: string; readonly count: number }[];
  readonly min: number | null;
  readonly max: number | null;
  /** Almost every filled cell is another one: ids rather than labels. */
  readonly nearlyUnique: boolean;
}

/** Looks at every cell of a column. */
export class SurveySink implements CellSink {
  private readonly number = new PlainNumber();
  private readonly decoder = new TextDecoder();
  private readonly levels = new Levels();
  private readonly counts = new Int32Array(LABELS_NAMED + 1);
  private readonly mark: number;
  private values = 0;
  private missing = 0;
  private texts = 0;
  private min = Infinity;
  private max = -Infinity;
  /** Filled cells up to the one that was the last different one counted. */
  private counted = 0;

  constructor(private readonly format: CellFormat) {
    this.mark = format.decimal.charCodeAt(0);
  }

  take(bytes: Uint8Array, start: number, end: number): void {
    if (this.number.read(bytes, start, end, this.mark)) {
      this.value(this.number.mantissa / 10 ** this.number.decimals);
    } else if (!this.takeText(this.decoder.decode(bytes.subarray(start, end)))) return;
    if (this.levels.size > MOST_DISTINCT) return;
    const level = this.levels.codeOf(bytes, start, end);
    this.counted++;
    if (level <= LABELS_NAMED) this.counts[level] = (this.counts[level] ?? 0) + 1;
  }

  absent(): void {
    this.missing++;
  }

  result(): ColumnSurvey {
    const { values, missing, texts } = this;
    const distinct = this.levels.size - 1;
    const labels = this.levels.texts().slice(1, LABELS_NAMED + 1);
    return {
      kind: values > 0 ? (texts > 0 ? 'mixed' : 'number') : texts > 0 ? 'label' : 'empty',
      values,
      missing,
      texts,
      distinct,
      labels: labels.map((label, i) => ({ label, count: this.counts[i + 1] ?? 0 })),
      min: values > 0 ? this.min : null,
      max: values > 0 ? this.max : null,
      nearlyUnique: distinct > 1 && distinct >= NEARLY * this.counted,
    };
  }

  /** @returns whether the cell is filled */
  private takeText(text: string): boolean {
    const { kind, value } = readCellText(text, this.format);
    if (kind === Cell.Missing) this.missing++;
    else if (kind === Cell.Text || kind === UNUSABLE || value === null) this.texts++;
    else this.value(nearestDouble(value));
    return kind !== Cell.Missing;
  }

  private value(value: number): void {
    this.values++;
    if (value < this.min) this.min = value;
    if (value > this.max) this.max = value;
  }
}
