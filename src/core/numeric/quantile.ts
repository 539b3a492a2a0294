/**
 * The value below which the share q of a sample lies: linear interpolation at position (n − 1)q of the ascending values
 * (Hyndman & Fan 1996, Am. Stat. 50: 361–365, definition 7).
 * @param sorted ascending values; none gives NaN
 * @param q from 0 to 1
 */
export function quantileSorted(sorted: ArrayLike<number>, q: number): number {
  const last = sorted.length - 1;
  if (last < 0) return NaN;
  const position = Math.min(Math.max(q, 0), 1) * last;
  const below = Math.floor(position);
  const lower = sorted[below] ?? NaN;
  const upper = sorted[Math.min(below + 1, last)] ?? NaN;
  const share = position - below;
  return share === 0 ? lower : lower + share * (upper - lower);
}
