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

/** A record that stands this far below the first data row is none of a header any more. */
const MOST_ROWS_ABOVE = 3;
const FILLED = 0.8;
/** Fewest records that say what a column holds, when only the end of the head is looked at. */
const SHORTEST_END = 3;

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
  const header = fixed ?? headerIndex(records, classes, width);
  const units = hasUnitsBelow(classes, header, width) ? header + 1 : null;
  const data = header >= 0 ? (units ?? header) + 1 : fixed === null ? firstData(classes, width) : 0;
  return { header, units, data, numeric: numericColumns(classes.slice(data), width, Infinity) };
}

function firstData(classes: Classes, width: number): number {
  const numeric = numericColumns(classes, width, Infinity);
  return Math.max(
    0,
    classes.findIndex(row => looksLikeData(row, numeric, width)),
  );
}

function headerIndex(records: readonly HeadRecord[], classes: Classes, width: number): number {
  const numeric = numericColumns(classes, width, SHORTEST_END);
  const first = classes.findIndex(row => looksLikeData(row, numeric, width));
  if (numeric.length === 0 || first < 0) {
    return records.findIndex(
      (record, i) => record.cells.length === width && !isLikeBelow(records, i, width, numeric),
    );
  }
  const filled = columnsFilled(classes, width);
  let above = -1;
  for (let i = 0; i < Math.min(records.length, first + MOST_ROWS_ABOVE + 1); i++) {
    if (i > first && above >= 0) break;
    const row = classes[i];
    if (
      row === undefined ||
      !isHeader(row, numeric, width, filled) ||
      isLikeBelow(records, i, width, numeric)
    )
      continue;
    const isUnits = above >= 0 && !row.includes('text');
    if (!isUnits) above = i;
  }
  return above;
}

/**
 * Columns of numbers, at least as many as words, over all records of this width or, where a preamble of the same width
 * stands above, over the end of them: half, a quarter, … down to `shortestEnd`.
 */
function numericColumns(classes: Classes, width: number, shortestEnd: number): readonly number[] {
  const rows = classes.filter(row => row.length === width);
  const ends = new Set([rows.length]);
  for (let end = rows.length >> 1; end >= shortestEnd && end > 0; end >>= 1) ends.add(end);
  const numeric: number[] = [];
  for (let column = 0; column < width; column++) {
    let numbers = 0;
    let texts = 0;
    for (let end = 1; end <= rows.length; end++) {
      const found = rows[rows.length - end]?.[column];
      if (isNumber(found)) numbers++;
      else if (found === 'text') texts++;
      if (numbers > 0 && numbers >= texts && ends.has(end)) {
        numeric.push(column);
        break;
      }
    }
  }
  return numeric;
}

/** How many columns have something in them. */
function columnsFilled(classes: Classes, width: number): number {
  let filled = 0;
  for (let column = 0; column < width; column++) {
    if (classes.some(row => row.length === width && row[column] !== 'empty')) filled++;
  }
  return filled;
}

/** Long enough, with more numbers than words where the numbers are. */
function looksLikeData(row: Classes[number], numeric: readonly number[], width: number): boolean {
  if (row.length > width || row.length * 2 < width) return false;
  const numbers = numeric.filter(column => isNumber(row[column])).length;
  return numbers > numeric.filter(column => row[column] === 'text' || row[column] === 'unit').length;
}

/** Words over the numbers, no number among them, and hardly a gap. */
function isHeader(row: Classes[number], numeric: readonly number[], width: number, filled: number): boolean {
  if (row.length !== width || numeric.some(column => isNumber(row[column]))) return false;
  const words = numeric.filter(column => row[column] === 'text' || row[column] === 'unit').length;
  const own = row.filter(found => found !== 'empty').length;
  return words >= FILLED * numeric.length && own >= FILLED * filled - 1;
}

/**
 * Whether this record is a row of labels like those below: one of its words stands below in the same column, or a column
 * of ids (T01, T02, …) is written alike from here on down.
 */
function isLikeBelow(
  records: readonly HeadRecord[],
  index: number,
  width: number,
  numeric: readonly number[],
): boolean {
  const own = records[index];
  if (own === undefined) return false;
  const below = records
    .slice(index + 1)
    .filter(record => record.cells.length === width && record.text !== own.text);
  return own.cells.some((cell, column) => {
    const word = cell.trim();
    if (word === '') return false;
    if (below.some(record => record.cells[column]?.trim() === word)) return true;
    if (numeric.includes(column) || !/\d/.test(word) || below.length < 2) return false;
    return below.every(record => patternOf(record.cells[column] ?? '') === patternOf(word));
  });
}

const patternOf = (text: string): string => text.trim().replace(/\d/g, '0').replace(/\p{L}/gu, 'a');

/** Nothing but units and gaps under the header, a unit over numbers (or over nothing at all) among them. */
function hasUnitsBelow(classes: Classes, header: number, width: number): boolean {
  const row = classes[header + 1];
  if (header < 0 || row === undefined || row.length > width) return false;
  const numeric = numericColumns(classes.slice(header + 2), width, Infinity);
  const isLast = header + 2 === classes.length;
  const only = row.every(found => found === 'unit' || found === 'empty');
  return only && row.some((found, column) => found === 'unit' && (isLast || numeric.includes(column)));
}
