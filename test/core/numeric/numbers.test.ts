import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  alignFrames,
  compareAt,
  countOf,
  equalAt,
  exactText,
  gather,
  nearestDoubles,
  offsetsOf,
  valueAt,
} from '../../../src/core/numeric/numbers';
import { decimalText, parseDecimal } from '../../../src/core/numeric/decimal';
import { NumbersBuilder } from '../../../src/core/numeric/numbersBuilder';
import { decimalTexts, numbersOf, scaled } from './arbitraries';

const PLACES = 40;
const columns = fc.array(decimalTexts, { minLength: 1, maxLength: 40 });
const plainText = (text: string): string => decimalText(scaled(text, PLACES), PLACES);

describe('numbers as written', () => {
  it('come back as their exact decimals', () => {
    fc.assert(
      fc.property(columns, texts => {
        const numbers = numbersOf(texts);
        expect(texts.map((_, i) => exactText(numbers, i))).toEqual(texts.map(plainText));
      }),
    );
  });

  it('have the nearest doubles that the language reads from the same text', () => {
    fc.assert(
      fc.property(columns, texts => {
        const numbers = numbersOf(texts);
        const truth = texts.map(text => Number(text) + 0);
        expect([...nearestDoubles(numbers)]).toEqual(truth);
        expect(texts.map((_, i) => valueAt(numbers, i))).toEqual(truth);
      }),
    );
  });

  it('are the same however they were added: straight from mantissas or by their text', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.maxSafeInteger(), fc.integer({ min: 0, max: 6 })), { minLength: 1 }),
        pairs => {
          const fast = new NumbersBuilder();
          const slow = new NumbersBuilder();
          for (const [mantissa, decimals] of pairs) {
            fast.add(mantissa, decimals);
            slow.addDecimal(decimalText(BigInt(mantissa), decimals).padEnd(1), '.');
          }
          const [a, b] = [fast.build(), slow.build()];
          expect(pairs.map((_, i) => exactText(a, i))).toEqual(pairs.map((_, i) => exactText(b, i)));
        },
      ),
    );
  });

  it('are compared by their exact decimals', () => {
    fc.assert(
      fc.property(columns, fc.nat(), fc.nat(), (texts, a, b) => {
        const numbers = numbersOf(texts);
        const [i, j] = [a % texts.length, b % texts.length];
        const [x, y] = [scaled(texts[i]!, PLACES), scaled(texts[j]!, PLACES)];
        expect(compareAt(numbers, i, numbers, j)).toBe(x < y ? -1 : x > y ? 1 : 0);
        expect(equalAt(numbers, i, numbers, j)).toBe(x === y);
      }),
    );
  });

  it('tell apart two that round to the same double', () => {
    const numbers = numbersOf(['0.1', '0.10000000000000000001', '0.1', '9e9']);
    expect(numbers.form).toBe('wide');
    expect(valueAt(numbers, 0)).toBe(valueAt(numbers, 1));
    expect(compareAt(numbers, 0, numbers, 1)).toBe(-1);
    expect(equalAt(numbers, 0, numbers, 2)).toBe(true);
  });

  it('take four bytes each when the steps fit', () => {
    const numbers = numbersOf(['1000000000000.4', '1000000000000.3', '1000000000000.5']);
    expect(numbers).toMatchObject({ form: 'steps', decimals: 1, per: 1, shift: 10000000000004n });
    expect(numbers.form === 'steps' && numbers.steps).toEqual(Int32Array.of(0, -1, 1));
  });

  it('take eight bytes each when the steps need more, and grow without losing any', () => {
    const texts = Array.from({ length: 5000 }, (_, i) => (i % 2 === 0 ? String(i) : `${i}00000000.25`));
    const numbers = numbersOf(texts);
    expect(numbers.form === 'steps' && numbers.steps).toBeInstanceOf(Float64Array);
    expect(texts.map((_, i) => exactText(numbers, i))).toEqual(texts);
  });

  it('may begin with places that hold no value', () => {
    const builder = new NumbersBuilder();
    builder.addNothing();
    builder.add(125, 1);
    builder.addNothing();
    builder.addDecimal('12.75');
    const numbers = builder.build();
    expect([exactText(numbers, 1), exactText(numbers, 3), countOf(numbers)]).toEqual(['12.5', '12.75', 4]);
  });

  it('refuse a text that is no number', () => {
    expect(() => {
      new NumbersBuilder().addDecimal('12 apples');
    }).toThrow(RangeError);
  });
});

describe('offsets', () => {
  it('are the exact differences from the shift, rounded once', () => {
    fc.assert(
      fc.property(columns, texts => {
        const numbers = numbersOf(texts);
        const shift = scaled(texts[0]!, PLACES);
        const truth = texts.map(text => Number(`${scaled(text, PLACES) - shift}e-${PLACES}`));
        expect([...offsetsOf(numbers)].map(x => x + 0)).toEqual(truth.map(x => x + 0));
      }),
    );
  });
});

describe('lists in one frame', () => {
  it('hold the same exact values and can be compared with each other', () => {
    fc.assert(
      fc.property(columns, columns, fc.nat(), fc.nat(), (left, right, i, j) => {
        const [a, b] = alignFrames([numbersOf(left), numbersOf(right)]);
        expect([a!.decimals, a!.per, a!.shift]).toEqual([b!.decimals, b!.per, b!.shift]);
        expect(left.map((_, k) => exactText(a!, k))).toEqual(left.map(plainText));
        expect(right.map((_, k) => exactText(b!, k))).toEqual(right.map(plainText));
        const [x, y] = [left[i % left.length]!, right[j % right.length]!];
        const truth = scaled(x, PLACES) - scaled(y, PLACES);
        expect(compareAt(a!, i % left.length, b!, j % right.length)).toBe(
          truth < 0n ? -1 : Number(truth > 0n),
        );
      }),
    );
  });

  it('that are in one frame already stay as they are', () => {
    const numbers = numbersOf(['1.5', '2.5', '3.5']);
    const parts = [gather(numbers, Int32Array.of(2, 0)), gather(numbers, Int32Array.of(1))];
    expect(alignFrames(parts)).toEqual(parts);
    expect(alignFrames([])).toEqual([]);
  });

  it('gathered keep order and values', () => {
    fc.assert(
      fc.property(columns, fc.array(fc.nat(), { minLength: 1, maxLength: 20 }), (texts, picks) => {
        const rows = Int32Array.from(picks, pick => pick % texts.length);
        const picked = gather(numbersOf(texts), rows);
        expect([...rows].map((_, i) => exactText(picked, i))).toEqual(
          [...rows].map(row => plainText(texts[row]!)),
        );
      }),
    );
  });

  it('read the same from any text of the same value', () => {
    expect(parseDecimal('1.50', '.')).not.toEqual(parseDecimal('1.5', '.'));
    const numbers = numbersOf(['1.50', '1.5', '15e-1']);
    expect(equalAt(numbers, 0, numbers, 1) && equalAt(numbers, 1, numbers, 2)).toBe(true);
  });
});
