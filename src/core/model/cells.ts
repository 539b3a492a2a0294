import type { CellRef } from './problem';

/**
 * Decimals as written. value[i] = (shift + steps[i]) / (10^decimals · per), exactly: ties, equality, sums and
 * permutations are integer arithmetic. `per` is 1, but for unit means the least common multiple of the counts.
 * 'wide' only when a value needs more than 53 bits after the shift: exact[i] is value[i] · 10^decimals · per, offsets[i]
 * is value[i] − shift / (10^decimals · per) rounded once, and `order` stands in the order of the exact values, equal
 * exactly where they are, across samples of one frame: ties and ranks stay exact. `exact` is null for computed doubles such as logs: there shift is 0 and offsets the values.
 */
export type Numbers =
  | {
      readonly form: 'steps';
      readonly decimals: number;
      readonly per: number;
      readonly shift: bigint;
      readonly steps: Int32Array | Float64Array;
    }
  | {
      readonly form: 'wide';
      readonly decimals: number;
      readonly per: bigint;
      readonly shift: bigint;
      readonly offsets: Float64Array;
      readonly order: Int32Array | Float64Array;
      readonly exact: readonly bigint[] | BigInt64Array | null;
    };

/** What one cell of a number column holds. Below and Above are censored readings such as <0.02 (the limit is the value). */
export const Cell = { Value: 0, Missing: 1, Below: 2, Above: 3, Text: 4 } as const;

export interface NumberColumn {
  readonly kind: 'number';
  readonly name: string;
  readonly unit: string | null;
  /** One entry a data row; what stands at a row that is not a Value, Below or Above is 0 and means nothing. */
  readonly numbers: Numbers;
  /** Cell code of each row; null: every row is a Value. */
  readonly state: Uint8Array | null;
  /** The first 20 cells that are Text, as written. */
  readonly texts: readonly { readonly row: number; readonly text: string }[];
}

export interface LabelColumn {
  readonly kind: 'label';
  readonly name: string;
  /** As written, untrimmed; level 0 is always '' (missing). */
  readonly levels: readonly string[];
  /** Index into levels, one a data row. */
  readonly codes: Uint8Array | Uint16Array | Int32Array;
}

/** One header cell: its exact text (unit taken off only into `unit`, the name keeps the header's exact text). */
export interface Field {
  readonly name: string;
  readonly unit: string | null;
  readonly file: number;
}

/**
 * What was read. Only the columns asked for are held; `fields` names them all. Rows are data rows in file order;
 * with two files (one group a file) the rows of the second follow those of the first and fields are those of the first.
 */
export interface Table {
  readonly rows: number;
  readonly fields: readonly Field[];
  readonly readings: readonly Reading[];
  /** The column as numbers or as labels; throws when it was not asked for in that kind. */
  numbers(field: number): NumberColumn;
  labels(field: number): LabelColumn;
  /** The line on which a row starts, from 1. */
  line(row: number): number;
  /** Index of the file a row came from. */
  file(row: number): number;
  /** The row that starts on this line, or −1. */
  rowAt(file: number, line: number): number;
  /** The cells of a row as written (unquoted), or null when the reader was not asked to keep that row. */
  cells(row: number): readonly string[] | null;
}

/** What the reader decided and what it met: nothing is dropped in silence. */
export interface Reading {
  readonly encoding: string;
  readonly delimiter: string;
  readonly decimal: '.' | ',';
  readonly thousands: string;
  readonly headerLine: number;
  readonly unitsLine: number | null;
  readonly footer: readonly { readonly line: number; readonly text: string }[];
  readonly missingWords: readonly string[];
  /** 'blank-line', 'ragged-short', 'ragged-long', 'preamble', 'units-row', 'footer-row', 'encoding-fallback', … */
  readonly met: readonly { readonly what: string; readonly at: CellRef; readonly text: string }[];
  /** How often each was met; `met` names the first 20 of a kind. */
  readonly metCounts: Readonly<Record<string, number>>;
  readonly bytes: number;
  readonly lines: number;
}
