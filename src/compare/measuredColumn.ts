import type { Table } from '../core/model/cells';
import type { Settings } from '../core/model/settings';
import { rolesOf } from './roles';

export interface MeasuredColumn {
  /** '' where the layout names none. */
  readonly name: string;
  readonly unit: string | null;
}

/** Name and unit of what was measured; with one column a group the unit that all of them share. */
export function measuredColumn(table: Table | null, settings: Settings): MeasuredColumn {
  if (table === null) return { name: '', unit: null };
  const fields = rolesOf(settings, table.fields).measured.map(field => table.fields[field]);
  const [first] = fields;
  const unit = first !== undefined && fields.every(field => field?.unit === first.unit) ? first.unit : null;
  const single = settings.layout.kind === 'long' || settings.layout.kind === 'files';
  return { name: single ? (first?.name ?? '') : '', unit };
}
