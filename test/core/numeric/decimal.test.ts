import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decimalText, nearestDouble, parseDecimal } from '../../../src/core/numeric/decimal';

const read = (text: string, mark: '.' | ',' = '.') => {
  const parsed = parseDecimal(text, mark);
  return parsed === null ? null : decimalText(parsed.digits, parsed.decimals);
};

describe('a decimal', () => {
  it.each([
    ['0.10', '0.1'],
    ['-0.5', '-0.5'],
    ['+12', '12'],
    ['\u22123.25', '-3.25'],
    ['.5', '0.5'],
    ['5.', '5'],
    ['1.50e3', '1500'],
    ['1.5E-3', '0.0015'],
    ['2e\u22122', '0.02'],
    ['000123', '123'],
    ['-0', '0'],
    ['9007199254740993', '9007199254740993'],
    ['0.12345678901234567890123', '0.12345678901234567890123'],
  ])('written %s is %s exactly', (text, exact) => {
    expect(read(text)).toBe(exact);
  });

  it.each([
    '',
    '.',
    '-',
    '1,5',
    '1 000',
    '1.2.3',
    '0x1F',
    '1e',
    'e5',
    '1e5.0',
    'Infinity',
    'NaN',
    ' 1',
    '1 ',
    '--1',
    '1-',
  ])('is not seen in %j', text => {
    expect(parseDecimal(text, '.')).toBeNull();
  });

  it('is read with a comma where that is the decimal mark, and then not with a point', () => {
    expect(read('12,50', ',')).toBe('12.5');
    expect(parseDecimal('12.50', ',')).toBeNull();
  });

  it('keeps the places as written', () => {
    expect(parseDecimal('0.500', '.')).toEqual({ digits: 500n, decimals: 3 });
  });

  it('with an exponent of any size is read without running out of memory', () => {
    const huge = parseDecimal('1e999999999', '.');
    expect(huge === null ? null : nearestDouble(huge)).toBe(Infinity);
    expect(nearestDouble(parseDecimal('1e-999999999', '.')!)).toBe(0);
  });

  it('written by the language itself is read back to the same double', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), x => {
        expect(nearestDouble(parseDecimal(String(x), '.')!)).toBe(x === 0 ? 0 : x);
      }),
    );
  });

  it('printed and read again is the same number', () => {
    fc.assert(
      fc.property(
        fc.bigInt({ min: -(10n ** 30n), max: 10n ** 30n }),
        fc.integer({ min: 0, max: 40 }),
        (digits, decimals) => {
          const again = parseDecimal(decimalText(digits, decimals), '.')!;
          expect(again.digits * 10n ** BigInt(decimals - again.decimals)).toBe(digits);
        },
      ),
    );
  });
});
