import type { Numbers } from '../core/model/cells';
import type { Group } from '../core/model/groups';
import type { Settings } from '../core/model/settings';
import { alignFrames } from '../core/numeric/numbers';
import { makeSample } from '../core/numeric/sample';
import { unitMeans, type UnitMeans } from '../core/numeric/unitMeans';
import { gathered } from './gathered';
import { groupAt } from './groupAt';
import { groupOf, type Readings } from './groupOf';
import { uncounted } from './uncounted';
import { usedRows, type Selection } from './selection';

/** The groups of a selection, their samples in one frame; readings averaged level by level where units were named. */
export function valueGroups(selection: Selection, settings: Settings): readonly Group[] {
  const rows = selection.groups.map((_, group) => usedRows(selection, group));
  const readings = alignFrames(rows.map((own, group) => valuesOf(selection, group, own, settings)));
  const rest = uncounted(selection, settings.layout);
  if (settings.relation.kind !== 'units') {
    return selection.groups.map((label, group) =>
      groupOf(label, makeSample(groupAt(readings, group), groupAt(rows, group)), groupAt(rest, group)),
    );
  }
  const averaged = readings.map((numbers, group) =>
    unitMeans(numbers, levelsOf(selection, groupAt(rows, group))),
  );
  const means = alignFrames(averaged.map(unit => unit.means));
  return selection.groups.map((label, group) => {
    const own = groupAt(averaged, group);
    const ownRows = groupAt(rows, group);
    const sample = makeSample(
      groupAt(means, group),
      own.first.map(reading => ownRows[reading] ?? 0),
    );
    return groupOf(
      label,
      sample,
      groupAt(rest, group),
      readingsOf(selection, own, groupAt(readings, group), ownRows),
    );
  });
}

/** The measured values at these rows of one group. */
export function valuesOf(selection: Selection, group: number, rows: Int32Array, settings: Settings): Numbers {
  const { success } = settings.options;
  const word = typeof success === 'string' ? success : null;
  return gathered(groupAt(selection.measured, group), rows, settings.reading.below, word);
}

/** The code of each unit column at these rows, outermost first. */
const levelsOf = ({ ids }: Selection, rows: Int32Array): readonly Int32Array[] =>
  ids.map(({ codes }) => rows.map(row => codes[row] ?? 0));

function readingsOf({ ids }: Selection, own: UnitMeans, numbers: Numbers, rows: Int32Array): Readings {
  const units = Array.from(own.first, (reading, unit) => {
    const row = rows[reading] ?? 0;
    const [outermost] = ids;
    const path = outermost === undefined ? [] : [outermost.levels[outermost.codes[row] ?? 0] ?? ''];
    return { path, readings: own.readings[unit] ?? 0 };
  });
  return { units, sample: makeSample(numbers, rows), unitOf: own.unitOf };
}
