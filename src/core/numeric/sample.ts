import type { Numbers } from '../model/cells';
import type { Moments, Sample } from '../model/groups';
import { momentsOf } from './moments';
import { countOf, keysOf, nearestDoubles, numbersFromDoubles, offsetsOf } from './numbers';

/**
 * A sample of numbers already gathered, one entry for each of `rows`. What is computed from it is computed once, on first
 * use.
 */
export const makeSample = (numbers: Numbers, rows: Int32Array): Sample => new GatheredSample(numbers, rows);

/** A sample of computed doubles: their order is their own, their frame has shift 0. */
export const sampleFromDoubles = (values: Float64Array, rows: Int32Array): Sample =>
  new GatheredSample(numbersFromDoubles(values), rows);

class GatheredSample implements Sample {
  readonly n: number;
  private offsets: Float64Array | null = null;
  private ascending: Float64Array | null = null;
  private doubles: Float64Array | null = null;
  private known: Moments | null = null;
  private logs: Sample | null | undefined = undefined;

  constructor(
    readonly numbers: Numbers,
    readonly rows: Int32Array,
  ) {
    this.n = countOf(numbers);
  }

  centred(): Float64Array {
    return (this.offsets ??= offsetsOf(this.numbers));
  }

  sorted(): Float64Array {
    return (this.ascending ??= this.values().slice().sort());
  }

  values(): Float64Array {
    return (this.doubles ??= nearestDoubles(this.numbers));
  }

  moments(): Moments {
    return (this.known ??= momentsOf(this.numbers));
  }

  log(): Sample | null {
    if (this.logs === undefined) this.logs = this.takeLogs();
    return this.logs;
  }

  private takeLogs(): Sample | null {
    const values = this.values();
    if (values.some(value => !(value > 0))) return null;
    const numbers: Numbers = {
      form: 'wide',
      decimals: 0,
      per: 1n,
      shift: 0n,
      offsets: values.map(Math.log),
      order: keysOf(this.numbers),
      exact: null,
    };
    return makeSample(numbers, this.rows);
  }
}
