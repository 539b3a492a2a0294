import type { Numbers } from '../model/cells';
import { parseDecimal } from './decimal';
import { numbersFromIntegers } from './fromIntegers';
import { EXACT_POWERS, LARGEST_STEP, type Steps } from './steps';

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
  private integers: bigint[] | null = null;

  /** @param expected how many values will come, if that is known roughly */
  constructor(expected = FIRST_CAPACITY) {
    this.steps = new Int32Array(Math.max(FIRST_CAPACITY, expected));
  }

  get length(): number {
    return this.count;
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
    const integer = digits * 10n ** BigInt(this.decimals - decimals);
    if (this.shift === null) {
      this.shift = integer;
      this.shiftDouble = isSafe(integer) ? Number(integer) : NaN;
    }
    const step = integer - this.shift;
    if (this.integers === null && isSafe(step)) this.push(Number(step));
    else this.widened().push(step);
    if (this.integers !== null) this.count = this.integers.length;
  }

  /** Adds a place that holds no value. */
  addNothing(): void {
    if (this.integers === null) this.push(0);
    else this.count = this.integers.push(0n);
  }

  /** The numbers gathered; the builder must not be used afterwards. */
  build(): Numbers {
    const shift = this.shift ?? 0n;
    const { decimals, integers, count, steps } = this;
    if (integers !== null) {
      const [numbers] = numbersFromIntegers([integers.map(step => step + shift)], {
        decimals,
        per: 1n,
        shift,
      });
      if (numbers !== undefined) return numbers;
    }
    const roomy = steps.length > count * 1.125 + FIRST_CAPACITY;
    return {
      form: 'steps',
      decimals,
      per: 1,
      shift,
      steps: roomy ? steps.slice(0, count) : steps.subarray(0, count),
    };
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

  /** Makes the step of the column smaller. */
  private refine(decimals: number): void {
    const by = decimals - this.decimals;
    this.decimals = decimals;
    const factor = 10n ** BigInt(by);
    if (this.shift !== null) {
      this.shift *= factor;
      this.shiftDouble = isSafe(this.shift) ? Number(this.shift) : NaN;
    }
    if (this.integers !== null) {
      this.integers = this.integers.map(step => step * factor);
      return;
    }
    const power = EXACT_POWERS[by] ?? Infinity;
    const finer = Float64Array.from(this.steps.subarray(0, this.count), step =>
      step === 0 ? 0 : step * power,
    );
    if (finer.some(step => !(Math.abs(step) < LARGEST_STEP))) {
      this.integers = Array.from(this.steps.subarray(0, this.count), step => BigInt(step) * factor);
      return;
    }
    const fitsInt32 = this.steps instanceof Int32Array && finer.every(step => (step | 0) === step);
    const Steps = fitsInt32 ? Int32Array : Float64Array;
    const refined = new Steps(Math.max(this.steps.length, FIRST_CAPACITY));
    refined.set(finer);
    this.steps = refined;
  }

  private widened(): bigint[] {
    this.integers ??= Array.from(this.steps.subarray(0, this.count), step => BigInt(step));
    return this.integers;
  }
}

const SAFE = BigInt(LARGEST_STEP);

const isSafe = (integer: bigint): boolean => integer < SAFE && integer > -SAFE;
