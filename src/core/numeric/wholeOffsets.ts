import type { Numbers } from '../model/cells';
import { parseDecimal } from './decimal';
import { countOf, integerAt } from './numbers';

/**
 * Whole numbers in proportion to value − `from`, exact, so that sums of them are equal exactly where the sums of the
 * values are. `from` is taken as its shortest decimal. Samples of one frame are in one proportion when they are given
 * the same `finest`: a number whose decimals are kept as well. null for computed doubles, and where a sum of all sizes
 * would not fit 53 bits.
 */
export function wholeOffsets(numbers: Numbers, from: number, finest = from): Float64Array | null {
  const mark = parseDecimal(String(from), '.');
  const kept = parseDecimal(String(finest), '.');
  if (mark === null || kept === null) return null;
  const decimals = Math.max(numbers.decimals, mark.decimals, kept.decimals);
  const per = BigInt(numbers.per);
  const widen = 10n ** BigInt(decimals - numbers.decimals);
  const base = mark.digits * 10n ** BigInt(decimals - mark.decimals) * per;
  const whole: bigint[] = [];
  for (let i = 0; i < countOf(numbers); i++) {
    const integer = integerAt(numbers, i);
    if (integer === null) return null;
    whole.push(integer * widen - base);
  }
  const size = whole.reduce((sum, value) => sum + (value < 0n ? -value : value), 0n);
  return size < BigInt(Number.MAX_SAFE_INTEGER) ? Float64Array.from(whole, Number) : null;
}
