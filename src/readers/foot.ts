/** What rows are called that sum up the rows above. */
const SUMMING =
  /^(?:(?:grand|overall|sub)[ -]?)?(?:means?|averages?|avg|totals?|sums?|std\.? ?dev\.?|stdev|standard deviation|st\. ?abw\.?|mittel(?:wert)?|durchschnitt|summe|gesamt|standardabweichung|moyenne|somme|[ée]cart[- ]type|promedio|suma)(?: ?\([^)]*\))?\s*[:=]?$/i;

/** Shorter names that are labels as well: they count only beside one of those above. */
const SUMMING_BESIDE =
  /^(?:s\.?d\.?|s\.?e\.?m?\.?|r\.?s\.?d\.?|c\.?v\.?|std\.?|n|median|min(?:imum)?|max(?:imum)?|count|anzahl|var(?:iance)?|range|media)(?: ?%| ?\([^)]*\))?\s*[:=]?$/i;

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
  const within = (names: readonly RegExp[]): { length: number; sumsUp: boolean } => {
    const found = { length: 0, sumsUp: false };
    for (let taken = 1; taken <= records.length; taken++) {
      const cells = records[records.length - taken]?.cells ?? [];
      if (isBlank(cells)) continue;
      const above = records.slice(0, records.length - taken);
      const named = names.findIndex(name => isCalled(cells, name, above, sample));
      if (named < 0 && !isNote(cells, width)) break;
      found.length = taken;
      found.sumsUp ||= named === 0;
    }
    return found;
  };
  const both = within([SUMMING, SUMMING_BESIDE]);
  return both.sumsUp ? both.length : within([SUMMING]).length;
}

export const isBlank = (cells: readonly string[]): boolean => cells.every(cell => cell.trim() === '');

/** A line of text in a table of three columns or more. */
function isNote(cells: readonly string[], width: number): boolean {
  return cells.length === 1 && width >= 3 && /\p{L}/u.test(cells[0] ?? '');
}

/** Whether a cell bears such a name, as no other cell of its column does. */
function isCalled(
  cells: readonly string[],
  name: RegExp,
  above: readonly FootRecord[],
  sample: readonly (readonly string[])[],
): boolean {
  return cells.some((cell, column) => {
    const word = cell.trim();
    if (!name.test(word)) return false;
    const stands = (row: readonly string[]): boolean =>
      row[column]?.trim().toLowerCase() === word.toLowerCase();
    return !above.some(record => stands(record.cells)) && !sample.some(stands);
  });
}
