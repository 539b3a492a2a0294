import type { Reading } from '../model/cells';
import type { EvidenceDescriptor, Finding } from '../model/comparison';
import { metFinding, passedOver, withoutLeftOut, type PassedOver } from './passedOver';

/** Digits that could stand before a decimal comma, and behind it. */
const WHOLE = /^\s*[+-]?\d{1,15}\s*$/;
const DECIMALS = /^\s*\d+\s*$/;

/** Whether two neighbouring cells of a row can be one number that its decimal comma has split in a comma-separated file. */
function isSplitNumber(text: string, delimiter: string): boolean {
  if (delimiter !== ',' || text.includes('"')) return false;
  const cells = text.split(delimiter);
  return cells.some((cell, at) => WHOLE.test(cell) && DECIMALS.test(cells[at + 1] ?? ''));
}

/** Rows with more cells than columns: a question where a split number could have moved the cells of the row, else a warning. */
export function longRows(reading: Reading, rows: PassedOver | null): readonly Finding[] {
  if (rows === null) return [];
  const split = rows.met.filter(({ text }) => isSplitNumber(text, reading.delimiter));
  if (split.length === 0) return [metFinding('ragged-rows', 'warn', rows, { what: 'long' })];
  const all = split.length === rows.met.length;
  const facts = { what: 'split', text: split[0]?.text ?? '' };
  return [metFinding('ragged-rows', 'ask', { count: all ? rows.count : split.length, met: split }, facts)];
}

/** Rows with fewer cells than columns. */
export const shortRows = (rows: PassedOver | null): readonly Finding[] =>
  rows === null ? [] : [metFinding('ragged-rows', 'warn', rows, { what: 'short' })];

/**
 * Rows that do not have as many cells as the table has columns. A cell too many is not used, and where it comes from a
 * decimal comma in a comma-separated file the value read is another one: 1,5 would be read as 1. Rows left out are not
 * looked at.
 */
export const raggedRows: EvidenceDescriptor<'ragged-rows'> = {
  id: 'ragged-rows',
  thresholds: [],
  references: [],
  look(seen) {
    const readings = seen.table?.readings ?? [];
    return readings.flatMap(reading => {
      const of = (what: string): PassedOver | null => {
        const met = passedOver(reading, what);
        return met === null ? null : withoutLeftOut(met, seen);
      };
      return [...longRows(reading, of('ragged-long')), ...shortRows(of('ragged-short'))];
    });
  },
  canTell: () => true,
  title: t => t('rows with cells too many or too few'),
  say({ facts }, t) {
    const count = Number(facts['count']);
    switch (facts['what']) {
      case 'split':
        return count === 1
          ? t(
              '1 row has more cells than there are columns, as a decimal comma would make of one number: "{0}". Correct the row, name the delimiter, or leave it out with a reason.',
              String(facts['text']),
            )
          : t(
              '{0} rows have more cells than there are columns, as a decimal comma would make of one number: "{1}". Correct the rows, name the delimiter, or leave them out with a reason.',
              count,
              String(facts['text']),
            );
      case 'long':
        return count === 1
          ? t('1 row has more cells than there are columns: the cells beyond the last column are not used.')
          : t(
              '{0} rows have more cells than there are columns: the cells beyond the last column are not used.',
              count,
            );
      default:
        return count === 1
          ? t('1 row has fewer cells than there are columns: the cells that are not there count as missing.')
          : t(
              '{0} rows have fewer cells than there are columns: the cells that are not there count as missing.',
              count,
            );
    }
  },
};
