import { stirlingError } from './stirlingError';

/** Nodes and weights for means over s = χ_df/√df, the scale by which a t or range is studentised. */
export interface ScaleNodes {
  readonly scales: Float64Array;
  readonly weights: Float64Array;
}

const NEGLIGIBLE = 1e-30;
const KEPT = 24;
const kept = new Map<string, ScaleNodes>();

/**
 * Trapezoidal rule over ln s, whose density is smooth and falls off doubly exponentially: it converges faster than any power of
 * the step, and all terms are positive, so that both tails keep their relative accuracy. `fineness` is nodes a
 * standard deviation of ln s.
 */
export function chiScaleNodes(df: number, fineness: number, widest: number): ScaleNodes {
  const key = `${df} ${fineness} ${widest}`;
  const known = kept.get(key);
  if (known !== undefined) return known;
  const density = logScaleDensity(df);
  const step = Math.min(1 / Math.sqrt(2 * df) / fineness, widest);
  const scales: number[] = [];
  const weights: number[] = [];
  const walk = (from: number, by: number): void => {
    for (let k = from; ; k += by) {
      const u = k * step;
      const weight = density(u);
      if (weight < NEGLIGIBLE && Math.abs(k) > 2) return;
      scales.push(Math.exp(u));
      weights.push(weight * step);
    }
  };
  walk(0, 1);
  walk(-1, -1);
  const nodes = { scales: Float64Array.from(scales), weights: Float64Array.from(weights) };
  if (kept.size >= KEPT) kept.clear();
  kept.set(key, nodes);
  return nodes;
}

/** The density of ln s at u, where s = χ_df/√df: highest at u = 0, and falling to both sides. */
export function logScaleDensity(df: number): (u: number) => number {
  const a = df / 2;
  const logHeight = Math.LN2 + 0.5 * Math.log(a / (2 * Math.PI)) - stirlingError(a);
  return u => Math.exp(logHeight - a * exponentBend(2 * u));
}

/** e^v − 1 − v without cancellation. */
function exponentBend(v: number): number {
  if (Math.abs(v) > 0.1) return Math.expm1(v) - v;
  let term = (v * v) / 2;
  let sum = term;
  for (let n = 3; Math.abs(term) > 1e-18 * sum; n += 1) {
    term *= v / n;
    sum += term;
  }
  return sum;
}
