import { normalDensity, normalUpperTail } from './normal';
import { normalBetween } from './normalBetween';
import { OverScales } from './overScales';
import { secantOfLogTail } from './secantOfLogTail';
import { tUpperQuantile } from './studentT';

const STEP = 1 / 8;
const LOWEST = -8.5;
const HIGHEST = 36;
const MOST_KEPT = 8;

/** Fixed nodes of the inner integral over the largest of k normal values. */
const largest = ((): {
  readonly z: Float64Array;
  readonly below: Float64Array;
  readonly weight: Float64Array;
} => {
  const z = Float64Array.from({ length: (HIGHEST - LOWEST) / STEP + 1 }, (_, i) => LOWEST + i * STEP);
  return { z, below: z.map(at => normalUpperTail(-at)), weight: z.map(at => STEP * normalDensity(at)) };
})();

const upper = new Map<number, OverScales>();
const lower = new Map<number, OverScales>();

/** P(Q ≥ q): range of k ≥ 2 means over their own SD on df > 0 (Infinity: known SD). Source: Tukey 1953; Copenhaver & Holland 1988. */
export const studentizedRangeUpperTail = (q: number, k: number, df: number): number =>
  q <= 0 ? 1 : kept(upper, k, () => new OverScales(w => rangeUpperTail(w, k), 'falling')).mean(q, df);

/** P(Q ≤ q). */
export const studentizedRangeLowerTail = (q: number, k: number, df: number): number =>
  q <= 0 ? 0 : kept(lower, k, () => new OverScales(w => rangeLowerTail(w, k), 'rising')).mean(q, df);

/** q with P(Q ≥ q) = p, for p in (0, 1). */
export function studentizedRangeUpperQuantile(p: number, k: number, df: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? Infinity : p === 1 ? 0 : NaN;
  if (p > 0.5) return studentizedRangeLowerQuantile(1 - p, k, df);
  if (k === 2) return pairQuantile(p, df);
  const [low, high] = bracket(p, k, df);
  const nearby = bracket(p * NEARBY, k, df)[1];
  const slope = Math.log(NEARBY) / Math.log(high / nearby);
  return secantOfLogTail(q => studentizedRangeUpperTail(q, k, df), p, high, slope, [low, high]);
}

/** q with P(Q ≤ q) = p, for p in (0, 1). */
export function studentizedRangeLowerQuantile(p: number, k: number, df: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? 0 : p === 1 ? Infinity : NaN;
  if (p > 0.5) return studentizedRangeUpperQuantile(1 - p, k, df);
  const [, high] = bracket(0.5, k, df);
  // The lower tail falls with 1/q, about as its power k − 1.
  const start = high * p ** (1 / (k - 1));
  const tail = (x: number): number => studentizedRangeLowerTail(1 / x, k, df);
  return 1 / secantOfLogTail(tail, p, 1 / start, k - 1, [1 / high, 1 / (LEAST * p)]);
}

/** √2/2φ(0): a single pair lies below q with no more than q/LEAST, whatever the df. */
const LEAST = Math.SQRT2 / 2 / normalDensity(0);
/** How far apart the two shares are taken from which the slope of a tail is guessed. */
const NEARBY = 1.1;

/** The range of two means is |t|·√2. */
const pairQuantile = (p: number, df: number): number => Math.SQRT2 * tUpperQuantile(p / 2, df);

/** Between the quantile of one pair and that of all pairs taken one by one (Bonferroni). */
function bracket(p: number, k: number, df: number): readonly [low: number, high: number] {
  const pairs = (k * (k - 1)) / 2;
  return [pairQuantile(p, df) * (1 - 1e-9), pairQuantile(p / pairs, df) * (1 + 1e-9)];
}

function kept(all: Map<number, OverScales>, k: number, make: () => OverScales): OverScales {
  const known = all.get(k) ?? make();
  if (all.size >= MOST_KEPT) all.clear();
  all.set(k, known);
  return known;
}

/** k ∫ φ(z) [Φ(z)^(k−1) − (Φ(z) − Φ(z − w))^(k−1)] dz, the difference formed by log1p and expm1. */
function rangeUpperTail(w: number, k: number): number {
  const { z, below, weight } = largest;
  const top = -LOWEST + w / 2;
  let sum = 0;
  for (let i = 0; i < z.length; i += 1) {
    const at = z[i] ?? 0;
    if (at > top) break;
    const all = below[i] ?? 0;
    const share = normalUpperTail(w - at) / all;
    if (share <= 0) continue;
    const spared = share >= 1 ? 1 : -Math.expm1((k - 1) * Math.log1p(-share));
    sum += (weight[i] ?? 0) * all ** (k - 1) * spared;
  }
  return k * sum;
}

/** k ∫ φ(z) (Φ(z) − Φ(z − w))^(k−1) dz. */
function rangeLowerTail(w: number, k: number): number {
  const { z, weight } = largest;
  let sum = 0;
  for (let i = 0; i < z.length; i += 1) {
    sum += (weight[i] ?? 0) * normalBetween(z[i] ?? 0, w) ** (k - 1);
  }
  return k * sum;
}
