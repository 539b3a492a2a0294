import { Refusal } from '../core/model/problem';
import type { LabelCount } from './labelCounts';

interface Sides {
  readonly test: string;
  readonly reference: string;
}

/**
 * Which group is held against which. Two labels and none named: the first met is the test group. One of two named: the
 * other is the other. Refuses a label that is not there ('label-unknown'), fewer than two labels ('groups-too-few'), and
 * more than two of which not both are named ('groups-too-many').
 */
export function sidesOf(
  present: readonly LabelCount[],
  test: string | undefined,
  reference: string | undefined,
  column: string,
): Sides {
  const labels = present.map(({ label }) => label);
  const facts = factsOf(present, column);
  refuseUnknown([test, reference], labels, facts);
  if (test !== undefined && test === reference) throw new Refusal('groups-too-few', facts);
  if (test !== undefined && reference !== undefined) return { test, reference };
  const [first, second] = labels;
  if (first === undefined || second === undefined) throw new Refusal('groups-too-few', facts);
  if (labels.length > 2) throw new Refusal('groups-too-many', facts);
  const other = (named: string): string => (named === first ? second : first);
  if (test !== undefined) return { test, reference: other(test) };
  return reference === undefined ? { test: first, reference: second } : { test: other(reference), reference };
}

/**
 * Several groups: all of them, none of which is the test group; against the reference where one is named. Refuses a label
 * that is not there ('label-unknown') and fewer than two labels ('groups-too-few').
 */
export function sidesOfSeveral(
  present: readonly LabelCount[],
  reference: string | undefined,
  column: string,
): { readonly test: null; readonly reference: string | null } {
  const labels = present.map(({ label }) => label);
  const facts = factsOf(present, column);
  refuseUnknown([reference], labels, facts);
  if (labels.length < 2) throw new Refusal('groups-too-few', facts);
  return { test: null, reference: reference ?? null };
}

type LabelFacts = {
  readonly column: string;
  readonly labels: readonly string[];
  readonly counts: readonly number[];
};

const factsOf = (present: readonly LabelCount[], column: string): LabelFacts => ({
  column,
  labels: present.map(({ label }) => label),
  counts: present.map(({ count }) => count),
});

function refuseUnknown(
  named: readonly (string | undefined)[],
  labels: readonly string[],
  facts: LabelFacts,
): void {
  for (const label of named) {
    if (label !== undefined && !labels.includes(label))
      throw new Refusal('label-unknown', { label, ...facts });
  }
}
