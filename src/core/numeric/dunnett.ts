import { normalDensity, normalUpperTail } from './normal';
import { normalBetween } from './normalBetween';
import { OverScales } from './overScales';
import { secantOfLogTail } from './secantOfLogTail';
import { tLowerTail, tUpperQuantile, tUpperTail } from './studentT';

/** Groups that are each held against one reference, with one standard deviation estimated from all of them. */
export interface ManyToOne {
  /** Number of values of each group but the reference; at least one group. */
  readonly sizes: readonly number[];
  /** Number of values of the reference. */
  readonly reference: number;
  /** Degrees of freedom of the standard deviation, above 0; Infinity where it is known. */
  readonly df: number;
}

/** Farthest of all statistics to both sides, or highest of all. */
export type Sides = 'two' | 'one';

const WIDEST_STEP = 1 / 8;
/** Steps over the rise of the steepest factor. */
const FINENESS = 4;
/** Standard deviations beyond which a normal curve adds nothing. */
const REACH = 9;
const MOST_KEPT = 8;
const NEARBY = 1.1;

/**
 * P(some |T| ≥ t), or P(some T ≥ t) for one side, over the statistics T of all groups against the reference: by the share
 * that the reference has in all of them, given which they are independent. Source: Dunnett 1955, Journal of the American
 * Statistical Association 50:1096–1121; for unequal sizes Dunnett 1964, Biometrics 20:482–491.
 */
export function dunnettUpperTail(t: number, among: ManyToOne, sides: Sides): number {
  if (sides === 'two' && t <= 0) return 1;
  if (among.sizes.length === 1) return (sides === 'two' ? 2 : 1) * tUpperTail(t, among.df);
  return overScales(t, among, sides, 'upper');
}

/** P(every |T| ≤ t), or P(every T ≤ t) for one side. */
export function dunnettLowerTail(t: number, among: ManyToOne, sides: Sides): number {
  if (sides === 'two' && t <= 0) return 0;
  if (among.sizes.length === 1 && sides === 'one') return tLowerTail(t, among.df);
  return overScales(t, among, sides, 'lower');
}

/** t with P(some |T| ≥ t) = p, or P(some T ≥ t) = p for one side; p in (0, ½]. */
export function dunnettUpperQuantile(p: number, among: ManyToOne, sides: Sides): number {
  if (!(p > 0 && p <= 0.5)) return p === 0 ? Infinity : NaN;
  const alone = (share: number): number => tUpperQuantile(sides === 'two' ? share / 2 : share, among.df);
  const { length } = among.sizes;
  if (length === 1) return alone(p);
  // Between the quantile of one statistic and that of all of them taken one by one (Bonferroni).
  const highest = alone(p / length);
  const slope = Math.log(NEARBY) / Math.log(highest / alone((p / length) * NEARBY));
  const lowest = Math.max(alone(p), highest * 1e-6);
  return secantOfLogTail(t => dunnettUpperTail(t, among, sides), p, highest, slope, [
    lowest * (1 - 1e-9),
    highest * (1 + 1e-9),
  ]);
}

type End = 'upper' | 'lower';

const kept = new Map<string, OverScales>();

/** The mean over the scales; below 0 the statistic is taken by its size, as its tails then run the other way. */
function overScales(t: number, { sizes, reference, df }: ManyToOne, sides: Sides, end: End): number {
  if (t === 0) return conditional(0, factorsOf(sizes, reference), sides, end);
  const sign = t < 0 ? -1 : 1;
  const key = `${[...sizes].sort((a, b) => a - b).join(' ')} / ${reference} ${sides} ${end} ${sign}`;
  let scales = kept.get(key);
  if (scales === undefined) {
    const factors = factorsOf(sizes, reference);
    const course = (end === 'upper') === sign > 0 ? 'falling' : 'rising';
    scales = new OverScales(w => conditional(sign * w, factors, sides, end), course);
    if (kept.size >= MOST_KEPT) kept.clear();
    kept.set(key, scales);
  }
  return scales.mean(Math.abs(t), df);
}

/** Groups of one size: given the reference's share u, T ≥ w where a normal value is at least w·stretch − u·pull. */
interface Factor {
  readonly count: number;
  readonly stretch: number;
  readonly pull: number;
}

function factorsOf(sizes: readonly number[], reference: number): readonly Factor[] {
  return [...new Set(sizes)].map(size => ({
    count: sizes.filter(other => other === size).length,
    stretch: Math.sqrt(1 + size / reference),
    pull: Math.sqrt(size / reference),
  }));
}

/** ∫ φ(u) [1 − Π P(not beyond w | u)] du for the upper end, ∫ φ(u) Π P(not beyond w | u) du for the lower. */
function conditional(w: number, factors: readonly Factor[], sides: Sides, end: End): number {
  const steepest = Math.max(...factors.map(({ pull }) => pull));
  const step = Math.min(WIDEST_STEP, 1 / FINENESS / steepest);
  const last = Math.ceil((REACH + Math.max(0, w)) / step);
  // Both sides mirror each other.
  const first = sides === 'two' ? 0 : -Math.ceil((REACH + Math.max(0, -w)) / step);
  let sum = 0;
  for (let node = first; node <= last; node += 1) {
    const u = node * step;
    const share = end === 'upper' ? someBeyond(w, u, factors, sides) : noneBeyond(w, u, factors, sides);
    sum += normalDensity(u) * share * (sides === 'one' || node === 0 ? 1 : 2);
  }
  return sum * step;
}

/** 1 − Π (1 − beyond), formed so that small chances keep their digits. */
function someBeyond(w: number, u: number, factors: readonly Factor[], sides: Sides): number {
  let logNone = 0;
  for (const { count, stretch, pull } of factors) {
    const above = normalUpperTail(w * stretch - u * pull);
    const below = sides === 'two' ? normalUpperTail(w * stretch + u * pull) : 0;
    logNone += count * Math.log1p(-Math.min(1, above + below));
  }
  return -Math.expm1(logNone);
}

function noneBeyond(w: number, u: number, factors: readonly Factor[], sides: Sides): number {
  let none = 1;
  for (const { count, stretch, pull } of factors) {
    const within =
      sides === 'two'
        ? normalBetween(w * stretch + u * pull, 2 * w * stretch)
        : normalUpperTail(u * pull - w * stretch);
    none *= within ** count;
  }
  return none;
}
