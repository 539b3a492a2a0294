import type { Group, Sample, Unit } from '../core/model/groups';

/** What became of the values of a group that are not in its sample. */
export interface Uncounted {
  readonly missing: number;
  readonly leftOut: number;
}

/** The readings behind unit means. */
export interface Readings {
  readonly units: readonly Unit[];
  readonly sample: Sample;
  readonly unitOf: Int32Array;
}

/** A group with its mean and SD; the SD of one value is NaN. */
export function groupOf(
  label: string,
  sample: Sample,
  { missing, leftOut }: Uncounted,
  readings?: Readings,
): Group {
  const { mean, ss } = sample.moments();
  return {
    label,
    n: sample.n,
    mean,
    sd: sample.n > 1 ? Math.sqrt(ss / (sample.n - 1)) : Number.NaN,
    sample,
    readings: readings?.sample.n ?? sample.n,
    missing,
    leftOut,
    units: readings?.units ?? null,
    readingSample: readings?.sample ?? null,
    unitOf: readings?.unitOf ?? null,
  };
}
