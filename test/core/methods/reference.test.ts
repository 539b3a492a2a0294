import { describe, expect, it } from 'vitest';
import { conservativeT } from '../../../src/core/methods/conservativeT';
import { hedgesG } from '../../../src/core/methods/effects/hedgesG';
import { knownSigmaZ } from '../../../src/core/methods/knownSigmaZ';
import { largeNZ } from '../../../src/core/methods/largeNZ';
import { newcombe } from '../../../src/core/methods/newcombe';
import { pairedT } from '../../../src/core/methods/pairedT';
import { pooledT } from '../../../src/core/methods/pooledT';
import { proportionZ } from '../../../src/core/methods/proportionZ';
import { separateT } from '../../../src/core/methods/separateT';
import type { Ask, MethodResult } from '../../../src/core/model/methods';
import type { Question } from '../../../src/core/model/settings';
import { expectClose } from '../close';
import { fixture } from '../fixtures/read';
import { asking, exactDecimal, noTick, pairsOf, summariesOf, twoOf } from '../groupsFrom';

interface Truth {
  readonly difference: number;
  readonly se: number;
  readonly statistic: number;
  readonly df: number | null;
  readonly p: number;
  readonly pLower: number;
  readonly pHigher: number;
  readonly interval: Readonly<Record<string, readonly [number, number]>>;
}

interface Within {
  readonly fromLow: number;
  readonly fromHigh: number;
  readonly p: number;
  readonly interval: readonly [number, number];
}

interface Set {
  readonly name: string;
  readonly test: readonly number[];
  readonly reference: readonly number[];
  readonly sigma: readonly [number, number];
  readonly margin: number;
  readonly numbers: readonly { readonly n: number; readonly mean: number; readonly sd: number }[];
  readonly separate: Truth | null;
  readonly pooled: Truth | null;
  readonly smallerDf: Truth | null;
  readonly knownSd: Truth | null;
  readonly pairs: Truth | null;
  readonly size: {
    readonly inPooledSds: number;
    readonly factor: number | null;
    readonly corrected: number | null;
  } | null;
  readonly withinSeparate: Within | null;
  readonly withinPooled: Within | null;
}

// source: computed for this project with 50-digit arithmetic, see the fixture
const { sets } = fixture<{ sets: readonly Set[] }>('twoGroups.json');

const exact = (values: readonly number[]): readonly string[] => values.map(exactDecimal);

/** Statistics and p to a relative 1e-12, limits to 1e-10 of the half-width or of themselves. */
function hold(run: (ask: Ask) => MethodResult, truth: Truth, options: Ask['option']): void {
  const ask = (question: Question, confidence = 0.95): MethodResult =>
    run({ ...asking({ question, confidence }), option: options });
  const differs = ask('differs');
  expectClose(differs.estimate, truth.difference, 1e-12, 'difference');
  expectClose(differs.se, truth.se, 1e-12, 'standard error');
  expectClose(differs.statistic, truth.statistic, 1e-12, 'statistic');
  if (truth.df === null) expect(differs.df).toBeNull();
  else expectClose(Number(differs.df), truth.df, 1e-12, 'degrees of freedom');
  expectClose(differs.p, truth.p, 1e-12, 'two-sided p');
  expectClose(ask('higher').p, truth.pHigher, 1e-12, 'p of higher');
  expectClose(ask('lower').p, truth.pLower, 1e-12, 'p of lower');
  for (const [confidence, [lower, upper]] of Object.entries(truth.interval)) {
    const result = ask('differs', Number(confidence));
    expectClose(result.lower, lower, 1e-10, `lower limit at ${confidence}`);
    expectClose(result.upper, upper, 1e-10, `upper limit at ${confidence}`);
    expect(ask('higher', Number(confidence)).twoSided).toEqual({
      p: result.p,
      lower: result.lower,
      upper: result.upper,
    });
  }
}

describe('two groups, from every digit of their doubles', () => {
  it.each(sets)('n, mean and SD hold: $name', ({ test, reference, numbers }) => {
    const two = twoOf(exact(test), exact(reference));
    [two.test, two.reference].forEach((group, index) => {
      expect(group.n).toBe(numbers[index]?.n);
      expectClose(group.mean, numbers[index]!.mean, 1e-14, 'mean');
      expectClose(group.sd, numbers[index]!.sd, 1e-14, 'SD');
    });
  });

  it.each(sets)('every t and z holds from values and from summaries alike: $name', set => {
    const two = twoOf(exact(set.test), exact(set.reference));
    const option: Ask['option'] = key => (key === 'sigma' ? set.sigma : null);
    const held = [
      [separateT, set.separate],
      [pooledT, set.pooled],
      [conservativeT, set.smallerDf],
      [knownSigmaZ, set.knownSd],
    ] as const;
    for (const [method, truth] of held) {
      if (truth === null) {
        expect(method.applies(two, { ...asking(), option })?.code, method.id).toBe('zero-spread');
        continue;
      }
      expect(method.applies(two, { ...asking(), option })).toBeNull();
      hold(ask => method.run(two, ask, noTick), truth, option);
    }
  });

  it.each(sets.filter(({ separate }) => separate !== null))(
    'the normal curve has the statistic of separate: $name',
    set => {
      const two = twoOf(exact(set.test), exact(set.reference));
      const z = largeNZ.run(two, asking(), noTick);
      expectClose(z.statistic, set.separate!.statistic, 1e-12, 'statistic');
      expect(z.df).toBeNull();
      expect(largeNZ.doubts(two, asking()) === null).toBe(set.test.length > 30 && set.reference.length > 30);
    },
  );

  it.each(sets.filter(({ pairs }) => pairs !== null))('pairs hold: $name', ({ test, reference, pairs }) => {
    const data = pairsOf(exact(test), exact(reference));
    hold(
      ask => pairedT.run(data, ask, noTick),
      pairs!,
      () => null,
    );
  });

  it.each(sets)('two one-sided tests within the margin hold: $name', set => {
    const two = twoOf(exact(set.test), exact(set.reference));
    const ask = asking({ question: 'equivalent', margin: [-set.margin, set.margin] });
    for (const [method, truth] of [
      [separateT, set.withinSeparate],
      [pooledT, set.withinPooled],
    ] as const) {
      if (truth === null) continue;
      const result = method.run(two, ask, noTick);
      expectClose(result.p, truth.p, 1e-12, 'larger p');
      expect(result.confidence).toBe(0.9);
      expectClose(result.lower, truth.interval[0], 1e-10, 'lower limit');
      expectClose(result.upper, truth.interval[1], 1e-10, 'upper limit');
      const low = method.run(two, { ...ask, question: 'not-lower' }, noTick);
      const high = method.run(two, { ...ask, question: 'not-higher' }, noTick);
      expectClose(low.statistic, truth.fromLow, 1e-12, 'against the lower margin');
      expectClose(high.statistic, truth.fromHigh, 1e-12, 'against the upper margin');
      expect(result.p).toBe(Math.max(low.p!, high.p!));
    }
  });

  it.each(sets.filter(({ size }) => size !== null))('Hedges’ g holds: $name', ({ test, reference, size }) => {
    const two = twoOf(exact(test), exact(reference));
    const { estimate } = pooledT.run(two, asking(), noTick);
    const g = hedgesG(two.test, two.reference, estimate!);
    if (size!.corrected === null) expect(g).toBeNull();
    else expectClose(g, size!.corrected, 1e-12, 'g');
  });

  it('summaries give the same numbers as raw values, to the last bit but that of the difference', () => {
    for (const set of sets) {
      const two = twoOf(exact(set.test), exact(set.reference));
      for (const method of [separateT, pooledT, conservativeT]) {
        if (method.applies(two, asking()) !== null) continue;
        const [raw, typed] = [two, summariesOf(two)].map(data => method.run(data, asking(), noTick));
        expect(typed?.se).toBe(raw?.se);
        expect(typed?.df).toBe(raw?.df);
        // typed means are rounded to doubles before they are subtracted
        const rounding = 2 ** -52 * (Math.abs(two.test.mean) + Math.abs(two.reference.mean));
        expect(Math.abs(typed!.estimate! - raw!.estimate!)).toBeLessThanOrEqual(rounding);
      }
    }
  });
});

interface Shares {
  readonly name: string;
  readonly test: readonly [number, number];
  readonly reference: readonly [number, number];
  readonly difference: number;
  readonly pooled: {
    readonly se: number;
    readonly statistic: number;
    readonly p: number;
    readonly pLower: number;
    readonly pHigher: number;
  } | null;
  readonly newcombe: Readonly<Record<string, readonly [number, number]>>;
}

describe('two shares', () => {
  // source: computed for this project with 50-digit arithmetic, see the fixture
  const shares = fixture<{ sets: readonly Shares[] }>('twoShares.json').sets;

  it.each(shares)('pooled z and Newcombe’s limits hold: $name', set => {
    const [x1, n1] = set.test;
    const [x2, n2] = set.reference;
    const data = { test: { label: 'test', x: x1, n: n1 }, reference: { label: 'reference', x: x2, n: n2 } };
    for (const [confidence, [lower, upper]] of Object.entries(set.newcombe)) {
      const result = newcombe.run(data, asking({ confidence: Number(confidence) }), noTick);
      expectClose(result.estimate, set.difference, 1e-15, 'difference');
      expectClose(result.lower, lower, 1e-10, `lower limit at ${confidence}`);
      expectClose(result.upper, upper, 1e-10, `upper limit at ${confidence}`);
      expect(result.p).toBeNull();
    }
    if (set.pooled === null) {
      expect(proportionZ.applies(data, asking())?.code).toBe('no-variation');
      return;
    }
    const z = proportionZ.run(data, asking(), noTick);
    expectClose(z.se, set.pooled.se, 1e-12, 'standard error');
    expectClose(z.statistic, set.pooled.statistic, 1e-12, 'z');
    expectClose(z.p, set.pooled.p, 1e-12, 'p');
    expectClose(
      proportionZ.run(data, asking({ question: 'higher' }), noTick).p,
      set.pooled.pHigher,
      1e-12,
      'p of higher',
    );
    expectClose(
      proportionZ.run(data, asking({ question: 'lower' }), noTick).p,
      set.pooled.pLower,
      1e-12,
      'p of lower',
    );
  });
});
