import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { alphaOf } from '../../../src/core/methods/confidence';
import { miettinenNurminen } from '../../../src/core/methods/miettinenNurminen';
import { newcombe } from '../../../src/core/methods/newcombe';
import { proportionZ } from '../../../src/core/methods/proportionZ';
import { restrictedShares } from '../../../src/core/methods/restrictedShares';
import type { Designs } from '../../../src/core/model/groups';
import type { Ask } from '../../../src/core/model/methods';
import { expectClose } from '../close';
import { asking, noTick } from '../groupsFrom';

const countsOf = (x1: number, n1: number, x2: number, n2: number): Designs['counts'] => ({
  test: { label: 'test', x: x1, n: n1 },
  reference: { label: 'reference', x: x2, n: n2 },
});

const group = fc
  .integer({ min: 1, max: 60 })
  .chain(n => fc.tuple(fc.integer({ min: 0, max: n }), fc.constant(n)));
const table = fc.tuple(group, group).map(([[x1, n1], [x2, n2]]) => countsOf(x1, n1, x2, n2));
const confidence = fc.constantFrom(0.9, 0.95, 0.99);
const mn = (data: Designs['counts'], ask: Partial<Ask> = {}): ReturnType<typeof miettinenNurminen.run> =>
  miettinenNurminen.run(data, asking(ask), noTick);

describe('Miettinen and Nurminen’s interval', () => {
  it('and its p agree on 1,000 random tables, for every question', () => {
    const margin = [-0.2, 0.15] as const;
    fc.assert(
      fc.property(table, confidence, fc.constantFrom(0, 0.1, -0.25), (data, level, against) => {
        const alpha = alphaOf(level);
        const run = (question: Ask['question']): ReturnType<typeof mn> =>
          mn(data, { question, confidence: level, against, margin });
        const differs = run('differs');
        expect(differs.p! < alpha).toBe(differs.lower! > against || differs.upper! < against);
        expect(run('higher').p! < alpha).toBe(run('higher').lower! > against);
        expect(run('lower').p! < alpha).toBe(run('lower').upper! < against);
        expect(run('not-lower').p! < alpha).toBe(run('not-lower').lower! > margin[0]);
        expect(run('not-higher').p! < alpha).toBe(run('not-higher').upper! < margin[1]);
        const within = run('equivalent');
        expect(within.p! < alpha).toBe(within.lower! > margin[0] && within.upper! < margin[1]);
      }),
      { numRuns: 1000 },
    );
  });

  it('stays within −1 and 1 round the difference, and turns round with the groups', () => {
    fc.assert(
      fc.property(table, confidence, (data, level) => {
        const there = mn(data, { confidence: level });
        const back = mn({ test: data.reference, reference: data.test }, { confidence: level });
        expect(there.lower!).toBeGreaterThanOrEqual(-1);
        expect(there.upper!).toBeLessThanOrEqual(1);
        expect(there.lower!).toBeLessThanOrEqual(there.estimate!);
        expect(there.upper!).toBeGreaterThanOrEqual(there.estimate!);
        expectClose(back.lower, 0 - there.upper!, 1e-12, 'mirrored', 1);
        expectClose(back.upper, 0 - there.lower!, 1e-12, 'mirrored', 1);
        expectClose(back.p, there.p!, 1e-12, 'p');
      }),
      { numRuns: 300 },
    );
  });

  it('has at a difference of 0 the pooled z times √((N − 1)/N)', () => {
    // source: Campbell 2007, Statistics in Medicine 26:3661–3675 (the "N − 1" test)
    fc.assert(
      fc.property(table, data => {
        fc.pre(proportionZ.applies(data, asking()) === null);
        const all = data.test.n + data.reference.n;
        const z = proportionZ.run(data, asking(), noTick);
        expectClose(mn(data).statistic, z.statistic! * Math.sqrt((all - 1) / all), 1e-13, 'z');
      }),
    );
  });

  it('rests on the closed form of the restricted shares wherever that has its digits', () => {
    // source: Miettinen & Nurminen 1985, Statistics in Medicine 4:213–226, appendix I (Cardano's solution)
    fc.assert(
      fc.property(table, fc.integer({ min: -95, max: 95 }), (data, hundredths) => {
        const delta = hundredths / 100;
        fc.pre(delta !== 0);
        const [, reference] = restrictedShares(data, delta);
        // a double root costs the closed form half of its digits
        expect(Math.abs(reference - cardano(data, delta))).toBeLessThan(1e-6);
      }),
      { numRuns: 500 },
    );
  });

  it('has no evidence where every outcome of both groups is the same: z 0, p 1', () => {
    expect(mn(countsOf(0, 10, 0, 20))).toMatchObject({ estimate: 0, statistic: 0, p: 1 });
  });

  it('takes one outcome a group', () => {
    expect(mn(countsOf(1, 1, 0, 1)).upper).toBe(1);
  });
});

describe('Newcombe’s interval', () => {
  it('stays within −1 and 1 and holds the difference', () => {
    fc.assert(
      fc.property(table, confidence, (data, level) => {
        const { lower, upper, estimate } = newcombe.run(data, asking({ confidence: level }), noTick);
        expect(lower!).toBeGreaterThanOrEqual(-1);
        expect(upper!).toBeLessThanOrEqual(1);
        expect(lower!).toBeLessThanOrEqual(estimate!);
        expect(upper!).toBeGreaterThanOrEqual(estimate!);
      }),
      { numRuns: 1000 },
    );
  });
});

describe('the pooled z', () => {
  it('is not relied on below an expected count of 5', () => {
    // source: Cochran 1954, Biometrics 10:417–451 (rule of 5, from memory)
    expect(proportionZ.doubts(countsOf(2, 20, 6, 20), asking())).toMatchObject({
      code: 'few-expected',
      facts: { expected: 4 },
    });
    expect(proportionZ.doubts(countsOf(4, 20, 6, 20), asking())).toBeNull();
  });

  it('says why it cannot be had: no variation, another hypothesised difference, no outcome at all', () => {
    expect(proportionZ.applies(countsOf(0, 5, 0, 5), asking())?.code).toBe('no-variation');
    expect(proportionZ.applies(countsOf(2, 5, 1, 5), asking({ against: 0.1 }))?.code).toBe(
      'against-not-zero',
    );
    expect(proportionZ.applies(countsOf(0, 0, 1, 5), asking())?.code).toBe('no-outcomes');
  });
});

function cardano({ test, reference }: Designs['counts'], delta: number): number {
  const x = test.x + reference.x;
  const l3 = test.n + reference.n;
  const l2 = (test.n + 2 * reference.n) * delta - l3 - x;
  const l1 = (reference.n * delta - l3 - 2 * reference.x) * delta + x;
  const l0 = reference.x * delta * (1 - delta);
  const q = l2 ** 3 / (27 * l3 ** 3) - (l1 * l2) / (6 * l3 ** 2) + l0 / (2 * l3);
  const p = (q < 0 ? -1 : 1) * Math.sqrt(Math.max(0, l2 ** 2 / (9 * l3 ** 2) - l1 / (3 * l3)));
  const cosine = p === 0 ? 0 : Math.min(1, Math.max(-1, q / p ** 3));
  return 2 * p * Math.cos((Math.PI + Math.acos(cosine)) / 3) - l2 / (3 * l3);
}
