import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quotient } from '../../../src/core/numeric/quotient';

describe('a quotient of whole numbers', () => {
  it('with a power of ten below is the double that the language reads from the same decimal', () => {
    // ECMAScript reads decimal literals to the nearest double; independent of the code here.
    fc.assert(
      fc.property(
        fc.bigInt({ min: -(10n ** 19n), max: 10n ** 19n }),
        fc.integer({ min: 0, max: 40 }),
        (digits, places) => {
          expect(quotient(digits, 10n ** BigInt(places))).toBe(Number(`${digits}e-${places}`));
        },
      ),
    );
  });

  it('lies no further from the truth than either neighbour does', () => {
    fc.assert(
      fc.property(
        fc.bigInt({ min: 1n, max: 2n ** 200n }),
        fc.bigInt({ min: 1n, max: 2n ** 200n }),
        (a, b) => {
          const error = (x: number): bigint => {
            const difference = BigInt(x * 2 ** 255) * b - (a << 255n); // all quotients here are multiples of 2^-255
            return difference < 0n ? -difference : difference;
          };
          const x = quotient(a, b);
          const gap = 2 ** (Math.floor(Math.log2(x)) - 52);
          expect(error(x) <= error(x + gap) && error(x) <= error(x - gap)).toBe(true);
        },
      ),
    );
  });

  it('goes to the even neighbour from half-way', () => {
    expect(quotient(2n ** 53n + 1n, 1n)).toBe(2 ** 53);
    expect(quotient(2n ** 53n + 3n, 1n)).toBe(2 ** 53 + 4);
    expect(quotient(3n * (2n ** 54n + 2n) + 1n, 3n)).toBe(2 ** 54 + 4);
  });

  it('of 0 is 0', () => {
    expect(quotient(0n, 10n ** 40n)).toBe(0);
  });
});
