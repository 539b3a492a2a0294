import type { Table } from '../core/model/cells';
import type { Designs, Group } from '../core/model/groups';
import type { Settings } from '../core/model/settings';
import { alignFrames } from '../core/numeric/numbers';
import { pairedDifferences } from '../core/numeric/pairedDifferences';
import { makeSample } from '../core/numeric/sample';
import { completePairs } from './completePairs';
import { groupAt } from './groupAt';
import { groupOf } from './groupOf';
import type { Selection } from './selection';
import { uncounted } from './uncounted';
import { valuesOf } from './valueGroups';

/** The values of complete pairs and their differences. Throws Refusal 'pairs-repeated', 'pairs-none'. */
export function pairGroups(table: Table, selection: Selection, settings: Settings): Designs['pairs'] {
  const { rows, unmatched } = completePairs(table, selection);
  const numbers = alignFrames(rows.map((own, group) => valuesOf(selection, group, own, settings)));
  const rest = uncounted(selection, settings.layout);
  const samples = numbers.map((own, group) => makeSample(own, groupAt(rows, group)));
  const groupFrom = (group: number): Group =>
    groupOf(groupAt(selection.groups, group), groupAt(samples, group), groupAt(rest, group));
  const differences = pairedDifferences(groupAt(samples, 0), groupAt(samples, 1));
  return { test: groupFrom(0), reference: groupFrom(1), differences, unmatched };
}
