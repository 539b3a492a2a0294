import type { Comparison, Decision } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { alikeValue, estimateName, estimatesOf } from '../words/estimates';
import { groupLabels } from '../words/groupLabels';
import { subjectOf } from '../words/measuredName';
import type { Scale } from '../words/scale';

type MarginDecision = Exclude<
  Decision,
  'differs' | 'higher' | 'lower' | 'not settled' | 'not shown' | 'some differ'
>;

/** The answer to a question about a margin, in one sentence. */
export function marginHeadline(
  comparison: Comparison,
  decision: MarginDecision,
  scale: Scale,
  t: Say,
): string {
  const [low, high] = comparison.settings.margin ?? [0, 0];
  const margin = marginText(scale, low, high, t);
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = groupLabels(comparison);
  const below = marginBelow(comparison, scale);
  const above = scale.typed(high);
  if (estimatesOf(comparison.chosen) === 'ratio') {
    const name = estimateName(comparison, t);
    if (decision === 'within margin')
      return t('{0}: {1} lies within the margin of {2}', subject, name, margin);
    if (decision === 'outside margin')
      return t('{0}: {1} lies outside the margin of {2}', subject, name, margin);
    if (decision === 'not shown within margin')
      return t('Not shown for {0} that {1} lies within the margin of {2}', subject, name, margin);
  }
  switch (decision) {
    case 'within margin':
      return t(
        '{0}: the difference between {1} and {2} lies within the margin of {3}',
        subject,
        test,
        reference,
        margin,
      );
    case 'outside margin':
      return t(
        '{0}: the difference between {1} and {2} lies outside the margin of {3}',
        subject,
        test,
        reference,
        margin,
      );
    case 'not shown within margin':
      return t(
        'Not shown for {0} that the difference between {1} and {2} lies within the margin of {3}',
        subject,
        test,
        reference,
        margin,
      );
    case 'not lower by the margin':
      return t('{0} is not lower in {1} than in {2} by the margin of {3}', subject, test, reference, below);
    case 'lower by at least the margin':
      return t(
        '{0} is lower in {1} than in {2} by at least the margin of {3}',
        subject,
        test,
        reference,
        below,
      );
    case 'not higher by the margin':
      return t('{0} is not higher in {1} than in {2} by the margin of {3}', subject, test, reference, above);
    case 'higher by at least the margin':
      return t(
        '{0} is higher in {1} than in {2} by at least the margin of {3}',
        subject,
        test,
        reference,
        above,
      );
  }
}

/** The lower bound of the margin as people say it: a size below 0, or a ratio. */
export function marginBelow(comparison: Comparison, scale: Scale): string {
  const [low] = comparison.settings.margin ?? [0, 0];
  return scale.typed(alikeValue(comparison) === 0 ? -low : low);
}

/** "−5 to 5 MPa". */
export const marginText = (scale: Scale, low: number, high: number, t: Say): string =>
  scale.withUnit(t('{0} to {1}', scale.typedNumber(low), scale.typedNumber(high)));
