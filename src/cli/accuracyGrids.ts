import { betaQuantile } from '../core/numeric/betaQuantile';
import { chiSquareLowerTail, chiSquareUpperTail } from '../core/numeric/chiSquare';
import { fLowerTail, fUpperTail } from '../core/numeric/fisherF';
import { hypergeometricTails } from '../core/numeric/hypergeometric';
import { incompleteBeta } from '../core/numeric/incompleteBeta';
import { logGamma } from '../core/numeric/logGamma';
import { noncentralTLowerTail, noncentralTUpperTail } from '../core/numeric/noncentralT';
import { normalLowerTail, normalQuantile, normalUpperTail } from '../core/numeric/normal';
import {
  studentizedRangeLowerQuantile,
  studentizedRangeLowerTail,
  studentizedRangeUpperTail,
} from '../core/numeric/studentizedRange';
import { tLowerTail, tUpperQuantile, tUpperTail } from '../core/numeric/studentT';

/** A grid of truth: `cols` names the arguments, then what was computed of them to many digits; one row a point. */
export interface Grid {
  readonly name: string;
  readonly cols: readonly string[];
  /** null where the truth is too small for a double. */
  readonly rows: readonly (readonly (number | null)[])[];
}

type Of = (...values: number[]) => number;

/** t with lower tail p, through the tail that is the smaller one. */
const tQuantile: Of = (p = NaN, df = NaN) => (p <= 0.5 ? -tUpperQuantile(p, df) : tUpperQuantile(1 - p, df));

const fisher = ([a = NaN, b = NaN, c = NaN, d = NaN]: readonly number[]) =>
  hypergeometricTails(a, a + b + c + d, a + b, a + c);

/** What is computed of the arguments for each column of truth; named by the columns of the grid files. */
const functions: Readonly<Record<string, Readonly<Record<string, Of>>>> = {
  z: { sf: (z = NaN) => normalUpperTail(z), cdf: (z = NaN) => normalLowerTail(z) },
  p: { q: (p = NaN) => normalQuantile(p) },
  't,df': {
    sf: (t = NaN, df = NaN) => tUpperTail(t, df),
    cdf: (t = NaN, df = NaN) => tLowerTail(t, df),
  },
  'p,df': { q: tQuantile },
  'F,d1,d2': {
    sf: (f = NaN, df1 = NaN, df2 = NaN) => fUpperTail(f, df1, df2),
    cdf: (f = NaN, df1 = NaN, df2 = NaN) => fLowerTail(f, df1, df2),
  },
  'x,a,b': {
    lower: (x = NaN, a = NaN, b = NaN) => incompleteBeta(x, 1 - x, a, b).lower,
    upper: (x = NaN, a = NaN, b = NaN) => incompleteBeta(x, 1 - x, a, b).upper,
  },
  'p,a,b': { x: (p = NaN, a = NaN, b = NaN) => betaQuantile(p, a, b) },
  'x,k': {
    sf: (x = NaN, df = NaN) => chiSquareUpperTail(x, df),
    cdf: (x = NaN, df = NaN) => chiSquareLowerTail(x, df),
  },
  't,df,ncp': {
    cdf: (t = NaN, df = NaN, ncp = NaN) => noncentralTLowerTail(t, df, ncp),
    sf: (t = NaN, df = NaN, ncp = NaN) => noncentralTUpperTail(t, df, ncp),
  },
  'q,k,df': {
    sf: (q = NaN, k = NaN, df = NaN) => studentizedRangeUpperTail(q, k, df),
    cdf: (q = NaN, k = NaN, df = NaN) => studentizedRangeLowerTail(q, k, df),
  },
  'p,k,df': { q: (p = NaN, k = NaN, df = NaN) => studentizedRangeLowerQuantile(p, k, df) },
  'x,N,K,n': {
    lower: (x = NaN, N = NaN, K = NaN, n = NaN) => hypergeometricTails(x, N, K, n).lower,
    upper: (x = NaN, N = NaN, K = NaN, n = NaN) => hypergeometricTails(x, N, K, n).upper,
  },
  'a,b,c,d': {
    two: (...table: number[]) => fisher(table).twoSided,
    less: (...table: number[]) => fisher(table).lower,
    greater: (...table: number[]) => fisher(table).upper,
  },
  x: { v: (x = NaN) => logGamma(x) },
};

/**
 * Right digits of every number of a grid: −log10 of the relative error, at most 16; 16 for an exact hit, 0 where the truth
 * is 0 and ours is not. Null when nothing here computes what the grid holds.
 */
export function digitsOf(grid: Grid): readonly number[] | null {
  const split = Object.keys(functions).find(
    key => grid.cols.join(',').startsWith(`${key},`) && fits(key, grid),
  );
  const columns = split === undefined ? undefined : functions[split];
  if (split === undefined || columns === undefined) return null;
  const given = split.split(',').length;
  return grid.rows.flatMap(row => {
    const values = row.slice(0, given).map(value => value ?? NaN);
    return grid.cols.slice(given).flatMap((column, index) => {
      const truth = row[given + index] ?? null;
      return truth === null ? [] : [rightDigits(columns[column]?.(...values) ?? NaN, truth)];
    });
  });
}

const fits = (key: string, { cols }: Grid): boolean =>
  cols.slice(key.split(',').length).every(column => functions[key]?.[column] !== undefined);

function rightDigits(ours: number, truth: number): number {
  if (ours === truth) return 16;
  const error = Math.abs(ours - truth) / Math.abs(truth);
  return Number.isFinite(error) ? Math.max(0, Math.min(16, -Math.log10(error))) : 0;
}

/** Points, fewest and median digits of a grid. */
export function summaryOf(digits: readonly number[]): { readonly fewest: number; readonly median: number } {
  const sorted = [...digits].sort((a, b) => a - b);
  return { fewest: sorted[0] ?? 0, median: sorted[Math.floor(sorted.length / 2)] ?? 0 };
}
