import { Cell } from '../core/model/cells';
import { makeCellFormat, readCellText, UNUSABLE, type CellFormat } from './cellText';
import type { HeadRecord } from './headRecords';
import { readGrouped } from './thousands';
import { unitOfCell } from './unitText';

/** What a cell of the head looks like under one decimal mark. */
export type CellClass = 'empty' | 'number' | 'perhaps' | 'unit' | 'text';

/** Classes of all cells; 'perhaps': a number if its one mark separates thousands. */
export type Classes = readonly (readonly CellClass[])[];

export function classify(
  records: readonly HeadRecord[],
  decimal: '.' | ',',
  missing: readonly string[],
): Classes {
  const format = makeCellFormat(decimal, '', missing);
  const known = new Map<string, CellClass>();
  const classOf = (cell: string): CellClass => {
    let found = known.get(cell);
    if (found === undefined) known.set(cell, (found = classOfCell(cell, format)));
    return found;
  };
  return records.map(record => record.cells.map(classOf));
}

function classOfCell(cell: string, format: CellFormat): CellClass {
  const { kind, unclear } = readCellText(cell, format);
  if (kind === Cell.Missing) return 'empty';
  if (unclear) return 'perhaps';
  if (kind !== Cell.Text && kind !== UNUSABLE) return 'number';
  return unitOfCell(cell) === null ? 'text' : 'unit';
}

export const isNumber = (found: CellClass | undefined): boolean => found === 'number' || found === 'perhaps';

/**
 * The thousands mark that a column of the head proves: a cell with both marks or with two groups, or groups of three beside
 * whole numbers below 1000 and nothing that speaks against it; '' for none.
 * @param accepted whether a person fixed the decimal mark: then groups of three need no more proof
 */
export function provenThousands(
  rows: readonly HeadRecord[],
  decimal: '.' | ',',
  width: number,
  accepted: boolean,
): string {
  for (let column = 0; column < width; column++) {
    const cells = rows.map(row => (row.cells[column] ?? '').trim()).filter(cell => cell !== '');
    const grouped = cells.flatMap(cell => readGrouped(cell, decimal) ?? []);
    const clear = grouped.find(({ ambiguous }) => !ambiguous);
    if (clear !== undefined) return clear.mark;
    const [first] = grouped;
    if (first === undefined) continue;
    const small = cells.filter(cell => /^[+\-\u2212]?\d{1,3}$/.test(cell)).length;
    const consistent = cells.length === grouped.length + small;
    if (consistent && (small > 0 || accepted)) return first.mark;
  }
  return '';
}
