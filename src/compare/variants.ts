import { Cell, type Table } from '../core/model/cells';
import type { Below, Settings } from '../core/model/settings';
import { cellState } from './measuredValues';
import { Entry, type Selection } from './selection';

/** The same comparison on other data: left-out rows put back, or values below a limit taken otherwise. */
interface Variant {
  readonly data: string;
  readonly settings: Settings;
}

const BELOW: readonly Below[] = ['zero', 'half', 'limit'];

/**
 * The data of the chosen row by name ('all', 'without left-out', 'below as half', or both), and every variant that counts
 * beside it. A left-out cell that holds no number cannot be put back.
 */
export function variantsOf(
  table: Table | null,
  settings: Settings,
  selection: Selection | null,
): { readonly data: string; readonly beside: readonly Variant[] } {
  if (table === null || selection === null) return { data: 'all', beside: [] };
  const rows = settings.leftOut.length === 0 ? new Set<number>() : leftOutWithValue(selection);
  const leftOut = settings.leftOut.filter(({ file, line }) => !rows.has(table.rowAt(file, line)));
  const censored = hasBelow(selection);
  const { below } = settings.reading;
  const nameOf = (without: boolean, as: Below): string => {
    const parts = [...(without ? ['without left-out'] : []), ...(censored ? [`below as ${as}`] : [])];
    return parts.length === 0 ? 'all' : parts.join(', ');
  };
  const isShort = selection.state.includes(Entry.LeftOut);
  const others = censored ? BELOW.filter(as => as !== below) : [];
  return {
    data: nameOf(isShort, below),
    beside: [
      ...(rows.size > 0 ? [{ data: nameOf(false, below), settings: { ...settings, leftOut } }] : []),
      ...others.map(as => ({
        data: nameOf(isShort, as),
        settings: { ...settings, reading: { ...settings.reading, below: as } },
      })),
    ],
  };
}

function leftOutWithValue(selection: Selection): ReadonlySet<number> {
  const rows = new Set<number>();
  selection.state.forEach((state, at) => {
    const row = selection.rows[at] ?? 0;
    const measured = selection.measured[selection.group[at] ?? 0];
    if (state !== Entry.LeftOut || measured === undefined) return;
    const cell = cellState(measured, row);
    if (cell !== Cell.Missing && cell !== Cell.Text) rows.add(row);
  });
  return rows;
}

function hasBelow({ measured, rows, group, state }: Selection): boolean {
  const columns = measured.map(own => (own.kind === 'numbers' && own.column.state !== null ? own : null));
  if (columns.every(column => column === null)) return false;
  return rows.some((row, at) => {
    const column = columns[group[at] ?? 0] ?? null;
    return state[at] === Entry.Used && column !== null && cellState(column, row) === Cell.Below;
  });
}
