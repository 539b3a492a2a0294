import type { EvidenceDescriptor, Finding } from '../model/comparison';
import type { Group } from '../model/groups';

/**
 * Groups whose spread says nothing: one that is constant while another scatters, and one of two values, whose SD is
 * uncertain by a factor of about 32 (chi-square on 1 degree of freedom: 95% limits 0.45 to 32 times).
 */
export const constant: EvidenceDescriptor<'constant'> = {
  id: 'constant',
  thresholds: [],
  references: [],
  look: ({ groups, settings }) =>
    settings.measure === 'mean' ? [...groups.flatMap(flat(groups)), ...groups.flatMap(twoValues)] : [],
  canTell: ({ groups }) => groups.every(({ n }) => n > 1),
  title: t => t('constant or tiny groups'),
  say({ facts, group }, t) {
    const label = group ?? '';
    return facts['what'] === 'constant'
      ? t(
          'Every value of {0} is {1}: it has no spread of its own. A constant, a copied value, or too coarse a step?',
          label,
          Number(facts['value']),
        )
      : t(
          '{0} has 2 values: the SD itself is uncertain by a factor of about 32 (95% limits 0.45 to 32 times).',
          label,
        );
  },
};

const flat =
  (groups: readonly Group[]) =>
  (group: Group): readonly Finding[] =>
    group.sd === 0 && groups.some(({ sd }) => sd > 0)
      ? [{ ...about(group), level: 'warn', facts: { what: 'constant', value: group.mean, n: group.n } }]
      : [];

const twoValues = (group: Group): readonly Finding[] =>
  group.n === 2 ? [{ ...about(group), level: 'note', facts: { what: 'two-values', n: group.n } }] : [];

const about = ({ label, n }: Group): Pick<Finding, 'id' | 'group' | 'count' | 'cells' | 'answers'> => ({
  id: 'constant',
  group: label,
  count: n,
  cells: [],
  answers: [],
});
