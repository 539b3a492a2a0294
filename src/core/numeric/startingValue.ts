// eslint-disable-next-line @typescript-eslint/triple-slash-reference -- jstat brings no types; every program that reaches this file needs ours.
/// <reference path="./jstat.d.ts" />
import jStat from 'jstat';

/**
 * Starting values of 7 to 10 right digits for the quantiles, which Newton steps on the log of the smaller tail bring to
 * full precision. Where jstat gives none that can be used, a plain one is returned: rootOfLogTail converges from any.
 */

/** z with upper tail p, p in (0, ½). Beyond jstat's reach the asymptotic form of the tail. */
export function normalStart(p: number): number {
  const far = Math.sqrt(-2 * Math.log(p));
  return usable(-jStat.normal.inv(p, 0, 1)) ?? Math.max(far - Math.log(2.5 * far) / far, 0.1);
}

/** t with upper tail p, p in (0, ½). */
export function tStart(p: number, df: number): number {
  return usable(-jStat.studentt.inv(p, df)) ?? normalStart(p);
}

/** f with upper tail p, p in (0, 1). */
export function fStart(p: number, df1: number, df2: number): number {
  return usable(jStat.centralF.inv(1 - p, df1, df2)) ?? 1;
}

/** x of the beta distribution with lower tail p. */
export function betaStart(p: number, a: number, b: number): number {
  return usable(jStat.beta.inv(p, a, b)) ?? a / (a + b);
}

/** x of the chi-square distribution with lower tail p. */
export function chiSquareStart(p: number, df: number): number {
  return usable(jStat.chisquare.inv(p, df)) ?? df;
}

const usable = (value: number): number | null => (value > 0 && value < Infinity ? value : null);
