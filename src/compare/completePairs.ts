import type { Table } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import { Entry, type Selection } from './selection';

interface CompletePairs {
  /** Table rows of each pair: test, reference; in file order of the test value. */
  readonly rows: readonly [Int32Array, Int32Array];
  readonly unmatched: readonly string[];
}

/**
 * The rows of a selection whose one id column is the pair column, matched by id. A used id met twice in a group is refused
 * ('pairs-repeated'), as is a file without a complete pair ('pairs-none').
 */
export function completePairs(table: Table, selection: Selection): CompletePairs {
  const tests = rowsById(table, selection, 0);
  const references = rowsById(table, selection, 1);
  const complete = [...tests.keys()].filter(id => references.has(id));
  const unmatched = unmatchedIds(selection, new Set(complete));
  if (complete.length === 0) {
    throw new Refusal('pairs-none', {
      column: selection.ids[0]?.name ?? '',
      unmatched: unmatched.slice(0, 10),
    });
  }
  const rowsOf = (own: ReadonlyMap<number, number>): Int32Array =>
    Int32Array.from(complete, id => own.get(id) ?? 0);
  return { rows: [rowsOf(tests), rowsOf(references)], unmatched };
}

/** Row of each id code, in file order. */
function rowsById(table: Table, selection: Selection, group: number): ReadonlyMap<number, number> {
  const [ids] = selection.ids;
  const found = new Map<number, number>();
  selection.rows.forEach((row, at) => {
    if (selection.group[at] !== group || selection.state[at] !== Entry.Used) return;
    const id = ids?.codes[row] ?? 0;
    const before = found.get(id);
    if (before !== undefined) {
      const facts = {
        column: ids?.name ?? '',
        id: ids?.levels[id] ?? '',
        label: selection.groups[group] ?? '',
      };
      const lines = [table.line(before), table.line(row)];
      throw new Refusal(
        'pairs-repeated',
        { ...facts, lines },
        { file: table.file(row), line: table.line(row), field: selection.idFields[0] ?? 0 },
      );
    }
    found.set(id, row);
  });
  return found;
}

/** Ids that stand with a value in one group only, in file order. */
function unmatchedIds(selection: Selection, complete: ReadonlySet<number>): readonly string[] {
  const [ids] = selection.ids;
  const left = new Set<number>();
  selection.rows.forEach((row, at) => {
    const id = ids?.codes[row] ?? 0;
    if (selection.state[at] === Entry.Used && !complete.has(id)) left.add(id);
  });
  return Array.from(left, id => ids?.levels[id] ?? '');
}
