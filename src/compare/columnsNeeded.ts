import { methods } from '../core/methods/index';
import type { Field } from '../core/model/cells';
import type { MethodDescriptor } from '../core/model/methods';
import { layoutAsked, relationAsked } from './layoutAsked';
import { measureAsked, measuresOutcomes } from './measureAsked';
import type { Request } from './request';
import { rolesOf } from './roles';

/** Field indices to read as numbers and as labels. Refuses unknown, ambiguous and missing columns. */
export function columnsNeeded(
  request: Request,
  fields: readonly Field[],
  list: readonly MethodDescriptor[] = methods,
): { readonly numbers: readonly number[]; readonly labels: readonly number[] } {
  const layout = layoutAsked(request, fields);
  const roles = rolesOf({ layout, relation: relationAsked(request), where: request.where ?? [] }, fields);
  const outcomes = measuresOutcomes(measureAsked(request, fields, list), request.success);
  const { summary } = roles;
  const numbers =
    summary === null ? (outcomes ? [] : roles.measured) : [summary.n, summary.mean, summary.sd, summary.x];
  const labels = [roles.label, ...roles.ids, ...roles.where, ...(outcomes ? roles.measured : [])];
  return { numbers: distinct(numbers), labels: distinct(labels) };
}

const distinct = (fields: readonly (number | null)[]): readonly number[] => [
  ...new Set(fields.filter(field => field !== null)),
];
