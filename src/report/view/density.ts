import type { Sample } from '../../core/model/groups';
import type { Comparison } from '../../core/model/comparison';
import type { DensityShown } from './figureShown';

/** Above this many values points hide one another: how many lie where is drawn instead. */
const MOST_POINTS = 2000;
const BINS = 60;
const OUTSIDE = 0.005;
/** Values closer together than this share of the range are drawn at one place. */
const PLACES = 4096;

export const tooManyPoints = (groups: Comparison['groups']): boolean =>
  groups.reduce((sum, group) => sum + (group.readingSample?.n ?? group.sample?.n ?? 0), 0) > MOST_POINTS;

/** Counts of a sample's values in equal bins over its range, and every value outside its middle 99%, once a place. */
export function densityOf(sample: Sample): {
  readonly bins: DensityShown;
  readonly outside: readonly number[];
} {
  const sorted = sample.sorted();
  const from = sorted[0] ?? 0;
  const to = sorted[sorted.length - 1] ?? 0;
  const width = (to - from) / BINS || 1;
  const counts = new Array<number>(BINS).fill(0);
  for (const value of sorted) {
    const bin = Math.min(BINS - 1, Math.floor((value - from) / width));
    counts[bin] = (counts[bin] ?? 0) + 1;
  }
  const cut = Math.ceil(sorted.length * OUTSIDE);
  const tails = [...sorted.subarray(0, cut), ...sorted.subarray(sorted.length - cut)];
  return { bins: { from, width, counts }, outside: oncePerPlace(tails, (to - from) / PLACES) };
}

/** Ascending values less those that lie within `distance` of the last one kept. */
function oncePerPlace(values: readonly number[], distance: number): readonly number[] {
  const kept: number[] = [];
  for (const value of values) {
    const last = kept.at(-1);
    if (last === undefined || value - last > distance) kept.push(value);
  }
  return kept;
}
