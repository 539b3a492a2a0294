import { describe, expect, it } from 'vitest';
import { pooledT } from '../../../src/core/methods/pooledT';
import { separateT } from '../../../src/core/methods/separateT';
import { digits } from '../close';
import { fixture } from '../fixtures/read';
import { sevenToNine } from '../fixtures/equalLeadingDigits';
import { asking, noTick, twoOf } from '../groupsFrom';

// source of the sets and of every value: NIST Statistical Reference Datasets, Analysis of Variance

describe('thirteen equal leading digits cost nothing: SmLs07, SmLs08, SmLs09, two treatments at a time', () => {
  // Each treatment is c, then c − 0.1 and c + 0.1 in turn: mean c and SD 0.1 exactly, so that
  // t = difference / (0.1 √(2/n)); certified for all nine treatments: residual SD 0.1
  for (const { name, treatments } of sevenToNine()) {
    it(name, () => {
      treatments.forEach((test, i) => {
        treatments.forEach((reference, j) => {
          if (i === j) return;
          const two = twoOf(test.values, reference.values);
          const truth = (test.tenths - reference.tenths) / 10;
          for (const group of [two.test, two.reference])
            expect(digits(group.sd, 0.1)).toBeGreaterThanOrEqual(14);
          for (const method of [pooledT, separateT]) {
            const result = method.run(two, asking(), noTick);
            expect(digits(result.estimate!, truth)).toBeGreaterThanOrEqual(14);
            expect(
              digits(result.statistic!, truth / (0.1 * Math.sqrt(2 / two.test.n))),
            ).toBeGreaterThanOrEqual(14);
            expect(digits(Number(result.df), 2 * two.test.n - 2)).toBeGreaterThanOrEqual(14);
          }
        });
      });
    });
  }
});

describe('atomic weight of silver by two instruments: AtmWtAg', () => {
  it('gives the certified values to 14 digits', () => {
    const silver = fixture<{
      first: readonly string[];
      second: readonly string[];
      certified: { F: number; betweenSquares: number; residualSd: number };
    }>('silver.json');
    const two = twoOf(silver.second, silver.first);
    const { estimate, se, statistic, df } = pooledT.run(two, asking(), noTick);
    const { F, betweenSquares, residualSd } = silver.certified;
    expect(df).toBe(46);
    expect(digits(statistic! ** 2, F)).toBeGreaterThanOrEqual(14);
    // between-squares of two groups of 24 are 12 times the squared difference
    expect(digits(12 * estimate! ** 2, betweenSquares)).toBeGreaterThanOrEqual(14);
    expect(digits(se! / Math.sqrt(2 / 24), residualSd)).toBeGreaterThanOrEqual(14);
    expect(digits(separateT.run(two, asking(), noTick).statistic!, statistic!)).toBeGreaterThanOrEqual(14);
  });
});
