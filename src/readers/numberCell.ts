import { powerOfTen } from '../core/numeric/steps';
import { MINUS, PLUS, SPACE, ZERO } from './byteCodes';

const MOST_DIGITS = 16;
const LARGEST = 2 ** 53;
const HALF_OF_LONG = 15;

/** The number a cell held: mantissa / 10^decimals. */
export class PlainNumber {
  mantissa = 0;
  decimals = 0;

  /**
   * Reads the plain numbers, almost all there are, straight from bytes: sign, digits, one decimal mark, spaces around.
   * @returns false for everything else (exponents, more than 53 bits, words, nothing at all)
   */
  read(bytes: Uint8Array, start: number, end: number, mark: number): boolean {
    let at = start;
    let last = end;
    while (at < last && bytes[at] === SPACE) at++;
    while (last > at && bytes[last - 1] === SPACE) last--;
    const sign = bytes[at];
    if (sign === MINUS || sign === PLUS) at++;
    let mantissa = 0;
    const whole = at;
    for (; at < last; at++) {
      const digit = (bytes[at] as number) - ZERO;
      if (digit < 0 || digit > 9) break;
      mantissa = mantissa * 10 + digit;
    }
    let digits = at - whole;
    let decimals = 0;
    if (at < last && bytes[at] === mark) {
      const fraction = ++at;
      for (; at < last; at++) {
        const digit = (bytes[at] as number) - ZERO;
        if (digit < 0 || digit > 9) break;
        mantissa = mantissa * 10 + digit;
      }
      decimals = at - fraction;
      digits += decimals;
    }
    if (at !== last || digits === 0 || digits > MOST_DIGITS || mantissa >= LARGEST) return false;
    this.mantissa = sign === MINUS ? -mantissa : mantissa;
    this.decimals = decimals;
    return true;
  }

  /**
   * Reads what `read` could not because it has more digits than a double holds, up to 30.
   * @returns the digits as a whole number, with `decimals` set; null for everything else
   */
  readLong(bytes: Uint8Array, start: number, end: number, mark: number): bigint | null {
    const isNegative = bytes[start] === MINUS;
    let high = 0;
    let low = 0;
    let digits = 0;
    let decimals = -1;
    for (let at = start + (isNegative ? 1 : 0); at < end; at++) {
      const byte = bytes[at] as number;
      const digit = byte - ZERO;
      if (digit >= 0 && digit <= 9) {
        if (digits < HALF_OF_LONG) high = high * 10 + digit;
        else low = low * 10 + digit;
        digits++;
        if (decimals >= 0) decimals++;
      } else if (byte === mark && decimals < 0) decimals = 0;
      else return null;
    }
    const behind = digits - HALF_OF_LONG;
    if (behind <= 0 || behind > HALF_OF_LONG) return null;
    this.decimals = Math.max(0, decimals);
    const integer = BigInt(high) * powerOfTen(behind) + BigInt(low);
    return isNegative ? -integer : integer;
  }

  /** Whether it is one of these numbers. */
  isAmong(numbers: readonly number[]): boolean {
    return numbers.length > 0 && numbers.includes(this.mantissa / 10 ** this.decimals);
  }
}
