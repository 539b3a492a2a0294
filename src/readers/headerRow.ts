import { isNumber, type Classes } from './cellClasses';
import type { HeadRecord } from './headRecords';

/** Where header, units row and data stand among the records of the head. */
export interface HeaderRow {
  /** Index of the record; −1: none was found. */
  readonly header: number;
  readonly units: number | null;
  /** Index of the first record behind them. */
  readonly data: number;
  /** Columns that hold numbers. */
  readonly numeric: readonly number[];
}

/** Rows that may stand above a header and look like data all the same. */
const MOST_ROWS_ABOVE = 3;
const FILLED = 0.8;

/**
 * Finds the header of a table of this width: the record over the numbers whose cells are words and stand in no row below.
 * @param fixed index of the record that a person named as header, −1: there is none, null: to be found
 */
export function findHeader(
  records: readonly HeadRecord[],
  classes: Classes,
  width: number,
  fixed: number | null,
): HeaderRow {
  const numeric = numericColumns(classes, width, (fixed ?? -1) + 1);
  if (fixed !== null) return withUnits(classes, numeric, fixed, width);
  const isData = (row: Classes[number] | undefined): boolean => looksLikeData(row, numeric, width);
  const first = classes.findIndex(isData);
  if (numeric.length === 0 || first < 0) {
    const header = records.findIndex(
      (record, i) => record.cells.length === width && !recurs(records, i, width),
    );
    return withUnits(classes, numeric, header, width);
  }
  let found = -1;
  let dataAbove = 0;
  for (let i = 0; i < records.length; i++) {
    if (isData(classes[i])) dataAbove++;
    if (dataAbove > MOST_ROWS_ABOVE) break;
    if (isHeader(records[i], classes[i], numeric, width) && !recurs(records, i, width)) {
      const again = found >= 0 && records[found]?.text === records[i]?.text;
      if (!again) found = i;
    }
  }
  return found < 0
    ? { header: -1, units: null, data: first, numeric }
    : withUnits(classes, numeric, found, width);
}

function numericColumns(classes: Classes, width: number, from: number): readonly number[] {
  const numeric: number[] = [];
  for (let column = 0; column < width; column++) {
    let numbers = 0;
    let texts = 0;
    for (const row of classes.slice(from)) {
      if (row.length !== width) continue;
      if (isNumber(row[column])) numbers++;
      else if (row[column] === 'text') texts++;
    }
    if (numbers > 0 && numbers >= texts) numeric.push(column);
  }
  return numeric;
}

/** Long enough, numbers where the numbers are, and more of them than words. */
function looksLikeData(row: Classes[number] | undefined, numeric: readonly number[], width: number): boolean {
  if (row === undefined || row.length > width || row.length * 2 < width) return false;
  const numbers = numeric.filter(column => isNumber(row[column])).length;
  const words = numeric.filter(column => row[column] === 'text' || row[column] === 'unit').length;
  return numbers > 0 && numbers >= words;
}

function isHeader(
  record: HeadRecord | undefined,
  row: Classes[number] | undefined,
  numeric: readonly number[],
  width: number,
): boolean {
  if (record === undefined || row === undefined || row.length !== width) return false;
  const words = numeric.filter(column => row[column] === 'text' || row[column] === 'unit').length;
  const onlyUnits = numeric.every(column => row[column] !== 'text') && row.every(found => found !== 'text');
  const filled = record.cells.filter(cell => cell.trim() !== '').length;
  if (onlyUnits && filled < width) return false;
  return (
    words >= FILLED * numeric.length &&
    filled >= FILLED * width - 1 &&
    !numeric.some(column => isNumber(row[column]))
  );
}

/** Whether a word of this record stands in the same column of a later one: then it is a label, and this is a row of data. */
function recurs(records: readonly HeadRecord[], index: number, width: number): boolean {
  const own = records[index];
  if (own === undefined) return false;
  const below = records
    .slice(index + 1)
    .filter(record => record.cells.length === width && record.text !== own.text);
  return own.cells.some(
    (cell, column) => cell.trim() !== '' && below.some(record => record.cells[column] === cell),
  );
}

function withUnits(classes: Classes, numeric: readonly number[], header: number, width: number): HeaderRow {
  const below = classes[header + 1];
  const isUnits =
    header >= 0 &&
    below !== undefined &&
    below.length <= width &&
    below.every(found => found === 'unit' || found === 'empty') &&
    numeric.some(column => below[column] === 'unit');
  return { header, units: isUnits ? header + 1 : null, data: header + (isUnits ? 2 : 1), numeric };
}
