import { betaPrefactor, incompleteBeta } from './incompleteBeta';
import { normalLowerTail, normalUpperQuantile, normalUpperTail } from './normal';
import { rootOfLogTail } from './rootOfLogTail';
import { tStart } from './startingValue';

/** P(T ≥ t) for df > 0, real; df = Infinity is the normal curve. Source: DLMF 8.17 by incompleteBeta. */
export function tUpperTail(t: number, df: number): number {
  if (df === Infinity) return normalUpperTail(t);
  const outer = tTwoSided(t, df) / 2;
  return t >= 0 ? outer : centre(t, df);
}

/** P(T ≤ t). */
export const tLowerTail = (t: number, df: number): number =>
  df === Infinity ? normalLowerTail(t) : tUpperTail(-t, df);

/** P(|T| ≥ |t|). */
export function tTwoSided(t: number, df: number): number {
  if (df === Infinity) return 2 * normalUpperTail(Math.abs(t));
  const { x, y } = shares(t, df);
  return incompleteBeta(x, y, df / 2, 0.5).lower;
}

/** Density of Student's t at t. */
function tDensity(t: number, df: number): number {
  const { x, y } = shares(t, df);
  return t === 0
    ? (betaPrefactor(0.5, 0.5, df / 2, 0.5) * 2 ** ((df + 1) / 2)) / Math.sqrt(df)
    : betaPrefactor(x, y, df / 2, 0.5) / Math.abs(t);
}

/** t with P(T ≥ t) = p, for p in (0, 1) and df > 0; ±∞ at 0 and 1. */
export function tUpperQuantile(p: number, df: number): number {
  if (df === Infinity) return normalUpperQuantile(p);
  if (!(p > 0 && p < 1)) return p === 0 ? Infinity : p === 1 ? -Infinity : NaN;
  if (p === 0.5) return 0;
  if (p > 0.5) return -tUpperQuantile(1 - p, df);
  return rootOfLogTail(
    tStart(p, df),
    p,
    t => tUpperTail(t, df),
    t => tDensity(t, df),
  );
}

/** df/(df + t²) and t²/(df + t²); for huge t the first is formed from (df/t)/t, so that nothing overflows. */
function shares(t: number, df: number): { readonly x: number; readonly y: number } {
  const square = t * t;
  if (square === Infinity) return { x: df / t / t, y: 1 };
  const sum = df + square;
  return { x: df / sum, y: square / sum };
}

/** Upper tail left of the centre, ½ + half of the middle: a sum of positive parts. */
function centre(t: number, df: number): number {
  const { x, y } = shares(t, df);
  return 0.5 + incompleteBeta(x, y, df / 2, 0.5).upper / 2;
}
