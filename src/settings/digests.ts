import { Entry, selectRows } from '../compare/selection';
import type { Measured } from '../compare/measuredValues';
import type { LabelColumn, Table } from '../core/model/cells';
import type { Hasher } from '../core/model/hasher';
import type { Settings } from '../core/model/settings';
import { Cell } from '../core/model/cells';
import { cellState } from '../compare/measuredValues';
import { rolesOf } from '../compare/roles';
import { exactText } from '../core/numeric/numbers';

type CreateHasher = () => Hasher;

const LINES_AT_ONCE = 4096;

/**
 * SHA-256 of the cells used: for each used row in file order `label TAB value [TAB unit ids…] LF` in UTF-8; values as the
 * shortest exact decimals with a point, labels after merging, missing as empty, censored readings with their mark,
 * left-out rows absent. A row that is a summary has `n TAB mean TAB SD` (or `x TAB n`) for its value. `file`: only the rows
 * of that file. Anyone can repeat it with common tools.
 */
export function cellsDigest(
  table: Table,
  settings: Settings,
  createHasher: CreateHasher,
  file: number | null = null,
): string {
  const { rows, group, state, groups, measured, ids } = selectRows(table, settings);
  const summary = summaryColumns(table, settings);
  const hasher = createHasher();
  let lines: string[] = [];
  for (let at = 0; at < rows.length; at += 1) {
    const row = rows[at] ?? 0;
    if (state[at] === Entry.LeftOut || (file !== null && table.file(row) !== file)) continue;
    const index = group[at] ?? 0;
    const value =
      summary === null
        ? valueText(measured[index], row)
        : summary.map(column => valueText(column, row)).join('\t');
    lines.push(cellLine(groups[index] ?? '', value, ids, row));
    if (lines.length === LINES_AT_ONCE) {
      hasher.update(lines.join(''));
      lines = [];
    }
  }
  hasher.update(lines.join(''));
  return hasher.hex();
}

/** SHA-256 of a row's cells as written (unquoted), joined by TAB, in UTF-8. */
export function rowDigest(cells: readonly string[], createHasher: CreateHasher): string {
  const hasher = createHasher();
  hasher.update(cells.join('\t'));
  return hasher.hex();
}

/**
 * The record id: SHA-256 of the lines of a block above [record], each without trailing spaces and ended by LF, in UTF-8.
 * Indentation and line ends of the notebook are gone before (findBlocks), so they do not change it.
 */
export function recordId(text: string, createHasher: CreateHasher): string {
  const lines = text.split('\n').map(line => line.trimEnd());
  const end = lines.indexOf('[record]');
  const hasher = createHasher();
  hasher.update(
    lines
      .slice(0, end < 0 ? lines.length : end)
      .map(line => `${line}\n`)
      .join(''),
  );
  return hasher.hex();
}

/** The columns that make up a summary, in the order in which they are digested; null where rows are values. */
function summaryColumns(table: Table, settings: Settings): readonly Measured[] | null {
  const { summary } = rolesOf(settings, table.fields);
  if (summary === null) return null;
  const fields = summary.x === null ? [summary.n, summary.mean, summary.sd] : [summary.x, summary.n];
  return fields
    .filter(field => field !== null)
    .map(field => ({ kind: 'numbers', field, column: table.numbers(field) }));
}

function cellLine(label: string, value: string, ids: readonly LabelColumn[], row: number): string {
  const path = ids.map(({ levels, codes }) => `\t${levels[codes[row] ?? 0] ?? ''}`).join('');
  return `${label}\t${value}${path}\n`;
}

function valueText(measured: Measured | undefined, row: number): string {
  if (measured === undefined) return '';
  const state = cellState(measured, row);
  if (state === Cell.Missing) return '';
  if (measured.kind === 'outcomes') return measured.column.levels[measured.column.codes[row] ?? 0] ?? '';
  const mark = state === Cell.Below ? '<' : state === Cell.Above ? '>' : '';
  return `${mark}${exactText(measured.column.numbers, row)}`;
}
