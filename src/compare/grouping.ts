import { mergedLabel } from '../core/evidence/mergedLabel';
import type { Table } from '../core/model/cells';
import type { Settings } from '../core/model/settings';
import type { Roles } from './roles';

type Grouped = Pick<Settings, 'files' | 'layout' | 'same'>;

/** The labels that groups can be made from, before any is chosen. */
interface Grouping {
  /** After merging; in the order of the file's levels, the columns or the files. */
  readonly labels: readonly string[];
  /** Values that one row can hold: one a column in the wide layout, else one. */
  readonly valuesPerRow: number;
  /** Index into labels, −1 for a row without a label. `position` counts the values of a row. */
  labelOf(row: number, position: number): number;
}

export function groupingOf(table: Table, settings: Grouped, roles: Roles): Grouping {
  const { layout } = settings;
  if (layout.kind === 'wide') {
    return {
      labels: layout.columns,
      valuesPerRow: layout.columns.length,
      labelOf: (_, position) => position,
    };
  }
  if (layout.kind === 'files') {
    return { labels: fileLabels(settings.files), valuesPerRow: 1, labelOf: row => table.file(row) };
  }
  if (roles.label === null) return { labels: [], valuesPerRow: 0, labelOf: () => -1 };
  const { levels, codes } = table.labels(roles.label);
  const merged = levels.map(level => mergedLabel(level, settings.same));
  const labels = [...new Set(merged.filter((_, code) => code > 0))];
  const ofCode = Int32Array.from(merged, (label, code) => (code === 0 ? -1 : labels.indexOf(label)));
  return { labels, valuesPerRow: 1, labelOf: row => ofCode[codes[row] ?? 0] ?? -1 };
}

/** One group a file: its name without the folders, or the whole path where two names are alike. */
function fileLabels(files: readonly string[]): readonly string[] {
  const names = files.map(path => path.split('/').at(-1) ?? path);
  return new Set(names).size === names.length ? names : files;
}
