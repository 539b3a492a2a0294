import type { Layout } from '../core/model/settings';
import type { Uncounted } from './groupOf';
import { countEntries, Entry, type Selection } from './selection';

/**
 * Missing and left-out values of each group. With one column a group the empty cells below a column's last value are not
 * missing: the columns are just of different length.
 */
export function uncounted(selection: Selection, layout: Layout): readonly Uncounted[] {
  return selection.groups.map((_, group) => {
    const missing = countEntries(selection, group, Entry.Missing);
    const trailing = layout.kind === 'wide' && missing > 0 ? trailingMissing(selection, group) : 0;
    return { missing: missing - trailing, leftOut: countEntries(selection, group, Entry.LeftOut) };
  });
}

function trailingMissing({ group: groupOf, state }: Selection, group: number): number {
  let trailing = 0;
  for (let at = state.length - 1; at >= 0; at -= 1) {
    if (groupOf[at] !== group) continue;
    if (state[at] !== Entry.Missing) break;
    trailing += 1;
  }
  return trailing;
}
