import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  dunnettLowerTail,
  dunnettUpperQuantile,
  dunnettUpperTail,
  type ManyToOne,
} from '../../../src/core/numeric/dunnett';
import { studentizedRangeUpperTail } from '../../../src/core/numeric/studentizedRange';
import { tTwoSided, tUpperQuantile, tUpperTail } from '../../../src/core/numeric/studentT';
import { expectClose } from '../close';

const equal = (groups: number, df: number): ManyToOne => ({
  sizes: Array.from({ length: groups }, () => 8),
  reference: 8,
  df,
});

/** t, sizes, size of the reference, df, sides, upper tail. */
const GRID = [
  [2.5, [5, 5], 5, 12, 'two', 0.050211960152856616],
  [0.857032125934, [4, 5], 6, 12, 'two', 0.6201019800187006],
  [3.69375231124, [4, 5], 6, 12, 'two', 0.005825360847901842],
  [2.0, [5, 5, 5], 5, 16, 'one', 0.07517679902416154],
  [1.0, [3, 3], 3, 3, 'two', 0.5680717420700915],
  [4.0, [6, 6, 6, 6], 6, 25, 'two', 0.0018147064766619353],
  [8.0, [10, 10, 10], 10, 36, 'two', 5.000368227706471e-9],
  [2.2, [40, 3], 6, 46, 'one', 0.0297106032268565],
  [2.2, [40, 3], 6, 46, 'two', 0.059417533450098974],
  [-0.7, [5, 8], 4, 14, 'one', 0.864919359255419],
  [2.57, [30, 30, 30, 30, 30], 30, 174, 'two', 0.04574517639262005],
  [2.5, [200, 100], 5, 302, 'two', 0.0167683074117431],
  [0.05, [5, 5], 5, 12, 'two', 0.9981646163925171],
  [2.35, [8, 8, 8], 8, Infinity, 'two', 0.04986840681065533],
  [6.0, [4, 9, 16], 5, 30, 'one', 1.9916499286060288e-6],
] as const;

describe('Dunnett’s distribution of many against one', () => {
  // source: computed for this project with 30-digit arithmetic (mpmath 1.3.0): trapezoidal rule over the share of the
  // reference, Gauss–Legendre rule over the scale
  it.each(GRID)(
    'keeps 13 digits: t %d, %j against %d on %d df, sides %s',
    (t, sizes, reference, df, sides, truth) => {
      expectClose(dunnettUpperTail(t, { sizes, reference, df }, sides), truth, 1e-13, 'upper tail');
    },
  );

  it('has the printed critical values', () => {
    // source: Dunnett 1955, Journal of the American Statistical Association 50:1096–1121, Table 1a (one-sided 5%); Dunnett
    // 1964, Biometrics 20:482–491, Table II (two-sided 5%); printed digits from memory
    const printed = (df: number, sides: 'one' | 'two'): readonly string[] =>
      [1, 2, 3, 4].map(groups => dunnettUpperQuantile(0.05, equal(groups, df), sides).toFixed(2));
    expect(printed(5, 'one')).toEqual(['2.02', '2.44', '2.68', '2.85']);
    expect(printed(20, 'one')).toEqual(['1.72', '2.03', '2.19', '2.30']);
    expect(printed(10, 'two')).toEqual(['2.23', '2.57', '2.76', '2.89']);
    expect(printed(Infinity, 'two')).toEqual(['1.96', '2.21', '2.35', '2.44']);
  });

  const among = fc.array(fc.constantFrom(3, 5, 8, 40), { minLength: 1, maxLength: 5 }).chain(sizes =>
    fc.record({
      sizes: fc.constant(sizes),
      reference: fc.constantFrom(3, 6, 20),
      df: fc.constantFrom(2.5, 12, 60, Infinity),
    }),
  );
  const sides = fc.constantFrom('one' as const, 'two' as const);

  it('has two tails that add up to 1, between one comparison and all of them taken one by one', () => {
    fc.assert(
      fc.property(among, sides, fc.double({ min: -4, max: 8, noNaN: true }), (data, side, t) => {
        const upper = dunnettUpperTail(t, data, side);
        expect(upper + dunnettLowerTail(t, data, side)).toBeCloseTo(1, 13);
        if (side === 'two' && t <= 0) return;
        const one = side === 'two' ? tTwoSided(t, data.df) : tUpperTail(t, data.df);
        expect(upper).toBeGreaterThanOrEqual(one * (1 - 1e-12));
        expect(upper).toBeLessThanOrEqual(data.sizes.length * one * (1 + 1e-12));
      }),
      { numRuns: 40 },
    );
  });

  it('is inverted by its quantile', () => {
    fc.assert(
      fc.property(among, sides, fc.double({ min: 1e-6, max: 0.5, noNaN: true }), (data, side, p) => {
        const t = dunnettUpperQuantile(p, data, side);
        expectClose(dunnettUpperTail(t, data, side), p, 1e-12, 'tail');
      }),
      { numRuns: 40 },
    );
  });

  it('does not mind the order of the groups, and lies below the range of all means', () => {
    const turned = dunnettUpperTail(2.4, { sizes: [9, 3, 5], reference: 4, df: 17 }, 'two');
    expect(dunnettUpperTail(2.4, { sizes: [3, 5, 9], reference: 4, df: 17 }, 'two')).toBe(turned);
    expect(dunnettUpperTail(2.4, equal(3, 28), 'two')).toBeLessThan(
      studentizedRangeUpperTail(2.4 * Math.SQRT2, 4, 28),
    );
  });

  it('of one group is Student’s t, and says where it ends', () => {
    expect(dunnettUpperQuantile(0.05, equal(1, 9), 'two')).toBe(tUpperQuantile(0.025, 9));
    expect(dunnettUpperTail(2, equal(1, 9), 'one')).toBe(tUpperTail(2, 9));
    expect([dunnettUpperTail(0, equal(2, 9), 'two'), dunnettLowerTail(-1, equal(2, 9), 'two')]).toEqual([
      1, 0,
    ]);
    expect(dunnettUpperQuantile(0, equal(2, 9), 'two')).toBe(Infinity);
    expect(dunnettUpperQuantile(0.7, equal(2, 9), 'two')).toBeNaN();
    expect(dunnettUpperTail(NaN, equal(2, 9), 'two')).toBeNaN();
  });
});
