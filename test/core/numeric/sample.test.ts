import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lag1 } from '../../../src/core/numeric/lag1';
import { midRanks, midRanksOf } from '../../../src/core/numeric/ranks';
import { pairedDifferences } from '../../../src/core/numeric/pairedDifferences';
import { quantileSorted } from '../../../src/core/numeric/quantile';
import { keysOf, exactText } from '../../../src/core/numeric/numbers';
import { makeSample, sampleFromDoubles } from '../../../src/core/numeric/sample';
import { compensatedSum } from '../../../src/core/numeric/sums';
import { decimalTexts, numbersOf, plainColumns, scaled } from './arbitraries';

const PLACES = 40;
const columns = fc.array(decimalTexts, { minLength: 2, maxLength: 40 });
const sampleOf = (texts: readonly string[]) => makeSample(numbersOf(texts), Int32Array.from(texts.keys()));
const relative = (value: number, truth: number): number =>
  value === truth ? 0 : Math.abs(value / truth - 1);

/** Mean and sum of squares by big integers: exact fractions, rounded by the division of their leading digits. */
function exactMoments(texts: readonly string[]): { mean: number; ss: number } {
  const n = BigInt(texts.length);
  const values = texts.map(text => scaled(text, PLACES));
  const sum = values.reduce((a, b) => a + b, 0n);
  const squares = values.reduce((a, b) => a + b * b, 0n);
  const ss = ((n * squares - sum * sum) * 10n ** 40n) / n;
  return {
    mean: Number(`${(sum * 10n ** 30n) / n}e-${PLACES + 30}`),
    ss: Number(`${ss}e-${2 * PLACES + 40}`),
  };
}

describe('a sample', () => {
  it('has the mean and sum of squares of the exact decimals', () => {
    fc.assert(
      fc.property(columns, texts => {
        const { mean, ss } = sampleOf(texts).moments();
        const truth = exactMoments(texts);
        expect(relative(mean, truth.mean)).toBeLessThan(4e-16);
        expect(relative(ss, truth.ss)).toBeLessThan(1e-15);
      }),
    );
  });

  it('of plain numbers has them rounded once', () => {
    fc.assert(
      fc.property(plainColumns, texts => {
        const truth = exactMoments(texts);
        expect(sampleOf(texts).moments()).toMatchObject({ mean: truth.mean, ss: truth.ss });
      }),
    );
  });

  it('of equal values has a sum of squares of exactly 0', () => {
    expect(sampleOf(['0.1', '0.10', '1e-1']).moments()).toEqual({ mean: 0.1, offset: 0, ss: 0 });
    const longOnes = Array.from({ length: 7 }, () => '0.12345678901234567890123');
    expect(sampleOf([...longOnes]).moments().ss).toBe(0);
  });

  it('without values has no moments', () => {
    expect(makeSample(numbersOf([]), new Int32Array()).moments()).toEqual({
      mean: NaN,
      offset: NaN,
      ss: NaN,
    });
  });

  it('sorts its values, keeps them in file order too, and computes each once', () => {
    const sample = sampleOf(['3.5', '-1', '2']);
    expect([...sample.sorted()]).toEqual([-1, 2, 3.5]);
    expect([...sample.values()]).toEqual([3.5, -1, 2]);
    expect([...sample.centred()]).toEqual([0, -4.5, -1.5]);
    expect(sample.sorted()).toBe(sample.sorted());
    expect(sample.moments()).toBe(sample.moments());
  });

  it('of doubles has their mean and their order', () => {
    const sample = sampleFromDoubles(Float64Array.of(0.1, 0.2, 0.3), Int32Array.of(4, 5, 6));
    expect(sample.moments().mean).toBeCloseTo(0.2, 16);
    expect([...midRanks(sample.numbers).ranks]).toEqual([1, 2, 3]);
    expect(exactText(sample.numbers, 0)).toBe('0.1');
  });
});

describe('logs', () => {
  it('are those of the nearest doubles, with the ties of the values', () => {
    const logs = sampleOf(['2', '2.0', '10', '0.5']).log();
    expect([...logs!.values()]).toEqual([Math.log(2), Math.log(2), Math.log(10), Math.log(0.5)]);
    expect([...midRanks(logs!.numbers).ranks]).toEqual([2.5, 2.5, 4, 1]);
  });

  it('do not exist when one value is 0 or below', () => {
    expect(sampleOf(['1', '0']).log()).toBeNull();
    expect(sampleOf(['1', '-2']).log()).toBeNull();
  });
});

describe('mid-ranks', () => {
  it('count the values below and half of those equal', () => {
    fc.assert(
      fc.property(columns, texts => {
        const { ranks, tieSizes } = midRanks(numbersOf(texts));
        const values = texts.map(text => scaled(text, PLACES));
        values.forEach((value, i) => {
          const below = values.filter(other => other < value).length;
          const equal = values.filter(other => other === value).length;
          expect(ranks[i]).toBe(below + (equal + 1) / 2);
        });
        const sizes = [...new Set(values)].map(value => values.filter(other => other === value).length);
        expect([...tieSizes].sort()).toEqual(sizes.filter(size => size > 1).sort());
      }),
    );
  });

  it('run over several groups together', () => {
    const numbers = numbersOf(['1', '3', '2', '3']);
    const keys = keysOf(numbers);
    expect([...midRanksOf([keys.slice(0, 2), keys.slice(2)]).ranks]).toEqual([1, 3.5, 2, 3.5]);
  });
});

describe('differences of pairs', () => {
  it('are exact', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(decimalTexts, decimalTexts), { minLength: 1, maxLength: 20 }), pairs => {
        const both = pairs.flat();
        const numbers = numbersOf(both);
        const differences = pairedDifferences(
          makeSample(numbersOf(pairs.map(([a]) => a)), Int32Array.from(pairs.keys())),
          makeSample(numbersOf(pairs.map(([, b]) => b)), Int32Array.from(pairs.keys())),
        );
        expect(numbers.form).toMatch(/steps|wide/);
        expect([...differences.values()].map(x => x + 0)).toEqual(
          pairs.map(([a, b]) => Number(`${scaled(a, PLACES) - scaled(b, PLACES)}e-${PLACES}`) + 0),
        );
      }),
    );
  });

  it('of equal values are 0 where doubles would leave a rest', () => {
    const differences = pairedDifferences(sampleOf(['0.3', '1.1']), sampleOf(['0.1', '0.9']));
    expect(differences.numbers).toMatchObject({ form: 'steps', shift: 0n, steps: Int32Array.of(2, 2) });
  });

  it('of computed doubles are plain differences', () => {
    const rows = Int32Array.of(0, 1);
    const differences = pairedDifferences(
      sampleFromDoubles(Float64Array.of(1.5, 2), rows),
      sampleFromDoubles(Float64Array.of(1, 3), rows),
    );
    expect([...differences.values()]).toEqual([0.5, -1]);
  });
});

describe('quantiles', () => {
  it('lie at (n − 1)q between the ascending values', () => {
    // Hyndman & Fan 1996, definition 7, worked by hand: position 3 · 0.25 = 0.75 between 10 and 20.
    expect(quantileSorted([10, 20, 40, 80], 0.25)).toBe(17.5);
    expect(quantileSorted([10, 20, 40, 80], 0.5)).toBe(30);
    expect(quantileSorted([10, 20, 40, 80], 1)).toBe(80);
    expect(quantileSorted([7], 0.3)).toBe(7);
    expect(quantileSorted([], 0.5)).toBeNaN();
  });
});

describe('lag-1 autocorrelation', () => {
  it('is the same by exact integers and by compensated doubles', () => {
    fc.assert(
      fc.property(plainColumns, texts => {
        const exact = lag1(sampleOf(texts));
        const doubles = lag1(
          sampleFromDoubles(Float64Array.from(texts, Number), Int32Array.from(texts.keys())),
        );
        if (Number.isNaN(exact)) return;
        expect(Math.abs(exact - doubles)).toBeLessThan(1e-9);
      }),
    );
  });

  it('does not exist for equal values or a single one', () => {
    expect(lag1(sampleOf(['2', '2']))).toBeNaN();
    expect(lag1(sampleOf(['2']))).toBeNaN();
  });
});

describe('compensated sums', () => {
  it('keep what plain addition loses', () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2); // Neumaier 1974, the example that breaks plain compensation
    expect(compensatedSum(Array.from({ length: 10 }, () => 0.1))).toBe(1);
  });
});
