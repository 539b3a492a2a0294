import { describe, expect, it } from 'vitest';
import { brownForsythe } from '../../../src/core/evidence/brownForsythe';
import { constant } from '../../../src/core/evidence/constant';
import { varianceRatio } from '../../../src/core/evidence/varianceRatio';
import type { Evidence } from '../../../src/core/model/comparison';
import type { Group } from '../../../src/core/model/groups';
import { groupOfSummary } from '../../../src/compare/summaryGroups';
import { expectClose } from '../close';
import { fixture } from '../fixtures/read';
import { exactDecimal, groupsOf, noTick } from '../groupsFrom';
import { seenOf } from './seen';

interface Spread {
  readonly statistic: number;
  readonly df: readonly [number, number];
  readonly p: number;
}

interface Two {
  readonly name: string;
  readonly test: readonly number[];
  readonly reference: readonly number[];
  readonly brownForsythe: Spread | null;
  readonly varianceRatio: {
    readonly ratio: number;
    readonly df: readonly [number, number];
    readonly p: number;
    readonly interval: Readonly<Record<string, readonly [number, number]>>;
  } | null;
}

interface Many {
  readonly name: string;
  readonly groups: readonly (readonly number[])[];
  readonly brownForsythe: Spread | null;
}

// source: computed for this project with 50-digit arithmetic, see the fixtures
const twos = fixture<{ sets: readonly Two[] }>('twoGroups.json').sets;
const many = fixture<{ sets: readonly Many[] }>('manyGroups.json').sets;

const exactGroups = (lists: readonly (readonly number[])[]): Group[] =>
  groupsOf(lists.map(list => list.map(exactDecimal)));

function holdSpread(groups: readonly Group[], truth: Spread | null): void {
  const found = brownForsythe.look(seenOf(groups), noTick) as readonly Evidence[];
  if (truth === null) {
    expect(found).toEqual([]);
    return;
  }
  expectClose(found[0]!.statistic, truth.statistic, 1e-12, 'statistic');
  expect(found[0]!.df).toEqual(truth.df);
  expectClose(found[0]!.p, truth.p, 1e-12, 'p');
}

describe('spread about the medians', () => {
  it.each(twos)('holds for two groups: $name', ({ test, reference, brownForsythe: truth }) =>
    holdSpread(exactGroups([test, reference]), truth),
  );

  it.each(many)('holds for several groups: $name', ({ groups, brownForsythe: truth }) =>
    holdSpread(exactGroups(groups), truth),
  );

  it('gives the published value for ten batches of gears, to the digits that the data support', () => {
    // source: NIST/SEMATECH e-Handbook 1.3.5.10 prints 1.705910; its own data give 1.7059177 (good to five digits)
    const gears = fixture<{
      batches: readonly (readonly string[])[];
      statistic: { exact: number };
      p: number;
    }>('gears.json');
    const [found] = brownForsythe.look(seenOf(groupsOf(gears.batches)), noTick) as readonly Evidence[];
    expectClose(found!.statistic, gears.statistic.exact, 1e-12, 'statistic');
    expectClose(found!.statistic, 1.70591, 1e-5, 'statistic as printed');
    expect(found!.df).toEqual([9, 90]);
    expectClose(found!.p, gears.p, 1e-12, 'p');
  });

  it('says nothing without raw values, for pairs, and where no distance from a median scatters', () => {
    const groups = groupsOf([
      ['1', '2', '5'],
      ['3', '4', '9'],
    ]);
    expect(brownForsythe.look(seenOf(groups.map(group => ({ ...group, sample: null }))), noTick)).toEqual([]);
    expect(brownForsythe.look(seenOf(groups, { relation: { kind: 'pairs', column: 'id' } }), noTick)).toEqual(
      [],
    );
    expect(
      brownForsythe.look(
        seenOf(
          groupsOf([
            ['1', '2'],
            ['0.1', '0.4'],
          ]),
        ),
        noTick,
      ),
    ).toEqual([]);
  });

  it('cannot tell with fewer than ten values in a group', () => {
    const nine = Array.from({ length: 9 }, (_, i) => String(i));
    expect(brownForsythe.canTell(seenOf(groupsOf([nine, [...nine, '9']])))).toBe(false);
    expect(
      brownForsythe.canTell(
        seenOf(
          groupsOf([
            [...nine, '9'],
            [...nine, '9'],
          ]),
        ),
      ),
    ).toBe(true);
  });
});

describe('the ratio of the variances', () => {
  it.each(twos.filter(({ varianceRatio: truth }) => truth !== null))(
    'holds: $name',
    ({ test, reference, varianceRatio: truth }) => {
      for (const [confidence, [lower, upper]] of Object.entries(truth!.interval)) {
        const seen = seenOf(exactGroups([test, reference]), { confidence: Number(confidence) });
        const [found] = varianceRatio.look(seen, noTick) as readonly Evidence[];
        expectClose(found!.statistic, truth!.ratio, 1e-12, 'F');
        expect(found!.df).toEqual(truth!.df);
        expectClose(found!.p, truth!.p, 1e-12, 'p');
        const limits = found!.facts['varianceInterval'] as readonly number[];
        expectClose(limits[0], lower, 1e-10, `lower limit at ${confidence}`);
        expectClose(limits[1], upper, 1e-10, `upper limit at ${confidence}`);
        const sds = found!.facts['interval'] as readonly number[];
        expectClose(sds[0]! ** 2, lower, 1e-10, 'the SD ratio is the root');
      }
    },
  );

  it('gives the limits of the pharmacopoeial example: variances 45 and 25, 20 results each', () => {
    // source: USP <1010>, appendix: ratio 1.8, limits 1.8/2.168 and 1.8/0.461 (limits 0.83 and 3.90 from memory)
    const groups = [
      groupOfSummary({ label: 'alternative', n: 20, mean: 0, sd: Math.sqrt(45) }),
      groupOfSummary({ label: 'current', n: 20, mean: 0, sd: Math.sqrt(25) }),
    ];
    const [found] = varianceRatio.look(seenOf(groups, { confidence: 0.9 }), noTick) as readonly Evidence[];
    const [lower, upper] = found!.facts['varianceInterval'] as [number, number];
    expectClose(found!.statistic, 1.8, 1e-14, 'ratio');
    expectClose(lower, 0.830161960371, 1e-9, 'lower limit');
    expectClose(upper, 3.90285288253, 1e-9, 'upper limit');
    expect([lower.toFixed(2), upper.toFixed(2)]).toEqual(['0.83', '3.90']);
  });

  it('is a note from twice the SD on, a warning only where pooling was chosen and sizes are unequal', () => {
    const narrow = ['1', '2', '3', '4', '5', '6', '7', '8', '9'];
    const wide = ['0', '10', '20', '30', '40', '50'];
    const levels = (lists: readonly (readonly string[])[], method = 'separate-t'): string[] =>
      varianceRatio.look(seenOf(groupsOf(lists), { method }), noTick).map(({ level }) => level);
    expect(levels([narrow, narrow.slice(1)])).toEqual(['note']);
    expect(levels([narrow, wide])).toEqual(['note', 'note']);
    expect(levels([narrow, wide], 'pooled-t')).toEqual(['note', 'note']);
    expect(levels([narrow, wide.slice(0, 5)], 'pooled-t')).toEqual(['note', 'warn']);
    const threshold = { options: { 'sd-ratio': 100, 'sd-ratio-unequal-n': 100 } };
    expect(varianceRatio.look(seenOf(groupsOf([narrow, wide]), threshold), noTick)).toHaveLength(1);
  });

  it('says nothing of a constant group, of pairs and of shares', () => {
    const groups = groupsOf([
      ['1', '2', '3'],
      ['4', '4', '4'],
    ]);
    expect(varianceRatio.look(seenOf(groups), noTick)).toEqual([]);
    const scattered = groupsOf([
      ['1', '2', '3'],
      ['4', '5', '4'],
    ]);
    expect(
      varianceRatio.look(seenOf(scattered, { relation: { kind: 'pairs', column: 'id' } }), noTick),
    ).toEqual([]);
    expect(varianceRatio.look(seenOf(scattered, { measure: 'proportion' }), noTick)).toEqual([]);
  });
});

describe('constant or tiny groups', () => {
  it('warns of one constant group beside one that scatters, and names the value', () => {
    const [finding] = constant.look(
      seenOf(
        groupsOf([
          ['1', '2', '3'],
          ['4', '4', '4'],
        ]),
      ),
      noTick,
    );
    expect(finding).toMatchObject({
      level: 'warn',
      group: 'reference',
      facts: { what: 'constant', value: 4 },
    });
  });

  it('notes a group of two values', () => {
    const found = constant.look(
      seenOf(
        groupsOf([
          ['1', '2'],
          ['4', '5', '6'],
        ]),
      ),
      noTick,
    );
    expect(found.map(({ level, group }) => [level, group])).toEqual([['note', 'test']]);
  });
});
