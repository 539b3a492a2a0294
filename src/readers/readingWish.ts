import type { Below } from '../core/model/settings';

/** How to read a file, as far as a person (or a settings block) has said; what is left out is decided from the file. */
export interface ReadingWish {
  readonly encoding?: string;
  /** One character. */
  readonly delimiter?: string;
  readonly decimal?: '.' | ',';
  /** One character, '' for none. */
  readonly thousands?: string;
  /** Line of the header, from 1; 0: the file has none, columns are called #1, #2, … */
  readonly header?: number;
  readonly missing?: readonly string[];
  readonly below?: Below;
}

/** Cells that hold no value, unless a person says otherwise. The empty cell always does. */
export const MISSING_WORDS: readonly string[] = [
  'NA',
  'N/A',
  'na',
  'n/a',
  'NaN',
  'nan',
  '-',
  '.',
  'null',
  'NULL',
  '#N/A',
  '#DIV/0!',
];
