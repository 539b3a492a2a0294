import type { Table } from '../core/model/cells';
import type { Count, Designs } from '../core/model/groups';
import type { Settings } from '../core/model/settings';
import { completePairs } from './completePairs';
import { groupAt } from './groupAt';
import type { Selection } from './selection';

interface PairedOutcomes {
  readonly table: Designs['pairedCounts'];
  /** Successes of each group among the complete pairs. */
  readonly counts: readonly [Count, Count];
  readonly unmatched: readonly string[];
}

/**
 * How the outcomes of complete pairs go together: in both, in the test group only, in the reference only, in neither.
 * Throws Refusal 'pairs-repeated', 'pairs-none'.
 */
export function pairCounts(table: Table, selection: Selection, settings: Settings): PairedOutcomes {
  const { rows, unmatched } = completePairs(table, selection);
  const [tests, references] = rows;
  const isTest = successOf(selection, 0, settings);
  const isReference = successOf(selection, 1, settings);
  const found = { both: 0, testOnly: 0, referenceOnly: 0, neither: 0 };
  tests.forEach((row, pair) => {
    const [test, reference] = [isTest(row), isReference(references[pair] ?? 0)];
    if (test) found[reference ? 'both' : 'testOnly'] += 1;
    else found[reference ? 'referenceOnly' : 'neither'] += 1;
  });
  const count = (group: number, x: number): Count => ({
    label: groupAt(selection.groups, group),
    x,
    n: tests.length,
  });
  const counts = [count(0, found.both + found.testOnly), count(1, found.both + found.referenceOnly)] as const;
  return { table: found, counts, unmatched };
}

/** Whether the outcome on a row of the group is the one that is counted. */
export function successOf(
  selection: Selection,
  group: number,
  { options }: Settings,
): (row: number) => boolean {
  const { success } = options;
  const measured = selection.measured[group];
  if (measured?.kind !== 'outcomes') throw new RangeError('outcomes are counted, not numbers');
  const wanted = typeof success === 'string' ? measured.column.levels.indexOf(success) : -1;
  return row => measured.column.codes[row] === wanted;
}
