/** Whole numbers of any length. */
export type Integers = readonly bigint[] | BigInt64Array;

/**
 * Keys that stand in the order of the integers, equal exactly where those are, over all lists together. Rounding keeps the
 * order, so the doubles are sorted, and the integers are looked at only where their doubles are equal.
 * @param offsets the integers less one shift over one scale, rounded
 */
export function orderOf(lists: readonly Integers[], offsets: readonly Float64Array[]): Float64Array[] {
  const sorted = new Float64Array(offsets.reduce((sum, list) => sum + list.length, 0));
  let filled = 0;
  for (const list of offsets) {
    sorted.set(list, filled);
    filled += list.length;
  }
  sorted.sort();
  const order = offsets.map(list => list.map(offset => firstPlace(sorted, offset)));
  const within = ranksWithinTies(lists, order, sorted);
  if (within.size === 0) return order;
  return order.map((keys, index) =>
    keys.map((place, i) => place + (within.get(place)?.get(lists[index]?.[i] ?? 0n) ?? 0)),
  );
}

/** Ranks of the integers in every tie of doubles that they do not share, by the tie's place among the sorted. */
function ranksWithinTies(
  lists: readonly Integers[],
  order: readonly Float64Array[],
  sorted: Float64Array,
): ReadonlyMap<number, ReadonlyMap<bigint, number>> {
  const tied = new Map<number, Set<bigint>>();
  lists.forEach((list, index) => {
    for (let i = 0; i < list.length; i++) {
      const place = order[index]?.[i] ?? 0;
      if (sorted[place + 1] !== sorted[place]) continue;
      const integers = tied.get(place) ?? new Set<bigint>();
      tied.set(place, integers.add(list[i] ?? 0n));
    }
  });
  const ranks = new Map<number, ReadonlyMap<bigint, number>>();
  for (const [place, integers] of tied) {
    if (integers.size === 1) continue;
    const ascending = [...integers].sort((a, b) => (a < b ? -1 : 1));
    ranks.set(place, new Map(ascending.map((integer, rank) => [integer, rank])));
  }
  return ranks;
}

function firstPlace(sorted: Float64Array, value: number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sorted[middle] as number) < value) low = middle + 1;
    else high = middle;
  }
  return low;
}
