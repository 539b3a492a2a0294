import type { Comparison } from '../../core/model/comparison';
import { showLabel } from './label';
import { withoutUnit } from './measuredName';

/** The labels as printed, test group first: exactly as written, but for the unit in the header of a column that is a group. */
export const groupLabels = (comparison: Comparison): readonly string[] =>
  comparison.groups.map(group => groupLabel(group.label, comparison));

export function groupLabel(label: string, { settings, unit }: Pick<Comparison, 'settings' | 'unit'>): string {
  return settings.layout.kind === 'wide' ? withoutUnit(label, unit) : showLabel(label);
}
