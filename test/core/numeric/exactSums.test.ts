import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { exactProducts, exactSum } from '../../../src/core/numeric/exactSums';

const int32 = fc.int32Array({ minLength: 1, maxLength: 200 });
const doubles = fc
  .array(fc.integer({ min: -(2 ** 53) + 1, max: 2 ** 53 - 1 }), { minLength: 1, maxLength: 200 })
  .map(values => Float64Array.from(values));
const steps = fc.oneof(int32, doubles);

describe('sums of whole numbers', () => {
  it('are those of big integers', () => {
    fc.assert(
      fc.property(steps, x => {
        expect(exactSum(x)).toBe([...x].reduce((sum, value) => sum + BigInt(value), 0n));
      }),
    );
  });

  it('of squares and of neighbours are those of big integers', () => {
    fc.assert(
      fc.property(steps, fc.integer({ min: 0, max: 2 }), (x, lag) => {
        const pairs = [...x].slice(0, Math.max(0, x.length - lag));
        const truth = pairs.reduce((sum, value, i) => sum + BigInt(value) * BigInt(x[i + lag]!), 0n);
        expect(exactProducts(x, lag)).toBe(truth);
      }),
    );
  });

  it('stay exact over more values than fit one block, at the largest sizes there are', () => {
    const n = (1 << 19) + 7;
    const largest = new Int32Array(n).fill(-(2 ** 31));
    expect(exactSum(largest)).toBe(BigInt(n) * -(2n ** 31n));
    expect(exactProducts(largest)).toBe(BigInt(n) * 2n ** 62n);
    const wide = new Float64Array((1 << 14) + 3).fill(2 ** 53 - 1);
    expect(exactSum(wide)).toBe(BigInt(wide.length) * (2n ** 53n - 1n));
    expect(exactProducts(wide)).toBe(BigInt(wide.length) * (2n ** 53n - 1n) ** 2n);
  });
});
