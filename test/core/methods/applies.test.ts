import { describe, expect, it } from 'vitest';
import { groupOfSummary } from '../../../src/compare/summaryGroups';
import { knownSigmaZ } from '../../../src/core/methods/knownSigmaZ';
import { largeNZ } from '../../../src/core/methods/largeNZ';
import { pairedT } from '../../../src/core/methods/pairedT';
import { pooledT } from '../../../src/core/methods/pooledT';
import { separateT } from '../../../src/core/methods/separateT';
import type { Designs } from '../../../src/core/model/groups';
import { asking, noTick, pairsOf, twoOf } from '../groupsFrom';

const typed = (n1: number, n2: number, sd = 1): Designs['two'] => ({
  test: groupOfSummary({ label: 'test', n: n1, mean: 5, sd }),
  reference: groupOfSummary({ label: 'reference', n: n2, mean: 4, sd }),
});

describe('what a method cannot compute it says', () => {
  it('one value has no spread: no t, but a z with known standard deviations', () => {
    expect(separateT.applies(typed(1, 5), asking())).toEqual({
      code: 'one-value',
      facts: { label: 'test', n: 1 },
    });
    expect(pooledT.applies(typed(5, 1), asking())?.code).toBe('one-value');
    const known = asking({ options: { sigma: [2, 3] } });
    expect(knownSigmaZ.applies(typed(1, 1), known)).toBeNull();
    // by hand: 1 / √(4 + 9)
    expect(knownSigmaZ.run(typed(1, 1), known, noTick).statistic).toBeCloseTo(1 / Math.sqrt(13), 15);
  });

  it('no spread in either group: the difference as recorded, with the recorded step', () => {
    expect(separateT.applies(twoOf(['2.40', '2.40'], ['2.10', '2.1']), asking())).toEqual({
      code: 'zero-spread',
      facts: { difference: 0.3, resolution: 0.01 },
    });
    expect(separateT.applies(typed(3, 3, 0), asking())).toEqual({
      code: 'zero-spread',
      facts: { difference: 1, resolution: null },
    });
  });

  it('known standard deviations must be two', () => {
    expect(knownSigmaZ.applies(typed(3, 3), asking())?.code).toBe('sigma-absent');
    expect(knownSigmaZ.applies(typed(3, 3), asking({ options: { sigma: [2] } }))?.code).toBe('sigma-absent');
  });

  it('one pair has no spread, equal differences neither', () => {
    expect(pairedT.applies(pairsOf(['1'], ['2']), asking())).toEqual({ code: 'one-pair', facts: { n: 1 } });
    expect(pairedT.applies(pairsOf(['1.1', '2.3'], ['1', '2.2']), asking())).toEqual({
      code: 'equal-differences',
      facts: { difference: 0.1 },
    });
  });
});

describe('what a method computes but does not stand for it says', () => {
  it('the normal curve with 30 values or fewer', () => {
    // common practice, no source: more than 30 in each group
    expect(largeNZ.doubts(typed(31, 30), asking())).toEqual({
      code: 'too-few-for-normal',
      facts: { label: 'reference', n: 30 },
    });
    expect(largeNZ.doubts(typed(31, 31), asking())).toBeNull();
  });

  it('pooling with a constant group', () => {
    expect(pooledT.doubts(twoOf(['1', '2'], ['3', '3']), asking())).toEqual({
      code: 'one-constant-group',
      facts: { label: 'reference' },
    });
    // by hand: separate variances leave the degrees of freedom of the group that scatters
    expect(separateT.run(twoOf(['1', '2', '4'], ['3', '3']), asking(), noTick).df).toBe(2);
  });
});
