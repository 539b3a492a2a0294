import { normalStart } from './startingValue';

const SQRT_2PI = 2.5066282746310005024;
const INNER = 0.46875 * Math.SQRT2;
const GRID = 16;

/** W. J. Cody's rational approximations for erf on [0, 0.46875] and for exp(x²)·erfc(x) on (0.46875, 4] and beyond. */
const ERF_NUMERATOR = [
  3.1611237438705656, 1.13864154151050156e2, 3.77485237685302021e2, 3.20937758913846947e3,
] as const;
const ERF_LEAD = 1.85777706184603153e-1;
const ERF_DENOMINATOR = [
  2.36012909523441209e1, 2.44024637934444173e2, 1.28261652607737228e3, 2.84423683343917062e3,
] as const;
const MID_NUMERATOR = [
  5.64188496988670089e-1, 8.88314979438837594, 6.61191906371416295e1, 2.98635138197400131e2,
  8.8195222124176909e2, 1.71204761263407058e3, 2.05107837782607147e3, 1.23033935479799725e3,
] as const;
const MID_LEAD = 2.15311535474403846e-8;
const MID_DENOMINATOR = [
  1.57449261107098347e1, 1.17693950891312499e2, 5.37181101862009858e2, 1.62138957456669019e3,
  3.29079923573345963e3, 4.36261909014324716e3, 3.43936767414372164e3, 1.23033935480374942e3,
] as const;
const FAR_NUMERATOR = [
  3.05326634961232344e-1, 3.60344899949804439e-1, 1.25781726111229246e-1, 1.60837851487422766e-2,
  6.58749161529837803e-4,
] as const;
const FAR_LEAD = 1.63153871373020978e-2;
const FAR_DENOMINATOR = [
  2.56852019228982242, 1.87295284992346725, 5.27905102951428412e-1, 6.05183413124413191e-2,
  2.33520497626869185e-3,
] as const;
const INVERSE_SQRT_PI = 0.56418958354775628695;

/** Density of the standard normal distribution at z; 0 at ±∞. */
export const normalDensity = (z: number): number =>
  Math.abs(z) === Infinity ? 0 : halfSquareExp(Math.abs(z)) / SQRT_2PI;

/** P(Z ≤ z). Both tails keep their relative accuracy: nothing is formed as 1 − tail. */
export const normalLowerTail = (z: number): number => normalUpperTail(-z);

/** P(Z ≥ z). Source: Cody 1969, Mathematics of Computation 23:631, with exp(−z²/2) split so that z² loses nothing. */
export function normalUpperTail(z: number): number {
  if (Math.abs(z) === Infinity) return z > 0 ? 0 : 1;
  const size = Math.abs(z);
  if (size <= INNER) return 0.5 - 0.5 * smallErf(z / Math.SQRT2);
  const tail = 0.5 * halfSquareExp(size) * scaledErfc(size / Math.SQRT2);
  return z > 0 ? tail : 1 - tail;
}

/** z with P(Z ≤ z) = p, for p in (0, 1); ∓∞ at 0 and 1. */
export const normalQuantile = (p: number): number =>
  p <= 0.5 ? -normalUpperQuantile(p) : upperQuantile(1 - p);

/** z with P(Z ≥ z) = p, for p in (0, 1), also for tiny p; ±∞ at 0 and 1. */
export const normalUpperQuantile = (p: number): number =>
  p <= 0.5 ? upperQuantile(p) : -upperQuantile(1 - p);

/** Newton steps on the log of the tail: nearly linear in z², so a start of 8 digits needs one or two. */
function upperQuantile(p: number): number {
  if (p <= 0) return p === 0 ? Infinity : NaN;
  if (p === 0.5) return 0;
  let z = normalStart(p);
  for (let step = 0; step < 8; step += 1) {
    const tail = normalUpperTail(z);
    const move = (Math.log(tail / p) * tail) / normalDensity(z);
    z += move;
    if (Math.abs(move) <= 1e-15 * Math.abs(z)) break;
  }
  return z;
}

function smallErf(x: number): number {
  const square = x * x;
  let numerator = ERF_LEAD * square;
  let denominator = square;
  for (let i = 0; i < 3; i += 1) {
    numerator = (numerator + at(ERF_NUMERATOR, i)) * square;
    denominator = (denominator + at(ERF_DENOMINATOR, i)) * square;
  }
  return (x * (numerator + at(ERF_NUMERATOR, 3))) / (denominator + at(ERF_DENOMINATOR, 3));
}

/** exp(x²)·erfc(x) for x > 0.46875. */
function scaledErfc(x: number): number {
  if (x <= 4) {
    let numerator = MID_LEAD * x;
    let denominator = x;
    for (let i = 0; i < 7; i += 1) {
      numerator = (numerator + at(MID_NUMERATOR, i)) * x;
      denominator = (denominator + at(MID_DENOMINATOR, i)) * x;
    }
    return (numerator + at(MID_NUMERATOR, 7)) / (denominator + at(MID_DENOMINATOR, 7));
  }
  const inverse = 1 / (x * x);
  let numerator = FAR_LEAD * inverse;
  let denominator = inverse;
  for (let i = 0; i < 4; i += 1) {
    numerator = (numerator + at(FAR_NUMERATOR, i)) * inverse;
    denominator = (denominator + at(FAR_DENOMINATOR, i)) * inverse;
  }
  const bend = (inverse * (numerator + at(FAR_NUMERATOR, 4))) / (denominator + at(FAR_DENOMINATOR, 4));
  return (INVERSE_SQRT_PI - bend) / x;
}

/** exp(−z²/2) for z ≥ 0: z is split at a multiple of 1/16 whose square is exact. */
function halfSquareExp(z: number): number {
  const coarse = Math.trunc(z * GRID) / GRID;
  const rest = (z - coarse) * (z + coarse);
  return Math.exp((-coarse * coarse) / 2) * Math.exp(-rest / 2);
}

const at = (coefficients: readonly number[], i: number): number => coefficients[i] ?? 0;
