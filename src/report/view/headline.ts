import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { showLabel } from '../words/label';
import { subjectOf } from '../words/measuredName';
import type { Scale } from '../words/scale';

/** The answer in one sentence, in the words of the decision, with the labels and the size. */
export function headline(comparison: Comparison, scale: Scale, t: Say): string {
  const { chosen, settings } = comparison;
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = comparison.groups.map(group => showLabel(group.label));
  const estimate = chosen.result?.estimate ?? null;
  if (chosen.decision === null || estimate === null)
    return comparison.design === 'several'
      ? severalHeadline(comparison, subject, t)
      : t('{0}: no decision can be given', subject);

  const against = settings.against;
  const size = scale.difference(Math.abs(estimate));
  const [low, high] = settings.margin ?? [0, 0];
  const below = scale.typed(-low);
  const above = scale.typed(high);
  switch (chosen.decision) {
    case 'differs':
      if (against !== 0) return awayFrom(estimate, against, subject, `${test} \u2212 ${reference}`, scale, t);
      return estimate > 0
        ? t('{0} is higher in {1} than in {2} by {3}', subject, test, reference, size)
        : t('{0} is lower in {1} than in {2} by {3}', subject, test, reference, size);
    case 'higher':
      return against === 0
        ? t('{0} is higher in {1} than in {2} by {3}', subject, test, reference, size)
        : awayFrom(estimate, against, subject, `${test} \u2212 ${reference}`, scale, t);
    case 'lower':
      return against === 0
        ? t('{0} is lower in {1} than in {2} by {3}', subject, test, reference, size)
        : awayFrom(estimate, against, subject, `${test} \u2212 ${reference}`, scale, t);
    case 'not settled':
      return notSettled(comparison, scale, t);
    case 'not shown':
      return notShown(comparison, scale, t);
    case 'within margin':
      return t(
        '{0}: the difference between {1} and {2} lies within the margin of {3}',
        subject,
        test,
        reference,
        marginText(scale, low, high, t),
      );
    case 'outside margin':
      return t(
        '{0}: the difference between {1} and {2} lies outside the margin of {3}',
        subject,
        test,
        reference,
        marginText(scale, low, high, t),
      );
    case 'not shown within margin':
      return t(
        'Not shown that {0} in {1} and in {2} lies within the margin of {3}',
        subject,
        test,
        reference,
        marginText(scale, low, high, t),
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
    case 'some differ':
      return severalHeadline(comparison, subject, t);
  }
}

function awayFrom(
  estimate: number,
  against: number,
  subject: string,
  names: string,
  scale: Scale,
  t: Say,
): string {
  return estimate > against
    ? t(
        '{0}: {1} is {2}, above the {3} it was held against',
        subject,
        names,
        scale.difference(estimate),
        scale.typed(against),
      )
    : t(
        '{0}: {1} is {2}, below the {3} it was held against',
        subject,
        names,
        scale.difference(estimate),
        scale.typed(against),
      );
}

/** Never that there is none: what the interval leaves possible. */
function notSettled(comparison: Comparison, scale: Scale, t: Say): string {
  const { chosen, design } = comparison;
  const subject = subjectOf(comparison, t);
  if (design === 'several') return severalHeadline(comparison, subject, t);
  const [test = '', reference = ''] = comparison.groups.map(group => showLabel(group.label));
  const { lower, upper } = chosen.result ?? { lower: null, upper: null };
  return lower === null || upper === null
    ? t('Not settled whether {0} differs between {1} and {2}', subject, test, reference)
    : t(
        'Not settled: differences in {0} from {1} ({2} \u2212 {3}) are compatible with these data',
        subject,
        scale.withUnit(scale.interval({ lower, upper }).text),
        test,
        reference,
      );
}

function notShown(comparison: Comparison, scale: Scale, t: Say): string {
  const { question, against, margin } = comparison.settings;
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = comparison.groups.map(group => showLabel(group.label));
  const beyond = scale.typed(against);
  if (question === 'not-lower')
    return t(
      'Not shown that {0} is not lower in {1} than in {2} by the margin of {3}',
      subject,
      test,
      reference,
      scale.typed(-(margin?.[0] ?? 0)),
    );
  if (question === 'not-higher')
    return t(
      'Not shown that {0} is not higher in {1} than in {2} by the margin of {3}',
      subject,
      test,
      reference,
      scale.typed(margin?.[1] ?? 0),
    );
  if (question === 'higher')
    return against === 0
      ? t('Not shown that {0} is higher in {1} than in {2}', subject, test, reference)
      : t(
          'Not shown that {0} is higher in {1} than in {2} by more than {3}',
          subject,
          test,
          reference,
          beyond,
        );
  return against === 0
    ? t('Not shown that {0} is lower in {1} than in {2}', subject, test, reference)
    : t('Not shown that {0}: {1} \u2212 {2} lies below {3}', subject, test, reference, beyond);
}

function severalHeadline(comparison: Comparison, subject: string, t: Say): string {
  const n = comparison.groups.length;
  return comparison.chosen.decision === 'some differ'
    ? t('{0} is not alike in the {1} groups: some differ', subject, n)
    : t('Not settled whether {0} differs among the {1} groups', subject, n);
}

/** "−5 to 5 MPa". */
export const marginText = (scale: Scale, low: number, high: number, t: Say): string =>
  scale.withUnit(t('{0} to {1}', scale.typedNumber(low), scale.typedNumber(high)));
