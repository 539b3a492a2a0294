import { chiScaleNodes } from './chiScale';
import { normalUpperTail } from './normal';
import { tLowerTail, tUpperTail } from './studentT';

const FINENESS = 2.5;
const WIDEST = 1 / 24;
const MOST_STEPS = 200;

/** P(T ≥ t) of the noncentral t with df > 0 and noncentrality ncp: mean of P(Z ≥ t·s − ncp) over the scale s = χ_df/√df. */
export function noncentralTUpperTail(t: number, df: number, ncp: number): number {
  if (ncp === 0) return tUpperTail(t, df);
  if (df === Infinity) return normalUpperTail(t - ncp);
  const { scales, weights } = chiScaleNodes(df, FINENESS, WIDEST);
  return scales.reduce((sum, s, i) => sum + (weights[i] ?? 0) * normalUpperTail(t * s - ncp), 0);
}

/** P(T ≤ t). */
export const noncentralTLowerTail = (t: number, df: number, ncp: number): number =>
  ncp === 0 ? tLowerTail(t, df) : noncentralTUpperTail(-t, df, -ncp);

/** The noncentrality with P(T ≥ t) = p: the lower confidence limit of an effect at upper tail p (Steiger & Fouladi 1997). */
export function noncentralityForUpperTail(t: number, df: number, p: number): number {
  let low = t - 1;
  let high = t + 1;
  const excess = (ncp: number): number => Math.log(noncentralTUpperTail(t, df, ncp) / p);
  for (let reach = 1; excess(low) > 0; reach *= 2) low -= reach;
  for (let reach = 1; excess(high) < 0; reach *= 2) high += reach;
  return crossing(excess, low, high);
}

/** The noncentrality with P(T ≤ t) = p: the upper confidence limit. */
export const noncentralityForLowerTail = (t: number, df: number, p: number): number =>
  -noncentralityForUpperTail(-t, df, p);

/** Where an increasing function crosses 0 between low and high: false position (Illinois form, Dowell & Jarratt 1971). */
function crossing(increasing: (x: number) => number, low: number, high: number): number {
  let below = increasing(low);
  let above = increasing(high);
  let [from, to] = [low, high];
  let side = 0;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const guess = (below * to - above * from) / (below - above);
    const x = guess > from && guess < to ? guess : (from + to) / 2;
    const value = increasing(x);
    if (value === 0 || to - from <= 4e-16 * Math.abs(x) || x === from || x === to) return x;
    if (value < 0) {
      from = x;
      below = value;
      if (side === -1) above /= 2;
      side = -1;
    } else {
      to = x;
      above = value;
      if (side === 1) below /= 2;
      side = 1;
    }
  }
  return (from + to) / 2;
}
