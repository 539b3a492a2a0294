import { alikeOf } from '../../core/methods/alike';
import type { Comparison, Row } from '../../core/model/comparison';
import type { MethodResult } from '../../core/model/methods';
import type { Say } from '../../core/model/say';
import { boundsWords } from './boundsWords';
import { estimatesOf, onOneAxis } from './estimates';
import { clearOf, fullText, placeOf, printAt, withMinus } from '../numbersPrinted';
import type { Printed } from '../view/shown';
import { firstDigitExponent, movedPoint, roundedText, significantPlace } from './rounding';

/** How the values of one comparison are printed: one place for the difference, its limits and the means; one unit. */
export interface Scale {
  /** Unit of a difference, '' where there is none. */
  readonly unit: string;
  /** A value or a difference without its unit. */
  readonly number: (value: number) => Printed;
  /** The mean of a group: at the place of the difference, finer where that would leave fewer than three digits it has. */
  readonly mean: (mean: number, se: number | null) => Printed;
  /** A value as observed, such as a median or an extreme: as written where it stands in the file. */
  readonly observed: (value: number) => Printed;
  /** An estimate or a limit of it, already printed, with its unit. */
  readonly withUnit: (text: string) => string;
  /** A value of the measured column, as written, with its unit. */
  readonly valueWithUnit: (text: string) => string;
  /** A difference with its unit: "22.6 MPa". */
  readonly difference: (value: number) => string;
  /** A number as it was typed, with the unit: "15 MPa". */
  readonly typed: (value: number) => string;
  readonly typedNumber: (value: number) => string;
  /** "8.6 to 36.6", "at least 8.6", "no interval". */
  readonly interval: (result: Pick<MethodResult, 'lower' | 'upper'> | null) => Printed;
}

/** Share of the length of an interval that stands for a standard error where a method gives none. */
const LIMITS_APART = 4;

export function scaleOf(comparison: Comparison, t: Say): Scale {
  const { chosen, groups } = comparison;
  return { ...valueScale(comparison), ...estimateScale(comparison, chosen, decimalsOf(groups) + 1, t) };
}

/** The words for the interval of a row: those of the comparison, or of its own unit where it estimates something else. */
export const intervalOfRow = (row: Row, comparison: Comparison, scale: Scale, t: Say): Printed =>
  onOneAxis(row, comparison.chosen)
    ? scale.interval(row.result)
    : withOwnUnit(row, estimateScale(comparison, row, 2, t));

function withOwnUnit({ result }: Row, { interval, withUnit }: EstimateScale): Printed {
  const { text, full } = interval(result);
  const hasOne = result !== null && (result.lower !== null || result.upper !== null);
  return { text: hasOne ? withUnit(text) : text, full };
}

type ValueScale = Pick<Scale, 'mean' | 'observed' | 'valueWithUnit'>;
type EstimateScale = Omit<Scale, keyof ValueScale>;

/** How values of the measured column are printed: at the place of the difference of their means. */
function valueScale(comparison: Comparison): ValueScale {
  const { chosen, groups } = comparison;
  const inUnits = estimatesOf(chosen) === 'difference';
  const ses = groups.map(({ se }) => se ?? 0);
  const place = inUnits
    ? placeFor(chosen, value => value, specialValues(comparison), decimalsOf(groups) + 1)
    : placeOf(Math.hypot(...ses), [], [], decimalsOf(groups) + 1);
  return {
    mean: (mean, se) => ({ text: printAt(mean, meanPlace(place, mean, se)), full: fullText(mean) }),
    observed: value => ({
      text: printAt(value, observedPlace(comparison, place, value)),
      full: fullText(value),
    }),
    valueWithUnit: text => (comparison.unit === null ? text : `${text} ${comparison.unit}`),
  };
}

function estimateScale(comparison: Comparison, row: Row, fallback: number, t: Say): EstimateScale {
  const shares = comparison.design === 'counts' || comparison.design === 'pairedCounts';
  const estimates = estimatesOf(row);
  const power = shares && estimates === 'difference' ? 2 : 0;
  const moved = (value: number): number => (power === 0 ? value : movedPoint(value, power));
  const special = [alikeOf({ estimates }), ...specialValues(comparison)].map(moved);
  const place = placeFor(row, moved, special, fallback);
  const unit = estimates !== 'difference' ? '' : shares ? t('percentage points') : (comparison.unit ?? '');

  const number = (value: number): Printed => ({ text: printAt(moved(value), place), full: fullText(value) });
  const withUnit = (text: string): string =>
    estimates === 'ratio' ? t('{0} times', text) : unit === '' ? text : `${text} ${unit}`;
  const typedNumber = (value: number): string => withMinus(String(moved(value)));
  return {
    unit,
    number,
    withUnit,
    difference: value => withUnit(number(value).text),
    typed: value => withUnit(typedNumber(value)),
    typedNumber,
    interval: result => {
      const lower = result?.lower ?? null;
      const upper = result?.upper ?? null;
      const limits = [lower, upper].map(limit => (limit === null ? null : moved(limit)));
      const at = clearOf(place, limits, special);
      const text = (limit: number): string => printAt(moved(limit), at);
      return { text: spanWords(lower, upper, text, t), full: spanWords(lower, upper, fullText, t) };
    },
  };
}

function spanWords(
  lower: number | null,
  upper: number | null,
  text: (limit: number) => string,
  t: Say,
): string {
  return lower === null && upper === null ? t('no interval') : boundsWords(lower, upper, text, t);
}

/** Values that no limit may print as unless it truly has them. */
function specialValues({ settings }: Pick<Comparison, 'settings'>): readonly number[] {
  const { against, matters, margin } = settings;
  return [0, against, ...(matters === null ? [] : [matters, -matters]), ...(margin ?? [])];
}

/** A ratio has the place of its limits' distance, as it has no standard error in its own unit. */
function placeFor(
  { id, result }: Row,
  moved: (value: number) => number,
  special: readonly number[],
  fallback: number,
): number {
  const { lower, upper } = result ?? { lower: null, upper: null };
  const limits = [lower, upper].map(limit => (limit === null ? null : moved(limit)));
  const length = lower === null || upper === null ? null : (upper - lower) / LIMITS_APART;
  const se = estimatesOf({ id }) === 'ratio' ? length : (result?.se ?? length);
  return placeOf(se === null ? null : moved(se), limits, special, fallback);
}

function meanPlace(place: number, mean: number, se: number | null): number {
  if (se === null || !(se > 0) || mean === 0) return place;
  return Math.max(place, Math.min(1 - firstDigitExponent(se), significantPlace(mean, 3)));
}

const decimalsOf = (groups: Comparison['groups']): number =>
  Math.max(0, ...groups.map(group => group.sample?.numbers.decimals ?? 0));

/** Values of the file have the file's decimals, a median of two one more; unit means have those of the means. */
function observedPlace({ groups }: Comparison, place: number, value: number): number {
  const decimals = decimalsOf(groups);
  if (groups.some(group => group.units !== null)) return Math.max(place, decimals);
  return Number(roundedText(value, decimals)) === value ? decimals : decimals + 1;
}
