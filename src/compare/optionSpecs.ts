import { evidenceChecks } from '../core/evidence/index';
import { methods } from '../core/methods/index';
import type { EvidenceDescriptor } from '../core/model/comparison';
import type { MethodDescriptor, OptionSpec } from '../core/model/methods';

const ruledOut: OptionSpec = {
  key: 'ruled-out',
  flag: 'ruled-out',
  kind: 'text',
  default: null,
  says: t => t('methods ruled out by a stated reason, separated by commas: shown, not counted'),
};

/** Every option that a method, a check or the comparison itself declares, each key once, in registry order. */
export function optionSpecs(
  list: readonly MethodDescriptor[] = methods,
  checks: readonly EvidenceDescriptor[] = evidenceChecks,
): readonly OptionSpec[] {
  const all = [
    ...list.flatMap(({ options }) => options),
    ...checks.flatMap(({ thresholds }) => thresholds),
    ruledOut,
  ];
  return all.filter((option, index) => all.findIndex(({ key }) => key === option.key) === index);
}
