import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { waysOfSizes } from '../../../src/core/methods/allottedRanks';
import { kruskalWallis } from '../../../src/core/methods/kruskalWallis';
import type { Designs } from '../../../src/core/model/groups';
import type { MethodResult } from '../../../src/core/model/methods';
import { expectClose, printsAs } from '../close';
import { fixture } from '../fixtures/read';
import { asking, exactDecimal, groupsOf, noTick } from '../groupsFrom';

type Lists = readonly (readonly number[])[];

const severalOf = (lists: Lists): Designs['several'] => ({
  groups: groupsOf(
    lists.map(list => list.map(String)),
    lists.map((_, index) => `group ${index + 1}`),
  ),
  reference: null,
});

const run = (lists: Lists): MethodResult => kruskalWallis.run(severalOf(lists), asking(), noTick);

describe('Kruskal and Wallis’s H', () => {
  interface Many {
    readonly name: string;
    readonly groups: Lists;
    readonly kruskalWallis: {
      readonly statistic: number;
      readonly uncorrected: number;
      readonly df: number;
      readonly p: number;
    };
  }
  // source: computed for this project with 50-digit arithmetic, see the fixture
  it.each(fixture<{ readonly sets: readonly Many[] }>('manyGroups.json').sets)(
    'holds: $name',
    ({ groups, kruskalWallis: truth }) => {
      const several = {
        groups: groupsOf(groups.map(list => list.map(exactDecimal))),
        reference: null,
      };
      expect(kruskalWallis.applies(several, asking())).toBeNull();
      const { statistic, df, p, extra = {} } = kruskalWallis.run(several, asking(), noTick);
      expectClose(statistic, truth.statistic, 1e-13, 'H');
      expectClose(statistic! * Number(extra['tieFactor']), truth.uncorrected, 1e-13, 'H without ties');
      expect(df ?? extra['chiSquareDf']).toBe(truth.df);
      expectClose(df === null ? Number(extra['chiSquareP']) : p, truth.p, 1e-12, 'p of chi-square');
    },
  );

  it('has the printed values of the examples in print', () => {
    // source: Hollander & Wolfe 1973, p. 116 (from memory); mucociliary efficiency, three groups
    const lungs = run([
      [2.9, 3.0, 2.5, 2.6, 3.2],
      [3.8, 2.7, 4.0, 2.4],
      [2.8, 3.4, 3.7, 2.2, 2.0],
    ]);
    expect(printsAs(lungs.statistic!, '0.771')).toBe(true);
    expect(lungs.df).toBe(2);
    // source: NIST/SEMATECH e-Handbook of Statistical Methods 7.4.1 (printed from memory, without allowing for ties)
    const funds = run([
      [4.2, 4.6, 3.9, 4.0],
      [3.3, 2.4, 2.6, 3.8, 2.8],
      [1.9, 2.4, 2.1, 2.7, 1.8],
      [3.5, 3.1, 3.7, 4.1, 4.4],
    ]);
    expect(printsAs(funds.statistic! * Number(funds.extra?.['tieFactor']), '13.678')).toBe(true);
  });

  it.each([
    // source: Kruskal & Wallis 1952, Table 6.1 (from memory)
    [
      [
        [1, 2],
        [3, 4],
        [5, 6],
      ],
      '4.5714',
      '0.067',
    ],
    [
      [
        [1, 2, 3],
        [4, 5, 6],
        [7, 8, 9],
      ],
      '7.2000',
      '0.004',
    ],
    [
      [
        [1, 2, 4],
        [3, 5, 7],
        [6, 8, 9],
      ],
      '5.6889',
      '0.029',
    ],
    [
      [
        [1, 2, 6],
        [3, 4, 5],
        [7, 8, 9],
      ],
      '5.6000',
      '0.050',
    ],
    [
      [
        [1, 3, 5],
        [2, 4, 7],
        [6, 8, 9],
      ],
      '4.6222',
      '0.100',
    ],
  ])('of few values is held against all ways of allotting the ranks: %j', (lists, H, p) => {
    const found = run(lists);
    expect(printsAs(found.statistic!, H), String(found.statistic)).toBe(true);
    expect(printsAs(found.p!, p), String(found.p)).toBe(true);
    expect(found.df).toBeNull();
  });

  it('counts ways as one finds them by shuffling, ties and all', () => {
    const lists = [
      [1, 1, 2],
      [2, 3],
      [3, 3, 4],
    ];
    const { p, extra, statistic } = run(lists);
    expect(extra?.['ways']).toBe(560);
    let [all, atLeast] = [0, 0];
    for (const order of orders(lists.flat())) {
      all += 1;
      if (spreadOfRanks([order.slice(0, 3), order.slice(3, 5), order.slice(5)]) >= statistic! - 1e-9)
        atLeast += 1;
    }
    expectClose(p, atLeast / all, 1e-14, 'share of ways');
  });

  it('does not mind the order of groups and rows, nor any rising change of the values', () => {
    const list = fc.array(fc.integer({ min: 1, max: 30 }), { minLength: 1, maxLength: 12 });
    fc.assert(
      fc.property(fc.array(list, { minLength: 2, maxLength: 5 }), lists => {
        fc.pre(new Set(lists.flat()).size > 1);
        fc.pre(waysOfSizes(lists.map(({ length }) => length)) > 2000);
        const { statistic, p } = run(lists);
        for (const other of [
          [...lists].reverse().map(own => [...own].reverse()),
          lists.map(own => own.map(value => value ** 3 + 7)),
        ]) {
          const found = run(other);
          expectClose(found.statistic, statistic!, 1e-12, 'H', Math.max(1e-3, statistic!));
          expectClose(found.p, p!, 1e-12, 'p');
        }
      }),
      { numRuns: 50 },
    );
  });

  it('says why it cannot be had or should not be relied on', () => {
    expect(
      kruskalWallis.applies(
        severalOf([
          [2, 2],
          [2, 2, 2],
        ]),
        asking(),
      )?.code,
    ).toBe('all-equal');
    const bare = severalOf([
      [1, 2],
      [3, 4],
    ]).groups.map(group => ({ ...group, sample: null }));
    expect(kruskalWallis.applies({ groups: bare, reference: null }, asking())?.code).toBe('no-values');
    expect(
      kruskalWallis.applies(
        severalOf([
          [1, 2],
          [3, 4],
        ]),
        asking({ against: 1 }),
      )?.code,
    ).toBe('against-not-zero');
    expect(
      kruskalWallis.doubts(
        severalOf([
          [1, 2],
          [3, 4],
          [5, 6],
        ]),
        asking(),
      ),
    ).toEqual({
      code: 'cannot-reach',
      facts: { ways: 90, least: 6 / 90 },
    });
    const uneven = severalOf([
      [1, 2, 3],
      [4, 5, 6, 7, 8, 9],
      [10, 11, 12, 13, 14, 15],
    ]);
    expect(kruskalWallis.doubts(uneven, asking())).toEqual({
      code: 'few-for-chi-square',
      facts: { label: 'group 1', n: 3 },
    });
  });
});

/** H by its definition, up to what all orders share: variance of mean ranks; only for comparing. */
function spreadOfRanks(lists: Lists): number {
  const all = lists.flat();
  const rank = (value: number): number =>
    all.filter(other => other < value).length + (all.filter(other => other === value).length + 1) / 2;
  const middle = (all.length + 1) / 2;
  const total = all.reduce((sum, value) => sum + (rank(value) - middle) ** 2, 0);
  const between = lists.reduce((sum, list) => {
    const mean = list.reduce((own, value) => own + rank(value), 0) / list.length;
    return sum + list.length * (mean - middle) ** 2;
  }, 0);
  return ((all.length - 1) * between) / total;
}

function* orders(values: readonly number[]): Generator<readonly number[]> {
  if (values.length === 0) yield [];
  for (let first = 0; first < values.length; first += 1)
    for (const rest of orders(values.filter((_, place) => place !== first))) yield [values[first]!, ...rest];
}
