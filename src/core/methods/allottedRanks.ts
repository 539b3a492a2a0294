import type { Ticker } from '../model/problem';

const TICK = 1 << 12;

/** In how many ways values can be allotted to groups of these sizes: n! / Π nᵢ!; Infinity where it no longer matters. */
export function waysOfSizes(sizes: readonly number[]): number {
  let ways = 1;
  let all = 0;
  for (const size of sizes) {
    for (let taken = 1; taken <= size; taken += 1) {
      all += 1;
      ways = (ways * all) / taken;
      if (ways > 1e12) return Infinity;
    }
  }
  return Math.round(ways);
}

/**
 * Over all ways of allotting the ranks to groups of these sizes: how many there are, and in how many Σ R²/n over the groups
 * is at least that of the ranks as they stand, first group first. Twice the mid-ranks are whole numbers, and so is the sum
 * times the least common multiple of the sizes: ties are exact.
 */
export function allottedRanks(
  ranks: ArrayLike<number>,
  sizes: readonly number[],
  tick: Ticker,
): { readonly ways: number; readonly atLeast: number } {
  const doubled = Array.from(ranks, rank => Math.round(2 * rank));
  const common = sizes.reduce((multiple, size) => (multiple * size) / divisorOf(multiple, size), 1);
  const sums = sizes.map(() => 0);
  const room = [...sizes];
  const spread = (): number =>
    sums.reduce((total, sum, group) => total + (sum * sum * common) / (sizes[group] ?? 1), 0);

  let filled = 0;
  sizes.forEach((size, group) => {
    for (const end = filled + size; filled < end; filled += 1)
      sums[group] = (sums[group] ?? 0) + (doubled[filled] ?? 0);
  });
  const met = spread();
  sums.fill(0);

  let [ways, atLeast] = [0, 0];
  const allot = (next: number): void => {
    if (next === doubled.length) {
      ways += 1;
      if (ways % TICK === 0) tick(ways, ways);
      if (spread() >= met) atLeast += 1;
      return;
    }
    const rank = doubled[next] ?? 0;
    for (let group = 0; group < sizes.length; group += 1) {
      if (room[group] === 0) continue;
      room[group] = (room[group] ?? 0) - 1;
      sums[group] = (sums[group] ?? 0) + rank;
      allot(next + 1);
      sums[group] = (sums[group] ?? 0) - rank;
      room[group] = (room[group] ?? 0) + 1;
    }
  };
  allot(0);
  return { ways, atLeast };
}

function divisorOf(a: number, b: number): number {
  return b === 0 ? a : divisorOf(b, a % b);
}
