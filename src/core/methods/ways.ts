import type { Ask, MethodResult } from '../model/methods';
import type { Question } from '../model/settings';
import { alphaOf } from './confidence';
import type { Reason, Say } from '../model/say';
import { commonWhy } from './reasons';

/** Of all ways in which chance could have dealt the values: how many there are, and how many give a statistic at least as high, as low or as far as the one met. */
export interface Ways {
  readonly ways: number;
  readonly atLeast: number;
  readonly atMost: number;
  readonly asFar: number;
}

/** What can be asked of a method that counts ways: it has no interval to hold against a margin. */
export const waysQuestions: readonly Question[] = ['differs', 'higher', 'lower'];

type Met = Pick<MethodResult, 'estimate' | 'se' | 'statistic'>;

/** p is the share of ways at least as far as what was met: to both sides, or to the side asked for. */
export function judgeWays(met: Met, { ways, atLeast, atMost, asFar }: Ways, ask: Ask): MethodResult {
  const none = { lower: null, upper: null };
  const result = { ...met, ...none, df: null, confidence: ask.confidence, extra: { ways } };
  const twoSided = { p: asFar / ways, ...none };
  if (ask.question === 'differs') return { ...result, p: twoSided.p };
  return { ...result, twoSided, p: (ask.question === 'higher' ? atLeast : atMost) / ways };
}

/** Why so few ways decide nothing: the smallest p that can come of them is not below 1 − confidence. */
export const cannotReach = (least: number, ways: number, { confidence }: Ask): Reason | null =>
  least < alphaOf(confidence) ? null : { code: 'cannot-reach', facts: { ways, least } };

/** Sentences for the reasons that methods that count ways have in common. */
export function waysWhy(reason: Reason, t: Say): string {
  const { ways, least } = reason.facts;
  switch (reason.code) {
    case 'too-many-digits':
      return t('the values have too many digits for exact sums');
    case 'cannot-reach':
      return t('with {0} ways no p below {1} can come of it', Number(ways), Number(least));
    default:
      return commonWhy(reason, t);
  }
}
