import { alphaOf } from '../core/methods/confidence';
import type { Decision } from '../core/model/comparison';
import type { Ask, MethodResult } from '../core/model/methods';
import type { Question } from '../core/model/settings';

type Asked = Pick<Ask, 'confidence' | 'against' | 'margin'>;

/**
 * The word for a result. A row with a p is decided by it (below 1 − confidence); a row without one by its interval. The
 * two words that say the margin is crossed need the whole interval beyond it.
 */
export function decide(question: Question, result: MethodResult, ask: Asked): Decision {
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
      return isBeyond(result, ask) ? 'outside margin' : 'not shown within margin';
    case 'not-lower':
      if (shown) return 'not lower by the margin';
      return isOpposite(result, ask) ? 'lower by at least the margin' : 'not shown';
    case 'not-higher':
      if (shown) return 'not higher by the margin';
      return isOpposite(result, ask) ? 'higher by at least the margin' : 'not shown';
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

/** The whole interval of `equivalent` lies outside the margin. */
function isBeyond({ lower, upper }: MethodResult, { margin }: Asked): boolean {
  if (margin === null || lower === null || upper === null) return false;
  return upper <= margin[0] || lower >= margin[1];
}

/** The one-sided test the other way round, at the same level: its p is 1 − p of this one. */
function isOpposite({ p, twoSided }: MethodResult, { confidence, margin }: Asked): boolean {
  if (p !== null) return p > confidence;
  const { lower = null, upper = null } = twoSided ?? {};
  if (margin === null || lower === null || upper === null) return false;
  return upper <= margin[0] || lower >= margin[1];
}
