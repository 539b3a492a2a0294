/** First words of rows that sum up the rows above. */
const SUMMING =
  /^(grand |overall |sub)?(means?|averages?|avg|totals?|sums?|s\.?d\.?|std\.?( ?dev\.?)?|stdev|standard deviation|st\.? ?abw\.?|mittel(wert)?|durchschnitt|summe|gesamt|standardabweichung|moyenne|somme|[ée]cart[- ]type|media|promedio|suma|r\.?s\.?d\.?( ?%)?|%? ?rsd|cv|c\.v\.|cv ?%|%? ?cv|median|min(imum)?|max(imum)?|count|n|anzahl|variance|var|s\.?e\.?m?\.?|range)( ?\([^)]*\))?\s*[:=]?$/i;

/** One record at the foot of a file. */
export interface FootRecord {
  readonly cells: readonly string[];
}

/**
 * How many of the last records do not belong to the table: rows that sum it up (a cell reads Mean, Total, SD …, a word that
 * stands nowhere else in its column) and single notes below the table. Blank records between and behind them count too.
 * @param records the last records of the file, in order
 * @param sample the first data rows
 * @param width how many columns the table has
 */
export function footLength(
  records: readonly FootRecord[],
  sample: readonly (readonly string[])[],
  width: number,
): number {
  let length = 0;
  for (let taken = 1; taken <= records.length; taken++) {
    const record = records[records.length - taken];
    if (record === undefined) break;
    if (isBlank(record.cells)) continue;
    const above = records.slice(0, records.length - taken);
    if (!isNote(record.cells, width) && !sumsUp(record.cells, above, sample)) break;
    length = taken;
  }
  return length;
}

export const isBlank = (cells: readonly string[]): boolean => cells.every(cell => cell.trim() === '');

/** A line of text in a table of three columns or more. */
function isNote(cells: readonly string[], width: number): boolean {
  return cells.length === 1 && width >= 3 && /\p{L}/u.test(cells[0] ?? '');
}

function sumsUp(
  cells: readonly string[],
  above: readonly FootRecord[],
  sample: readonly (readonly string[])[],
): boolean {
  return cells.some((cell, column) => {
    const word = cell.trim();
    if (!SUMMING.test(word)) return false;
    const stands = (row: readonly string[]): boolean =>
      row[column]?.trim().toLowerCase() === word.toLowerCase();
    return !above.some(record => stands(record.cells)) && !sample.some(stands);
  });
}
