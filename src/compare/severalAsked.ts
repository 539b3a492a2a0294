import { methodById } from '../core/methods/index';
import type { MethodDescriptor } from '../core/model/methods';
import type { Relation } from '../core/model/settings';
import type { LabelCount } from './labelCounts';
import type { Request } from './request';

/** The method that asks of several groups at once what this one asks of two. */
const OF_SEVERAL: Readonly<Record<string, string>> = {
  'separate-t': 'welch-one-way',
  'pooled-t': 'one-way',
  'rank-sum': 'kruskal-wallis',
};

/**
 * The method for all groups at once, where that is what is asked: by its name, or because there are more than two groups
 * and no test group was named. null: two groups are compared. Pairs and margins have no method for several groups.
 */
export function severalAsked(
  { test, method }: Request,
  usual: string,
  relation: Relation,
  present: readonly LabelCount[],
  list: readonly MethodDescriptor[],
): string | null {
  if (method !== undefined) return methodById(method, list)?.design === 'several' ? method : null;
  const isOpen = present.length > 2 && test === undefined && relation.kind !== 'pairs';
  const several = isOpen ? OF_SEVERAL[usual] : undefined;
  return several !== undefined && methodById(several, list) !== undefined ? several : null;
}
