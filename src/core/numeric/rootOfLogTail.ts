const MOST_STEPS = 200;
const CLOSE = 4e-16;
const FARTHEST = 20;

/**
 * The x > 0 at which a decreasing upper tail equals p ≤ ½: Newton steps on ln x for the log of the tail, kept inside a
 * bracket that every evaluation tightens; where a step leaves it, the bracket is halved on the log scale. A start good
 * to 8 digits needs one or two steps; any positive start converges. NaN where the tail is.
 */
export function rootOfLogTail(
  start: number,
  p: number,
  upperTail: (x: number) => number,
  density: (x: number) => number,
): number {
  let low = 0;
  let high = Infinity;
  let x = start > 0 && start < Infinity ? start : 1;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const tail = upperTail(x);
    if (Number.isNaN(tail)) return NaN;
    if (tail === p) return x;
    if (tail > p) low = x;
    else high = x;
    const slope = (x * density(x)) / tail;
    const move = Math.log(tail / p) / slope;
    const next = x * Math.exp(Math.max(-FARTHEST, Math.min(FARTHEST, move)));
    const inside = next > low && next < high && Number.isFinite(next);
    const settled = Math.abs(move) <= CLOSE || high - low <= CLOSE * x;
    if (settled) return inside ? next : x;
    x = inside ? next : between(low, high);
  }
  return x;
}

function between(low: number, high: number): number {
  if (high === Infinity) return low * 16;
  if (low === 0) return high / 16;
  return Math.sqrt(low) * Math.sqrt(high);
}
