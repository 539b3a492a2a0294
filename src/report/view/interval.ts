import type { Comparison } from '../../core/model/comparison';
import type { Estimates } from '../../core/model/methods';
import type { Say } from '../../core/model/say';
import { printPercent } from '../numbersPrinted';
import { estimatesOf } from '../words/estimates';
import type { Scale } from '../words/scale';

/** "95% interval 8.6 to 36.6 MPa", or the bound of a one-sided question; null: the chosen row has none. */
export function intervalSentence({ chosen, settings }: Comparison, scale: Scale, t: Say): string | null {
  const result = chosen.result;
  if (result === null || (result.lower === null && result.upper === null)) return null;
  const percent = printPercent(result.confidence);
  const text = scale.withUnit(scale.interval(result).text);
  if (result.lower === null || result.upper === null)
    return boundSentence(estimatesOf(chosen), percent, text, t);
  return settings.question === 'equivalent'
    ? t('{0}% interval {1} ({2}% on each side)', percent, text, printPercent(oneSide(result.confidence)))
    : t('{0}% interval {1}', percent, text);
}

function boundSentence(estimates: Estimates, percent: string, text: string, t: Say): string {
  switch (estimates) {
    case 'difference':
      return t('{0}% bound: the difference is {1}', percent, text);
    case 'ratio':
      return t('{0}% bound: the ratio is {1}', percent, text);
    case 'chance':
      return t('{0}% bound: the chance is {1}', percent, text);
  }
}

/** The two-sided interval that stands beside a bound or beside the interval of a margin question. */
export function besideSentence({ chosen, settings }: Comparison, scale: Scale, t: Say): string | null {
  const beside = chosen.result?.twoSided;
  if (beside === undefined) return null;
  const text = scale.withUnit(scale.interval(beside).text);
  const sentence = t('two-sided {0}% interval {1}', printPercent(settings.confidence), text);
  return settings.question !== 'differs' && settings.margin !== null && settings.confidence === 0.95
    ? `${sentence}. ${t('One-sided 5%; clinical and many regulatory protocols require 2.5% (confidence 0.975).')}`
    : sentence;
}

/** The share on each side outside a two-sided interval, to the decimals of its confidence. */
const oneSide = (confidence: number): number => Number(((1 - confidence) / 2).toPrecision(12));
