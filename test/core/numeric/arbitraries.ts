import fc from 'fast-check';
import type { Numbers } from '../../../src/core/model/cells';
import { NumbersBuilder } from '../../../src/core/numeric/numbersBuilder';

/** Decimal texts as instruments write them, some of them longer than a double holds. */
export const decimalTexts = fc.oneof(
  { weight: 4, arbitrary: fc.integer({ min: -99999, max: 99999 }).map(String) },
  {
    weight: 4,
    arbitrary: fc
      .tuple(fc.integer({ min: -9999, max: 9999 }), fc.integer({ min: 0, max: 999 }))
      .map(([a, b]) => `${a}.${b}`),
  },
  {
    weight: 1,
    arbitrary: fc
      .tuple(
        fc.constantFrom('', '-'),
        fc.bigInt({ min: 0n, max: 10n ** 25n }),
        fc.integer({ min: 0, max: 12 }),
      )
      .map(
        ([sign, digits, decimals]) =>
          `${sign}${digits / 10n ** 12n}.${String(digits).padStart(12, '0').slice(0, decimals)}`,
      ),
  },
  {
    weight: 1,
    arbitrary: fc.tuple(fc.integer(), fc.integer({ min: -12, max: 12 })).map(([m, e]) => `${m}e${e}`),
  },
);

/** Plain numbers, as in a column of one instrument: the form is 'steps'. */
export const plainColumns = fc.array(
  fc
    .tuple(fc.integer({ min: 100000, max: 110000 }), fc.integer({ min: 0, max: 9 }))
    .map(([a, b]) => `${a}.${b}`),
  { minLength: 1, maxLength: 30 },
);

export function numbersOf(texts: readonly string[]): Numbers {
  const builder = new NumbersBuilder();
  for (const text of texts) builder.addDecimal(text, '.');
  return builder.build();
}

/** The exact value of a decimal text over 10^places. */
export function scaled(text: string, places: number): bigint {
  const [mantissa = '', power = '0'] = text.toLowerCase().split('e');
  const negative = mantissa.startsWith('-');
  const [whole = '', fraction = ''] = mantissa.replace(/^[+-]/, '').split('.');
  const digits = BigInt(whole + fraction) * 10n ** BigInt(places + Number(power) - fraction.length);
  return negative ? -digits : digits;
}
