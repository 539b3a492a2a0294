import { LARGE_N } from '../core/methods/largeNZ';
import type { Group } from '../core/model/groups';
import type { Settings } from '../core/model/settings';

/**
 * The id of the row that answers. It is the method of the settings, but under the curve rule `normal-over-30`: there the
 * normal curve when both groups have more than 30 values, else t.
 */
export function chosenMethod({ method, options }: Settings, groups: readonly Group[]): string {
  const byRule = method === 'separate-t' && options['curve'] === 'normal-over-30';
  return byRule && groups.every(({ n }) => n > LARGE_N) ? 'large-n-z' : method;
}
