import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  alignFrames,
  countOf,
  exactText,
  integerAt,
  nearestDoubles,
} from '../../../src/core/numeric/numbers';
import { makeSample, sampleFromDoubles } from '../../../src/core/numeric/sample';
import { unitMeans } from '../../../src/core/numeric/unitMeans';
import { midRanks } from '../../../src/core/numeric/ranks';
import { decimalTexts, numbersOf, scaled } from './arbitraries';

const PLACES = 40;

describe('unit means', () => {
  it('of one level are exact fractions', () => {
    const { means, unitOf, readings, first } = unitMeans(numbersOf(['1', '2', '4', '10', '11']), [
      [7, 7, 7, 3, 3],
    ]);
    expect(means).toMatchObject({ form: 'steps', per: 6, decimals: 0 });
    expect([integerAt(means, 0), integerAt(means, 1)]).toEqual([14n, 63n]); // 7/3 and 21/2 in sixths
    expect([...unitOf]).toEqual([0, 0, 0, 1, 1]);
    expect([...readings]).toEqual([3, 2]);
    expect([...first]).toEqual([0, 3]);
    expect(exactText(means, 1)).toBe('10.5');
  });

  it('of two levels count every piece once, however many readings it has', () => {
    // Firing 1: tile a has 1, 1, 1, 5 (mean 2), tile b has 6: mean 4, not the 2.8 of all readings.
    const { means } = unitMeans(numbersOf(['1', '1', '1', '5', '6', '3']), [
      [1, 1, 1, 1, 1, 2],
      [1, 1, 1, 1, 2, 1],
    ]);
    expect([...nearestDoubles(means)]).toEqual([4, 3]);
  });

  it('take the ids of an inner level within each piece above', () => {
    const { means, readings } = unitMeans(numbersOf(['1', '3', '10', '20']), [
      [1, 1, 2, 2],
      [1, 2, 1, 2],
    ]);
    expect([...nearestDoubles(means)]).toEqual([2, 15]);
    expect([...readings]).toEqual([2, 2]);
  });

  it('equal the means of exact fractions for any numbers and any nesting', () => {
    const reading = fc.tuple(decimalTexts, fc.nat({ max: 3 }), fc.nat({ max: 2 }));
    fc.assert(
      fc.property(fc.array(reading, { minLength: 1, maxLength: 40 }), readings => {
        const { means } = unitMeans(numbersOf(readings.map(([text]) => text)), [
          readings.map(([, outer]) => outer),
          readings.map(([, , inner]) => inner),
        ]);
        const outers = [...new Set(readings.map(([, outer]) => outer))];
        const truth = outers.map(outer => {
          const own = readings.filter(entry => entry[1] === outer);
          const inners = [...new Set(own.map(entry => entry[2]))];
          const parts = inners.map(inner => {
            const values = own.filter(entry => entry[2] === inner).map(([text]) => scaled(text, PLACES + 30));
            return values.reduce((a, b) => a + b, 0n) / BigInt(values.length);
          });
          return Number(`${parts.reduce((a, b) => a + b, 0n) / BigInt(parts.length)}e-${PLACES + 30}`);
        });
        const doubles = [...nearestDoubles(means)];
        expect(countOf(means)).toBe(outers.length);
        doubles.forEach((value, i) =>
          expect(Math.abs(value - truth[i]!)).toBeLessThanOrEqual(3e-16 * Math.abs(truth[i]!) + 1e-60),
        );
      }),
    );
  });

  it('that are equal are tied, whatever their counts', () => {
    const a = unitMeans(numbersOf(['0.1', '0.2', '0.3']), [[1, 1, 1]]).means; // 0.2
    const b = unitMeans(numbersOf(['0.1', '0.3', '0.2']), [[1, 1, 2]]).means; // 0.2, 0.2
    const [x, y] = alignFrames([a, b]);
    expect(x!.per).toBe(y!.per);
    expect(integerAt(x!, 0)).toBe(integerAt(y!, 0));
    expect([...midRanks(y!).ranks]).toEqual([1.5, 1.5]);
  });

  it('stay exact where the least common multiple of the counts is beyond 53 bits', () => {
    const counts = [41, 43, 47, 53, 59, 61, 67, 71, 73, 79];
    const texts = counts.flatMap((count, unit) =>
      Array.from({ length: count }, (_, i) => String(unit + (i % 2))),
    );
    const codes = counts.flatMap((count, unit) => Array.from({ length: count }, () => unit));
    const { means } = unitMeans(numbersOf(texts), [codes]);
    expect(means.form).toBe('wide');
    const truth = counts.map((count, unit) => unit + Math.floor(count / 2) / count);
    [...nearestDoubles(means)].forEach((value, i) => expect(value).toBeCloseTo(truth[i]!, 14));
    expect(makeSample(means, new Int32Array(counts.length)).moments().mean).toBeCloseTo(
      4.5 + truth.reduce((s, x, i) => s + x - i, 0) / 10,
      14,
    );
  });

  it('of computed doubles are plain means', () => {
    const { numbers } = sampleFromDoubles(Float64Array.of(0.5, 1.5, 4), new Int32Array(3));
    expect([...nearestDoubles(unitMeans(numbers, [[1, 1, 2]]).means)]).toEqual([1, 4]);
  });
});
