import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import fc from 'fast-check';
import jStat from 'jstat';
import { describe, expect, it } from 'vitest';
import { digitsOf, summaryOf, type Grid } from '../../../src/cli/accuracyGrids';
import { betaQuantile } from '../../../src/core/numeric/betaQuantile';
import { binomialTails } from '../../../src/core/numeric/binomial';
import {
  chiSquareLowerQuantile,
  chiSquareLowerTail,
  chiSquareUpperQuantile,
  chiSquareUpperTail,
} from '../../../src/core/numeric/chiSquare';
import { fLowerQuantile, fLowerTail, fUpperQuantile, fUpperTail } from '../../../src/core/numeric/fisherF';
import { incompleteBeta } from '../../../src/core/numeric/incompleteBeta';
import {
  normalDensity,
  normalLowerTail,
  normalQuantile,
  normalUpperQuantile,
  normalUpperTail,
} from '../../../src/core/numeric/normal';
import {
  noncentralityForLowerTail,
  noncentralityForUpperTail,
  noncentralTLowerTail,
  noncentralTUpperTail,
} from '../../../src/core/numeric/noncentralT';
import { rootOfLogTail } from '../../../src/core/numeric/rootOfLogTail';
import {
  studentizedRangeLowerQuantile,
  studentizedRangeLowerTail,
  studentizedRangeUpperQuantile,
  studentizedRangeUpperTail,
} from '../../../src/core/numeric/studentizedRange';
import { tLowerTail, tTwoSided, tUpperQuantile, tUpperTail } from '../../../src/core/numeric/studentT';

const fixtures = path.join(import.meta.dirname, 'fixtures');
const grids = readdirSync(fixtures)
  .filter(name => name.endsWith('.json'))
  .map(name => JSON.parse(readFileSync(path.join(fixtures, name), 'utf8')) as Grid);

const relative = (ours: number, truth: number): number => Math.abs(ours - truth) / Math.abs(truth);
const probability = fc.double({ min: 1e-12, max: 1 - 1e-12, noNaN: true });
const df = fc.double({ min: 1, max: 1e6, noNaN: true });
const moderate = fc.double({ min: -30, max: 30, noNaN: true });

// Source of every grid: 50-digit arithmetic (mpmath) from the exact doubles of the arguments.
describe('tails and quantiles', () => {
  it.each(grids.map(grid => [grid.name, grid] as const))('of %s keep 13 digits on every point', (_, grid) => {
    const digits = digitsOf(grid);
    expect(digits?.length).toBeGreaterThanOrEqual(grid.rows.length);
    expect(summaryOf(digits ?? []).fewest).toBeGreaterThanOrEqual(13);
  });

  it('agree with an independent implementation at its own accuracy', () => {
    // jstat 1.9: tails by continued fraction to about 3e-7, quantiles to 7 to 10 digits.
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.49, noNaN: true }),
        fc.integer({ min: 2, max: 200 }),
        (p, n) => {
          expect(relative(tUpperQuantile(p, n), -jStat.studentt.inv(p, n))).toBeLessThan(1e-6);
          expect(relative(fUpperQuantile(p, n, 7), jStat.centralF.inv(1 - p, n, 7))).toBeLessThan(1e-6);
          expect(relative(normalUpperQuantile(p), -jStat.normal.inv(p, 0, 1))).toBeLessThan(1e-6);
          expect(relative(betaQuantile(p, n, 3), jStat.beta.inv(p, n, 3))).toBeLessThan(1e-6);
        },
      ),
      { numRuns: 200 },
    );
  });

  it('of both sides add up to 1', () => {
    fc.assert(
      fc.property(moderate, df, df, (t, a, b) => {
        expect(normalLowerTail(t) + normalUpperTail(t)).toBeCloseTo(1, 14);
        expect(tLowerTail(t, a) + tUpperTail(t, a)).toBeCloseTo(1, 14);
        expect(fLowerTail(Math.abs(t), a, b) + fUpperTail(Math.abs(t), a, b)).toBeCloseTo(1, 14);
      }),
    );
  });

  it('are symmetric for t and the normal curve', () => {
    fc.assert(
      fc.property(moderate, df, (t, n) => {
        expect(tLowerTail(-t, n)).toBe(tUpperTail(t, n));
        expect(normalLowerTail(-t)).toBe(normalUpperTail(t));
        expect(tUpperQuantile(0.125, n)).toBe(-tUpperQuantile(0.875, n));
      }),
    );
  });

  it('are 0 and 1 at the ends of the normal curve', () => {
    expect([normalUpperTail(Infinity), normalUpperTail(-Infinity)]).toEqual([0, 1]);
    expect([normalLowerTail(Infinity), normalLowerTail(-Infinity)]).toEqual([1, 0]);
  });

  it('join t, F and the normal curve: t² is F on 1 and df, infinite df is normal', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 30, noNaN: true }), df, (t, n) => {
        expect(relative(tTwoSided(t, n), fUpperTail(t * t, 1, n))).toBeLessThan(1e-11);
        expect(tUpperTail(t, Infinity)).toBe(normalUpperTail(t));
        expect(tUpperQuantile(0.025, Infinity)).toBe(normalUpperQuantile(0.025));
      }),
    );
  });

  it('are inverted by their quantiles', () => {
    fc.assert(
      fc.property(probability, df, fc.integer({ min: 1, max: 500 }), (p, n, m) => {
        expect(relative(tUpperTail(tUpperQuantile(p, n), n), p)).toBeLessThan(1e-12);
        expect(relative(fUpperTail(fUpperQuantile(p, m, n), m, n), p)).toBeLessThan(1e-11);
        expect(relative(fLowerTail(fLowerQuantile(p, m, n), m, n), p)).toBeLessThan(1e-11);
        expect(relative(normalLowerTail(normalQuantile(p)), p)).toBeLessThan(1e-12);
        const x = betaQuantile(p, m, 2.5);
        if (x < 1) expect(relative(incompleteBeta(x, 1 - x, m, 2.5).lower, p)).toBeLessThan(1e-9);
      }),
    );
  });

  it('say where they end: impossible and certain tails', () => {
    expect([normalUpperQuantile(0), normalQuantile(0), normalQuantile(1)]).toEqual([
      Infinity,
      -Infinity,
      Infinity,
    ]);
    expect([tUpperQuantile(0, 5), tUpperQuantile(1, 5), tUpperQuantile(0.5, 5)]).toEqual([
      Infinity,
      -Infinity,
      0,
    ]);
    expect([fUpperQuantile(0, 2, 3), fUpperQuantile(1, 2, 3)]).toEqual([Infinity, 0]);
    expect([betaQuantile(0, 2, 3), betaQuantile(1, 2, 3)]).toEqual([0, 1]);
    expect([fUpperTail(0, 2, 3), fLowerTail(0, 2, 3), fUpperTail(Infinity, 2, 3)]).toEqual([1, 0, 0]);
    expect([tUpperTail(Infinity, 4), tUpperTail(-Infinity, 4)]).toEqual([0, 1]);
    expect(normalDensity(0)).toBeCloseTo(0.3989422804014327, 15);
    for (const bad of [-0.1, 1.1, NaN]) {
      expect([tUpperQuantile(bad, 5), fUpperQuantile(bad, 2, 3), betaQuantile(bad, 2, 3)]).toEqual([
        NaN,
        NaN,
        NaN,
      ]);
    }
  });
});

describe('the distributions of sizes, counts and ranges', () => {
  it('chi-square quantiles invert its tails; on 1 df it is the square of a normal value', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 0.999, noNaN: true }), df, (p, n) => {
        expect(relative(chiSquareUpperTail(chiSquareUpperQuantile(p, n), n), p)).toBeLessThan(1e-9);
        expect(relative(chiSquareLowerTail(chiSquareLowerQuantile(p, n), n), p)).toBeLessThan(1e-9);
        expect(relative(chiSquareUpperQuantile(p, 1), normalUpperQuantile(p / 2) ** 2)).toBeLessThan(1e-9);
      }),
    );
  });

  it('the noncentrality found for a tail gives that tail, and is mirrored with the sign of t', () => {
    const tail = fc.constantFrom(0.005, 0.025, 0.05, 0.5);
    fc.assert(
      fc.property(
        fc.double({ min: -8, max: 8, noNaN: true }),
        fc.integer({ min: 2, max: 200 }),
        tail,
        (t, n, p) => {
          const lower = noncentralityForUpperTail(t, n, p);
          expect(relative(noncentralTUpperTail(t, n, lower), p)).toBeLessThan(1e-12);
          const upper = noncentralityForLowerTail(t, n, p);
          expect(relative(noncentralTLowerTail(t, n, upper), p)).toBeLessThan(1e-12);
          expect(noncentralityForLowerTail(-t, n, p)).toBe(-lower);
        },
      ),
      { numRuns: 30 },
    );
  });

  it('binomial tails are sums of their terms', () => {
    // Source: the definition; C(10, k) / 2^10 by hand.
    expect(binomialTails(2, 10, 0.5).lower).toBeCloseTo(56 / 1024, 15);
    expect(binomialTails(8, 10, 0.5).upper).toBeCloseTo(56 / 1024, 15);
    expect(binomialTails(10, 10, 0.5)).toEqual({ lower: 1, upper: expect.closeTo(1 / 1024, 15) });
    expect(binomialTails(0, 10, 0.5).upper).toBe(1);
  });

  it('the range of two means is a t times the root of 2', () => {
    expect(studentizedRangeUpperQuantile(0.05, 2, 9)).toBe(Math.SQRT2 * tUpperQuantile(0.025, 9));
    // Source: NIST/SEMATECH e-Handbook 7.4.7.1 prints q(0.05; 4, 16) = 4.05.
    expect(studentizedRangeUpperQuantile(0.05, 4, 16)).toBeCloseTo(4.05, 2);
  });

  it('the quantile of a range inverts its tails, for few df and for many', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-6, max: 0.999, noNaN: true }),
        fc.constantFrom(2, 3, 9, 60),
        fc.constantFrom(1, 1.7, 2.1, 5.3, 12, 400.5, 1e6, Infinity),
        (p, k, n) => {
          const upper = studentizedRangeUpperQuantile(p, k, n);
          expect(relative(studentizedRangeUpperTail(upper, k, n), p)).toBeLessThan(1e-12);
          expect(studentizedRangeLowerTail(upper, k, n) + p).toBeCloseTo(1, 13);
          const lower = studentizedRangeLowerQuantile(p, k, n);
          expect(relative(studentizedRangeLowerTail(lower, k, n), p)).toBeLessThan(1e-12);
        },
      ),
      { numRuns: 60, examples: [[1e-6, 2, Infinity]] },
    );
  });

  it('the tails of a range end at 0 and infinity, and its quantiles at 0 and 1', () => {
    expect([studentizedRangeUpperTail(0, 4, 9), studentizedRangeUpperTail(Infinity, 4, 9)]).toEqual([1, 0]);
    expect(studentizedRangeLowerTail(0, 4, 9)).toBe(0);
    expect(studentizedRangeLowerTail(Infinity, 4, 9)).toBeCloseTo(1, 15);
    expect([studentizedRangeUpperQuantile(0, 4, 9), studentizedRangeUpperQuantile(1, 4, 9)]).toEqual([
      Infinity,
      0,
    ]);
    expect([studentizedRangeLowerQuantile(0, 4, 9), studentizedRangeLowerQuantile(1, 4, 9)]).toEqual([
      0,
      Infinity,
    ]);
    expect([studentizedRangeUpperTail(NaN, 4, 9), studentizedRangeUpperQuantile(NaN, 4, 9)]).toEqual([
      NaN,
      NaN,
    ]);
  });
});

describe('the root of a log tail', () => {
  it('is found from any start', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-100, max: 1e100, noNaN: true }),
        fc.double({ min: 1e-9, max: 0.5, noNaN: true }),
        (start, p) => {
          // The exponential tail, whose quantile is −ln p.
          const x = rootOfLogTail(
            start,
            p,
            at => Math.exp(-at),
            at => Math.exp(-at),
          );
          expect(relative(x, -Math.log(p))).toBeLessThan(1e-14);
        },
      ),
    );
  });
});
