import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { alikeValue, estimateName } from '../words/estimates';
import { groupLabels } from '../words/groupLabels';
import { subjectOf } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { otherDecided, otherKind, otherNotSettled } from './otherHeadline';
import { marginBelow, marginHeadline } from './marginHeadline';

/** The answer in one sentence, in the words of the decision, with the labels and the size. */
export function headline(comparison: Comparison, scale: Scale, t: Say): string {
  const { chosen } = comparison;
  const subject = subjectOf(comparison, t);
  const kind = otherKind(comparison);
  switch (chosen.decision) {
    case null:
      return t('{0}: no decision can be given', subject);
    case 'differs':
    case 'higher':
    case 'lower':
      return kind === null ? decidedHeadline(comparison, scale, t) : otherDecided(comparison, kind, scale, t);
    case 'not settled':
      return kind === null || comparison.design === 'several'
        ? notSettled(comparison, scale, t)
        : otherNotSettled(comparison, kind, scale, t);
    case 'not shown':
      return notShown(comparison, scale, t);
    case 'some differ':
      return t('{0} is not alike in the {1} groups: some differ', subject, comparison.groups.length);
    case 'within margin':
    case 'outside margin':
    case 'not shown within margin':
    case 'not lower by the margin':
    case 'lower by at least the margin':
    case 'not higher by the margin':
    case 'higher by at least the margin':
      return marginHeadline(comparison, chosen.decision, scale, t);
  }
}

function decidedHeadline(comparison: Comparison, scale: Scale, t: Say): string {
  const { against } = comparison.settings;
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = groupLabels(comparison);
  const estimate = comparison.chosen.result?.estimate ?? null;
  if (estimate === null) return t('{0} differs between {1} and {2}', subject, test, reference);
  const size = scale.difference(Math.abs(estimate));
  if (against === 0)
    return estimate > 0
      ? t('{0} is higher in {1} than in {2} by {3}', subject, test, reference, size)
      : t('{0} is lower in {1} than in {2} by {3}', subject, test, reference, size);
  const names = estimateName(comparison, t);
  const held = scale.typed(against);
  return estimate > against
    ? t(
        '{0}: {1} is {2}, above the {3} it was held against',
        subject,
        names,
        scale.difference(estimate),
        held,
      )
    : t(
        '{0}: {1} is {2}, below the {3} it was held against',
        subject,
        names,
        scale.difference(estimate),
        held,
      );
}

/** Never that there is none: what the interval leaves possible. */
function notSettled(comparison: Comparison, scale: Scale, t: Say): string {
  const subject = subjectOf(comparison, t);
  const { design, groups, chosen } = comparison;
  if (design === 'several')
    return t('Not settled whether {0} differs among the {1} groups', subject, groups.length);
  const [test = '', reference = ''] = groupLabels(comparison);
  const { lower, upper } = chosen.result ?? { lower: null, upper: null };
  if (lower === null || upper === null)
    return t('Not settled whether {0} differs between {1} and {2}', subject, test, reference);
  const range = scale.withUnit(scale.interval({ lower, upper }).text);
  return t(
    'Not settled: differences in {0} from {1} ({2}) are compatible with these data',
    subject,
    range,
    estimateName(comparison, t),
  );
}

function notShown(comparison: Comparison, scale: Scale, t: Say): string {
  const { question, against, margin } = comparison.settings;
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = groupLabels(comparison);
  switch (question) {
    case 'not-lower':
      return t(
        'Not shown that {0} is not lower in {1} than in {2} by the margin of {3}',
        subject,
        test,
        reference,
        marginBelow(comparison, scale),
      );
    case 'not-higher':
      return t(
        'Not shown that {0} is not higher in {1} than in {2} by the margin of {3}',
        subject,
        test,
        reference,
        scale.typed(margin?.[1] ?? 0),
      );
    case 'higher':
      return against === alikeValue(comparison)
        ? t('Not shown that {0} is higher in {1} than in {2}', subject, test, reference)
        : t(
            'Not shown for {0} that {1} lies above {2}',
            subject,
            estimateName(comparison, t),
            scale.typed(against),
          );
    case 'lower':
    case 'differs':
    case 'equivalent':
      return against === alikeValue(comparison)
        ? t('Not shown that {0} is lower in {1} than in {2}', subject, test, reference)
        : t(
            'Not shown for {0} that {1} lies below {2}',
            subject,
            estimateName(comparison, t),
            scale.typed(against),
          );
  }
}
