import type { Ticker } from '../model/problem';
import type { Ways } from './ways';

const TICK = 1 << 12;
/** Doubles closer than this, relative to their size, are told apart by whole numbers. */
const NEAR = 1e-9;
/** Below this share of the squares, too little of the spread is left in doubles. */
const LOST = 1e-6;

/**
 * Counts, over all allotments, the separate-variance t of the values against that of the allotment met, which is `test`
 * against `reference`. The values are whole numbers; ties are decided on whole numbers too, never on rounded statistics.
 * Both groups hold two values or more, and those met are not all equal within both groups.
 */
export function allottedStatistics(test: Float64Array, reference: Float64Array, tick: Ticker): Ways {
  const values = centred([...test, ...reference]);
  const [n, m] = [test.length, reference.length];
  const whole = new Whole(values, n);
  const chosen = Int32Array.from({ length: n }, (_, index) => index);
  const met = whole.exact(chosen);
  const metT = whole.near(chosen);
  let [ways, atLeast, atMost, asFar] = [0, 0, 0, 0];
  do {
    ways++;
    if (ways % TICK === 0) tick(ways, ways);
    const t = whole.near(chosen);
    const [above, far] = isNear(Math.abs(t), Math.abs(metT))
      ? exactOrder(whole.exact(chosen), met)
      : [Math.sign(t - metT), Math.sign(Math.abs(t) - Math.abs(metT))];
    if (above >= 0) atLeast++;
    if (above <= 0) atMost++;
    if (far >= 0) asFar++;
  } while (nextChoice(chosen, n + m));
  return { ways, atLeast, atMost, asFar };
}

/** A constant taken off all values changes no statistic and keeps squares small. */
function centred(values: readonly number[]): readonly number[] {
  const middle = Math.round(values.reduce((sum, value) => sum + value / values.length, 0));
  return values.map(value => value - middle);
}

/** Also where a double could not be had at all. */
const isNear = (a: number, b: number): boolean => !(Math.abs(a - b) > NEAR * Math.max(a, b));

/** The next choice of ascending indices below `of`, in place; false after the last. */
function nextChoice(chosen: Int32Array, of: number): boolean {
  const { length } = chosen;
  let at = length - 1;
  while (at >= 0 && (chosen[at] ?? 0) === of - length + at) at--;
  if (at < 0) return false;
  let index = (chosen[at] ?? 0) + 1;
  for (; at < length; at++) chosen[at] = index++;
  return true;
}

/** t as numerator and squared denominator, up to a factor that all allotments share. */
interface Fraction {
  readonly over: bigint;
  readonly under: bigint;
}

/** Signs of t − met and of |t| − |met|. */
function exactOrder(t: Fraction, met: Fraction): readonly [number, number] {
  const far = sign(t.over * t.over * met.under - met.over * met.over * t.under);
  const [side, metSide] = [sign(t.over), sign(met.over)];
  return [side !== metSide ? Math.sign(side - metSide) : side * far, far];
}

const sign = (value: bigint): number => (value > 0n ? 1 : value < 0n ? -1 : 0);

/** The statistic of any allotment of the same values, quickly or exactly. */
class Whole {
  private readonly m: number;
  private readonly sum: number;
  private readonly squares: number;
  private readonly integers: readonly bigint[];
  private readonly exactSum: bigint;
  private readonly exactSquares: bigint;

  constructor(
    private readonly values: readonly number[],
    private readonly n: number,
  ) {
    this.m = values.length - n;
    this.sum = values.reduce((total, value) => total + value, 0);
    this.squares = values.reduce((total, value) => total + value * value, 0);
    this.integers = values.map(BigInt);
    this.exactSum = this.integers.reduce((total, value) => total + value, 0n);
    this.exactSquares = this.integers.reduce((total, value) => total + value * value, 0n);
  }

  /** t in doubles; NaN where the groups scatter too little for doubles. */
  near(chosen: Int32Array): number {
    const { n, m } = this;
    let [sum, squares] = [0, 0];
    for (const index of chosen) {
      const value = this.values[index] ?? 0;
      sum += value;
      squares += value * value;
    }
    const other = this.sum - sum;
    const rest = this.squares - squares;
    const over = sum / n - other / m;
    const [a, b] = [1 / n / (n - 1), 1 / m / (m - 1)];
    const under = (squares - (sum * sum) / n) * a + (rest - (other * other) / m) * b;
    return under < LOST * (squares * a + rest * b) ? NaN : over / Math.sqrt(under);
  }

  exact(chosen: Int32Array): Fraction {
    const [n, m] = [BigInt(this.n), BigInt(this.m)];
    let [sum, squares] = [0n, 0n];
    for (const index of chosen) {
      const value = this.integers[index] ?? 0n;
      sum += value;
      squares += value * value;
    }
    const other = this.exactSum - sum;
    return {
      over: m * sum - n * other,
      under:
        (n * squares - sum * sum) * m * m * (m - 1n) +
        (m * (this.exactSquares - squares) - other * other) * n * n * (n - 1n),
    };
  }
}
