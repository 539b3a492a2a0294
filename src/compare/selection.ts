import { Cell, type LabelColumn, type Table } from '../core/model/cells';
import { Refusal, type CellRef, type Ticker } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { groupingOf } from './grouping';
import { labelCounts } from './labelCounts';
import { cellState, measuredValues, type Measured } from './measuredValues';
import { rolesOf, type Roles } from './roles';
import { rowFilter } from './rowFilter';

/** What becomes of one value of the groups compared. */
export const Entry = { Used: 0, Missing: 1, LeftOut: 2, NoId: 3 } as const;

/**
 * The values of the groups compared, in file order (in the wide layout row by row, columns in the order asked). The same
 * selection makes the groups and the digest of the cells used.
 */
export interface Selection {
  /** Labels after merging: the test group, then the reference group; several groups in order of first appearance. */
  readonly groups: readonly string[];
  /** The measured column of each group. */
  readonly measured: readonly Measured[];
  /** Unit columns outermost first, or the pair column. */
  readonly ids: readonly LabelColumn[];
  /** Their fields in the table. */
  readonly idFields: readonly number[];
  /** One entry a value: table row, index into groups, and Entry code. */
  readonly rows: Int32Array;
  readonly group: Uint16Array;
  readonly state: Uint8Array;
  /** Rows taken that have no label; rows taken whose label is not compared. */
  readonly withoutLabel: number;
  readonly otherLabels: number;
}

const noTick: Ticker = () => undefined;
const TICK_EVERY = 0x10000;

/**
 * Takes the rows of the groups that `settings` names. Refuses text in a used cell ('text-in-measured'), a censored value
 * that nothing was said about ('censored-unanswered') and a left-out line on which no row starts ('leave-out-unknown').
 */
export function selectRows(table: Table, settings: Settings, tick: Ticker = noTick): Selection {
  const roles = rolesOf(settings, table.fields);
  const grouping = groupingOf(table, settings, roles);
  const taken = rowFilter(table, settings, roles);
  const leftOut = leftOutRows(table, settings);
  const groups = groupsCompared(table, settings);
  const groupOfLabel = Int32Array.from(grouping.labels, label => groups.indexOf(label));
  const measuredAt = measuredFields(roles).map(field => measuredValues(table, settings, field));
  const ids = roles.ids.map(field => table.labels(field));

  const rows = new Int32Array(table.rows * grouping.valuesPerRow);
  const group = new Uint16Array(rows.length);
  const state = new Uint8Array(rows.length);
  let count = 0;
  let withoutLabel = 0;
  let otherLabels = 0;
  for (let row = 0; row < table.rows; row += 1) {
    if (row % TICK_EVERY === 0) tick(row, table.rows);
    if (!taken(row)) continue;
    for (let position = 0; position < grouping.valuesPerRow; position += 1) {
      const label = grouping.labelOf(row, position);
      const index = label < 0 ? -1 : (groupOfLabel[label] ?? -1);
      if (index < 0) {
        if (label < 0) withoutLabel += 1;
        else otherLabels += 1;
        continue;
      }
      rows[count] = row;
      group[count] = index;
      const measured = measuredAt[measuredAt.length > 1 ? position : 0];
      state[count] = leftOut.has(row) ? Entry.LeftOut : entryOf(measured, ids, row);
      count += 1;
    }
  }
  const selection: Selection = {
    groups,
    measured: groups.map(label => columnOfGroup(measuredAt, grouping.labels.indexOf(label))),
    ids,
    idFields: roles.ids,
    rows: rows.subarray(0, count),
    group: group.subarray(0, count),
    state: state.subarray(0, count),
    withoutLabel,
    otherLabels,
  };
  refuseText(table, selection);
  if (settings.reading.below === 'refuse') refuseCensored(table, selection);
  return selection;
}

/** The table rows of the used values of a group, in file order. */
export function usedRows({ rows, group: groupOf, state }: Selection, group: number): Int32Array {
  const used = new Int32Array(countEntries({ group: groupOf, state }, group, Entry.Used));
  let count = 0;
  for (let at = 0; at < rows.length; at += 1) {
    if (groupOf[at] === group && state[at] === Entry.Used) used[count++] = rows[at] ?? 0;
  }
  return used;
}

/** How many entries of a group (null: of all) are in a state. */
export function countEntries(
  { group: groupOf, state }: Pick<Selection, 'group' | 'state'>,
  group: number | null,
  wanted: number,
): number {
  let count = 0;
  for (let at = 0; at < state.length; at += 1) {
    if (state[at] === wanted && (group === null || groupOf[at] === group)) count += 1;
  }
  return count;
}

const measuredFields = (roles: Roles): readonly number[] =>
  roles.summary === null ? roles.measured : [roles.summary.mean ?? roles.summary.x ?? roles.summary.n];

function columnOfGroup(measured: readonly Measured[], position: number): Measured {
  const own = measured[measured.length > 1 ? position : 0];
  if (own === undefined) throw new RangeError('a group has no measured column');
  return own;
}

function entryOf(measured: Measured | undefined, ids: readonly LabelColumn[], row: number): number {
  if (measured === undefined || cellState(measured, row) === Cell.Missing) return Entry.Missing;
  return ids.some(id => (id.codes[row] ?? 0) === 0) ? Entry.NoId : Entry.Used;
}

const groupsCompared = (table: Table, settings: Settings): readonly string[] =>
  settings.test === null || settings.reference === null
    ? labelCounts(table, settings).map(({ label }) => label)
    : [settings.test, settings.reference];

function leftOutRows(table: Table, settings: Settings): ReadonlySet<number> {
  return new Set(
    settings.leftOut.map(({ file, line }) => {
      const row = table.rowAt(file, line);
      if (row < 0) throw new Refusal('leave-out-unknown', { line, file: settings.files[file] ?? null });
      return row;
    }),
  );
}

const TEXTS_NAMED = 5;

function refuseText(table: Table, selection: Selection): void {
  const cells = cellsInState(selection, [Cell.Text]);
  const [first] = cells;
  if (first === undefined) return;
  const texts = new Set<string>();
  for (const { row, measured } of cells) {
    if (texts.size === TEXTS_NAMED) break;
    const written = 'texts' in measured.column ? measured.column.texts : [];
    texts.add(written.find(own => own.row === row)?.text ?? '');
  }
  throw new Refusal('text-in-measured', { texts: [...texts], count: cells.length }, placeOf(table, first));
}

function refuseCensored(table: Table, selection: Selection): void {
  const cells = cellsInState(selection, [Cell.Below, Cell.Above]);
  const [first] = cells;
  if (first !== undefined)
    throw new Refusal('censored-unanswered', { count: cells.length }, placeOf(table, first));
}

interface MeasuredCell {
  readonly row: number;
  readonly measured: Measured;
}

const placeOf = (table: Table, { row, measured }: MeasuredCell): CellRef => ({
  file: table.file(row),
  line: table.line(row),
  field: measured.field,
});

/** The used cells that are in one of the given states. */
function cellsInState(selection: Selection, states: readonly number[]): readonly MeasuredCell[] {
  const found: MeasuredCell[] = [];
  if (selection.measured.every(measured => measured.kind === 'outcomes' || measured.column.state === null)) {
    return found;
  }
  selection.rows.forEach((row, at) => {
    const measured = selection.measured[selection.group[at] ?? 0];
    if (selection.state[at] !== Entry.Used || measured === undefined) return;
    if (!states.includes(cellState(measured, row))) return;
    found.push({ row, measured });
  });
  return found;
}
