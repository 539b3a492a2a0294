import { betaPrefactor, incompleteBeta, type Tails } from './incompleteBeta';
import { rootOfLogTail } from './rootOfLogTail';
import { fStart } from './startingValue';

/** P(F ≥ f) for f ≥ 0 and real df1, df2 > 0. */
export const fUpperTail = (f: number, df1: number, df2: number): number => tails(f, df1, df2).upper;

/** P(F ≤ f). */
export const fLowerTail = (f: number, df1: number, df2: number): number => tails(f, df1, df2).lower;

/** f with P(F ≥ f) = p, for p in (0, 1). */
export function fUpperQuantile(p: number, df1: number, df2: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? Infinity : p === 1 ? 0 : NaN;
  const start = fStart(p, df1, df2);
  const density = (f: number): number => fDensity(f, df1, df2);
  // The smaller tail is the one that keeps its relative accuracy.
  if (p <= 0.5) return rootOfLogTail(start, p, f => fUpperTail(f, df1, df2), density);
  return (
    1 /
    rootOfLogTail(
      1 / start,
      1 - p,
      g => fUpperTail(g, df2, df1),
      g => fDensity(g, df2, df1),
    )
  );
}

/** f with P(F ≤ f) = p, for p in (0, 1): the reciprocal of the upper quantile with the df exchanged. */
export const fLowerQuantile = (p: number, df1: number, df2: number): number =>
  1 / fUpperQuantile(p, df2, df1);

/** Density of F at f > 0. */
function fDensity(f: number, df1: number, df2: number): number {
  const { x, y, lambda } = shares(f, df1, df2);
  return betaPrefactor(x, y, df1 / 2, df2 / 2, lambda) / f;
}

/** The tails of F are those of the beta distribution at df1·f/(df2 + df1·f). Source: DLMF 8.17. */
function tails(f: number, df1: number, df2: number): Tails {
  if (!(f > 0)) return { lower: 0, upper: 1 };
  const { x, y, lambda } = shares(f, df1, df2);
  return incompleteBeta(x, y, df1 / 2, df2 / 2, lambda);
}

interface Shares {
  readonly x: number;
  readonly y: number;
  readonly lambda: number;
}

/** df1·f/s and df2/s with s = df2 + df1·f, and λ = df1·df2·(1 − f)/2s, which keeps the digits that a·y − b·x would lose. */
function shares(f: number, df1: number, df2: number): Shares {
  const scaled = df1 * f;
  if (scaled === Infinity) return { x: 1, y: df2 / df1 / f, lambda: -df2 / 2 };
  const sum = df2 + scaled;
  return { x: scaled / sum, y: df2 / sum, lambda: ((df1 / 2) * (df2 * (1 - f))) / sum };
}
