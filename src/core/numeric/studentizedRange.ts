import { chiScaleNodes } from './chiScale';
import { crossing } from './noncentralT';
import { normalDensity, normalUpperTail } from './normal';
import { tUpperQuantile } from './studentT';

const FINENESS = 2;
const WIDEST = 1 / 20;
const STEP = 1 / 8;
const LOWEST = -8.5;
const HIGHEST = 36;
/** Above this many df the scale is 1 to the last digit. */
const NO_SCALE = 1e8;

/** Fixed nodes of the inner integral over the largest of k normal values. */
const largest = ((): {
  readonly z: Float64Array;
  readonly below: Float64Array;
  readonly weight: Float64Array;
} => {
  const z = Float64Array.from({ length: (HIGHEST - LOWEST) / STEP + 1 }, (_, i) => LOWEST + i * STEP);
  return { z, below: z.map(at => normalUpperTail(-at)), weight: z.map(at => STEP * normalDensity(at)) };
})();

/** P(Q ≥ q): range of k ≥ 2 means over their own SD on df > 0 (Infinity: known SD). Source: Tukey 1953; Copenhaver & Holland 1988. */
export function studentizedRangeUpperTail(q: number, k: number, df: number): number {
  return q <= 0 ? 1 : overScales(q, df, w => rangeUpperTail(w, k));
}

/** P(Q ≤ q). */
export function studentizedRangeLowerTail(q: number, k: number, df: number): number {
  return q <= 0 ? 0 : overScales(q, df, w => rangeLowerTail(w, k));
}

/** q with P(Q ≥ q) = p, for p in (0, 1). */
export function studentizedRangeUpperQuantile(p: number, k: number, df: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? Infinity : p === 1 ? 0 : NaN;
  if (p > 0.5) return studentizedRangeLowerQuantile(1 - p, k, df);
  return quantile(p, k, df, q => -Math.log(studentizedRangeUpperTail(q, k, df) / p));
}

/** q with P(Q ≤ q) = p, for p in (0, 1). */
export function studentizedRangeLowerQuantile(p: number, k: number, df: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? 0 : p === 1 ? Infinity : NaN;
  if (p > 0.5) return studentizedRangeUpperQuantile(1 - p, k, df);
  return quantile(1 - p, k, df, q => Math.log(studentizedRangeLowerTail(q, k, df) / p));
}

/** Between the quantile of one pair, which is exact for k = 2, and that of all pairs taken one by one (Bonferroni). */
function quantile(upper: number, k: number, df: number, shortfall: (q: number) => number): number {
  const onePair = Math.SQRT2 * tUpperQuantile(upper / 2, df);
  if (k === 2) return onePair;
  const pairs = (k * (k - 1)) / 2;
  const allPairs = Math.SQRT2 * tUpperQuantile(upper / 2 / pairs, df);
  return crossing(shortfall, onePair * (1 - 1e-9), allPairs * (1 + 1e-9));
}

function overScales(q: number, df: number, tail: (w: number) => number): number {
  if (!(df < NO_SCALE)) return tail(q);
  const { scales, weights } = chiScaleNodes(df, FINENESS, WIDEST);
  return scales.reduce((sum, s, i) => sum + (weights[i] ?? 0) * tail(q * s), 0);
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
    const at = z[i] ?? 0;
    const between =
      at > w / 2
        ? normalUpperTail(at - w) - normalUpperTail(at)
        : normalUpperTail(-at) - normalUpperTail(w - at);
    sum += (weight[i] ?? 0) * Math.max(between, 0) ** (k - 1);
  }
  return k * sum;
}
