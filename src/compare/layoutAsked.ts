import type { Field } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import type { Layout, Relation } from '../core/model/settings';
import { findField } from '../readers/findField';
import type { Request } from './request';
import { summaryFields } from './summaryFields';

/**
 * Where the groups stand in the file. Every column named is looked for, so that a wrong name is refused here
 * ('column-unknown', 'column-ambiguous'); a column that is needed and not named is 'column-needed'.
 */
export function layoutAsked(request: Request, fields: readonly Field[]): Layout {
  if (request.typed !== undefined) return { kind: 'typed', groups: request.typed };
  if (request.summary === true) {
    const { label } = summaryFields(fields, request.label);
    return { kind: 'summary', label: request.label ?? nameOf(fields, label) };
  }
  if (request.columns !== undefined) {
    if (request.columns.length < 2) throw new Refusal('groups-too-few', { labels: request.columns });
    return { kind: 'wide', columns: known(request.columns, fields) };
  }
  const measured = measuredAsked(request, fields);
  if (request.files.length > 1) return { kind: 'files', measured };
  if (request.label === undefined) throw needed('label', fields);
  return { kind: 'long', measured: [measured], label: known([request.label], fields)[0] ?? request.label };
}

/** How rows belong together, as far as it was said. */
export function relationAsked(request: Request): Relation {
  const { per, pair } = request;
  const paired = pair !== undefined && pair !== 'none';
  if (per === 'none' || per?.length === 0) {
    return paired ? { kind: 'pairs', column: pair } : { kind: 'independent' };
  }
  if (per !== undefined) {
    if (paired) throw new Refusal('method-not-for-this', { pair, per });
    return { kind: 'units', columns: per };
  }
  return paired ? { kind: 'pairs', column: pair } : { kind: 'rows' };
}

function measuredAsked(request: Request, fields: readonly Field[]): string {
  const [first, ...more] = known(request.measured ?? [], fields);
  if (first === undefined) throw needed('measured', fields);
  if (more.length > 0) throw new Refusal('columns-too-many', { columns: [first, ...more] });
  return first;
}

function known(names: readonly string[], fields: readonly Field[]): readonly string[] {
  for (const name of names) findField(fields, name);
  return names;
}

const needed = (role: 'measured' | 'label', fields: readonly Field[]): Refusal =>
  new Refusal('column-needed', { needed: role, columns: fields.map(field => field.name) });

/** The exact header text where it is the only one of its kind, else its place. */
function nameOf(fields: readonly Field[], index: number): string {
  const name = fields[index]?.name ?? '';
  return name !== '' && fields.filter(field => field.name === name).length === 1 ? name : `#${index + 1}`;
}
