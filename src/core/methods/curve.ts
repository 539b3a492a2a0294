import { normalLowerTail, normalUpperQuantile, normalUpperTail } from '../numeric/normal';
import { tLowerTail, tTwoSided, tUpperQuantile, tUpperTail } from '../numeric/studentT';

/** The distribution a statistic is held against. Both tails are functions of their own, never 1 − the other. */
export interface Curve {
  lowerTail(x: number): number;
  upperTail(x: number): number;
  /** Chance of a value at least as far from 0. */
  twoSided(x: number): number;
  /** The point above which the given share lies. */
  upperQuantile(share: number): number;
}

/** The standard normal curve. */
export const normalCurve: Curve = {
  lowerTail: normalLowerTail,
  upperTail: normalUpperTail,
  twoSided: x => 2 * normalUpperTail(Math.abs(x)),
  upperQuantile: normalUpperQuantile,
};

/** Student's t with real degrees of freedom of at least 1; null stands for the normal curve. */
export function curveOf(df: number | null): Curve {
  if (df === null) return normalCurve;
  return {
    lowerTail: x => tLowerTail(x, df),
    upperTail: x => tUpperTail(x, df),
    twoSided: x => tTwoSided(x, df),
    upperQuantile: share => tUpperQuantile(share, df),
  };
}
