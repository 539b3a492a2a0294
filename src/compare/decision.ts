import { alphaOf } from '../core/methods/confidence';
import type { Decision } from '../core/model/comparison';
import type { Ask, MethodResult } from '../core/model/methods';
import type { Question } from '../core/model/settings';

type Asked = Pick<Ask, 'confidence' | 'against' | 'margin'>;

/**
 * The word for a result. A row with a p is decided by it (below 1 − confidence); a row without one by its interval. The
 * words that say the margin is crossed were not asked for, so they need the whole two-sided interval beyond it, in every
 * row alike (for `equivalent` its interval of two one-sided tests). Throws RangeError for a p that is not a number: it
 * would read as "not shown".
 */
export function decide(question: Question, result: MethodResult, ask: Asked): Decision {
  if (Number.isNaN(result.p)) throw new RangeError('a row was computed without a p that can be decided by');
  const shown = isShown(question, result, ask);
  switch (question) {
    case 'differs':
      return shown ? 'differs' : 'not settled';
    case 'higher':
      return shown ? 'higher' : 'not shown';
    case 'lower':
      return shown ? 'lower' : 'not shown';
    case 'equivalent':
      if (shown) return 'within margin';
      return isBelow(result, ask) || isAbove(result, ask) ? 'outside margin' : 'not shown within margin';
    case 'not-lower':
      if (shown) return 'not lower by the margin';
      return isBelow(result.twoSided, ask) ? 'lower by at least the margin' : 'not shown';
    case 'not-higher':
      if (shown) return 'not higher by the margin';
      return isAbove(result.twoSided, ask) ? 'higher by at least the margin' : 'not shown';
  }
}

function isShown(question: Question, { p, lower, upper }: MethodResult, ask: Asked): boolean {
  if (p !== null) return p < alphaOf(ask.confidence);
  const above = (bound: number | undefined): boolean =>
    lower !== null && bound !== undefined && lower > bound;
  const below = (bound: number | undefined): boolean =>
    upper !== null && bound !== undefined && upper < bound;
  switch (question) {
    case 'differs':
      return above(ask.against) || below(ask.against);
    case 'higher':
      return above(ask.against);
    case 'lower':
      return below(ask.against);
    case 'equivalent':
      return above(ask.margin?.[0]) && below(ask.margin?.[1]);
    case 'not-lower':
      return above(ask.margin?.[0]);
    case 'not-higher':
      return below(ask.margin?.[1]);
  }
}

type Limits = Pick<MethodResult, 'lower' | 'upper'> | undefined;

/** The whole interval lies below the margin, or ends on its lower bound. */
const isBelow = (limits: Limits, { margin }: Asked): boolean =>
  margin !== null && (limits?.upper ?? Infinity) <= margin[0];

/** The whole interval lies above the margin, or begins on its upper bound. */
const isAbove = (limits: Limits, { margin }: Asked): boolean =>
  margin !== null && (limits?.lower ?? -Infinity) >= margin[1];
