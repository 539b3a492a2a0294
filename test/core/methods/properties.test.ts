import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { percentOfReference } from '../../../src/core/methods/effects/percentOfReference';
import { alphaOf } from '../../../src/core/methods/confidence';
import { conservativeT } from '../../../src/core/methods/conservativeT';
import { knownSigmaZ } from '../../../src/core/methods/knownSigmaZ';
import { largeNZ } from '../../../src/core/methods/largeNZ';
import { pairedT } from '../../../src/core/methods/pairedT';
import { pooledT } from '../../../src/core/methods/pooledT';
import { separateT } from '../../../src/core/methods/separateT';
import type { Designs } from '../../../src/core/model/groups';
import type { Ask, MethodResult } from '../../../src/core/model/methods';
import { expectClose } from '../close';
import { asking, noTick, pairsOf, summariesOf, twoOf } from '../groupsFrom';

// Identities that follow from the formulas; no outside source is needed beyond those of the methods.

const tenths = (value: number): string => (value / 10).toFixed(1);
const list = fc.array(fc.integer({ min: -5000, max: 5000 }), { minLength: 2, maxLength: 40 });
const scattered = list.filter(values => new Set(values).size > 1);
const two = fc.tuple(scattered, scattered);
const confidence = fc.constantFrom(0.8, 0.9, 0.95, 0.99);
const methods = [separateT, pooledT, conservativeT, largeNZ, knownSigmaZ] as const;
const option: Ask['option'] = key => (key === 'sigma' ? [12, 30] : null);
const ask = (asked: Parameters<typeof asking>[0] = {}): Ask => ({ ...asking(asked), option });

const groups = (
  test: readonly number[],
  reference: readonly number[],
  by: (v: number) => number = v => v,
): Designs['two'] =>
  twoOf(
    test.map(value => tenths(by(value))),
    reference.map(value => tenths(by(value))),
  );

describe('every t and z of two groups', () => {
  it('does not mind a constant added to every value', () => {
    fc.assert(
      fc.property(two, fc.integer({ min: -1e9, max: 1e9 }), ([test, reference], shift) => {
        for (const method of methods) {
          const plain = method.run(groups(test, reference), ask(), noTick);
          const shifted = method.run(
            groups(test, reference, value => value + shift),
            ask(),
            noTick,
          );
          expect(shifted).toEqual(plain);
        }
      }),
      { numRuns: 100 },
    );
  });

  it('scales its estimate, error and interval with the values and keeps t and p', () => {
    fc.assert(
      fc.property(two, fc.integer({ min: 2, max: 1000 }), ([test, reference], factor) => {
        for (const method of [separateT, pooledT, conservativeT, largeNZ]) {
          const plain = method.run(groups(test, reference), ask(), noTick);
          const scaled = method.run(
            groups(test, reference, value => value * factor),
            ask(),
            noTick,
          );
          expectClose(scaled.estimate, plain.estimate! * factor, 1e-14, 'estimate');
          expectClose(scaled.se, plain.se! * factor, 1e-14, 'standard error');
          expectClose(scaled.statistic, plain.statistic!, 1e-13, 'statistic');
          expectClose(scaled.lower, plain.lower! * factor, 1e-12, 'lower', plain.se! * factor);
        }
      }),
      { numRuns: 100 },
    );
  });

  it('turns round when the groups change places: t changes sign, higher and lower swap, the interval is mirrored', () => {
    fc.assert(
      fc.property(two, confidence, ([test, reference], level) => {
        for (const method of [separateT, pooledT, conservativeT, largeNZ]) {
          const run = (data: Designs['two'], question: Ask['question']): MethodResult =>
            method.run(data, ask({ question, confidence: level, margin: [-3, 5] }), noTick);
          const there = groups(test, reference);
          const back = groups(reference, test);
          const mirrored = ({ statistic, p, lower, upper }: MethodResult): unknown => ({
            statistic: 0 - statistic!,
            p,
            lower: upper === null ? null : 0 - upper,
            upper: lower === null ? null : 0 - lower,
          });
          const plain = ({ statistic, p, lower, upper }: MethodResult): unknown => ({
            statistic,
            p,
            lower,
            upper,
          });
          expect(mirrored(run(back, 'differs'))).toEqual(plain(run(there, 'differs')));
          expect(mirrored(run(back, 'lower'))).toEqual(plain(run(there, 'higher')));
          expect(mirrored(run(back, 'higher'))).toEqual(plain(run(there, 'lower')));
        }
      }),
      { numRuns: 100 },
    );
  });

  it('decides by p as it decides by its interval, for every question', () => {
    fc.assert(
      fc.property(
        two,
        confidence,
        fc.integer({ min: -200, max: 200 }),
        ([test, reference], level, against) => {
          const data = groups(test, reference);
          const margin = [-40, 25] as const;
          for (const method of methods) {
            const run = (question: Ask['question']): MethodResult =>
              method.run(data, ask({ question, confidence: level, against: against / 10, margin }), noTick);
            const alpha = alphaOf(level);
            const differs = run('differs');
            expect(differs.p! < alpha).toBe(differs.lower! > against / 10 || differs.upper! < against / 10);
            expect(run('higher').p! < alpha).toBe(run('higher').lower! > against / 10);
            expect(run('lower').p! < alpha).toBe(run('lower').upper! < against / 10);
            expect(run('not-lower').p! < alpha).toBe(run('not-lower').lower! > margin[0]);
            expect(run('not-higher').p! < alpha).toBe(run('not-higher').upper! < margin[1]);
            const within = run('equivalent');
            expect(within.p! < alpha).toBe(within.lower! > margin[0] && within.upper! < margin[1]);
          }
        },
      ),
      { numRuns: 200 },
    );
  });

  it('keeps the degrees of freedom of separate between the smaller group’s and the sum of both', () => {
    fc.assert(
      fc.property(two, ([test, reference]) => {
        const df = Number(separateT.run(groups(test, reference), ask(), noTick).df);
        expect(df).toBeGreaterThanOrEqual((Math.min(test.length, reference.length) - 1) * (1 - 1e-9));
        expect(df).toBeLessThanOrEqual((test.length + reference.length - 2) * (1 + 1e-9));
      }),
    );
  });

  it('has equal t for separate and pooled where both groups are of one size', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 20 }).chain(n => fc.tuple(listOf(n), listOf(n))),
        ([test, reference]) => {
          const data = groups(test, reference);
          expectClose(
            separateT.run(data, ask(), noTick).statistic,
            pooledT.run(data, ask(), noTick).statistic!,
            1e-13,
            't',
          );
        },
      ),
      { numRuns: 100 },
    );
  });

  it('gives from n, mean and SD what it gives from values', () => {
    fc.assert(
      fc.property(two, ([test, reference]) => {
        const data = groups(test, reference);
        for (const method of methods) {
          const raw = method.run(data, ask(), noTick);
          const typed = method.run(summariesOf(data), ask(), noTick);
          expect([typed.se, typed.df]).toEqual([raw.se, raw.df]);
          expectClose(
            typed.estimate,
            raw.estimate!,
            1e-15,
            'estimate',
            Math.abs(data.test.mean) + Math.abs(data.reference.mean),
          );
        }
      }),
      { numRuns: 100 },
    );
  });

  it('does not mind the order of the rows', () => {
    fc.assert(
      fc.property(two, ([test, reference]) => {
        for (const method of methods) {
          const plain = method.run(groups(test, reference), ask(), noTick);
          const turned = method.run(
            groups(
              [...test].reverse(),
              [...reference].sort((a, b) => a - b),
            ),
            ask(),
            noTick,
          );
          expect(turned).toEqual(plain);
        }
      }),
      { numRuns: 50 },
    );
  });
});

const listOf = (length: number): fc.Arbitrary<number[]> =>
  fc
    .array(fc.integer({ min: -5000, max: 5000 }), { minLength: length, maxLength: length })
    .filter(values => new Set(values).size > 1);

describe('pairs', () => {
  it('decide by p as they decide by the interval, and do not mind which pair comes first', () => {
    const pair = fc.tuple(fc.integer({ min: -500, max: 500 }), fc.integer({ min: -500, max: 500 }));
    const pairs = fc.array(pair, { minLength: 3, maxLength: 30 });
    fc.assert(
      fc.property(pairs, confidence, (values, level) => {
        fc.pre(new Set(values.map(([a, b]) => a - b)).size > 1);
        const data = (own: readonly (readonly [number, number])[]): Designs['pairs'] =>
          pairsOf(
            own.map(([a]) => tenths(a)),
            own.map(([, b]) => tenths(b)),
          );
        const result = pairedT.run(data(values), ask({ confidence: level }), noTick);
        expect(result.p! < alphaOf(level)).toBe(result.lower! > 0 || result.upper! < 0);
        expect(pairedT.run(data([...values].reverse()), ask({ confidence: level }), noTick)).toEqual(result);
      }),
    );
  });
});

describe('percent of the reference mean', () => {
  it('excludes 0 exactly when the interval of the difference does, under every assumption and for pairs', () => {
    const positive = fc.array(fc.integer({ min: 500, max: 5000 }), { minLength: 3, maxLength: 12 });
    const equal = fc
      .integer({ min: 3, max: 12 })
      .chain(n =>
        fc.tuple(
          ...[0, 1].map(() => fc.array(fc.integer({ min: 500, max: 5000 }), { minLength: n, maxLength: n })),
        ),
      );
    const excludes = (lower: number | null, upper: number | null): boolean =>
      (lower !== null && lower > 0) || (upper !== null && upper < 0);
    const hold = (difference: number, mean: number, row: MethodResult): void => {
      const percent = percentOfReference(difference, mean, row)!;
      if (percent.lower === null && percent.upper === null) return;
      expect(excludes(percent.lower, percent.upper)).toBe(excludes(row.lower, row.upper));
    };
    const question = fc.constantFrom('differs' as const, 'higher' as const, 'lower' as const);
    fc.assert(
      fc.property(positive, positive, question, (test, reference, asked) => {
        fc.pre(new Set(test).size > 1 && new Set(reference).size > 1);
        const data = groups(test, reference);
        for (const method of methods) {
          const row = method.run(data, ask({ question: asked }), noTick);
          hold(row.estimate!, data.reference.mean, row);
        }
      }),
      { numRuns: 300 },
    );
    fc.assert(
      fc.property(equal, question, ([test = [], reference = []], asked) => {
        fc.pre(new Set(test.map((value, i) => value - reference[i]!)).size > 1);
        const data = pairsOf(test.map(tenths), reference.map(tenths));
        const row = pairedT.run(data, ask({ question: asked }), noTick);
        hold(row.estimate!, data.reference.mean, row);
      }),
      { numRuns: 300 },
    );
  });

  it('has no finite limits where the reference mean is not away from 0, and is not given at or below 0', () => {
    const near = groups([20, 30, 40], [-40, 50, 5]);
    const row = separateT.run(near, ask(), noTick);
    expect(percentOfReference(row.estimate!, near.reference.mean, row)).toMatchObject({
      lower: null,
      upper: null,
    });
    expect(percentOfReference(row.estimate!, -1, row)).toBeNull();
  });
});
