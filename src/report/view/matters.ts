import type { Comparison } from '../../core/model/comparison';
import { showLabel } from '../words/label';
import type { Say } from '../../core/model/say';
import type { Scale } from '../words/scale';

/** Where an interval lies as seen from the size that matters: wholly beyond it, wholly inside, or across. */
type Place = 'beyond' | 'inside' | 'across';

/**
 * What the chosen interval says of the smallest difference that matters, measured from 0; or the request to name it. For
 * a bound, the open end counts as unlimited.
 */
export function mattersSentence(comparison: Comparison, scale: Scale, t: Say): string {
  const { settings, chosen, groups } = comparison;
  const { matters, against, question } = settings;
  if (matters === null) {
    const asksMargin = settings.margin !== null && question !== 'differs';
    return asksMargin ? '' : t('Say what size of difference matters to get more than this.');
  }
  const said = scale.typed(matters);
  const result = chosen.result;
  if (result === null || (result.lower === null && result.upper === null))
    return t('You said {0} matters: without an interval this cannot be held against it.', said);
  const lower = result.lower ?? -Infinity;
  const upper = result.upper ?? Infinity;
  const place = placeOf(lower, upper, matters);
  if (lower <= against && upper >= against) {
    return place === 'inside'
      ? t(
          'You said {0} matters: the interval lies wholly inside that size; differences that large are not compatible with these data at this confidence.',
          said,
        )
      : t(
          'You said {0} matters: these data are compatible with a difference of {1} and with one that matters.',
          said,
          scale.typed(against),
        );
  }
  const [test = '', reference = ''] = groups.map(group => showLabel(group.label));
  switch (place) {
    case 'beyond':
      return t('You said {0} matters: the data show a difference of at least that size.', said);
    case 'inside':
      return lower >= 0
        ? t(
            'You said {0} matters: the data show {1} higher than {2}, but every value in the interval is smaller than that.',
            said,
            test,
            reference,
          )
        : upper <= 0
          ? t(
              'You said {0} matters: the data show {1} lower than {2}, but every value in the interval is smaller than that.',
              said,
              test,
              reference,
            )
          : t('You said {0} matters: every value in the interval is smaller than that.', said);
    case 'across':
      return lower >= 0
        ? t(
            'You said {0} matters: the interval runs from below {1} to above it, so whether the difference is large enough to matter is not settled.',
            said,
            scale.typedNumber(matters),
          )
        : t(
            'You said {0} matters: in size, the interval runs from below {1} to above it, so whether the difference is large enough to matter is not settled.',
            said,
            scale.typedNumber(matters),
          );
  }
}

function placeOf(lower: number, upper: number, matters: number): Place {
  if (lower >= matters || upper <= -matters) return 'beyond';
  return lower > -matters && upper < matters ? 'inside' : 'across';
}
