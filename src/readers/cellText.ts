import { Cell } from '../core/model/cells';
import { nearestDouble, parseDecimal, type Decimal } from '../core/numeric/decimal';
import { readGrouped } from './thousands';

/** How the text of a number cell is read. */
export interface CellFormat {
  readonly decimal: '.' | ',';
  /** A mark that stands between groups of three digits even where that alone does not prove it; '' for none. */
  readonly thousands: string;
  /** Words that stand for a missing value. */
  readonly missing: ReadonlySet<string>;
  /** Numbers that do, however they are written. */
  readonly missingNumbers: readonly number[];
}

export function makeCellFormat(
  decimal: '.' | ',',
  thousands: string,
  missing: readonly string[],
): CellFormat {
  const numbers = missing.flatMap(word => {
    const value = parseDecimal(word.trim(), decimal) ?? parseDecimal(word.trim(), '.');
    return value === null ? [] : [nearestDouble(value)];
  });
  return { decimal, thousands, missing: new Set(missing), missingNumbers: numbers };
}

/** A number that no double can hold: infinite, or so large or small that it would become infinite or 0. */
export const UNUSABLE = 5;

/** What a number cell was found to hold. */
export interface CellText {
  readonly kind: (typeof Cell)[keyof typeof Cell] | typeof UNUSABLE;
  /** The number, or the limit of a censored reading. */
  readonly value: Decimal | null;
  /** The thousands mark met, or ''. */
  readonly thousands: string;
  /** Whether it is a number only if its one comma or point is a thousands mark, which nothing proves. */
  readonly unclear: boolean;
}

const CENSORED = /^([<>\u2264\u2265])=?\s*(.*)$/s;
const MAY_BE_NUMBER = /^[0-9+\-\u2212.,iI\u221e]/;
const INFINITE = /^[+\-\u2212]?(inf|infinity|\u221e)$/i;
const SMALLEST = 2.2250738585072014e-308; // below it doubles lose digits

const plain = (kind: CellText['kind'], value: Decimal | null = null): CellText => ({
  kind,
  value,
  thousands: '',
  unclear: false,
});

/** Reads the text of a number cell: a value, missing, censored (<0.02, > 2000), unusable, or text. */
export function readCellText(written: string, format: CellFormat): CellText {
  const text = written.trim();
  if (text === '' || format.missing.has(text)) return plain(Cell.Missing);
  const censored = CENSORED.exec(text);
  if (censored !== null) {
    const limit = readNumber(censored[2] ?? '', format);
    if (limit.kind !== Cell.Value) return limit;
    return { ...limit, kind: '<\u2264'.includes(censored[1] ?? '') ? Cell.Below : Cell.Above };
  }
  return readNumber(text, format);
}

function readNumber(text: string, format: CellFormat): CellText {
  if (!MAY_BE_NUMBER.test(text)) return plain(Cell.Text);
  const value = parseDecimal(text, format.decimal);
  if (value !== null) {
    if (format.missingNumbers.includes(nearestDouble(value))) return plain(Cell.Missing);
    return plain(isUsable(value) ? Cell.Value : UNUSABLE, value);
  }
  if (INFINITE.test(text)) return plain(UNUSABLE);
  const grouped = readGrouped(text, format.decimal);
  if (grouped === null) return plain(Cell.Text);
  if (grouped.ambiguous && grouped.mark !== format.thousands) return { ...plain(Cell.Text), unclear: true };
  return { ...plain(Cell.Value, parseDecimal(grouped.text, format.decimal)), thousands: grouped.mark };
}

function isUsable(value: Decimal): boolean {
  const size = Math.abs(nearestDouble(value));
  return value.digits === 0n || (size >= SMALLEST && size !== Infinity);
}
