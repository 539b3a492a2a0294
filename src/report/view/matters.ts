import { mattersPlace, type MattersPlace } from '../../compare/mattersPlace';
import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { estimatesOf } from '../words/estimates';
import { groupLabels } from '../words/groupLabels';
import type { Scale } from '../words/scale';

/** The same in a sentence and in few words. */
export interface MattersWords {
  readonly full: string;
  readonly short: string;
}

/**
 * What the chosen interval says of the smallest difference that matters, measured from 0; or the request to name it. For
 * a bound, the open end counts as unlimited.
 */
export function mattersSentence(comparison: Comparison, scale: Scale, t: Say): MattersWords {
  const { settings, chosen } = comparison;
  const { matters, against, question, margin } = settings;
  if (estimatesOf(chosen) !== 'difference') return { full: '', short: '' };
  if (matters === null)
    return margin !== null && question !== 'differs'
      ? { full: '', short: '' }
      : {
          full: t('Say what size of difference matters to get more than this.'),
          short: t('Say what size of difference matters (--matters) to get more than this.'),
        };
  const said = scale.typed(matters);
  const result = chosen.result;
  if (result === null || (result.lower === null && result.upper === null))
    return both(t('{0} matters: without an interval this cannot be held against it.', said));
  const lower = result.lower ?? -Infinity;
  const upper = result.upper ?? Infinity;
  const place = mattersPlace(lower, upper, matters);
  return lower <= against && upper >= against
    ? undecided(place, said, scale.typed(against), t)
    : decided(place, { lower, upper, matters: scale.typedNumber(matters), said }, comparison, t);
}

const both = (text: string): MattersWords => ({ full: text, short: text });

/** The interval holds what the difference was held against. */
function undecided(place: MattersPlace, said: string, against: string, t: Say): MattersWords {
  return place === 'inside'
    ? {
        full: t(
          'You said {0} matters: the interval lies wholly inside that size; differences that large are not compatible with these data at this confidence.',
          said,
        ),
        short: t('{0} matters: differences that large are not compatible with these data.', said),
      }
    : {
        full: t(
          'You said {0} matters: these data are compatible with a difference of {1} and with one that matters.',
          said,
          against,
        ),
        short: t(
          '{0} matters: compatible with a difference of {1} and with one that matters.',
          said,
          against,
        ),
      };
}

interface Seen {
  readonly lower: number;
  readonly upper: number;
  /** The size that matters, without and with its unit. */
  readonly matters: string;
  readonly said: string;
}

function decided(place: MattersPlace, seen: Seen, comparison: Comparison, t: Say): MattersWords {
  const { lower, upper, matters, said } = seen;
  const [test = '', reference = ''] = groupLabels(comparison);
  switch (place) {
    case 'beyond':
      return {
        full: t('You said {0} matters: the data show a difference of at least that size.', said),
        short: t('{0} matters: every value in the interval is at least that large.', said),
      };
    case 'inside':
      return {
        full: insideSentence(lower, upper, said, test, reference, t),
        short: t('{0} matters: every value in the interval is smaller than that.', said),
      };
    case 'across':
      return {
        full:
          lower >= 0
            ? t(
                'You said {0} matters: the interval runs from below {1} to above it, so whether the difference is large enough to matter is not settled.',
                said,
                matters,
              )
            : t(
                'You said {0} matters: in size, the interval runs from below {1} to above it, so whether the difference is large enough to matter is not settled.',
                said,
                matters,
              ),
        short: t('{0} matters: the interval runs from below it to above it; not settled.', said),
      };
  }
}

function insideSentence(
  lower: number,
  upper: number,
  said: string,
  test: string,
  reference: string,
  t: Say,
): string {
  if (lower < 0 && upper > 0)
    return t('You said {0} matters: every value in the interval is smaller than that.', said);
  return lower >= 0
    ? t(
        'You said {0} matters: the data show {1} higher than {2}, but every value in the interval is smaller than that.',
        said,
        test,
        reference,
      )
    : t(
        'You said {0} matters: the data show {1} lower than {2}, but every value in the interval is smaller than that.',
        said,
        test,
        reference,
      );
}
