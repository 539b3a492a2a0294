import type { Numbers } from './cells';

/** n, mean and SD (divisor n − 1, NaN where n is 1) of a group in the units of the measured column. */
export interface Summary {
  readonly label: string;
  readonly n: number;
  readonly mean: number;
  readonly sd: number;
}

/** x successes of n. */
export interface Count {
  readonly label: string;
  readonly x: number;
  readonly n: number;
}

/** Mean and sum of squares about it. `offset` = mean − shift of the sample's frame, so that differences keep every digit. */
export interface Moments {
  readonly mean: number;
  readonly offset: number;
  readonly ss: number;
}

/**
 * One group's values, gathered once. Samples of one comparison share one frame (decimals, per, shift), so differences
 * of their offsets are exact. Sorted values, ranks and moments are computed on first use and shared by all rows.
 */
export interface Sample {
  readonly n: number;
  readonly numbers: Numbers;
  /** Table rows in file order; for unit means the first row of each unit. */
  readonly rows: Int32Array;
  /** value − shift, in units of the measured column. */
  centred(): Float64Array;
  /** Nearest doubles of the values, ascending. */
  sorted(): Float64Array;
  /** Nearest doubles of the values, file order. */
  values(): Float64Array;
  moments(): Moments;
  /** The logs of the values with the order of the values; null when a value is not above 0. */
  log(): Sample | null;
}

/** One unit: the label path (outermost first) and how many readings it has. */
export interface Unit {
  readonly path: readonly string[];
  readonly readings: number;
}

export interface Group extends Summary {
  /** null for summaries and typed numbers. */
  readonly sample: Sample | null;
  /** Readings used (equals n unless readings are averaged by unit). */
  readonly readings: number;
  readonly missing: number;
  readonly leftOut: number;
  /** Set when readings are averaged: the units in the order of the sample, the readings themselves and each one's unit. */
  readonly units: readonly Unit[] | null;
  readonly readingSample: Sample | null;
  readonly unitOf: Int32Array | null;
}

/** What a method works on. */
export interface Designs {
  two: { readonly test: Group; readonly reference: Group };
  pairs: {
    readonly test: Group;
    readonly reference: Group;
    /** test − reference of each complete pair, in file order of the test value. */
    readonly differences: Sample;
    readonly unmatched: readonly string[];
  };
  several: { readonly groups: readonly Group[]; readonly reference: number | null };
  counts: { readonly test: Count; readonly reference: Count };
  pairedCounts: {
    readonly both: number;
    readonly testOnly: number;
    readonly referenceOnly: number;
    readonly neither: number;
  };
}
