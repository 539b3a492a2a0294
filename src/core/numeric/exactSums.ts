import type { Numbers } from '../model/cells';
import type { Steps } from './steps';

/** Σ (value − shift), exactly, in units of 1 / (10^decimals · per); null for computed doubles. */
export function exactSumOfOffsets(numbers: Numbers): bigint | null {
  if (numbers.form === 'steps') return exactSum(numbers.steps);
  if (numbers.exact === null) return null;
  const { exact } = numbers;
  let total = 0n;
  for (let i = 0; i < exact.length; i++) total += exact[i] as bigint;
  return total - numbers.shift * BigInt(exact.length);
}

/**
 * Σ x[i], exactly, for whole numbers below 2^53 in size. Doubles add whole numbers without error while the sum stays
 * below 2^53; each block is that short and goes into a big integer.
 */
export function exactSum(x: Steps): bigint {
  return x instanceof Int32Array ? sumOfInt32(x) : sumOfDoubles(x);
}

/**
 * Σ x[i] · x[i + lag], exactly: each factor is cut into limbs so short that products and sums of a block of them are
 * whole numbers below 2^53. With lag 0 the sum of squares.
 */
export function exactProducts(x: Steps, lag = 0): bigint {
  return x instanceof Int32Array ? productsOfInt32(x, lag) : productsOfDoubles(x, lag);
}

const INT32_BLOCK = 1 << 19;
const DOUBLE_BLOCK = 1 << 14;

function sumOfInt32(x: Int32Array): bigint {
  let total = 0n;
  for (let start = 0; start < x.length; start += INT32_BLOCK) {
    const end = Math.min(x.length, start + INT32_BLOCK);
    let block = 0;
    for (let i = start; i < end; i++) block += x[i] as number;
    total += BigInt(block);
  }
  return total;
}

function sumOfDoubles(x: Float64Array): bigint {
  let total = 0n;
  for (let start = 0; start < x.length; start += DOUBLE_BLOCK) {
    const end = Math.min(x.length, start + DOUBLE_BLOCK);
    let high = 0;
    let low = 0;
    for (let i = start; i < end; i++) {
      const value = x[i] as number;
      const upper = Math.trunc(value / 2 ** 27);
      high += upper;
      low += value - upper * 2 ** 27;
    }
    total += (BigInt(high) << 27n) + BigInt(low);
  }
  return total;
}

/** Two limbs of 16 bits. */
function productsOfInt32(x: Int32Array, lag: number): bigint {
  let total = 0n;
  const pairs = x.length - lag;
  for (let start = 0; start < pairs; start += INT32_BLOCK) {
    const end = Math.min(pairs, start + INT32_BLOCK);
    let high = 0;
    let middle = 0;
    let low = 0;
    for (let i = start; i < end; i++) {
      const a = x[i] as number;
      const b = x[i + lag] as number;
      const aHigh = a >> 16;
      const aLow = a & 0xffff;
      const bHigh = b >> 16;
      const bLow = b & 0xffff;
      high += aHigh * bHigh;
      middle += aHigh * bLow + aLow * bHigh;
      low += aLow * bLow;
    }
    total += (BigInt(high) << 32n) + (BigInt(middle) << 16n) + BigInt(low);
  }
  return total;
}

/** Three limbs of 18 bits. */
function productsOfDoubles(x: Float64Array, lag: number): bigint {
  let total = 0n;
  const pairs = x.length - lag;
  const sums = new Float64Array(5);
  for (let start = 0; start < pairs; start += DOUBLE_BLOCK) {
    const end = Math.min(pairs, start + DOUBLE_BLOCK);
    sums.fill(0);
    for (let i = start; i < end; i++) addLimbProducts(x[i] as number, x[i + lag] as number, sums);
    for (let place = 0; place < 5; place++) total += BigInt(sums[place] as number) << BigInt(18 * place);
  }
  return total;
}

function addLimbProducts(a: number, b: number, sums: Float64Array): void {
  const a2 = Math.trunc(a / 2 ** 36);
  const aRest = a - a2 * 2 ** 36;
  const a1 = Math.trunc(aRest / 2 ** 18);
  const a0 = aRest - a1 * 2 ** 18;
  const b2 = Math.trunc(b / 2 ** 36);
  const bRest = b - b2 * 2 ** 36;
  const b1 = Math.trunc(bRest / 2 ** 18);
  const b0 = bRest - b1 * 2 ** 18;
  sums[0] = (sums[0] as number) + a0 * b0;
  sums[1] = (sums[1] as number) + (a0 * b1 + a1 * b0);
  sums[2] = (sums[2] as number) + (a0 * b2 + a1 * b1 + a2 * b0);
  sums[3] = (sums[3] as number) + (a1 * b2 + a2 * b1);
  sums[4] = (sums[4] as number) + a2 * b2;
}
