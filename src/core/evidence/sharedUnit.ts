import type { EvidenceDescriptor, Finding, Seen } from '../model/comparison';
import type { Group } from '../model/groups';
import type { CellRef } from '../model/problem';
import type { Settings } from '../model/settings';

const NAMED = 10;
const CELLS = 20;

/**
 * Units whose id stands in both groups: measured under both conditions (pairs), or numbering that starts again in each
 * group. Only the person knows, and it changes the design, so it is asked. The pairs can be offered as they stand only
 * where no unit has several readings.
 */
export const sharedUnit: EvidenceDescriptor<'shared-unit'> = {
  id: 'shared-unit',
  thresholds: [],
  references: ['Hurlbert 1984, Ecological Monographs 54:187–211'],
  look(seen) {
    const { relation, numberingRestarts } = seen.settings;
    const [column] = relation.kind === 'units' ? relation.columns : [];
    if (column === undefined || numberingRestarts) return [];
    const shared = sharedIds(seen.groups);
    return shared.size === 0 ? [] : [questionOf(seen, column, shared)];
  },
  canTell: () => true,
  title: t => t('units in both groups'),
  say({ facts }, t) {
    const ids = facts['ids'];
    return t(
      '{0} of {1} in both groups: {2}. Was each measured under both conditions (pairs), or does the numbering start again in each group?',
      Number(facts['shared']),
      String(facts['column']),
      Array.isArray(ids) ? ids.join(', ') : '',
    );
  },
};

function sharedIds(groups: readonly Group[]): ReadonlySet<string> {
  const [first, ...others] = groups.map(
    ({ units }) => new Set((units ?? []).map(({ path }) => path[0] ?? '')),
  );
  return new Set([...(first ?? [])].filter(id => others.some(ids => ids.has(id))));
}

function questionOf(seen: Seen, column: string, shared: ReadonlySet<string>): Finding {
  const single = seen.groups.every(({ units }) => (units ?? []).every(({ readings }) => readings === 1));
  const asPairs: Partial<Settings> = { relation: { kind: 'pairs', column } };
  const restarts: Partial<Settings> = { numberingRestarts: true };
  return {
    id: 'shared-unit',
    level: 'ask',
    facts: { column, shared: shared.size, ids: [...shared].slice(0, NAMED), singleReadings: Number(single) },
    group: null,
    count: shared.size,
    cells: seen.groups.flatMap(group => cellsOf(seen, group, column, shared)).slice(0, CELLS),
    answers: single ? [asPairs, restarts] : [restarts],
  };
}

/** The first reading of each shared unit. */
function cellsOf(
  { table }: Seen,
  group: Group,
  column: string,
  shared: ReadonlySet<string>,
): readonly CellRef[] {
  if (table === null) return [];
  const byName = table.fields.findIndex(({ name }) => name === column);
  const field = byName >= 0 ? byName : Number(column.slice(1)) - 1;
  return (group.units ?? []).flatMap(({ path }, unit) => {
    const row = group.sample?.rows[unit];
    if (row === undefined || !shared.has(path[0] ?? '')) return [];
    return [{ file: table.file(row), line: table.line(row), field }];
  });
}
