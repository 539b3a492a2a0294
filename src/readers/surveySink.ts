import { Cell } from '../core/model/cells';
import { nearestDouble } from '../core/numeric/decimal';
import type { CellSink } from './cellSink';
import { readCellText, UNUSABLE, type CellFormat } from './cellText';
import { Levels } from './levels';
import { PlainNumber } from './numberCell';

const MOST_DISTINCT = 1000;
const LABELS_NAMED = 50;
const NEARLY = 0.9;
const MISSING = 'missing';
const TEXT = 'text';

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
  /** By level. */
  private readonly counts = new Int32Array(MOST_DISTINCT + 2);
  private readonly known: (number | typeof MISSING | typeof TEXT | undefined)[] = [];
  private readonly mark: number;
  private values = 0;
  private missing = 0;
  private texts = 0;
  private min = Infinity;
  private max = -Infinity;
  /** Filled cells while different ones were counted. */
  private counted = 0;

  constructor(private readonly format: CellFormat) {
    this.mark = format.decimal.charCodeAt(0);
  }

  take(bytes: Uint8Array, start: number, end: number): void {
    const plain = this.number.read(bytes, start, end, this.mark);
    if (plain && !this.number.isAmong(this.format.missingNumbers)) {
      this.value(this.number.mantissa / 10 ** this.number.decimals);
      if (this.levels.size <= MOST_DISTINCT) this.count(this.levels.codeOf(bytes, start, end));
      return;
    }
    const level = this.levels.size <= MOST_DISTINCT ? this.levels.codeOf(bytes, start, end) : 0;
    const known = level > 0 ? this.known[level] : undefined;
    const found = known ?? this.classOf(bytes, start, end);
    if (level > 0) this.known[level] = found;
    if (found === MISSING) {
      this.missing++;
      return;
    }
    if (found === TEXT) this.texts++;
    else this.value(found);
    if (level > 0) this.count(level);
  }

  absent(): void {
    this.missing++;
  }

  result(): ColumnSurvey {
    const { values, missing, texts } = this;
    const filled = this.levels.texts().flatMap((label, level) => {
      const count = this.counts[level] ?? 0;
      return count > 0 ? [{ label, count }] : []; // words for a missing value stand among the levels
    });
    const distinct = filled.length;
    return {
      kind: values > 0 ? (texts > 0 ? 'mixed' : 'number') : texts > 0 ? 'label' : 'empty',
      values,
      missing,
      texts,
      distinct,
      labels: filled.slice(0, LABELS_NAMED),
      min: values > 0 ? this.min : null,
      max: values > 0 ? this.max : null,
      nearlyUnique: distinct > 1 && distinct >= NEARLY * this.counted,
    };
  }

  private classOf(bytes: Uint8Array, start: number, end: number): number | typeof MISSING | typeof TEXT {
    const { kind, value } = readCellText(this.decoder.decode(bytes.subarray(start, end)), this.format);
    if (kind === Cell.Missing) return MISSING;
    return kind === Cell.Text || kind === UNUSABLE || value === null ? TEXT : nearestDouble(value);
  }

  private count(level: number): void {
    this.counts[level] = (this.counts[level] ?? 0) + 1;
    this.counted++;
  }

  private value(value: number): void {
    this.values++;
    if (value < this.min) this.min = value;
    if (value > this.max) this.max = value;
  }
}
