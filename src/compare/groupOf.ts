import type { Group, Sample, Unit } from '../core/model/groups';
import { Refusal } from '../core/model/problem';

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

/** Sums of squares outside of this lose digits, or all, when variances are squared for degrees of freedom. */
const LEAST_SQUARES = 1e-140;
const MOST_SQUARES = 1e140;

/**
 * A group with its mean and SD; the SD of one value is NaN. Throws Refusal number-unusable for values so large or so small
 * that their spread cannot be computed with.
 */
export function groupOf(
  label: string,
  sample: Sample,
  { missing, leftOut }: Uncounted,
  readings?: Readings,
): Group {
  const { mean, ss } = sample.moments();
  if (sample.n > 1 && !isUsable(ss, sample)) throw unusable(label, sample);
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

function isUsable(ss: number, sample: Sample): boolean {
  if (ss > LEAST_SQUARES && ss < MOST_SQUARES) return true;
  if (ss !== 0) return false;
  const values = sample.sorted();
  return values[0] === values.at(-1);
}

function unusable(label: string, sample: Sample): Refusal {
  const values = sample.sorted();
  return new Refusal('number-unusable', { label, lowest: values[0] ?? null, highest: values.at(-1) ?? null });
}
