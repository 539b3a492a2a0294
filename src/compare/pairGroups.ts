import type { Table } from '../core/model/cells';
import type { Designs, Group } from '../core/model/groups';
import { Refusal } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { alignFrames } from '../core/numeric/numbers';
import { pairedDifferences } from '../core/numeric/pairedDifferences';
import { makeSample } from '../core/numeric/sample';
import { groupAt } from './groupAt';
import { groupOf } from './groupOf';
import { Entry, type Selection } from './selection';
import { uncounted } from './uncounted';
import { valuesOf } from './valueGroups';

/**
 * Complete pairs of a selection whose one id column is the pair column, in file order of the test value. A used id met
 * twice in a group is refused ('pairs-repeated'), as is a file without a complete pair ('pairs-none').
 */
export function pairGroups(table: Table, selection: Selection, settings: Settings): Designs['pairs'] {
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
  const rows = [tests, references].map(own => Int32Array.from(complete, id => own.get(id) ?? 0));
  const numbers = alignFrames(rows.map((own, group) => valuesOf(selection, group, own, settings)));
  const rest = uncounted(selection, settings.layout);
  const samples = numbers.map((own, group) => makeSample(own, groupAt(rows, group)));
  const groupFrom = (group: number): Group =>
    groupOf(groupAt(selection.groups, group), groupAt(samples, group), groupAt(rest, group));
  const differences = pairedDifferences(groupAt(samples, 0), groupAt(samples, 1));
  return { test: groupFrom(0), reference: groupFrom(1), differences, unmatched };
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
