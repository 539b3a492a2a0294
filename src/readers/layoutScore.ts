import { classify, isNumber, type Classes } from './cellClasses';
import type { Head, HeadRecord } from './headRecords';
import { findHeader, type HeaderRow } from './headerRow';

/** One way to read the head of a file, and how well it fits. */
export interface Candidate {
  readonly delimiter: string;
  readonly decimal: '.' | ',';
  readonly width: number;
  readonly head: Head;
  readonly classes: Classes;
  readonly place: HeaderRow;
  /** From 0 to 1. */
  readonly score: number;
}

/** Delimiters, the one that rather stands between cells than inside of them first. */
export const DELIMITERS: readonly string[] = ['\t', ';', '|', ','];

const MOST_WIDTHS = 6;
const WITHOUT_HEADER = 0.3;
const ONE_COLUMN = 0.5;
/** A table of words alone is one too. */
const FLOOR = 0.2;
const REGULAR_OTHER = 0.1;
const SCATTERED_OTHER = 0.3;

export interface Trial {
  readonly head: Head;
  readonly delimiter: string;
  readonly decimal: '.' | ',';
  readonly missing: readonly string[];
  /** Line of the header if a person named it; 0: none. */
  readonly headerLine: number | undefined;
}

/** The best way to read these records with this delimiter and decimal mark, over all widths they have; null: none. */
export function bestCandidate(trial: Trial): Candidate | null {
  const { head, delimiter, decimal, headerLine } = trial;
  const { records } = head;
  const classes = classify(records, decimal, trial.missing);
  const fixed = headerLine === undefined ? null : records.findIndex(record => record.line === headerLine);
  let best: Candidate | null = null;
  for (const width of widths(records, fixed)) {
    const place = findHeader(records, classes, width, fixed);
    const score = fit(records, classes, place, width, delimiter, fixed);
    if (best === null || score > best.score + 1e-9) {
      best = { delimiter, decimal, width, head, classes, place, score };
    }
  }
  return best;
}

/** Widths of records, the most frequent first; the width of the header where that is fixed. */
function widths(records: readonly HeadRecord[], fixed: number | null): readonly number[] {
  const own = fixed === null ? undefined : records[fixed];
  if (own !== undefined) return [own.cells.length];
  const counts = new Map<number, number>();
  for (const { cells } of records) counts.set(cells.length, (counts.get(cells.length) ?? 0) + 1);
  return [...counts]
    .sort((a, b) => b[1] - a[1] || b[0] - a[0])
    .slice(0, MOST_WIDTHS)
    .map(([width]) => width);
}

/** Constant width × share of numbers × a header that fits × no other delimiter that parts as well. */
function fit(
  records: readonly HeadRecord[],
  classes: Classes,
  place: HeaderRow,
  width: number,
  delimiter: string,
  fixed: number | null,
): number {
  const rows = records.slice(place.data);
  if (rows.length === 0) return place.header >= 0 ? 0.01 * width : 0;
  const regular = rows.reduce((sum, { cells }) => sum + regularity(cells.length, width), 0) / rows.length;
  let numbers = 0;
  let filled = 0;
  for (const row of classes.slice(place.data)) {
    for (const found of row) {
      if (found === 'empty') continue;
      filled++;
      if (isNumber(found)) numbers++;
    }
  }
  const share = FLOOR + (1 - FLOOR) * (filled === 0 ? 0 : numbers / filled);
  const header = place.header >= 0 || fixed === -1 ? 1 : WITHOUT_HEADER;
  const reach = 0.9 + (0.1 * rows.length) / records.length;
  return (
    regular *
    share *
    header *
    reach *
    tidiness(records, place.header, delimiter) *
    (width === 1 ? ONE_COLUMN : 1)
  );
}

function regularity(cells: number, width: number): number {
  if (cells === width) return 1;
  return cells < width && cells * 2 > width ? 0.5 : 0;
}

/**
 * 1 where no cell holds a delimiter that comes before the one on trial; little where one stands in the header and in every
 * row equally often: then that is what parts the cells.
 */
function tidiness(records: readonly HeadRecord[], header: number, delimiter: string): number {
  const bare = records.slice(Math.max(0, header)).filter(({ quoted }) => !quoted);
  let tidy = 1;
  for (const other of DELIMITERS.slice(0, Math.max(0, DELIMITERS.indexOf(delimiter)))) {
    const counts = bare.map(({ text }) => text.split(other).length - 1);
    const untidy = counts.filter(count => count > 0).length / Math.max(1, bare.length);
    tidy *= untidy === 1 && new Set(counts).size === 1 ? REGULAR_OTHER : 1 - SCATTERED_OTHER * untidy;
  }
  return tidy;
}
