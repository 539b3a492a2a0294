import { alikeOf, inOneUnit } from '../../core/methods/alike';
import { methodById } from '../../core/methods/index';
import type { Comparison, Row } from '../../core/model/comparison';
import type { Estimates } from '../../core/model/methods';
import type { Say } from '../../core/model/say';
import { groupLabels } from './groupLabels';

/** What the method of a row estimates; of a method that this version does not know, a difference. */
export const estimatesOf = ({ id }: Pick<Row, 'id'>): Estimates => methodById(id)?.estimates ?? 'difference';

/** The value of the chosen estimate where the groups are alike. */
export const alikeValue = ({ chosen }: Pick<Comparison, 'chosen'>): number =>
  alikeOf({ estimates: estimatesOf(chosen) });

/** Whether a row can stand on the axis of the chosen one and share its words. */
export function onOneAxis(row: Pick<Row, 'id'>, chosen: Pick<Row, 'id'>): boolean {
  const [one, other] = [methodById(row.id), methodById(chosen.id)];
  return one === undefined || other === undefined ? row.id === chosen.id : inOneUnit(one, other);
}

/** "slow cool − standard", "slow cool / standard", "chance that slow cool is the larger". */
export function estimateName(comparison: Comparison, t: Say): string {
  const labels = groupLabels(comparison);
  switch (estimatesOf(comparison.chosen)) {
    case 'difference':
      return labels.join(' \u2212 ');
    case 'ratio':
      return labels.join(' / ');
    case 'chance':
      return t('chance that {0} is the larger', labels[0] ?? '');
  }
}
