import type { Count, Summary } from '../core/model/groups';
import type { LeftOut, Measure, OptionValue, Question } from '../core/model/settings';
import type { ReadingWish } from '../readers/readingWish';

export type Variance = 'separate' | 'pooled' | 'known';
export type DfRule = 'welch' | 'smaller';
export type Curve = 't' | 'normal' | 'normal-over-30';

/** What a surface may have been told; everything left open is decided by `settle` or asked. */
interface Told {
  /** Exact header texts, or '#3'. */
  measured: readonly string[];
  label: string;
  /** Wide layout: one column a group. */
  columns: readonly string[];
  /** Rows are summaries: columns n, mean, sd; or x, n. */
  summary: boolean;
  /** Groups typed as numbers: no file. */
  typed: readonly (Summary | Count)[];
  test: string;
  reference: string;
  /** Unit columns, outermost first; 'none': a person said that rows are independent. */
  per: readonly string[] | 'none';
  /** Pair column; 'none': ids start again in each group. */
  pair: string;
  measure: Measure;
  success: string;
  variance: Variance;
  /** Known standard deviations: test, reference. */
  sigma: readonly [number, number];
  df: DfRule;
  curve: Curve;
  method: string;
  question: Question;
  /** Bounds of the margin in units of the measure: below and above 0. */
  margin: readonly [number, number];
  matters: number;
  against: number;
  confidence: number;
  /** Closed ranges of line numbers. */
  rows: readonly (readonly [number, number])[];
  where: readonly (readonly [column: string, label: string])[];
  leaveOut: readonly LeftOut[];
  same: readonly (readonly [from: string, to: string])[];
  onlyChosen: boolean;
  /** Keys declared by methods and evidence. */
  options: Readonly<Record<string, OptionValue>>;
}

/** A comparison as asked for, by names: files and how to read them are always there, all else may be left open. */
export type Request = {
  /** Paths relative to the root, '/' separated. */
  readonly files: readonly string[];
  readonly wish: ReadingWish;
} & { readonly [K in keyof Told]?: Told[K] };
