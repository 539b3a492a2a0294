import type { Numbers } from '../model/cells';
import { parseDecimal } from './decimal';
import { numbersFromIntegers } from './fromIntegers';
import { IntegersBuilder } from './integersBuilder';
import { EXACT_POWERS, LARGEST_STEP, powerOfTen, type Steps } from './steps';

const FIRST_CAPACITY = 1024;

/**
 * Gathers one column of decimals as they are read: whole numbers of the smallest step met so far, less the first value,
 * in four bytes each while they fit, then eight, then as big integers.
 */
export class NumbersBuilder {
  private decimals = 0;
  private shift: bigint | null = null;
  private shiftDouble = NaN;
  private steps: Steps;
  private count = 0;
  private integers: IntegersBuilder | null = null;

  /** @param expected how many values will come, if that is known roughly */
  constructor(expected = FIRST_CAPACITY) {
    this.steps = new Int32Array(Math.max(FIRST_CAPACITY, expected));
  }

  get length(): number {
    return this.integers?.length ?? this.count;
  }

  /** Adds mantissa / 10^decimals, the mantissa a whole number below 2^53 in size. */
  add(mantissa: number, decimals: number): void {
    if (decimals === this.decimals && this.integers === null) {
      const step = mantissa - this.shiftDouble;
      if (step < LARGEST_STEP && step > -LARGEST_STEP) {
        this.push(step);
        return;
      }
    }
    this.addInteger(BigInt(mantissa), decimals);
  }

  /**
   * Adds a number of any length.
   * @throws RangeError when the text is no number (`parseDecimal` decides)
   */
  addDecimal(text: string, decimal: '.' | ',' = '.'): void {
    const parsed = parseDecimal(text, decimal);
    if (parsed === null) throw new RangeError(`not a number: ${text}`);
    this.addInteger(parsed.digits, parsed.decimals);
  }

  /** Adds digits / 10^decimals. */
  addInteger(digits: bigint, decimals: number): void {
    if (decimals > this.decimals) this.refine(decimals);
    const integer = decimals === this.decimals ? digits : digits * powerOfTen(this.decimals - decimals);
    this.shift ??= this.takeShift(integer);
    if (this.integers === null) {
      const step = integer - this.shift;
      if (isSafe(step)) {
        this.push(Number(step));
        return;
      }
      this.widen();
    }
    this.integers?.push(integer);
  }

  /** Adds a place that holds no value. */
  addNothing(): void {
    if (this.integers === null) this.push(0);
    else this.integers.push(this.shift ?? 0n);
  }

  /** The numbers gathered; the builder must not be used afterwards. */
  build(): Numbers {
    const shift = this.shift ?? 0n;
    const { decimals, integers, count, steps } = this;
    if (integers !== null) {
      const [numbers] = numbersFromIntegers([integers.build()], { decimals, per: 1n, shift });
      if (numbers !== undefined) return numbers;
    }
    const isRoomy = steps.length > count * 1.125 + FIRST_CAPACITY;
    const own = isRoomy ? steps.slice(0, count) : steps.subarray(0, count);
    return { form: 'steps', decimals, per: 1, shift, steps: own };
  }

  private push(step: number): void {
    if (this.steps instanceof Int32Array && (step | 0) !== step) this.steps = new Float64Array(this.steps);
    if (this.count === this.steps.length) {
      const grown = new (this.steps.constructor as new (length: number) => Steps)(this.count * 2);
      grown.set(this.steps);
      this.steps = grown;
    }
    this.steps[this.count++] = step;
  }

  private takeShift(integer: bigint): bigint {
    this.shiftDouble = isSafe(integer) ? Number(integer) : NaN;
    return integer;
  }

  /** Makes the step of the column smaller. */
  private refine(decimals: number): void {
    const by = decimals - this.decimals;
    this.decimals = decimals;
    if (this.shift !== null) this.shift = this.takeShift(this.shift * powerOfTen(by));
    if (this.integers !== null) {
      this.integers.multiply(powerOfTen(by));
      return;
    }
    const { steps, count } = this;
    const power = EXACT_POWERS[by] ?? Infinity;
    const finer = new Float64Array(steps.length);
    let largest = 0;
    for (let i = 0; i < count; i++) {
      const step = steps[i] as number;
      finer[i] = step === 0 ? 0 : step * power;
      largest = Math.max(largest, Math.abs(finer[i] as number));
    }
    if (largest >= LARGEST_STEP) this.widen(powerOfTen(by));
    else this.steps = steps instanceof Int32Array && largest < INT32_LIMIT ? new Int32Array(finer) : finer;
  }

  /** Goes over to big integers; the steps so far are `factor` of the smallest step each. */
  private widen(factor = 1n): void {
    const shift = this.shift ?? 0n;
    this.integers = new IntegersBuilder(this.steps.length);
    for (let i = 0; i < this.count; i++) this.integers.push(shift + BigInt(this.steps[i] as number) * factor);
    this.steps = new Int32Array();
  }
}

const SAFE = BigInt(LARGEST_STEP);
const INT32_LIMIT = 2 ** 31;

const isSafe = (integer: bigint): boolean => integer < SAFE && integer > -SAFE;
