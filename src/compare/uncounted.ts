import type { Layout } from '../core/model/settings';
import type { Uncounted } from './groupOf';
import { Entry, type Selection } from './selection';

/**
 * Missing and left-out values of each group. With one column a group the empty cells below a column's last value are not
 * missing: the columns are just of different length.
 */
export function uncounted(selection: Selection, layout: Layout): readonly Uncounted[] {
  return selection.groups.map((_, group) => {
    let missing = 0;
    let trailing = 0;
    let leftOut = 0;
    selection.state.forEach((state, at) => {
      if (selection.group[at] !== group) return;
      if (state === Entry.LeftOut) leftOut += 1;
      if (state === Entry.Missing) {
        missing += 1;
        trailing += 1;
      } else {
        trailing = 0;
      }
    });
    return { missing: layout.kind === 'wide' ? missing - trailing : missing, leftOut };
  });
}
