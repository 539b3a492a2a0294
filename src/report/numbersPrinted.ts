import { alphaOf } from '../core/methods/confidence';
import type { MethodResult } from '../core/model/methods';
import { firstDigitExponent, movedPoint, roundedText, significantPlace } from './words/rounding';

/** Beyond this many decimals or whole digits a plain number is no longer readable and is printed with a power of ten. */
const READABLE_DIGITS = 15;
const MOST_EXTRA_DIGITS = 17;
const SMALL_P = 0.001;

/** A minus sign for people instead of a hyphen. */
export const withMinus = (text: string): string => text.replace(/-/g, '\u2212');

/**
 * A number rounded half to even to `place` decimals, as people read it. What is not finite has no place in a sentence:
 * it is printed as a dash.
 */
export function printAt(value: number, place: number): string {
  if (!Number.isFinite(value)) return '\u2013';
  const readable = place <= READABLE_DIGITS && Math.abs(value) < 10 ** READABLE_DIGITS;
  return withMinus(readable ? roundedText(value, place) : withPower(value, place));
}

/** "1.23 × 10^-20", to the same place as the plain number would have. */
function withPower(value: number, place: number): string {
  if (Number(roundedText(value, place)) === 0) return '0';
  const exponent = firstDigitExponent(value);
  const digits = Math.max(0, Math.min(MOST_EXTRA_DIGITS, exponent + place));
  return `${roundedText(movedPoint(value, -exponent), digits)} × 10^${exponent}`;
}

/** To `digits` significant digits: standard deviations, statistics. */
export const printSignificant = (value: number, digits: number): string =>
  printAt(value, Number.isFinite(value) ? significantPlace(value, digits) : 0);

/** A standard deviation or a statistic: three significant digits. */
export const printThree = (value: number): string => printSignificant(value, 3);

/**
 * The place of the second significant digit of a standard error (GUM, JCGM 100:2008, 7.2.6), and as many more places as
 * it takes until none of the limits prints as a value it does not have: 0, what it is held against, a margin, what
 * matters. `fallback` stands in for a standard error that is absent or 0.
 */
export function placeOf(
  se: number | null,
  limits: readonly (number | null)[],
  special: readonly number[],
  fallback: number,
): number {
  const known = se !== null && Number.isFinite(se) && se > 0;
  const place = known ? 1 - firstDigitExponent(se) : fallback;
  return clearOf(place, limits, special);
}

/** `place`, or as many more places as it takes until no value prints as a special one that it does not equal. */
export function clearOf(
  place: number,
  values: readonly (number | null)[],
  special: readonly number[],
): number {
  const clash = (at: number): boolean =>
    values.some(
      value =>
        value !== null &&
        Number.isFinite(value) &&
        !special.includes(value) &&
        special.includes(Number(roundedText(value, at))),
    );
  for (let more = 0; more <= MOST_EXTRA_DIGITS; more += 1) if (!clash(place + more)) return place + more;
  return place;
}

/**
 * p without its name: two decimals from 0.10 on, three below, "< 0.001" below that, "> 0.99" near 1; more digits where
 * rounding would print exactly 1 − confidence for a p that is not. With a confidence above 0.999 the lowest printed
 * bound is the power of ten below 1 − confidence, so that a p never hides on which side of it lies.
 * Source: SAMPL guidelines (Lang & Altman 2013).
 */
export function printP(p: number, confidence: number): string {
  if (!Number.isFinite(p)) return '\u2013';
  if (p > 0.99) return '> 0.99';
  const alpha = alphaOf(confidence);
  const floor = alpha < SMALL_P ? movedPoint(1, firstDigitExponent(alpha)) : SMALL_P;
  if (p < floor) return `< ${roundedText(floor, -firstDigitExponent(floor))}`;
  const place = p >= 0.1 ? 2 : p >= SMALL_P ? 3 : significantPlace(p, 2);
  return printAt(p, clearOf(place, [p], [alpha]));
}

/** "p = 0.003", "p < 0.001", "p > 0.99". */
export function sayP(p: number, confidence: number): string {
  const text = printP(p, confidence);
  return /^[<>]/.test(text) ? `p ${text}` : `p = ${text}`;
}

/** Degrees of freedom: whole numbers as they are, else three significant digits. */
export const printDf = (df: number): string => (Number.isInteger(df) ? printAt(df, 0) : printThree(df));

/** A confidence or another share in percent, with the digits it was given with: 95 for 0.95, 99.9 for 0.999. */
export const printPercent = (share: number): string => withMinus(String(movedPoint(share, 2)));

/**
 * A share of n in percent: no decimals below 100 values, one from there on, and more where rounding would print 0 or 100
 * for a share that is neither.
 */
export function printShare(x: number, n: number): string {
  const percent = movedPoint(x / n, 2);
  return printAt(percent, clearOf(n < 100 ? 0 : 1, [percent], [0, 100]));
}

/**
 * The place of an effect size with an interval: the first significant digit of a quarter of its length (of half the
 * distance to its one limit), never coarser than ones.
 */
export function effectPlace(
  value: number,
  lower: number | null,
  upper: number | null,
  special: readonly number[],
): number {
  const reach = [lower, upper].filter(limit => limit !== null).map(limit => Math.abs(limit - value));
  const half = reach.reduce((sum, own) => sum + own, 0) / reach.length;
  const known = half > 0 && Number.isFinite(half);
  const place = known ? Math.max(0, -firstDigitExponent(half / 2)) : significantPlace(value, 3);
  return clearOf(place, [lower, upper], special);
}

/** The shortest text that reads back to the same double; null and what is not finite: ''. */
export const fullText = (value: number | null): string =>
  value === null || !Number.isFinite(value) ? '' : String(value);

/** Degrees of freedom of a row in full: one number, or two for F. */
export function fullDf(df: MethodResult['df']): string {
  return df === null ? '' : typeof df === 'number' ? fullText(df) : df.map(fullText).join(', ');
}
