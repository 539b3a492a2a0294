import { logScaleDensity } from './chiScale';

/** Nodes a standard deviation of ln s, at least; and the widest step of ln s. */
const FINENESS = 2;
const WIDEST = 1 / 32;
/** Above this many df the scale is 1 to the last digit. */
const NO_SCALE = 1e8;
/** Terms this much smaller than the sum add nothing to it. */
const NEGLIGIBLE = 1e-19;
const MOST_KEPT = 20_000;

/**
 * The mean of tail(q·s) over s = χ_df/√df: what becomes of a tail when its standard deviation is estimated on df degrees of
 * freedom. The trapezoidal rule over ln s (see chiScaleNodes) may start anywhere, so its nodes are laid where ln(q·s) is a
 * multiple of the step: the values of `tail` are then the same for every q and nearly every df, and are kept.
 */
export class OverScales {
  private readonly kept = new Map<number, number>();

  /**
   * @param tail of w > 0, with values from 0 to 1
   * @param course whether it falls or rises with w
   */
  constructor(
    private readonly tail: (w: number) => number,
    private readonly course: 'falling' | 'rising',
  ) {}

  /** q > 0; df > 0, Infinity for a known standard deviation. */
  mean(q: number, df: number): number {
    if (Number.isNaN(q) || Number.isNaN(df)) return NaN;
    if (!(df < NO_SCALE) || q === Infinity) return this.tail(q);
    const step = stepFor(df);
    const density = logScaleDensity(df);
    const logQ = Math.log(q);
    const middle = Math.round(logQ / step);
    let sum = 0;
    const walk = (from: number, by: 1 | -1): void => {
      const isFalling = (this.course === 'falling') === by > 0;
      for (let node = from; ; node += by) {
        // Exact: the step is a power of 2, and the logs are near each other.
        const weight = density(node * step - logQ);
        const term = weight * this.valueAt(node * step);
        sum += term;
        // Weights fall from the middle on, and no value is above 1.
        if (weight <= NEGLIGIBLE * sum || (isFalling && term <= NEGLIGIBLE * sum)) return;
      }
    };
    walk(middle, 1);
    walk(middle - 1, -1);
    return sum * step;
  }

  private valueAt(logW: number): number {
    const known = this.kept.get(logW);
    if (known !== undefined) return known;
    const value = this.tail(Math.exp(logW));
    if (this.kept.size >= MOST_KEPT) this.kept.clear();
    this.kept.set(logW, value);
    return value;
  }
}

/** The largest power of 2 that is fine enough. */
function stepFor(df: number): number {
  const finest = 1 / Math.sqrt(2 * df) / FINENESS;
  let step = WIDEST;
  while (step > finest) step /= 2;
  return step;
}
