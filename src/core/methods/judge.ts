import type { Ask, MethodResult } from '../model/methods';
import type { Facts } from '../model/say';
import { alphaOf, bothTailsConfidence } from './confidence';
import type { Curve } from './curve';

/** An estimate whose distance from any hypothesised value can be put on a curve, and whose limits can be read off it. */
export interface Pivot {
  readonly estimate: number;
  readonly se: number | null;
  readonly df: number | null;
  readonly curve: Curve;
  /** The statistic for the hypothesis that the true value is `value`; null where the method gives intervals only. */
  readonly at: ((value: number) => number) | null;
  /** The limits at which the statistic is +quantile (lower) and −quantile (upper). */
  lower(quantile: number): number;
  upper(quantile: number): number;
  readonly extra?: Facts;
}

type Asked = Pick<Ask, 'question' | 'confidence' | 'against' | 'margin'>;

/**
 * Statistic, p and interval of an estimate for each question. One-sided questions get a bound at the stated confidence
 * with an open end (null) and the two-sided p and interval beside it. `equivalent` is answered by two one-sided tests:
 * p is the larger, the interval the one whose two tails are each 1 − confidence.
 * Sources: ISO 2854:1976 (bounds); Schuirmann 1987, J. Pharmacokin. Biopharm. 15:657–680 (two one-sided tests).
 */
export function judge(pivot: Pivot, ask: Asked): MethodResult {
  const alpha = alphaOf(ask.confidence);
  const common = { estimate: pivot.estimate, se: pivot.se, df: pivot.df, confidence: ask.confidence };
  const extra = pivot.extra === undefined ? {} : { extra: pivot.extra };
  const twoSided = both(pivot, ask.against, alpha);
  const beside = { ...extra, twoSided };
  const wide = pivot.curve.upperQuantile(alpha);
  switch (ask.question) {
    case 'differs':
      return { ...common, ...extra, statistic: statisticAt(pivot, ask.against), ...twoSided };
    case 'higher': {
      const statistic = statisticAt(pivot, ask.against);
      return {
        ...common,
        ...beside,
        statistic,
        p: upperTail(pivot, statistic),
        lower: pivot.lower(wide),
        upper: null,
      };
    }
    case 'lower': {
      const statistic = statisticAt(pivot, ask.against);
      return {
        ...common,
        ...beside,
        statistic,
        p: lowerTail(pivot, statistic),
        lower: null,
        upper: pivot.upper(wide),
      };
    }
    case 'not-lower': {
      const statistic = statisticAt(pivot, marginOf(ask)[0]);
      return {
        ...common,
        ...beside,
        statistic,
        p: upperTail(pivot, statistic),
        lower: pivot.lower(wide),
        upper: null,
      };
    }
    case 'not-higher': {
      const statistic = statisticAt(pivot, marginOf(ask)[1]);
      return {
        ...common,
        ...beside,
        statistic,
        p: lowerTail(pivot, statistic),
        lower: null,
        upper: pivot.upper(wide),
      };
    }
    case 'equivalent':
      return {
        ...common,
        ...beside,
        ...harder(pivot, marginOf(ask)),
        lower: pivot.lower(wide),
        upper: pivot.upper(wide),
        confidence: bothTailsConfidence(ask.confidence),
      };
  }
}

function both(
  pivot: Pivot,
  against: number,
  alpha: number,
): { p: number | null; lower: number; upper: number } {
  const statistic = statisticAt(pivot, against);
  const quantile = pivot.curve.upperQuantile(alpha / 2);
  return {
    p: statistic === null ? null : pivot.curve.twoSided(statistic),
    lower: pivot.lower(quantile),
    upper: pivot.upper(quantile),
  };
}

/** The one of the two one-sided tests with the larger p. */
function harder(
  pivot: Pivot,
  [low, high]: readonly [number, number],
): { statistic: number | null; p: number | null } {
  const above = statisticAt(pivot, low);
  const below = statisticAt(pivot, high);
  const pAbove = upperTail(pivot, above);
  const pBelow = lowerTail(pivot, below);
  if (pAbove === null || pBelow === null) return { statistic: null, p: null };
  return pAbove >= pBelow ? { statistic: above, p: pAbove } : { statistic: below, p: pBelow };
}

const statisticAt = (pivot: Pivot, value: number): number | null =>
  pivot.at === null ? null : pivot.at(value);

const upperTail = (pivot: Pivot, statistic: number | null): number | null =>
  statistic === null ? null : pivot.curve.upperTail(statistic);

const lowerTail = (pivot: Pivot, statistic: number | null): number | null =>
  statistic === null ? null : pivot.curve.lowerTail(statistic);

function marginOf(ask: Asked): readonly [number, number] {
  if (ask.margin === null) throw new RangeError(`question '${ask.question}' came without a margin`);
  return ask.margin;
}
