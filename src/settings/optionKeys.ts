import type { EvidenceDescriptor } from '../core/model/comparison';
import type { MethodDescriptor } from '../core/model/methods';

/** Every key that a method of the list or an evidence check declares: the keys of Settings.options that a block may hold. */
export function optionKeys(
  methods: readonly MethodDescriptor[],
  checks: readonly EvidenceDescriptor[],
): ReadonlySet<string> {
  const declared = methods.flatMap(({ options }) => options.map(({ key }) => key));
  return new Set([...declared, ...thresholdKeys(checks)]);
}

/** The keys that a block holds under `thresholds`. */
export const thresholdKeys = (checks: readonly EvidenceDescriptor[]): readonly string[] =>
  checks.flatMap(({ thresholds }) => thresholds.map(({ key }) => key));
