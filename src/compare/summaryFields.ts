import type { Field } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import { findField } from '../readers/findField';

/** Where a file of summaries keeps its numbers: either mean and sd, or x. Field indices. */
export interface SummaryFields {
  readonly label: number;
  readonly n: number;
  readonly mean: number | null;
  readonly sd: number | null;
  readonly x: number | null;
}

/**
 * The columns n, mean, sd (or x, n) of a file whose rows are summaries; upper and lower case are the same here. The label
 * column is the one named, else the first that is none of these.
 */
export function summaryFields(fields: readonly Field[], label: string | undefined): SummaryFields {
  const n = roleField(fields, 'n');
  const x = roleField(fields, 'x');
  const mean = roleField(fields, 'mean');
  const sd = roleField(fields, 'sd');
  const counted = x !== null && mean === null;
  if (n === null) throw missing('n', fields);
  if (!counted && mean === null) throw missing('mean', fields);
  if (!counted && sd === null) throw missing('sd', fields);
  const named =
    label === undefined
      ? fields.findIndex((_, at) => ![n, x, mean, sd].includes(at))
      : findField(fields, label);
  if (named < 0) throw missing('label', fields);
  return { label: named, n, mean: counted ? null : mean, sd: counted ? null : sd, x: counted ? x : null };
}

function roleField(fields: readonly Field[], role: string): number | null {
  const exact = fields.findIndex(field => field.name.trim() === role);
  const at = exact >= 0 ? exact : fields.findIndex(field => field.name.trim().toLowerCase() === role);
  return at < 0 ? null : at;
}

const missing = (needed: string, fields: readonly Field[]): Refusal =>
  new Refusal('column-needed', { needed, columns: fields.map(field => field.name) });
