import type { Table } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { measuredColumn } from './measuredColumn';
import { Entry, selectRows } from './selection';

/** Pairs of outcomes of which the second can only be the one that is counted. */
const PLAIN_OUTCOMES: readonly (readonly [string, string])[] = [
  ['0', '1'],
  ['no', 'yes'],
  ['false', 'true'],
];

const OUTCOMES_NAMED = 10;

/**
 * The outcome that is counted when none was named: plain for 0/1, no/yes, false/true (upper and lower case alike). Refuses
 * other outcomes ('success-needed') and more than two ('outcomes-too-many').
 */
export function plainSuccess(table: Table, settings: Settings): string {
  const outcomes = outcomesUsed(table, settings);
  const { name: column } = measuredColumn(table, settings);
  if (outcomes.length > 2) {
    const facts = { column, outcomes: outcomes.slice(0, OUTCOMES_NAMED), count: outcomes.length };
    throw new Refusal('outcomes-too-many', facts);
  }
  for (const [failure, success] of PLAIN_OUTCOMES) {
    const known = outcomes.every(outcome => [failure, success].includes(outcome.toLowerCase()));
    if (!known || outcomes.length === 0) continue;
    const written = outcomes.find(outcome => outcome.toLowerCase() === success);
    if (written !== undefined) return written;
    if (success === '1') return success;
  }
  throw new Refusal('success-needed', { column, outcomes });
}

/** The distinct outcomes of the groups compared, in order of first appearance. */
export function outcomesUsed(table: Table, settings: Settings): readonly string[] {
  const selection = selectRows(table, settings);
  const met = new Set<string>();
  selection.rows.forEach((row, at) => {
    const measured = selection.measured[selection.group[at] ?? 0];
    if (selection.state[at] !== Entry.Used || measured?.kind !== 'outcomes') return;
    met.add(measured.column.levels[measured.column.codes[row] ?? 0] ?? '');
  });
  return [...met];
}
