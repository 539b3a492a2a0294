import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { oneWay } from '../../../src/core/methods/oneWay';
import { pooledT } from '../../../src/core/methods/pooledT';
import { separateT } from '../../../src/core/methods/separateT';
import { welchOneWay } from '../../../src/core/methods/welchOneWay';
import type { Designs, Group } from '../../../src/core/model/groups';
import { digits, expectClose, printsAs } from '../close';
import { oneToNine } from '../fixtures/equalLeadingDigits';
import { fixture } from '../fixtures/read';
import { asking, exactDecimal, groupsOf, noTick } from '../groupsFrom';

type Several = Designs['several'];

const severalOf = (lists: readonly (readonly string[])[]): Several => ({
  groups: groupsOf(
    lists,
    lists.map((_, index) => `group ${index + 1}`),
  ),
  reference: null,
});

const summaries = ({ groups }: Several): Several => ({
  groups: groups.map(group => ({ ...group, sample: null })),
  reference: null,
});

describe('one-way analysis of variance: the eleven certified sets', () => {
  // source of the data and of every value: NIST Statistical Reference Datasets, Analysis of Variance
  interface Certified {
    readonly name: string;
    readonly df: readonly [number, number];
    readonly F: number;
    readonly betweenSquares: number;
    readonly withinSquares: number;
    readonly rSquared: number;
    readonly residualSd: number;
  }
  const { resistance, certified } = fixture<{
    readonly resistance: readonly (readonly string[])[];
    readonly certified: readonly Certified[];
  }>('certifiedOneWay.json');
  const silver = fixture<{ readonly first: readonly string[]; readonly second: readonly string[] }>(
    'silver.json',
  );
  const data: Readonly<Record<string, readonly (readonly string[])[]>> = {
    SiRstv: resistance,
    AtmWtAg: [silver.first, silver.second],
    ...Object.fromEntries(
      oneToNine().map(({ name, treatments }) => [name, treatments.map(({ values }) => values)]),
    ),
  };

  it.each(certified)('$name to 14 digits', ({ name, df, F, ...squares }) => {
    expect(certified).toHaveLength(11);
    const { statistic, df: found, extra = {} } = oneWay.run(severalOf(data[name]!), asking(), noTick);
    expect(found).toEqual(df);
    expect(digits(statistic!, F)).toBeGreaterThanOrEqual(14);
    for (const [key, value] of Object.entries(squares))
      expect(digits(Number(extra[key]), value), key).toBeGreaterThanOrEqual(14);
  });
});

describe('several means, from every digit of their doubles', () => {
  interface Overall {
    readonly statistic: number;
    readonly df: readonly [number, number];
    readonly p: number;
  }
  interface Many {
    readonly name: string;
    readonly groups: readonly (readonly number[])[];
    readonly oneWay: Overall;
    readonly welchOneWay: Overall | null;
  }
  // source: computed for this project with 50-digit arithmetic, see the fixture
  const { sets } = fixture<{ readonly sets: readonly Many[] }>('manyGroups.json');

  it.each(sets)('both F hold: $name', set => {
    const several = severalOf(set.groups.map(list => list.map(exactDecimal)));
    for (const [method, truth] of [
      [oneWay, set.oneWay],
      [welchOneWay, set.welchOneWay],
    ] as const) {
      if (truth === null) {
        expect(method.applies(several, asking())?.code).toBe('known-exactly');
        continue;
      }
      expect(method.applies(several, asking())).toBeNull();
      const { statistic, df, p, estimate, lower, upper } = method.run(several, asking(), noTick);
      expectClose(statistic, truth.statistic, 1e-12, 'F');
      const [df1, df2] = df as readonly [number, number];
      expect(df1).toBe(truth.df[0]);
      expectClose(df2, truth.df[1], 1e-12, 'df');
      expectClose(p, truth.p, 1e-12, 'p');
      expect([estimate, lower, upper]).toEqual([null, null, null]);
      const typed = method.run(summaries(several), asking(), noTick);
      // typed means are rounded to doubles before they are subtracted
      if (!set.name.includes('offset'))
        expectClose(typed.statistic, truth.statistic, 1e-12, 'F of summaries');
    }
  });

  it('the three treatments of the e-Handbook have the printed F', () => {
    // source: NIST/SEMATECH e-Handbook of Statistical Methods 7.4.3.3 (printed F from memory)
    const data = severalOf([
      ['6.9', '5.4', '5.8', '4.6', '4.0'],
      ['8.3', '6.8', '7.8', '9.2', '6.5'],
      ['8.0', '10.5', '8.1', '6.9', '9.3'],
    ]);
    expect(printsAs(oneWay.run(data, asking(), noTick).statistic!, '9.59')).toBe(true);
  });
});

describe('several means', () => {
  const values = fc.array(fc.integer({ min: -5000, max: 5000 }), { minLength: 2, maxLength: 12 });
  const scattering = values.filter(list => new Set(list).size > 1);
  const tenths = (list: readonly number[]): readonly string[] => list.map(value => (value / 10).toFixed(1));
  const several = (lists: readonly (readonly number[])[]): Several => severalOf(lists.map(tenths));

  it('of two groups are the squared t: pooled for one-way, separate for the other, with the same p', () => {
    fc.assert(
      fc.property(scattering, scattering, (a, b) => {
        const data = several([a, b]);
        const [test, reference] = data.groups as [Group, Group];
        for (const [method, t] of [
          [oneWay, pooledT],
          [welchOneWay, separateT],
        ] as const) {
          const all = method.run(data, asking(), noTick);
          const two = t.run({ test, reference }, asking(), noTick);
          expectClose(all.statistic, two.statistic! ** 2, 1e-13, 'F', Math.max(1e-3, two.statistic! ** 2));
          expectClose((all.df as readonly number[])[1], Number(two.df), 1e-13, 'df');
          expectClose(all.p, two.p!, 1e-12, 'p');
        }
      }),
      { numRuns: 100 },
    );
  });

  it('do not mind the order of groups and rows, nor a shift, nor a scale', () => {
    fc.assert(
      fc.property(fc.array(scattering, { minLength: 3, maxLength: 6 }), lists => {
        const turned = [...lists].reverse().map(list => [...list].reverse());
        const moved = lists.map(list => list.map(value => value * 3 + 100_000_000));
        for (const method of [oneWay, welchOneWay]) {
          const { statistic, p } = method.run(several(lists), asking(), noTick);
          for (const other of [turned, moved]) {
            const found = method.run(several(other), asking(), noTick);
            expectClose(found.statistic, statistic!, 1e-13, 'F');
            expectClose(found.p, p!, 1e-11, 'p');
          }
        }
      }),
      { numRuns: 100 },
    );
  });

  it('are refused with a reason where they cannot be compared', () => {
    const constant = severalOf([
      ['1.0', '1.0'],
      ['2.0', '2.0'],
      ['3.0', '3.0', '3.0'],
    ]);
    expect(oneWay.applies(constant, asking())?.code).toBe('no-spread-in-any');
    expect(welchOneWay.applies(constant, asking())).toMatchObject({ code: 'known-exactly' });
    const single = severalOf([['1.0'], ['2.0', '2.1'], ['3.0', '3.3', '3.1']]);
    expect(welchOneWay.applies(single, asking())).toEqual({
      code: 'one-value',
      facts: { label: 'group 1', n: 1 },
    });
    expect(oneWay.applies(single, asking())).toBeNull();
    expect(oneWay.run(single, asking(), noTick).df).toEqual([2, 3]);
    for (const method of [oneWay, welchOneWay]) {
      expect(method.applies(several([[1, 2, 3]]), asking())?.code).toBe('one-group');
      expect(
        method.applies(
          several([
            [1, 2],
            [3, 5],
          ]),
          asking({ against: 1 }),
        )?.code,
      ).toBe('against-not-zero');
    }
  });

  it('pooled over a group that does not scatter are not relied on', () => {
    const one = severalOf([
      ['1.0', '1.0'],
      ['2.0', '2.1'],
    ]);
    expect(oneWay.doubts(one, asking())).toEqual({
      code: 'one-constant-group',
      facts: { label: 'group 1' },
    });
  });
});
