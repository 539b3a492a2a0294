import type { LabelColumn } from '../../core/model/cells';

/** How the ids of a column stand to the groups, over the rows of the groups compared. */
export interface IdFacts {
  readonly ids: number;
  /** Fewest and most rows of one id. */
  readonly fewest: number;
  readonly most: number;
  /** Every id occurs in one group only: the treatment can have been given to it as one piece. */
  readonly withinGroups: boolean;
  /** Every id occurs exactly once in each group: its rows can be partners. */
  readonly pairs: boolean;
  /** Ids that occur in more than one group. */
  readonly shared: number;
}

/**
 * Counts rows by id and group; rows whose id or group is missing, or whose group is not compared, are passed over.
 * @param compared the groups by name
 * @param named the name of the group that a label belongs to
 */
export function idFacts(
  groups: LabelColumn,
  ids: LabelColumn,
  compared: readonly string[],
  named: (label: string) => string = label => label,
): IdFacts {
  const wanted = groups.levels.map(level => compared.indexOf(named(level)));
  const width = Math.max(1, compared.length);
  const counts = new Int32Array(ids.levels.length * width);
  for (let row = 0; row < groups.codes.length; row++) {
    const group = wanted[groups.codes[row] ?? 0] ?? -1;
    const id = ids.codes[row] ?? 0;
    if (group < 0 || id === 0) continue;
    const at = id * width + group;
    counts[at] = (counts[at] ?? 0) + 1;
  }
  let met = 0;
  let fewest = Infinity;
  let most = 0;
  let shared = 0;
  let pairs = true;
  for (let id = 1; id < ids.levels.length; id++) {
    const ofId = counts.subarray(id * width, (id + 1) * width);
    const rows = ofId.reduce((sum, count) => sum + count, 0);
    if (rows === 0) continue;
    met++;
    fewest = Math.min(fewest, rows);
    most = Math.max(most, rows);
    if (ofId.filter(count => count > 0).length > 1) shared++;
    if (ofId.some(count => count !== 1)) pairs = false;
  }
  return {
    ids: met,
    fewest: met === 0 ? 0 : fewest,
    most,
    withinGroups: met > 0 && shared === 0,
    pairs: met > 0 && pairs && compared.length === 2,
    shared,
  };
}

/** Two columns joined into one whose ids are "outer, inner": the ids of the inner column may start again in each outer. */
export function nestIds(outer: LabelColumn, inner: LabelColumn): LabelColumn {
  const levels = [''];
  const known = new Map<number, number>();
  const codes = new Int32Array(outer.codes.length);
  for (let row = 0; row < codes.length; row++) {
    const a = outer.codes[row] ?? 0;
    const b = inner.codes[row] ?? 0;
    if (a === 0 || b === 0) continue;
    const key = a * inner.levels.length + b;
    let code = known.get(key);
    if (code === undefined) {
      code = levels.length;
      known.set(key, code);
      levels.push(`${outer.levels[a] ?? ''}, ${inner.levels[b] ?? ''}`);
    }
    codes[row] = code;
  }
  return { kind: 'label', name: `${outer.name}, ${inner.name}`, levels, codes };
}
