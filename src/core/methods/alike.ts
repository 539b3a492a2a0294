import type { Estimates, MethodDescriptor } from '../model/methods';

type Method = Pick<MethodDescriptor, 'measure' | 'estimates'>;

const ALIKE: Readonly<Record<Estimates, number>> = { difference: 0, ratio: 1, chance: 0.5 };

/** The value that an estimate has where the groups are alike: 0 for a difference, 1 for a ratio, 0.5 for a chance. */
export const alikeOf = ({ estimates = 'difference' }: Pick<Method, 'estimates'>): number => ALIKE[estimates];

/** Whether two methods estimate in the same unit, so that both can be held against one value and drawn on one axis. */
export const inOneUnit = (one: Method, other: Method): boolean => unitOf(one) === unitOf(other);

/** Means and ranks both give differences in the units of the measured column; every other estimate has a unit of its own. */
function unitOf({ measure, estimates = 'difference' }: Method): string {
  const measured = estimates === 'difference' && (measure === 'mean' || measure === 'rank');
  return measured ? 'of the column' : `${measure} ${estimates}`;
}
