import type { Integers } from './integerOrder';

const FIRST_CAPACITY = 1024;
const LIMIT = 1n << 63n;

/** Gathers whole numbers in eight bytes each while they fit, then as big integers of any length. */
export class IntegersBuilder {
  private short: BigInt64Array;
  private long: bigint[] | null = null;
  private count = 0;

  constructor(expected: number) {
    this.short = new BigInt64Array(Math.max(FIRST_CAPACITY, expected));
  }

  get length(): number {
    return this.long?.length ?? this.count;
  }

  push(integer: bigint): void {
    if (this.long === null && integer < LIMIT && integer >= -LIMIT) {
      if (this.count === this.short.length) {
        const grown = new BigInt64Array(this.count * 2);
        grown.set(this.short);
        this.short = grown;
      }
      this.short[this.count++] = integer;
      return;
    }
    this.long ??= Array.from(this.short.subarray(0, this.count));
    this.long.push(integer);
  }

  /** Multiplies all of them. */
  multiply(factor: bigint): void {
    const before = this.build();
    this.long = null;
    this.count = 0;
    if (!(before instanceof BigInt64Array)) {
      this.long = before.map(integer => integer * factor);
      return;
    }
    const { length } = before;
    for (let i = 0; i < length; i++) this.push((before[i] as bigint) * factor);
  }

  /** All of them, in order. */
  build(): Integers {
    return this.long ?? this.short.subarray(0, this.count);
  }
}
