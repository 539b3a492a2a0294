const MOST_STEPS = 100;
/** The step after one this small, relative to x, is below the last digit. */
const SETTLED = 1e-10;
const NARROW = 1e-15;

/**
 * The x > 0 at which a falling upper tail equals p: secant steps on ln x for the log of the tail, which is nearly straight
 * there, kept inside a bracket that every evaluation tightens. About five evaluations from a start good to a few percent.
 * @param start inside the bracket
 * @param slope guess of −d ln(tail)/d ln x at the start, above 0
 */
export function secantOfLogTail(
  upperTail: (x: number) => number,
  p: number,
  start: number,
  slope: number,
  bracket: readonly [low: number, high: number],
): number {
  let [low, high] = bracket.map(Math.log) as [number, number];
  let at = Math.log(start);
  let steepness = slope;
  let before: { readonly at: number; readonly excess: number } | null = null;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const excess = Math.log(upperTail(Math.exp(at)) / p);
    if (Number.isNaN(excess)) return NaN;
    if (excess === 0) return Math.exp(at);
    if (excess > 0) low = at;
    else high = at;
    // A tail too small for a double says on which side it is, and no more.
    const isSeen = excess > -Infinity;
    if (isSeen && before !== null) steepness = (before.excess - excess) / (at - before.at);
    const next = isSeen ? at + excess / steepness : NaN;
    if (Math.abs(next - at) <= SETTLED || high - low <= NARROW) return Math.exp(next);
    if (isSeen) before = { at, excess };
    at = next > low && next < high ? next : (low + high) / 2;
  }
  return Math.exp(at);
}
