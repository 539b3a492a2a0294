import { MINUS, PLUS, SPACE, ZERO } from './byteCodes';

const MOST_DIGITS = 16;
const LARGEST = 2 ** 53;

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

  /** Whether it is one of these numbers. */
  isAmong(numbers: readonly number[]): boolean {
    return numbers.length > 0 && numbers.includes(this.mantissa / 10 ** this.decimals);
  }
}
